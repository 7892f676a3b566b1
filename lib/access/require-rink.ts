// The access check on a rink: every service that touches a rink's rows starts here.
import { findMembership } from '@/db/queries/members'
import type { ServiceContext } from '@/lib/context'
import { ForbiddenError, NotFoundError } from '@/lib/errors'
import { isGranted, type RinkPermission } from './permissions'
import type { RinkAccess, StaffAccess } from './proofs'

/**
 * Checks that the viewer may do something on a rink.
 *
 * @throws NotFoundError for outsiders, so that ids cannot be probed; ForbiddenError for members with too weak a role.
 */
export async function requireRink<P extends RinkPermission>(
  { db, viewer }: ServiceContext,
  rinkId: string,
  permission: P,
): Promise<RinkAccess<P>> {
  const membership = await findMembership(db, { rinkId, userId: viewer.userId })
  if (!membership) throw new NotFoundError('Rink')
  if (!isGranted(membership.role, permission)) throw new ForbiddenError()
  return { rinkId } as RinkAccess<P>
}

/** @throws NotFoundError for everybody who does not run this server: the staff screens do not exist for them. */
export function requireStaff({ viewer }: ServiceContext): StaffAccess {
  if (!viewer.isAdmin) throw new NotFoundError('Page')
  return {} as StaffAccess
}
