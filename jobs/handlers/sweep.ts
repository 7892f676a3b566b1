// The hourly round over all cells in season.
import { startSweep } from '@/lib/services/forecasts'
import { logEvent } from '@/lib/log'
import type { WorkerParts } from '../parts'

export async function sweepJob({ db, readClock }: WorkerParts, { slotAt }: { slotAt: string }): Promise<void> {
  const cells = await startSweep(db, new Date(slotAt), readClock())
  if (cells !== null) logEvent('sweep.started', { slotAt, cells })
}
