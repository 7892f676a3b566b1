// Everything that is stored about a person, for themselves: no password, no token, no key.
import type { Db } from '@/db/knex'
import { unitsColumn } from './unit-columns'

const TABLES_OF_A_RINK = [
  'water_sources',
  'available_hours',
  'log_entries',
  'fills',
  'own_passes',
  'night_outcomes',
  'advised_windows',
] as const

const TABLES_OF_A_FILL = ['fill_sessions', 'fill_checks'] as const

/** Columns that only the machine reads. */
const LEFT_OUT = [
  'rink_id',
  'outlook_id',
  'forecast_id',
  'entry_key',
  'written_by',
  'started_by',
  'checked_by',
  'changed_by',
]

export async function readAccountForExport(db: Db, userId: string): Promise<Record<string, unknown>> {
  const [account] = await db('users')
    .where({ id: userId })
    .select([
      'email',
      'name',
      'clock',
      'theme',
      'created_at',
      'email_verified_at',
      'deletion_due_at',
      unitsColumn(db, 'users').wrap('', ' as units'),
    ])
  const devices = await db('push_subscriptions')
    .where({ user_id: userId })
    .select([db.raw(`split_part(endpoint, '/', 3) as push_service`), 'created_at', 'disabled_at', 'disabled_reason'])
  const sessions = await db('sessions').where({ user_id: userId }).select('device', 'created_at', 'last_seen_at')
  const messages = await db('messages')
    .where({ user_id: userId })
    .orderBy('created_at')
    // A link's id opens nothing, but it is nothing to read either.
    .select(['kind', 'channel', 'night_date', 'state', 'created_at', 'settled_at', db.raw(`content->'words' as words`)])
  const invitations = await db('invitations as i')
    .join('rinks as r', 'r.id', 'i.rink_id')
    .where({ 'i.invited_by': userId })
    .orderBy('i.created_at')
    .select('r.name as rink', 'i.email', 'i.role', 'i.created_at', 'i.expires_at', 'i.taken_at', 'i.withdrawn_at')
  return { account, devices, sessions, messages, invitations, rinks: await rinksOf(db, userId) }
}

function readable(row: Record<string, unknown>): Record<string, unknown> {
  return Object.fromEntries(Object.entries(row).filter(([key]) => !LEFT_OUT.includes(key)))
}

async function rinksOf(db: Db, userId: string): Promise<unknown[]> {
  const memberships = await db('rink_members').where({ user_id: userId }).orderBy('joined_at')
  const rinks: unknown[] = []
  for (const { rink_id, role, joined_at } of memberships) {
    const [rink] = await db('rinks').where({ id: rink_id }).select()
    const { created_by: _createdBy, creation_key: _creationKey, grid_cell_id: _cellId, ...settings } = rink ?? {}
    const alerts = await db('alert_preferences')
      .where({ rink_id, user_id: userId })
      .select('tell_at', 'wants_email', 'wants_push', 'muted_through')
    const parts: Record<string, unknown> = {}
    for (const table of TABLES_OF_A_RINK) {
      const rows = await db<Record<string, unknown>>(table).where({ rink_id }).select()
      parts[table] = rows.map(readable)
    }
    for (const table of TABLES_OF_A_FILL) {
      const fills = db('fills').where({ rink_id }).select('id')
      parts[table] = (await db<Record<string, unknown>>(table).whereIn('fill_id', fills).select()).map(readable)
    }
    rinks.push({ role, joined_at, settings, alerts: alerts[0] ?? null, ...parts })
  }
  return rinks
}
