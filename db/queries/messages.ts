// Promised messages and their deliveries.
import type { Db } from '@/db/knex'
import { enqueueJob } from './jobs'

export type MessageKind =
  | 'flood-tonight'
  | 'flood-changed'
  | 'flood-closed'
  | 'fill-check'
  | 'fill-ahead'
  | 'fill-changed'
  | 'fill-closed'
  | 'thaw-ahead'
  | 'verify-address'
  | 'sign-in-link'
  | 'reset-password'
  | 'address-already-registered'
  | 'test'
  | 'change-address'
  | 'address-changed'
  | 'deletion-asked'
  | 'rink-invitation'

export type MessageState = 'promised' | 'delivered' | 'expired' | 'dead'

export interface NewMessage {
  /** Why this message exists once: the same key again changes nothing, unless the message was given up. */
  dedupeKey: string
  userId: string
  rinkId?: string
  nightDate?: string
  channel: 'email' | 'push'
  kind: MessageKind
  /** Finished words for alerts; for account mail `{ linkId }`, for an invitation its id; never a token. */
  content: Record<string, unknown>
  windowId?: string
  sendAt: Date
  expiresAt: Date
}

/**
 * Promises a message and its delivery together: called inside the transaction of the decision. One that was given up is
 * promised anew, with what is said now: what never arrived was not told.
 *
 * @returns true when this call made the promise, false when it stands already or was kept.
 */
export async function promiseMessage(trx: Db, message: NewMessage, now: Date): Promise<boolean> {
  const promised = {
    dedupe_key: message.dedupeKey,
    user_id: message.userId,
    rink_id: message.rinkId ?? null,
    night_date: message.nightDate ?? null,
    channel: message.channel,
    kind: message.kind,
    content: JSON.stringify(message.content),
    window_id: message.windowId ?? null,
    send_at: message.sendAt,
    expires_at: message.expiresAt,
    state: 'promised' as const,
    settled_at: null,
    created_at: now,
  }
  const [row] = await trx('messages')
    .insert(promised)
    .onConflict('dedupe_key')
    .merge(promised)
    // Of two decisions at once the second waits for the first here, and then finds a promise that stands.
    .whereIn('messages.state', ['dead', 'expired'])
    .returning('id')
  if (!row) return false
  await enqueueDelivery(trx, row.id, message.sendAt)
  return true
}

/** One pending delivery job per message, however often it is asked for. */
export async function enqueueDelivery(db: Db, messageId: string, runAt: Date): Promise<void> {
  await enqueueJob(db, 'deliver-message', { messageId }, { key: `message:${messageId}`, runAt })
}
