// What the model made of a forecast for one rink: the outlook and its scored hours.
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import type { NightRuns } from '@/lib/advice/night-runs'
import type { NightSummary } from '@/lib/advice/night-summary'
import type { Judgement, ScoredHour } from '@/lib/advice/types'
import type { WhatWouldTurn } from '@/lib/advice/what-would-change'

/** A judgement without its hours. What is optional is absent in outlooks from before it was asked. */
export type Advice = Pick<Judgement, 'windows' | 'plan' | 'fill' | 'thaws'> & {
  wouldTurn?: WhatWouldTurn[]
  otherNights?: NightRuns[]
}

export interface StoredOutlook {
  id: string
  forecastId: string
  settingsVersion: number
  modelVersion: string
  judgedAt: Date
  nightDate: string
  summary: NightSummary
  advice: Advice
}

export interface NewOutlook extends Omit<StoredOutlook, 'id'> {
  rinkId: string
  /** The hour it was judged in. */
  slotAt: Date
  timeZone: string
}

const COLUMNS = {
  id: 'id',
  forecastId: 'forecast_id',
  settingsVersion: 'settings_version',
  modelVersion: 'model_version',
  judgedAt: 'judged_at',
  nightDate: 'night_date',
  summary: 'summary',
  advice: 'advice',
}

/** Stores an outlook once per forecast, settings and hour; undefined when another worker was first. */
export async function insertOutlook(trx: Db, outlook: NewOutlook): Promise<string | undefined> {
  const [row] = await trx('outlooks')
    .insert({
      rink_id: outlook.rinkId,
      forecast_id: outlook.forecastId,
      settings_version: outlook.settingsVersion,
      model_version: outlook.modelVersion,
      judged_at: outlook.judgedAt,
      slot_at: outlook.slotAt,
      time_zone: outlook.timeZone,
      night_date: outlook.nightDate,
      verdict: outlook.summary.verdict,
      summary: JSON.stringify(outlook.summary),
      advice: JSON.stringify(outlook.advice),
    })
    .onConflict(['rink_id', 'forecast_id', 'settings_version', 'slot_at'])
    .ignore()
    .returning('id')
  return row?.id
}

/** True when this forecast was judged for these settings in this hour. */
export async function hasOutlook(
  db: Db,
  key: { rinkId: string; forecastId: string; settingsVersion: number; slotAt: Date },
): Promise<boolean> {
  const row = await db('outlooks')
    .where({
      rink_id: key.rinkId,
      forecast_id: key.forecastId,
      settings_version: key.settingsVersion,
      slot_at: key.slotAt,
    })
    .first('id')
  return row !== undefined
}

function toRow(outlookId: string, hour: ScoredHour) {
  const { parts, weather, limits, sheet, isAvailable } = hour
  return {
    outlook_id: outlookId,
    starts_at: hour.time,
    is_known: hour.isKnown,
    net_heat_loss_wm2: hour.netHeatLossWm2,
    freeze_rate_mm_per_h: hour.freezeRateMmPerH,
    wind_chill_c: hour.windChillC,
    sets_at: hour.setsAt,
    fill_score: hour.scores.fill,
    flood_score: hour.scores.flood,
    hold_score: hour.scores.hold,
    verdict: hour.verdict,
    reasons: hour.reasons,
    detail: { parts, weather, limits, sheet, isAvailable },
  }
}

/** All hours in one statement: ten days of them for every rink, every hour. */
export async function insertScoredHours(trx: Db, outlookId: string, hours: readonly ScoredHour[]): Promise<void> {
  await trx.raw(
    `insert into scored_hours
     select * from jsonb_populate_recordset(null::scored_hours, :rows::jsonb)`,
    { rows: JSON.stringify(hours.map((hour) => toRow(outlookId, hour))) },
  )
}

/** The outlook that stands for a rink. */
export async function findNewestOutlook(db: Db, access: RinkAccess): Promise<StoredOutlook | undefined> {
  return db('outlooks')
    .where({ rink_id: access.rinkId })
    .orderBy([
      { column: 'judged_at', order: 'desc' },
      { column: 'settings_version', order: 'desc' },
    ])
    .first<StoredOutlook | undefined>(COLUMNS)
}

interface HourRow {
  time: string
  isKnown: boolean
  netHeatLossWm2: number | null
  freezeRateMmPerH: number | null
  windChillC: number | null
  setsAt: string | null
  fill: number
  flood: number
  hold: number
  verdict: ScoredHour['verdict']
  reasons: ScoredHour['reasons']
  detail: Pick<ScoredHour, 'parts' | 'weather' | 'limits' | 'sheet' | 'isAvailable'>
}

/** Scored hours of an outlook, in order, in the shape the model gave them. */
export async function listScoredHours(db: Db, outlookId: string): Promise<ScoredHour[]> {
  const { rows } = await db.raw<{ rows: HourRow[] }>(
    `select to_char(starts_at at time zone 'UTC', :iso) as time, is_known as "isKnown",
            net_heat_loss_wm2 as "netHeatLossWm2", freeze_rate_mm_per_h as "freezeRateMmPerH",
            wind_chill_c as "windChillC", to_char(sets_at at time zone 'UTC', :iso) as "setsAt",
            fill_score as fill, flood_score as flood, hold_score as hold, verdict, reasons, detail
     from scored_hours where outlook_id = :outlookId order by starts_at`,
    { outlookId, iso: 'YYYY-MM-DD"T"HH24:MI:SS"Z"' },
  )
  return rows.map(({ fill, flood, hold, detail, ...hour }) => ({ ...hour, ...detail, scores: { fill, flood, hold } }))
}

/** The newest outlook's summary of each of a person's rinks. */
export async function listNewestSummaries(
  db: Db,
  userId: string,
): Promise<{ rinkId: string; summary: NightSummary }[]> {
  return db('outlooks as o')
    .join('rink_members as m', 'm.rink_id', 'o.rink_id')
    .where('m.user_id', userId)
    .distinctOn('o.rink_id')
    .orderBy([{ column: 'o.rink_id' }, { column: 'o.judged_at', order: 'desc' }])
    .select<{ rinkId: string; summary: NightSummary }[]>({ rinkId: 'o.rink_id', summary: 'o.summary' })
}
