// The yard teaches the model: what people found is kept with its weather, and the yard's factors are learned from it.
import { enqueueRefresh } from '@/db/queries/jobs'
import { listFloodsSince } from '@/db/queries/floods'
import { countChange } from '@/db/queries/rink-settings'
import { findRinkForJudging, type RinkForJudging } from '@/db/queries/rinks'
import { findSheetBefore, type StoredSheet } from '@/db/queries/sheet-states'
import {
  findYardEstimate,
  listTellingEntries,
  listYardReports,
  putYardEstimate,
  putYardReport,
  type TellingEntry,
} from '@/db/queries/yards'
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import { MODEL_VERSION } from '@/lib/advice/judge'
import { learnYard } from '@/lib/advice/yard/learn'
import type { LearnedYard, YardReport } from '@/lib/advice/yard/types'
import { DAY_MILLIS, HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { weatherAsItCame } from './weather-as-it-came'
import { isSameYard, priorOf } from './yard-in-use'

/** The sheet's states are kept for three days, so an entry is looked at before. [h] */
const FRESH_HOURS = 66
/** A yard changes with its trees and boards: reports of one winter count. Ours. [d] */
const REPORTS_DAYS = 150
/** Hours after a report that a slow layer may still need. [h] */
const AHEAD_HOURS = 24
/** A drilled hole says something of the yard when the sheet has grown for a day since it was last known. Ours. [h] */
const GROWTH_HOURS = 24
/** An answer that names an earlier time than its own tells when the layer set; else only that it had. [min] Ours. */
const NAMED_MINUTES = 10

/**
 * Keeps what people found since the last look with its weather and sheet, learns the yard's factors from all of it, and has
 * the night judged anew when they moved. Repeating it changes nothing.
 *
 * @returns What was learned; null when there was nothing new.
 */
export async function learnRinkYard(
  { db, now }: { db: Db; now: Date },
  access: RinkAccess<'writeLog'>,
): Promise<LearnedYard | null> {
  const rink = await findRinkForJudging(db, access.rinkId)
  if (!rink) return null
  const before = await findYardEstimate(db, rink.id)
  const isNew = await keepReports(db, access, rink, now)
  if (!isNew && before && isSameYard(before.learned.prior, priorOf(rink))) return null
  const reports = await listYardReports(db, access, new Date(now.getTime() - REPORTS_DAYS * DAY_MILLIS))
  const { latitudeDeg, longitudeDeg } = rink
  const learned = learnYard({ latitudeDeg, longitudeDeg, prior: priorOf(rink), reports })
  const used = before?.learned ?? priorOf(rink)
  await db.transaction(async (trx) => {
    await putYardEstimate(trx, rink.id, { estimatedAt: now, modelVersion: MODEL_VERSION, learned })
    if (isSameYard(used, learned)) return
    await countChange(trx, access, now)
    await enqueueRefresh(trx, rink.id)
  })
  return learned
}

async function keepReports(db: Db, access: RinkAccess<'writeLog'>, rink: RinkForJudging, now: Date): Promise<boolean> {
  const entries = await listTellingEntries(db, access, new Date(now.getTime() - FRESH_HOURS * HOUR_MILLIS))
  let isNew = false
  for (const entry of entries) {
    const report = await reportOf(db, access, rink, entry)
    if (!report) continue
    await putYardReport(db, rink.id, entry, report)
    isNew = true
  }
  return isNew
}

async function reportOf(
  db: Db,
  access: RinkAccess<'writeLog'>,
  rink: RinkForJudging,
  entry: TellingEntry,
): Promise<YardReport | null> {
  const seenAt = entry.kind === 'reading' ? entry.happenedAt : (entry.outcomeAt ?? entry.happenedAt)
  const knownBy = entry.kind === 'reading' ? earlier(entry.happenedAt, GROWTH_HOURS) : entry.happenedAt
  const sheet = await findSheetBefore(db, rink.id, knownBy)
  if (!sheet || sheet.asOf < earlier(entry.happenedAt, 2 * FRESH_HOURS)) return null
  const from = new Date(Math.ceil(sheet.asOf.getTime() / HOUR_MILLIS) * HOUR_MILLIS)
  const hours = await weatherAsItCame(db, rink.gridCellId, { from, to: seenAt, aheadHours: AHEAD_HOURS })
  if (hours[0] === undefined || Date.parse(hours[0].time) !== from.getTime()) return null
  const floods = await listFloodsSince(db, access, from)
  const until = entry.kind === 'reading' ? seenAt : entry.happenedAt
  const situation = {
    hours,
    sheet: sheetOf(sheet, rink),
    poured: floods
      .filter(({ pouredAt }) => pouredAt <= until)
      .map((flood) => ({
        at: flood.pouredAt.toISOString(),
        layerMm: flood.layerMm,
        temperatureC: flood.waterTemperatureC,
      })),
    at: seenAt.toISOString(),
  }
  if (entry.kind === 'reading') return { kind: 'drilled', thicknessMm: entry.thicknessMm ?? 0, ...situation }
  // A later layer hides what became of this one.
  if (floods.some(({ pouredAt }) => pouredAt > entry.happenedAt && pouredAt < seenAt)) return null
  return { kind: layerKind(entry, seenAt), ...situation }
}

function layerKind({ outcome, updatedAt }: TellingEntry, seenAt: Date): 'set' | 'set_before' | 'wet' {
  if (outcome === 'wet') return 'wet'
  return updatedAt.getTime() - seenAt.getTime() > NAMED_MINUTES * MINUTE_MILLIS ? 'set' : 'set_before'
}

function sheetOf(sheet: StoredSheet, rink: RinkForJudging): YardReport['sheet'] {
  if (sheet.state && sheet.modelVersion === MODEL_VERSION) return { state: sheet.state }
  const { thicknessMm, temperatureC, snowCoverCm } = sheet
  return { thicknessMm, temperatureC, snowCoverCm, base: rink.base }
}

const earlier = (at: Date, hours: number) => new Date(at.getTime() - hours * HOUR_MILLIS)
