// What people heard of the day to fill.
import type { Db } from '@/db/knex'
import type { FillDayKind, ToldFillDay } from '@/lib/advice/fill-day-due'

export const FILL_DAY_KINDS: FillDayKind[] = ['fill-ahead', 'fill-changed', 'fill-closed']

export interface ToldFillDayRow extends ToldFillDay {
  userId: string
  channel: 'email' | 'push'
}

/** What was promised since, newest first. */
export async function listToldFillDays(db: Db, rinkId: string, since: Date): Promise<ToldFillDayRow[]> {
  return (
    db('messages')
      .where({ rink_id: rinkId })
      .whereIn('kind', FILL_DAY_KINDS)
      // What never arrived was not told.
      .whereIn('state', ['promised', 'delivered'])
      .where('created_at', '>=', since)
      .orderBy('created_at', 'desc')
      .select({ userId: 'user_id', channel: 'channel', kind: 'kind', toldAt: 'created_at' })
      .select<ToldFillDayRow[]>(
        db.raw(`content->>'fillDate' as "fillDate", (content->>'startsAt')::timestamptz as "startsAt"`),
      )
  )
}
