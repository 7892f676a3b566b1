// The nights ahead as read back: who may see them, before the first forecast, a night opened, and clock changes.
import { expect, test } from 'vitest'
import { NotFoundError } from '@/lib/errors'
import { getWeek } from '@/lib/services/week'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { judgeForecast } from '@/tests/support/night-at-the-rink'
import { THAW } from '@/tests/support/night-weather'

const NOW = new Date('2027-01-12T23:10:00Z')

const database = givenDatabase()
const cast = givenCast(database, new Date('2027-01-12T19:10:00Z'))

async function judged(now: Date, ...change: Parameters<typeof judgeForecast>[3][]) {
  await judgeForecast(database.db, cast, now, ...change)
}

test('keeper, crew and skater see the nights; a stranger cannot see that the rink exists', async () => {
  await judged(NOW)
  for (const actor of [cast.keeper, cast.crew, cast.skater]) {
    expect((await getWeek(actor.at(NOW), cast.rinkId)).outlook?.nights.length).toBeGreaterThan(0)
  }
  await expect(getWeek(cast.stranger.at(NOW), cast.rinkId)).rejects.toThrow(NotFoundError)
})

test('before the first forecast there is no outlook', async () => {
  expect(await getWeek(cast.keeper.at(NOW), cast.rinkId)).toMatchObject({ outlook: null, forecast: null })
})

test('the forecast’s four days ahead give four nights, the last one cut where it ends', async () => {
  await judged(NOW)
  const { outlook } = await getWeek(cast.keeper.at(NOW), cast.rinkId)
  // Hours run from a day before the slot at 23:00 UTC to four days after it.
  expect(outlook?.nights.map(({ nightDate }) => nightDate)).toEqual([
    '2027-01-12',
    '2027-01-13',
    '2027-01-14',
    '2027-01-15',
  ])
  expect(outlook?.nights.map(({ bars }) => bars.length)).toEqual([24, 24, 24, 24])
  expect(outlook?.nights[0]).toMatchObject({ verdict: 'flood', isFar: false })
  expect(outlook?.nights[0]?.passes?.isEstimate).toBe(false)
  expect(outlook?.nights[1]?.passes?.isEstimate).toBe(true)
})

test('tonight’s verdict, window and passes are those of the Tonight page', async () => {
  await judged(NOW)
  const { getTonight } = await import('@/lib/services/tonight')
  const [week, tonight] = await Promise.all([
    getWeek(cast.keeper.at(NOW), cast.rinkId),
    getTonight(cast.keeper.at(NOW), cast.rinkId),
  ])
  const night = week.outlook?.nights[0]
  expect(night?.window).toEqual(tonight.outlook?.summary.window)
  expect(night?.passes?.count).toBe(tonight.outlook?.passes.length)
  expect(night?.sunsetAt).toBe(tonight.night.sunsetAt)
})

test('a night that is asked for opens its own hours, one that is not ahead opens nothing', async () => {
  await judged(NOW)
  const open = async (date: string) => (await getWeek(cast.keeper.at(NOW), cast.rinkId, date)).outlook?.open
  const hours = (await open('2027-01-13'))?.hours ?? []
  expect([hours[0]?.time, hours.at(-1)?.time, hours.length]).toEqual([
    '2027-01-13T17:00:00Z',
    '2027-01-14T16:00:00Z',
    24,
  ])
  expect(await open('2027-02-01')).toBeNull()
})

test('a thaw on the way is in the summary, and its nights lose ice', async () => {
  const thawFrom = Date.parse('2027-01-14T12:00:00Z')
  await judged(NOW, (at) => (at.getTime() >= thawFrom ? THAW : {}))
  const { outlook } = await getWeek(cast.keeper.at(NOW), cast.rinkId)
  expect(outlook?.summary.thaw).not.toBeNull()
  // Nights of the thaw have no window; the runs were asked about them all the same, and none sees a good hour.
  expect(outlook?.nights.map(({ agreement }) => agreement?.runs)).toEqual([24, 24, 24, 24])
  expect(outlook?.nights.at(-1)).toMatchObject({ window: null, agreement: { agreeing: 0 } })
  const thawing = outlook?.nights.find(({ nightDate }) => nightDate === '2027-01-14')
  expect(thawing?.verdict).toBe('thaw')
  expect(thawing?.weatherMm).toBeLessThan(0)
})

test('a night with a clock change has its 25 hours, each once', async () => {
  const saturday = new Date('2026-10-31T22:10:00Z')
  await judged(saturday)
  const { outlook } = await getWeek(cast.keeper.at(saturday), cast.rinkId)
  const [night, next] = outlook?.nights ?? []
  expect(new Set(night?.bars.map(({ startsAt }) => startsAt)).size).toBe(25)
  expect(next?.bars).toHaveLength(24)
})

test('after six hours the forecast is called stale', async () => {
  await judged(NOW)
  const later = new Date('2027-01-13T05:10:00Z')
  expect((await getWeek(cast.keeper.at(later), cast.rinkId)).forecast?.isStale).toBe(true)
})

test('while waiting for the fill the windows to fill are listed', async () => {
  await database.db('rinks').where({ id: cast.rinkId }).update({ phase: 'waiting' })
  // Mild enough for hose and hands until Friday noon, then hard cold.
  const coldFrom = Date.parse('2027-01-14T05:00:00Z')
  await judged(NOW, (at) => (at.getTime() < coldFrom ? { airTemperatureC: -1, dewPointC: -4 } : {}))
  const { outlook } = await getWeek(cast.keeper.at(NOW), cast.rinkId)
  expect(outlook?.fillWindows.length).toBeGreaterThan(0)
  expect(outlook?.fillWindows.every(({ kind }) => kind === 'fill')).toBe(true)
  expect(outlook?.nights[0]?.weatherMm).toBeNull()
})
