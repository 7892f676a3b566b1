// Settling nights that are over, with the weather that came and what people found.
import { expect, test } from 'vitest'
import { systemRinkAccess } from '@/lib/access/system'
import { settleRinkNight, startSettling } from '@/lib/services/night-outcomes'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { judgeForecast, storeForecast } from '../../support/night-at-the-rink'
import { SNOW } from '../../support/night-weather'

const NIGHT = '2027-01-12'
/** 3 pm and 1:30 pm the next day in Toronto. */
const AFTERNOON = new Date('2027-01-12T20:00:00Z')
const NEXT_DAY = new Date('2027-01-13T18:30:00Z')

const database = givenDatabase()
const cast = givenCast(database, new Date('2027-01-12T19:10:00Z'))

const settle = () => settleRinkNight({ db: database.db, now: NEXT_DAY }, systemRinkAccess<'view'>(cast.rinkId), NIGHT)
const outcome = () => database.db('night_outcomes').where({ rink_id: cast.rinkId }).first()
const queued = async () => {
  const { rows } = await database.db.raw<{ rows: { key: string }[] }>(
    `select key from graphile_worker.jobs where task_identifier = 'settle-night' and key like ?`,
    [`%${cast.rinkId}%`],
  )
  return rows.map(({ key }) => key)
}

test('a flood that the later weather bears out is kept', async () => {
  await judgeForecast(database.db, cast, AFTERNOON)
  await storeForecast(database.db, cast, NEXT_DAY)
  expect(await settle()).toBe(true)
  expect(await outcome()).toMatchObject({ said: 'flood', result: 'kept', source: 'weather', night_date: NIGHT })
})

test('a flood that snow fell on is broken, and settled once', async () => {
  await judgeForecast(database.db, cast, AFTERNOON)
  await storeForecast(database.db, cast, NEXT_DAY, () => SNOW)
  expect((await Promise.all([settle(), settle()])).sort()).toEqual([false, true])
  expect(await outcome()).toMatchObject({ said: 'flood', result: 'broken', detail: { code: 'precipitation' } })
})

test('holding off in snow that came is kept; when the sky cleared instead, a night was missed', async () => {
  await judgeForecast(database.db, cast, AFTERNOON, () => SNOW)
  await storeForecast(database.db, cast, NEXT_DAY, () => SNOW)
  await settle()
  expect(await outcome()).toMatchObject({ said: 'hold', result: 'kept' })
  await database.db('night_outcomes').delete()
  await database
    .db('forecasts')
    .where({ slot_at: new Date('2027-01-13T18:00:00Z') })
    .delete()
  await storeForecast(database.db, cast, NEXT_DAY)
  await settle()
  expect(await outcome()).toMatchObject({ said: 'hold', result: 'broken', detail: { code: 'missed' } })
})

test('what somebody found counts before the weather', async () => {
  await judgeForecast(database.db, cast, AFTERNOON)
  await database.db('log_entries').insert({
    rink_id: cast.rinkId,
    kind: 'flood',
    happened_at: new Date('2027-01-13T00:05:00Z'),
    night_date: NIGHT,
    layer_mm: 3,
    water_l: 300,
    water_temperature_c: 6,
    said_set_by_at: new Date('2027-01-13T01:30:00Z'),
    outcome: 'wet',
    outcome_at: new Date('2027-01-13T03:00:00Z'),
  })
  await storeForecast(database.db, cast, NEXT_DAY)
  await settle()
  expect(await outcome()).toMatchObject({ result: 'broken', source: 'report', detail: { code: 'found_wet' } })
})

test('nights are asked for once they are over, and not again when settled', async () => {
  await judgeForecast(database.db, cast, AFTERNOON)
  await startSettling(database.db, new Date('2027-01-13T17:30:00Z'))
  expect(await queued()).toEqual([])
  await startSettling(database.db, NEXT_DAY)
  expect(await queued()).toEqual([`settle:${cast.rinkId}:${NIGHT}`])
  await settle()
  await database.db.raw(`select graphile_worker.remove_job(?)`, [`settle:${cast.rinkId}:${NIGHT}`])
  await startSettling(database.db, NEXT_DAY)
  expect(await queued()).toEqual([])
})
