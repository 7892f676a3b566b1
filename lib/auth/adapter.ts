// next-auth's view of our tables: sessions and who they belong to. Accounts are made by our services, never by next-auth.
import type { Adapter } from 'next-auth/adapters'
import type { Db } from '@/db/knex'
import { deleteSession, extendSession, findSession, noteSeen } from '@/db/queries/sessions'
import { readClock } from '@/lib/clock'
import { MINUTE_MILLIS } from '@/lib/physics/constants'
import { hashSessionToken } from './session-tokens'

/** How exactly a session knows when it was last used. */
const SEEN_STEP_MILLIS = 10 * MINUTE_MILLIS

/** @param onFault Hears of a session that could not be read. */
export function sessionAdapter(db: Db, onFault?: (fault: unknown) => void): Adapter {
  return {
    getSessionAndUser: async (sessionToken) => {
      try {
        return await readSession(db, sessionToken)
      } catch (fault) {
        onFault?.(fault)
        throw fault
      }
    },
    updateSession: async ({ sessionToken, expires }) => {
      if (expires) await extendSession(db, hashSessionToken(sessionToken), expires)
      return null
    },
    deleteSession: async (sessionToken) => {
      await deleteSession(db, hashSessionToken(sessionToken))
    },
  }
}

async function readSession(db: Db, sessionToken: string) {
  const [tokenHash, now] = [hashSessionToken(sessionToken), readClock()]
  const found = await findSession(db, tokenHash, now)
  if (!found) return null
  if (now.getTime() - found.lastSeenAt.getTime() > SEEN_STEP_MILLIS) await noteSeen(db, tokenHash, now)
  const { userId, name, email, isAdmin, emailVerifiedAt, createdAt, expiresAt } = found
  return {
    session: { sessionToken, userId, expires: expiresAt },
    user: { id: userId, name, email, isAdmin, emailVerified: emailVerifiedAt, signedInAt: createdAt },
  }
}
