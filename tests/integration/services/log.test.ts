// The log: written once, by those who may, at a time that was; changed with history, and never over somebody unseen.
import { randomUUID } from 'node:crypto'
import { describe, expect, test } from 'vitest'
import { ConflictError, ForbiddenError, InvalidInputError, NotFoundError } from '@/lib/errors'
import { MINUTE_MILLIS } from '@/lib/physics/constants'
import { answerSetSchema } from '@/lib/schemas/log'
import { IMPERIAL, unitsCode } from '@/lib/units'
import { answerSet, changeEntry, deleteEntry, restoreEntry, writeEntry } from '@/lib/services/log'
import { getEntry, getLog } from '@/lib/services/log-book'
import { checkOffPass } from '@/lib/services/floods'
import { createCast, type Actor } from '@/tests/support/cast'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { typedChange, typedEntry } from '@/tests/support/log-form'

// Tuesday, 6:10 pm at the rink.
const NOW = new Date('2027-01-12T23:10:00Z')
const later = (minutes: number) => new Date(NOW.getTime() + minutes * MINUTE_MILLIS)

const database = givenDatabase()
const cast = givenCast(database, new Date('2027-01-12T19:10:00Z'))

const write = (actor: Actor, changes: Record<string, string> = {}, now = NOW) =>
  writeEntry(actor.at(now), typedEntry(cast.rinkId, changes))
const change = (actor: Actor, entryId: string, version: number, changes: Record<string, string>, now = later(10)) =>
  changeEntry(actor.at(now), typedChange(cast.rinkId, entryId, version, changes))
const rows = () => database.db('log_entries').where({ rink_id: cast.rinkId })
const entry = async (entryId: string) => (await getEntry(cast.keeper.at(later(60)), cast.rinkId, entryId)).entry
const settingsVersion = async () =>
  (await database.db('rinks').where({ id: cast.rinkId }).first('settings_version'))?.settings_version ?? 0
const faultsOf = (work: Promise<unknown>) =>
  work.then(
    () => null,
    (error: unknown) => (error instanceof InvalidInputError ? error.fields : error),
  )

describe('writing', () => {
  test('a flood with nothing filled in takes the rink’s layer, its area and its water', async () => {
    const { entryId } = await write(cast.crew)
    // 10 m by 10 m, 3 mm: 300 L. Water as set up: cold tap at 6 °C.
    expect(await entry(entryId)).toMatchObject({
      nightDate: '2027-01-12',
      happenedAt: NOW.toISOString(),
      layerMm: 3,
      waterL: 300,
      waterTemperatureC: 6,
      waterKind: 'cold-tap',
      by: 'Crew',
      version: 1,
    })
  })

  test('another source comes with its own temperature', async () => {
    const { entryId } = await write(cast.keeper, { waterKind: 'hot-tap', layer: '2' })
    expect(await entry(entryId)).toMatchObject({ waterKind: 'hot-tap', waterTemperatureC: 45, waterL: 200 })
  })

  test('litres without a layer spread over the rink', async () => {
    const { entryId } = await write(cast.keeper, { water: '450' })
    expect(await entry(entryId)).toMatchObject({ layerMm: 4.5, waterL: 450 })
  })

  test('the same key twice, or twice at once, is kept once', async () => {
    const entryKey = randomUUID()
    const answers = await Promise.all([write(cast.crew, { entryKey }), write(cast.crew, { entryKey })])
    answers.push(await write(cast.keeper, { entryKey }, later(5)))
    expect(new Set(answers.map(({ entryId }) => entryId)).size).toBe(1)
    expect(await rows()).toHaveLength(1)
  })

  test('a flood has the night judged again; a note does not', async () => {
    const before = await settingsVersion()
    await write(cast.crew, { kind: 'note', note: 'Key is under the bench' })
    expect(await settingsVersion()).toBe(before)
    await write(cast.crew)
    expect(await settingsVersion()).toBe(before + 1)
  })

  test('half past midnight belongs to the night before', async () => {
    const { entryId } = await write(cast.keeper, { onDate: '2027-01-11', atTime: '00:30' })
    expect(await entry(entryId)).toMatchObject({ nightDate: '2027-01-10', happenedAt: '2027-01-11T05:30:00.000Z' })
  })

  test('a time alone is the last time the clock showed it', async () => {
    const { entryId } = await write(cast.keeper, { atTime: '22:00' })
    expect(await entry(entryId)).toMatchObject({ happenedAt: '2027-01-12T03:00:00.000Z' })
  })
})

describe('refusals', () => {
  test('a skater may read, and write nothing', async () => {
    const { entryId } = await write(cast.crew)
    await expect(write(cast.skater)).rejects.toThrow(ForbiddenError)
    await expect(change(cast.skater, entryId, 1, {})).rejects.toThrow(ForbiddenError)
    await expect(deleteEntry(cast.skater.at(NOW), { rinkId: cast.rinkId, entryId })).rejects.toThrow(ForbiddenError)
    const log = await getLog(cast.skater.at(NOW), cast.rinkId, {})
    expect(log.mayWrite).toBe(false)
    expect(log.nights[0]?.entries).toHaveLength(1)
  })

  test('a stranger cannot see that the rink exists', async () => {
    const { entryId } = await write(cast.crew)
    await expect(write(cast.stranger)).rejects.toThrow(NotFoundError)
    await expect(getLog(cast.stranger.at(NOW), cast.rinkId, {})).rejects.toThrow(NotFoundError)
    await expect(getEntry(cast.stranger.at(NOW), cast.rinkId, entryId)).rejects.toThrow(NotFoundError)
  })

  test('an entry of another rink is not found through one’s own', async () => {
    const { entryId } = await write(cast.crew)
    const other = await createCast(database.db, NOW)
    const ids = { rinkId: other.rinkId, entryId }
    await expect(deleteEntry(other.keeper.at(NOW), ids)).rejects.toThrow(NotFoundError)
    await expect(getEntry(other.keeper.at(NOW), other.rinkId, entryId)).rejects.toThrow(NotFoundError)
  })

  test('what is still to come, and another season, at their fields', async () => {
    expect(await faultsOf(write(cast.keeper, { onDate: '2027-01-12', atTime: '18:20' }))).toEqual({
      onDate: 'That is still to come.',
    })
    expect(await faultsOf(write(cast.keeper, { onDate: '2026-06-30', atTime: '20:00' }))).toEqual({
      onDate: 'That night belongs to another season.',
    })
    expect(await rows()).toHaveLength(0)
  })

  test('a phone whose clock is four minutes ahead is let through, as now', async () => {
    const { entryId } = await write(cast.keeper, { onDate: '2027-01-12', atTime: '18:14' })
    expect(await entry(entryId)).toMatchObject({ happenedAt: NOW.toISOString() })
  })
})

describe('changing', () => {
  test('what it said before is kept, with who changed it', async () => {
    const { entryId } = await write(cast.crew)
    await change(cast.keeper, entryId, 1, { layer: '4', onDate: '2027-01-12', atTime: '18:00' })
    const { entry: now, history } = await getEntry(cast.crew.at(later(20)), cast.rinkId, entryId)
    expect(now).toMatchObject({ layerMm: 4, waterL: 400, version: 2, happenedAt: '2027-01-12T23:00:00.000Z' })
    expect(history).toMatchObject([{ changedBy: 'Keeper', was: { layerMm: 3, waterL: 300, version: 1 } }])
  })

  test('the second of two sees the first’s change, and may then overwrite it deliberately', async () => {
    const { entryId } = await write(cast.crew)
    await change(cast.crew, entryId, 1, { layer: '4' })
    const refused = await change(cast.keeper, entryId, 1, { layer: '2' }).catch((error: unknown) => error)
    expect(refused).toBeInstanceOf(ConflictError)
    const { message, latest } = refused as ConflictError
    expect(message).toContain('Crew changed this at 6:20 pm: Flood, 4 mm, 400 L')
    expect((await entry(entryId)).layerMm).toBe(4)
    await change(cast.keeper, entryId, Number(latest.version), { layer: '2' })
    expect(await entry(entryId)).toMatchObject({ layerMm: 2, version: 3 })
  })

  test('of two changes at once, one stands and the other hears of it', async () => {
    const { entryId } = await write(cast.crew)
    const results = await Promise.allSettled([
      change(cast.crew, entryId, 1, { layer: '4' }),
      change(cast.keeper, entryId, 1, { layer: '2' }),
    ])
    expect(results.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
    expect((await entry(entryId)).version).toBe(2)
  })

  test('deleting is undone, and a deleted flood is not on the sheet', async () => {
    const { entryId } = await write(cast.crew)
    const ids = { rinkId: cast.rinkId, entryId }
    await deleteEntry(cast.keeper.at(later(1)), ids)
    await deleteEntry(cast.keeper.at(later(2)), ids)
    expect((await getLog(cast.keeper.at(later(3)), cast.rinkId, {})).totals.floods).toBe(0)
    await expect(change(cast.crew, entryId, 1, { layer: '4' })).rejects.toThrow('Keeper deleted this')
    await restoreEntry(cast.crew.at(later(4)), ids)
    expect((await getLog(cast.keeper.at(later(5)), cast.rinkId, {})).totals.floods).toBe(1)
    expect((await getEntry(cast.keeper.at(later(5)), cast.rinkId, entryId)).history).toHaveLength(2)
  })

  test('a pass that was checked off again meanwhile comes back as a flood like any other', async () => {
    const pass = { rinkId: cast.rinkId, nightDate: '2027-01-12', passNumber: 1, layerMm: 3 }
    await checkOffPass(cast.crew.at(NOW), pass)
    const [first] = await rows().select('id')
    const ids = { rinkId: cast.rinkId, entryId: first?.id ?? '' }
    await deleteEntry(cast.crew.at(later(1)), ids)
    await checkOffPass(cast.crew.at(later(2)), pass)
    await restoreEntry(cast.crew.at(later(3)), ids)
    const passes = await rows().whereNull('deleted_at').orderBy('happened_at').select('pass_number')
    expect(passes.map(({ pass_number }) => pass_number)).toEqual([null, 1])
  })
})

describe('a mended note', () => {
  const IN_INCHES = { units: unitsCode(IMPERIAL) }
  // As the form showed it: the time of NOW at the rink.
  const at = { minutesAgo: '', onDate: '2027-01-12', atTime: '18:10' }

  test('leaves figures as they are that were shown rounded, in inches and °F too, and has nothing judged', async () => {
    const { entryId } = await write(cast.crew, { layer: '3' })
    const before = await settingsVersion()
    // 3 mm are 0.118 in and 6 °C are 42.8 °F; water that follows the layer is not sent.
    const shown = { ...at, ...IN_INCHES, layer: '0.118', waterTemperature: '43', waterKind: 'cold-tap' }
    await change(cast.keeper, entryId, 1, { ...shown, note: 'By the gate' })
    const kept = { layerMm: 3, waterL: 300, waterTemperatureC: 6 }
    expect(await entry(entryId)).toMatchObject({ ...kept, note: 'By the gate', version: 2 })
    expect(await settingsVersion()).toBe(before)
    await change(cast.keeper, entryId, 2, { ...shown, layer: '0.2', note: '' })
    expect((await entry(entryId)).layerMm).toBeCloseTo(5.08, 6)
    expect(await settingsVersion()).toBe(before + 1)
  })

  test('of a reading leaves the thickness', async () => {
    const { entryId } = await write(cast.crew, { kind: 'reading', thickness: '8.9' })
    // 89 mm are 3.504 in.
    await change(cast.crew, entryId, 1, { ...at, ...IN_INCHES, kind: 'reading', thickness: '3.5', note: 'At the gate' })
    expect(await entry(entryId)).toMatchObject({ thicknessMm: 89, note: 'At the gate' })
  })

  test('of a flood of little water is kept: 28 L on 100 m² are 0.28 mm, shown as 0.3', async () => {
    const { entryId } = await write(cast.crew, { water: '28' })
    await change(cast.crew, entryId, 1, {
      ...at,
      layer: '0.3',
      waterKind: 'cold-tap',
      waterTemperature: '6',
      note: 'Edges',
    })
    const { layerMm, waterL, note } = await entry(entryId)
    expect({ waterL, note }).toEqual({ waterL: 28, note: 'Edges' })
    expect(layerMm).toBeCloseTo(0.28, 9)
  })
})

describe('how it set', () => {
  const answer = (actor: Actor, entryId: string, changes: Record<string, string>, now = later(90)) => {
    const fields = { rinkId: cast.rinkId, entryId, version: '1', outcome: 'set', ...changes }
    return answerSet(actor.at(now), answerSetSchema.parse(fields))
  }

  test('a person says when, and takes it back', async () => {
    const { entryId } = await write(cast.crew)
    await answer(cast.keeper, entryId, { atTime: '19:30' })
    expect(await entry(entryId)).toMatchObject({ outcome: 'set', outcomeAt: '2027-01-13T00:30:00.000Z', version: 2 })
    await answer(cast.keeper, entryId, { version: '2', outcome: 'none' })
    expect(await entry(entryId)).toMatchObject({ outcome: null, outcomeAt: null })
  })

  test('without a time it is now; not of a flood of last night', async () => {
    const { entryId } = await write(cast.crew)
    expect(await faultsOf(answer(cast.crew, entryId, {}, later(13 * 60)))).toHaveProperty('atTime')
    await answer(cast.crew, entryId, { outcome: 'wet' })
    expect(await entry(entryId)).toMatchObject({ outcome: 'wet', outcomeAt: later(90).toISOString() })
  })

  test('a time that is still to come is refused, and so is pouring it after it was seen', async () => {
    const { entryId } = await write(cast.crew)
    expect(await faultsOf(answer(cast.crew, entryId, { atTime: '23:30' }))).toHaveProperty('atTime')
    await answer(cast.crew, entryId, { atTime: '19:30' })
    const moved = change(cast.crew, entryId, 2, { onDate: '2027-01-12', atTime: '19:40' }, later(100))
    expect(await faultsOf(moved)).toHaveProperty('atTime')
  })

  test('two answers at once: the second hears of the first', async () => {
    const { entryId } = await write(cast.crew)
    await answer(cast.crew, entryId, { atTime: '19:30' })
    await expect(answer(cast.keeper, entryId, { outcome: 'spoiled' })).rejects.toThrow('It was set at 7:30 pm.')
  })

  test('only a flood sets', async () => {
    const { entryId } = await write(cast.crew, { kind: 'scrape' })
    await expect(answer(cast.crew, entryId, {})).rejects.toThrow(InvalidInputError)
  })
})
