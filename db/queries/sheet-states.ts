// The sheet as somebody saw it or as the model carried it.
import type { Db } from '@/db/knex'
import type { StoredSheet as ModelState } from '@/lib/advice/types'

export interface StoredSheet {
  asOf: Date
  origin: 'reported' | 'modelled'
  modelVersion: string | null
  thicknessMm: number
  temperatureC: number
  snowCoverCm: number
  state: ModelState | null
}

const COLUMNS = {
  asOf: 'as_of',
  origin: 'origin',
  modelVersion: 'model_version',
  thicknessMm: 'thickness_mm',
  temperatureC: 'temperature_c',
  snowCoverCm: 'snow_cover_cm',
  state: 'state',
}

/**
 * Where a run over hours from `firstHourAt` starts: what a person saw since then, else the newest state before it,
 * else the oldest there is.
 */
export async function findStartingSheet(
  db: Db,
  rinkId: string,
  { firstHourAt, now }: { firstHourAt: Date; now: Date },
): Promise<StoredSheet | undefined> {
  const states = () => db('sheet_states').where({ rink_id: rinkId }).select(COLUMNS)
  const reported = await states()
    .where({ origin: 'reported' })
    .whereBetween('as_of', [firstHourAt, now])
    .orderBy('as_of', 'desc')
    .first<StoredSheet | undefined>()
  if (reported) return reported
  const before = await states()
    .where('as_of', '<=', firstHourAt)
    .orderBy('as_of', 'desc')
    .first<StoredSheet | undefined>()
  return before ?? (await states().orderBy('as_of').first<StoredSheet | undefined>())
}

/** The newest state at or before an instant, reported or modelled. */
export async function findSheetBefore(db: Db, rinkId: string, at: Date): Promise<StoredSheet | undefined> {
  return db('sheet_states')
    .where({ rink_id: rinkId })
    .where('as_of', '<=', at)
    .orderBy('as_of', 'desc')
    .select(COLUMNS)
    .first<StoredSheet | undefined>()
}

/** Keeps where the model has carried the sheet; what a person reported for that instant stays. */
export async function keepModelledSheet(
  db: Db,
  rinkId: string,
  sheet: Omit<StoredSheet, 'origin'> & { state: ModelState; modelVersion: string },
): Promise<void> {
  await db.raw(
    `insert into sheet_states (rink_id, as_of, origin, model_version, thickness_mm, temperature_c, snow_cover_cm, state)
     values (:rinkId, :asOf, 'modelled', :modelVersion, :thicknessMm, :temperatureC, :snowCoverCm, :state::jsonb)
     on conflict (rink_id, as_of) do update
       set model_version = excluded.model_version, thickness_mm = excluded.thickness_mm,
           temperature_c = excluded.temperature_c, snow_cover_cm = excluded.snow_cover_cm, state = excluded.state
       where sheet_states.origin = 'modelled'`,
    { rinkId, ...sheet, state: JSON.stringify(sheet.state) },
  )
}

/** The sheet as a person saw it at `now`; it outranks what the model carried to that instant. */
export async function insertReportedSheet(
  db: Db,
  rinkId: string,
  sheet: { thicknessMm: number; temperatureC: number; snowCoverCm: number },
  now: Date,
): Promise<void> {
  const seen = {
    origin: 'reported' as const,
    model_version: null,
    thickness_mm: sheet.thicknessMm,
    temperature_c: sheet.temperatureC,
    snow_cover_cm: sheet.snowCoverCm,
    state: null,
  }
  await db('sheet_states')
    .insert({ rink_id: rinkId, as_of: now, ...seen })
    .onConflict(['rink_id', 'as_of'])
    .merge(seen)
}
