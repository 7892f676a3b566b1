// On which channels a person can be told something now.
import type { AlertRecipient } from '@/db/queries/alert-preferences'
import { listEnabledPushSubscriptions } from '@/db/queries/push-subscriptions'
import type { Db } from '@/db/knex'

export type Channel = 'email' | 'push'

export async function channelsOf(db: Db, person: AlertRecipient): Promise<Channel[]> {
  const hasDevice = person.wantsPush && (await listEnabledPushSubscriptions(db, person.userId)).length > 0
  return [
    ...(person.wantsEmail && !person.isEmailRefused ? ['email' as const] : []),
    ...(hasDevice ? ['push' as const] : []),
  ]
}
