// One rink's judgement.
import { systemRinkAccess } from '@/lib/access/system'
import { refreshOutlook } from '@/lib/services/outlooks'
import { logEvent } from '@/lib/log'
import type { WorkerParts } from '../parts'

export async function refreshOutlookJob(parts: WorkerParts, { rinkId }: { rinkId: string }): Promise<void> {
  const startedAt = parts.readClock()
  const access = systemRinkAccess<'view'>(rinkId)
  const isNew = await refreshOutlook({ db: parts.db, now: startedAt }, access)
  if (isNew) logEvent('outlook.stored', { rinkId, millis: parts.readClock().getTime() - startedAt.getTime() })
}
