// A message that tries a channel out, and what became of it.
import type { Db } from '@/db/knex'
import type { MessageState } from './messages'

export interface TestState {
  state: MessageState
  /** What the mail server or the push service said last, when it refused. */
  error: string | null
}

/** One's own only. */
export async function findTestState(db: Db, userId: string, messageId: string): Promise<TestState | undefined> {
  return db('messages as m')
    .leftJoin('delivery_attempts as a', 'a.message_id', 'm.id')
    .where({ 'm.id': messageId, 'm.user_id': userId, 'm.kind': 'test' })
    .orderBy('a.attempted_at', 'desc')
    .first({ state: 'm.state', error: 'a.error' })
}

/** The message that a dedupe key stands for. */
export async function findMessageId(db: Db, dedupeKey: string): Promise<string | undefined> {
  const row = await db('messages').where({ dedupe_key: dedupeKey }).first('id')
  return row?.id
}
