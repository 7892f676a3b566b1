// The browsers in which one is signed in.
import { voidAccountLinks } from '@/db/queries/account-links'
import { deleteSessionByHandle, deleteSessionsOf, listSessionsOf, type SessionOfUser } from '@/db/queries/sessions'
import type { ServiceContext } from '@/lib/context'
import { NotFoundError } from '@/lib/errors'

export type OwnSession = SessionOfUser

export function listOwnSessions({ db, now, viewer }: ServiceContext): Promise<OwnSession[]> {
  return listSessionsOf(db, viewer.userId, now)
}

/** @throws NotFoundError for a session that is over or somebody else's. */
export async function endOwnSession({ db, viewer }: ServiceContext, handle: string): Promise<void> {
  if (!(await deleteSessionByHandle(db, viewer.userId, handle))) throw new NotFoundError('Session')
}

/** Every browser, this one too. Links that are still on their way sign nobody in any more. */
export async function signOutEverywhere({ db, now, viewer }: ServiceContext): Promise<void> {
  await db.transaction(async (trx) => {
    await deleteSessionsOf(trx, viewer.userId)
    await voidAccountLinks(trx, viewer.userId, now)
  })
}
