// A signed-in person's own account: how they are called, how they read figures, their password and their sessions.
import { voidAccountLinks } from '@/db/queries/account-links'
import { deleteSessionsOf } from '@/db/queries/sessions'
import { findAccount, findPasswordHash, setPasswordHash, updateAccount } from '@/db/queries/users'
import { hashPassword, verifyPassword } from '@/lib/auth/passwords'
import type { ServiceContext } from '@/lib/context'
import { InvalidInputError, NotFoundError } from '@/lib/errors'
import type { AccountInput, PasswordChangeInput } from '@/lib/schemas/accounts'
import type { ThemeChoice } from '@/lib/schemas/themes'
import type { Units } from '@/lib/units'
import { spend } from './rate-limits'

export interface AccountView {
  email: string
  name: string
  units: Units
  clock: '12' | '24'
  theme: ThemeChoice
  hasPassword: boolean
}

export async function getAccount({ db, viewer }: ServiceContext): Promise<AccountView> {
  const account = await findAccount(db, viewer.userId)
  if (!account) throw new NotFoundError('Account')
  return account
}

export async function saveAccount({ db, now, viewer }: ServiceContext, input: AccountInput): Promise<void> {
  await updateAccount(db, viewer.userId, input, now)
}

/** Ends every session, this one too: the caller opens a new one. Somebody without a password may set a first one. */
export async function changePassword(context: ServiceContext, input: PasswordChangeInput): Promise<void> {
  const { db, now, viewer } = context
  await spend(context, 'passwordChangeByUser', viewer.userId)
  const present = await findPasswordHash(db, viewer.userId)
  if (present && !(await verifyPassword(present, input.currentPassword))) {
    throw new InvalidInputError('Nothing was changed.', { currentPassword: 'This is not your present password.' })
  }
  const passwordHash = await hashPassword(input.newPassword)
  await db.transaction(async (trx) => {
    await setPasswordHash(trx, viewer.userId, passwordHash, now)
    await deleteSessionsOf(trx, viewer.userId)
    await voidAccountLinks(trx, viewer.userId, now)
  })
}

/** Every browser, this one too. Links that are still on their way sign nobody in any more. */
export async function signOutEverywhere({ db, now, viewer }: ServiceContext): Promise<void> {
  await db.transaction(async (trx) => {
    await deleteSessionsOf(trx, viewer.userId)
    await voidAccountLinks(trx, viewer.userId, now)
  })
}
