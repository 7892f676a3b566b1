// Delivering promised messages. Sending happens outside any transaction; the outcome is settled by a conditional update.
import {
  findMessageToDeliver,
  insertAttempt,
  isTaken,
  listDeliveredDevices,
  settleMessage,
  type MessageToDeliver,
} from '@/db/queries/deliveries'
import { enqueueDelivery } from '@/db/queries/messages'
import { disablePushSubscription, listEnabledPushSubscriptions } from '@/db/queries/push-subscriptions'
import { noteEmailRefused } from '@/db/queries/users'
import type { Db } from '@/db/knex'
import { logEvent } from '@/lib/log'
import { DeliveryError, type EmailTransport, type PushTransport } from '@/lib/messaging/port'
import { nextAttemptAt } from '@/lib/messaging/retry'
import { pushTopic } from '@/lib/messaging/push-topic'
import { testContentSchema } from '@/lib/schemas/alert-content'
import { renderEmail, renderPush, type RenderSettings } from './render-message'

export interface Delivering {
  db: Db
  /** Read again after each send: a send can take its time. */
  readClock: () => Date
  email: EmailTransport
  push: PushTransport
  settings: RenderSettings
}

interface Failure {
  isPermanent: boolean
  retryAfterSeconds: number | null
}

/**
 * Tries to deliver a message. A crash between sending and settling sends again: mail then carries the same Message-ID
 * and a push the same topic and tag, so the person sees one.
 */
export async function deliverMessage(delivering: Delivering, messageId: string): Promise<void> {
  const { db, readClock } = delivering
  const message = await findMessageToDeliver(db, messageId)
  if (!message) return
  // An older message that was held up must not have the last word, nor one that the person has said no to since.
  if (readClock() >= message.expiresAt || message.isOvertaken || message.isUnwanted) {
    return end(delivering, message, (await isTaken(db, message.id)) ? 'delivered' : 'expired')
  }
  const failures =
    message.channel === 'email' ? await sendEmail(delivering, message) : await sendPushes(delivering, message)
  await settle(delivering, message, failures)
}

async function settle(delivering: Delivering, message: MessageToDeliver, failures: Failure[]): Promise<void> {
  const { db, readClock } = delivering
  const temporary = failures.filter((failure) => !failure.isPermanent)
  if (temporary.length === 0) return end(delivering, message, failures.length === 0 ? 'delivered' : 'dead')
  const retryAfterSeconds = Math.max(...temporary.map((failure) => failure.retryAfterSeconds ?? 0))
  const again = nextAttemptAt({
    attempt: message.attempts + 1,
    now: readClock(),
    expiresAt: message.expiresAt,
    retryAfterSeconds,
    key: message.id,
  })
  if (again) return enqueueDelivery(db, message.id, again)
  // One device that took it is enough: given up, it would count as not told, and be told there a second time.
  await end(delivering, message, (await isTaken(db, message.id)) ? 'delivered' : 'dead')
}

async function end(
  { db, readClock }: Delivering,
  { id: messageId, kind }: MessageToDeliver,
  state: 'delivered' | 'expired' | 'dead',
): Promise<void> {
  if (await settleMessage(db, messageId, state, readClock())) logEvent(`message.${state}`, { messageId, kind })
}

/** Sends one thing and keeps the attempt; undefined when it went. */
async function attempt(
  { db, readClock }: Delivering,
  target: { messageId: string; pushSubscriptionId?: string },
  send: () => Promise<void>,
): Promise<(Failure & { error: string }) | undefined> {
  const attemptedAt = readClock()
  try {
    await send()
  } catch (error) {
    if (!(error instanceof DeliveryError)) throw error
    const outcome = error.permanent ? 'permanent' : 'temporary'
    await insertAttempt(db, { ...target, attemptedAt, outcome, error: error.message })
    return { isPermanent: error.permanent, retryAfterSeconds: error.retryAfterSeconds, error: error.message }
  }
  await insertAttempt(db, { ...target, attemptedAt, outcome: 'delivered' })
  return undefined
}

async function sendEmail(delivering: Delivering, message: MessageToDeliver): Promise<Failure[]> {
  const mail = renderEmail(message, delivering.settings)
  const failure = await attempt(delivering, { messageId: message.id }, () => delivering.email.send(mail))
  if (failure?.isPermanent) await noteEmailRefused(delivering.db, message.userId, mail.to, delivering.readClock())
  return failure ? [failure] : []
}

/** One send per device; devices that took it stay served, devices that are gone are disabled and no failure of the message. */
async function sendPushes(delivering: Delivering, message: MessageToDeliver): Promise<Failure[]> {
  const { db, readClock } = delivering
  const served = new Set(await listDeliveredDevices(db, message.id))
  const devices = (await devicesFor(db, message)).filter(({ id }) => !served.has(id))
  const payload = renderPush(message, delivering.settings)
  const failures: Failure[] = []
  for (const { id, ...subscription } of devices) {
    const failure = await attempt(delivering, { messageId: message.id, pushSubscriptionId: id }, () =>
      delivering.push.send({
        subscription,
        payload,
        topic: pushTopic(payload.tag),
        ttlSeconds: Math.max(0, Math.floor((message.expiresAt.getTime() - readClock().getTime()) / 1000)),
      }),
    )
    if (failure) failures.push(failure)
    if (failure?.isPermanent) await disablePushSubscription(db, id, failure.error, readClock())
  }
  const isServed = served.size > 0 || devices.length > failures.length
  if (isServed) return failures.filter((failure) => !failure.isPermanent)
  return failures.length > 0 ? failures : [{ isPermanent: true, retryAfterSeconds: null }]
}

/** All of the person's; a test goes to the one that is tried. */
async function devicesFor(db: Db, message: MessageToDeliver) {
  const devices = await listEnabledPushSubscriptions(db, message.userId)
  if (message.kind !== 'test') return devices
  const { deviceId } = testContentSchema.parse(message.content)
  return devices.filter(({ id }) => id === deviceId)
}
