// Subscriptions and what was caught for them. Subscriptions outlive a restart in a file, like a browser's would.
import { createECDH, randomBytes, randomUUID } from 'node:crypto'
import { readFileSync, writeFileSync } from 'node:fs'
import { z } from 'zod'
import type { ReceiverKeys } from './decrypt'
import type { Sender } from './vapid'

const MOST_KEPT = 500

const subscriptionSchema = z.object({
  id: z.string(),
  privateKey: z.string(),
  auth: z.string(),
  /** The one sender that may push here (RFC 8292 section 4); the first to push, when none was named. */
  senderKey: z.string().optional(),
  isCancelled: z.boolean().default(false),
})
type Subscription = z.infer<typeof subscriptionSchema>

export interface CaughtPush {
  id: string
  subscriptionId: string
  receivedAt: string
  expiresAt: string
  ttlSeconds: number
  topic: string | null
  urgency: string
  sizeBytes: number
  sender: Sender
  /** Decrypted. */
  text: string
  /** The text as JSON, null when it is none. */
  payload: unknown
  /** A newer push with the same topic took its place before it was shown (RFC 8030 section 5.4). */
  isReplaced: boolean
}

export type PushStore = ReturnType<typeof createPushStore>

export function createPushStore(file: string) {
  const subscriptions = new Map(readSubscriptions(file).map((one) => [one.id, one]))
  const save = () => writeFileSync(file, JSON.stringify([...subscriptions.values()]), { mode: 0o600 })
  let caught: CaughtPush[] = []
  let count = 0
  return {
    subscribe(senderKey?: string): { id: string; keys: { p256dh: string; auth: string } } {
      const ecdh = createECDH('prime256v1')
      const p256dh = ecdh.generateKeys('base64url')
      const auth = randomBytes(16).toString('base64url')
      const id = randomUUID()
      const privateKey = ecdh.getPrivateKey('base64url')
      subscriptions.set(id, { id, privateKey, auth, senderKey, isCancelled: false })
      save()
      return { id, keys: { p256dh, auth } }
    },
    find: (id: string): Subscription | undefined => subscriptions.get(id),
    cancel(subscription: Subscription): void {
      subscription.isCancelled = true
      save()
    },
    /** False when the subscription belongs to another sender. */
    admitSender(subscription: Subscription, senderKey: string): boolean {
      if (!subscription.senderKey) {
        subscription.senderKey = senderKey
        save()
      }
      return subscription.senderKey === senderKey
    },
    add(push: Omit<CaughtPush, 'id' | 'isReplaced'>): CaughtPush {
      const isOlder = (one: CaughtPush) =>
        push.topic !== null && one.topic === push.topic && one.subscriptionId === push.subscriptionId
      const added = { id: String((count += 1)), ...push, isReplaced: false }
      const older = caught.map((one) => (isOlder(one) ? { ...one, isReplaced: true } : one))
      caught = [...older, added].slice(-MOST_KEPT)
      return added
    },
    list: (subscriptionId?: string): CaughtPush[] =>
      caught.filter((one) => !subscriptionId || one.subscriptionId === subscriptionId),
    clear(): void {
      caught = []
    },
  }
}

export function receiverKeys({ privateKey, auth }: Subscription): ReceiverKeys {
  const ecdh = createECDH('prime256v1')
  ecdh.setPrivateKey(privateKey, 'base64url')
  return { ecdh, auth: Buffer.from(auth, 'base64url') }
}

/** A file that is absent or spoilt means no subscriptions: the product then learns that they are gone. */
function readSubscriptions(file: string): Subscription[] {
  try {
    return z.array(subscriptionSchema).parse(JSON.parse(readFileSync(file, 'utf8')))
  } catch {
    return []
  }
}
