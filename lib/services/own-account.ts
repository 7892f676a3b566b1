// A signed-in person's own account: how they are called, how they read figures, and their password.
import { voidAccountLinks } from '@/db/queries/account-links'
import { deleteSessionsOf } from '@/db/queries/sessions'
import { findAccount, findPasswordHash, setPasswordHash, updateAccount } from '@/db/queries/users'
import { hashPassword, verifyPassword } from '@/lib/auth/passwords'
import type { ServiceContext } from '@/lib/context'
import { InvalidInputError, NotFoundError } from '@/lib/errors'
import { MINUTE_MILLIS } from '@/lib/physics/constants'
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

/**
 * Ends every session, this one too: the caller opens a new one. Somebody without a password may set a first one.
 *
 * @throws InvalidInputError as requireOwner does.
 */
export async function changePassword(context: ServiceContext, input: PasswordChangeInput): Promise<void> {
  const { db, now, viewer } = context
  await requireOwner(context, input.currentPassword)
  const passwordHash = await hashPassword(input.newPassword)
  await db.transaction(async (trx) => {
    await setPasswordHash(trx, viewer.userId, passwordHash, now)
    await deleteSessionsOf(trx, viewer.userId)
    await voidAccountLinks(trx, viewer.userId, now)
  })
}

/** @throws InvalidInputError at the field when a password is set and this is not it. */
export async function requirePassword(context: ServiceContext, typed: string): Promise<{ hasPassword: boolean }> {
  await spend(context, 'passwordChangeByUser', context.viewer.userId)
  const present = await findPasswordHash(context.db, context.viewer.userId)
  if (present && !(await verifyPassword(present, typed))) {
    throw new InvalidInputError('Nothing was changed.', { currentPassword: 'This is not your present password.' })
  }
  return { hasPassword: Boolean(present) }
}

/** How long the mailbox vouches for somebody who signed in from it. Ours: as long as a mailed link works. [min] */
export const VOUCHED_MINUTES = 30

/** Without a password only the mailbox tells the owner of an account from whoever holds their phone. */
export function isVouchedFor({ now, viewer }: ServiceContext): boolean {
  return (
    viewer.signedInAt !== undefined && now.getTime() - viewer.signedInAt.getTime() < VOUCHED_MINUTES * MINUTE_MILLIS
  )
}

/**
 * Before something with which an account could be taken away.
 *
 * @throws InvalidInputError without the password, or where there is none without a sign-in from the mailbox just now.
 */
export async function requireOwner(context: ServiceContext, typed: string): Promise<void> {
  const { hasPassword } = await requirePassword(context, typed)
  if (!hasPassword && !isVouchedFor(context)) {
    throw new InvalidInputError(
      'Nothing was changed. Load this page again, and ask for a link to your present address.',
    )
  }
}
