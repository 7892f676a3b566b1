// Who is on a rink, and what its keeper may change about that.
import { enqueueDecision } from '@/db/queries/jobs'
import { listStandingInvitations, withdrawInvitationsBy } from '@/db/queries/invitations'
import { changeRole as changeRoleRow, countKeepers, deleteMember, listMembers } from '@/db/queries/members'
import { getRinkHead } from '@/db/queries/rinks'
import type { Db } from '@/db/knex'
import { isGranted, type Role } from '@/lib/access/permissions'
import type { RinkAccess } from '@/lib/access/proofs'
import { requireRink } from '@/lib/access/require-rink'
import type { ServiceContext } from '@/lib/context'
import { InvalidInputError, NotFoundError } from '@/lib/errors'
import type { ChangeRoleInput, TakeOffInput } from '@/lib/schemas/people'
import { rinkIdSchema } from '@/lib/schemas/rinks'

export interface Person {
  userId: string
  name: string
  role: Role
  isViewer: boolean
}

export interface Invited {
  id: string
  email: string
  role: Role
  expiresAt: Date
  hasRunOut: boolean
  /** Its mail could not be delivered. */
  hasFailed: boolean
}

export interface People {
  rink: { id: string; name: string; timeZone: string }
  people: Person[]
  /** Whom the keeper waits for; null for everybody else. */
  invited: Invited[] | null
  isOnlyKeeper: boolean
}

/** @throws NotFoundError for strangers. */
export async function getPeople(context: ServiceContext, rinkId: string): Promise<People> {
  const { db, viewer } = context
  const access = await requireRink(context, rinkIdSchema.parse(rinkId), 'view')
  const [rink, members] = await Promise.all([getRinkHead(db, access), listMembers(db, access)])
  const people = members.map((member) => ({ ...member, isViewer: member.userId === viewer.userId }))
  const mayManage = people.some(({ isViewer, role }) => isViewer && isGranted(role, 'manage'))
  return {
    rink: { id: access.rinkId, ...rink },
    people,
    invited: mayManage ? await listInvited(context, access.rinkId) : null,
    isOnlyKeeper: mayManage && people.filter(({ role }) => role === 'keeper').length === 1,
  }
}

async function listInvited(context: ServiceContext, rinkId: string): Promise<Invited[]> {
  const access = await requireRink(context, rinkId, 'manage')
  const invitations = await listStandingInvitations(context.db, access)
  return invitations.map(({ mailState, ...invitation }) => ({
    ...invitation,
    hasRunOut: invitation.expiresAt <= context.now,
    hasFailed: mailState === 'dead' || mailState === 'expired',
  }))
}

/** Counted under the rink's lock: two keepers cannot both step back at once. */
async function requireKeeper(trx: Db, access: RinkAccess): Promise<void> {
  if ((await countKeepers(trx, access)) === 0) {
    throw new InvalidInputError('A rink needs a keeper. Make somebody else keeper first.')
  }
}

/** @throws InvalidInputError when nobody would keep the rink; NotFoundError for somebody who is not on it. */
export async function changeRole(context: ServiceContext, { rinkId, userId, role }: ChangeRoleInput): Promise<void> {
  const { db, now } = context
  const access = await requireRink(context, rinkId, 'manage')
  await db.transaction(async (trx) => {
    const before = await changeRoleRow(trx, access, userId, role)
    if (!before) throw new NotFoundError('Person')
    await requireKeeper(trx, access)
    if (!isGranted(role, 'manage')) await withdrawInvitationsBy(trx, access, userId, now)
    // Who may be told from now on shall not wait for the next forecast.
    if (!isGranted(before.role, 'receiveAlerts')) await enqueueDecision(trx, rinkId)
  })
}

/** What they wrote in the log stays. @throws InvalidInputError when nobody would keep the rink. */
export async function takeOff(context: ServiceContext, { rinkId, userId }: TakeOffInput): Promise<void> {
  const access = await requireRink(context, rinkId, 'manage')
  await context.db.transaction(async (trx) => {
    if (!(await deleteMember(trx, access, userId, context.now))) throw new NotFoundError('Person')
    await requireKeeper(trx, access)
  })
}
