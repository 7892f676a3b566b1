// Reads the signed-in person from the request, and starts and ends sessions in this browser.
import 'server-only'
import { cookies, headers } from 'next/headers'
import { getServerSession } from 'next-auth'
import { cache } from 'react'
import { deleteSession, sessionHandle } from '@/db/queries/sessions'
import { readClock } from '@/lib/clock'
import type { Viewer } from '@/lib/context'
import { readEnvironment } from '@/lib/env'
import { authOptions } from './options'
import { sharedPool } from './pool'
import { sessionCookie } from './session-cookie'
import { hashSessionToken } from './session-tokens'
import { openSession } from './sessions'

/**
 * Once per rendering, however many parts of a page ask.
 *
 * @throws what the database threw: next-auth alone would take somebody whose session cannot be read for a stranger.
 */
export const readViewer = cache(async (): Promise<Viewer | undefined> => {
  const faults: unknown[] = []
  const session = await getServerSession(authOptions((fault) => faults.push(fault)))
  if (faults.length > 0) throw faults[0]
  if (!session) return undefined
  const { id: userId, isAdmin, signedInAt } = session.user
  return { userId, isAdmin, signedInAt }
})

/** Signs a person in, in this browser; a session that it had before ends. For server actions, which may set cookies. */
export async function startSession(userId: string): Promise<void> {
  await endSession()
  const { token, expiresAt } = await openSession(
    sharedPool(),
    userId,
    readClock(),
    (await headers()).get('user-agent') ?? '',
  )
  const { name, options } = sessionCookie(readEnvironment().PUBLIC_URL)
  const jar = await cookies()
  jar.set(name, token, { ...options, expires: expiresAt })
}

/** Signs this browser out. */
export async function endSession(): Promise<void> {
  const { name, options } = sessionCookie(readEnvironment().PUBLIC_URL)
  const jar = await cookies()
  const token = jar.get(name)?.value
  if (!token) return
  await deleteSession(sharedPool(), hashSessionToken(token))
  // `delete` alone leaves out Secure, and browsers then ignore it for a __Host- cookie.
  jar.set(name, '', { ...options, maxAge: 0 })
}

/** By which this browser finds itself in the list of sessions. */
export async function presentSessionHandle(): Promise<string | undefined> {
  const { name } = sessionCookie(readEnvironment().PUBLIC_URL)
  const token = (await cookies()).get(name)?.value
  return token && sessionHandle(hashSessionToken(token))
}
