// How reading the weather goes, cell by cell.
import type { Db } from '@/db/knex'

export interface CellToRead {
  id: string
  latitudeDeg: number
  longitudeDeg: number
}

/** Nothing is read for rinks that wait for autumn or are closed for the season. */
const IN_SEASON = ['waiting', 'filling', 'freezing', 'skating', 'thaw'] as const

export async function findCell(db: Db, cellId: string): Promise<CellToRead | undefined> {
  return db('grid_cells')
    .where({ id: cellId })
    .first({ id: 'id', latitudeDeg: 'latitude_deg', longitudeDeg: 'longitude_deg' })
}

/** Cells with a rink in season that the provider has not told us to leave alone. */
export async function listCellsDue(db: Db, now: Date): Promise<string[]> {
  const rows = await db('grid_cells as c')
    .whereExists(
      db('rinks as r')
        .select(db.raw('1'))
        .whereRaw('r.grid_cell_id = c.id')
        .whereIn('r.phase', [...IN_SEASON]),
    )
    .where((due) => due.whereNull('c.retry_at').orWhere('c.retry_at', '<=', now))
    .orderBy('c.id')
    .select<{ id: string }[]>('c.id')
  return rows.map(({ id }) => id)
}

/** Rinks of a cell that want a judgement. */
export async function listRinksOfCell(db: Db, cellId: string): Promise<string[]> {
  const rows = await db('rinks')
    .where({ grid_cell_id: cellId })
    .whereIn('phase', [...IN_SEASON])
    .orderBy('id')
    .select('id')
  return rows.map(({ id }) => id)
}

export async function noteCellRead(db: Db, cellId: string, now: Date): Promise<void> {
  await db('grid_cells').where({ id: cellId }).update({ last_tried_at: now, last_error: null, retry_at: null })
}

export async function noteCellTrouble(
  db: Db,
  cellId: string,
  trouble: { error: string; retryAt: Date },
  now: Date,
): Promise<void> {
  await db('grid_cells')
    .where({ id: cellId })
    .update({ last_tried_at: now, last_error: trouble.error.slice(0, 500), retry_at: trouble.retryAt })
}

export async function findCellTrouble(db: Db, cellId: string): Promise<string | null> {
  const cell = await db('grid_cells').where({ id: cellId }).first('last_error')
  return cell?.last_error ?? null
}
