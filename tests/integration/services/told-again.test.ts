// What never arrived is told when it can be: once, by the message that was given up, with the words of now.
import { describe, expect, test } from 'vitest'
import { promiseMessage, type NewMessage } from '@/db/queries/messages'
import { systemRinkAccess } from '@/lib/access/system'
import { decideAlerts } from '@/lib/services/alerts'
import { deliverMessage } from '@/lib/services/deliveries'
import { addDevice } from '@/lib/services/push-subscriptions'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import {
  caughtMails,
  caughtPushes,
  givenDelivering,
  refuseNext,
  subscribe,
  type BrowserSubscription,
} from '@/tests/support/given-delivering'
import { judgeForecast } from '@/tests/support/night-at-the-rink'
import { listMessages } from '@/tests/support/told'

// Toronto is five hours behind: 14:10, 16:10, 17:10 on 12 January by the rink's clock.
const AT_14_10 = new Date('2027-01-12T19:10:00Z')
const AT_16_10 = new Date('2027-01-12T21:10:00Z')
const AT_17_10 = new Date('2027-01-12T22:10:00Z')
const NIGHT = '2027-01-12'

const database = givenDatabase()
const cast = givenCast(database, AT_14_10)
const delivering = givenDelivering(database, AT_16_10)

const judge = () => judgeForecast(database.db, cast, AT_16_10)
const decide = () => decideAlerts({ db: database.db, now: AT_17_10 }, systemRinkAccess<'view'>(cast.rinkId))

async function keepers(channel: 'email' | 'push') {
  const all = await listMessages(database, cast)
  return all.filter((one) => one.channel === channel && one.user_id === cast.keeper.userId)
}

/** As the queue does: every delivery that is waiting. */
async function deliver(channel: 'email' | 'push'): Promise<void> {
  for (const { id } of await keepers(channel)) await deliverMessage(delivering, id)
}

const switchOn = ({ endpoint, keys }: BrowserSubscription, now: Date) =>
  addDevice(cast.keeper.at(now), { endpoint, keys }, [delivering.pushService.origin])

const mute = (through: string | null) =>
  database
    .db('alert_preferences')
    .where({ rink_id: cast.rinkId, user_id: cast.keeper.userId })
    .update({ muted_through: through })

describe('a night', () => {
  test('whose push found the device gone is pushed once when the device is back, however often it is decided', async () => {
    const device = await subscribe(delivering)
    await switchOn(device, AT_16_10)
    await judge()
    await refuseNext(delivering.pushService, '410')
    await deliver('push')
    expect(await keepers('push')).toMatchObject([{ state: 'dead' }])
    await decide()
    expect(await keepers('push')).toMatchObject([{ state: 'dead' }])

    await switchOn(device, AT_17_10)
    await Promise.all([decide(), decide(), decide()])
    const [again, ...others] = await keepers('push')
    expect(again).toMatchObject({ state: 'promised', settled_at: null, created_at: AT_17_10, send_at: AT_17_10 })
    expect(others).toEqual([])
    const { rows } = await database.db.raw('select run_at from graphile_worker.jobs where key = ?', [
      `message:${again?.id}`,
    ])
    expect(rows).toEqual([{ run_at: AT_17_10 }])

    await deliver('push')
    await decide()
    await deliver('push')
    expect(await caughtPushes(delivering, device.id)).toHaveLength(1)
    expect(await keepers('push')).toMatchObject([{ state: 'delivered' }])
  })

  test('whose mail fell into a silence is told when the silence is taken back', async () => {
    await judge()
    await mute(NIGHT)
    await deliver('email')
    await decide()
    expect(await keepers('email')).toMatchObject([{ state: 'expired' }])
    await mute(null)
    await Promise.all([decide(), decide()])
    await deliver('email')
    await decide()
    await deliver('email')
    expect(await caughtMails(delivering, cast.keeper.email)).toHaveLength(1)
    expect(await keepers('email')).toMatchObject([{ state: 'delivered' }])
  })
})

describe('a promise that is made again', () => {
  const promise = (text: string, changes: Partial<NewMessage> = {}) =>
    promiseMessage(
      database.db,
      {
        dedupeKey: `flood-tonight:${cast.rinkId}`,
        userId: cast.keeper.userId,
        rinkId: cast.rinkId,
        nightDate: NIGHT,
        channel: 'email',
        kind: 'flood-tonight',
        content: { text },
        sendAt: AT_16_10,
        expiresAt: new Date('2027-01-13T04:00:00Z'),
        ...changes,
      },
      changes.sendAt ?? AT_16_10,
    )
  const settle = (state: 'delivered' | 'dead' | 'expired') =>
    database.db('messages').where({ rink_id: cast.rinkId }).update({ state, settled_at: AT_16_10 })

  test.each(['dead', 'expired'] as const)(
    'of a message that is %s holds once, with what is said now',
    async (state) => {
      await promise('first')
      await settle(state)
      const later = { sendAt: AT_17_10, expiresAt: new Date('2027-01-13T05:00:00Z') }
      const made = await Promise.all([promise('again', later), promise('again', later), promise('again', later)])
      expect(made.filter(Boolean)).toHaveLength(1)
      expect(await listMessages(database, cast)).toMatchObject([
        { state: 'promised', settled_at: null, content: { text: 'again' }, expires_at: later.expiresAt },
      ])
    },
  )

  test('of one that is on its way, or was delivered, changes nothing', async () => {
    await promise('first')
    expect(await promise('again')).toBe(false)
    await settle('delivered')
    expect(await promise('again', { sendAt: AT_17_10 })).toBe(false)
    expect(await listMessages(database, cast)).toMatchObject([
      { state: 'delivered', content: { text: 'first' }, created_at: AT_16_10 },
    ])
  })
})
