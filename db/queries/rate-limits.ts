// How often something was tried within a fixed window of time.
import type { Db } from '@/db/knex'

/** Counts one try and returns how many there are now: one statement, so tries at once cannot slip past each other. */
export async function countHit(db: Db, key: string, windowStartsAt: Date): Promise<number> {
  const [row] = await db('rate_limits')
    .insert({ key, window_starts_at: windowStartsAt, hits: 1 })
    .onConflict(['key', 'window_starts_at'])
    .merge({ hits: db.raw('rate_limits.hits + 1') })
    .returning('hits')
  if (!row) throw new Error('An upsert returned no row')
  return row.hits
}

export async function takeBackHit(db: Db, key: string, windowStartsAt: Date): Promise<void> {
  const counter = { key, window_starts_at: windowStartsAt }
  const lowered = await db('rate_limits').where(counter).where('hits', '>', 1).decrement('hits', 1)
  // A row stands for at least one try.
  if (lowered === 0)
    await db('rate_limits')
      .where({ ...counter, hits: 1 })
      .delete()
}
