// Passes that were poured: the floods of the log, as the model and the plan need them.
import type { Db } from '@/db/knex'
import type { LogEntryRow } from '@/db/types'
import type { RinkAccess } from '@/lib/access/proofs'

export interface PouredPass {
  id: string
  version: number
  nightDate: string
  /** Of a planned pass; null for a flood that was written into the log by hand. */
  passNumber: number | null
  pouredAt: Date
  layerMm: number
  waterL: number
  waterTemperatureC: number
  saidSetByAt: Date | null
  outcome: LogEntryRow['outcome']
  outcomeAt: Date | null
  by: string | null
}

/** As it is checked off. */
export type NewFlood = Omit<PouredPass, 'id' | 'version' | 'outcome' | 'outcomeAt' | 'by'> & {
  waterKind: LogEntryRow['water_kind']
  pouredBy: string
  /** Made where it was checked off: sent twice, it is kept once. */
  entryKey: string
}

/** Logs a planned pass once per night and number, and once per key; false when it is logged already. */
export async function insertFlood(
  trx: Db,
  access: RinkAccess<'writeLog'>,
  flood: NewFlood,
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
      water_kind: flood.waterKind,
      said_set_by_at: flood.saidSetByAt,
      written_by: flood.pouredBy,
      entry_key: flood.entryKey,
      created_at: now,
      updated_at: now,
    })
    .onConflict()
    .ignore()
    .returning('id')
  return rows.length > 0
}

/** Passes since an instant, oldest first. */
export async function listFloodsSince(db: Db, access: RinkAccess, since: Date): Promise<PouredPass[]> {
  return db('log_entries as f')
    .leftJoin('users as u', 'u.id', 'f.written_by')
    .where({ 'f.rink_id': access.rinkId, 'f.kind': 'flood', 'f.deleted_at': null })
    .where('f.happened_at', '>=', since)
    .orderBy(['f.happened_at', 'f.pass_number'])
    .select({
      id: 'f.id',
      version: 'f.version',
      nightDate: 'f.night_date',
      passNumber: 'f.pass_number',
      pouredAt: 'f.happened_at',
      layerMm: 'f.layer_mm',
      waterL: 'f.water_l',
      waterTemperatureC: 'f.water_temperature_c',
      saidSetByAt: 'f.said_set_by_at',
      outcome: 'f.outcome',
      outcomeAt: 'f.outcome_at',
      by: 'u.name',
    })
}
