// Deciding what to tell: once per night, channel and person; changes and closings; silence when there is nothing.
import { describe, expect, test } from 'vitest'
import { systemRinkAccess } from '@/lib/access/system'
import type { HourlyRecord } from '@/lib/physics/types'
import { decideAlerts } from '@/lib/services/alerts'
import { checkOffPass } from '@/lib/services/floods'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { judgeForecast, judgeNow, storeForecast } from '@/tests/support/night-at-the-rink'
import { SNOW, THAW } from '@/tests/support/night-weather'

// Toronto is five hours behind: 16:10, 17:10, … on 12 January by the rink's clock.
const AT_16_10 = new Date('2027-01-12T21:10:00Z')
const AT_17_10 = new Date('2027-01-12T22:10:00Z')
const AT_18_10 = new Date('2027-01-12T23:10:00Z')
const AT_14_10 = new Date('2027-01-12T19:10:00Z')
const AT_15_30 = new Date('2027-01-12T20:30:00Z')
const NIGHT = '2027-01-12'

const database = givenDatabase()
const cast = givenCast(database, AT_14_10)

async function told(): Promise<string[]> {
  const rows = await database
    .db('messages')
    .where({ rink_id: cast.rinkId })
    .orderBy(['created_at', 'dedupe_key'])
    .select('kind', 'channel', 'user_id')
  const names = new Map([
    [cast.keeper.userId, 'keeper'],
    [cast.crew.userId, 'crew'],
    [cast.skater.userId, 'skater'],
  ])
  return rows.map((row) => `${row.kind} ${row.channel} ${names.get(row.user_id) ?? 'somebody'}`).sort()
}

const windows = () =>
  database
    .db('advised_windows')
    .where({ rink_id: cast.rinkId, kind: 'flood', night_date: NIGHT })
    .orderBy('version')
    .select('version', 'state')

async function judgeAt(now: Date, change?: (at: Date) => Partial<HourlyRecord>): Promise<void> {
  await judgeForecast(database.db, cast, now, change)
}

const snowFrom = (from: string) => (at: Date) => (at >= new Date(from) ? SNOW : {})

const TOLD_ONCE = ['flood-tonight email crew', 'flood-tonight email keeper']

describe('a cold clear night', () => {
  test('is told once to keeper and crew, and not to skaters', async () => {
    await judgeAt(AT_16_10)
    expect(await told()).toEqual(TOLD_ONCE)
    expect(await windows()).toEqual([{ version: 1, state: 'open' }])
  })

  test('is told once however often and by however many workers it is judged', async () => {
    await storeForecast(database.db, cast, AT_16_10)
    const results = await Promise.all([1, 2, 3].map(() => judgeNow(database.db, cast, AT_16_10)))
    expect(results.filter(Boolean)).toHaveLength(1)
    await judgeAt(AT_17_10)
    expect(await told()).toEqual(TOLD_ONCE)
    expect(await windows()).toEqual([{ version: 1, state: 'open' }])
  })

  test('is told by push too, to those with a device', async () => {
    await database.db('push_subscriptions').insert({
      user_id: cast.keeper.userId,
      endpoint: `https://push.example/${cast.rinkId}`,
      p256dh: 'key',
      auth: 'auth',
    })
    await judgeAt(AT_16_10)
    expect(await told()).toEqual([...TOLD_ONCE, 'flood-tonight push keeper'])
  })

  test('is told by push alone to somebody who adds a device after the mail', async () => {
    await judgeAt(AT_16_10)
    await database.db('push_subscriptions').insert({
      user_id: cast.keeper.userId,
      endpoint: `https://push.example/${cast.rinkId}`,
      p256dh: 'key',
      auth: 'auth',
    })
    await decideAlerts({ db: database.db, now: AT_17_10 }, systemRinkAccess<'view'>(cast.rinkId))
    expect(await told()).toEqual([...TOLD_ONCE, 'flood-tonight push keeper'])
  })

  test('waits for the time of day that the person chose', async () => {
    await judgeAt(AT_14_10)
    expect(await told()).toEqual([])
    const { rows } = await database.db.raw(
      `select run_at from graphile_worker.jobs where task_identifier = 'decide-alerts' and key like ?`,
      [`decide:${cast.rinkId}:%`],
    )
    expect(rows).toEqual([{ run_at: AT_15_30 }])
    const access = systemRinkAccess<'view'>(cast.rinkId)
    await decideAlerts({ db: database.db, now: AT_15_30 }, access)
    await decideAlerts({ db: database.db, now: AT_15_30 }, access)
    expect(await told()).toEqual(TOLD_ONCE)
  })

  test('carries finished words and no secret', async () => {
    await judgeAt(AT_16_10)
    const message = await database.db('messages').where({ rink_id: cast.rinkId }).first('content')
    expect(message?.content).toMatchObject({ rinkId: cast.rinkId, nightDate: NIGHT, words: { rinkName: 'Birch Lane' } })
    expect(JSON.stringify(message?.content)).not.toContain('http')
  })

  test('leaves nothing behind when its messages cannot be promised', async () => {
    await storeForecast(database.db, cast, AT_16_10)
    await database.db.raw(`alter table messages add constraint refuse check (rink_id <> '${cast.rinkId}') not valid`)
    await expect(judgeNow(database.db, cast, AT_16_10)).rejects.toThrow('refuse')
    await database.db.raw('alter table messages drop constraint refuse')
    expect(await windows()).toEqual([])
    expect(await database.db('outlooks').where({ rink_id: cast.rinkId })).toEqual([])
    await judgeNow(database.db, cast, AT_16_10)
    expect(await told()).toEqual(TOLD_ONCE)
  })
})

describe('a changed forecast', () => {
  test('closes a window that was told, and says so once', async () => {
    await judgeAt(AT_16_10)
    await judgeAt(AT_17_10, snowFrom('2027-01-12T22:00:00Z'))
    await judgeAt(AT_18_10, snowFrom('2027-01-12T22:00:00Z'))
    expect(await windows()).toEqual([
      { version: 1, state: 'open' },
      { version: 2, state: 'closed' },
    ])
    expect(await told()).toEqual(['flood-closed email crew', 'flood-closed email keeper', ...TOLD_ONCE])
  })

  test('is not told by a worker that judged it and was overtaken by a later judgement', async () => {
    await storeForecast(database.db, cast, AT_16_10)
    await judgeNow(database.db, cast, AT_18_10)
    await judgeAt(AT_17_10, snowFrom('2027-01-12T22:00:00Z'))
    expect(await windows()).toEqual([{ version: 1, state: 'open' }])
    expect(await told()).toEqual(TOLD_ONCE)
  })

  test('says when a window ends hours earlier than told', async () => {
    await judgeAt(AT_16_10)
    await judgeAt(AT_17_10, snowFrom('2027-01-13T03:00:00Z'))
    expect(await windows()).toEqual([
      { version: 1, state: 'open' },
      { version: 2, state: 'open' },
    ])
    expect(await told()).toEqual(['flood-changed email crew', 'flood-changed email keeper', ...TOLD_ONCE])
  })

  test('is not told once somebody has poured', async () => {
    await judgeAt(AT_16_10)
    await checkOffPass(cast.crew.at(AT_17_10), { rinkId: cast.rinkId, nightDate: NIGHT, passNumber: 1, layerMm: 3 })
    await judgeAt(AT_18_10, snowFrom('2027-01-13T00:00:00Z'))
    expect(await told()).toEqual(TOLD_ONCE)
  })
})

describe('silence', () => {
  test('once somebody has poured in the morning, when tonight had begun', async () => {
    const at1010 = cast.crew.at(new Date('2027-01-12T15:10:00Z'))
    await checkOffPass(at1010, { rinkId: cast.rinkId, nightDate: NIGHT, passNumber: 1, layerMm: 3 })
    await judgeAt(AT_16_10)
    expect(await told()).toEqual([])
  })

  test('through a thaw', async () => {
    await judgeAt(AT_16_10, () => THAW)
    expect(await told()).toEqual([])
    expect(await windows()).toEqual([])
  })

  test('for a person who muted the night, and for nobody else', async () => {
    await database
      .db('alert_preferences')
      .where({ rink_id: cast.rinkId, user_id: cast.keeper.userId })
      .update({ muted_through: NIGHT })
    await judgeAt(AT_16_10)
    expect(await told()).toEqual(['flood-tonight email crew'])
  })

  test('until the mute is over', async () => {
    await database
      .db('alert_preferences')
      .where({ rink_id: cast.rinkId, user_id: cast.keeper.userId })
      .update({ muted_through: '2027-01-11' })
    await judgeAt(AT_16_10)
    expect(await told()).toEqual(TOLD_ONCE)
  })

  test('when the forecast is older than it may be', async () => {
    await storeForecast(database.db, cast, AT_14_10)
    await judgeNow(database.db, cast, new Date('2027-01-13T01:30:00Z'))
    expect(await told()).toEqual([])
  })
})
