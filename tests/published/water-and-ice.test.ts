// Hoses, floors, floating loads and snow against published tables and worked examples. The source stands beside each value.
import { describe, expect, test } from 'vitest'
import { bucketFlowLPerMin } from '@/lib/physics/hose'
import { FUSION_J_PER_KG, WATER_HEAT_CAPACITY } from '@/lib/physics/constants'
import { floorFromCorners } from '@/lib/physics/floor'
import { hoseHours, stageAt } from '@/lib/physics/stage'
import { newSnowDensity, snowConductivity } from '@/lib/physics/snow'
import { frictionHeadM, openHoseFlowLPerMin, wrappedPipeHoursToCool } from '../support/published-forms/hose-flow'
import { CAUTIOUS_GOLD_PA, floatingLoadKg } from '../support/published-forms/ice-and-snow'

const M_PER_INCH = 0.0254
const M_PER_FOOT = 0.3048
const L_PER_GALLON = 3.785411784
const PA_PER_PSI = 6894.757
const KG_PER_LB = 0.45359237

describe('hose', () => {
  // Hazen-Williams worked example: 200 US gallons a minute, 3.048 inch, C 140.
  test.each([
    { feet: 100, headFeet: 9.0, tolerance: 0.1 },
    { feet: 30, headFeet: 2.7, tolerance: 0.05 },
  ])('friction over $feet ft', ({ feet, headFeet, tolerance }) => {
    const flow = (200 * L_PER_GALLON) / 60_000
    const head = frictionHeadM(flow, 3.048 * M_PER_INCH, feet * M_PER_FOOT, 140)
    expect(Math.abs(head / M_PER_FOOT - headFeet)).toBeLessThan(tolerance)
  })
  // Hazen-Williams solved for a 5/8 inch hose, 100 ft, 40 psi: 10.9 US gallons a minute; quoted range 9-17.
  test('a garden hose gives 10.9 gallons a minute', () => {
    const flow = openHoseFlowLPerMin(40 * PA_PER_PSI, 0.625 * M_PER_INCH, 100 * M_PER_FOOT, 140)
    expect(Math.abs(flow / L_PER_GALLON - 10.9)).toBeLessThan(0.2)
  })
  // WaterSafe UK: a tap that fills 4.5 L in 30 s.
  test('the bucket test gives 9 L/min', () => expect(Math.abs(bucketFlowLPerMin(4.5, 30) - 9)).toBeLessThan(0.01))
  // ASHRAE Handbook - Fundamentals, ch. 23: 2 inch pipe, 1.5 inch insulation, 42 °F to 32 °F.
  test.each([
    { airF: -18, hours: 1.4 },
    { airF: 20, hours: 4.6 },
  ])('still water at $airF °F outside cools in $hours h', ({ airF, hours }) => {
    const pipe = {
      boreM: 2.067 * M_PER_INCH,
      outsideM: 2.375 * M_PER_INCH,
      insulatedM: 5.375 * M_PER_INCH,
      // 0.30 Btu inch / (h ft² °F)
      insulationConductivity: 0.3 * 0.1442279,
    }
    expect(Math.abs(wrappedPipeHoursToCool(pipe, 10 / 1.8, (airF - 32) / 1.8) - hours)).toBeLessThan(0.05)
  })
})

describe('warm water', () => {
  // c T / (c T + L) at 60 °C and 1 + c T / L at 10 °C.
  test('sensible share of hot flood water', () => {
    const sensible = WATER_HEAT_CAPACITY * 60
    expect(Math.abs(sensible / (sensible + FUSION_J_PER_KG) - 0.429)).toBeLessThan(0.003)
  })
  test('tap water needs an eighth more', () => {
    expect(Math.abs(1 + (WATER_HEAT_CAPACITY * 10) / FUSION_J_PER_KG - 1.125)).toBeLessThan(0.002)
  })
})

describe('floor', () => {
  // Bilinear floor, mean of the corners: 12 × 6 m, 0.10, 0.15, 0.20, 0.25 m.
  test('volume between four corners', () => {
    const floor = floorFromCorners(12, 6, [0.1, 0.15, 0.25, 0.2])
    expect(Math.abs(stageAt(floor, 0).volumeM3 - 12.6)).toBeLessThan(0.001)
    expect(Math.abs(hoseHours(12_600, 20) - 10.5)).toBeLessThan(0.01)
  })
  // Triangle d²/(2 slope): 0.24 m fall over 12 m, water 0.06 m below the top, per metre of width.
  test('volume of a wedge with a dry side', () => {
    const floor = floorFromCorners(12, 1, [0, 0, 0.24, 0.24])
    expect(Math.abs(stageAt(floor, 0.06).volumeM3 - 0.81)).toBeLessThan(0.001)
    expect(Math.abs(stageAt(floor, 0.06).wetShare - 0.75)).toBeLessThan(0.03)
  })
})

describe('floating ice', () => {
  // Minnesota DNR, thickness by weight (Gold 1971, 50 h² in lb and inch).
  test.each([
    [4, 800],
    [7, 2450],
    [12, 7200],
    [20, 20000],
  ])('%d inch bear %d lb', (inches, pounds) => {
    expect(Math.abs(floatingLoadKg(inches * M_PER_INCH) / KG_PER_LB - pounds)).toBeLessThan(0.5)
  })
  // Gold 1971, Can. Geotech. J. 8, 170: 50 psi is 3.515 kg/cm².
  test('coefficient in metric', () => {
    expect(Math.abs(CAUTIOUS_GOLD_PA / 98_066.5 - 3.515)).toBeLessThan(0.01)
  })
})

describe('snow', () => {
  // Anderson 1976 in the form of CLM: 103.8 kg/m³ at -5 °C.
  test('density of new snow', () => expect(Math.abs(newSnowDensity(-5) - 103.8)).toBeLessThan(0.2))
  // Sturm et al. 1997, J. Glaciol. 43, 26; coefficients from memory.
  test.each([
    [100, 0.0464],
    [200, 0.0653],
    [300, 0.126],
  ])('conductivity at %d kg/m³ is %d', (density, conductivity) => {
    expect(Math.abs(snowConductivity(density) - conductivity)).toBeLessThan(0.001)
  })
  // NWS Alaska-Pacific River Forecast Center: 0.04 fresh to 0.2 wind-packed.
  test('conductivity stays in the operational range from fresh to packed', () => {
    expect(snowConductivity(80)).toBeGreaterThanOrEqual(0.04)
    expect(snowConductivity(360)).toBeLessThanOrEqual(0.2)
  })
})
