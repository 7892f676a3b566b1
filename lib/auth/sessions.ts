// Opens sessions. next-auth (for its own routes) and our forms both come here, so there is one kind of session.
import type { Db } from '@/db/knex'
import { insertSession } from '@/db/queries/sessions'
import { deviceName } from './device-name'
import { SESSION_SECONDS } from './session-cookie'
import { createSessionToken, hashSessionToken } from './session-tokens'

export interface OpenedSession {
  token: string
  expiresAt: Date
}

/** @param userAgent Of the browser; kept as its name and system only. */
export async function openSession(db: Db, userId: string, now: Date, userAgent = ''): Promise<OpenedSession> {
  const token = createSessionToken()
  const expiresAt = new Date(now.getTime() + SESSION_SECONDS * 1000)
  await insertSession(db, { tokenHash: hashSessionToken(token), userId, expiresAt, device: deviceName(userAgent) }, now)
  return { token, expiresAt }
}
