// Nights in which the clocks change, 1 November 2026 and 14 March 2027 at Toronto: right hours, each counted once.
import { expect, test } from 'vitest'
import type { InvalidInputError } from '@/lib/errors'
import { changeEntry, writeEntry } from '@/lib/services/log'
import { getEntry, getLog } from '@/lib/services/log-book'
import { entryTime } from '@/lib/words/log'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { typedChange, typedEntry } from '@/tests/support/log-form'

const database = givenDatabase()
const cast = givenCast(database, new Date('2026-10-31T19:10:00Z'))

const write = async (now: string, changes: Record<string, string>) => {
  const { entryId } = await writeEntry(cast.keeper.at(new Date(now)), typedEntry(cast.rinkId, changes))
  const { entry, reader } = await getEntry(cast.keeper.at(new Date(now)), cast.rinkId, entryId)
  return { ...entry, shown: entryTime(entry.happenedAt, entry.nightDate, reader) }
}

test('clocks back: the two 1:30 are an hour apart, both of the night before, and counted as one night', async () => {
  // Daylight time ended at 2 am EDT on 1 November 2026: 1:30 EDT is 05:30 UTC, 1:30 EST is 06:30 UTC.
  const noon = '2026-11-01T18:00:00Z'
  const day = { onDate: '2026-11-01', atTime: '01:30' }
  const first = await write(noon, { ...day, whichHour: 'first' })
  const second = await write(noon, { ...day, whichHour: 'second' })
  expect(first).toMatchObject({
    happenedAt: '2026-11-01T05:30:00.000Z',
    nightDate: '2026-10-31',
    shown: 'Sun 1:30 am EDT',
  })
  expect(second).toMatchObject({
    happenedAt: '2026-11-01T06:30:00.000Z',
    nightDate: '2026-10-31',
    shown: 'Sun 1:30 am EST',
  })
  const { totals, nights } = await getLog(cast.keeper.at(new Date(noon)), cast.rinkId, {})
  expect(totals).toMatchObject({ floods: 2, nightsFlooded: 1, waterL: 600 })
  expect(nights.map(({ date }) => date)).toEqual(['2026-10-31'])
})

test('clocks back: a time that came twice is asked about, and stays the same instant when something else is changed', async () => {
  const noon = '2026-11-01T18:00:00Z'
  const day = { onDate: '2026-11-01', atTime: '01:30' }
  const refused = await write(noon, day).catch((error: unknown) => error)
  expect((refused as InvalidInputError).fields).toHaveProperty('whichHour')
  const { id } = await write(noon, { ...day, whichHour: 'second' })
  await changeEntry(cast.keeper.at(new Date(noon)), typedChange(cast.rinkId, id, 1, { ...day, layer: '4' }))
  const { entry } = await getEntry(cast.keeper.at(new Date(noon)), cast.rinkId, id)
  expect(entry).toMatchObject({ happenedAt: '2026-11-01T06:30:00.000Z', layerMm: 4 })
})

test('clocks back: minutes ago are minutes, across the change too', async () => {
  // 1:10 EST is 06:10 UTC; twenty minutes before, the clock showed 1:50 EDT.
  const entry = await write('2026-11-01T06:10:00Z', { minutesAgo: '20' })
  expect(entry).toMatchObject({ happenedAt: '2026-11-01T05:50:00.000Z', shown: 'Sun 1:50 am EDT' })
})

test('clocks forward: 2:30 never was, 1:59 and 3:00 are a minute apart and of one night', async () => {
  // Daylight time begins at 2 am EST on 14 March 2027: 1:59 EST is 06:59 UTC, 3:00 EDT is 07:00 UTC.
  const noon = '2027-03-14T17:00:00Z'
  const refused = await write(noon, { onDate: '2027-03-14', atTime: '02:30' }).catch((error: unknown) => error)
  expect((refused as InvalidInputError).fields).toHaveProperty('atTime')
  const before = await write(noon, { onDate: '2027-03-14', atTime: '01:59' })
  const after = await write(noon, { onDate: '2027-03-14', atTime: '03:00' })
  expect(before).toMatchObject({ happenedAt: '2027-03-14T06:59:00.000Z', nightDate: '2027-03-13' })
  expect(after).toMatchObject({ happenedAt: '2027-03-14T07:00:00.000Z', nightDate: '2027-03-13', shown: 'Sun 3 am' })
})
