// The keeper's own passes of a night.
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import { lockRink } from './rink-settings'

export interface OwnPass {
  number: number
  startsAt: Date
  layerMm: number
  waterTemperatureC: number
  flowLPerMin: number
}

/** In the order of their numbers, and who changed the plan last; none when the advised plan stands. */
export async function listOwnPasses(
  db: Db,
  access: RinkAccess,
  nightDate: string,
): Promise<(OwnPass & { by: string | null })[]> {
  return db('own_passes as p')
    .leftJoin('users as u', 'u.id', 'p.changed_by')
    .where({ 'p.rink_id': access.rinkId, 'p.night_date': nightDate })
    .orderBy('p.pass_number')
    .select({
      number: 'p.pass_number',
      startsAt: 'p.starts_at',
      layerMm: 'p.layer_mm',
      waterTemperatureC: 'p.water_temperature_c',
      flowLPerMin: 'p.flow_l_per_min',
      by: 'u.name',
    })
}

/** Replaces a night's own passes by these; with none, the advised plan stands again. Two at once wait for each other. */
export async function replaceOwnPasses(
  trx: Db,
  access: RinkAccess<'manage'>,
  nightDate: string,
  passes: readonly OwnPass[],
  { changedBy, now }: { changedBy: string; now: Date },
): Promise<void> {
  await lockRink(trx, access)
  await trx('own_passes').where({ rink_id: access.rinkId, night_date: nightDate }).delete()
  if (passes.length === 0) return
  await trx('own_passes').insert(
    passes.map((pass) => ({
      rink_id: access.rinkId,
      night_date: nightDate,
      pass_number: pass.number,
      starts_at: pass.startsAt,
      layer_mm: pass.layerMm,
      water_temperature_c: pass.waterTemperatureC,
      flow_l_per_min: pass.flowLPerMin,
      changed_by: changedBy,
      changed_at: now,
    })),
  )
}
