// A signed-in person's own account: how they are called, how they read figures, and their password.
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
  isEmailRefused: boolean
  /** The day on which the account goes, when that was asked for. */
  deletionDueAt: Date | null
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
  await requirePassword(context, input.currentPassword)
  const passwordHash = await hashPassword(input.newPassword)
  await db.transaction(async (trx) => {
    await setPasswordHash(trx, viewer.userId, passwordHash, now)
    await deleteSessionsOf(trx, viewer.userId)
    await voidAccountLinks(trx, viewer.userId, now)
  })
}

/** @throws InvalidInputError at the field when a password is set and this is not it. */
export async function requirePassword(context: ServiceContext, typed: string): Promise<void> {
  await spend(context, 'passwordChangeByUser', context.viewer.userId)
  const present = await findPasswordHash(context.db, context.viewer.userId)
  if (present && !(await verifyPassword(present, typed))) {
    throw new InvalidInputError('Nothing was changed.', { currentPassword: 'This is not your present password.' })
  }
}
