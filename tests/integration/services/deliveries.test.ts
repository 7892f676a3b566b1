// Delivering: over real SMTP and real encrypted push; retries, expiry, and a crash between sending and settling.
import { describe, expect, test } from 'vitest'
import { promiseMessage, type MessageKind } from '@/db/queries/messages'
import { putPushSubscription } from '@/db/queries/push-subscriptions'
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { deliverMessage } from '@/lib/services/deliveries'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { caughtMails, caughtPushes, givenDelivering, refuseNext, subscribe } from '@/tests/support/given-delivering'

const NOW = new Date('2027-01-12T21:10:00Z')
const LATER = new Date('2027-01-13T04:00:00Z')

const database = givenDatabase()
const cast = givenCast(database, NOW)
const delivering = givenDelivering(database, NOW)

const WORDS = {
  rinkName: 'Birch Lane',
  nightLabel: 'Tue 12 to Wed 13 January',
  sentence: 'Flood tonight between 8 pm and 1 am.',
  sure: '9 of 10 forecast runs agree.',
  passes: [{ at: '8:00 pm', what: '3 mm over the whole sheet' }],
  cautions: ['Do not flood alone.'],
  why: [],
}

async function promise(
  channel: 'email' | 'push',
  kind: MessageKind = 'flood-tonight',
  now = NOW,
  expiresAt = LATER,
): Promise<string> {
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
      expiresAt,
    },
    now,
  )
  const row = await database.db('messages').where({ dedupe_key: dedupeKey }).first('id')
  return row?.id ?? ''
}

const stateOf = async (id: string) => (await database.db('messages').where({ id }).first('state'))?.state

async function addDevice(): Promise<{ id: string; deviceId: string }> {
  const { id, endpoint, keys } = await subscribe(delivering)
  const { id: deviceId } = await putPushSubscription(database.db, cast.keeper.userId, { endpoint, ...keys }, NOW)
  return { id, deviceId }
}

const caughtMail = () => caughtMails(delivering, cast.keeper.email)

describe('mail', () => {
  test('arrives with one-click unsubscribe, and once however often the job runs', async () => {
    const id = await promise('email')
    await deliverMessage(delivering, id)
    await deliverMessage(delivering, id)
    const caught = await caughtMail()
    expect(caught).toHaveLength(1)
    const raw = await (await fetch(`${delivering.mail.url}/api/messages/${caught[0]?.id}`)).text()
    expect(raw).toContain('List-Unsubscribe=One-Click')
    expect(raw).toContain(`${id}@rink.example`)
    expect(await stateOf(id)).toBe('delivered')
  })

  test('is tried again after a temporary refusal', async () => {
    const id = await promise('email')
    await refuseNext(delivering.mail, '451')
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
    await refuseNext(delivering.mail, '550')
    await deliverMessage(delivering, id)
    expect(await stateOf(id)).toBe('dead')
    expect(await database.db('delivery_attempts').where({ message_id: id }).select('outcome')).toEqual([
      { outcome: 'permanent' },
    ])
    const person = await database.db('users').where({ id: cast.keeper.userId }).first('email_refused_at')
    expect(person?.email_refused_at).toEqual(NOW)
  })

  test('counts its tries anew when it is promised again after it was given up', async () => {
    const id = await promise('email')
    await refuseNext(delivering.mail, '451', 6)
    for (const minutes of [0, 1, 2, 4, 8])
      await deliverMessage({ ...delivering, readClock: () => new Date(NOW.getTime() + minutes * MINUTE_MILLIS) }, id)
    const beforeLater = new Date(LATER.getTime() - MINUTE_MILLIS)
    await deliverMessage({ ...delivering, readClock: () => beforeLater }, id)
    expect(await stateOf(id)).toBe('dead')

    expect(await promise('email', 'flood-tonight', beforeLater, new Date(LATER.getTime() + HOUR_MILLIS))).toBe(id)
    await refuseNext(delivering.mail, '451')
    await deliverMessage({ ...delivering, readClock: () => LATER }, id)
    const { rows } = await database.db.raw('select run_at from graphile_worker.jobs where key = ?', [`message:${id}`])
    // The first wait is half a minute at most, the sixth a quarter of an hour.
    expect(rows[0].run_at.getTime() - LATER.getTime()).toBeLessThanOrEqual(MINUTE_MILLIS)
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
    expect(await caughtMail()).toHaveLength(1)
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

  test('is not sent to somebody who skates only since it was promised', async () => {
    const id = await promise('email')
    await database.db('rink_members').where({ user_id: cast.keeper.userId }).update({ role: 'skater' })
    await deliverMessage(delivering, id)
    expect(await stateOf(id)).toBe('expired')
    expect(await caughtMail()).toEqual([])
  })

  test('sent again after a crash before settling keeps its Message-ID', async () => {
    const id = await promise('email')
    await database.db.raw(`alter table delivery_attempts add constraint crash check (message_id <> '${id}') not valid`)
    await expect(deliverMessage(delivering, id)).rejects.toThrow('crash')
    await database.db.raw('alter table delivery_attempts drop constraint crash')
    await deliverMessage(delivering, id)
    const raws = await Promise.all(
      (await caughtMail()).map(async (one) => (await fetch(`${delivering.mail.url}/api/messages/${one.id}`)).text()),
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
      const caught = await caughtPushes(delivering, device.id)
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
    await refuseNext(delivering.pushService, '503')
    await deliverMessage(delivering, id)
    expect(await stateOf(id)).toBe('promised')
    await deliverMessage(delivering, id)
    expect(await stateOf(id)).toBe('delivered')
    expect(await caughtPushes(delivering, one.id)).toHaveLength(1)
    expect(await caughtPushes(delivering, two.id)).toHaveLength(1)
  })

  test.each([
    ['is refused until it is too late', { wants_push: true }, LATER.getTime() - 1000, 1],
    ['is late news', { wants_push: true }, LATER.getTime(), 0],
    ['is not wanted any more', { wants_push: false }, NOW.getTime(), 0],
  ])('one device took counts as told, though for the other it %s', async (_why, choice, atMillis, refusals) => {
    const devices = [await addDevice(), await addDevice()]
    const id = await promise('push')
    await refuseNext(delivering.pushService, '503')
    await deliverMessage(delivering, id)
    expect(await stateOf(id)).toBe('promised')

    await database.db('alert_preferences').where({ rink_id: cast.rinkId, user_id: cast.keeper.userId }).update(choice)
    if (refusals > 0) await refuseNext(delivering.pushService, '503')
    await deliverMessage({ ...delivering, readClock: () => new Date(atMillis) }, id)
    expect(await stateOf(id)).toBe('delivered')
    const caught = await Promise.all(devices.map((device) => caughtPushes(delivering, device.id)))
    expect(caught.flat()).toHaveLength(1)
  })

  test('disables a device that is gone, and says why', async () => {
    const { deviceId } = await addDevice()
    const id = await promise('push')
    await refuseNext(delivering.pushService, '410')
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
