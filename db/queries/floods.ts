// Passes that were poured.
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'

export interface PouredPass {
  nightDate: string
  passNumber: number
  pouredAt: Date
  layerMm: number
  waterL: number
  waterTemperatureC: number
  by: string | null
}

/** Logs a pass once per night and number; false when it is logged already. */
export async function insertFlood(
  trx: Db,
  access: RinkAccess<'logFlood'>,
  flood: Omit<PouredPass, 'by'> & { pouredBy: string },
  now: Date,
): Promise<boolean> {
  const rows = await trx('floods')
    .insert({
      rink_id: access.rinkId,
      night_date: flood.nightDate,
      pass_number: flood.passNumber,
      poured_at: flood.pouredAt,
      layer_mm: flood.layerMm,
      water_l: flood.waterL,
      water_temperature_c: flood.waterTemperatureC,
      poured_by: flood.pouredBy,
      created_at: now,
    })
    .onConflict(['rink_id', 'night_date', 'pass_number'])
    .ignore()
    .returning('id')
  return rows.length > 0
}

/** Takes back a pass that was checked off by mistake; false when there is none. */
export async function deleteFlood(
  trx: Db,
  access: RinkAccess<'logFlood'>,
  pass: { nightDate: string; passNumber: number },
): Promise<boolean> {
  const count = await trx('floods')
    .where({ rink_id: access.rinkId, night_date: pass.nightDate, pass_number: pass.passNumber })
    .delete()
  return count > 0
}

/** Passes since an instant, oldest first. */
export async function listFloodsSince(db: Db, access: RinkAccess, since: Date): Promise<PouredPass[]> {
  return db('floods as f')
    .leftJoin('users as u', 'u.id', 'f.poured_by')
    .where('f.rink_id', access.rinkId)
    .where('f.poured_at', '>=', since)
    .orderBy(['f.poured_at', 'f.pass_number'])
    .select({
      nightDate: 'f.night_date',
      passNumber: 'f.pass_number',
      pouredAt: 'f.poured_at',
      layerMm: 'f.layer_mm',
      waterL: 'f.water_l',
      waterTemperatureC: 'f.water_temperature_c',
      by: 'u.name',
    })
}

/** Counts a change that the advice depends on. */
export async function bumpSettingsVersion(trx: Db, access: RinkAccess<'logFlood'>, now: Date): Promise<void> {
  await trx('rinks').where({ id: access.rinkId }).update({ updated_at: now }).increment('settings_version')
}
