// The log as its pages show it: the season's figures, the nights, one entry with its history.
import { findEntry, listRevisions } from '@/db/queries/log-entries'
import { listEntries, listNights, listWriters } from '@/db/queries/log-lists'
import { findLimits, findNewestThickness, sumSeason, type SeasonSums } from '@/db/queries/log-season'
import { findMembership, listMembers } from '@/db/queries/members'
import { listNightOutcomes } from '@/db/queries/night-outcomes'
import { getRinkForJudging } from '@/db/queries/rinks'
import { listWaterSources, type WaterSource } from '@/db/queries/water-sources'
import type { RinkAccess } from '@/lib/access/proofs'
import { isGranted } from '@/lib/access/permissions'
import { requireRink } from '@/lib/access/require-rink'
import { keptRates } from '@/lib/advice/kept-rates'
import { nightDateOf } from '@/lib/advice/night'
import { seasonOf, type Season } from '@/lib/advice/season'
import type { ServiceContext } from '@/lib/context'
import { NotFoundError } from '@/lib/errors'
import type { EntryView } from '@/lib/schemas/log-choices'
import type { LogQuery } from '@/lib/schemas/log-query'
import type { WordOptions } from '@/lib/words/options'
import { chartsOf, skatingDays, type LogCharts } from './log-charts'
import { entryView } from './log-view'
import { readerOf } from './rink-and-reader'

/** Nights with entries on one page. Ours: what a person scrolls through on a phone. */
const NIGHTS_A_PAGE = 7

export interface LogFrame {
  rink: { id: string; name: string; timeZone: string; people: number }
  reader: WordOptions
  readAt: string
  mayWrite: boolean
  season: Season
  /** Where the form of a new entry starts. */
  usual: { layerMm: number; areaM2: number; waterKind: WaterSource['kind']; sources: WaterSource[] }
}

export interface SeasonTotals extends SeasonSums {
  thicknessMm: number | null
  /** By model and readings; null while no day is on record. */
  skating: { days: number; onRecord: number } | null
  kept: { kept: number; of: number }
}

export interface LogView extends LogFrame {
  totals: SeasonTotals
  charts: LogCharts
  nights: { date: string; entries: EntryView[] }[]
  /** Goes before the nights of the next page; null on the last. */
  olderBefore: string | null
  writers: { id: string; name: string }[]
}

/** Whose log it is and who reads it. @throws NotFoundError for strangers */
export async function logFrame(context: ServiceContext, access: RinkAccess): Promise<LogFrame> {
  const { db, now, viewer } = context
  const rink = await getRinkForJudging(db, access.rinkId)
  const [membership, people, sources, reader] = await Promise.all([
    findMembership(db, { rinkId: rink.id, userId: viewer.userId }),
    listMembers(db, access),
    listWaterSources(db, access),
    readerOf(context, rink.timeZone),
  ])
  return {
    rink: { id: rink.id, name: rink.name, timeZone: rink.timeZone, people: people.length },
    reader,
    readAt: now.toISOString(),
    mayWrite: membership !== undefined && isGranted(membership.role, 'writeLog'),
    season: seasonOf(nightDateOf(now, rink.timeZone)),
    usual: {
      layerMm: rink.water.layerMm,
      areaM2: rink.lengthM * rink.widthM,
      waterKind: rink.water.kind,
      sources,
    },
  }
}

export async function seasonTotals(
  { db, now }: Pick<ServiceContext, 'db' | 'now'>,
  access: RinkAccess,
  season: Season,
  thickness: LogCharts['thickness'],
): Promise<SeasonTotals> {
  const [sums, thicknessMm, limits, outcomes] = await Promise.all([
    sumSeason(db, access, season),
    findNewestThickness(db, access, now),
    findLimits(db, access),
    listNightOutcomes(db, access, season),
  ])
  const carriesSkaterMm = limits?.carriesSkaterMm ?? Infinity
  const skating = await skatingDays(db, access, { season, thickness, carriesSkaterMm })
  const { flood, hold } = keptRates(outcomes)
  return {
    ...sums,
    thicknessMm: thicknessMm ?? null,
    skating: skating.onRecord > 0 ? skating : null,
    kept: { kept: flood.kept + hold.kept, of: flood.of + hold.of },
  }
}

/** @throws NotFoundError for strangers */
export async function getLog(context: ServiceContext, rinkId: string, query: LogQuery): Promise<LogView> {
  const access = await requireRink(context, rinkId, 'view')
  const { db } = context
  const frame = await logFrame(context, access)
  const { kind, person, from, to, before } = query
  // Without dates the list runs back through all seasons.
  const filter = { kind, person, from, to, before }
  const [found, charts, writers] = await Promise.all([
    listNights(db, access, filter, NIGHTS_A_PAGE + 1),
    chartsOf(db, access, frame.season, frame.rink.timeZone),
    listWriters(db, access),
  ])
  const dates = found.slice(0, NIGHTS_A_PAGE)
  const entries = await entriesOfNights(context, access, filter, dates)
  return {
    ...frame,
    totals: await seasonTotals(context, access, frame.season, charts.thickness),
    charts,
    nights: dates.map((date) => ({ date, entries: entries.filter(({ nightDate }) => nightDate === date) })),
    olderBefore: found.length > NIGHTS_A_PAGE ? (dates.at(-1) ?? null) : null,
    writers,
  }
}

async function entriesOfNights(
  { db }: ServiceContext,
  access: RinkAccess,
  filter: Pick<LogQuery, 'kind' | 'person'>,
  dates: readonly string[],
): Promise<EntryView[]> {
  if (dates.length === 0) return []
  const { kind, person } = filter
  const entries = await listEntries(db, access, { kind, person, from: dates.at(-1), to: dates[0] })
  return entries.map(entryView)
}

export interface EntryPage extends LogFrame {
  entry: EntryView
  /** What it said before each change, newest first, with who changed it then. */
  history: { was: EntryView; changedBy: string | null; changedAt: string }[]
}

/** @throws NotFoundError for strangers, and for what is no entry of this rink */
export async function getEntry(context: ServiceContext, rinkId: string, entryId: string): Promise<EntryPage> {
  const access = await requireRink(context, rinkId, 'view')
  const entry = await findEntry(context.db, access, entryId)
  if (!entry) throw new NotFoundError('Entry')
  const [frame, revisions] = await Promise.all([logFrame(context, access), listRevisions(context.db, access, entryId)])
  return {
    ...frame,
    entry: entryView(entry),
    history: revisions.map(({ was, changedBy, changedAt }) => ({
      was: entryView(was),
      changedBy,
      changedAt: changedAt.toISOString(),
    })),
  }
}
