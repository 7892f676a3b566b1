// Passes that were poured: the floods of the log, as the model and the plan need them.
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'

export interface PouredPass {
  nightDate: string
  /** Of a planned pass; null for a flood that was written into the log by hand. */
  passNumber: number | null
  pouredAt: Date
  layerMm: number
  waterL: number
  waterTemperatureC: number
  by: string | null
}

/** Logs a planned pass once per night and number; false when it is logged already. */
export async function insertFlood(
  trx: Db,
  access: RinkAccess<'writeLog'>,
  flood: Omit<PouredPass, 'by'> & { pouredBy: string; saidSetByAt: Date | null },
  now: Date,
): Promise<boolean> {
  const rows = await trx('log_entries')
    .insert({
      rink_id: access.rinkId,
      kind: 'flood',
      night_date: flood.nightDate,
      pass_number: flood.passNumber,
      happened_at: flood.pouredAt,
      layer_mm: flood.layerMm,
      water_l: flood.waterL,
      water_temperature_c: flood.waterTemperatureC,
      said_set_by_at: flood.saidSetByAt,
      written_by: flood.pouredBy,
      created_at: now,
      updated_at: now,
    })
    .onConflict(trx.raw('(rink_id, night_date, pass_number) where deleted_at is null'))
    .ignore()
    .returning('id')
  return rows.length > 0
}

/** Takes back a pass that was checked off by mistake; false when there is none. */
export async function deleteFlood(
  trx: Db,
  access: RinkAccess<'writeLog'>,
  pass: { nightDate: string; passNumber: number },
  now: Date,
): Promise<boolean> {
  const count = await trx('log_entries')
    .where({ rink_id: access.rinkId, night_date: pass.nightDate, pass_number: pass.passNumber, deleted_at: null })
    .update({ deleted_at: now, updated_at: now })
  return count > 0
}

/** Passes since an instant, oldest first. */
export async function listFloodsSince(db: Db, access: RinkAccess, since: Date): Promise<PouredPass[]> {
  return db('log_entries as f')
    .leftJoin('users as u', 'u.id', 'f.written_by')
    .where({ 'f.rink_id': access.rinkId, 'f.kind': 'flood', 'f.deleted_at': null })
    .where('f.happened_at', '>=', since)
    .orderBy(['f.happened_at', 'f.pass_number'])
    .select({
      nightDate: 'f.night_date',
      passNumber: 'f.pass_number',
      pouredAt: 'f.happened_at',
      layerMm: 'f.layer_mm',
      waterL: 'f.water_l',
      waterTemperatureC: 'f.water_temperature_c',
      by: 'u.name',
    })
}

/** Counts a change that the advice depends on. */
export async function bumpSettingsVersion(trx: Db, access: RinkAccess<'writeLog'>, now: Date): Promise<void> {
  await trx('rinks').where({ id: access.rinkId }).update({ updated_at: now }).increment('settings_version')
}
