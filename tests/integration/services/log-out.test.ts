// Lists, sums and files of the log: filtered and paged by night, summed by season, safe to open in a spreadsheet.
import { expect, test } from 'vitest'
import { NotFoundError, RateLimitedError } from '@/lib/errors'
import { logQuerySchema } from '@/lib/schemas/log-query'
import { writeEntry } from '@/lib/services/log'
import { getLog } from '@/lib/services/log-book'
import { exportLog } from '@/lib/services/log-export'
import { getSeason } from '@/lib/services/log-season'
import type { Actor } from '@/tests/support/cast'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { typedEntry } from '@/tests/support/log-form'

const NOW = new Date('2027-01-12T23:10:00Z')

const database = givenDatabase()
const cast = givenCast(database, new Date('2026-12-01T19:10:00Z'))

const write = (actor: Actor, changes: Record<string, string>) =>
  writeEntry(actor.at(NOW), typedEntry(cast.rinkId, changes))
const log = (query: Record<string, string> = {}) =>
  getLog(cast.keeper.at(NOW), cast.rinkId, logQuerySchema.parse(query))
const file = (format: 'csv' | 'json', actor = cast.keeper) => exportLog(actor.at(NOW), cast.rinkId, { format })

test('by kind, by person, by nights; what cannot be read filters nothing', async () => {
  await write(cast.crew, { onDate: '2027-01-10', atTime: '20:00' })
  await write(cast.keeper, { onDate: '2027-01-11', atTime: '20:00' })
  await write(cast.keeper, { kind: 'scrape', onDate: '2027-01-11', atTime: '19:00' })
  const nights = async (query: Record<string, string>) =>
    (await log(query)).nights.map(({ date, entries }) => [date, ...entries.map(({ kind }) => kind)])
  expect(await nights({})).toEqual([
    ['2027-01-11', 'flood', 'scrape'],
    ['2027-01-10', 'flood'],
  ])
  expect(await nights({ kind: 'scrape' })).toEqual([['2027-01-11', 'scrape']])
  expect(await nights({ person: cast.crew.userId })).toEqual([['2027-01-10', 'flood']])
  expect(await nights({ to: '2027-01-10' })).toEqual([['2027-01-10', 'flood']])
  expect(await nights({ from: '2027-01-12' })).toEqual([])
  expect(await nights({ kind: 'dance', person: 'me', from: 'yesterday' })).toHaveLength(2)
})

test('seven nights a page, and the address of the next', async () => {
  const dates = Array.from({ length: 9 }, (_, index) => `2026-12-${String(index + 5).padStart(2, '0')}`)
  for (const onDate of dates) await write(cast.crew, { onDate, atTime: '20:00' })
  const first = await log()
  expect(first.nights.map(({ date }) => date)).toEqual(dates.slice(2).reverse())
  const second = await log({ before: first.olderBefore ?? '' })
  expect(second.nights.map(({ date }) => date)).toEqual(['2026-12-06', '2026-12-05'])
  expect(second.olderBefore).toBeNull()
})

test('a season’s sums, hose hours and lists', async () => {
  await write(cast.crew, { onDate: '2027-01-10', atTime: '20:00' })
  await write(cast.crew, { onDate: '2027-01-10', atTime: '22:00' })
  await write(cast.crew, { kind: 'fill', water: '9000', onDate: '2026-12-05', atTime: '10:00' })
  await write(cast.keeper, { kind: 'thaw', note: 'Rain', onDate: '2027-01-03', atTime: '15:00' })
  await write(cast.keeper, { kind: 'repair', note: 'North boards', onDate: '2027-01-04', atTime: '15:00' })
  const season = await getSeason(cast.skater.at(NOW), cast.rinkId)
  expect(season.totals).toMatchObject({ floods: 2, nightsFlooded: 1, waterL: 9600 })
  // 9600 L at 25 L/min are 6.4 h.
  expect(season.hoseHours).toBeCloseTo(6.4, 6)
  expect(season.thaws.map(({ note }) => note)).toEqual(['Rain'])
  expect(season.repairs.map(({ note }) => note)).toEqual(['North boards'])
  expect((await getSeason(cast.skater.at(NOW), cast.rinkId, 2025)).totals.floods).toBe(0)
  expect((await getSeason(cast.skater.at(NOW), cast.rinkId, 2025)).totals.thicknessMm).toBeNull()
  await expect(getSeason(cast.stranger.at(NOW), cast.rinkId)).rejects.toThrow(NotFoundError)
})

test('of several holes of a day the thinnest is drawn', async () => {
  for (const thickness of ['9.4', '8.1', '9']) await write(cast.keeper, { kind: 'reading', thickness })
  const { thickness } = (await log()).charts
  expect(thickness.flatMap(({ readingMm }) => readingMm ?? [])).toEqual([81])
})

test('CSV: a mark for UTF-8, units in the headings, lines as RFC 4180 ends them, and no formula runs', async () => {
  await write(cast.crew, { note: '=1+1, "quoted"\nsecond line', onDate: '2027-01-11', atTime: '20:00' })
  await write(cast.keeper, { kind: 'note', note: '-2 on the porch, à côté' })
  const { body, contentType, name } = await file('csv', cast.skater)
  expect(contentType).toBe('text/csv; charset=utf-8')
  expect(name).toBe('birch-lane-log.csv')
  const [head, ...lines] = body.split('\r\n')
  expect(head?.startsWith('\uFEFFid,kind,happened_at_utc,happened_at_local,')).toBe(true)
  expect(head).toContain(',layer_mm,water_l,water_temperature_c,')
  expect(lines[0]).toContain(',flood,2027-01-12T01:00:00.000Z,2027-01-11 20:00 -05:00,America/Toronto,2027-01-11,')
  expect(lines[0]).toContain(',3,300,6,cold-tap,')
  expect(lines[0]).toContain(`,"'=1+1, ""quoted""\nsecond line",Crew,1`)
  expect(lines[1]).toContain(`"'-2 on the porch, à côté"`)
})

test('JSON: the same entries, oldest first', async () => {
  await write(cast.crew, { onDate: '2027-01-11', atTime: '20:00' })
  await write(cast.keeper, { kind: 'reading', thickness: '8.9' })
  const { body } = await file('json')
  expect(JSON.parse(body)).toMatchObject({
    rink: 'Birch Lane',
    timeZone: 'America/Toronto',
    entries: [
      { kind: 'flood', layer_mm: 3, written_by: 'Crew' },
      { kind: 'reading', ice_thickness_mm: 89 },
    ],
  })
})

test('no file for strangers, and not without end', async () => {
  await expect(file('csv', cast.stranger)).rejects.toThrow(NotFoundError)
  for (let tries = 0; tries < 30; tries++) await file('json', cast.crew)
  await expect(file('json', cast.crew)).rejects.toThrow(RateLimitedError)
})
