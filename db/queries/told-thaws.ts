// Which thaws people heard of.
import type { Db } from '@/db/knex'
import type { Thaw } from '@/lib/advice/types'

export interface ToldThawRow extends Pick<Thaw, 'startsAt' | 'endsAt'> {
  userId: string
  channel: 'email' | 'push'
}

/** What never arrived was not told. */
export async function listToldThaws(db: Db, rinkId: string, since: Date): Promise<ToldThawRow[]> {
  return db('messages')
    .where({ rink_id: rinkId, kind: 'thaw-ahead' })
    .whereIn('state', ['promised', 'delivered'])
    .where('created_at', '>=', since)
    .select({ userId: 'user_id', channel: 'channel' })
    .select<ToldThawRow[]>(db.raw(`content->'thaw'->>'startsAt' as "startsAt", content->'thaw'->>'endsAt' as "endsAt"`))
}
