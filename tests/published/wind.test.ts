// Wind chill, frostbite and the wind profile against official charts. The source stands beside each value.
import { describe, expect, test } from 'vitest'
import { frostbiteBand, windChillC } from '@/lib/physics/wind-chill'
import { logLawRatio, OPEN_GROUND_ROUGHNESS_M } from '@/lib/physics/site'
import { frostbiteMinutes, usWindChillF } from '../support/published-forms/skin'

// Environment Canada wind chill chart (2001 index), 132 of its 192 cells; columns are air temperatures.
const AIR_C = [5, 0, -5, -10, -15, -20, -25, -30, -35, -40, -45, -50]
const CHART: Record<number, number[]> = {
  5: [4, -2, -7, -13, -19, -24, -30, -36, -41, -47, -53, -58],
  10: [3, -3, -9, -15, -21, -27, -33, -39, -45, -51, -57, -63],
  15: [2, -4, -11, -17, -23, -29, -35, -41, -48, -54, -60, -66],
  20: [1, -5, -12, -18, -24, -30, -37, -43, -49, -56, -62, -68],
  25: [1, -6, -12, -19, -25, -32, -38, -44, -51, -57, -64, -70],
  30: [0, -6, -13, -20, -26, -33, -39, -46, -52, -59, -65, -72],
  35: [0, -7, -14, -20, -27, -33, -40, -47, -53, -60, -66, -73],
  40: [-1, -7, -14, -21, -27, -34, -41, -48, -54, -61, -68, -74],
  50: [-1, -8, -15, -22, -29, -35, -42, -49, -56, -63, -69, -76],
  60: [-2, -9, -16, -23, -30, -36, -43, -50, -57, -64, -71, -78],
  80: [-3, -10, -17, -24, -31, -38, -45, -52, -60, -67, -74, -81],
}

describe('wind chill', () => {
  test.each(Object.entries(CHART))('rounds to the chart at %s km/h', (windKmh, row) => {
    row.forEach((printed, column) => {
      expect(Math.abs(windChillC(AIR_C[column]!, Number(windKmh) / 3.6) - printed)).toBeLessThanOrEqual(0.5)
    })
  })
  // US National Weather Service chart 2001, °F and mph.
  test.each([
    { airF: 30, mph: 5, printedF: 25 },
    { airF: 20, mph: 20, printedF: 4 },
    { airF: 0, mph: 15, printedF: -19 },
    { airF: -10, mph: 25, printedF: -37 },
  ])('at $airF °F and $mph mph is $printedF °F', ({ airF, mph, printedF }) => {
    expect(Math.abs(usWindChillF(airF, mph) - printedF)).toBeLessThanOrEqual(0.5)
    // The two countries rounded their coefficients apart; ours is the Canadian line.
    const indexF = windChillC((airF - 32) / 1.8, mph * 0.44704) * 1.8 + 32
    expect(Math.abs(indexF - usWindChillF(airF, mph))).toBeLessThan(0.1)
  })
})

describe('frostbite', () => {
  // Tikuisis & Osczevski, equation of Environment Canada: 12.6 minutes at -20 °C and 50 km/h.
  test('strong wind', () => expect(Math.abs(frostbiteMinutes(-20, 50 / 3.6)! - 12.6)).toBeLessThan(0.1))
  // Environment Canada wind-chill hazard table.
  test.each([
    [-27, null],
    [-28, { fromMinutes: 10, toMinutes: 30 }],
    [-39, { fromMinutes: 10, toMinutes: 30 }],
    [-40, { fromMinutes: 5, toMinutes: 10 }],
    [-48, { fromMinutes: 2, toMinutes: 5 }],
    [-55, { fromMinutes: 0, toMinutes: 2 }],
  ])('band at %d', (index, band) => expect(frostbiteBand(index)).toEqual(band))
})

describe('profile', () => {
  // Log profile over open ground, roughness 0.03 m: 0.723 from 10 m to 2 m.
  test('down to the rink', () =>
    expect(Math.abs(logLawRatio(2, 10, OPEN_GROUND_ROUGHNESS_M) - 0.723)).toBeLessThan(0.001))
  // Published worked example: 10 m/s at 10 m, 80 m, roughness 0.03 m: 13.58 m/s.
  test('up to a mast', () => expect(Math.abs(10 * logLawRatio(80, 10, 0.03) - 13.58)).toBeLessThan(0.02))
})
