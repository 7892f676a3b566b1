// Where a rink's water can come from, as the log needs it.
import type { Db } from '@/db/knex'
import type { WaterSourceRow } from '@/db/types'
import type { RinkAccess } from '@/lib/access/proofs'

export interface WaterSource {
  kind: WaterSourceRow['kind']
  temperatureC: number
  flowLPerMin: number
}

/** The default source first. */
export async function listWaterSources(db: Db, access: RinkAccess): Promise<WaterSource[]> {
  return db('water_sources')
    .where({ rink_id: access.rinkId })
    .orderBy([{ column: 'is_default', order: 'desc' }, { column: 'kind' }])
    .select({ kind: 'kind', temperatureC: 'temperature_c', flowLPerMin: 'flow_l_per_min' })
}
