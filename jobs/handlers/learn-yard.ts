// What one yard's reports teach.
import { systemRinkAccess } from '@/lib/access/system'
import { logEvent } from '@/lib/log'
import { learnRinkYard } from '@/lib/services/yards'
import type { WorkerParts } from '../parts'

export async function learnYardJob({ db, readClock }: WorkerParts, { rinkId }: { rinkId: string }): Promise<void> {
  const learned = await learnRinkYard({ db, now: readClock() }, systemRinkAccess<'writeLog'>(rinkId))
  if (learned) logEvent('yard.learned', { rinkId, isLearned: learned.isLearned, reports: learned.reportsUsed })
}
