// Opens sessions. next-auth (for its own routes) and our forms both come here, so there is one kind of session.
import type { Db } from '@/db/knex'
import { insertSession } from '@/db/queries/sessions'
import { createSessionToken, hashSessionToken } from './session-tokens'

/** A winter: nobody should have to sign in with gloves on. Every visit within it starts it anew. */
export const SESSION_SECONDS = 180 * 24 * 60 * 60

export interface OpenedSession {
  token: string
  expiresAt: Date
}

export async function openSession(db: Db, userId: string, now: Date): Promise<OpenedSession> {
  const token = createSessionToken()
  const expiresAt = new Date(now.getTime() + SESSION_SECONDS * 1000)
  await insertSession(db, { tokenHash: hashSessionToken(token), userId, expiresAt }, now)
  return { token, expiresAt }
}
