// A fill from its start to its end: by those who may, once at a time, paused over days, with reminders while the hose runs.
import { describe, expect, test } from 'vitest'
import { findMessageToDeliver } from '@/db/queries/deliveries'
import { ConflictError, ForbiddenError, NotFoundError } from '@/lib/errors'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { changeIceSchema } from '@/lib/schemas/rink-settings'
import { checkFillSchema, resumeFillSchema, startFillSchema } from '@/lib/schemas/fills'
import { getFilling } from '@/lib/services/filling'
import { checkFill, finishFill, giveUpFill, pauseFill, resumeFill, startFill } from '@/lib/services/fills'
import { changeIce } from '@/lib/services/rink-settings'
import { renderEmail, renderPush } from '@/lib/services/render-message'
import type { Actor } from '@/tests/support/cast'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { SETTINGS } from '@/tests/support/night-at-the-rink'

// Sunday, 1 pm at the rink.
const NOW = new Date('2027-01-03T18:00:00Z')
const later = (hours: number) => new Date(NOW.getTime() + hours * HOUR_MILLIS)

const database = givenDatabase()
// 10 m by 10 m, 10 cm of water, 25 L/min: 10,000 L in 6 h 40 min.
const cast = givenCast(database, new Date('2027-01-02T19:00:00Z'), { phase: 'waiting', iceThickness: '' })

const form = (changes: Record<string, string> = {}) => ({ rinkId: cast.rinkId, units: 'metric', ...changes })
const start = (actor: Actor, at = NOW, changes = {}) => startFill(actor.at(at), startFillSchema.parse(form(changes)))
const pause = (actor: Actor, at: Date) => pauseFill(actor.at(at), { rinkId: cast.rinkId })
const resume = (actor: Actor, at: Date, changes = {}) => resumeFill(actor.at(at), resumeFillSchema.parse(form(changes)))
const look = (actor: Actor, at: Date, changes = {}) => checkFill(actor.at(at), checkFillSchema.parse(form(changes)))
const finish = (actor: Actor, at: Date) => finishFill(actor.at(at), { rinkId: cast.rinkId })
const filling = (at: Date, actor = cast.keeper) => getFilling(actor.at(at), cast.rinkId)
const phase = async () => (await database.db('rinks').where({ id: cast.rinkId }).first('phase'))?.phase
const reminders = () =>
  database.db('messages').where({ rink_id: cast.rinkId, kind: 'fill-check', state: 'promised' }).orderBy('send_at')

describe('who may', () => {
  test('crew and keeper start and pause, a skater only looks on, a stranger finds nothing', async () => {
    await expect(start(cast.skater)).rejects.toThrow(ForbiddenError)
    await expect(start(cast.stranger)).rejects.toThrow(NotFoundError)
    await start(cast.crew)
    await expect(pause(cast.skater, later(1))).rejects.toThrow(ForbiddenError)
    await expect(look(cast.stranger, later(1))).rejects.toThrow(NotFoundError)
    expect((await filling(later(1), cast.skater)).mayWrite).toBe(false)
    await expect(filling(later(1), cast.stranger)).rejects.toThrow(NotFoundError)
    await pause(cast.keeper, later(1))
  })
})

describe('one at a time', () => {
  test('of two who start at once, one is told of the other', async () => {
    const results = await Promise.allSettled([start(cast.keeper), start(cast.crew)])
    const refused = results.filter((result) => result.status === 'rejected')
    expect(refused).toHaveLength(1)
    expect(refused[0]?.reason).toBeInstanceOf(ConflictError)
    expect(String(refused[0]?.reason)).toMatch(/(Keeper|Crew) has started this fill already/)
    expect(await database.db('fills').where({ rink_id: cast.rinkId })).toHaveLength(1)
  })

  test('of two who pause or go on at once, one is told', async () => {
    await start(cast.keeper)
    const paused = await Promise.allSettled([pause(cast.keeper, later(1)), pause(cast.crew, later(1))])
    expect(paused.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
    const resumed = await Promise.allSettled([resume(cast.keeper, later(2)), resume(cast.crew, later(2))])
    expect(resumed.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
  })

  test('ice that is there refuses a fill', async () => {
    await database.db('rinks').where({ id: cast.rinkId }).update({ phase: 'skating' })
    await expect(start(cast.keeper)).rejects.toThrow(ConflictError)
    expect(await database.db('fills').where({ rink_id: cast.rinkId })).toHaveLength(0)
  })
})

describe('the water', () => {
  test('counts over a pause of a day, each time with its own flow', async () => {
    await start(cast.keeper)
    expect(await phase()).toBe('filling')
    await pause(cast.keeper, later(2))
    await resume(cast.crew, later(26), { flow: '30' })
    const { fill } = await filling(later(27))
    // 2 h at 25 L/min and 1 h at 30 L/min; what is left of 10,000 L takes 5,200 / 30 min = 2 h 53 min 20 s.
    expect(fill?.progress.litres).toBeCloseTo(3000 + 1800, 6)
    expect(fill?.progress.doneAt).toBe('2027-01-04T23:54:00Z')
    expect(fill?.sessions.map(({ litres }) => litres)).toEqual([3000, 1800])
  })

  test('stands at the corners as the floor lies, and a look tells what was read', async () => {
    const floor = JSON.stringify({ cornersM: [0, 0, 0.1, 0.1] })
    await database.db('rinks').where({ id: cast.rinkId }).update({ floor })
    await start(cast.keeper)
    await look(cast.crew, later(2), { lowCornerDepth: '4', note: 'All quiet' })
    const { fill } = await filling(later(2))
    // A wedge of 10 m by x with depth x/100 holds x²/20 m³: 3 m³ give x = 7.75 m and 7.7 cm at the low side.
    expect(fill?.progress.cornerDepthsM.map((depth) => Math.round(depth * 1000))).toEqual([0, 0, 77, 77])
    expect(fill?.progress.wettedShare).toBeCloseTo(Math.sqrt(60) / 10, 2)
    expect(fill?.checks[0]).toMatchObject({ by: 'Crew', lowCornerDepthMm: 40, note: 'All quiet' })
    expect(fill?.checks[0]?.reckonedDepthMm).toBeCloseTo(77.5, 0)
  })

  test('that falls while the hose is off is called a leak', async () => {
    await start(cast.keeper)
    await pause(cast.keeper, later(4))
    await look(cast.keeper, later(4), { lowCornerDepth: '6' })
    await look(cast.keeper, later(10), { lowCornerDepth: '4' })
    expect((await filling(later(10))).fill?.progress.leak?.code).toBe('level_falls')
  })
})

describe('finishing', () => {
  test('logs the water, reports open water and lets it freeze', async () => {
    await start(cast.crew)
    await finish(cast.crew, later(4))
    expect(await phase()).toBe('freezing')
    const [entry, ...others] = await database.db('log_entries').where({ rink_id: cast.rinkId })
    expect(others).toHaveLength(0)
    // 4 h at 25 L/min.
    expect(entry).toMatchObject({ kind: 'fill', water_l: 6000, happened_at: later(4), written_by: cast.crew.userId })
    const sheet = await database
      .db('sheet_states')
      .where({ rink_id: cast.rinkId, as_of: later(4) })
      .first()
    expect(sheet).toMatchObject({ origin: 'reported', thickness_mm: 0 })
    const view = await filling(later(5))
    expect(view.fill).toBeNull()
    expect(view.last).toEqual({ finishedAt: later(4).toISOString(), litres: 6000 })
  })

  test('twice at once ends it once', async () => {
    await start(cast.keeper)
    const results = await Promise.allSettled([finish(cast.keeper, later(4)), finish(cast.crew, later(4))])
    expect(results.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
    expect(await database.db('log_entries').where({ rink_id: cast.rinkId })).toHaveLength(1)
  })

  test('giving up logs the water and leaves the rink waiting, for another start', async () => {
    await start(cast.keeper)
    await giveUpFill(cast.keeper.at(later(1)), { rinkId: cast.rinkId })
    expect(await phase()).toBe('waiting')
    expect(await database.db('log_entries').where({ rink_id: cast.rinkId }).first('water_l')).toEqual({ water_l: 1500 })
    await start(cast.keeper, later(30))
    expect((await filling(later(31))).fill?.progress.litres).toBeCloseTo(1500, 6)
  })
})

describe('a fill that nobody ended, and a rink set otherwise in its settings', () => {
  const set = (at: Date, fields: Record<string, string> = {}) =>
    changeIce(cast.keeper.at(at), changeIceSchema.parse(form({ phase: 'skating', iceThickness: '12', ...fields })))
  const fillEntry = () => database.db('log_entries').where({ rink_id: cast.rinkId, kind: 'fill' }).first()

  test('ends when the water wanted was in, not three weeks later, and Finish finds it finished', async () => {
    await start(cast.keeper)
    await set(later(21 * 24))
    expect(await phase()).toBe('skating')
    // 10,000 L at 25 L/min: 6 h 40 min.
    expect(await fillEntry()).toMatchObject({ water_l: 10_000, happened_at: later(6 + 2 / 3) })
    expect((await filling(later(21 * 24))).fill).toBeNull()
    expect(await reminders()).toHaveLength(0)
    await expect(finish(cast.crew, later(21 * 24))).rejects.toThrow(ConflictError)
    expect(await phase()).toBe('skating')
    const sheets = database.db('sheet_states').where({ rink_id: cast.rinkId }).orderBy('as_of', 'desc')
    expect(await sheets.first()).toMatchObject({ thickness_mm: 120 })
  })

  test('counts a hose that somebody looked after later, one turned off, and one that has only begun', async () => {
    await start(cast.keeper)
    await look(cast.crew, later(8))
    await set(later(30))
    expect(await fillEntry()).toMatchObject({ water_l: 8 * 1500, happened_at: later(8) })
    await set(later(31), { phase: 'waiting', iceThickness: '' })
    await database.db('log_entries').where({ rink_id: cast.rinkId }).delete()
    await start(cast.keeper, later(32))
    await pause(cast.keeper, later(34))
    await set(later(60), { phase: 'closed' })
    expect(await fillEntry()).toMatchObject({ water_l: 2 * 1500, happened_at: later(34) })
  })

  test('is left open where the rink is said to be filling still', async () => {
    await start(cast.keeper)
    await set(later(1), { phase: 'filling' })
    expect((await filling(later(1))).fill).not.toBeNull()
  })

  test('left open from before, is neither finished nor given up on a rink with ice', async () => {
    await start(cast.keeper)
    await database.db('rinks').where({ id: cast.rinkId }).update({ phase: 'skating' })
    await expect(finish(cast.crew, later(2))).rejects.toThrow(ConflictError)
    await expect(giveUpFill(cast.crew.at(later(2)), { rinkId: cast.rinkId })).rejects.toThrow(ConflictError)
    expect(await phase()).toBe('skating')
  })

  test('finished and set at once: one after the other, and it ends once', async () => {
    await start(cast.keeper)
    await Promise.allSettled([finish(cast.crew, later(4)), set(later(4))])
    expect(await database.db('log_entries').where({ rink_id: cast.rinkId, kind: 'fill' })).toHaveLength(1)
    expect(await phase()).toBe('skating')
  })
})

describe('reminders', () => {
  test('come every two hours while the hose runs, and once when the water should be in', async () => {
    await start(cast.crew)
    // 6 h 40 min of hose: looks at 2, 4 and 6 h, the end at 6 h 40 min, by mail to who started it alone.
    const promised = await reminders()
    expect(promised.map(({ send_at }) => send_at)).toEqual([later(2), later(4), later(6), later(6 + 2 / 3)])
    expect(new Set(promised.map(({ user_id }) => user_id))).toEqual(new Set([cast.crew.userId]))
  })

  test('start anew with a look, and reach who looked as well', async () => {
    await start(cast.crew)
    await look(cast.keeper, later(3))
    const promised = await reminders()
    const times = (userId: string) => promised.filter(({ user_id }) => user_id === userId).map(({ send_at }) => send_at)
    expect(times(cast.crew.userId)).toEqual([later(5), later(6 + 2 / 3)])
    expect(times(cast.keeper.userId)).toEqual(times(cast.crew.userId))
  })

  test('stop with a pause and with the end', async () => {
    await start(cast.keeper)
    await pause(cast.keeper, later(1))
    expect(await reminders()).toHaveLength(0)
    await resume(cast.keeper, later(2))
    expect(await reminders()).not.toHaveLength(0)
    await finish(cast.keeper, later(3))
    expect(await reminders()).toHaveLength(0)
  })

  test.each([{ wants_email: false }, { muted_through: '2027-01-03' }])('leave out who said no: %o', async (choice) => {
    const quiet = { rink_id: cast.rinkId, user_id: cast.crew.userId, ...choice, updated_at: NOW }
    await database.db('alert_preferences').insert(quiet)
    await start(cast.crew)
    expect(await reminders()).toHaveLength(0)
  })

  test('promised before somebody asks for silence are not sent', async () => {
    await start(cast.crew)
    const [first] = await reminders()
    const quiet = { rink_id: cast.rinkId, user_id: cast.crew.userId, muted_through: '2027-01-03', updated_at: NOW }
    await database.db('alert_preferences').insert(quiet)
    expect(await findMessageToDeliver(database.db, first!.id)).toMatchObject({ isUnwanted: true })
  })

  test('say what should be in by then, and lead to where a look is logged', async () => {
    await start(cast.crew)
    const [first] = await reminders()
    const message = await findMessageToDeliver(database.db, first!.id)
    // Two hours at 25 L/min.
    const push = renderPush(message!, SETTINGS)
    expect(push).toMatchObject({ url: expect.stringMatching(new RegExp(`/rinks/${cast.rinkId}/filling$`)) })
    expect(push.body).toMatch(/\b3.?000.L\b/)
    const mail = renderEmail(message!, SETTINGS)
    expect(mail.to).toBe(cast.crew.email)
    expect(mail.text).toMatch(/\b3.?000.L\b/)
    expect(mail.text).toMatch(/electric/i)
  })
})
