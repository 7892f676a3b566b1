// Rinks with their water and their keeper's hours.
import type { Db } from '@/db/knex'
import { NotFoundError } from '@/lib/errors'
import type { RinkAccess } from '@/lib/access/proofs'
import type { Role } from '@/lib/access/permissions'
import type { Base, Phase, ShelterName } from '@/lib/advice/types'

export type WaterKind = 'cold-tap' | 'hot-tap' | 'hydrant' | 'tanker'

export interface WaterRow {
  kind: WaterKind
  flowLPerMin: number
  temperatureC: number
  layerMm: number
  fillDepthMm: number
}

/** "HH:MM" in the rink's zone; `to` before `from` runs past midnight. */
export interface HoursRow {
  from: string
  to: string
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
}

/** Everything a judgement depends on, except the weather and the sheet. */
export interface RinkForJudging extends RinkSettingsRow {
  id: string
  settingsVersion: number
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
}

function toColumns(rink: RinkSettingsRow) {
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

/** Counts the change, so that outlooks made before it are known to be old. */
export async function updateRinkSettings(
  trx: Db,
  access: RinkAccess<'manage'>,
  rink: RinkSettingsRow,
  now: Date,
): Promise<void> {
  await trx('rinks')
    .where({ id: access.rinkId })
    .update({ ...toColumns(rink), updated_at: now })
    .increment('settings_version')
}

/** Sets the rink's default water source, replacing the one before. */
export async function putDefaultWater(trx: Db, rinkId: string, water: WaterRow): Promise<void> {
  const row = {
    rink_id: rinkId,
    kind: water.kind,
    flow_l_per_min: water.flowLPerMin,
    temperature_c: water.temperatureC,
    layer_mm: water.layerMm,
    fill_depth_mm: water.fillDepthMm,
  }
  await trx('water_sources').insert(row).onConflict(trx.raw('(rink_id) where is_default')).merge()
}

/** Sets all hours in which somebody can go out. */
export async function replaceAvailableHours(trx: Db, rinkId: string, hours: readonly HoursRow[]): Promise<void> {
  await trx('available_hours').where({ rink_id: rinkId }).delete()
  await trx('available_hours').insert(
    hours.map(({ from, to }) => ({ rink_id: rinkId, from_local: from, to_local: to })),
  )
}

export async function findRinkForJudging(db: Db, rinkId: string): Promise<RinkForJudging | undefined> {
  const rink = await db('rinks as r')
    .join('grid_cells as c', 'c.id', 'r.grid_cell_id')
    .where('r.id', rinkId)
    .first({
      id: 'r.id',
      settingsVersion: 'r.settings_version',
      ...SETTINGS,
      cellLatitudeDeg: 'c.latitude_deg',
      cellLongitudeDeg: 'c.longitude_deg',
    })
  if (!rink) return undefined
  const { cellLatitudeDeg, cellLongitudeDeg, ...settings } = rink
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
    .select({ from: 'from_local', to: 'to_local' })
  return { ...settings, cell: { latitudeDeg: cellLatitudeDeg, longitudeDeg: cellLongitudeDeg }, water, available }
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

/** What a page about something else needs of its rink. */
export async function getRinkHead(db: Db, access: RinkAccess): Promise<{ name: string; timeZone: string }> {
  const row = await db('rinks').where({ id: access.rinkId }).first({ name: 'name', timeZone: 'time_zone' })
  if (!row) throw new NotFoundError('Rink')
  return row
}
