// One cell's forecast.
import { pullForecast } from '@/lib/services/forecasts'
import type { WorkerParts } from '../parts'

export async function pullForecastJob(
  { db, readClock, provider }: WorkerParts,
  { cellId }: { cellId: string },
): Promise<void> {
  await pullForecast({ db, now: readClock(), provider }, cellId)
}
