// Sums over a season of the log, and the thickness that the record keeps for each day.
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'

export interface SeasonSums {
  floods: number
  nightsFlooded: number
  waterL: number
  readings: number
  clears: number
  scrapes: number
  lastThawAt: Date | null
}

interface Span {
  from: string
  to: string
}

export async function sumSeason(db: Db, access: RinkAccess, { from, to }: Span): Promise<SeasonSums> {
  const row = await db('log_entries')
    .where({ rink_id: access.rinkId, deleted_at: null })
    .whereBetween('night_date', [from, to])
    .first<SeasonSums>(
      db.raw(`
        (count(*) filter (where kind = 'flood'))::int as floods,
        (count(distinct night_date) filter (where kind = 'flood'))::int as "nightsFlooded",
        coalesce(sum(water_l), 0) as "waterL",
        (count(*) filter (where kind = 'reading'))::int as readings,
        (count(*) filter (where kind = 'clear'))::int as clears,
        (count(*) filter (where kind = 'scrape'))::int as scrapes,
        max(happened_at) filter (where kind = 'thaw') as "lastThawAt"`),
    )
  return row
}

/** Water by where it came from, for the hours it took. */
export async function sumWaterByKind(
  db: Db,
  access: RinkAccess,
  { from, to }: Span,
): Promise<{ waterKind: string | null; waterL: number }[]> {
  return db('log_entries')
    .where({ rink_id: access.rinkId, deleted_at: null })
    .whereBetween('night_date', [from, to])
    .whereNotNull('water_l')
    .groupBy('water_kind')
    .select({ waterKind: 'water_kind' })
    .sum<{ waterKind: string | null; waterL: number }[]>({ waterL: 'water_l' })
}

/** Nights with a flood or a fill, oldest first. */
export async function listWaterByNight(
  db: Db,
  access: RinkAccess,
  { from, to }: Span,
): Promise<{ nightDate: string; waterL: number; floods: number }[]> {
  return db('log_entries')
    .where({ rink_id: access.rinkId, deleted_at: null })
    .whereBetween('night_date', [from, to])
    .whereNotNull('water_l')
    .groupBy('night_date')
    .orderBy('night_date')
    .select<{ nightDate: string; waterL: number; floods: number }[]>(
      'night_date as nightDate',
      db.raw('sum(water_l) as "waterL"'),
      db.raw(`(count(*) filter (where kind = 'flood'))::int as floods`),
    )
}

/** The newest thickness that the record has for each day by the rink's clock, oldest first. */
export async function listThicknessByDay(
  db: Db,
  access: RinkAccess,
  { from, to }: Span,
): Promise<{ date: string; thicknessMm: number }[]> {
  const { rows } = await db.raw<{ rows: { date: string; thicknessMm: number }[] }>(
    `select distinct on (date) date, "thicknessMm" from (
       select to_char(s.as_of at time zone r.time_zone, 'YYYY-MM-DD') as date, s.as_of, s.thickness_mm as "thicknessMm"
         from sheet_states s join rinks r on r.id = s.rink_id
        where s.rink_id = :rinkId) as days
     where date between :from and :to
     order by date, as_of desc`,
    { rinkId: access.rinkId, from, to },
  )
  return rows
}

/** Days by the rink's clock on which somebody wrote down a thaw. */
export async function listThawDates(db: Db, access: RinkAccess, { from, to }: Span): Promise<string[]> {
  const { rows } = await db.raw<{ rows: { date: string }[] }>(
    `select distinct to_char(e.happened_at at time zone r.time_zone, 'YYYY-MM-DD') as date
       from log_entries e join rinks r on r.id = e.rink_id
      where e.rink_id = :rinkId and e.kind = 'thaw' and e.deleted_at is null and e.night_date between :from and :to
      order by date`,
    { rinkId: access.rinkId, from, to },
  )
  return rows.map(({ date }) => date)
}

/** The newest thickness there is, reported or modelled. */
export async function findNewestThickness(db: Db, access: RinkAccess, now: Date): Promise<number | undefined> {
  const row = await db('sheet_states')
    .where({ rink_id: access.rinkId })
    .where('as_of', '<=', now)
    .orderBy('as_of', 'desc')
    .first<{ thicknessMm: number } | undefined>({ thicknessMm: 'thickness_mm' })
  return row?.thicknessMm
}

/** Ice that a sheet must have to carry a skater, as its keeper set it; and what water costs. */
export async function findLimits(
  db: Db,
  access: RinkAccess,
): Promise<{ carriesSkaterMm: number; waterPricePerM3: number | null } | undefined> {
  return db('rinks')
    .where({ id: access.rinkId })
    .first({ carriesSkaterMm: 'carries_skater_mm', waterPricePerM3: 'water_price_per_m3' })
}
