// A rink that freezes: thickness ahead against Ashton's closed form, carrying dates over runs, snow on thin ice.
import { describe, expect, test } from 'vitest'
import { freezingOutlook } from '@/lib/advice/freezing'
import { growthUnderSnow } from '@/lib/advice/snow-on-thin-ice'
import type { JudgeInput } from '@/lib/advice/types'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { hourOf, inputOf, steadyHours } from '../../support/advice-weather'

const sheet = { thicknessMm: 40, temperatureC: -3, snowCoverCm: 0 }
const freezing = (hours: JudgeInput['hours'], given: Partial<JudgeInput> = {}): JudgeInput => {
  const input = inputOf(hours, { sheet, ...given })
  return { ...input, rink: { ...input.rink, phase: 'freezing' } }
}
const alone = { runs: 0 }

describe('thickness ahead', () => {
  const outlook = freezingOutlook(freezing(steadyHours(120, { airTemperatureC: -10 })), alone)
  test('starts at the reading and has a value each three hours to the end of the forecast', () => {
    expect(outlook.now.thicknessMm).toBeCloseTo(40, 0)
    expect(outlook.ahead).toHaveLength(41)
    expect(outlook.ahead[0]!.p50).toBe(outlook.now.thicknessMm)
    expect(Date.parse(outlook.ahead[1]!.at) - Date.parse(outlook.ahead[0]!.at)).toBe(3 * HOUR_MILLIS)
  })
  // Water left: 120 kg/m² less 40 mm × 917 kg/m³ = 83.3 kg/m².
  test('says how much water is left below', () => expect(outlook.now.waterBelowMm).toBeCloseTo(83.3, 0))
  // Ashton with ΔT 10 K, from 40 mm, in 24 h: h = √((0.040 + B)² + 2 k ΔT t / ρ L) - B with B = k/H and
  // 2 k ΔT t / ρ L = 0.01265 m² gives 63 mm for H 10 and 86 mm for H 30 W/m²K, the range Ashton names.
  test('one day at -10 °C adds what Ashton gives', () => {
    const day = outlook.ahead[8]!.p50
    expect(day).toBeGreaterThan(63)
    expect(day).toBeLessThan(86)
  })
  test('a thicker drilled reading carries sooner, a keeper who asks for more waits longer', () => {
    const hours = steadyHours(168, { airTemperatureC: -12 })
    const usual = freezingOutlook(freezing(hours), alone).carriesSkaterAt.p50!
    const drilled = freezingOutlook(freezing(hours, { sheet: { ...sheet, thicknessMm: 70 } }), alone)
    const cautious = freezingOutlook(freezing(hours, { carriesSkaterMm: 120 }), alone)
    expect(drilled.carriesSkaterAt.p50! < usual).toBe(true)
    expect(cautious.carriesSkaterAt.p50! > usual).toBe(true)
    expect(cautious.carriesSkaterMm).toBe(120)
  })
})

describe('spread over runs', () => {
  // Five runs, each colder than the one before: p10 is of the coldest for a date, of the mildest for a thickness.
  const at = (airTemperatureC: number) => steadyHours(168, { airTemperatureC })
  const members = [-6, -8, -12, -14].map(at)
  const outlook = freezingOutlook(freezing(at(-10), { members }))
  test('the order of dates and thicknesses', () => {
    const { p10, p50, p90 } = outlook.carriesSkaterAt
    expect(outlook.runs).toBe(5)
    expect(p10! < p50!).toBe(true)
    expect(p90 === null || p50! < p90).toBe(true)
    const later = outlook.ahead[16]!
    expect(later.p10).toBeLessThan(later.p50)
  })
  // Nearest rank of five: the third is the median, the forecast at -10 °C itself.
  test('p50 is the middle run', () => {
    const middle = freezingOutlook(freezing(at(-10)), alone)
    expect(outlook.carriesSkaterAt.p50).toBe(middle.carriesSkaterAt.p50)
    expect(outlook.ahead[16]!.p50).toBe(middle.ahead[16]!.p50)
  })
  test('not within the forecast is null, not a guess', () => {
    const mild = freezingOutlook(freezing(steadyHours(48, { airTemperatureC: 4, cloudCover: 1, dewPointC: 3 })), alone)
    expect(mild.carriesSkaterAt).toEqual({ p10: null, p50: null, p90: null })
  })
})

describe('snow on thin ice', () => {
  const codesOf = (given: Partial<JudgeInput>, hours = steadyHours(72)) =>
    freezingOutlook(freezing(hours, given), alone).snow.map(({ code }) => code)
  // 40 mm float 40 × (1000 - 917) = 3.3 kg/m² of snow: 1.3 cm at the 250 kg/m³ of lying snow.
  test('a centimetre is borne, three flood the ice, and nobody walks on 4 cm to clear them', () => {
    expect(codesOf({ sheet: { ...sheet, snowCoverCm: 1 } })).toEqual(['leave_snow'])
    expect(codesOf({ sheet: { ...sheet, snowCoverCm: 3 } })).toEqual(['snow_floods_ice', 'leave_snow'])
  })
  test('on 8 cm it is cleared', () => {
    expect(codesOf({ sheet: { ...sheet, thicknessMm: 80, snowCoverCm: 2 } })).toEqual(['clear_snow_now'])
  })
  // 40 mm of water would be 43.6 mm of ice: 44 mm lie on the floor, which carries whoever clears them.
  test('on 44 mm frozen to the floor it is cleared, and snow to come is no worry of thin ice', () => {
    const water = { temperatureC: 6, flowLPerMin: 25, layerMm: 3, fillDepthMm: 40 }
    const onFloor = { ...sheet, thicknessMm: 44 }
    expect(codesOf({ water, sheet: { ...onFloor, snowCoverCm: 3 } })).toEqual(['clear_snow_on_floor'])
    const snowy = steadyHours(72, { snowfallCm: 1, precipitationMm: 1, cloudCover: 1 })
    expect(codesOf({ water, sheet: onFloor }, snowy)).toEqual([])
  })
  test('bare ice under a clear sky needs nothing', () => expect(codesOf({})).toEqual([]))
  // 4 cm at 100 kg/m³ are 4 kg/m², more than 3.3.
  test('snow to come is told before it falls', () => {
    const hours = Array.from({ length: 72 }, (_, hour) =>
      hourOf(hour, hour >= 6 && hour < 10 ? { snowfallCm: 1, precipitationMm: 1, cloudCover: 1 } : {}),
    )
    expect(codesOf({}, hours)).toEqual(['snow_due_will_flood'])
  })
  // 20 mm of snow at 0.10 W/mK on 50 mm of ice keeps 27 % of the growth (H 20): 0.0723 / (0.0723 + 0.2).
  // Sturm's fit 0.138 - 1.01 ρ + 3.233 ρ² gives 0.10 W/mK at 268.7 kg/m³.
  test('what growth is left under snow', () => expect(growthUnderSnow(50, 2, 268.7)).toBeCloseTo(0.2655, 3))
})
