// Who belongs to a rink, and as what.
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import type { Role } from '@/lib/access/permissions'
import { withdrawInvitationsBy } from './invitations'
import { lockRink } from './rink-settings'

export interface MemberRow {
  userId: string
  name: string
  role: Role
}

const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/i

/** Needs no proof: it is what proofs are made from. An id that is no UUID belongs to nothing. */
export async function findMembership(
  db: Db,
  { rinkId, userId }: { rinkId: string; userId: string },
): Promise<{ role: Role } | undefined> {
  if (!UUID.test(rinkId)) return undefined
  return db('rink_members').where({ rink_id: rinkId, user_id: userId }).first('role')
}

export async function listMembers(db: Db, access: RinkAccess): Promise<MemberRow[]> {
  return db('rink_members as m')
    .join('users as u', 'u.id', 'm.user_id')
    .where('m.rink_id', access.rinkId)
    .orderBy(['m.joined_at', 'u.id'])
    .select({ userId: 'u.id', name: 'u.name', role: 'm.role' })
}

/** Adds somebody to a rink; who is on it already stays as they are. */
export async function insertMember(
  db: Db,
  member: { rinkId: string; userId: string; role: Role },
  now: Date,
): Promise<void> {
  await db('rink_members')
    .insert({ rink_id: member.rinkId, user_id: member.userId, role: member.role, joined_at: now })
    .onConflict(['rink_id', 'user_id'])
    .ignore()
}

/**
 * Their choice of alerts and the invitations that they sent go along.
 *
 * @returns what they were, undefined when they had left already.
 */
export async function deleteMember(
  trx: Db,
  access: RinkAccess,
  userId: string,
  now: Date,
): Promise<{ role: Role } | undefined> {
  // The rink's lock first: of two keepers who leave at once, the second sees that the first is gone.
  await lockRink(trx, access)
  await trx('alert_preferences').where({ rink_id: access.rinkId, user_id: userId }).delete()
  await withdrawInvitationsBy(trx, access, userId, now)
  const [left] = await trx('rink_members').where({ rink_id: access.rinkId, user_id: userId }).delete('role')
  return left && { role: left.role }
}

/** @returns what they were before, undefined when they are not on the rink. */
export async function changeRole(
  trx: Db,
  access: RinkAccess<'manage'>,
  userId: string,
  role: Role,
): Promise<{ role: Role } | undefined> {
  await lockRink(trx, access)
  const before = await findMembership(trx, { rinkId: access.rinkId, userId })
  await trx('rink_members').where({ rink_id: access.rinkId, user_id: userId }).update({ role })
  return before
}

export async function countMembers(db: Db, access: RinkAccess): Promise<number> {
  const row = await db('rink_members').where({ rink_id: access.rinkId }).count({ members: '*' }).first()
  return Number(row?.members ?? 0)
}

export async function countKeepers(db: Db, access: RinkAccess): Promise<number> {
  const row = await db('rink_members').where({ rink_id: access.rinkId, role: 'keeper' }).count({ keepers: '*' }).first()
  return Number(row?.keepers ?? 0)
}
