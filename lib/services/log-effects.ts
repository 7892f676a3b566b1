// What an entry of the log does to the model: floods are poured onto the sheet, readings and swept snow set where it starts from.
import { enqueueRefresh } from '@/db/queries/jobs'
import type { LogEntry } from '@/db/queries/log-entries'
import {
  deleteModelledSheetsFrom,
  deleteReportedSheet,
  findHourOfSheet,
  findReadingSince,
  findSheetBetween,
  listSheetEntriesAt,
  listSweptBetween,
} from '@/db/queries/log-sheets'
import { insertReportedSheet } from '@/db/queries/sheet-states'
import type { Db } from '@/db/knex'
import { countChange } from '@/db/queries/rink-settings'
import type { RinkAccess } from '@/lib/access/proofs'
import { REPORTED } from '@/lib/advice/thresholds'
import { HOUR_MILLIS } from '@/lib/physics/constants'

/** What was last known of a sheet stands in for the hour this long. [h] Ours, as long as modelled sheets are kept. */
const LOOK_BACK_HOURS = 72
/** A reading outweighs what the model grew since for a day. [h] Ours. */
const OUTWEIGHS_HOURS = 24

type Told = Pick<LogEntry, 'kind' | 'happenedAt'>

interface Sheet {
  thicknessMm: number
  temperatureC: number
  snowCoverCm: number
}

const hoursBefore = (at: Date, hours: number) => new Date(at.getTime() - hours * HOUR_MILLIS)
const setsSheet = ({ kind }: Told) => kind === 'reading' || kind === 'clear' || kind === 'scrape'

/**
 * The sheet as the model has it for an instant: the hour of the newest outlook, unless somebody measured since that was
 * judged; without an outlook of that hour the newest sheet on record before it.
 *
 * @param isOutlookTrue false when the outlook rests on a reading that is no longer so.
 */
export async function modelSheetAt(
  db: Db,
  access: RinkAccess,
  at: Date,
  isOutlookTrue = true,
): Promise<Sheet | undefined> {
  const hour = isOutlookTrue ? await findHourOfSheet(db, access, at) : undefined
  const known = hour?.sheet ?? (await findSheetBetween(db, access, { from: hoursBefore(at, LOOK_BACK_HOURS), to: at }))
  const measured = await findReadingSince(db, access, {
    from: hoursBefore(at, OUTWEIGHS_HOURS),
    to: at,
    writtenSince: hour?.judgedAt ?? new Date(0),
  })
  const thicknessMm = measured ?? known?.thicknessMm
  if (thicknessMm === undefined) return undefined
  return {
    thicknessMm,
    temperatureC: Math.min(0, known?.temperatureC ?? REPORTED.iceTemperatureC),
    snowCoverCm: known?.snowCoverCm ?? 0,
  }
}

/**
 * Makes the reported sheet of an instant what the log says of it. A reading gives the thickness, with temperature and
 * snow from the model; clearing and scraping take the snow off and leave the model's thickness and temperature. Where
 * nothing is known of the sheet, sweeping it says nothing of how thick it is.
 */
async function reportSheetAt(trx: Db, access: RinkAccess<'writeLog'>, at: Date, isOutlookTrue: boolean): Promise<void> {
  const entries = await listSheetEntriesAt(trx, access, at)
  await deleteReportedSheet(trx, access, at)
  if (entries.length === 0) return
  const model = await modelSheetAt(trx, access, at, isOutlookTrue)
  const thicknessMm = entries.findLast(({ kind }) => kind === 'reading')?.thicknessMm ?? model?.thicknessMm
  if (thicknessMm === undefined) return
  const isSwept = entries.some(({ kind }) => kind !== 'reading')
  const temperatureC = thicknessMm > 0 ? (model?.temperatureC ?? REPORTED.iceTemperatureC) : 0
  const snowCoverCm = isSwept ? 0 : (model?.snowCoverCm ?? 0)
  await insertReportedSheet(trx, access.rinkId, { thicknessMm, temperatureC, snowCoverCm }, at)
}

/** Readings that are no longer so leave marks: where the model went from them, and what was swept after them. */
async function forgetReadings(trx: Db, access: RinkAccess<'writeLog'>, before: Told | undefined, now: Date) {
  if (before?.kind !== 'reading' || before.happenedAt < hoursBefore(now, LOOK_BACK_HOURS)) return false
  // A run takes a reported sheet from the start of its hour on.
  const hourMillis = Math.floor(before.happenedAt.getTime() / HOUR_MILLIS) * HOUR_MILLIS
  await deleteModelledSheetsFrom(trx, access, new Date(hourMillis))
  return true
}

/**
 * Brings the model in line with the log and has the night judged again, in the transaction of the entry.
 *
 * @param before What the entry was; undefined for a new or restored one.
 * @param after What it is; undefined for a deleted one.
 */
export async function followLog(
  trx: Db,
  access: RinkAccess<'writeLog'>,
  { before, after }: { before?: Told; after?: Told },
  now: Date,
): Promise<void> {
  const told = [before, after].filter((entry) => entry !== undefined)
  if (!told.some((entry) => entry.kind === 'flood' || setsSheet(entry))) return
  const isForgotten = await forgetReadings(trx, access, before, now)
  const instants = new Map(told.filter(setsSheet).map((entry) => [entry.happenedAt.getTime(), entry]))
  for (const { kind, happenedAt } of instants.values()) {
    await reportSheetAt(trx, access, happenedAt, !isForgotten)
    if (kind !== 'reading') continue
    const swept = await listSweptBetween(trx, access, { after: happenedAt, to: now })
    for (const at of swept) await reportSheetAt(trx, access, at, !isForgotten)
  }
  await countChange(trx, access, now)
  await enqueueRefresh(trx, access.rinkId)
}
