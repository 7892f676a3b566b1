// One night that is over.
import { systemRinkAccess } from '@/lib/access/system'
import { settleRinkNight } from '@/lib/services/night-outcomes'
import type { WorkerParts } from '../parts'

export async function settleNightJob(
  { db, readClock }: WorkerParts,
  { rinkId, nightDate }: { rinkId: string; nightDate: string },
): Promise<void> {
  await settleRinkNight({ db, now: readClock() }, systemRinkAccess<'view'>(rinkId), nightDate)
}
