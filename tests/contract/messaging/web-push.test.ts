// The push port over real encrypted pushes: what the subscriber reads, and how each refusal is told apart.
import { createECDH } from 'node:crypto'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest'
import webPush from 'web-push'
import { decryptPush } from '@/fakes/push/decrypt'
import { startPushFake } from '@/fakes/push/server'
import type { PushFake } from '@/fakes/push/server'
import type { CaughtPush } from '@/fakes/push/store'
import { verifyVapid } from '@/fakes/push/vapid'
import { DeliveryError } from '@/lib/messaging/port'
import type { PushMessage, PushTransport } from '@/lib/messaging/port'
import { pushTopic } from '@/lib/messaging/push-topic'
import { createWebPushTransport } from '@/lib/messaging/web-push'

const folder = mkdtempSync(join(tmpdir(), 'push-'))
const caFile = join(folder, 'ca.pem')
const vapid = { subject: 'mailto:keeper@nightsheet.test', ...webPush.generateVAPIDKeys() }
let fake: PushFake
let transport: PushTransport
let subscription: PushMessage['subscription']

beforeAll(async () => {
  fake = await startPushFake({ port: 0, pagePort: 0, caFile })
  transport = connect()
})
afterAll(async () => {
  await fake.close()
  rmSync(folder, { recursive: true })
})
beforeEach(async () => {
  await fetch(`${fake.url}/api/messages`, { method: 'DELETE' })
  await setFault('none')
  subscription = await subscribe()
})

const connect = (changes: Partial<Parameters<typeof createWebPushTransport>[0]> = {}) =>
  createWebPushTransport({ vapid, extraOrigins: [fake.origin], caFile, ...changes })

async function subscribe(): Promise<PushMessage['subscription']> {
  const response = await fetch(`${fake.url}/subscriptions`, { method: 'POST' })
  const { endpoint, keys } = (await response.json()) as { endpoint: string; keys: { p256dh: string; auth: string } }
  return { endpoint, ...keys }
}

async function setFault(kind: string, times = 1) {
  await fetch(`${fake.url}/__fake/fault`, { method: 'POST', body: JSON.stringify({ kind, times }) })
}

const subscriptionId = () => subscription.endpoint.split('/').at(-1)

async function caught(): Promise<CaughtPush[]> {
  return (await (await fetch(`${fake.url}/api/messages?id=${subscriptionId()}`)).json()) as CaughtPush[]
}

const message = (changes: Partial<PushMessage> = {}): PushMessage => ({
  subscription,
  payload: { title: 'Birch Lane', body: 'Flood tonight, −9 °C. Très froid.', url: '/rinks/1', tag: 'flood:1' },
  topic: pushTopic('flood:1:2026-01-12'),
  ttlSeconds: 5400,
  ...changes,
})

async function failure(toSend: PushMessage, through = transport): Promise<DeliveryError> {
  const error: unknown = await through.send(toSend).then(
    () => undefined,
    (reason: unknown) => reason,
  )
  if (!(error instanceof DeliveryError)) throw new Error('expected a DeliveryError')
  return error
}

describe('what arrives', () => {
  test('the subscriber decrypts exactly what was sent, with its time to live, topic, urgency and sender', async () => {
    await transport.send(message())
    const [push] = await caught()
    expect(push?.payload).toEqual(message().payload)
    expect(push?.text).toBe(JSON.stringify(message().payload))
    expect(push).toMatchObject({ ttlSeconds: 5400, topic: message().topic, urgency: 'high', isReplaced: false })
    expect(push?.sender).toMatchObject({ aud: fake.origin, sub: vapid.subject, k: vapid.publicKey })
  })

  test('a repeat with the same topic takes the place of the first', async () => {
    await transport.send(message())
    await transport.send(message())
    await transport.send(message({ topic: pushTopic('another') }))
    expect((await caught()).map(({ isReplaced }) => isReplaced)).toEqual([true, false, false])
  })

  test('a payload of 3,900 bytes still fits', async () => {
    const rest = JSON.stringify({ ...message().payload, body: '' }).length
    await transport.send(message({ payload: { ...message().payload, body: 'x'.repeat(3900 - rest) } }))
    expect((await caught())[0]?.text).toHaveLength(3900)
  })

  test('subscriptions outlive a restart of the push service, which then has a new authority', async () => {
    await fake.close()
    const port = Number(new URL(fake.origin).port)
    fake = await startPushFake({ port, pagePort: 0, caFile })
    await transport.send(message())
    expect(await caught()).toHaveLength(1)
  })

  test('the page shows what a phone would have shown', async () => {
    await transport.send(message())
    const page = await (await fetch(fake.url)).text()
    expect(page).toContain('Flood tonight, −9 °C.')
    expect(page).toContain('opens /rinks/1')
  })
})

describe('what fails', () => {
  test.each(['404', '410', '413'])('%s is permanent', async (kind) => {
    await setFault(kind)
    const error = await failure(message())
    expect(error.permanent).toBe(true)
    expect(error.message).toContain(kind)
    expect(error.message).not.toContain(subscriptionId())
  })

  test.each(['429', '503'])('%s is temporary and says when to come back', async (kind) => {
    await setFault(kind)
    expect(await failure(message())).toMatchObject({ permanent: false, retryAfterSeconds: 120 })
    await transport.send(message())
    expect(await caught()).toHaveLength(1)
  })

  test('a service that says nothing is given up after the time limit, as temporary', async () => {
    await setFault('hang')
    expect((await failure(message(), connect({ silenceMillis: 500 }))).permanent).toBe(false)
  })

  test('a cancelled subscription and an unknown one are permanent', async () => {
    const unknown = { ...subscription, endpoint: `${fake.origin}/push/unknown` }
    expect((await failure(message({ subscription: unknown }))).permanent).toBe(true)
    await fetch(`${fake.url}/subscriptions/${subscriptionId()}`, { method: 'DELETE' })
    expect((await failure(message())).permanent).toBe(true)
  })

  test('a payload beyond 4,096 bytes is refused by the service itself', async () => {
    const error = await failure(message({ payload: { ...message().payload, body: 'x'.repeat(4100) } }))
    expect(error.message).toContain('413')
  })

  test('a sender with other keys is refused, which is not the fault of the subscription', async () => {
    await transport.send(message())
    const stranger = connect({ vapid: { subject: vapid.subject, ...webPush.generateVAPIDKeys() } })
    const error = await failure(message(), stranger)
    expect(error).toMatchObject({ permanent: false })
    expect(error.message).toContain('403')
  })

  test('without the authority nothing is sent', async () => {
    expect((await failure(message(), connect({ caFile: undefined }))).permanent).toBe(false)
    expect((await failure(message(), connect({ caFile: join(folder, 'absent.pem') }))).permanent).toBe(false)
    expect(await caught()).toEqual([])
  })

  test('an address that is no push service is never called', async () => {
    const forged = { ...subscription, endpoint: `${fake.url}/push/${subscriptionId()}` }
    expect((await failure(message({ subscription: forged }))).permanent).toBe(true)
    expect((await failure(message(), connect({ extraOrigins: [] }))).permanent).toBe(true)
  })

  test.each([{ p256dh: 'AAAA' }, { auth: 'AAAA' }, { p256dh: `B${'A'.repeat(86)}` }])(
    'malformed keys are permanent: %o',
    async (keys) => {
      expect((await failure(message({ subscription: { ...subscription, ...keys } }))).permanent).toBe(true)
    },
  )
})

describe('the fake reads what the standards print', () => {
  test('it opens the message of RFC 8291 section 5', () => {
    const ecdh = createECDH('prime256v1')
    ecdh.setPrivateKey('q1dXpw3UpT5VOmu_cf_v6ih07Aems3njxI-JWgLcM94', 'base64url')
    const body =
      'DGv6ra1nlYgDCS1FRnbzlwAAEABBBP4z9KsN6nGRTbVYI_c7VJSPQTBtkgcy27ml' +
      'mlMoZIIgDll6e3vCYLocInmYWAmS6TlzAC8wEqKK6PBru3jl7A_yl95bQpu6cVPT' +
      'pK4Mqgkf1CXztLVBSt2Ks3oZwbuwXPXLWyouBWLVWGNWQexSgSxsj_Qulcy4a-fN'
    const auth = Buffer.from('BTBZMqHH6r4Tts7J_aSIgg', 'base64url')
    const text = decryptPush(Buffer.from(body, 'base64url'), { ecdh, auth }).toString()
    expect(text).toBe('When I grow up, I want to be a watermelon')
  })

  // Its token expires at 1453523768 s.
  const authorization =
    'vapid t=eyJ0eXAiOiJKV1QiLCJhbGciOiJFUzI1NiJ9.eyJhdWQiOiJodHRwczovL3B1c2guZXhhbXBsZS5uZXQiLCJleHAiOjE0NTM1MjM3Njgs' +
    'InN1YiI6Im1haWx0bzpwdXNoQGV4YW1wbGUuY29tIn0.i3CYb7t4xfxCDquptFOepC9GAu_HLGkMlMuCGSK2rpiUfnK9ojFwDXb1JrErtmysazNjjvW2L9OkSSHzvoD1oA, ' +
    'k=BA1Hxzyi1RUM1b5wjxsn7nGxAszw2u61m164i3MrAIxHF6YK5h4SDYic-dRuU_RCPCfA5aq9ojSwk5Y2EmClBPs'
  const at = (seconds: number) => new Date((1453523768 + seconds) * 1000)

  test('it admits the sender of RFC 8292 section 2.4 while the token lasts', () => {
    const sender = verifyVapid(authorization, 'https://push.example.net', at(-3600))
    expect(sender).toMatchObject({ sub: 'mailto:push@example.com' })
  })

  test.each([
    ['expired', authorization, 'https://push.example.net', at(1), 403],
    ['more than a day ahead', authorization, 'https://push.example.net', at(-86_401), 403],
    ['for another service', authorization, 'https://push.example.org', at(-60), 403],
    ['changed by one letter', authorization.replace('.i3C', '.i3D'), 'https://push.example.net', at(-60), 403],
    ['absent', undefined, 'https://push.example.net', at(-60), 401],
  ])('it refuses a token that is %s', (_why, header, origin, now, status) => {
    expect(() => verifyVapid(header, origin, now)).toThrow(expect.objectContaining({ status }) as Error)
  })
})
