// Wet bulb and humidity ratio: what moist air can do to a drop or a wetted thermometer.
import { VAPOUR_MASS_RATIO } from '@/lib/physics/constants'
import { inRange } from '@/lib/physics/check'
import { saturationOverIceHpa, saturationOverWaterHpa } from '@/lib/physics/humidity'

/** Psychrometer coefficients of an aspirated thermometer, wick wet and wick iced. [1/K] AMS Glossary of Meteorology. */
const WET_WICK = 6.6e-4
const ICED_WICK = 5.82e-4

/**
 * Mass of vapour per mass of dry air.
 *
 * @param vapourPressureHpa Vapour pressure. [hPa], 0 to below pressure
 * @param pressureHpa Air pressure. [hPa], 300 to 1100
 * @returns Ratio. [kg/kg]
 * @throws RangeError outside the ranges.
 *
 * Source: ideal gases; ASHRAE's real-gas tables are up to 0.5 % higher.
 */
export function humidityRatio(vapourPressureHpa: number, pressureHpa: number): number {
  inRange('pressureHpa [hPa]', pressureHpa, 300, 1100)
  inRange('vapourPressureHpa [hPa]', vapourPressureHpa, 0, pressureHpa * 0.99)
  return (VAPOUR_MASS_RATIO * vapourPressureHpa) / (pressureHpa - vapourPressureHpa)
}

/**
 * Vapour pressure from dry and wet bulb.
 *
 * @param dryC Dry bulb. [°C]
 * @param wetC Wet bulb, not above the dry bulb; below 0 °C the wick is iced. [°C]
 * @param pressureHpa Air pressure. [hPa]
 * @returns Vapour pressure. [hPa]
 *
 * Source: AMS Glossary, psychrometric formula, e = es(Tw) - A p (T - Tw) (1 + 0.00115 Tw).
 */
export function vapourFromWetBulbHpa(dryC: number, wetC: number, pressureHpa: number): number {
  const isIced = wetC < 0
  const saturation = isIced ? saturationOverIceHpa(wetC) : saturationOverWaterHpa(wetC)
  const coefficient = (isIced ? ICED_WICK : WET_WICK) * (1 + 0.00115 * wetC)
  return saturation - coefficient * pressureHpa * (dryC - wetC)
}

/**
 * Humidity ratio from dry and thermodynamic wet bulb.
 *
 * @param dryC Dry bulb. [°C]
 * @param wetC Wet bulb. [°C]
 * @param pressureHpa Air pressure. [hPa]
 * @returns Ratio. [kg/kg]
 *
 * Source: ASHRAE Handbook - Fundamentals, eq. 33 (over water) and 35 (over ice), seen in public code.
 */
export function ratioFromWetBulb(dryC: number, wetC: number, pressureHpa: number): number {
  const isIced = wetC < 0
  const saturation = isIced ? saturationOverIceHpa(wetC) : saturationOverWaterHpa(wetC)
  const saturated = humidityRatio(saturation, pressureHpa)
  return isIced
    ? ((2830 - 0.24 * wetC) * saturated - 1.006 * (dryC - wetC)) / (2830 + 1.86 * dryC - 2.1 * wetC)
    : ((2501 - 2.326 * wetC) * saturated - 1.006 * (dryC - wetC)) / (2501 + 1.86 * dryC - 4.186 * wetC)
}

/**
 * Thermodynamic wet bulb.
 *
 * @param airTemperatureC Dry bulb. [°C], -50 to 50
 * @param vapourPressureHpa Vapour pressure, at most saturation over water. [hPa]
 * @param pressureHpa Air pressure. [hPa]
 * @returns Wet bulb, to 0.001 K. [°C]
 * @throws RangeError outside the ranges.
 *
 * Source: inversion of the ASHRAE equations above by bisection.
 */
export function wetBulbC(airTemperatureC: number, vapourPressureHpa: number, pressureHpa: number): number {
  inRange('airTemperatureC [°C]', airTemperatureC, -50, 50)
  const wanted = humidityRatio(vapourPressureHpa, pressureHpa)
  let low = airTemperatureC - 40
  let high = airTemperatureC
  while (high - low > 1e-4) {
    const middle = (low + high) / 2
    if (ratioFromWetBulb(airTemperatureC, middle, pressureHpa) > wanted) high = middle
    else low = middle
  }
  return (low + high) / 2
}
