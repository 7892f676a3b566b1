// Changes to a rink that its advice depends on; each is counted, so that outlooks made before it are known to be old.
import type { Db } from '@/db/knex'
import type { RinkRow } from '@/db/types'
import type { RinkAccess } from '@/lib/access/proofs'
import type { HoursRow, RinkForJudging } from './rinks'

/** What settings pages change. */
export type RinkChanges = Partial<
  Pick<
    RinkRow,
    | 'name'
    | 'place_name'
    | 'latitude_deg'
    | 'longitude_deg'
    | 'grid_cell_id'
    | 'time_zone'
    | 'time_zone_by'
    | 'length_m'
    | 'width_m'
    | 'base'
    | 'phase'
    | 'shelter'
    | 'sky_view'
    | 'max_passes'
    | 'board_height_mm'
    | 'carries_skater_mm'
    | 'wind_limit_mps'
    | 'wind_chill_limit_c'
    | 'floor'
    | 'water_price_per_m3'
  >
>

/**
 * Of two changes at once, or of two workers deciding at once, the second waits here until the first is done. "No key":
 * rows that name the rink hold a share of its key, and two that had each written one would wait for each other for ever.
 */
export async function lockRink(trx: Db, access: RinkAccess): Promise<void> {
  await trx('rinks').where({ id: access.rinkId }).forNoKeyUpdate().first('id')
}

/** Whether the rink is in a phase and stands as it was judged. Asked with the rink's row locked. */
export async function isAsJudged(
  trx: Db,
  access: RinkAccess,
  { phase, settingsVersion }: Pick<RinkForJudging, 'phase' | 'settingsVersion'>,
): Promise<boolean> {
  const row = await trx('rinks').where({ id: access.rinkId, phase, settings_version: settingsVersion }).first('id')
  return row !== undefined
}

/** Counts a change beside the rink's own columns that the advice depends on: water poured, what was learned. */
export async function countChange(trx: Db, access: RinkAccess<'writeLog'>, now: Date): Promise<void> {
  await updateCounted(trx, access, {}, now)
}

/** The work itself moves a rink on: crew may do it. */
export async function movePhase(
  trx: Db,
  access: RinkAccess<'writeLog'>,
  phase: RinkRow['phase'],
  now: Date,
): Promise<void> {
  await updateCounted(trx, access, { phase }, now)
}

export async function changeRink(
  trx: Db,
  access: RinkAccess<'manage'>,
  { floor, ...changes }: RinkChanges,
  now: Date,
): Promise<void> {
  const columns = floor === undefined ? changes : { ...changes, floor: floor === null ? null : JSON.stringify(floor) }
  await updateCounted(trx, access, columns, now)
}

async function updateCounted(
  trx: Db,
  { rinkId }: RinkAccess<'writeLog'> | RinkAccess<'manage'>,
  columns: Partial<RinkRow>,
  now: Date,
): Promise<void> {
  await trx('rinks')
    .where({ id: rinkId })
    .update({ ...columns, updated_at: now })
    .increment('settings_version')
}

/** Sets all hours in which somebody can go out. */
export async function replaceAvailableHours(trx: Db, rinkId: string, hours: readonly HoursRow[]): Promise<void> {
  await trx('available_hours').where({ rink_id: rinkId }).delete()
  await trx('available_hours').insert(
    hours.map(({ from, to, weekdays }) => ({ rink_id: rinkId, from_local: from, to_local: to, weekdays })),
  )
}

/** Everything of the rink goes with it. */
export async function deleteRink(db: Db, access: RinkAccess<'manage'>): Promise<void> {
  await db('rinks').where({ id: access.rinkId }).delete()
}
