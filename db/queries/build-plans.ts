// What the building plan keeps beside the rink's settings: the price of water, and the fill of its usual source.
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'

/** In the keeper's money; null when nobody said. */
export async function findWaterPrice(db: Db, access: RinkAccess): Promise<number | null> {
  const row = await db('rinks').where({ id: access.rinkId }).first<{ price: number | null } | undefined>({
    price: 'water_price_per_m3',
  })
  return row?.price ?? null
}

export async function setFillWater(
  trx: Db,
  access: RinkAccess<'manage'>,
  { fillDepthMm, flowLPerMin }: { fillDepthMm: number; flowLPerMin: number },
): Promise<void> {
  await trx('water_sources')
    .where({ rink_id: access.rinkId, is_default: true })
    .update({ fill_depth_mm: fillDepthMm, flow_l_per_min: flowLPerMin })
}
