// One night that is over; what people found of it may teach the model something of their yard.
import { enqueueLearning } from '@/db/queries/jobs'
import { systemRinkAccess } from '@/lib/access/system'
import { settleRinkNight } from '@/lib/services/night-outcomes'
import type { WorkerParts } from '../parts'

export async function settleNightJob(
  { db, readClock }: WorkerParts,
  { rinkId, nightDate }: { rinkId: string; nightDate: string },
): Promise<void> {
  await enqueueLearning(db, rinkId)
  await settleRinkNight({ db, now: readClock() }, systemRinkAccess<'view'>(rinkId), nightDate)
}
