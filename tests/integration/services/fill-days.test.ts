// The day to fill, told while a rink waits for it: once a date and channel; moves, closings, silence; what goes out.
import { describe, expect, test } from 'vitest'
import { findMessageToDeliver, type MessageToDeliver } from '@/db/queries/deliveries'
import { systemRinkAccess } from '@/lib/access/system'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { HourlyRecord } from '@/lib/physics/types'
import { decideAlerts } from '@/lib/services/alerts'
import { getAlertSettings } from '@/lib/services/alert-preferences'
import { startFill } from '@/lib/services/fills'
import { renderEmail, renderPush } from '@/lib/services/render-message'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { judgeForecast, judgeNow, SETTINGS, storeForecast } from '@/tests/support/night-at-the-rink'
import { addDevice, listMessages, listTold } from '@/tests/support/told'

// Toronto is five hours behind: 14:10, 15:30, … on Tuesday 12 January by the rink's clock.
const AT_14_10 = new Date('2027-01-12T19:10:00Z')
const AT_15_30 = new Date('2027-01-12T20:30:00Z')
const AT_16_10 = new Date('2027-01-12T21:10:00Z')
const AT_17_10 = new Date('2027-01-12T22:10:00Z')
const AT_18_10 = new Date('2027-01-12T23:10:00Z')
/** At night nobody is told of a far day. */
const AT_23_10 = new Date('2027-01-13T04:10:00Z')
const TONIGHT = '2027-01-12'

const database = givenDatabase()
const cast = givenCast(database, AT_14_10, { phase: 'waiting', iceThickness: '', length: '10', width: '6' })
const rinkAccess = () => systemRinkAccess<'view'>(cast.rinkId)

const TOO_COLD: Partial<HourlyRecord> = { airTemperatureC: -12, dewPointC: -15 }

/** Too cold for a hose, but for one evening from four in the afternoon on. */
function mildOn(day: number) {
  const from = Date.parse(`2027-01-${day}T21:00:00Z`)
  const to = Date.parse(`2027-01-${day + 1}T06:00:00Z`)
  return (at: Date) => (at.getTime() >= from && at.getTime() < to ? { airTemperatureC: -1, dewPointC: -4 } : TOO_COLD)
}
const tooCold = () => TOO_COLD

const judgeAt = (now: Date, change: (at: Date) => Partial<HourlyRecord>) =>
  judgeForecast(database.db, cast, now, change)

const messages = () => listMessages(database, cast)
const told = () => listTold(database, cast)

const both = (kind: string, date: string) => [`${kind} ${date} email crew`, `${kind} ${date} email keeper`]

async function expectTold(...expected: string[][]): Promise<void> {
  expect(await told()).toEqual(expected.flat().sort())
}

const choose = (choice: Record<string, unknown>) =>
  database.db('alert_preferences').where({ rink_id: cast.rinkId, user_id: cast.keeper.userId }).update(choice)

async function deliverable(kind: string, channel = 'email'): Promise<MessageToDeliver> {
  const row = (await messages()).find(
    (one) => one.kind === kind && one.channel === channel && one.user_id === cast.keeper.userId,
  )
  const message = await findMessageToDeliver(database.db, row?.id ?? '')
  if (!message) throw new Error(`No ${kind} by ${channel}`)
  return message
}

describe('a day to fill ahead', () => {
  test('is told to keeper and crew, and not to skaters', async () => {
    await judgeAt(AT_16_10, mildOn(14))
    await expectTold(both('fill-ahead', '2027-01-14'))
  })

  test('is told once however often and by however many workers it is judged and decided', async () => {
    await storeForecast(database.db, cast, AT_14_10, mildOn(14))
    await judgeNow(database.db, cast, AT_14_10)
    await expectTold([])
    await Promise.all([1, 2, 3].map(() => decideAlerts({ db: database.db, now: AT_15_30 }, rinkAccess())))
    await storeForecast(database.db, cast, AT_16_10, mildOn(14))
    await Promise.all([1, 2, 3].map(() => judgeNow(database.db, cast, AT_16_10)))
    await judgeAt(AT_17_10, mildOn(14))
    await expectTold(both('fill-ahead', '2027-01-14'))
  })

  test('is told by each channel, a device added later by push alone', async () => {
    await judgeAt(AT_16_10, mildOn(14))
    await addDevice(database, cast)
    await decideAlerts({ db: database.db, now: AT_17_10 }, rinkAccess())
    await decideAlerts({ db: database.db, now: AT_18_10 }, rinkAccess())
    await expectTold(both('fill-ahead', '2027-01-14'), ['fill-ahead 2027-01-14 push keeper'])
  })

  test('waits for the time of day that the person chose', async () => {
    await choose({ tell_at: '18:00' })
    await judgeAt(AT_16_10, mildOn(14))
    await expectTold(['fill-ahead 2027-01-14 email crew'])
    await decideAlerts({ db: database.db, now: AT_18_10 }, rinkAccess())
    await expectTold(both('fill-ahead', '2027-01-14'))
  })

  test('rings nobody at night while it is far', async () => {
    await judgeAt(AT_23_10, mildOn(14))
    await expectTold([])
  })

  test('is late news once its start has come', async () => {
    await judgeAt(AT_16_10, mildOn(13))
    const [message] = await messages()
    expect(message?.expires_at).toEqual(new Date('2027-01-13T22:00:00Z'))
  })

  test('leaves nothing behind when its messages cannot be promised', async () => {
    await storeForecast(database.db, cast, AT_16_10, mildOn(14))
    await database.db.raw(`alter table messages add constraint refuse check (rink_id <> '${cast.rinkId}') not valid`)
    await expect(judgeNow(database.db, cast, AT_16_10)).rejects.toThrow('refuse')
    await database.db.raw('alter table messages drop constraint refuse')
    expect(await database.db('outlooks').where({ rink_id: cast.rinkId })).toEqual([])
    await judgeNow(database.db, cast, AT_16_10)
    await expectTold(both('fill-ahead', '2027-01-14'))
  })
})

describe('a day that was told', () => {
  test('and moves is told anew, once', async () => {
    await judgeAt(AT_16_10, mildOn(14))
    await judgeAt(AT_17_10, mildOn(13))
    await judgeAt(AT_18_10, mildOn(13))
    await expectTold(both('fill-ahead', '2027-01-14'), both('fill-changed', '2027-01-13'))
  })

  test('and falls away is taken back, once', async () => {
    await judgeAt(AT_16_10, mildOn(14))
    await judgeAt(AT_17_10, tooCold)
    await judgeAt(AT_18_10, tooCold)
    await expectTold(both('fill-ahead', '2027-01-14'), both('fill-closed', '2027-01-14'))
  })

  test('may move three times, and is then taken back', async () => {
    await judgeAt(AT_16_10, mildOn(14))
    for (const [index, day] of [13, 14, 13, 14].entries()) {
      await judgeAt(new Date(AT_17_10.getTime() + index * HOUR_MILLIS), mildOn(day))
    }
    expect((await told()).filter((one) => one.endsWith('keeper')).map((one) => one.split(' ')[0])).toEqual([
      'fill-ahead',
      'fill-changed',
      'fill-changed',
      'fill-changed',
      'fill-closed',
    ])
  })
})

describe('silence', () => {
  test('for a person who muted tonight, and for nobody else', async () => {
    await choose({ muted_through: TONIGHT })
    await judgeAt(AT_16_10, mildOn(14))
    await expectTold(['fill-ahead 2027-01-14 email crew'])
  })

  test('without a day to fill', async () => {
    await judgeAt(AT_16_10, tooCold)
    await expectTold([])
  })

  test('when the forecast is older than it may be', async () => {
    await storeForecast(database.db, cast, AT_14_10, mildOn(13))
    await judgeNow(database.db, cast, new Date('2027-01-13T01:30:00Z'))
    await expectTold([])
  })

  test('once a fill runs, also about what was told', async () => {
    await judgeAt(AT_16_10, mildOn(13))
    await startFill(cast.crew.at(AT_17_10), { rinkId: cast.rinkId, targetDepthMm: undefined, flowLPerMin: undefined })
    await decideAlerts({ db: database.db, now: AT_17_10 }, rinkAccess())
    await judgeAt(AT_18_10, tooCold)
    const kinds = new Set((await messages()).map(({ kind }) => kind))
    expect(kinds).toEqual(new Set(['fill-ahead', 'fill-check']))
  })

  test('while what stands was judged under other settings', async () => {
    await judgeAt(AT_14_10, mildOn(14))
    await database.db('rinks').where({ id: cast.rinkId }).increment('settings_version', 1)
    await decideAlerts({ db: database.db, now: AT_16_10 }, rinkAccess())
    await expectTold([])
  })
})

describe('what goes out', () => {
  test('the mail says when, how sure, how much, what to have ready, and where to stop it', async () => {
    await judgeAt(AT_16_10, mildOn(14))
    const mail = renderEmail(await deliverable('fill-ahead'), SETTINGS)
    expect(mail.subject).toBe('Birch Lane: Fill Thursday evening, 14 January')
    expect(mail.text).toContain('forecast runs agree.')
    // 10 m by 6 m, 10 cm deep, at 25 L a minute.
    expect(mail.text).toContain('about 6000 L and 4 h of hose')
    expect(mail.text).toContain('This is a plan and no decision yet')
    expect(mail.text).toContain('The liner at hand')
    expect(mail.text).toContain('backflow preventer')
    expect(mail.text).toContain(`https://rink.example/rinks/${cast.rinkId}/week`)
    expect(mail.unsubscribeUrl).toMatch(/^https:\/\/rink\.example\/api\/unsubscribe/)
    for (const side of [mail.subject, mail.text, mail.html]) expect(side).not.toMatch(/NaN|undefined|null|Invalid/)
  })

  test('a day that is near is no plan any more', async () => {
    await judgeAt(AT_17_10, mildOn(13))
    expect(renderEmail(await deliverable('fill-ahead'), SETTINGS).text).not.toContain('no decision yet')
  })

  test('a move names the day that was told, a closing says to hold off', async () => {
    await judgeAt(AT_16_10, mildOn(14))
    await judgeAt(AT_17_10, mildOn(13))
    const moved = renderEmail(await deliverable('fill-changed'), SETTINGS)
    expect(moved.subject).toBe('Birch Lane: plan changed. Fill Wednesday evening, 13 January')
    expect(moved.text).toContain('We had told you Thursday evening, 14 January.')
    await judgeAt(AT_18_10, tooCold)
    const closed = renderEmail(await deliverable('fill-closed'), SETTINGS)
    expect(closed.subject).toBe(
      'Birch Lane: called off. Hold off filling: Wednesday evening, 13 January, no longer holds',
    )
    expect(closed.text).not.toContain('Have ready')
  })

  test('the push opens the week, and the next takes its place', async () => {
    await addDevice(database, cast)
    await judgeAt(AT_16_10, mildOn(14))
    const push = renderPush(await deliverable('fill-ahead', 'push'), SETTINGS)
    expect(push).toMatchObject({
      title: 'Birch Lane: a day to fill',
      url: `https://rink.example/rinks/${cast.rinkId}/week`,
      tag: `fill-day:${cast.rinkId}`,
    })
    expect(push.body).toMatch(/^Fill Thursday evening, 14 January\. .*forecast runs agree\. Best start/)
    await judgeAt(AT_17_10, tooCold)
    expect(renderPush(await deliverable('fill-closed', 'push'), SETTINGS).tag).toBe(push.tag)
  })

  test('is dropped when newer news was promised, when muted or unwanted, and when the rink waits no more', async () => {
    await judgeAt(AT_16_10, mildOn(14))
    expect(await deliverable('fill-ahead')).toMatchObject({ isOvertaken: false, isUnwanted: false })
    await choose({ muted_through: TONIGHT })
    expect((await deliverable('fill-ahead')).isUnwanted).toBe(true)
    await choose({ muted_through: null, wants_email: false })
    expect((await deliverable('fill-ahead')).isUnwanted).toBe(true)
    await choose({ wants_email: true })
    await judgeAt(AT_17_10, mildOn(13))
    expect((await deliverable('fill-ahead')).isOvertaken).toBe(true)
    expect(await deliverable('fill-changed')).toMatchObject({ isOvertaken: false, isUnwanted: false })
    await database.db('rinks').where({ id: cast.rinkId }).update({ phase: 'filling' })
    expect((await deliverable('fill-changed')).isUnwanted).toBe(true)
  })

  test('neither overtakes news of the night nor is overtaken by it', async () => {
    await judgeAt(AT_16_10, mildOn(14))
    const [row] = (await messages()).filter(({ user_id }) => user_id === cast.keeper.userId)
    for (const [kind, minutes] of [
      ['flood-tonight', -5],
      ['fill-check', 1],
      ['flood-closed', 5],
    ] as const) {
      const createdAt = new Date(AT_16_10.getTime() + minutes * 60_000)
      await database.db('messages').insert({
        user_id: cast.keeper.userId,
        rink_id: cast.rinkId,
        night_date: TONIGHT,
        channel: 'email',
        content: JSON.stringify(row?.content),
        send_at: AT_16_10,
        expires_at: AT_18_10,
        kind,
        dedupe_key: `${kind}:${cast.rinkId}`,
        created_at: createdAt,
      })
    }
    expect((await deliverable('fill-ahead')).isOvertaken).toBe(false)
    expect((await deliverable('fill-check')).isOvertaken).toBe(false)
    expect((await deliverable('flood-tonight')).isOvertaken).toBe(true)
    expect((await deliverable('flood-closed')).isOvertaken).toBe(false)
  })

  test('the alerts page names the night of the fill', async () => {
    await judgeAt(AT_16_10, mildOn(14))
    const { told: shown } = await getAlertSettings(cast.keeper.at(AT_17_10), cast.rinkId)
    expect(shown).toMatchObject([{ kind: 'fill-ahead', nightDate: '2027-01-14' }])
  })
})
