// The hourly round over all cells in season, and over the nights that have ended.
import { startSweep } from '@/lib/services/forecasts'
import { startSettling } from '@/lib/services/night-outcomes'
import { logEvent } from '@/lib/log'
import type { WorkerParts } from '../parts'

export async function sweepJob({ db, readClock }: WorkerParts, { slotAt }: { slotAt: string }): Promise<void> {
  const cells = await startSweep(db, new Date(slotAt), readClock())
  if (cells === null) return
  logEvent('sweep.started', { slotAt, cells, nights: await startSettling(db, readClock()) })
}
