// The night sheet as read back: before the first forecast, fresh, and old.
import { expect, test } from 'vitest'
import { getTonight } from '@/lib/services/tonight'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { judgeForecast } from '@/tests/support/night-at-the-rink'

const NOW = new Date('2027-01-12T23:10:00Z')

const database = givenDatabase()
const cast = givenCast(database, new Date('2027-01-12T19:10:00Z'))

const view = (now: Date) => getTonight(cast.keeper.at(now), cast.rinkId)

test('before the first forecast there is no outlook, and the night is known all the same', async () => {
  const tonight = await view(NOW)
  expect(tonight.outlook).toBeNull()
  // Noon to noon in Toronto, five hours behind.
  expect(tonight.night).toMatchObject({
    date: '2027-01-12',
    startsAt: '2027-01-12T17:00:00.000Z',
    endsAt: '2027-01-13T17:00:00.000Z',
  })
})

test('a judged night has 24 hours from noon to noon, ten days are cut to what is there, and a plan', async () => {
  await judgeForecast(database.db, cast, NOW)
  const tonight = await view(NOW)
  const hours = tonight.outlook?.hours ?? []
  expect(hours).toHaveLength(24)
  expect([hours[0]?.time, hours.at(-1)?.time]).toEqual(['2027-01-12T17:00:00Z', '2027-01-13T16:00:00Z'])
  expect(tonight.outlook?.summary.verdict).toBe('flood')
  expect(tonight.outlook?.passes.map((pass) => pass.number)).toEqual([1, 2, 3])
  expect(tonight.outlook?.days[0]?.date).toBe('2027-01-12')
  expect(tonight.forecast).toMatchObject({ provider: 'invented', isStale: false })
})

test('a night with a clock change has its 25 hours, each once', async () => {
  const saturday = new Date('2026-10-31T22:10:00Z')
  await judgeForecast(database.db, cast, saturday)
  const times = (await view(saturday)).outlook?.hours.map((hour) => hour.time) ?? []
  expect(times).toHaveLength(25)
  expect(new Set(times).size).toBe(25)
})

test('after six hours the forecast is called stale', async () => {
  await judgeForecast(database.db, cast, NOW)
  expect((await view(new Date('2027-01-13T05:10:00Z'))).forecast?.isStale).toBe(true)
})

test('yesterday’s sheet is where today starts', async () => {
  await judgeForecast(database.db, cast, NOW)
  const kept = await database.db('sheet_states').where({ rink_id: cast.rinkId, origin: 'modelled' }).first()
  expect(kept?.as_of).toEqual(new Date('2027-01-12T23:00:00Z'))
  const nextDay = new Date('2027-01-13T23:10:00Z')
  await judgeForecast(database.db, cast, nextDay)
  const today = await view(nextDay)
  const yesterday = await database
    .db('scored_hours as h')
    .join('outlooks as o', 'o.id', 'h.outlook_id')
    .where({ 'o.rink_id': cast.rinkId, 'h.starts_at': '2027-01-13T20:00:00Z' })
    .orderBy('o.judged_at')
    .select('h.detail')
  // The same weather over the same hours: carried on from the stored state or run in one go, the sheet is the same.
  const [first, second] = yesterday.map(
    ({ detail }) => (detail as { sheet: { thicknessMm: number } }).sheet.thicknessMm,
  )
  expect(Math.abs((first ?? 0) - (second ?? 1))).toBeLessThan(0.01)
  expect(today.outlook?.hours[0]?.sheet.thicknessMm).toBeGreaterThan(85)
})
