// next-auth's view of our tables: sessions and who they belong to. Accounts are made by our services, never by next-auth.
import type { Adapter } from 'next-auth/adapters'
import type { Db } from '@/db/knex'
import { deleteSession, extendSession, findSession } from '@/db/queries/sessions'
import { readClock } from '@/lib/clock'
import { hashSessionToken } from './session-tokens'

export function sessionAdapter(db: Db): Adapter {
  return {
    getSessionAndUser: async (sessionToken) => {
      const found = await findSession(db, hashSessionToken(sessionToken), readClock())
      if (!found) return null
      const { userId, name, email, isAdmin, emailVerifiedAt, expiresAt } = found
      return {
        session: { sessionToken, userId, expires: expiresAt },
        user: { id: userId, name, email, isAdmin, emailVerified: emailVerifiedAt },
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
