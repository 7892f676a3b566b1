// Signed-in browsers. A row is found by the SHA-256 of its token; the token itself is in the cookie only.
import type { Db } from '@/db/knex'

export interface SessionWithUser {
  userId: string
  name: string
  email: string
  isAdmin: boolean
  emailVerifiedAt: Date | null
  expiresAt: Date
}

export async function insertSession(
  db: Db,
  session: { tokenHash: string; userId: string; expiresAt: Date },
  now: Date,
): Promise<void> {
  await db('sessions').insert({
    token_hash: session.tokenHash,
    user_id: session.userId,
    created_at: now,
    expires_at: session.expiresAt,
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
      expiresAt: 's.expires_at',
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
