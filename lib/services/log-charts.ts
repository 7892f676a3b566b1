// What the log's charts draw: thickness by day, water by night, nights flooded by week.
import { listEntries } from '@/db/queries/log-lists'
import { listThawDates, listThicknessByDay, listWaterByNight } from '@/db/queries/log-season'
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import type { Season } from '@/lib/advice/season'
import { addDays, localDateOf } from '@/lib/advice/zoned-time'
import { DAY_MILLIS } from '@/lib/physics/constants'

const WEEK_DAYS = 7

export interface ThicknessDay {
  date: string
  /** The last the model had of the day. [mm] */
  modelMm: number | null
  /** Measured on the day; of several holes the thinnest, which is the one that counts. [mm] */
  readingMm: number | null
}

export interface LogCharts {
  thickness: ThicknessDay[]
  water: { nightDate: string; waterL: number; floods: number }[]
  /** Weeks from the first flood on, by the night they begin with. */
  weeks: { from: string; nights: number }[]
}

/** Dates from one to another, both included. */
function datesBetween(from: string, to: string): string[] {
  const days = Math.round((Date.parse(to) - Date.parse(from)) / DAY_MILLIS)
  return Array.from({ length: days + 1 }, (_, index) => addDays(from, index))
}

export async function thicknessDays(
  db: Db,
  access: RinkAccess,
  season: Season,
  timeZone: string,
): Promise<ThicknessDay[]> {
  const [days, readings] = await Promise.all([
    listThicknessByDay(db, access, season),
    listEntries(db, access, { kind: 'reading', from: season.from, to: season.to }),
  ])
  const model = new Map(days.map(({ date, thicknessMm }) => [date, thicknessMm]))
  const measured = new Map<string, number>()
  for (const { happenedAt, thicknessMm } of readings) {
    const date = localDateOf(happenedAt.getTime(), timeZone)
    if (thicknessMm !== null) measured.set(date, Math.min(thicknessMm, measured.get(date) ?? Infinity))
  }
  const known = [...model.keys(), ...measured.keys()].sort()
  const [first, last] = [known[0], known.at(-1)]
  if (first === undefined || last === undefined) return []
  return datesBetween(first, last).map((date) => ({
    date,
    modelMm: model.get(date) ?? null,
    readingMm: measured.get(date) ?? null,
  }))
}

/** Every week of the span has its place, flooded or not. */
function weeksOf(nights: readonly { nightDate: string; floods: number }[]): LogCharts['weeks'] {
  const flooded = nights.filter(({ floods }) => floods > 0).map(({ nightDate }) => nightDate)
  const [first, last] = [flooded[0], flooded.at(-1)]
  if (first === undefined || last === undefined) return []
  // A week begins on its Monday.
  const monday = addDays(first, -((new Date(`${first}T12:00:00Z`).getUTCDay() + 6) % WEEK_DAYS))
  const starts = datesBetween(monday, last).filter((_, index) => index % WEEK_DAYS === 0)
  return starts.map((from) => ({
    from,
    nights: flooded.filter((night) => night >= from && night < addDays(from, WEEK_DAYS)).length,
  }))
}

export async function chartsOf(db: Db, access: RinkAccess, season: Season, timeZone: string): Promise<LogCharts> {
  const [thickness, water] = await Promise.all([
    thicknessDays(db, access, season, timeZone),
    listWaterByNight(db, access, season),
  ])
  return { thickness, water, weeks: weeksOf(water) }
}

/**
 * Days whose sheet, as last modelled or measured, carried a skater and on which nobody wrote down a thaw. Days without a
 * record count for nothing, which is why the number of days on record goes with it.
 */
export async function skatingDays(
  db: Db,
  access: RinkAccess,
  {
    season,
    thickness,
    carriesSkaterMm,
  }: { season: Season; thickness: readonly ThicknessDay[]; carriesSkaterMm: number },
): Promise<{ days: number; onRecord: number }> {
  const thaws = new Set(await listThawDates(db, access, season))
  const known = thickness.filter(({ modelMm, readingMm }) => (readingMm ?? modelMm) !== null)
  const good = known.filter(
    ({ date, modelMm, readingMm }) => (readingMm ?? modelMm ?? 0) >= carriesSkaterMm && !thaws.has(date),
  )
  return { days: good.length, onRecord: known.length }
}
