// The end of an account: asked for, waited for, and taken back.
import { listRinksKeptAlone, setDeletionDue } from '@/db/queries/account-ends'
import type { ServiceContext } from '@/lib/context'
import { DAY_MILLIS } from '@/lib/physics/constants'
import type { DeletionInput } from '@/lib/schemas/accounts'
import { promiseDeletionMail } from './account-mail'
import { requirePassword } from './own-account'

/** Long enough to come back from a trip and find the mail. Ours. */
export const GRACE_DAYS = 14

/** What goes with the account: the rinks that nobody else keeps. */
export function listRinksThatGo({ db, viewer }: ServiceContext): Promise<{ id: string; name: string }[]> {
  return listRinksKeptAlone(db, viewer.userId)
}

/** The account goes in two weeks; a mail says so. @returns the day. */
export async function askForDeletion(context: ServiceContext, input: DeletionInput): Promise<{ dueAt: Date }> {
  const { db, now, viewer } = context
  await requirePassword(context, input.currentPassword)
  const dueAt = new Date(now.getTime() + GRACE_DAYS * DAY_MILLIS)
  await db.transaction(async (trx) => {
    await setDeletionDue(trx, viewer.userId, dueAt, now)
    await promiseDeletionMail(trx, viewer.userId, dueAt, now)
  })
  return { dueAt }
}

export async function keepAccount({ db, now, viewer }: ServiceContext): Promise<void> {
  await setDeletionDue(db, viewer.userId, null, now)
}
