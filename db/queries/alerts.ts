// Who wants to hear about a rink, and what they heard of a night.
import type { Db } from '@/db/knex'
import type { AlertKind } from '@/lib/advice/alert-due'

export interface AlertRecipient {
  userId: string
  units: 'metric' | 'imperial'
  clock: '12' | '24'
  tellAt: string
  mutedThrough: string | null
  wantsEmail: boolean
  /** Wants push and has a device that takes it. */
  wantsPush: boolean
}

/** Keepers and crew of a rink whose address is confirmed and who want at least one channel. */
export async function listAlertRecipients(db: Db, rinkId: string): Promise<AlertRecipient[]> {
  return db('alert_preferences as p')
    .join('rink_members as m', (join) => join.on('m.rink_id', 'p.rink_id').andOn('m.user_id', 'p.user_id'))
    .join('users as u', 'u.id', 'p.user_id')
    .where('p.rink_id', rinkId)
    .whereIn('m.role', ['keeper', 'crew'])
    .whereNotNull('u.email_verified_at')
    .where((wants) => wants.where('p.wants_email', true).orWhere('p.wants_push', true))
    .orderBy('p.user_id')
    .select({
      userId: 'p.user_id',
      units: 'u.units',
      clock: 'u.clock',
      tellAt: 'p.tell_at',
      mutedThrough: 'p.muted_through',
      wantsEmail: 'p.wants_email',
    })
    .select<AlertRecipient[]>(
      db.raw(`p.wants_push and exists (
        select 1 from push_subscriptions s where s.user_id = p.user_id and s.disabled_at is null) as "wantsPush"`),
    )
}

export interface ToldAlert {
  userId: string
  kind: AlertKind
  version: number
}

/** Alerts promised for a night, newest window version first; a change told on two channels counts once. */
export async function listToldAlerts(db: Db, rinkId: string, nightDate: string): Promise<ToldAlert[]> {
  return db('messages as m')
    .join('advised_windows as w', 'w.id', 'm.window_id')
    .where({ 'm.rink_id': rinkId })
    .where('m.night_date', nightDate)
    .distinct<ToldAlert[]>({ userId: 'm.user_id', kind: 'm.kind', version: 'w.version' })
    .orderBy('version', 'desc')
}
