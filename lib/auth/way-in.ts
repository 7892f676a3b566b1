// Where somebody goes who has just signed in.
import type { Route } from 'next'
import type { SignedIn } from '@/lib/services/accounts'
import { localPath } from './next-path'

/** An account that is about to go is asked about first. */
export function wayIn({ hasRink, isLeaving, invitationPath }: SignedIn, next?: unknown): Route {
  if (isLeaving) return '/account/keep' as Route
  return (localPath(next) ?? (hasRink ? '/rinks' : (invitationPath ?? '/rinks/new'))) as Route
}
