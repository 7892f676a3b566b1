// The demo's record: three weeks judged and settled, once, and nobody is told of them.
import { expect, test } from 'vitest'
import { seedDemo } from '@/db/seeds/dev'
import { PAST_NIGHTS } from '@/db/seeds/past-weather'
import { MINUTE_MILLIS } from '@/lib/physics/constants'
import { givenDatabase } from '@/tests/support/given-cast'

const NOW = new Date('2027-01-20T17:00:00Z')
const database = givenDatabase()

test('the record is kept and broken, and seeding again changes nothing', async () => {
  const record = () => database.db('night_outcomes').orderBy('night_date').select('night_date', 'said', 'result')
  await seedDemo(database.db, NOW)
  const first = await record()
  await seedDemo(database.db, new Date(NOW.getTime() + MINUTE_MILLIS))
  expect(await record()).toEqual(first)
  // The last of them is settled by the worker's first round.
  expect(first).toHaveLength(PAST_NIGHTS - 1)
  expect(new Set(first.map(({ said }) => said))).toEqual(new Set(['flood', 'hold']))
  expect(new Set(first.map(({ result }) => result))).toEqual(new Set(['kept', 'broken']))
  expect(await database.db('messages').whereNotNull('night_date')).toEqual([])
})
