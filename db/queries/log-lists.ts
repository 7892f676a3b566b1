// The log as people read it: night by night, filtered, and in one piece to take out.
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import { ENTRY_COLUMNS, entriesOf, type LogEntry } from './log-entries'

/** Nights are text, 'yyyy-MM-dd'; `from` and `to` belong to the span. */
export interface LogFilter {
  kind?: LogEntry['kind']
  person?: string
  from?: string
  to?: string
  before?: string
}

function filtered(db: Db, access: RinkAccess, { kind, person, from, to, before }: LogFilter) {
  const entries = entriesOf(db, access).whereNull('e.deleted_at')
  if (kind) entries.where('e.kind', kind)
  if (person) entries.where('e.written_by', person)
  if (from) entries.where('e.night_date', '>=', from)
  if (to) entries.where('e.night_date', '<=', to)
  if (before) entries.where('e.night_date', '<', before)
  return entries
}

/** Nights with entries, newest first. */
export async function listNights(db: Db, access: RinkAccess, filter: LogFilter, most: number): Promise<string[]> {
  const rows = await filtered(db, access, filter)
    .distinct<{ nightDate: string }[]>({ nightDate: 'e.night_date' })
    .orderBy('nightDate', 'desc')
    .limit(most)
  return rows.map(({ nightDate }) => nightDate)
}

/** Newest first. */
export async function listEntries(db: Db, access: RinkAccess, filter: LogFilter): Promise<LogEntry[]> {
  return filtered(db, access, filter)
    .orderBy([
      { column: 'e.happened_at', order: 'desc' },
      { column: 'e.created_at', order: 'desc' },
    ])
    .select<LogEntry[]>(ENTRY_COLUMNS)
}

/** Everybody who wrote into the log, members or not any more. */
export async function listWriters(db: Db, access: RinkAccess): Promise<{ id: string; name: string }[]> {
  return db('log_entries as e')
    .join('users as u', 'u.id', 'e.written_by')
    .where('e.rink_id', access.rinkId)
    .whereNull('e.deleted_at')
    .distinct<{ id: string; name: string }[]>({ id: 'u.id', name: 'u.name' })
    .orderBy('name')
}
