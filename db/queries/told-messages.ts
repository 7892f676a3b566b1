// What one person was told about one rink, newest first.
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import type { MessageKind, MessageState } from './messages'

export interface ToldMessageRow {
  id: string
  kind: MessageKind
  channel: 'email' | 'push'
  /** The night it is about. */
  nightDate: string | null
  state: MessageState
  createdAt: Date
  settledAt: Date | null
}

export async function listToldMessages(
  db: Db,
  access: RinkAccess<'receiveAlerts'>,
  userId: string,
  limit: number,
): Promise<ToldMessageRow[]> {
  return db('messages')
    .where({ rink_id: access.rinkId, user_id: userId })
    .orderBy([{ column: 'created_at', order: 'desc' }, 'id'])
    .limit(limit)
    .select({
      id: 'id',
      kind: 'kind',
      channel: 'channel',
      state: 'state',
      createdAt: 'created_at',
      settledAt: 'settled_at',
    })
    .select<ToldMessageRow[]>(db.raw(`coalesce((content->>'fillDate')::date, night_date) as "nightDate"`))
}
