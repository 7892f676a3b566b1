// Who asks, and when: every page, action and route handler starts with one of these.
import 'server-only'
import { headers } from 'next/headers'
import { redirect, unstable_rethrow } from 'next/navigation'
import { connection } from 'next/server'
import { readClock } from '@/lib/clock'
import type { ServiceContext, Viewer } from '@/lib/context'
import { NotSignedInError } from '@/lib/errors'
import { localPath, PATH_HEADER } from './next-path'
import { sharedPool } from './pool'
import { readViewer } from './session'

/** For open pages, which serve a stranger as well: also while nobody's session can be read. */
export async function maybeViewer(): Promise<Viewer | undefined> {
  await connection()
  try {
    return await readViewer()
  } catch (error) {
    unstable_rethrow(error)
    return undefined
  }
}

/** For actions and route handlers. @throws NotSignedInError */
export async function requestContext(): Promise<ServiceContext> {
  await connection()
  const viewer = await readViewer()
  if (!viewer) throw new NotSignedInError()
  return { db: sharedPool(), now: readClock(), viewer }
}

/** For pages: strangers go to sign-in, and come back afterwards. */
export async function pageContext(): Promise<ServiceContext> {
  await connection()
  const viewer = await readViewer()
  if (viewer) return { db: sharedPool(), now: readClock(), viewer }
  const path = localPath((await headers()).get(PATH_HEADER))
  redirect(path ? `/sign-in?next=${encodeURIComponent(path)}` : '/sign-in')
}
