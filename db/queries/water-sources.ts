// Where a rink's water comes from: one source is the usual one.
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import type { WaterRow } from './rinks'

export interface WaterSource extends WaterRow {
  id: string
  isDefault: boolean
}

const COLUMNS = {
  id: 'id',
  kind: 'kind',
  flowLPerMin: 'flow_l_per_min',
  temperatureC: 'temperature_c',
  layerMm: 'layer_mm',
  fillDepthMm: 'fill_depth_mm',
  isDefault: 'is_default',
}

function toColumns(water: WaterRow) {
  return {
    kind: water.kind,
    flow_l_per_min: water.flowLPerMin,
    temperature_c: water.temperatureC,
    layer_mm: water.layerMm,
    fill_depth_mm: water.fillDepthMm,
  }
}

/** The usual one first. */
export async function listWaterSources(db: Db, access: RinkAccess): Promise<WaterSource[]> {
  return db('water_sources')
    .where({ rink_id: access.rinkId })
    .orderBy([{ column: 'is_default', order: 'desc' }, 'kind', 'id'])
    .select(COLUMNS)
}

export async function insertWater(trx: Db, rinkId: string, water: WaterRow, isDefault: boolean): Promise<void> {
  await trx('water_sources').insert({ rink_id: rinkId, ...toColumns(water), is_default: isDefault })
}

/** @returns false when the rink has no such source. */
export async function updateWater(
  trx: Db,
  access: RinkAccess<'manage'>,
  sourceId: string,
  water: WaterRow,
): Promise<boolean> {
  const changed = await trx('water_sources').where({ id: sourceId, rink_id: access.rinkId }).update(toColumns(water))
  return changed === 1
}

/** @returns false when the rink has no such source; then nothing may be kept of the transaction. */
export async function makeWaterUsual(trx: Db, access: RinkAccess<'manage'>, sourceId: string): Promise<boolean> {
  await trx('water_sources').where({ rink_id: access.rinkId, is_default: true }).update({ is_default: false })
  const changed = await trx('water_sources')
    .where({ id: sourceId, rink_id: access.rinkId })
    .update({ is_default: true })
  return changed === 1
}

/** The usual source stays: a rink without water has nothing to plan with. @returns false when it did. */
export async function deleteWater(trx: Db, access: RinkAccess<'manage'>, sourceId: string): Promise<boolean> {
  const deleted = await trx('water_sources').where({ id: sourceId, rink_id: access.rinkId, is_default: false }).delete()
  return deleted === 1
}
