// The places we ask the weather for: one row per cell, shared by every rink in it.
import type { Db } from '@/db/knex'

/** The cell's id, also when another transaction makes it at the same moment. */
export async function findOrCreateGridCell(
  trx: Db,
  cell: { latitudeDeg: number; longitudeDeg: number },
): Promise<{ id: string }> {
  const place = { latitude_deg: cell.latitudeDeg, longitude_deg: cell.longitudeDeg }
  const [made] = await trx('grid_cells')
    .insert(place)
    .onConflict(['latitude_deg', 'longitude_deg'])
    .ignore()
    .returning<{ id: string }[]>('id')
  return made ?? (await trx('grid_cells').where(place).first<{ id: string }>('id'))
}
