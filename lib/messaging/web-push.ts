// Web push (RFC 8030, 8291, 8292) to the browsers' push services.
import { ECDH } from 'node:crypto'
import { readFile } from 'node:fs/promises'
import { Agent } from 'node:https'
import { rootCertificates } from 'node:tls'
import webPush from 'web-push'
import { readClock } from '@/lib/clock'
import { DeliveryError } from './port'
import type { PushMessage, PushTransport } from './port'
import { isAllowedPushEndpoint, isExtraPushOrigin } from './push-services'
import { redactReason } from './redact'

const SILENCE_MILLIS = 10_000

export interface WebPushSettings {
  vapid: { subject: string; publicKey: string; privateKey: string }
  /** Push services besides the browsers' own. */
  extraOrigins: string[]
  /** PEM file of an authority trusted for the extra origins, and for no others. */
  caFile?: string
  /** How long a push service may say nothing before the try counts as failed. */
  silenceMillis?: number
}

/** A transport that throws DeliveryError and nothing else. */
export function createWebPushTransport(settings: WebPushSettings): PushTransport {
  const { vapid, extraOrigins, silenceMillis = SILENCE_MILLIS } = settings
  const publicAgent = new Agent({ keepAlive: true })
  const extraAgent = createExtraAgent(settings.caFile)
  return {
    async send({ subscription, payload, topic, ttlSeconds }) {
      const { endpoint, p256dh, auth } = subscription
      if (!isAllowedPushEndpoint(endpoint, extraOrigins)) throw new DeliveryError('not a known push service', true)
      if (!areUsableKeys(subscription)) throw new DeliveryError('the subscription keys are malformed', true)
      try {
        await webPush.sendNotification({ endpoint, keys: { p256dh, auth } }, JSON.stringify(payload), {
          vapidDetails: vapid,
          TTL: Math.max(0, Math.floor(ttlSeconds)),
          topic,
          // RFC 8030 section 5.3: a phone that saves power holds back anything less until it is next picked up.
          urgency: 'high',
          agent: isExtraPushOrigin(endpoint, extraOrigins) ? await extraAgent() : publicAgent,
          timeout: silenceMillis,
        })
      } catch (error) {
        throw toDeliveryError(error)
      }
    },
  }
}

/** The file is read at each use, because a local push service makes itself a new authority whenever it starts. */
function createExtraAgent(caFile: string | undefined): () => Promise<Agent> {
  let current = { pem: '', agent: new Agent() }
  return async () => {
    const pem = caFile ? await readFile(caFile, 'utf8') : ''
    if (pem !== current.pem) current = { pem, agent: new Agent({ ca: [...rootCertificates, pem] }) }
    return current.agent
  }
}

/** A point on P-256 and 16 bytes (RFC 8291 sections 3.1 and 3.2). */
function areUsableKeys({ p256dh, auth }: PushMessage['subscription']): boolean {
  try {
    ECDH.convertKey(p256dh, 'prime256v1', 'base64url')
  } catch {
    return false
  }
  return Buffer.from(auth, 'base64url').length === 16
}

/** 404 and 410: the subscription is gone. 413: it takes no message of ours. Refused VAPID keys are our fault, not its. */
const PERMANENT_STATUSES = [404, 410, 413]

function toDeliveryError(error: unknown): DeliveryError {
  if (!(error instanceof webPush.WebPushError))
    return new DeliveryError('push service not reached', false, { cause: error })
  const { statusCode, headers, body } = error
  const reason = `push service answered ${statusCode} ${redactReason(body)}`.trim()
  return new DeliveryError(reason, PERMANENT_STATUSES.includes(statusCode), {
    retryAfterSeconds: readRetryAfter(headers['retry-after']),
  })
}

/** Seconds, or an HTTP date (RFC 9110 section 10.2.3). */
function readRetryAfter(value: string | undefined): number | undefined {
  if (!value) return undefined
  const seconds = /^\d+$/.test(value) ? Number(value) : (Date.parse(value) - readClock().getTime()) / 1000
  return Number.isFinite(seconds) ? Math.max(0, Math.ceil(seconds)) : undefined
}
