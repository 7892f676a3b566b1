// Somebody's time of day has come: is there something to tell about tonight?
import { systemRinkAccess } from '@/lib/access/system'
import { decideAlerts } from '@/lib/services/alerts'
import type { WorkerParts } from '../parts'

export async function decideAlertsJob(parts: WorkerParts, { rinkId }: { rinkId: string }): Promise<void> {
  await decideAlerts({ db: parts.db, now: parts.readClock() }, systemRinkAccess<'view'>(rinkId))
}
