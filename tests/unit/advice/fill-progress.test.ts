// A running fill: water, level, looks, leaks and frost, worked out by hand.
import { describe, expect, test } from 'vitest'
import { fillProgress, type FillProgressInput } from '@/lib/advice/fill-progress'
import { levelOfReading } from '@/lib/advice/leak-warning'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { floorFromCorners } from '@/lib/physics/floor'

const at = (hour: number) => new Date(Date.UTC(2026, 11, 20, 18) + hour * HOUR_MILLIS).toISOString()
/** 10 m square, falling 0.3 m along its length; the hose on at 18:00, three hours ago. */
const WEDGE: FillProgressInput = {
  now: at(3),
  lengthM: 10,
  widthM: 10,
  floor: { cornersM: [0, 0, 0.3, 0.3] },
  targetL: 15_000,
  sessions: [{ startedAt: at(0), stoppedAt: null, flowLPerMin: 25 }],
}

describe('progress', () => {
  const progress = fillProgress(WEDGE)
  // 3 h × 25 L/min = 4500 L of 15 000; 10 500 L are 7 h more.
  test('water so far and done by', () => {
    expect(progress.isRunning).toBe(true)
    expect(progress.litres).toBeCloseTo(4500, 6)
    expect(progress.doneShare).toBeCloseTo(0.3, 9)
    expect(progress.hoursLeft).toBeCloseTo(7, 9)
    expect(progress.doneAt).toBe('2026-12-21T04:00:00Z')
  })
  // Wedge: depth √(2 × 0.03 × 4.5 / 10) = 0.1643 m, wet 5.48 of 10 m.
  test('level, corners and wetted share', () => {
    expect(progress.deepestM).toBeCloseTo(0.16432, 4)
    expect(progress.wettedShare).toBeCloseTo(0.54772, 4)
    expect(progress.levelM).toBeCloseTo(0.3 - 0.16432, 4)
    expect(progress.cornerDepthsM[0]).toBe(0)
    expect(progress.cornerDepthsM[3]).toBeCloseTo(0.16432, 4)
  })
  test('paused and resumed the next day', () => {
    const sessions = [
      { startedAt: at(24), stoppedAt: null, flowLPerMin: 20 },
      { startedAt: at(0), stoppedAt: at(3), flowLPerMin: 25 },
    ]
    expect(fillProgress({ ...WEDGE, now: at(25), sessions }).litres).toBeCloseTo(5700, 6)
    const paused = fillProgress({ ...WEDGE, now: at(12), sessions: sessions.slice(1) })
    expect(paused.litres).toBeCloseTo(4500, 6)
    expect([paused.isRunning, paused.doneAt, paused.nextCheckAt]).toEqual([false, null, null])
    expect(paused.hoursLeft).toBeCloseTo(7, 9)
  })
  test('full, empty, and nonsense', () => {
    const full = fillProgress({ ...WEDGE, now: at(11) })
    expect([full.litresLeft, full.doneShare, full.doneAt]).toEqual([0, 1, null])
    const empty = fillProgress({ ...WEDGE, sessions: [] })
    expect([empty.litres, empty.wettedShare, empty.hoursLeft]).toEqual([0, 0, 0])
    expect(() => fillProgress({ ...WEDGE, now: 'soon' })).toThrow(RangeError)
    const backwards = [{ startedAt: at(3), stoppedAt: at(1), flowLPerMin: 25 }]
    expect(() => fillProgress({ ...WEDGE, sessions: backwards })).toThrow(RangeError)
  })
})

describe('looks at hose and liner', () => {
  // Common practice, no source: somebody looks every two hours.
  test('the first is due two hours after the start', () => {
    expect(fillProgress({ ...WEDGE, now: at(1) })).toMatchObject({
      nextCheckAt: '2026-12-20T20:00:00Z',
      isCheckDue: false,
    })
    expect(fillProgress(WEDGE)).toMatchObject({ nextCheckAt: '2026-12-20T20:00:00Z', isCheckDue: true })
  })
  test('the next counts from the last look, and a reading is a look', () => {
    expect(fillProgress({ ...WEDGE, checkedAt: [at(2.5)] }).nextCheckAt).toBe('2026-12-20T22:30:00Z')
    const readings = [{ at: at(2.75), belowLineMm: 140 }]
    expect(fillProgress({ ...WEDGE, checkedAt: [at(2.5)], readings }).nextCheckAt).toBe('2026-12-20T22:45:00Z')
  })
})

describe('a leak', () => {
  /** Level ground: the hose off, or on at 1.5 m³ an hour, which is 15 mm. */
  const level = (depths: [hour: number, mm: number][], isRunning = false) =>
    fillProgress({
      ...WEDGE,
      now: at(30),
      floor: null,
      sessions: isRunning ? [{ startedAt: at(-4), stoppedAt: null, flowLPerMin: 25 }] : [],
      readings: depths.map(([hour, lowestDepthMm]) => ({ at: at(hour), lowestDepthMm })),
    }).leak
  // 8 mm on 100 m² in 2 h are 400 L an hour.
  test('the level falls with the hose off', () => {
    const leak = level([[0, 50], [2, 42]]) // prettier-ignore
    expect(leak?.code).toBe('level_falls')
    expect(leak?.values.riseMm).toBeCloseTo(-8, 6)
    expect(leak?.values.lostLPerHour).toBeCloseTo(400, 3)
  })
  test('what a stick and the air account for is no leak', () => {
    expect(level([[0, 50], [2, 46]])).toBeNull() // prettier-ignore
    expect(level([[0, 50], [24, 45]])).toBeNull() // prettier-ignore
    expect(level([[0, 50]])).toBeNull() // prettier-ignore
  })
  test('a slow leak shows over several readings', () => {
    expect(level([[0, 50], [2, 46.5], [4, 43]])).toMatchObject({ code: 'level_falls', values: { since: at(0) } }) // prettier-ignore
  })
  // A stick is good for a few millimetres, so looks a minute apart differ by chance, and 20 mm lost in ten seconds
  // would be 720 000 L an hour from 100 m². Half an hour on, the same 20 mm are 2000 L, 4000 L an hour.
  test('looks moments apart tell of no rate; a later one still compares with both', () => {
    const tenSeconds = 10 / 3600
    expect(level([[0, 50], [tenSeconds, 30]])).toBeNull() // prettier-ignore
    expect(level([[0, 50], [0.49, 30]])).toBeNull() // prettier-ignore
    const leak = level([[0, 50], [tenSeconds, 50], [0.5, 30]]) // prettier-ignore
    expect(leak).toMatchObject({ code: 'level_falls', values: { since: at(0) } })
    expect(leak?.values.lostLPerHour).toBeCloseTo(4000, 3)
  })
  test('after looks moments apart the next one compares with what came before', () => {
    const leak = level([[0, 50], [2, 42], [2.01, 42]]) // prettier-ignore
    expect(leak).toMatchObject({ code: 'level_falls', values: { since: at(0) } })
  })
  // Two hours of hose are 30 mm; 5 mm and 15 % are allowed, 9.5 mm in all.
  test('the level rises less than the hose should make it', () => {
    expect(level([[0, 50], [2, 73]], true)).toBeNull() // prettier-ignore
    expect(level([[0, 50], [2, 68]], true)?.code).toBe('level_lags') // prettier-ignore
    expect(level([[0, 50], [2, 44]], true)?.code).toBe('level_falls') // prettier-ignore
  })
  test('a leak that is mended is forgotten after a day', () => {
    expect(level([[0, 80], [3, 50], [28, 50], [30, 50]])).toBeNull() // prettier-ignore
  })
  test('readings at a corner, at the lowest point and below the string say the same', () => {
    const floor = floorFromCorners(10, 10, [0, 0, 0.3, 0.2])
    expect(levelOfReading(floor, { at: at(0), lowestDepthMm: 150 })).toBeCloseTo(0.15, 9)
    expect(levelOfReading(floor, { at: at(0), corner: 3, depthMm: 50 })).toBeCloseTo(0.15, 9)
    expect(levelOfReading(floor, { at: at(0), belowLineMm: 150 })).toBeCloseTo(0.15, 9)
  })
  test('the last reading is told beside what the hose should have made', () => {
    const readings = [{ at: at(2), belowLineMm: 180 }, { at: at(2.9), belowLineMm: 140 }] // prettier-ignore
    expect(fillProgress({ ...WEDGE, readings }).readLevelM).toBeCloseTo(0.14, 9)
  })
})

describe('frost in the hose', () => {
  const hours = (temperatures: number[]) =>
    temperatures.map((airTemperatureC, hour) => ({ time: at(3 + hour), airTemperatureC, windAtRinkMps: 1 }))
  // Common practice, no source: a running cold hose has frozen at -4 to -5 °C.
  test('a running hose is warned from the first hour at -4 °C', () => {
    const { hose } = fillProgress({ ...WEDGE, hours: hours([-1, -2, -4.5, -7]) })
    expect(hose).toMatchObject({ code: 'running_hose_freezes', values: { startsAt: at(5), lowestC: -7 } })
    const already = fillProgress({ ...WEDGE, hours: hours([-4.5, -7]) }).hose
    expect(already).toMatchObject({ code: 'running_hose_freezes_now', values: { airTemperatureC: -4.5 } })
    expect(fillProgress({ ...WEDGE, hours: hours([-1, -2, -3, -3.5]) }).hose).toBeNull()
  })
  test('a hose left lying is warned of any frost', () => {
    const off = { ...WEDGE, sessions: [] }
    const { hose } = fillProgress({ ...off, hours: hours([1, -2, -6]) })
    expect(hose).toMatchObject({ code: 'still_hose_freezes', values: { startsAt: at(4), airTemperatureC: -6 } })
    expect(fillProgress({ ...off, hours: hours([2, 1, 0.5]) }).hose).toBeNull()
  })
  test('hours without a temperature, and hours past a day, warn of nothing', () => {
    const far = [{ time: at(30), airTemperatureC: -9 }, { time: at(4), airTemperatureC: null }] // prettier-ignore
    expect(fillProgress({ ...WEDGE, hours: far }).hose).toBeNull()
  })
})
