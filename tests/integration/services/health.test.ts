// The state of the product: what it goes by, and how often it is read.
import { expect, test } from 'vitest'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { createHealthReader, getHealth } from '@/lib/services/health'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { storeForecast } from '@/tests/support/night-at-the-rink'

const NOW = new Date('2027-01-12T21:10:00Z')
const secondsLater = (seconds: number) => new Date(NOW.getTime() + seconds * 1000)

const database = givenDatabase()
const cast = givenCast(database, NOW)

test('a rink is without a forecast when its newest one is stale, whatever an older one said of itself', async () => {
  await database.db('rinks').whereNot({ id: cast.rinkId }).update({ phase: 'closed' })
  await storeForecast(database.db, cast, new Date(NOW.getTime() - 8 * HOUR_MILLIS))
  const older = database.db('forecasts').where({ grid_cell_id: cast.cellId })
  await older.update({ expires_at: new Date(NOW.getTime() + HOUR_MILLIS) })
  expect((await getHealth(database.db, NOW)).troubles.join()).not.toContain('no current forecast')
  await storeForecast(database.db, cast, new Date(NOW.getTime() - 7 * HOUR_MILLIS))
  expect((await getHealth(database.db, NOW)).troubles).toContain('1 of 1 rinks in season have no current forecast.')
})

test('all who ask within ten seconds get one answer, then it is read anew', async () => {
  const read = createHealthReader()
  const [first, second] = await Promise.all([read(database.db, NOW), read(database.db, secondsLater(1))])
  expect(second).toBe(first)
  await database.db('messages').insert({
    dedupe_key: `dead ${cast.rinkId}`,
    user_id: cast.keeper.userId,
    channel: 'email',
    kind: 'test',
    content: JSON.stringify({}),
    send_at: NOW,
    expires_at: secondsLater(60),
    state: 'dead',
    settled_at: NOW,
    created_at: NOW,
  })
  expect((await read(database.db, secondsLater(9))).deadMessages).toBe(first.deadMessages)
  expect((await read(database.db, secondsLater(10))).deadMessages).toBe(first.deadMessages + 1)
})
