// The log to take along: CSV as RFC 4180 has it, safe to open in a spreadsheet, or JSON. SI units, named in the headings.
import { stringify } from 'csv-stringify/sync'
import { roundToNearestMinutes } from 'date-fns'
import { formatInTimeZone } from 'date-fns-tz'
import { listEntries } from '@/db/queries/log-lists'
import type { LogEntry } from '@/db/queries/log-entries'
import { getRinkHead } from '@/db/queries/rinks'
import { requireRink } from '@/lib/access/require-rink'
import { seasonOfYear } from '@/lib/advice/season'
import type { ServiceContext } from '@/lib/context'
import type { LogExportQuery } from '@/lib/schemas/log-query'
import { spend } from './rate-limits'

export interface LogFile {
  name: string
  contentType: string
  body: string
}

const iso = (at: Date | null) => at?.toISOString() ?? null

/** What was typed in other units is kept to the last bit of them; a reader of the file wants the figure. */
const figure = (value: number | null, decimals: number) => (value === null ? null : Number(value.toFixed(decimals)))

/** One entry under the headings of the file. Local times carry their offset, so that a doubled hour stays two. */
function toRecord(entry: LogEntry, timeZone: string) {
  return {
    id: entry.id,
    kind: entry.kind,
    happened_at_utc: iso(entry.happenedAt),
    happened_at_local: formatInTimeZone(roundToNearestMinutes(entry.happenedAt), timeZone, 'yyyy-MM-dd HH:mm xxx'),
    time_zone: timeZone,
    night_date: entry.nightDate,
    pass_number: entry.passNumber,
    layer_mm: figure(entry.layerMm, 2),
    water_l: figure(entry.waterL, 1),
    water_temperature_c: figure(entry.waterTemperatureC, 1),
    water_source: entry.waterKind,
    ice_thickness_mm: figure(entry.thicknessMm, 1),
    model_ice_thickness_mm: figure(entry.modelThicknessMm, 1),
    said_set_by_utc: iso(entry.saidSetByAt),
    outcome: entry.outcome,
    outcome_at_utc: iso(entry.outcomeAt),
    note: entry.note,
    written_by: entry.by,
    version: entry.version,
  }
}

type LogRecord = ReturnType<typeof toRecord>

const HEADINGS: (keyof LogRecord)[] = [
  'id',
  'kind',
  'happened_at_utc',
  'happened_at_local',
  'time_zone',
  'night_date',
  'pass_number',
  'layer_mm',
  'water_l',
  'water_temperature_c',
  'water_source',
  'ice_thickness_mm',
  'model_ice_thickness_mm',
  'said_set_by_utc',
  'outcome',
  'outcome_at_utc',
  'note',
  'written_by',
  'version',
]

/** The byte order mark tells spreadsheets that it is UTF-8. */
function toCsv(records: readonly LogRecord[]): string {
  return stringify([...records], {
    header: true,
    columns: HEADINGS,
    record_delimiter: 'windows',
    bom: true,
    escape_formulas: true,
  })
}

/** Every entry that stands, oldest first. @throws RateLimitedError; NotFoundError for strangers */
export async function exportLog(context: ServiceContext, rinkId: string, query: LogExportQuery): Promise<LogFile> {
  const access = await requireRink(context, rinkId, 'view')
  const { db, now, viewer } = context
  await spend(context, 'exportByUser', viewer.userId)
  const rink = await getRinkHead(db, access)
  const span = query.season === undefined ? {} : seasonOfYear(query.season)
  const records = (await listEntries(db, access, span)).reverse().map((entry) => toRecord(entry, rink.timeZone))
  const name = `${fileName(rink.name)}-log${query.season === undefined ? '' : `-${query.season}`}.${query.format}`
  if (query.format === 'csv') return { name, contentType: 'text/csv; charset=utf-8', body: toCsv(records) }
  const body = { rink: rink.name, timeZone: rink.timeZone, exportedAt: now.toISOString(), entries: records }
  return { name, contentType: 'application/json; charset=utf-8', body: `${JSON.stringify(body, null, 2)}\n` }
}

/** Plain letters only: the name travels in a header. */
function fileName(rinkName: string): string {
  const plain = rinkName
    .normalize('NFKD')
    .replace(/[^A-Za-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
  return plain.toLowerCase() || 'rink'
}
