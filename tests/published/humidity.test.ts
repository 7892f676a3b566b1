// Water vapour against handbooks and releases. The source stands beside each value.
import { describe, expect, test } from 'vitest'
import { dewPointFromHumidityC, saturationOverIceHpa, saturationOverWaterHpa } from '@/lib/physics/humidity'
import {
  humidityRatio,
  ratioFromWetBulb,
  vapourFromWetBulbHpa,
  wetBulbC,
} from '../support/published-forms/psychrometry'
import { frostPointC, iapwsSaturationPa, iapwsSublimationPa } from '../support/published-forms/vapour'

describe('saturation over ice', () => {
  test.each([
    // ASHRAE Handbook - Fundamentals 2017, ch. 1, Table 3 (1.08 Pa, 103.24 Pa).
    { at: -60, hpa: 0.0108, tolerance: 1e-4 },
    { at: -20, hpa: 1.0324, tolerance: 5e-4 },
    // Panametrics/GE hygrometer handbook, Table A-1 (4.579, 3.013, 1.241, 0.776 mmHg).
    { at: 0, hpa: 6.1048, tolerance: 0.012 },
    { at: -5, hpa: 4.017, tolerance: 0.012 },
    { at: -15, hpa: 1.6545, tolerance: 0.012 },
    { at: -20, hpa: 1.0346, tolerance: 0.012 },
    // WMO-No. 8, Annex 4.B.
    { at: -10, hpa: 2.5987, tolerance: 0.003 },
  ])('at $at °C is $hpa hPa', ({ at, hpa, tolerance }) => {
    expect(Math.abs(saturationOverIceHpa(at) - hpa)).toBeLessThanOrEqual(tolerance)
  })
})

describe('saturation over water', () => {
  test.each([
    // ASHRAE Handbook - Fundamentals 2017, ch. 1, Table 3 (872.6 Pa).
    { at: 5, hpa: 8.726, tolerance: 0.003 },
    // Goff-Gratch, from a table that holds it beside another fit.
    { at: -15, hpa: 1.91, tolerance: 0.02 },
    { at: -9, hpa: 3.09, tolerance: 0.02 },
    { at: 2, hpa: 7.05, tolerance: 0.02 },
    // WMO-No. 8, Annex 4.B.
    { at: -10, hpa: 2.87, tolerance: 0.01 },
  ])('at $at °C is $hpa hPa', ({ at, hpa, tolerance }) => {
    expect(Math.abs(saturationOverWaterHpa(at) - hpa)).toBeLessThanOrEqual(tolerance)
  })
  // FAO-56 Example 3, p. 69: 15.0 and 24.5 °C.
  test('mean over a day after FAO-56 is 2.39 kPa', () => {
    expect(Math.abs((saturationOverWaterHpa(15) + saturationOverWaterHpa(24.5)) / 20 - 2.39)).toBeLessThan(0.01)
  })
})

describe('reference equations that the model is held against', () => {
  // IAPWS R14-08(2011), Table 3: 8.94735 Pa at 230 K.
  test('sublimation pressure', () => expect(Math.abs(iapwsSublimationPa(230) - 8.94735)).toBeLessThan(1e-4))
  // IAPWS-95, Table 8: 698.451 Pa at 275 K.
  test('saturation pressure', () => expect(Math.abs(iapwsSaturationPa(275) - 698.451)).toBeLessThan(0.05))
  test('the model follows them within 0.1 % over ice from -40 to 0 °C and 0.2 % over water from 0 to 30 °C', () => {
    for (let at = -40; at <= 0; at += 1) {
      expect(Math.abs((saturationOverIceHpa(at) * 100) / iapwsSublimationPa(at + 273.15) - 1)).toBeLessThan(0.001)
    }
    for (let at = 0; at <= 30; at += 1) {
      expect(Math.abs((saturationOverWaterHpa(at) * 100) / iapwsSaturationPa(at + 273.15) - 1)).toBeLessThan(0.002)
    }
  })
})

describe('points and ratios', () => {
  // WMO-No. 8, Annex 4.B: air at -10 °C with 80 % over water.
  test('the frost point is warmer than the dew point', () => {
    const vapour = 0.8 * saturationOverWaterHpa(-10)
    expect(Math.abs(frostPointC(vapour) - -11.39)).toBeLessThan(0.05)
    expect(Math.abs(dewPointFromHumidityC(-10, 0.8) - -12.8)).toBeLessThan(0.05)
  })
  // ASHRAE Fundamentals 2017, ch. 1, Table 2 (real gas, up to 0.5 % above the ideal formula).
  test('saturated humidity ratio at -5 °C', () => {
    expect(Math.abs(humidityRatio(saturationOverIceHpa(-5), 1013.25) - 0.0024863)).toBeLessThan(1.3e-5)
  })
  // FAO-56 Example 4, p. 70: 25.6 and 19.5 °C at 87.9 kPa give 1.91 kPa; FAO's coefficient 0.000662 is that of the wet wick.
  test('vapour pressure from a wet bulb', () => {
    expect(Math.abs(vapourFromWetBulbHpa(25.6, 19.5, 879) / 10 - 1.91)).toBeLessThan(0.01)
  })
  // PsychroLib regression value (ASHRAE equations): 7 °C, 61 %, 100 kPa.
  test('wet bulb of cool air', () => {
    expect(Math.abs(wetBulbC(7, 0.61 * saturationOverWaterHpa(7), 1000) - 3.9267)).toBeLessThan(0.004)
  })
  // PsychroLib, checked in a spreadsheet (ASHRAE eq. 35): dry -1, wet -5 °C, 95461 Pa.
  test('humidity ratio from an iced bulb', () => {
    expect(Math.abs(ratioFromWetBulb(-1, -5, 954.61) - 0.001204)).toBeLessThan(5e-7)
  })
  // ASHRAE Fundamentals 2017, ch. 1, Example 1: dry 40, wet 20 °C, 101325 Pa.
  test('humidity ratio of hot air', () => {
    expect(Math.abs(ratioFromWetBulb(40, 20, 1013.25) - 0.0065)).toBeLessThan(1e-4)
  })
})
