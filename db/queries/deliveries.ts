// A promised message on its way out: claim, attempts, settlement.
import type { Db } from '@/db/knex'
import { isGranted, type Role } from '@/lib/access/permissions'
import { FILL_DAY_KINDS } from './fill-days'
import type { MessageKind, MessageState } from './messages'

export interface MessageToDeliver {
  id: string
  userId: string
  rinkId: string | null
  channel: 'email' | 'push'
  kind: MessageKind
  content: Record<string, unknown>
  expiresAt: Date
  createdAt: Date
  email: string
  /** The person was promised newer news of the same night, or of the day to fill, on the same channel. */
  isOvertaken: boolean
  /** The person has muted the night, switched the channel off, left the rink or may be told of it no more since; an
   *  invitation stands no more. */
  isUnwanted: boolean
  /** Tries since it was promised, the last time that it was. */
  attempts: number
}

/** The message with the address it goes to, or undefined when it is settled or gone. */
export async function findMessageToDeliver(db: Db, messageId: string): Promise<MessageToDeliver | undefined> {
  const message = await db('messages as m')
    .join('users as u', 'u.id', 'm.user_id')
    .leftJoin('account_links as l', db.raw(`l.id = (m.content->>'linkId')::uuid`))
    .leftJoin('invitations as i', db.raw(`i.id = (m.content->>'invitationId')::uuid`))
    .leftJoin('rink_members as k', (on) => on.on('k.rink_id', 'm.rink_id').andOn('k.user_id', 'm.user_id'))
    .where({ 'm.id': messageId, 'm.state': 'promised' })
    .select({
      id: 'm.id',
      userId: 'm.user_id',
      rinkId: 'm.rink_id',
      channel: 'm.channel',
      kind: 'm.kind',
      content: 'm.content',
      expiresAt: 'm.expires_at',
      createdAt: 'm.created_at',
      role: 'k.role',
      // A new address is confirmed by whoever reads its mail; of a changed one the old address hears; who is invited may
      // have no account.
      email: db.raw(`coalesce(m.content->>'oldEmail', i.email, l.new_email, u.email)`),
    })
    .select(
      db.raw(
        `exists (select 1 from messages newer
                 where newer.user_id = m.user_id and newer.rink_id = m.rink_id
                   and newer.channel = m.channel and newer.created_at > m.created_at
                   and case when m.kind = any(:fillDays)
                     -- Of the day to fill the last word counts, on whichever night it was said.
                     then newer.kind = any(:fillDays)
                     -- Neither it, a look at a hose nor a thaw is news of the night.
                     else newer.night_date = m.night_date and newer.kind <> all(:fillDays)
                       and (newer.kind = 'fill-check') = (m.kind = 'fill-check')
                       and (newer.kind = 'thaw-ahead') = (m.kind = 'thaw-ahead') end) as "isOvertaken"`,
        { fillDays: FILL_DAY_KINDS },
      ),
      db.raw(
        `exists (select 1 from alert_preferences p
                 where p.rink_id = m.rink_id and p.user_id = m.user_id
                   and (p.muted_through >= m.night_date
                        or not case m.channel when 'email' then p.wants_email else p.wants_push end))
         -- A day to fill is news for as long as the rink waits.
         or m.kind = any(:fillDays)
           and not exists (select 1 from rinks r where r.id = m.rink_id and r.phase = 'waiting')
         -- Of an invitation that went with its rink, no mail must go to who sent it.
         or m.kind = 'rink-invitation' and (i.id is null or i.taken_at is not null or i.withdrawn_at is not null)
           as "isUnwanted"`,
        { fillDays: FILL_DAY_KINDS },
      ),
    )
    .first<(Omit<MessageToDeliver, 'attempts'> & { role: Role | null }) | undefined>()
  if (!message) return undefined
  const counted = await db('delivery_attempts')
    .where({ message_id: messageId })
    .where('attempted_at', '>=', message.createdAt)
    .countDistinct({ tries: 'attempted_at' })
    .first()
  const { role, ...rest } = message
  const isOutsider = message.rinkId !== null && !(role && isGranted(role, 'receiveAlerts'))
  return { ...rest, isUnwanted: message.isUnwanted || isOutsider, attempts: Number(counted?.tries ?? 0) }
}

/** Whether a mail server, or one device at least, took this message. */
export async function isTaken(db: Db, messageId: string): Promise<boolean> {
  return (
    (await db('delivery_attempts').where({ message_id: messageId, outcome: 'delivered' }).first('id')) !== undefined
  )
}

/** Devices that took this message already: another try leaves them alone. */
export async function listDeliveredDevices(db: Db, messageId: string): Promise<string[]> {
  const rows = await db('delivery_attempts')
    .where({ message_id: messageId, outcome: 'delivered' })
    .whereNotNull('push_subscription_id')
    .select('push_subscription_id')
  return rows.flatMap(({ push_subscription_id: id }) => (id ? [id] : []))
}

export interface Attempt {
  messageId: string
  pushSubscriptionId?: string
  attemptedAt: Date
  outcome: 'delivered' | 'temporary' | 'permanent'
  error?: string
}

export async function insertAttempt(db: Db, attempt: Attempt): Promise<void> {
  await db('delivery_attempts').insert({
    message_id: attempt.messageId,
    push_subscription_id: attempt.pushSubscriptionId ?? null,
    attempted_at: attempt.attemptedAt,
    outcome: attempt.outcome,
    error: attempt.error?.slice(0, 500) ?? null,
  })
}

/** Ends a message once; false when it was ended before. */
export async function settleMessage(
  db: Db,
  messageId: string,
  state: Exclude<MessageState, 'promised'>,
  now: Date,
): Promise<boolean> {
  const count = await db('messages').where({ id: messageId, state: 'promised' }).update({ state, settled_at: now })
  return count > 0
}
