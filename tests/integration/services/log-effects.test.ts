// What the log does to the model: readings and swept snow set the sheet that a run starts from.
import { beforeEach, describe, expect, test } from 'vitest'
import { pruneExpired } from '@/db/queries/prune'
import { keepModelledSheet } from '@/db/queries/sheet-states'
import { MINUTE_MILLIS } from '@/lib/physics/constants'
import { changeEntry, deleteEntry, writeEntry } from '@/lib/services/log'
import { getLog } from '@/lib/services/log-book'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { typedChange, typedEntry } from '@/tests/support/log-form'
import { judgeForecast, judgeNow } from '@/tests/support/night-at-the-rink'

const NOW = new Date('2027-01-12T23:10:00Z')
const later = (minutes: number) => new Date(NOW.getTime() + minutes * MINUTE_MILLIS)
const CREATED = new Date('2027-01-12T19:10:00Z')

const database = givenDatabase()
const cast = givenCast(database, CREATED)

const write = async (changes: Record<string, string>, now = NOW) =>
  (await writeEntry(cast.crew.at(now), typedEntry(cast.rinkId, changes))).entryId
const reported = () =>
  database
    .db('sheet_states')
    .where({ rink_id: cast.rinkId, origin: 'reported' })
    .where('as_of', '>', CREATED)
    .orderBy('as_of')
    .select('as_of', 'thickness_mm', 'temperature_c', 'snow_cover_cm')
const ids = (entryId: string) => ({ rinkId: cast.rinkId, entryId })

test('without an outlook a reading is of bare ice a little below freezing', async () => {
  await database.db('sheet_states').where({ rink_id: cast.rinkId }).delete()
  await write({ kind: 'reading', thickness: '8.9' })
  expect(await reported()).toEqual([{ as_of: NOW, thickness_mm: 89, temperature_c: -2, snow_cover_cm: 0 }])
})

test('sweeping a sheet of which nothing is known says nothing of its thickness', async () => {
  await database.db('sheet_states').where({ rink_id: cast.rinkId }).delete()
  await write({ kind: 'clear' })
  expect(await reported()).toEqual([])
})

describe('with an outlook', () => {
  beforeEach(async () => {
    await judgeForecast(database.db, cast, NOW)
  })

  const modelNow = async () => {
    const row = await database
      .db('scored_hours as h')
      .join('outlooks as o', 'o.id', 'h.outlook_id')
      .where({ 'o.rink_id': cast.rinkId, 'h.starts_at': new Date('2027-01-12T23:00:00Z') })
      .first('h.detail')
    return (row?.detail as { sheet: { thicknessMm: number; temperatureC: number } }).sheet
  }

  test('clearing keeps the model’s thickness and temperature and takes the snow off', async () => {
    const { thicknessMm, temperatureC } = await modelNow()
    await write({ kind: 'clear' })
    expect(await reported()).toEqual([
      { as_of: NOW, thickness_mm: thicknessMm, temperature_c: Math.min(0, temperatureC), snow_cover_cm: 0 },
    ])
  })

  test('a reading remembers what the model had, and the next judgement follows the drill', async () => {
    const { thicknessMm } = await modelNow()
    await write({ kind: 'reading', thickness: '6' })
    const log = await getLog(cast.keeper.at(later(1)), cast.rinkId, {})
    expect(log.nights[0]?.entries[0]).toMatchObject({ thicknessMm: 60, modelThicknessMm: thicknessMm })
    await judgeNow(database.db, cast, later(1))
    const [hour] = await database
      .db('scored_hours as h')
      .join('outlooks as o', 'o.id', 'h.outlook_id')
      .where({ 'o.rink_id': cast.rinkId, 'h.starts_at': new Date('2027-01-13T00:00:00Z') })
      .orderBy('o.judged_at', 'desc')
      .select('h.detail')
    const sheet = (hour?.detail as { sheet: { thicknessMm: number } }).sheet
    // From 6 cm on: one or two hours of a cold night add no centimetre.
    expect(sheet.thicknessMm).toBeGreaterThanOrEqual(60)
    expect(sheet.thicknessMm).toBeLessThan(70)
  })

  test('a scrape right after a reading stands on the reading, though nothing was judged between', async () => {
    await write({ kind: 'reading', thickness: '6' })
    await write({ kind: 'scrape' }, later(10))
    expect((await reported()).map(({ thickness_mm }) => thickness_mm)).toEqual([60, 60])
  })

  test('a slip in a reading is mended, deleted, and forgotten, in what was swept after it too', async () => {
    const { thicknessMm } = await modelNow()
    const entryId = await write({ kind: 'reading', thickness: '0.9' })
    await write({ kind: 'clear' }, later(10))
    await judgeNow(database.db, cast, later(11))
    const mended = typedChange(cast.rinkId, entryId, 1, {
      kind: 'reading',
      thickness: '9.1',
      onDate: '2027-01-12',
      atTime: '18:10',
    })
    await changeEntry(cast.crew.at(later(12)), mended)
    expect((await reported()).map(({ thickness_mm }) => thickness_mm)).toEqual([91, 91])
    await deleteEntry(cast.crew.at(later(13)), ids(entryId))
    const left = await reported()
    expect(left).toHaveLength(1)
    // Set up with 9 cm four hours before: a cold afternoon adds little to it.
    expect(Math.abs((left[0]?.thickness_mm ?? 0) - thicknessMm)).toBeLessThan(5)
  })

  test('a flood written by hand is on the sheet, and gone when it is deleted', async () => {
    const lastMm = async () => {
      const row = await database
        .db('scored_hours as h')
        .join('outlooks as o', 'o.id', 'h.outlook_id')
        .where({ 'o.rink_id': cast.rinkId })
        .orderBy([
          { column: 'o.settings_version', order: 'desc' },
          { column: 'h.starts_at', order: 'desc' },
        ])
        .first('h.detail')
      return (row?.detail as { sheet: { thicknessMm: number } }).sheet.thicknessMm
    }
    const bare = await lastMm()
    const entryId = await write({ layer: '3' })
    await judgeNow(database.db, cast, later(1))
    // 3 mm of water are 3.3 mm of ice: 1000/917.
    expect((await lastMm()) - bare).toBeGreaterThan(2.5)
    await deleteEntry(cast.crew.at(later(2)), ids(entryId))
    await judgeNow(database.db, cast, later(3))
    expect(Math.abs((await lastMm()) - bare)).toBeLessThan(0.2)
  })
})

test('of the modelled sheets the last of each day by the rink’s clock is kept for the season', async () => {
  const state = {} as never
  const kept = ['2027-01-05T04:00:00Z', '2027-01-06T04:00:00Z']
  const dropped = ['2027-01-04T15:00:00Z', '2027-01-05T06:00:00Z']
  for (const at of [...kept, ...dropped]) {
    const sheet = { asOf: new Date(at), modelVersion: '1', thicknessMm: 80, temperatureC: -3, snowCoverCm: 0, state }
    await keepModelledSheet(database.db, cast.rinkId, sheet)
  }
  await pruneExpired(database.db, NOW)
  const left = await database
    .db('sheet_states')
    .where({ rink_id: cast.rinkId, origin: 'modelled' })
    .orderBy('as_of')
    .select('as_of')
  // 04:00 UTC is 11 pm of the day before at Toronto.
  expect(left.map(({ as_of }) => as_of.toISOString())).toEqual(kept.map((at) => new Date(at).toISOString()))
  const { charts } = await getLog(cast.keeper.at(NOW), cast.rinkId, {})
  expect(charts.thickness.slice(0, 2).map(({ date }) => date)).toEqual(['2027-01-04', '2027-01-05'])
})
