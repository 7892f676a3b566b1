// A fill split over the keeper's hours, and how it freezes over the forecast runs.
import { describe, expect, test } from 'vitest'
import { judge } from '@/lib/advice/judge'
import type { JudgeInput } from '@/lib/advice/types'
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { hourOf, inputOf, timeOf } from '../../support/advice-weather'
import { scoreExample } from '../../support/score-example'
import { scoreInputSchema } from '@/lib/schemas/score'

const alone = { runs: 0 }
/** The first hour is noon in Toronto. */
const waiting = (airAt: (hour: number) => number, given: Partial<JudgeInput> = {}, count = 240): JudgeInput => {
  const hours = Array.from({ length: count }, (_, hour) => hourOf(hour, { airTemperatureC: airAt(hour) }))
  const input = inputOf(hours, given)
  return { ...input, rink: { ...input.rink, phase: 'waiting', ...given.rink } }
}
const available = [{ from: '12:00', to: '18:00' }]
const always = [{ from: '00:00', to: '24:00' }]

describe('sessions', () => {
  // 12 000 L at 25 L/min are 8 h; the keeper has six hours a day: 6 h and 2 h, 9000 L and 3000 L.
  test('split over two afternoons', () => {
    const { fill } = judge(
      waiting((hour) => (hour < 40 ? -1 : -9), { available }),
      alone,
    )
    expect(fill.sessions).toEqual([
      { startsAt: timeOf(0), endsAt: timeOf(6), litres: 9000 },
      { startsAt: timeOf(24), endsAt: timeOf(26), litres: 3000 },
    ])
  })
  // The hose bears the first four hours; at -6 °C it is off, and the next afternoon it runs its other four.
  test('only in hours that the hose bears', () => {
    const airAt = (hour: number) => (hour < 4 || (hour >= 24 && hour < 30) ? -1 : -6)
    const { fill } = judge(waiting(airAt, { available }), alone)
    expect(fill.sessions).toEqual([
      { startsAt: timeOf(0), endsAt: timeOf(4), litres: 6000 },
      { startsAt: timeOf(24), endsAt: timeOf(28), litres: 6000 },
    ])
  })
  test('the last one ends in the minute in which the water is in', () => {
    const water = { temperatureC: 6, flowLPerMin: 40, layerMm: 3, fillDepthMm: 100 }
    const { fill } = judge(
      waiting((hour) => (hour < 20 ? -1 : -9), { available, water }),
      alone,
    )
    // 10 000 L ÷ 40 L/min = 250 min.
    expect(fill.sessions?.at(-1)?.endsAt).toBe(
      new Date(Date.parse(timeOf(0)) + 250 * MINUTE_MILLIS).toISOString().replace('.000', ''),
    )
  })
  test('what is in already is not poured again', () => {
    const water = { temperatureC: 6, flowLPerMin: 25, layerMm: 3, fillDepthMm: 120, filledLitres: 9000 }
    const { fill } = judge(
      waiting((hour) => (hour < 20 ? -1 : -9), { available, water }),
      alone,
    )
    expect(fill).toMatchObject({ litres: 3000, hoseHours: 2 })
    expect(fill.hours?.map(({ litresSoFar }) => litresSoFar)).toEqual([10_500, 12_000])
  })
  test('there are none where no hour is good to start', () => {
    const { fill } = judge(
      waiting(() => -15),
      alone,
    )
    expect([fill.startsAt, fill.sessions, fill.hours]).toEqual([null, [], []])
  })
})

describe('runs that doubt the first time to start', () => {
  // -1 °C on the first and the third afternoon and -9 °C after each; in seven of ten members the first is too cold for a hose.
  const afternoons = (first: number) => (hour: number) => (hour < 10 ? first : hour >= 48 && hour < 58 ? -1 : -9)
  const members = Array.from({ length: 10 }, (_, member) => waiting(afternoons(member < 3 ? -1 : -15)).hours)
  const input = waiting(afternoons(-1), { available: always, members })

  test('leave the start to the next that most of them see, as the windows say', () => {
    const { fill, windows } = judge(input)
    expect(windows.map(({ kind, agreement }) => [kind, agreement])).toEqual([
      ['fill', 0.3],
      ['fill', 1],
    ])
    expect(Date.parse(fill.startsAt!)).toBeGreaterThanOrEqual(Date.parse(timeOf(48)))
    expect(fill.sessions?.[0]?.startsAt).toBe(fill.startsAt)
  })
  test('leave none where there is no other', () => {
    const hours = input.hours.slice(0, 48)
    const { fill } = judge({ ...input, hours, members: members.map((member) => member.slice(0, 48)) })
    expect([fill.startsAt, fill.skinAt, fill.sessions]).toEqual([null, null, []])
  })
})

describe('level hour by hour', () => {
  const rink = { ...inputOf([]).rink, phase: 'waiting' as const, floor: { cornersM: [0, 0, 0.24, 0.24] } }
  const { fill } = judge(
    waiting((hour) => (hour < 20 ? -1 : -9), { available: always, rink }),
    alone,
  )
  // 100 m² falling 0.24 m in 10 m; 1.5 m³ an hour: depth √(2 × 0.024 × V / 10), until 12 m³ stand at the brim.
  test.each([1, 3, 5])('after %d hours', (hours) => {
    const { litresSoFar, wettedShare, levelM, cornerDepthsM } = fill.hours![hours - 1]!
    const depthM = Math.sqrt((2 * 0.024 * 1.5 * hours) / 10)
    expect(litresSoFar).toBe(1500 * hours)
    expect(levelM).toBeCloseTo(0.24 - depthM, 3)
    expect(wettedShare).toBeCloseTo(depthM / 0.24, 3)
    expect(cornerDepthsM[2]).toBeCloseTo(depthM, 3)
    expect(cornerDepthsM[0]).toBe(0)
  })
  test('at the end the floor is wet to the high side', () => {
    expect(fill.hours).toHaveLength(8)
    expect(fill.hours!.at(-1)!.levelM).toBeCloseTo(0, 3)
    expect(fill.hours!.at(-1)!.wettedShare).toBeCloseTo(1, 3)
  })
})

describe('freezing of the fill over the runs', () => {
  const cold = (degrees: number) => waiting((hour) => (hour < 12 ? -1 : degrees), { available: always })
  const members = [-7, -9, -11, -13].map((degrees) => cold(degrees).hours)
  const { fill } = judge({ ...cold(-10), members })
  test('skin, carrying and frozen through come in that order, each with its spread', () => {
    for (const spread of [fill.skinAtSpread!, fill.carriesSkaterAt, fill.frozenThroughAt!]) {
      expect(spread.p10! <= spread.p50!).toBe(true)
      expect(spread.p90 === null || spread.p50! <= spread.p90).toBe(true)
    }
    expect(fill.skinAtSpread!.p50! < fill.carriesSkaterAt.p50!).toBe(true)
    expect(fill.carriesSkaterAt.p50! < fill.frozenThroughAt!.p50!).toBe(true)
  })
  test('a keeper who asks for less ice skates sooner', () => {
    const sooner = judge({ ...cold(-10), members, carriesSkaterMm: 70 }).fill
    expect(sooner.carriesSkaterAt.p50! < fill.carriesSkaterAt.p50!).toBe(true)
    expect(sooner.frozenThroughAt).toEqual(fill.frozenThroughAt)
  })
  // Mean 12 cm both times; with 24 cm at the low side there is twice the water over it.
  test('the deepest place freezes through last', () => {
    const input = cold(-12)
    const sloping = judge({ ...input, rink: { ...input.rink, floor: { cornersM: [0, 0, 0.24, 0.24] } } }, alone).fill
    const level = judge(input, alone).fill
    const later = sloping.frozenThroughAt!.p50 ?? timeOf(240)
    expect(Date.parse(later) - Date.parse(level.frozenThroughAt!.p50!)).toBeGreaterThan(24 * HOUR_MILLIS)
    expect(sloping.litres).toBe(level.litres)
  })
})

describe('the document of npm run score', () => {
  const document = scoreExample()
  const parse = (rink: object, rest: object = {}) =>
    scoreInputSchema.safeParse({ ...document, ...rest, rink: { ...document.rink, ...rink } })
  test('takes a floor by corners or grid, water that is in, and the keeper’s limit', () => {
    expect(parse({ floor: { cornersM: [0, 0, 0.2, 0.2] } }).success).toBe(true)
    expect(parse({ floor: { depthsM: [[0, 0, 0], [0.1, 0.2, 0.1]] } }).success).toBe(true) // prettier-ignore
    const water = { ...document.water, filledLitres: 4000 }
    const parsed = parse({}, { water, carriesSkaterMm: 120 })
    expect(parsed.data?.carriesSkaterMm).toBe(120)
    expect(parsed.data?.water.filledLitres).toBe(4000)
  })
  test('refuses a floor that is none', () => {
    for (const floor of [{ cornersM: [0, 0, 0] }, { depthsM: [[0, 0], [0]] }, { cornersM: [0, 0, 0, 99] }, 'flat']) {
      expect(parse({ floor }).success).toBe(false)
    }
  })
})
