// A filled rink: it cools, skins over, thickens and freezes through.
import { describe, expect, test } from 'vitest'
import { growFill } from '@/lib/physics/fill'
import { steadyHours } from '@/lib/validation/steady-hours'

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
