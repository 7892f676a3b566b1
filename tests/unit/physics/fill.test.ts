// A filled rink: it cools, skins over, thickens and freezes through; and the floor under it.
import { describe, expect, test } from 'vitest'
import { fillByHour, floorFromCorners, hoseHours, levelOf, linerLengthM, stageAt } from '@/lib/physics/floor'
import { growFill } from '@/lib/physics/fill'
import { steadyHours } from '../../support/steady-hours'

const COLD = steadyHours(240, { airTemperatureC: -10, windSpeedMps: 2, site: { shelter: 0.6, skyView: 0.85 } })

describe('freezing of a fill', () => {
  const fill = { depthMm: 120, waterTemperatureC: 6, base: 'liner' as const }

  test('skin, thickness and frozen through come in that order', () => {
    const { hoursToSkin, hoursToThickness, hoursToFrozen } = growFill(fill, COLD, 0, [50, 100])
    expect(hoursToSkin).not.toBeNull()
    expect(hoursToThickness[0]!).toBeGreaterThan(hoursToSkin!)
    expect(hoursToThickness[1]!).toBeGreaterThan(hoursToThickness[0]!)
    expect(hoursToFrozen!).toBeGreaterThan(hoursToThickness[1]!)
  })
  // 120 kg/m² × 4200 J/kgK × 6 K = 3.0 MJ/m² at 160-330 W/m² take 2.5-5.3 h, then 5 mm × 306 MJ/m³ another 1.3-2.7 h.
  test('the skin comes after the water has given its warmth', () => {
    const { hoursToSkin } = growFill(fill, COLD, 0)
    expect(hoursToSkin!).toBeGreaterThan(3.8)
    expect(hoursToSkin!).toBeLessThan(9)
  })
  test('cold water skins over sooner, deep water later', () => {
    const usual = growFill(fill, COLD, 0).hoursToSkin!
    expect(growFill({ ...fill, waterTemperatureC: 1 }, COLD, 0).hoursToSkin!).toBeLessThan(usual)
    expect(growFill({ ...fill, depthMm: 200 }, COLD, 0).hoursToSkin!).toBeGreaterThan(usual)
  })
  test('nothing freezes in mild weather', () => {
    const mild = steadyHours(72, { airTemperatureC: 8, relativeHumidity: 0.9, cloudCover: 1 })
    const growth = growFill(fill, mild, 0, [10])
    expect([growth.hoursToSkin, growth.hoursToThickness[0], growth.hoursToFrozen]).toEqual([null, null, null])
  })
  test('a depth that is none is refused', () => {
    expect(() => growFill({ ...fill, depthMm: -1 }, COLD, 0)).toThrow(RangeError)
  })
})

describe('floor', () => {
  // Common practice, no source: a rink 9.9 m square takes 8 to 10 hours from one garden hose (25 L/min and a mean depth of 0.14 m).
  test('a yard rink fills in 8 to 10 hours', () => {
    const floor = floorFromCorners(9.9, 9.9, [0.08, 0.12, 0.2, 0.16])
    const hours = hoseHours(stageAt(floor, 0).volumeM3 * 1000, 25)
    expect(hours).toBeGreaterThan(8)
    expect(hours).toBeLessThan(10)
  })
  // Common practice, no source: after some three hours the water covers about half of a sloping floor.
  test('after three hours about half of a sloping floor is wet', () => {
    const floor = floorFromCorners(9.9, 9.9, [0.02, 0.02, 0.27, 0.27])
    const third = fillByHour(floor, 25, 14).find(({ hours }) => hours === 3)!
    expect(third.stage.wetShare).toBeGreaterThan(0.4)
    expect(third.stage.wetShare).toBeLessThan(0.65)
  })
  // Common practice, no source: a 34 ft rink with 14¾ in of board at the low corner needs about 3 ft more of liner.
  test('the liner goes up and over', () => {
    const extraFeet = (linerLengthM(34 * 0.3048, 14.75 * 0.0254, 0.08) - 34 * 0.3048) / 0.3048
    expect(extraFeet).toBeGreaterThan(2.5)
    expect(extraFeet).toBeLessThan(3.5)
  })
  test('level and volume answer each other', () => {
    const floor = floorFromCorners(12, 6, [0, 0.05, 0.22, 0.15])
    for (const volumeM3 of [0.2, 2, 6, 20]) {
      expect(stageAt(floor, levelOf(floor, volumeM3)).volumeM3).toBeCloseTo(volumeM3, 3)
    }
  })
  test('a floor needs four corners and a size', () => {
    expect(() => floorFromCorners(10, 10, [1, 2, 3])).toThrow(RangeError)
    expect(() => floorFromCorners(0, 10, [0, 0, 0, 0])).toThrow(RangeError)
    expect(() => hoseHours(1000, 0)).toThrow(RangeError)
  })
})
