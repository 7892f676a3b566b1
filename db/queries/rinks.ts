// Rinks with their water and their keeper's hours.
import type { Db } from '@/db/knex'
import type { RinkRow } from '@/db/types'
import { NotFoundError } from '@/lib/errors'
import type { RinkAccess } from '@/lib/access/proofs'
import type { Role } from '@/lib/access/permissions'
import type { Base, Phase, ShelterName } from '@/lib/advice/types'
import type { FloorShape } from '@/lib/physics/floor'
import { readFloor } from '@/lib/schemas/floor'

export type WaterKind = 'cold-tap' | 'hot-tap' | 'hydrant' | 'tanker'

export interface WaterRow {
  kind: WaterKind
  flowLPerMin: number
  temperatureC: number
  layerMm: number
  fillDepthMm: number
}

/** "HH:MM" in the rink's zone; `to` before `from` runs past midnight. The days, Monday 1 to Sunday 7, are those of the start. */
export interface HoursRow {
  from: string
  to: string
  weekdays: number[]
}

/** What a keeper can set, apart from water and hours. */
export interface RinkSettingsRow {
  name: string
  placeName: string
  latitudeDeg: number
  longitudeDeg: number
  gridCellId: string
  timeZone: string
  lengthM: number
  widthM: number
  base: Base
  phase: Phase
  shelter: ShelterName
  skyView: number
  maxPasses: number
  /** Whether the clock follows from the place, or was chosen and stays. */
  timeZoneBy: RinkRow['time_zone_by']
}

/** Everything a judgement depends on, except the weather and the sheet. */
export interface RinkForJudging extends RinkSettingsRow {
  id: string
  settingsVersion: number
  /** Null is level ground. */
  floor: FloorShape | null
  boardHeightMm: number | null
  carriesSkaterMm: number
  windLimitMps: number | null
  windChillLimitC: number | null
  cell: { latitudeDeg: number; longitudeDeg: number }
  water: WaterRow
  available: HoursRow[]
}

export interface RinkOfUser {
  id: string
  name: string
  placeName: string
  timeZone: string
  phase: Phase
  role: Role
}

const SETTINGS = {
  name: 'r.name',
  placeName: 'r.place_name',
  latitudeDeg: 'r.latitude_deg',
  longitudeDeg: 'r.longitude_deg',
  gridCellId: 'r.grid_cell_id',
  timeZone: 'r.time_zone',
  lengthM: 'r.length_m',
  widthM: 'r.width_m',
  base: 'r.base',
  phase: 'r.phase',
  shelter: 'r.shelter',
  skyView: 'r.sky_view',
  maxPasses: 'r.max_passes',
  timeZoneBy: 'r.time_zone_by',
}

export function toColumns(rink: RinkSettingsRow) {
  return {
    name: rink.name,
    place_name: rink.placeName,
    latitude_deg: rink.latitudeDeg,
    longitude_deg: rink.longitudeDeg,
    grid_cell_id: rink.gridCellId,
    time_zone: rink.timeZone,
    length_m: rink.lengthM,
    width_m: rink.widthM,
    base: rink.base,
    phase: rink.phase,
    shelter: rink.shelter,
    sky_view: rink.skyView,
    max_passes: rink.maxPasses,
    time_zone_by: rink.timeZoneBy,
  }
}

/**
 * A new rink, or undefined when the same person's form with this key made one already.
 * A race ends here: the second of two waits for the first and then changes nothing.
 */
export async function insertRink(
  trx: Db,
  rink: RinkSettingsRow & { createdBy: string; creationKey: string },
  now: Date,
): Promise<{ id: string } | undefined> {
  const [row] = await trx('rinks')
    .insert({
      ...toColumns(rink),
      created_by: rink.createdBy,
      creation_key: rink.creationKey,
      created_at: now,
      updated_at: now,
    })
    .onConflict(['created_by', 'creation_key'])
    .ignore()
    .returning<{ id: string }[]>('id')
  return row
}

export async function findRinkByCreationKey(
  db: Db,
  made: { createdBy: string; creationKey: string },
): Promise<{ id: string } | undefined> {
  return db('rinks').where({ created_by: made.createdBy, creation_key: made.creationKey }).first('id')
}

export async function findRinkForJudging(db: Db, rinkId: string): Promise<RinkForJudging | undefined> {
  const rink = await db('rinks as r')
    .join('grid_cells as c', 'c.id', 'r.grid_cell_id')
    .where('r.id', rinkId)
    .first({
      id: 'r.id',
      settingsVersion: 'r.settings_version',
      ...SETTINGS,
      storedFloor: 'r.floor',
      boardHeightMm: 'r.board_height_mm',
      carriesSkaterMm: 'r.carries_skater_mm',
      windLimitMps: 'r.wind_limit_mps',
      windChillLimitC: 'r.wind_chill_limit_c',
      cellLatitudeDeg: 'c.latitude_deg',
      cellLongitudeDeg: 'c.longitude_deg',
    })
  if (!rink) return undefined
  const { cellLatitudeDeg, cellLongitudeDeg, storedFloor, ...settings } = rink
  const water = await db('water_sources').where({ rink_id: rinkId, is_default: true }).first({
    kind: 'kind',
    flowLPerMin: 'flow_l_per_min',
    temperatureC: 'temperature_c',
    layerMm: 'layer_mm',
    fillDepthMm: 'fill_depth_mm',
  })
  const available = await db('available_hours')
    .where({ rink_id: rinkId })
    .orderBy('from_local')
    .select({ from: 'from_local', to: 'to_local', weekdays: 'weekdays' })
  const cell = { latitudeDeg: cellLatitudeDeg, longitudeDeg: cellLongitudeDeg }
  return { ...settings, floor: readFloor(storedFloor), cell, water, available }
}

export async function listRinksOfUser(db: Db, userId: string): Promise<RinkOfUser[]> {
  return db('rink_members as m')
    .join('rinks as r', 'r.id', 'm.rink_id')
    .where('m.user_id', userId)
    .orderBy(['r.name', 'r.id'])
    .select({
      id: 'r.id',
      name: 'r.name',
      placeName: 'r.place_name',
      timeZone: 'r.time_zone',
      phase: 'r.phase',
      role: 'm.role',
    })
}

/** @throws NotFoundError for a rink that is gone. */
export async function getRinkForJudging(db: Db, rinkId: string): Promise<RinkForJudging> {
  const rink = await findRinkForJudging(db, rinkId)
  if (!rink) throw new NotFoundError('Rink')
  return rink
}

/** What a page about something else needs of its rink. */
export async function getRinkHead(
  db: Db,
  access: RinkAccess,
): Promise<Pick<RinkOfUser, 'name' | 'timeZone' | 'phase'>> {
  const row = await db('rinks')
    .where({ id: access.rinkId })
    .first({ name: 'name', timeZone: 'time_zone', phase: 'phase' })
  if (!row) throw new NotFoundError('Rink')
  return row
}
