// Signed-in browsers. A row is found by the SHA-256 of its token; the token itself is in the cookie only.
import type { Db } from '@/db/knex'

export interface SessionWithUser {
  userId: string
  name: string
  email: string
  isAdmin: boolean
  emailVerifiedAt: Date | null
  createdAt: Date
  expiresAt: Date
  lastSeenAt: Date
}

export async function insertSession(
  db: Db,
  session: { tokenHash: string; userId: string; expiresAt: Date; device?: string },
  now: Date,
): Promise<void> {
  await db('sessions').insert({
    token_hash: session.tokenHash,
    user_id: session.userId,
    created_at: now,
    expires_at: session.expiresAt,
    device: session.device ?? '',
    last_seen_at: now,
  })
}

/** With what the person is now: a changed role counts from the next request on. */
export async function findSession(db: Db, tokenHash: string, now: Date): Promise<SessionWithUser | undefined> {
  return db('sessions as s')
    .join('users as u', 'u.id', 's.user_id')
    .where('s.token_hash', tokenHash)
    .where('s.expires_at', '>', now)
    .first({
      userId: 'u.id',
      name: 'u.name',
      email: 'u.email',
      isAdmin: 'u.is_admin',
      emailVerifiedAt: 'u.email_verified_at',
      createdAt: 's.created_at',
      expiresAt: 's.expires_at',
      lastSeenAt: 's.last_seen_at',
    })
}

export async function extendSession(db: Db, tokenHash: string, expiresAt: Date): Promise<void> {
  await db('sessions').where({ token_hash: tokenHash }).update({ expires_at: expiresAt })
}

export async function deleteSession(db: Db, tokenHash: string): Promise<void> {
  await db('sessions').where({ token_hash: tokenHash }).delete()
}

export async function deleteSessionsOf(db: Db, userId: string): Promise<number> {
  return db('sessions').where({ user_id: userId }).delete()
}

/** Noted now and then, not at every look. */
export async function noteSeen(db: Db, tokenHash: string, now: Date): Promise<void> {
  await db('sessions').where({ token_hash: tokenHash }).update({ last_seen_at: now })
}

export interface SessionOfUser {
  /** The beginning of the token's hash: enough to tell one's sessions apart, nothing that signs in. */
  handle: string
  device: string
  createdAt: Date
  lastSeenAt: Date
}

const HANDLE_LENGTH = 16
export const sessionHandle = (tokenHash: string) => tokenHash.slice(0, HANDLE_LENGTH)

export async function listSessionsOf(db: Db, userId: string, now: Date): Promise<SessionOfUser[]> {
  return db('sessions')
    .where({ user_id: userId })
    .where('expires_at', '>', now)
    .orderBy([{ column: 'last_seen_at', order: 'desc' }, 'token_hash'])
    .select({
      handle: db.raw(`left(token_hash, ${HANDLE_LENGTH})`),
      device: 'device',
      createdAt: 'created_at',
      lastSeenAt: 'last_seen_at',
    })
}

/** One's own only. @returns false when there is no such session any more. */
export async function deleteSessionByHandle(db: Db, userId: string, handle: string): Promise<boolean> {
  const ended = await db('sessions')
    .where({ user_id: userId })
    .whereRaw(`left(token_hash, ${HANDLE_LENGTH}) = ?`, [handle])
    .delete()
  return ended > 0
}
