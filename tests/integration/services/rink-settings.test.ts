// Changing a rink, its water and its end: by its keeper, counted, and judged anew.
import { randomUUID } from 'node:crypto'
import { describe, expect, test } from 'vitest'
import { findRinkForJudging } from '@/db/queries/rinks'
import { ForbiddenError, NotFoundError } from '@/lib/errors'
import * as schemas from '@/lib/schemas/rink-settings'
import { deleteRink, getLeaving, leaveRink } from '@/lib/services/rink-end'
import * as services from '@/lib/services/rink-settings'
import { listMyRinks } from '@/lib/services/rinks'
import { pourFromWater, removeWater, saveWater } from '@/lib/services/water-sources'
import { createCast, type Actor } from '@/tests/support/cast'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'

const NOW = new Date('2027-01-12T19:10:00Z')
const LATER = new Date('2027-01-12T20:10:00Z')
/** Kenora lies in Ontario’s west, an hour behind Toronto and Sudbury. */
const KENORA = { latitude: '49.77', longitude: '-94.49' }
const EAST = { latitude: '46.5', longitude: '-81' }

const database = givenDatabase()
const cast = givenCast(database, NOW)

const read = () => services.getRinkSettings(cast.keeper.at(LATER), cast.rinkId)
const place = (fields: Record<string, string>, actor: Actor = cast.keeper) =>
  services.changePlace(
    actor.at(LATER),
    schemas.changePlaceSchema.parse({ rinkId: cast.rinkId, name: 'Birch Lane', ...EAST, ...fields }),
  )
const hours = (fields: Record<string, string>, actor: Actor = cast.keeper) =>
  services.changeHours(
    actor.at(LATER),
    schemas.changeHoursSchema.parse({ rinkId: cast.rinkId, maxPasses: '2', ...fields }),
  )
const yard = (fields: Record<string, string>, actor: Actor = cast.keeper) =>
  services.changeYard(
    actor.at(LATER),
    schemas.changeYardSchema.parse({
      rinkId: cast.rinkId,
      units: 'metric',
      length: '12',
      width: '8',
      base: 'liner',
      shelter: 'tight',
      sky: 'wide',
      ...fields,
    }),
  )
const limits = (fields: Record<string, string>, actor: Actor = cast.keeper) =>
  services.changeLimits(
    actor.at(LATER),
    schemas.changeLimitsSchema.parse({ rinkId: cast.rinkId, units: 'metric', carriesSkater: '12', ...fields }),
  )
const ice = (fields: Record<string, string>, actor: Actor = cast.keeper) =>
  services.changeIce(
    actor.at(LATER),
    schemas.changeIceSchema.parse({ rinkId: cast.rinkId, units: 'metric', phase: 'skating', ...fields }),
  )
const water = (fields: Record<string, string>, actor: Actor = cast.keeper) =>
  saveWater(actor.at(LATER), schemas.saveWaterSchema.parse({ rinkId: cast.rinkId, units: 'metric', ...fields }))
const jobs = async (task: string) =>
  (
    await database.db.raw(
      'select key from graphile_worker._private_jobs j join graphile_worker._private_tasks t on t.id = j.task_id where t.identifier = ?',
      [task],
    )
  ).rows.map(({ key }: { key: string }) => key)

const EVENINGS = { from1: '20:00', to1: '23:30', day1_1: 'on', day1_5: 'on' }

describe('a change by the keeper', () => {
  test('to another phase has the weather read: off the season nobody did', async () => {
    await ice({ phase: 'planning' })
    await database.db.raw('delete from graphile_worker._private_jobs')
    await ice({ phase: 'planning' })
    expect(await jobs('pull-forecast')).toEqual([])
    await ice({ phase: 'waiting' })
    const { grid_cell_id: cellId } = (await database.db('rinks').where({ id: cast.rinkId }).first('grid_cell_id'))!
    expect(await jobs('pull-forecast')).toEqual([`pull:${cellId}`])
  })

  test('is counted and judged, and leaves the rest alone', async () => {
    const before = await read()
    await hours(EVENINGS)
    expect(await read()).toEqual({
      ...before,
      settingsVersion: 2,
      maxPasses: 2,
      available: [{ from: '20:00', to: '23:30', weekdays: [1, 5] }],
    })
    expect(await jobs('refresh-outlook')).toContain(`refresh:${cast.rinkId}`)
  })

  test('of the yard keeps floor and boards, and a share of sky that was set by hand', async () => {
    const corners = { floorKind: 'corners', cornerEast: '12', cornerSouth: '28', cornerWest: '15', boardHeight: '40' }
    await yard(corners)
    expect(await read()).toMatchObject({
      lengthM: 12,
      shelter: 'tight',
      skyView: 0.95,
      floor: { cornersM: [0, 0.12, 0.28, 0.15] },
      boardHeightMm: 400,
    })
    await database.db('rinks').where({ id: cast.rinkId }).update({ sky_view: 0.72 })
    await yard({ sky: 'kept', floorKind: 'level' })
    expect(await read()).toMatchObject({ skyView: 0.72, floor: null, boardHeightMm: null, settingsVersion: 3 })
  })

  test('of the limits is kept, and taken back when left open', async () => {
    await limits({ windLimit: '36', windChillLimit: '-25' })
    expect(await read()).toMatchObject({ windLimitMps: 10, windChillLimitC: -25, carriesSkaterMm: 120 })
    await limits({})
    expect(await read()).toMatchObject({ windLimitMps: null, windChillLimitC: null })
  })

  test('of the ice is a new state of the sheet only when it was measured', async () => {
    await ice({ iceThickness: '' })
    expect(await database.db('sheet_states').where({ rink_id: cast.rinkId })).toHaveLength(1)
    await ice({ iceThickness: '11' })
    const newest = await database.db('sheet_states').where({ rink_id: cast.rinkId }).orderBy('as_of', 'desc').first()
    expect(newest).toMatchObject({ as_of: LATER, origin: 'reported', thickness_mm: 110 })
  })

  test('two at once are both kept, and both counted', async () => {
    await Promise.all([hours(EVENINGS), limits({ windLimit: '36' })])
    expect(await read()).toMatchObject({ settingsVersion: 3, maxPasses: 2, windLimitMps: 10 })
  })
})

describe('place and clock', () => {
  test('a clock that follows the place moves with it, and so does the weather', async () => {
    const before = await read()
    expect(before).toMatchObject({ timeZone: 'America/Toronto', timeZoneBy: 'place' })
    await place(KENORA)
    const after = await read()
    expect(after).toMatchObject({ timeZone: 'America/Winnipeg', timeZoneBy: 'place', placeName: 'Near Kenora' })
    expect(after.gridCellId).not.toBe(before.gridCellId)
    expect(await jobs('pull-forecast')).toContain(`pull:${after.gridCellId}`)
  })

  test('a clock that the keeper chose stays, across the border and back', async () => {
    await place({ ...EAST, zoneBy: 'keeper', timeZone: 'America/Winnipeg' })
    expect(await read()).toMatchObject({ timeZone: 'America/Winnipeg', timeZoneBy: 'keeper' })
    // The form sends along what is stored; only the position is another.
    for (const position of [KENORA, EAST]) {
      const { timeZone, timeZoneBy } = await read()
      await place({ ...position, timeZone, zoneBy: timeZoneBy })
      expect(await read()).toMatchObject({ timeZone: 'America/Winnipeg', timeZoneBy: 'keeper' })
    }
    await place({ ...EAST, zoneBy: 'place', timeZone: 'America/Winnipeg' })
    expect(await read()).toMatchObject({ timeZoneBy: 'place', timeZone: 'America/Toronto' })
  })
})

describe('water', () => {
  test('sources are added, changed, and one of them is the usual one', async () => {
    await water({ waterKind: 'hot-tap', flow: '10', waterTemperature: '50' })
    const [cold, hot] = (await read()).sources
    expect([cold, hot]).toMatchObject([
      { kind: 'cold-tap', isDefault: true },
      { kind: 'hot-tap', isDefault: false, flowLPerMin: 10, temperatureC: 50 },
    ])
    await water({ sourceId: hot?.id ?? '', waterKind: 'hot-tap', flow: '11' })
    await pourFromWater(cast.keeper.at(LATER), { rinkId: cast.rinkId, sourceId: hot?.id ?? '' })
    expect(await read()).toMatchObject({
      water: { kind: 'hot-tap', flowLPerMin: 11 },
      sources: [
        { id: hot?.id, isDefault: true },
        { id: cold?.id, isDefault: false },
      ],
    })
    await removeWater(cast.keeper.at(LATER), { rinkId: cast.rinkId, sourceId: cold?.id ?? '' })
    expect((await read()).sources).toHaveLength(1)
  })

  test('the usual source and the last one stay', async () => {
    const only = (await read()).sources[0]?.id ?? ''
    const remove = () => removeWater(cast.keeper.at(LATER), { rinkId: cast.rinkId, sourceId: only })
    await expect(remove()).rejects.toThrow('the last source stays')
    await water({ waterKind: 'tanker' })
    await expect(remove()).rejects.toThrow('Make another source the usual one first')
    expect((await read()).sources).toHaveLength(2)
  })

  test('another rink’s source is none of this one', async () => {
    const other = await createCast(database.db, NOW)
    const theirs = (await services.getRinkSettings(other.keeper.at(LATER), other.rinkId)).sources[0]?.id ?? ''
    const one = { rinkId: cast.rinkId, sourceId: theirs }
    await expect(water({ sourceId: theirs })).rejects.toThrow(NotFoundError)
    await expect(pourFromWater(cast.keeper.at(LATER), one)).rejects.toThrow(NotFoundError)
    await expect(removeWater(cast.keeper.at(LATER), one)).rejects.toThrow(NotFoundError)
    expect(await read()).toMatchObject({ settingsVersion: 1, water: { kind: 'cold-tap' } })
  })
})

describe('those who may not', () => {
  const all: [string, (actor: Actor) => Promise<unknown>][] = [
    ['read', (actor) => services.getRinkSettings(actor.at(LATER), cast.rinkId)],
    ['place', (actor) => place({ name: 'Mine' }, actor)],
    ['yard', (actor) => yard({}, actor)],
    ['ice', (actor) => ice({ iceThickness: '20' }, actor)],
    ['hours', (actor) => hours(EVENINGS, actor)],
    ['limits', (actor) => limits({ windLimit: '36' }, actor)],
    ['water', (actor) => water({ waterKind: 'tanker' }, actor)],
    ['delete', (actor) => deleteRink(actor.at(LATER), { rinkId: cast.rinkId, name: 'Birch Lane' })],
  ]

  test.each(all)(
    '%s: crew and skaters are refused, a stranger finds nothing, and nothing changes',
    async (_name, act) => {
      const before = await findRinkForJudging(database.db, cast.rinkId)
      await expect(act(cast.crew)).rejects.toThrow(ForbiddenError)
      await expect(act(cast.skater)).rejects.toThrow(ForbiddenError)
      await expect(act(cast.stranger)).rejects.toThrow(NotFoundError)
      expect(await findRinkForJudging(database.db, cast.rinkId)).toEqual(before)
    },
  )

  test('a forged id looks like a rink that does not exist', async () => {
    for (const rinkId of [randomUUID(), 'forged', "' or 1=1 --", '']) {
      await expect(services.getRinkSettings(cast.keeper.at(LATER), rinkId)).rejects.toThrow(NotFoundError)
    }
  })
})

describe('the end', () => {
  const rinksOf = async (actor: Actor) => (await listMyRinks(actor.at(LATER))).map(({ id }) => id)

  test('a rink goes with everything of it, once its name was typed', async () => {
    const wrong = deleteRink(cast.keeper.at(LATER), { rinkId: cast.rinkId, name: 'Birch' })
    await expect(wrong).rejects.toMatchObject({ code: 'invalid_input', fields: { name: expect.any(String) } })
    await deleteRink(cast.keeper.at(LATER), { rinkId: cast.rinkId, name: 'birch lane' })
    expect(await findRinkForJudging(database.db, cast.rinkId)).toBeUndefined()
    expect(await rinksOf(cast.crew)).toEqual([])
    expect(await database.db('water_sources').where({ rink_id: cast.rinkId })).toEqual([])
  })

  test('crew leave, and the rink stays', async () => {
    expect(await getLeaving(cast.crew.at(LATER), cast.rinkId)).toEqual({ rinkName: 'Birch Lane', isOnlyKeeper: false })
    await leaveRink(cast.crew.at(LATER), cast.rinkId)
    expect(await rinksOf(cast.crew)).toEqual([])
    expect(await rinksOf(cast.keeper)).toEqual([cast.rinkId])
    await expect(leaveRink(cast.crew.at(LATER), cast.rinkId)).rejects.toThrow(NotFoundError)
    await expect(leaveRink(cast.stranger.at(LATER), cast.rinkId)).rejects.toThrow(NotFoundError)
  })

  test('the only keeper stays; of two who leave at once, one does', async () => {
    await expect(leaveRink(cast.keeper.at(LATER), cast.rinkId)).rejects.toThrow('only keeper')
    await database
      .db('rink_members')
      .where({ rink_id: cast.rinkId, user_id: cast.crew.userId })
      .update({ role: 'keeper' })
    const both = await Promise.allSettled(
      [cast.keeper, cast.crew].map((actor) => leaveRink(actor.at(LATER), cast.rinkId)),
    )
    expect(both.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
    expect(await database.db('rink_members').where({ rink_id: cast.rinkId, role: 'keeper' })).toHaveLength(1)
  })
})
