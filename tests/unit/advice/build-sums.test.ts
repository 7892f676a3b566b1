// The sums of a rink before it is built, beside sums done by hand.
import { describe, expect, test } from 'vitest'
import { buildSums } from '@/lib/advice/build-sums'
import type { BuildInput } from '@/lib/advice/build-types'

/** 14 × 7 m, falling 28 cm along its length, with 4 cm of water over the high side. */
const RINK: BuildInput = {
  lengthM: 14,
  widthM: 7,
  floor: { cornersM: [0, 0, 0.28, 0.28] },
  leastDepthM: 0.04,
  flow: { lPerMin: 25 },
  hoursPerSession: 6,
  waterPricePerM3: 3,
  seasonYear: 2026,
}
const sums = buildSums(RINK)

describe('sums', () => {
  // 98 m² × (0.04 + 0.32)/2 = 17.64 m³.
  test('water', () => {
    expect(sums.ground.areaM2).toBeCloseTo(98, 9)
    expect(sums.ground.fallM).toBeCloseTo(0.28, 9)
    expect(sums.water.volumeM3).toBeCloseTo(17.64, 6)
    expect(sums.water.meanDepthM).toBeCloseTo(0.18, 9)
    expect(sums.water.deepestM).toBeCloseTo(0.32, 9)
    expect(sums.water.levelM).toBeCloseTo(-0.04, 9)
  })
  // 17 640 L ÷ 25 L/min ÷ 60 = 11.76 h: two times of 5.88 h; 17.64 × 3 = 52.92.
  test('hose, times out, cost', () => {
    expect(sums.hose.hours).toBeCloseTo(11.76, 6)
    expect(sums.sessions.count).toBe(2)
    expect(sums.sessions.hoursEach).toBeCloseTo(5.88, 6)
    expect(sums.cost?.amount).toBeCloseTo(52.92, 6)
    expect(buildSums({ ...RINK, waterPricePerM3: null }).cost).toBeNull()
  })
  // Bucket of 10 L in 24 s: 25 L/min.
  test('bucket test', () => {
    expect(buildSums({ ...RINK, flow: { bucketL: 10, bucketSeconds: 24 } }).flow.lPerMin).toBeCloseTo(25, 9)
  })
  // Three hours are 4.5 m³: depth √(2 × 0.02 × 4.5 / 7) = 0.1604 m, wet 8.02 of 14 m.
  test('wetted area by hour', () => {
    const third = sums.wetted.byHour[2]!
    expect(third.litres).toBeCloseTo(4500, 6)
    expect(third.wettedShare).toBeCloseTo(0.5727, 4)
    expect(third.wettedM2).toBeCloseTo(56.12, 1)
    expect(third.cornerDepthsM[2]).toBeCloseTo(0.1604, 4)
    expect(third.cornerDepthsM[0]).toBe(0)
    expect(sums.wetted.byHour.at(-1)!.wettedShare).toBeCloseTo(1, 9)
  })
  // Boards 32 + 5 cm: 9¼ and 5½ inches make 37.5 cm. ½ × 1000 × 9.81 × 0.32² = 502 N/m = 51.2 kg/m, 53.6 N m at the foot.
  test('boards and the push on them', () => {
    expect(sums.boards.heightM).toBeCloseTo(0.37, 9)
    expect(sums.boards.lumber?.boards).toEqual(['2×10', '2×6'])
    expect(sums.push.pushKgPerM).toBeCloseTo(51.2, 1)
    expect(sums.push.footMomentNmPerM).toBeCloseTo(53.6, 1)
    expect(sums.corners.map(({ boardM }) => Number(boardM.toFixed(6)))).toEqual([0.09, 0.09, 0.37, 0.37])
  })
  // 0.32 m × (1000 / 916.7 - 1)
  test('rise on freezing', () => expect(sums.expansion.riseM).toBeCloseTo(0.0291, 4))
  // 14 + 2 × (0.37 + 0.0381 + 0.15) = 15.116; × 1.03 + 0.30 = 15.87, cut at 16; 7 m: 8.116 × 1.03 + 0.30 = 8.66, cut at 9.
  test('liner', () => {
    expect(sums.liner.lengthBeforeFoldsM).toBeCloseTo(15.1162, 4)
    expect(sums.liner.lengthM).toBeCloseTo(16, 9)
    expect(sums.liner.widthM).toBeCloseTo(9, 9)
  })
  // In whole feet: 15.87 m is 52.07 ft, so 53.
  test('liner in feet', () => {
    expect(buildSums({ ...RINK, linerStepM: 0.3048 }).liner.lengthM / 0.3048).toBeCloseTo(53, 9)
  })
  // 17.64 m³ and 3 m³ of floods, less 10 mm × 98 m² = 0.98 m³.
  test('melt water', () => {
    expect(sums.meltWater.volumeM3).toBeCloseTo(17.64, 6)
    expect(buildSums({ ...RINK, floodsL: 3000, sublimatedMm: 10 }).meltWater.volumeM3).toBeCloseTo(19.66, 6)
  })
  test('a level rink and a grid', () => {
    const level = buildSums({ ...RINK, floor: null, leastDepthM: 0.12 })
    expect(level.water.volumeM3).toBeCloseTo(98 * 0.12, 6)
    expect(level.wetted.byHour[0]!.wettedShare).toBe(1)
    const grid = buildSums({ ...RINK, floor: { depthsM: [[0, 0], [0.14, 0.14], [0.28, 0.28]] } }) // prettier-ignore
    expect(grid.water.volumeM3).toBeCloseTo(17.64, 6)
  })
  test('every sum says how it was made', () => {
    // Corners and section are drawn from the sums of water and boards; cautions name the sums they come from.
    const drawn = ['corners', 'section', 'cautions']
    const counted = Object.entries(sums).filter(([name]) => !drawn.includes(name))
    expect(counted.map(([, sum]) => sum && 'how' in sum && sum.how.formulaId)).toEqual(counted.map(([name]) => name))
  })
  test('nonsense is refused', () => {
    expect(() => buildSums({ ...RINK, leastDepthM: -0.1 })).toThrow(RangeError)
    expect(() => buildSums({ ...RINK, flow: { lPerMin: 0 } })).toThrow(RangeError)
    expect(() => buildSums({ ...RINK, lengthM: Number.NaN })).toThrow(RangeError)
  })
})

describe('cautions', () => {
  const codesOf = (input: Partial<BuildInput>) => buildSums({ ...RINK, ...input }).cautions.map(({ code }) => code)
  // Burlington stops at 12 in (30.5 cm) between high and low side.
  test('too much fall', () => {
    expect(codesOf({})).not.toContain('too_much_fall')
    expect(codesOf({ floor: { cornersM: [0, 0, 0.5, 0.5] } })).toContain('too_much_fall')
  })
  test('boards that are too low, and two boards stacked', () => {
    expect(codesOf({ boardHeightM: 0.3 })).toContain('boards_too_low')
    expect(codesOf({ boardHeightM: 0.4 })).not.toContain('boards_too_low')
    expect(codesOf({})).toContain('fill_half_first')
    expect(codesOf({ floor: null, leastDepthM: 0.1 })).not.toContain('fill_half_first')
  })
  // 60 cm of water rise 5.5 cm, more than the 5 cm left.
  test('ice over the boards', () => {
    expect(codesOf({})).toContain('ice_rises')
    expect(codesOf({ floor: { cornersM: [0, 0, 0.56, 0.56] } })).toContain('ice_over_boards')
  })
})
