// People: who they are to us, how they prove it, and how they like figures shown.
import type { Db } from '@/db/knex'
import type { UserRow } from '@/db/types'
import type { Units } from '@/lib/units'
import { unitColumns, unitsColumn } from './unit-columns'

export interface SignInRow {
  id: string
  passwordHash: string | null
  emailVerifiedAt: Date | null
}

export interface AccountRow {
  email: string
  name: string
  units: Units
  clock: UserRow['clock']
  theme: UserRow['theme']
  hasPassword: boolean
  /** The mail server refused this address for good. */
  isEmailRefused: boolean
  /** The day on which the account goes, when that was asked for. */
  deletionDueAt: Date | null
}

/**
 * Adds a person, or starts an unconfirmed one over with the new name and password.
 *
 * @returns undefined when the address belongs to somebody who confirmed it; their row is left alone.
 */
export async function putUnconfirmedUser(
  db: Db,
  user: { email: string; name: string; passwordHash: string },
  now: Date,
): Promise<{ id: string } | undefined> {
  const row = { name: user.name, password_hash: user.passwordHash, updated_at: now }
  const [stored] = await db('users')
    .insert({ ...row, email: user.email, created_at: now })
    .onConflict('email')
    .merge(row)
    .whereNull('users.email_verified_at')
    .returning('id')
  return stored
}

export async function findUserForSignIn(db: Db, email: string): Promise<SignInRow | undefined> {
  return db('users')
    .where({ email })
    .first({ id: 'id', passwordHash: 'password_hash', emailVerifiedAt: 'email_verified_at' })
}

export async function findPasswordHash(db: Db, userId: string): Promise<string | null | undefined> {
  const row = await db('users').where({ id: userId }).first('password_hash')
  return row?.password_hash
}

export async function findEmail(db: Db, userId: string): Promise<string | undefined> {
  const row = await db('users').where({ id: userId }).first('email')
  return row?.email
}

export async function findAccount(db: Db, userId: string): Promise<AccountRow | undefined> {
  return db('users')
    .where({ id: userId })
    .first(
      'email',
      'name',
      'clock',
      'theme',
      unitsColumn(db, 'users').wrap('', ' as units'),
      db.ref('deletion_due_at').as('deletionDueAt'),
      db.raw('password_hash is not null as "hasPassword"'),
      db.raw('email_refused_at is not null as "isEmailRefused"'),
    )
}

/** The first confirmation counts. @returns true when this call confirmed the address. */
export async function confirmEmail(db: Db, userId: string, now: Date): Promise<boolean> {
  // Whoever opens a mailed link has a mailbox that takes mail.
  await db('users').where({ id: userId }).update({ email_refused_at: null })
  const changed = await db('users')
    .where({ id: userId })
    .whereNull('email_verified_at')
    .update({ email_verified_at: now, updated_at: now })
  return changed === 1
}

/** `null` takes the password away: only links sign in from then on. */
export async function setPasswordHash(db: Db, userId: string, passwordHash: string | null, now: Date): Promise<void> {
  await db('users').where({ id: userId }).update({ password_hash: passwordHash, updated_at: now })
}

export async function updateAccount(
  db: Db,
  userId: string,
  { units, ...values }: Pick<UserRow, 'name' | 'clock' | 'theme'> & { units: Units },
  now: Date,
): Promise<void> {
  await db('users')
    .where({ id: userId })
    .update({ ...values, ...unitColumns(units), updated_at: now })
}

export async function isOnAnyRink(db: Db, userId: string): Promise<boolean> {
  return (await db('rink_members').where({ user_id: userId }).first('user_id')) !== undefined
}

/** Sign-ups that nobody confirmed hold an address and a name for no reason. */
export async function deleteUnconfirmedUsersBefore(db: Db, instant: Date): Promise<number> {
  return db('users').whereNull('email_verified_at').where('updated_at', '<', instant).delete()
}

/** The units a person typed in are the ones they want to read. */
export async function chooseUnits(db: Db, userId: string, units: Units, now: Date): Promise<void> {
  await db('users')
    .where({ id: userId })
    .update({ ...unitColumns(units), updated_at: now })
}

/** A refusal for good: alerts leave the address alone from now on, and the alerts page says so. */
export async function noteEmailRefused(db: Db, userId: string, email: string, now: Date): Promise<void> {
  // Some mail goes to an address that is not the account's, not yet or no more.
  await db('users').where({ id: userId, email }).update({ email_refused_at: now })
}

const UNIQUE_VIOLATION = '23505'

/** @returns false when the address has an account already: of two who take it at once, one gets it. */
export async function changeEmail(trx: Db, userId: string, email: string, now: Date): Promise<boolean> {
  const row = { email, email_verified_at: now, email_refused_at: null, updated_at: now }
  try {
    // In a savepoint: the refusal must not end the caller's transaction.
    await trx.transaction((savepoint) => savepoint('users').where({ id: userId }).update(row))
    return true
  } catch (error) {
    if ((error as { code?: string }).code === UNIQUE_VIOLATION) return false
    throw error
  }
}
