// Delivering: over real SMTP and real encrypted push; retries, expiry, and a crash between sending and settling.
import { randomUUID } from 'node:crypto'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest'
import webPush from 'web-push'
import { promiseMessage, type MessageKind } from '@/db/queries/messages'
import { putPushSubscription } from '@/db/queries/push-subscriptions'
import { startMailFake, type MailFake } from '@/fakes/mail/server'
import { startPushFake, type PushFake } from '@/fakes/push/server'
import { createSmtpTransport } from '@/lib/messaging/smtp'
import { createWebPushTransport } from '@/lib/messaging/web-push'
import { deliverMessage, type Delivering } from '@/lib/services/deliveries'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { SETTINGS } from '@/tests/support/night-at-the-rink'

const NOW = new Date('2027-01-12T21:10:00Z')
const LATER = new Date('2027-01-13T04:00:00Z')

const database = givenDatabase()
const cast = givenCast(database, NOW)
let mail: MailFake
let push: PushFake
let delivering: Delivering

beforeAll(async () => {
  const caFile = path.join(tmpdir(), `nightsheet-${randomUUID()}.pem`)
  ;[mail, push] = await Promise.all([
    startMailFake({ smtpPort: 0, pagePort: 0 }),
    startPushFake({ port: 0, pagePort: 0, caFile }),
  ])
  const vapid = { ...webPush.generateVAPIDKeys(), subject: 'mailto:keeper@nightsheet.example' }
  delivering = {
    db: database.db,
    readClock: () => NOW,
    email: createSmtpTransport({ url: mail.smtpUrl, from: 'Nightsheet <night@nightsheet.example>' }),
    push: createWebPushTransport({ vapid, extraOrigins: [push.origin], caFile }),
    settings: SETTINGS,
  }
})
afterAll(() => Promise.all([mail.close(), push.close()]))
beforeEach(async () => {
  await fetch(`${mail.url}/api/messages`, { method: 'DELETE' })
  await fetch(`${push.url}/api/messages`, { method: 'DELETE' })
})

const WORDS = {
  rinkName: 'Birch Lane',
  nightLabel: 'Tue 12 to Wed 13 January',
  sentence: 'Flood tonight between 8 pm and 1 am.',
  sure: '9 of 10 forecast runs agree.',
  passes: [{ at: '8:00 pm', what: '3 mm over the whole sheet' }],
  cautions: ['Do not flood alone.'],
  why: [],
}

async function promise(channel: 'email' | 'push', kind: MessageKind = 'flood-tonight', now = NOW): Promise<string> {
  const dedupeKey = `${kind}:${cast.rinkId}:2027-01-12:${channel}:${cast.keeper.userId}`
  await promiseMessage(
    database.db,
    {
      dedupeKey,
      userId: cast.keeper.userId,
      rinkId: cast.rinkId,
      nightDate: '2027-01-12',
      channel,
      kind,
      content: { rinkId: cast.rinkId, nightDate: '2027-01-12', words: WORDS },
      sendAt: NOW,
      expiresAt: LATER,
    },
    now,
  )
  const row = await database.db('messages').where({ dedupe_key: dedupeKey }).first('id')
  return row?.id ?? ''
}

const stateOf = async (id: string) => (await database.db('messages').where({ id }).first('state'))?.state

async function addDevice(): Promise<{ id: string; deviceId: string }> {
  const response = await fetch(`${push.url}/subscriptions`, { method: 'POST', body: '{}' })
  const { id, endpoint, keys } = (await response.json()) as {
    id: string
    endpoint: string
    keys: { p256dh: string; auth: string }
  }
  const { id: deviceId } = await putPushSubscription(database.db, cast.keeper.userId, { endpoint, ...keys }, NOW)
  return { id, deviceId }
}

async function caughtMail(): Promise<{ id: string; to: string[]; subject: string }[]> {
  return (await fetch(`${mail.url}/api/messages?to=${encodeURIComponent(cast.keeper.email)}`)).json()
}

async function caughtPushes(id: string): Promise<{ text: string }[]> {
  return (await fetch(`${push.url}/api/messages?id=${id}`)).json()
}

const fault = (url: string, kind: string, times: number) =>
  fetch(`${url}/__fake/fault`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ kind, times }),
  })

describe('mail', () => {
  test('arrives with one-click unsubscribe, and once however often the job runs', async () => {
    const id = await promise('email')
    await deliverMessage(delivering, id)
    await deliverMessage(delivering, id)
    const caught = await caughtMail()
    expect(caught).toHaveLength(1)
    const raw = await (await fetch(`${mail.url}/api/messages/${caught[0]?.id}`)).text()
    expect(raw).toContain('List-Unsubscribe=One-Click')
    expect(raw).toContain(`${id}@rink.example`)
    expect(await stateOf(id)).toBe('delivered')
  })

  test('is tried again after a temporary refusal', async () => {
    const id = await promise('email')
    await fault(mail.url, '451', 1)
    await deliverMessage(delivering, id)
    expect(await stateOf(id)).toBe('promised')
    const { rows } = await database.db.raw('select run_at > ? as later from graphile_worker.jobs where key = ?', [
      NOW,
      `message:${id}`,
    ])
    expect(rows).toEqual([{ later: true }])
    await deliverMessage(delivering, id)
    expect(await stateOf(id)).toBe('delivered')
  })

  test('is given up after a refusal for good', async () => {
    const id = await promise('email')
    await fault(mail.url, '550', 1)
    await deliverMessage(delivering, id)
    expect(await stateOf(id)).toBe('dead')
    expect(await database.db('delivery_attempts').where({ message_id: id }).select('outcome')).toEqual([
      { outcome: 'permanent' },
    ])
    const person = await database.db('users').where({ id: cast.keeper.userId }).first('email_refused_at')
    expect(person?.email_refused_at).toEqual(NOW)
  })

  test('is dropped when it is late news', async () => {
    const id = await promise('email')
    await deliverMessage({ ...delivering, readClock: () => LATER }, id)
    expect(await stateOf(id)).toBe('expired')
    expect(await caughtMail()).toEqual([])
  })

  test('is dropped when newer news of the night was promised meanwhile', async () => {
    const held = await promise('email')
    const newer = await promise('email', 'flood-closed', new Date(NOW.getTime() + 1000))
    await deliverMessage(delivering, newer)
    await deliverMessage(delivering, held)
    expect(await database.db('messages').where({ id: held }).first('state')).toEqual({ state: 'expired' })
    expect(await (await fetch(`${mail.url}/api/messages`)).json()).toHaveLength(1)
  })

  test.each([{ muted_through: '2027-01-12' }, { wants_email: false }])(
    'is not sent to somebody who said no after it was promised: %o',
    async (choice) => {
      const id = await promise('email')
      await database.db('alert_preferences').where({ rink_id: cast.rinkId, user_id: cast.keeper.userId }).update(choice)
      await deliverMessage(delivering, id)
      expect(await stateOf(id)).toBe('expired')
      expect(await caughtMail()).toEqual([])
    },
  )

  test('sent again after a crash before settling keeps its Message-ID', async () => {
    const id = await promise('email')
    await database.db.raw(`alter table delivery_attempts add constraint crash check (message_id <> '${id}') not valid`)
    await expect(deliverMessage(delivering, id)).rejects.toThrow('crash')
    await database.db.raw('alter table delivery_attempts drop constraint crash')
    await deliverMessage(delivering, id)
    const raws = await Promise.all(
      (await caughtMail()).map(async (one) => (await fetch(`${mail.url}/api/messages/${one.id}`)).text()),
    )
    expect(raws).toHaveLength(2)
    expect(raws.every((raw) => raw.includes(`${id}@rink.example`))).toBe(true)
    expect(await stateOf(id)).toBe('delivered')
  })
})

describe('push', () => {
  test('reaches every device once, encrypted', async () => {
    const [one, two] = [await addDevice(), await addDevice()]
    const id = await promise('push')
    await deliverMessage(delivering, id)
    await deliverMessage(delivering, id)
    for (const device of [one, two]) {
      const caught = await caughtPushes(device.id)
      expect(caught).toHaveLength(1)
      expect(JSON.parse(caught[0]?.text ?? '')).toMatchObject({
        body: `${WORDS.sentence} ${WORDS.sure}`,
        url: `https://rink.example/rinks/${cast.rinkId}`,
      })
    }
    expect(await stateOf(id)).toBe('delivered')
  })

  test('tries again only the device that failed', async () => {
    const [one, two] = [await addDevice(), await addDevice()]
    const id = await promise('push')
    await fault(push.url, '503', 1)
    await deliverMessage(delivering, id)
    expect(await stateOf(id)).toBe('promised')
    await deliverMessage(delivering, id)
    expect(await stateOf(id)).toBe('delivered')
    expect(await caughtPushes(one.id)).toHaveLength(1)
    expect(await caughtPushes(two.id)).toHaveLength(1)
  })

  test('disables a device that is gone, and says why', async () => {
    const { deviceId } = await addDevice()
    const id = await promise('push')
    await fault(push.url, '410', 1)
    await deliverMessage(delivering, id)
    const device = await database
      .db('push_subscriptions')
      .where({ id: deviceId })
      .first('disabled_at', 'disabled_reason')
    expect(device?.disabled_at).toEqual(NOW)
    expect(device?.disabled_reason).toBeTruthy()
    expect(await stateOf(id)).toBe('dead')
  })
})
