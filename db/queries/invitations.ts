// Invitations to a rink: sent, taken back, taken. "Standing" is one that was neither taken nor taken back.
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import type { Role } from '@/lib/access/permissions'
import type { MessageState } from './messages'

const standing = (db: Db) => db('invitations').whereNull('taken_at').whereNull('withdrawn_at')

/** @returns undefined when one to this address stands; one that has run out makes room. */
export async function insertInvitation(
  trx: Db,
  access: RinkAccess<'manage'>,
  invitation: { email: string; role: Role; invitedBy: string; expiresAt: Date },
  now: Date,
): Promise<{ id: string } | undefined> {
  const { email, role, invitedBy, expiresAt } = invitation
  await standing(trx)
    .where({ rink_id: access.rinkId, email })
    .where('expires_at', '<=', now)
    .update({ withdrawn_at: now })
  const [row] = await trx('invitations')
    .insert({ rink_id: access.rinkId, email, role, invited_by: invitedBy, created_at: now, expires_at: expiresAt })
    .onConflict(trx.raw('(rink_id, email) where taken_at is null and withdrawn_at is null'))
    .ignore()
    .returning('id')
  return row
}

export async function findStandingInvitation(
  db: Db,
  access: RinkAccess<'manage'>,
  invitationId: string,
): Promise<{ email: string } | undefined> {
  return standing(db).where({ rink_id: access.rinkId, id: invitationId }).first('email')
}

/** Its time starts anew, and it is now the invitation of whoever sent it again. @returns false when it stands no more. */
export async function renewInvitation(
  trx: Db,
  access: RinkAccess<'manage'>,
  { invitationId, invitedBy, expiresAt }: { invitationId: string; invitedBy: string; expiresAt: Date },
): Promise<boolean> {
  const renewed = await standing(trx)
    .where({ rink_id: access.rinkId, id: invitationId })
    .update({ invited_by: invitedBy, expires_at: expiresAt })
  return renewed === 1
}

/** @returns false when it stands no more. */
export async function withdrawInvitation(
  db: Db,
  access: RinkAccess<'manage'>,
  invitationId: string,
  now: Date,
): Promise<boolean> {
  const withdrawn = await standing(db).where({ rink_id: access.rinkId, id: invitationId }).update({ withdrawn_at: now })
  return withdrawn === 1
}

/** Who may invite no more has no invitations out. */
export async function withdrawInvitationsBy(trx: Db, access: RinkAccess, userId: string, now: Date): Promise<void> {
  await standing(trx).where({ rink_id: access.rinkId, invited_by: userId }).update({ withdrawn_at: now })
}

export interface StandingInvitation {
  id: string
  email: string
  role: Role
  expiresAt: Date
  /** Of its newest mail. */
  mailState: MessageState
}

/** Oldest first, those that have run out too. */
export async function listStandingInvitations(db: Db, access: RinkAccess<'manage'>): Promise<StandingInvitation[]> {
  const newestMail = db('messages as m')
    .whereRaw(`m.user_id = i.invited_by and m.kind = 'rink-invitation' and m.content->>'invitationId' = i.id::text`)
    .orderBy('m.created_at', 'desc')
    .limit(1)
    .select('m.state')
  return db('invitations as i')
    .where({ 'i.rink_id': access.rinkId })
    .whereNull('i.taken_at')
    .whereNull('i.withdrawn_at')
    .orderBy(['i.created_at', 'i.id'])
    .select({ id: 'i.id', email: 'i.email', role: 'i.role', expiresAt: 'i.expires_at', mailState: newestMail })
}

export async function countStandingInvitations(db: Db, access: RinkAccess<'manage'>): Promise<number> {
  const row = await standing(db).where({ rink_id: access.rinkId }).count({ invitations: '*' }).first()
  return Number(row?.invitations ?? 0)
}

export interface InvitationToAnswer {
  rinkId: string
  rinkName: string
  inviterName: string
  email: string
  role: Role
  expiresAt: Date
  takenAt: Date | null
  withdrawnAt: Date | null
}

/** Needs no proof: whoever asks holds the key that was mailed, or sent it. */
export async function findInvitation(db: Db, invitationId: string): Promise<InvitationToAnswer | undefined> {
  return db('invitations as i')
    .join('rinks as r', 'r.id', 'i.rink_id')
    .join('users as u', 'u.id', 'i.invited_by')
    .where({ 'i.id': invitationId })
    .first({
      rinkId: 'i.rink_id',
      rinkName: 'r.name',
      inviterName: 'u.name',
      email: 'i.email',
      role: 'i.role',
      expiresAt: 'i.expires_at',
      takenAt: 'i.taken_at',
      withdrawnAt: 'i.withdrawn_at',
    })
}

/** The newest to an address that its owner has confirmed. */
export async function findInvitationTo(db: Db, email: string, now: Date): Promise<{ id: string } | undefined> {
  return standing(db).where({ email }).where('expires_at', '>', now).orderBy('created_at', 'desc').first('id')
}

/** Uses an invitation up: of two who try at once, one gets the role and the other nothing. */
export async function takeInvitation(
  trx: Db,
  invitationId: string,
  userId: string,
  now: Date,
): Promise<{ rinkId: string; role: Role } | undefined> {
  const [taken] = await standing(trx)
    .where({ id: invitationId })
    .where('expires_at', '>', now)
    .update({ taken_at: now, taken_by: userId })
    .returning(['rink_id', 'role'])
  return taken && { rinkId: taken.rink_id, role: taken.role }
}
