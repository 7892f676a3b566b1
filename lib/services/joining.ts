// The answer to an invitation. Reading it changes nothing; whoever holds its key may join, once.
import { findInvitation, takeInvitation, type InvitationToAnswer } from '@/db/queries/invitations'
import { enqueueDecision } from '@/db/queries/jobs'
import { countMembers, findMembership, insertMember } from '@/db/queries/members'
import { lockRink } from '@/db/queries/rink-settings'
import { findAccount } from '@/db/queries/users'
import type { Db } from '@/db/knex'
import { isGranted, type Role } from '@/lib/access/permissions'
import { requireRink } from '@/lib/access/require-rink'
import { openLinkKey } from '@/lib/auth/account-links'
import type { OpenContext, Viewer } from '@/lib/context'
import { InvalidInputError } from '@/lib/errors'
import { MOST_PEOPLE } from './invitations'

/** Why an invitation cannot be taken. */
export type Closed = 'unknown' | 'withdrawn' | 'taken' | 'expired'

const CLOSED_WORDS: Record<Closed, string> = {
  unknown: 'This link is not complete, or the rink is gone.',
  withdrawn: 'This invitation was taken back.',
  taken: 'This invitation has been used.',
  expired: 'This invitation has run out.',
}

export type InvitationView =
  | { state: 'closed'; sentence: string }
  /** The viewer is on the rink. */
  | { state: 'joined'; rinkId: string; rinkName: string; role: Role }
  | {
      state: 'open'
      rinkName: string
      inviterName: string
      role: Role
      /** Where it was mailed. */
      email: string
      /** The account that would join; null for a visitor. */
      account: { name: string; email: string } | null
    }

function closedBy(invitation: InvitationToAnswer | undefined, now: Date): Closed | undefined {
  if (!invitation) return 'unknown'
  if (invitation.withdrawnAt) return 'withdrawn'
  if (invitation.takenAt) return 'taken'
  return invitation.expiresAt <= now ? 'expired' : undefined
}

/** What an invitation says to who opened it. */
export async function readInvitation(
  { db, now, secret }: OpenContext,
  viewer: Viewer | undefined,
  key: string,
): Promise<InvitationView> {
  const link = openLinkKey(secret, 'invitation', key)
  const invitation = link && (await findInvitation(db, link.id))
  const member = invitation && viewer && (await findMembership(db, { ...invitation, userId: viewer.userId }))
  if (member) return { state: 'joined', rinkId: invitation.rinkId, rinkName: invitation.rinkName, role: member.role }
  const closed = closedBy(invitation, now)
  if (closed || !invitation) return { state: 'closed', sentence: CLOSED_WORDS[closed ?? 'unknown'] }
  const account = viewer && (await findAccount(db, viewer.userId))
  const { rinkName, inviterName, role, email } = invitation
  return {
    state: 'open',
    rinkName,
    inviterName,
    role,
    email,
    account: account ? { name: account.name, email: account.email } : null,
  }
}

/**
 * Puts the viewer on the rink. Who is on it already stays as they are and uses nothing up.
 *
 * @throws InvalidInputError when the invitation cannot be taken, or the rink is full.
 */
export async function join({ db, now, secret }: OpenContext, viewer: Viewer, key: string): Promise<{ rinkId: string }> {
  const link = openLinkKey(secret, 'invitation', key)
  const invitation = link && (await findInvitation(db, link.id))
  if (!invitation) throw new InvalidInputError(CLOSED_WORDS.unknown)
  const membership = { rinkId: invitation.rinkId, userId: viewer.userId }
  if (await findMembership(db, membership)) return membership
  const taken = await db.transaction((trx) => takePlace(trx, link.id, viewer, now))
  // A button pressed twice: the first press may have joined meanwhile.
  if (taken || (await findMembership(db, membership))) return membership
  throw new InvalidInputError(CLOSED_WORDS[closedBy(await findInvitation(db, link.id), now) ?? 'taken'])
}

async function takePlace(trx: Db, invitationId: string, viewer: Viewer, now: Date): Promise<boolean> {
  const taken = await takeInvitation(trx, invitationId, viewer.userId, now)
  if (!taken) return false
  await insertMember(trx, { rinkId: taken.rinkId, userId: viewer.userId, role: taken.role }, now)
  const access = await requireRink({ db: trx, now, viewer }, taken.rinkId, 'view')
  await lockRink(trx, access)
  if ((await countMembers(trx, access)) > MOST_PEOPLE) {
    throw new InvalidInputError(`The rink is full: ${MOST_PEOPLE} people are on it. Its keeper can make room.`)
  }
  // Tonight's news shall not wait for the next forecast.
  if (isGranted(taken.role, 'receiveAlerts')) await enqueueDecision(trx, taken.rinkId)
  return true
}
