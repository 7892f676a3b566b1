// The push resource: checks a push as a push service does, and opens it as the browser would (RFC 8030, 8291, 8292).
import { z } from 'zod'
import type { Faults } from '../faults'
import { answer, readBody } from '../http'
import type { Exchange } from '../http'
import { decryptPush } from './decrypt'
import type { PushStore } from './store'
import { receiverKeys } from './store'
import { VapidError, verifyVapid } from './vapid'

export const PUSH_FAULTS = ['404', '410', '413', '429', '503', 'hang'] as const
export type PushFault = (typeof PUSH_FAULTS)[number]

/** Asked for with 429 and 503. */
const RETRY_AFTER_SECONDS = 120
/** RFC 8030 section 7.2: a service must take 4,096 bytes; ours takes no more. */
const LARGEST_PUSH = 4096

const headersSchema = z.object({
  'content-encoding': z.literal('aes128gcm'),
  ttl: z.string().regex(/^\d+$/, 'TTL is required, in seconds').transform(Number),
  topic: z
    .string()
    .regex(/^[\w-]{1,32}$/, 'Topic takes at most 32 URL-safe characters')
    .optional(),
  urgency: z.enum(['very-low', 'low', 'normal', 'high']).default('normal'),
})

export interface PushService {
  store: PushStore
  faults: Faults<PushFault>
  origin: string
}

export async function receivePush({ store, faults, origin }: PushService, { request, response, route }: Exchange) {
  const [, id = ''] = /^POST \/push\/([\w-]+)$/.exec(route) ?? []
  const subscription = store.find(id)
  if (!subscription) return answer(response, 404, 'no such subscription')
  if (subscription.isCancelled) return answer(response, 410, 'the subscription was cancelled')
  const body = await readBody(request)
  const fault = faults.take(id)
  if (fault === 'hang') return
  if (fault) return answer(response, Number(fault), 'as told', faultHeaders(fault))
  if (body.length > LARGEST_PUSH) return answer(response, 413, `at most ${LARGEST_PUSH} bytes`)

  const now = new Date()
  try {
    const sender = verifyVapid(request.headers.authorization, origin, now)
    if (!store.admitSender(subscription, sender.k))
      throw new VapidError(403, 'the subscription belongs to another sender')
    const { ttl, topic = null, urgency } = headersSchema.parse(request.headers)
    const text = decryptPush(body, receiverKeys(subscription)).toString('utf8')
    const push = store.add({
      subscriptionId: id,
      receivedAt: now.toISOString(),
      expiresAt: new Date(now.getTime() + ttl * 1000).toISOString(),
      ttlSeconds: ttl,
      topic,
      urgency,
      sizeBytes: body.length,
      sender,
      text,
      payload: parseOrNull(text),
    })
    answer(response, 201, '', { Location: `${origin}/messages/${push.id}`, TTL: String(ttl) })
  } catch (error) {
    answer(response, error instanceof VapidError ? error.status : 400, error instanceof Error ? error.message : '')
  }
}

function faultHeaders(fault: PushFault): Record<string, string> {
  return fault === '429' || fault === '503' ? { 'Retry-After': String(RETRY_AFTER_SECONDS) } : {}
}

function parseOrNull(text: string): unknown {
  try {
    return JSON.parse(text)
  } catch {
    return null
  }
}
