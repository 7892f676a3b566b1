// Delivery over real SMTP and real encrypted push, to servers on loopback that keep what they caught.
import { randomUUID } from 'node:crypto'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { afterAll, beforeAll, beforeEach } from 'vitest'
import webPush from 'web-push'
import { startMailFake, type MailFake } from '@/fakes/mail/server'
import { startPushFake, type PushFake } from '@/fakes/push/server'
import { createSmtpTransport } from '@/lib/messaging/smtp'
import { createWebPushTransport } from '@/lib/messaging/web-push'
import type { Delivering } from '@/lib/services/deliveries'
import { SETTINGS } from './night-at-the-rink'
import type { TestDatabase } from './test-database'

export interface CaughtMail {
  id: string
  to: string[]
  subject: string
}

export interface BrowserSubscription {
  /** By which the push service knows it. */
  id: string
  endpoint: string
  keys: { p256dh: string; auth: string }
}

export interface GivenDelivering extends Delivering {
  mail: MailFake
  pushService: PushFake
}

/** Filled before the file's first test; what was caught is forgotten before each. */
export function givenDelivering(database: TestDatabase, now: Date): GivenDelivering {
  const given = {} as GivenDelivering
  beforeAll(async () => {
    const caFile = path.join(tmpdir(), `nightsheet-${randomUUID()}.pem`)
    const [mail, pushService] = await Promise.all([
      startMailFake({ smtpPort: 0, pagePort: 0 }),
      startPushFake({ port: 0, pagePort: 0, caFile }),
    ])
    const vapid = { ...webPush.generateVAPIDKeys(), subject: 'mailto:keeper@nightsheet.example' }
    Object.assign(given, {
      mail,
      pushService,
      db: database.db,
      readClock: () => now,
      email: createSmtpTransport({ url: mail.smtpUrl, from: 'Nightsheet <night@nightsheet.example>' }),
      push: createWebPushTransport({ vapid, extraOrigins: [pushService.origin], caFile }),
      settings: SETTINGS,
    })
  })
  beforeEach(async () => {
    for (const { url } of [given.mail, given.pushService]) await fetch(`${url}/api/messages`, { method: 'DELETE' })
  })
  afterAll(() => Promise.all([given.mail.close(), given.pushService.close()]))
  return given
}

/** What a browser is given by its push service. */
export async function subscribe({ pushService }: GivenDelivering): Promise<BrowserSubscription> {
  return (await fetch(`${pushService.url}/subscriptions`, { method: 'POST', body: '{}' })).json()
}

export async function caughtMails({ mail }: GivenDelivering, to: string): Promise<CaughtMail[]> {
  return (await fetch(`${mail.url}/api/messages?to=${encodeURIComponent(to)}`)).json()
}

export async function caughtPushes({ pushService }: GivenDelivering, id: string): Promise<{ text: string }[]> {
  return (await fetch(`${pushService.url}/api/messages?id=${id}`)).json()
}

/** The next so many answers of a server are refusals of one kind. */
export async function refuseNext({ url }: MailFake | PushFake, kind: string, times = 1): Promise<void> {
  await fetch(`${url}/__fake/fault`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ kind, times }),
  })
}
