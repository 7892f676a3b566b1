// Forgets what nobody needs any more about accounts: run by the worker's daily pruning.
import type { Db } from '@/db/knex'
import { deleteAccountLinksBefore } from '@/db/queries/account-links'
import { deleteRateLimitsBefore } from '@/db/queries/rate-limits'
import { deleteExpiredSessions } from '@/db/queries/sessions'
import { deleteUnconfirmedUsersBefore } from '@/db/queries/users'

const DAY_MILLIS = 24 * 60 * 60 * 1000
const UNCONFIRMED_DAYS = 14

export async function pruneAccounts({ db, now }: { db: Db; now: Date }): Promise<void> {
  const daysAgo = (days: number) => new Date(now.getTime() - days * DAY_MILLIS)
  await deleteExpiredSessions(db, now)
  await deleteRateLimitsBefore(db, daysAgo(1))
  await deleteAccountLinksBefore(db, daysAgo(1))
  await deleteUnconfirmedUsersBefore(db, daysAgo(UNCONFIRMED_DAYS))
}
