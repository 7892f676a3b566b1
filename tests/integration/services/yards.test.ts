// The yard teaches the model: reports are kept with their weather, and learned factors reach the next judgement.
import { expect, test } from 'vitest'
import { insertForecast } from '@/db/queries/forecasts'
import { findRinkForJudging } from '@/db/queries/rinks'
import { systemRinkAccess } from '@/lib/access/system'
import { DAY_MILLIS, HOUR_MILLIS } from '@/lib/physics/constants'
import { shelterFactor } from '@/lib/physics/site'
import { findYardInUse } from '@/lib/services/yard-in-use'
import { learnRinkYard } from '@/lib/services/yards'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { hoursFrom } from '../../support/night-weather'

/** 7 pm in Toronto. */
const FIRST_POUR = new Date('2027-01-06T00:00:00Z')

const database = givenDatabase()
const cast = givenCast(database, new Date(FIRST_POUR.getTime() - 6 * HOUR_MILLIS))

const learn = (now: Date) => learnRinkYard({ db: database.db, now }, systemRinkAccess<'writeLog'>(cast.rinkId))
const inUse = async () => {
  const rink = await findRinkForJudging(database.db, cast.rinkId)
  return findYardInUse(database.db, rink!)
}

/** A windy night just below freezing, where wind says most, and a layer that was found set or wet. */
async function night(index: number, found: { outcome: 'set' | 'wet'; afterHours: number }) {
  const pouredAt = new Date(FIRST_POUR.getTime() + index * DAY_MILLIS)
  const slotAt = new Date(pouredAt.getTime() + 15 * HOUR_MILLIS)
  const windy = { airTemperatureC: -4, dewPointC: -7, windSpeedMps: 9, windGustMps: 13, cloudCover: 1 }
  await insertForecast(database.db, {
    cellId: cast.cellId,
    provider: 'invented',
    slotAt,
    issuedAt: null,
    fetchedAt: slotAt,
    expiresAt: new Date(slotAt.getTime() + 6 * HOUR_MILLIS),
    hours: hoursFrom(new Date(slotAt.getTime() - DAY_MILLIS), 72, () => windy),
    members: null,
    attribution: { text: 'Invented weather', url: 'https://weather.example', licence: 'none' },
  })
  await database.db('sheet_states').insert({
    rink_id: cast.rinkId,
    as_of: new Date(pouredAt.getTime() - HOUR_MILLIS),
    origin: 'reported',
    thickness_mm: 90,
    temperature_c: -2,
    snow_cover_cm: 0,
  })
  const outcomeAt = new Date(pouredAt.getTime() + found.afterHours * HOUR_MILLIS)
  await database.db('log_entries').insert({
    rink_id: cast.rinkId,
    kind: 'flood',
    happened_at: pouredAt,
    night_date: new Date(pouredAt.getTime() - DAY_MILLIS).toISOString().slice(0, 10),
    layer_mm: 3,
    water_l: 300,
    water_temperature_c: 6,
    outcome: found.outcome,
    outcome_at: outcomeAt,
    // The keeper names the time the next morning.
    updated_at: new Date(pouredAt.getTime() + 12 * HOUR_MILLIS),
  })
  return new Date(pouredAt.getTime() + 17 * HOUR_MILLIS)
}

test('without reports the yard is as its keeper set it', async () => {
  expect(await learn(FIRST_POUR)).toMatchObject({ isLearned: false, keptBecause: 'too_few_nights' })
  expect(await inUse()).toEqual({ shelter: shelterFactor('suburban'), skyView: 0.85 })
})

test('layers that set far sooner in wind than a sheltered yard allows teach an opener one, and the night is judged anew', async () => {
  const version = async () => await database.db('rinks').where({ id: cast.rinkId }).first('settings_version')
  const before = await version()
  let learned = null
  for (let index = 0; index < 8; index++) learned = await learn(await night(index, { outcome: 'set', afterHours: 1.2 }))
  expect(learned).toMatchObject({ isLearned: true, reportsUsed: 8, ledBy: 'wind' })
  expect(learned!.shelter).toBeGreaterThan(shelterFactor('suburban'))
  expect((await inUse()).shelter).toBe(learned!.shelter)
  expect((await version())!.settings_version).toBeGreaterThan(before!.settings_version)
  // Nothing new: nothing is done.
  expect(await learn(new Date(FIRST_POUR.getTime() + 8 * DAY_MILLIS))).toBeNull()
  // The keeper knows better: what was learned from other settings no longer counts.
  await database.db('rinks').where({ id: cast.rinkId }).update({ shelter: 'open' })
  expect((await inUse()).shelter).toBe(shelterFactor('open'))
})

test('a report goes with its entry', async () => {
  await learn(await night(0, { outcome: 'wet', afterHours: 1 }))
  const reports = () => database.db('yard_reports').where({ rink_id: cast.rinkId })
  expect(await reports()).toHaveLength(1)
  await database
    .db('log_entries')
    .where({ rink_id: cast.rinkId })
    .update({ outcome: null, outcome_at: null, version: 2 })
  expect((await learn(await night(1, { outcome: 'wet', afterHours: 1 })))?.reportsUsed).toBe(1)
})
