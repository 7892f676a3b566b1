// A thaw ahead of a rink with ice: told once by each channel, then silence; what goes out.
import { describe, expect, test } from 'vitest'
import { findMessageToDeliver } from '@/db/queries/deliveries'
import { systemRinkAccess } from '@/lib/access/system'
import { decideAlerts } from '@/lib/services/alerts'
import { renderEmail, renderPush } from '@/lib/services/render-message'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { judgeForecast, judgeNow, SETTINGS, storeForecast } from '@/tests/support/night-at-the-rink'
import { addDevice, listMessages, listTold } from '@/tests/support/told'
import { SNOW, THAW } from '@/tests/support/night-weather'

// Toronto is five hours behind: 14:10, 15:30, … on Tuesday 12 January by the rink's clock.
const AT_14_10 = new Date('2027-01-12T19:10:00Z')
const AT_15_30 = new Date('2027-01-12T20:30:00Z')
const AT_16_10 = new Date('2027-01-12T21:10:00Z')
const AT_17_10 = new Date('2027-01-12T22:10:00Z')
const TONIGHT = '2027-01-12'

const database = givenDatabase()
const cast = givenCast(database, AT_14_10)
const rinkAccess = () => systemRinkAccess<'view'>(cast.rinkId)

/** Snow tonight, so that nobody is told to flood; from then on mild until the forecast ends, or until cold returns. */
function thawFrom(from: string, to = '2027-01-20T00:00:00Z') {
  return (at: Date) => {
    if (at < new Date(from)) return SNOW
    return at < new Date(to) ? THAW : {}
  }
}
const TOMORROW = '2027-01-13T15:00:00Z'
const IN_TWO_DAYS = '2027-01-14T15:00:00Z'

const judgeAt = (now: Date, from: string, to?: string) => judgeForecast(database.db, cast, now, thawFrom(from, to))

const messages = () => listMessages(database, cast)
const told = () => listTold(database, cast)

const TOLD_ONCE = ['thaw-ahead email crew', 'thaw-ahead email keeper']

describe('a thaw within a day', () => {
  test('is told once however often and by however many workers it is judged and decided', async () => {
    await judgeAt(AT_14_10, TOMORROW)
    expect(await told()).toEqual([])
    await Promise.all([1, 2, 3].map(() => decideAlerts({ db: database.db, now: AT_15_30 }, rinkAccess())))
    await storeForecast(database.db, cast, AT_16_10, thawFrom(TOMORROW))
    await Promise.all([1, 2, 3].map(() => judgeNow(database.db, cast, AT_16_10)))
    // An hour later, and two hours shorter, it is the same thaw.
    await judgeAt(AT_17_10, '2027-01-13T16:00:00Z', '2027-01-15T22:00:00Z')
    expect(await told()).toEqual(TOLD_ONCE)
  })

  test('is told by each channel', async () => {
    await addDevice(database, cast)
    await judgeAt(AT_16_10, TOMORROW)
    expect(await told()).toEqual([...TOLD_ONCE, 'thaw-ahead push keeper'])
  })

  test('is silence for who muted tonight', async () => {
    await database
      .db('alert_preferences')
      .where({ rink_id: cast.rinkId, user_id: cast.keeper.userId })
      .update({ muted_through: TONIGHT })
    await judgeAt(AT_16_10, TOMORROW)
    expect(await told()).toEqual(['thaw-ahead email crew'])
  })

  test.each(['freezing', 'thaw', 'closed'] as const)('is not told of a rink that is %s', async (phase) => {
    await database.db('rinks').where({ id: cast.rinkId }).update({ phase })
    await judgeAt(AT_16_10, TOMORROW)
    expect(await told()).not.toContain('thaw-ahead email keeper')
  })

  test('says from when until when and how much ice it takes', async () => {
    await addDevice(database, cast)
    await judgeAt(AT_16_10, TOMORROW, '2027-01-14T22:00:00Z')
    const rows = (await messages()).filter(({ user_id }) => user_id === cast.keeper.userId)
    const [mailRow, pushRow] = [rows.find((one) => one.channel === 'email'), rows.find((one) => one.channel === 'push')]
    const mail = await findMessageToDeliver(database.db, mailRow?.id ?? '')
    const push = await findMessageToDeliver(database.db, pushRow?.id ?? '')
    if (!mail || !push) throw new Error('Not promised')
    expect(mail).toMatchObject({ isOvertaken: false, isUnwanted: false })
    const letter = renderEmail(mail, SETTINGS)
    // Ice goes hours after the air turns mild, and stops going soon after it turns cold.
    expect(letter.subject).toMatch(
      /^Birch Lane: Thaw from Wednesday (morning|afternoon), 13 January until Thursday (afternoon|evening|night), 14 January$/,
    )
    expect(letter.text).toMatch(/It takes about \d+ mm of ice in this forecast\./)
    expect(letter.unsubscribeUrl).toMatch(/^https:\/\/rink\.example\/api\/unsubscribe/)
    for (const side of [letter.subject, letter.text, letter.html])
      expect(side).not.toMatch(/NaN|undefined|null|Invalid/)
    expect(renderPush(push, SETTINGS)).toMatchObject({
      title: 'Birch Lane: thaw',
      url: `https://rink.example/rinks/${cast.rinkId}`,
      tag: `thaw:${cast.rinkId}`,
    })
  })
})

test('news of the night and of a thaw do not overtake each other', async () => {
  await judgeAt(AT_16_10, TOMORROW)
  const [thaw] = (await messages()).filter(({ user_id }) => user_id === cast.keeper.userId)
  const flood = { user_id: cast.keeper.userId, rink_id: cast.rinkId, night_date: TONIGHT, channel: 'email' as const }
  const times = { send_at: AT_16_10, expires_at: AT_17_10 }
  const rows = await database
    .db('messages')
    .insert(
      [AT_15_30, AT_17_10].map((createdAt, index) => ({
        ...flood,
        ...times,
        kind: index === 0 ? 'flood-tonight' : 'flood-closed',
        dedupe_key: `flood ${index} ${cast.rinkId}`,
        content: JSON.stringify(thaw?.content),
        created_at: createdAt,
      })),
    )
    .returning('id')
  const overtaken = await Promise.all(
    [thaw, ...rows].map(async (row) => (await findMessageToDeliver(database.db, row?.id ?? ''))?.isOvertaken),
  )
  expect(overtaken).toEqual([false, true, false])
})

test('a thaw more than a day off is told when it is near', async () => {
  await judgeAt(AT_16_10, IN_TWO_DAYS)
  expect(await told()).toEqual([])
  await judgeAt(new Date('2027-01-13T21:10:00Z'), IN_TWO_DAYS)
  expect(await told()).toEqual(TOLD_ONCE)
})
