// The demo's log: what people could have written, once.
import { expect, test } from 'vitest'
import { seedDemo } from '@/db/seeds/dev'
import { DEMO_LOG } from '@/db/seeds/log-nights'
import { MINUTE_MILLIS } from '@/lib/physics/constants'
import { givenDatabase } from '@/tests/support/given-cast'

const NOW = new Date('2027-01-20T17:00:00Z')
const database = givenDatabase()

test('three weeks of entries with answers, and seeding again adds none', async () => {
  const entries = () => database.db('log_entries').orderBy('happened_at').select('id', 'kind', 'outcome', 'version')
  await seedDemo(database.db, NOW)
  const first = await entries()
  await seedDemo(database.db, new Date(NOW.getTime() + MINUTE_MILLIS))
  expect(await entries()).toEqual(first)
  expect(first).toHaveLength(DEMO_LOG.length)
  const floods = first.filter(({ kind }) => kind === 'flood')
  expect(new Set(floods.map(({ outcome }) => outcome))).toEqual(new Set(['set', 'wet', 'spoiled', null]))
  // The forecast of the bad nights aside, most floods were said to be set by some time.
  expect(floods.filter(({ outcome }) => outcome === 'set').length).toBeGreaterThan(12)
}, 120_000)
