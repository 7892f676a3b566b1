// Water vapour: saturation over water and ice, dew point, the psychrometric coefficient.
import { AIR_HEAT_CAPACITY, VAPORISATION_J_PER_KG, VAPOUR_MASS_RATIO, ZERO_CELSIUS_K } from './constants'
import { inRange } from './check'

/**
 * Saturation vapour pressure over liquid (below 0 °C: supercooled) water.
 *
 * @param temperatureC Water temperature. [°C], valid -80 to 100
 * @returns Saturation vapour pressure. [hPa]
 * @throws RangeError outside -80 to 100.
 *
 * Source: Sonntag 1990, pure phase; from memory. Within 0.02 % of IAPWS-95 from 0 to 30 °C.
 */
export function saturationOverWaterHpa(temperatureC: number): number {
  inRange('temperatureC [°C]', temperatureC, -80, 100)
  const kelvin = temperatureC + ZERO_CELSIUS_K
  const polynomial = 16.635794 - 2.711193e-2 * kelvin + 1.673952e-5 * kelvin * kelvin
  return Math.exp(polynomial - 6096.9385 / kelvin + 2.433502 * Math.log(kelvin))
}

/**
 * Saturation vapour pressure over a flat ice surface.
 *
 * @param temperatureC Ice temperature. [°C], valid -90 to 0.01 (the source claims -65 to 0)
 * @returns Saturation vapour pressure. [hPa]
 * @throws RangeError outside -90 to 0.01.
 *
 * Source: WMO-No. 8, Annex 4.B, Magnus form for the pure phase; seen in public code, not in the book.
 */
export function saturationOverIceHpa(temperatureC: number): number {
  inRange('temperatureC [°C]', temperatureC, -90, 0.01)
  return 6.112 * Math.exp((22.46 * temperatureC) / (272.62 + temperatureC))
}

/**
 * Dew point (over water) from vapour pressure.
 *
 * @param vapourPressureHpa Vapour pressure. [hPa], above 0
 * @returns Dew point. [°C]
 * @throws RangeError at or below 0.
 *
 * Source: inversion of the form above by Newton's method, from the Magnus form of WMO-No. 8.
 */
export function dewPointC(vapourPressureHpa: number): number {
  inRange('vapourPressureHpa [hPa]', vapourPressureHpa, 1e-6, 1100)
  const logRatio = Math.log(vapourPressureHpa / 6.112)
  let dewPoint = (243.12 * logRatio) / (17.62 - logRatio)
  for (let round = 0; round < 3; round++) {
    const relativeSlope = (17.62 * 243.12) / (243.12 + dewPoint) ** 2
    dewPoint -= Math.log(saturationOverWaterHpa(Math.max(-80, dewPoint)) / vapourPressureHpa) / relativeSlope
  }
  return dewPoint
}

/**
 * Dew point from relative humidity over water, the convention of weather services below 0 °C too.
 *
 * @param temperatureC Air temperature. [°C], -60 to 60
 * @param relativeHumidity Share of saturation over water. [0-1], above 0 to 1
 * @returns Dew point. [°C]
 * @throws RangeError outside the ranges.
 *
 * Source: definition of relative humidity, dewPointC.
 */
export function dewPointFromHumidityC(temperatureC: number, relativeHumidity: number): number {
  inRange('relativeHumidity [0-1]', relativeHumidity, 1e-4, 1)
  return dewPointC(relativeHumidity * saturationOverWaterHpa(temperatureC))
}

/**
 * Psychrometric coefficient: heat flux per kelvin over vapour flux per hectopascal when both share one exchange (Lewis factor 1).
 *
 * @param pressureHpa Air pressure. [hPa], 300 to 1100
 * @param latentJPerKg Latent heat of the phase change. [J/kg]
 * @returns Coefficient. [hPa/K]
 * @throws RangeError outside 300 to 1100 hPa.
 *
 * Source: FAO-56 eq. 8.
 */
export function psychrometricHpaPerK(pressureHpa: number, latentJPerKg = VAPORISATION_J_PER_KG): number {
  inRange('pressureHpa [hPa]', pressureHpa, 300, 1100)
  return (AIR_HEAT_CAPACITY * pressureHpa) / (VAPOUR_MASS_RATIO * latentJPerKg)
}
