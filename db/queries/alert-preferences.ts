// How each member of a rink wants to be told. A member who never chose has the defaults of the table.
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import type { Role } from '@/lib/access/permissions'
import type { Units } from '@/lib/units'
import { unitsColumn } from './unit-columns'

export interface AlertPreferences {
  /** "HH:MM" in the rink's zone. */
  tellAt: string
  wantsEmail: boolean
  wantsPush: boolean
  /** Silent up to and including this night. */
  mutedThroughDate: string | null
}

export interface AlertRecipient extends AlertPreferences {
  userId: string
  role: Role
  name: string
  email: string
  isEmailVerified: boolean
  isEmailRefused: boolean
  units: Units
  clock: '12' | '24'
}

export const DEFAULT_PREFERENCES: AlertPreferences = {
  tellAt: '15:30',
  wantsEmail: true,
  wantsPush: true,
  mutedThroughDate: null,
}

const CHOICE = {
  tellAt: 'tell_at',
  wantsEmail: 'wants_email',
  wantsPush: 'wants_push',
  mutedThroughDate: 'muted_through',
} as const

export async function findAlertPreferences(
  db: Db,
  access: RinkAccess,
  userId: string,
): Promise<AlertPreferences | undefined> {
  return db('alert_preferences').where({ rink_id: access.rinkId, user_id: userId }).first(CHOICE)
}

/** Everybody on the rink with how they want to be told; who may be told is for lib/access to say. */
export async function listAlertRecipients(db: Db, access: RinkAccess): Promise<AlertRecipient[]> {
  const rows = await db('rink_members as m')
    .join('users as u', 'u.id', 'm.user_id')
    .leftJoin('alert_preferences as p', (on) => on.on('p.rink_id', 'm.rink_id').andOn('p.user_id', 'm.user_id'))
    .where('m.rink_id', access.rinkId)
    .orderBy('u.id')
    .select({
      userId: 'u.id',
      role: 'm.role',
      name: 'u.name',
      email: 'u.email',
      emailVerifiedAt: 'u.email_verified_at',
      emailRefusedAt: 'u.email_refused_at',
      units: unitsColumn(db, 'u'),
      clock: 'u.clock',
      tellAt: 'p.tell_at',
      wantsEmail: 'p.wants_email',
      wantsPush: 'p.wants_push',
      mutedThroughDate: 'p.muted_through',
    })
  return rows.map(({ emailVerifiedAt, emailRefusedAt, tellAt, wantsEmail, wantsPush, ...row }) => ({
    ...row,
    isEmailVerified: emailVerifiedAt !== null,
    isEmailRefused: emailRefusedAt !== null,
    tellAt: tellAt ?? DEFAULT_PREFERENCES.tellAt,
    wantsEmail: wantsEmail ?? DEFAULT_PREFERENCES.wantsEmail,
    wantsPush: wantsPush ?? DEFAULT_PREFERENCES.wantsPush,
  }))
}

/** Writes the given choices and leaves the others as they are. */
export async function putAlertPreferences(
  db: Db,
  access: RinkAccess,
  userId: string,
  choice: Partial<AlertPreferences>,
  now: Date,
): Promise<void> {
  const columns = Object.entries(CHOICE).filter(([key]) => choice[key as keyof AlertPreferences] !== undefined)
  const row = Object.fromEntries(columns.map(([key, column]) => [column, choice[key as keyof AlertPreferences]]))
  await db('alert_preferences')
    .insert({ rink_id: access.rinkId, user_id: userId, ...row, updated_at: now })
    .onConflict(['rink_id', 'user_id'])
    .merge({ ...row, updated_at: now })
}

/** Whether the person is a member still; switching off what is off already changes nothing. */
export async function turnEmailOff(
  db: Db,
  { rinkId, userId }: { rinkId: string; userId: string },
  now: Date,
): Promise<boolean> {
  const result = await db.raw(
    `insert into alert_preferences (rink_id, user_id, wants_email, updated_at)
     select rink_id, user_id, false, :now from rink_members where rink_id = :rinkId and user_id = :userId
     on conflict (rink_id, user_id) do update set wants_email = false, updated_at = excluded.updated_at`,
    { rinkId, userId, now },
  )
  return result.rowCount === 1
}

/** For the page behind a mail's unsubscribe link; undefined when the person has left the rink. */
export async function findMailChoice(
  db: Db,
  { rinkId, userId }: { rinkId: string; userId: string },
): Promise<{ rinkName: string; wantsEmail: boolean } | undefined> {
  const row = await db('rink_members as m')
    .join('rinks as r', 'r.id', 'm.rink_id')
    .leftJoin('alert_preferences as p', (on) => on.on('p.rink_id', 'm.rink_id').andOn('p.user_id', 'm.user_id'))
    .where('m.rink_id', rinkId)
    .where('m.user_id', userId)
    .first({ rinkName: 'r.name', wantsEmail: 'p.wants_email' })
  return row && { rinkName: row.rinkName, wantsEmail: row.wantsEmail ?? DEFAULT_PREFERENCES.wantsEmail }
}
