// The keeper's own plan: kept, seen by the crew, judged by the model, followed by check-offs, and dropped again.
import { randomUUID } from 'node:crypto'
import { beforeEach, describe, expect, test } from 'vitest'
import { ForbiddenError, InvalidInputError, NotFoundError } from '@/lib/errors'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { keepOwnPassesSchema, type KeepOwnPasses } from '@/lib/schemas/own-passes'
import { checkOffPass } from '@/lib/services/floods'
import { getMovableNight } from '@/lib/services/night-model'
import { dropOwnPasses, keepOwnPasses } from '@/lib/services/own-passes'
import { getTonight } from '@/lib/services/tonight'
import type { Actor } from '@/tests/support/cast'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { judgeForecast, storeForecast } from '@/tests/support/night-at-the-rink'
import { SNOW } from '@/tests/support/night-weather'

const NOW = new Date('2027-01-12T23:10:00Z')
const NIGHT = '2027-01-12'

const database = givenDatabase()
const cast = givenCast(database, new Date('2027-01-12T19:10:00Z'))

beforeEach(async () => {
  await judgeForecast(database.db, cast, NOW)
})

const tonight = (actor: Actor, now = NOW) => getTonight(actor.at(now), cast.rinkId)
const pass = (number: number, startsAt: string, given = {}) => ({
  number,
  startsAt,
  layerMm: 3,
  temperatureC: 6,
  flowLPerMin: 25,
  ...given,
})
/** As the form sends it. */
const plan = (passes: object[], nightDate = NIGHT): KeepOwnPasses =>
  keepOwnPassesSchema.parse({ rinkId: cast.rinkId, nightDate, passes: JSON.stringify(passes) })
const two = () =>
  plan([pass(1, '2027-01-13T00:00:00Z'), pass(2, '2027-01-13T02:00:00Z', { layerMm: 2, temperatureC: 45 })])

test('the keeper’s plan stands for everybody, with the set times of the model', async () => {
  await keepOwnPasses(cast.keeper.at(NOW), two())
  const { outlook } = await tonight(cast.crew)
  expect(outlook?.ownPlan).toEqual({ by: 'Keeper' })
  expect(outlook?.passes).toHaveLength(2)
  expect(outlook?.passes[1]).toMatchObject({ number: 2, layerMm: 2, temperatureC: 45, waterL: 200, hoseMinutes: 8 })
  const hour = outlook?.hours.find(({ time }) => time === '2027-01-13T00:00:00Z')
  expect(outlook?.passes[0]?.setBy).toBe(hour?.setsAt)
})

test('the alerts’ text is the advised plan’s: keeping a plan promises nothing', async () => {
  const messages = () => database.db('messages').where({ rink_id: cast.rinkId }).count('* as n').first()
  const before = await messages()
  await keepOwnPasses(cast.keeper.at(NOW), two())
  expect(await messages()).toEqual(before)
})

test('a pass poured in the morning, when tonight had begun, is no part of a plan any more', async () => {
  const at1010 = cast.crew.at(new Date('2027-01-12T15:10:00Z'))
  await checkOffPass(at1010, { rinkId: cast.rinkId, nightDate: NIGHT, passNumber: 1, layerMm: 3 })
  await keepOwnPasses(cast.keeper.at(NOW), two())
  const kept = await database.db('own_passes').where({ rink_id: cast.rinkId }).select('pass_number')
  expect(kept).toEqual([{ pass_number: 2 }])
})

test('back to the advised plan', async () => {
  const advised = await tonight(cast.keeper)
  await keepOwnPasses(cast.keeper.at(NOW), two())
  await dropOwnPasses(cast.keeper.at(NOW), { rinkId: cast.rinkId, nightDate: NIGHT })
  const again = await tonight(cast.keeper)
  expect(again.outlook?.ownPlan).toBeNull()
  expect(again.outlook?.passes).toEqual(advised.outlook?.passes)
})

test('two plans kept at once: one of them stands, whole', async () => {
  const other = plan([
    pass(1, '2027-01-13T01:00:00Z'),
    pass(2, '2027-01-13T03:00:00Z'),
    pass(3, '2027-01-13T05:00:00Z'),
  ])
  await Promise.all([keepOwnPasses(cast.keeper.at(NOW), two()), keepOwnPasses(cast.keeper.at(NOW), other)])
  expect([2, 3]).toContain((await tonight(cast.keeper)).outlook?.passes.length)
})

test('a pass of the plan is checked off with its own water, and the rest of the plan stays', async () => {
  await keepOwnPasses(cast.keeper.at(NOW), two())
  const at = new Date('2027-01-13T00:02:00Z')
  await checkOffPass(cast.crew.at(at), {
    rinkId: cast.rinkId,
    nightDate: NIGHT,
    passNumber: 1,
    layerMm: 3,
    waterTemperatureC: 45,
  })
  const [first, second] = (await tonight(cast.keeper, at)).outlook?.passes ?? []
  expect(first).toMatchObject({ number: 1, temperatureC: 45, poured: { by: 'Crew', at: at.toISOString() } })
  expect(Date.parse(first?.poured?.saidSetByAt ?? '')).toBeGreaterThan(at.getTime())
  expect(second).toMatchObject({ number: 2, poured: null })
})

test('warnings come with the plan: snow before it is set', async () => {
  await storeForecast(database.db, cast, new Date(NOW.getTime() + HOUR_MILLIS), (at) =>
    at >= new Date('2027-01-13T02:00:00Z') ? SNOW : {},
  )
  await keepOwnPasses(cast.keeper.at(NOW), two())
  const passes = (await tonight(cast.keeper)).outlook?.passes
  expect(passes?.[0]?.warnings).toEqual([])
  expect(passes?.[1]?.warnings.map(({ code }) => code)).toContain('snow_before_set')
})

// 3 mm on 10 m by 10 m are 300 L, at 2 L/min 150 min of hose: out from 00:00 until 02:30, past the second pass at 02:00.
test('warnings come with the plan: the hose is out for the pass before', async () => {
  const slow = pass(1, '2027-01-13T00:00:00Z', { flowLPerMin: 2 })
  await keepOwnPasses(cast.keeper.at(NOW), plan([slow, pass(2, '2027-01-13T02:00:00Z')]))
  const passes = (await tonight(cast.keeper)).outlook?.passes
  expect(passes?.[1]?.warnings.find(({ code }) => code === 'hose_still_out')?.values).toMatchObject({
    until: '2027-01-13T02:30:00Z',
  })
})

describe('refusals', () => {
  test('crew and skaters see the plan and do not change it', async () => {
    for (const actor of [cast.crew, cast.skater]) {
      await expect(keepOwnPasses(actor.at(NOW), two())).rejects.toThrow(ForbiddenError)
      await expect(dropOwnPasses(actor.at(NOW), { rinkId: cast.rinkId, nightDate: NIGHT })).rejects.toThrow(
        ForbiddenError,
      )
      await expect(getMovableNight(actor.at(NOW), cast.rinkId)).rejects.toThrow(ForbiddenError)
    }
  })

  test('a stranger cannot see that the rink exists', async () => {
    await expect(keepOwnPasses(cast.stranger.at(NOW), two())).rejects.toThrow(NotFoundError)
    await expect(getMovableNight(cast.stranger.at(NOW), cast.rinkId)).rejects.toThrow(NotFoundError)
  })

  test('another night, a pass outside the night, and what is no plan', async () => {
    const other = plan([pass(1, '2027-01-14T01:00:00Z')], '2027-01-13')
    await expect(keepOwnPasses(cast.keeper.at(NOW), other)).rejects.toThrow(InvalidInputError)
    await expect(keepOwnPasses(cast.keeper.at(NOW), plan([pass(1, '2027-01-13T17:00:00Z')]))).rejects.toThrow(
      InvalidInputError,
    )
    const parse = (passes: string) =>
      keepOwnPassesSchema.safeParse({ rinkId: cast.rinkId, nightDate: NIGHT, passes }).success
    expect([parse('['), parse('[]'), parse(JSON.stringify([pass(1, 'soon')]))]).toEqual([false, false, false])
    expect(parse(JSON.stringify([pass(1, '2027-01-13T01:00:00Z'), pass(1, '2027-01-13T02:00:00Z')]))).toBe(false)
  })
})

describe('check-offs that a phone kept without a network', () => {
  const sent = (given = {}) => ({
    rinkId: cast.rinkId,
    nightDate: NIGHT,
    passNumber: 1,
    layerMm: 3,
    waterTemperatureC: 6,
    entryKey: randomUUID(),
    userId: cast.crew.userId,
    pouredAt: new Date('2027-01-13T01:00:00Z'),
    ...given,
  })
  const floods = () => database.db('log_entries').where({ rink_id: cast.rinkId, kind: 'flood' })

  test('are logged for the moment of the pour, even after the night', async () => {
    const nextDay = new Date('2027-01-13T20:00:00Z')
    await checkOffPass(cast.crew.at(nextDay), sent())
    expect((await floods())[0]).toMatchObject({ happened_at: new Date('2027-01-13T01:00:00Z'), night_date: NIGHT })
  })

  test('are kept once however often they are sent, also after the pass was taken back', async () => {
    const once = sent()
    const later = new Date('2027-01-13T01:30:00Z')
    await Promise.all([checkOffPass(cast.crew.at(later), once), checkOffPass(cast.crew.at(later), once)])
    await database.db('log_entries').where({ rink_id: cast.rinkId }).update({ deleted_at: later })
    await checkOffPass(cast.crew.at(later), once)
    expect(await floods()).toHaveLength(1)
  })

  test('are not sent in another person’s name, nor when they are days old', async () => {
    const later = new Date('2027-01-13T01:30:00Z')
    for (const other of [cast.keeper, cast.skater, cast.stranger]) {
      await expect(checkOffPass(other.at(later), sent())).rejects.toMatchObject({ code: 'other_account' })
    }
    await expect(checkOffPass(cast.crew.at(new Date('2027-01-16T01:00:00Z')), sent())).rejects.toThrow(
      InvalidInputError,
    )
    expect(await floods()).toHaveLength(0)
  })
})
