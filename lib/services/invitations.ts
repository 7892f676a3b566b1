// A keeper asks somebody in. Every address is answered alike, so that nobody learns who has an account.
import {
  countStandingInvitations,
  findStandingInvitation,
  insertInvitation,
  renewInvitation,
  withdrawInvitation,
} from '@/db/queries/invitations'
import { countMembers } from '@/db/queries/members'
import { lockRink } from '@/db/queries/rink-settings'
import { findEmail } from '@/db/queries/users'
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import { requireRink } from '@/lib/access/require-rink'
import type { ServiceContext } from '@/lib/context'
import { InvalidInputError, NotFoundError } from '@/lib/errors'
import { DAY_MILLIS } from '@/lib/physics/constants'
import type { InviteInput, OneInvitationInput } from '@/lib/schemas/people'
import { promiseInvitationMail } from './invitation-mail'
import { spend } from './rate-limits'

/** Long enough for somebody who reads mail on weekends. Ours. */
export const INVITATION_DAYS = 14
/** A club and its guests. Ours. */
export const MOST_PEOPLE = 100
/** Whoever has more in mind waits for the first answers. Ours. */
export const MOST_INVITATIONS = 30

const NOTHING_SENT = 'Nothing was sent.'

const expiryFrom = (now: Date) => new Date(now.getTime() + INVITATION_DAYS * DAY_MILLIS)

/** @throws InvalidInputError when this address is invited already, when it is one's own, or when there is no room. */
export async function invite(context: ServiceContext, { rinkId, email, role }: InviteInput): Promise<void> {
  const { db, now, viewer } = context
  const access = await requireRink(context, rinkId, 'manage')
  if (email === (await findEmail(db, viewer.userId))) {
    throw new InvalidInputError(NOTHING_SENT, { email: 'This is your own address.' })
  }
  await spendMail(context, rinkId, email)
  await db.transaction(async (trx) => {
    // Under the rink's lock, so that two who invite at once count each other's.
    await lockRink(trx, access)
    await requireRoom(trx, access)
    const invitation = { email, role, invitedBy: viewer.userId, expiresAt: expiryFrom(now) }
    const made = await insertInvitation(trx, access, invitation, now)
    if (!made) {
      throw new InvalidInputError(NOTHING_SENT, { email: 'This address is invited already. You can send it again.' })
    }
    await promiseInvitationMail(trx, { invitationId: made.id, invitedBy: viewer.userId }, now)
  })
}

async function spendMail(context: ServiceContext, rinkId: string, email: string): Promise<void> {
  await spend(context, 'inviteByUser', context.viewer.userId)
  await spend(context, 'inviteByRink', rinkId)
  await spend(context, 'inviteToEmail', email)
}

async function requireRoom(trx: Db, access: RinkAccess<'manage'>): Promise<void> {
  if ((await countMembers(trx, access)) >= MOST_PEOPLE) {
    throw new InvalidInputError(`${MOST_PEOPLE} people are on this rink, and it has room for no more.`)
  }
  if ((await countStandingInvitations(trx, access)) >= MOST_INVITATIONS) {
    throw new InvalidInputError(`${MOST_INVITATIONS} invitations wait for an answer. Take one back first.`)
  }
}

/** The same link in a new mail; its days start anew. @throws NotFoundError when it was taken or taken back. */
export async function sendInvitationAgain(context: ServiceContext, input: OneInvitationInput): Promise<void> {
  const { db, now, viewer } = context
  const { rinkId, invitationId } = input
  const access = await requireRink(context, rinkId, 'manage')
  const invitation = await findStandingInvitation(db, access, invitationId)
  if (!invitation) throw new NotFoundError('Invitation')
  await spendMail(context, rinkId, invitation.email)
  await db.transaction(async (trx) => {
    const renewal = { invitationId, invitedBy: viewer.userId, expiresAt: expiryFrom(now) }
    if (!(await renewInvitation(trx, access, renewal))) throw new NotFoundError('Invitation')
    await promiseInvitationMail(trx, renewal, now)
  })
}

/** Its link opens nothing any more. @throws NotFoundError when it was taken or taken back. */
export async function takeInvitationBack(context: ServiceContext, input: OneInvitationInput): Promise<void> {
  const access = await requireRink(context, input.rinkId, 'manage')
  if (!(await withdrawInvitation(context.db, access, input.invitationId, context.now))) {
    throw new NotFoundError('Invitation')
  }
}
