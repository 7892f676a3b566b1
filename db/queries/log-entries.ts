// Entries of the log, one by one, with what they said before each change.
import type { Db } from '@/db/knex'
import type { LogEntryRow } from '@/db/types'
import type { RinkAccess } from '@/lib/access/proofs'

export interface LogEntry {
  id: string
  kind: LogEntryRow['kind']
  happenedAt: Date
  nightDate: string
  /** Of a planned pass that was checked off. */
  passNumber: number | null
  layerMm: number | null
  waterL: number | null
  waterTemperatureC: number | null
  waterKind: LogEntryRow['water_kind']
  thicknessMm: number | null
  modelThicknessMm: number | null
  saidSetByAt: Date | null
  outcome: LogEntryRow['outcome']
  outcomeAt: Date | null
  note: string
  writtenBy: string | null
  by: string | null
  version: number
  updatedAt: Date
  deletedAt: Date | null
}

/** What a person can say and change. */
export type EntryValues = Pick<
  LogEntry,
  | 'happenedAt'
  | 'nightDate'
  | 'passNumber'
  | 'layerMm'
  | 'waterL'
  | 'waterTemperatureC'
  | 'waterKind'
  | 'thicknessMm'
  | 'modelThicknessMm'
  | 'saidSetByAt'
  | 'outcome'
  | 'outcomeAt'
  | 'note'
>

const VALUE_COLUMNS = {
  happenedAt: 'happened_at',
  nightDate: 'night_date',
  passNumber: 'pass_number',
  layerMm: 'layer_mm',
  waterL: 'water_l',
  waterTemperatureC: 'water_temperature_c',
  waterKind: 'water_kind',
  thicknessMm: 'thickness_mm',
  modelThicknessMm: 'model_thickness_mm',
  saidSetByAt: 'said_set_by_at',
  outcome: 'outcome',
  outcomeAt: 'outcome_at',
  note: 'note',
} as const satisfies Record<keyof EntryValues, keyof LogEntryRow>

/** For `select` from `log_entries as e`, left-joined with `users as u`. */
export const ENTRY_COLUMNS = {
  ...Object.fromEntries(Object.entries(VALUE_COLUMNS).map(([name, column]) => [name, `e.${column}`])),
  id: 'e.id',
  kind: 'e.kind',
  writtenBy: 'e.written_by',
  by: 'u.name',
  version: 'e.version',
  updatedAt: 'e.updated_at',
  deletedAt: 'e.deleted_at',
}

function toColumns(values: Partial<EntryValues>): Partial<LogEntryRow> {
  const named = Object.entries(values) as [keyof EntryValues, unknown][]
  return Object.fromEntries(named.map(([name, value]) => [VALUE_COLUMNS[name], value]))
}

export function entriesOf(db: Db, access: RinkAccess) {
  return db('log_entries as e').leftJoin('users as u', 'u.id', 'e.written_by').where('e.rink_id', access.rinkId)
}

/** @returns the new entry's id; undefined when one with this key was written before. */
export async function insertEntry(
  trx: Db,
  access: RinkAccess<'writeLog'>,
  entry: Partial<EntryValues> & { kind: LogEntry['kind']; entryKey: string; writtenBy: string },
  now: Date,
): Promise<string | undefined> {
  const { kind, entryKey, writtenBy, ...values } = entry
  const [row] = await trx('log_entries')
    .insert({
      ...toColumns(values),
      rink_id: access.rinkId,
      kind,
      entry_key: entryKey,
      written_by: writtenBy,
      created_at: now,
      updated_at: now,
    })
    .onConflict(['rink_id', 'entry_key'])
    .ignore()
    .returning('id')
  return row?.id
}

export async function findEntryIdByKey(db: Db, access: RinkAccess, entryKey: string): Promise<string | undefined> {
  const row = await db('log_entries').where({ rink_id: access.rinkId, entry_key: entryKey }).first('id')
  return row?.id
}

/** Deleted ones too. */
export async function findEntry(db: Db, access: RinkAccess, entryId: string): Promise<LogEntry | undefined> {
  return entriesOf(db, access).where('e.id', entryId).first<LogEntry | undefined>(ENTRY_COLUMNS)
}

/** The same, held until the transaction ends: of two changes at once the second sees the first. */
export async function lockEntry(
  trx: Db,
  access: RinkAccess<'writeLog'>,
  entryId: string,
): Promise<LogEntry | undefined> {
  return entriesOf(trx, access).where('e.id', entryId).forUpdate('e').first<LogEntry | undefined>(ENTRY_COLUMNS)
}

/** A pass of a night as it was checked off, held likewise. */
export async function lockPass(
  trx: Db,
  access: RinkAccess<'writeLog'>,
  pass: { nightDate: string; passNumber: number },
): Promise<LogEntry | undefined> {
  return entriesOf(trx, access)
    .where({ 'e.night_date': pass.nightDate, 'e.pass_number': pass.passNumber, 'e.deleted_at': null })
    .forUpdate('e')
    .first<LogEntry | undefined>(ENTRY_COLUMNS)
}

/** Changes a locked entry and keeps what it said before. */
export async function updateEntry(
  trx: Db,
  before: LogEntry,
  changes: Partial<EntryValues> & { deletedAt?: Date | null },
  { changedBy, now }: { changedBy: string; now: Date },
): Promise<void> {
  await trx('log_revisions').insert({
    entry_id: before.id,
    version: before.version,
    was: JSON.stringify(before),
    changed_by: changedBy,
    changed_at: now,
  })
  const { deletedAt, ...values } = changes
  await trx('log_entries')
    .where({ id: before.id })
    .update({
      ...toColumns(values),
      ...(deletedAt === undefined ? {} : { deleted_at: deletedAt }),
      version: before.version + 1,
      updated_at: now,
    })
}

/** Whether a planned pass of a night is in the log. */
export async function isPassLogged(
  trx: Db,
  access: RinkAccess,
  pass: Pick<LogEntry, 'nightDate' | 'passNumber'>,
): Promise<boolean> {
  if (pass.passNumber === null) return false
  const row = await trx('log_entries')
    .where({ rink_id: access.rinkId, night_date: pass.nightDate, pass_number: pass.passNumber, deleted_at: null })
    .first('id')
  return row !== undefined
}

export interface Revision {
  version: number
  /** As JSON keeps it: instants are text. */
  was: Omit<LogEntry, 'happenedAt' | 'saidSetByAt' | 'outcomeAt' | 'deletedAt'> & {
    happenedAt: string
    saidSetByAt: string | null
    outcomeAt: string | null
    deletedAt: string | null
  }
  changedBy: string | null
  changedAt: Date
}

/** What an entry said before each change, newest first. */
export async function listRevisions(db: Db, access: RinkAccess, entryId: string): Promise<Revision[]> {
  return db('log_revisions as v')
    .join('log_entries as e', 'e.id', 'v.entry_id')
    .leftJoin('users as u', 'u.id', 'v.changed_by')
    .where({ 'v.entry_id': entryId, 'e.rink_id': access.rinkId })
    .orderBy('v.version', 'desc')
    .select<Revision[]>({ version: 'v.version', was: 'v.was', changedBy: 'u.name', changedAt: 'v.changed_at' })
}
