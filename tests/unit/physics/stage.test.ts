// Water on floors whose volume, shore and level can be worked out by hand.
import { describe, expect, test } from 'vitest'
import { cornerDepthsM, floorFromCorners, floorFromGrid, floorOf } from '@/lib/physics/floor'
import { floorDepthM, highToLowSection } from '@/lib/physics/section'
import { fillByHour, levelOf, stageAt } from '@/lib/physics/stage'

/** Falls 0.3 m along its 10 m. */
const WEDGE = floorFromCorners(10, 10, [0, 0, 0.3, 0.3])
/** A plane that falls 0.02 a metre both ways: depth = 0.02 x + 0.02 y. */
const TILTED = floorFromCorners(10, 10, [0, 0.2, 0.4, 0.2])

describe('stage', () => {
  // Wedge: wet length d/0.03, volume d²/(2 × 0.03) × 10; all wet: area × mean depth.
  test.each([
    { levelM: 0.1, volumeM3: 20 / 3, wetShare: 2 / 3, deepestM: 0.2 },
    { levelM: 0.28, volumeM3: 0.2 / 3, wetShare: 0.2 / 3, deepestM: 0.02 },
    { levelM: 0, volumeM3: 15, wetShare: 1, deepestM: 0.3 },
    { levelM: -0.1, volumeM3: 25, wetShare: 1, deepestM: 0.4 },
    { levelM: 0.5, volumeM3: 0, wetShare: 0, deepestM: 0 },
  ])('a wedge with its water at $levelM m', ({ levelM, ...expected }) => {
    const stage = stageAt(WEDGE, levelM)
    expect(stage.volumeM3).toBeCloseTo(expected.volumeM3, 9)
    expect(stage.wetShare).toBeCloseTo(expected.wetShare, 9)
    expect(stage.deepestM).toBeCloseTo(expected.deepestM, 9)
  })
  // Pyramid in the low corner: 0.1 m deep, 5 m each way: 12.5 m² × 0.1 m / 3.
  test('a tilted plane with water in its low corner only', () => {
    const { volumeM3, wetShare } = stageAt(TILTED, 0.3)
    expect(volumeM3).toBeCloseTo((12.5 * 0.1) / 3, 9)
    expect(wetShare).toBeCloseTo(0.125, 9)
  })
  // Mean water 0.1 m over 100 m², less what the dry pyramid at the high corner counts below zero.
  test('a tilted plane with one corner dry', () => {
    const { volumeM3, wetShare } = stageAt(TILTED, 0.1)
    expect(volumeM3).toBeCloseTo(10 + (12.5 * 0.1) / 3, 9)
    expect(wetShare).toBeCloseTo(0.875, 9)
  })
  // Floor 0.2 - 0.2 p q below the line (p, q the shares of the way to the high corner). At 0.1 the shore is p q = c = 1/2:
  // wet share c (1 - ln c); volume 100 × (0.1 × that - 0.2 × c² (1/4 - ln c / 2)).
  test('one corner high, the floor twisted', () => {
    const floor = floorFromCorners(10, 10, [0, 0.2, 0.2, 0.2])
    expect(stageAt(floor, 0).volumeM3).toBeCloseTo(15, 9)
    const { volumeM3, wetShare } = stageAt(floor, 0.1)
    expect(Math.abs(volumeM3 - 5.4829)).toBeLessThan(0.005)
    expect(Math.abs(wetShare - 0.84657)).toBeLessThan(0.002)
  })
  // A hollow: four cells, each with one corner 0.3 m deep, mean 0.075 m.
  test('a grid with a hollow in its middle', () => {
    const floor = floorFromGrid(10, 10, [
      [0, 0, 0],
      [0, 0.3, 0],
      [0, 0, 0],
    ])
    expect(stageAt(floor, 0).volumeM3).toBeCloseTo(7.5, 9)
  })
  test('a plane measured on a grid holds what it holds between corners', () => {
    const floor = floorFromGrid(10, 10, [
      [0, 0, 0, 0],
      [0.1, 0.1, 0.1, 0.1],
      [0.2, 0.2, 0.2, 0.2],
      [0.3, 0.3, 0.3, 0.3],
    ])
    expect(stageAt(floor, 0.15).volumeM3).toBeCloseTo(stageAt(WEDGE, 0.15).volumeM3, 9)
  })
})

describe('level', () => {
  // Wedge of volume V: depth √(2 × 0.03 × V / 10); over the brim of 15 m³ each m³ is 10 mm.
  test.each([
    { volumeM3: 5, levelM: 0.3 - Math.sqrt(0.03) },
    { volumeM3: 0.001, levelM: 0.3 - Math.sqrt(0.000006) },
    { volumeM3: 15, levelM: 0 },
    { volumeM3: 20, levelM: -0.05 },
    { volumeM3: 0, levelM: 0.3 },
  ])('of $volumeM3 m³ in a wedge', ({ volumeM3, levelM }) => {
    expect(levelOf(WEDGE, volumeM3)).toBeCloseTo(levelM, 7)
  })
  test('on level ground is the depth of the water', () => {
    expect(levelOf(floorOf(10, 10), 12)).toBeCloseTo(-0.12, 9)
  })
  test('answers the volume in a low corner and in a twisted floor', () => {
    for (const floor of [TILTED, floorFromCorners(12, 6, [0, 0.05, 0.22, 0.15])]) {
      for (const volumeM3 of [1e-4, 0.2, 2, 6, 20]) {
        expect(stageAt(floor, levelOf(floor, volumeM3)).volumeM3).toBeCloseTo(volumeM3, 6)
      }
    }
  })
  // 25 L/min are 1.5 m³ an hour: √(2 × 0.03 × 1.5 / 10) deep after one, the brim of 15 m³ after ten.
  test('hour by hour of hose', () => {
    const hours = fillByHour(WEDGE, 25, 15)
    expect(hours).toHaveLength(10)
    expect(hours[0]!.stage.deepestM).toBeCloseTo(Math.sqrt(0.009), 7)
    expect(hours[9]!.levelM).toBeCloseTo(0, 7)
  })
})

describe('floor', () => {
  test('corners come back in the order they were given, from a grid too', () => {
    expect(cornerDepthsM(floorFromCorners(8, 6, [0.1, 0.2, 0.3, 0.4]))).toEqual([0.1, 0.2, 0.3, 0.4])
    const grid = floorOf(8, 6, { depthsM: [[0.1, 0, 0.2], [0.4, 0, 0.3]] }) // prettier-ignore
    expect(cornerDepthsM(grid)).toEqual([0.1, 0.2, 0.3, 0.4])
  })
  test('what is no floor is refused', () => {
    expect(() => floorFromGrid(10, 10, [[0, 0]])).toThrow(RangeError)
    expect(() => floorFromGrid(10, 10, [[0, 0], [0]])).toThrow(RangeError)
    expect(() => floorFromGrid(10, 10, [[0, 0], [0, Number.NaN]])).toThrow(RangeError) // prettier-ignore
    expect(() => floorFromCorners(10, 10, [0, 0, 0, 9])).toThrow(RangeError)
    expect(() => levelOf(WEDGE, -1)).toThrow(RangeError)
  })
  test('the cut runs from the highest to the lowest corner', () => {
    const points = highToLowSection(TILTED)
    expect(points[0]).toEqual({ alongM: 0, floorM: 0 })
    expect(points.at(-1)!.alongM).toBeCloseTo(Math.hypot(10, 10), 9)
    expect(points.at(-1)!.floorM).toBeCloseTo(0.4, 9)
    expect(points[12]!.floorM).toBeCloseTo(0.2, 9)
    expect(floorDepthM(TILTED, 0.5, 0)).toBeCloseTo(0.1, 9)
    expect(highToLowSection(floorOf(8, 6)).at(-1)).toEqual({ alongM: 8, floorM: 0 })
  })
})
