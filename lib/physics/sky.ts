// Longwave radiation from the sky and from what stands around the rink.
import { STEFAN_BOLTZMANN, ZERO_CELSIUS_K } from './constants'
import { inRange } from './check'

/**
 * Emission of a black body.
 *
 * @param temperatureC Temperature. [°C], above -273.15
 * @returns Emitted flux. [W/m²]
 *
 * Source: Stefan-Boltzmann law.
 */
export function blackBodyWm2(temperatureC: number): number {
  const kelvin = temperatureC + ZERO_CELSIUS_K
  return STEFAN_BOLTZMANN * kelvin * kelvin * kelvin * kelvin
}

/**
 * Emissivity of the cloudless sky; holds well below 0 °C.
 *
 * @param temperatureC Air temperature at screen height. [°C], -60 to 60
 * @param vapourPressureHpa Vapour pressure at screen height. [hPa], 0 to 130
 * @returns Emissivity. [0-1]
 * @throws RangeError outside the ranges.
 *
 * Source: Prata 1996, Q. J. R. Meteorol. Soc. 122, 1127, eq. for w = 46.5 e/T; seen in three public codes.
 */
export function clearSkyEmissivity(temperatureC: number, vapourPressureHpa: number): number {
  inRange('temperatureC [°C]', temperatureC, -60, 60)
  inRange('vapourPressureHpa [hPa]', vapourPressureHpa, 0, 130)
  const precipitableWater = (46.5 * vapourPressureHpa) / (temperatureC + ZERO_CELSIUS_K)
  return 1 - (1 + precipitableWater) * Math.exp(-Math.sqrt(1.2 + 3 * precipitableWater))
}

/**
 * Emissivity of a sky with cloud.
 *
 * @param clearEmissivity Of the cloudless sky. [0-1]
 * @param cloudCover Share of the sky under cloud. [0-1]
 * @returns Emissivity. [0-1]
 * @throws RangeError outside 0-1.
 *
 * Source: Unsworth & Monteith 1975, (1 - 0.84 c) ε₀ + 0.84 c; from memory.
 */
export function cloudySkyEmissivity(clearEmissivity: number, cloudCover: number): number {
  inRange('cloudCover [0-1]', cloudCover, 0, 1)
  return (1 - 0.84 * cloudCover) * clearEmissivity + 0.84 * cloudCover
}

/**
 * Longwave that reaches the rink: the open part of the dome from the sky, the rest from walls and trees at air
 * temperature.
 *
 * @param skyWm2 Flux from the unobstructed sky. [W/m²]
 * @param temperatureC Air temperature. [°C]
 * @param skyView Open share of the dome. [0-1]
 * @returns Flux on a horizontal surface. [W/m²]
 *
 * Source: share of the dome; walls at air temperature are our assumption.
 */
export function longwaveOnRinkWm2(skyWm2: number, temperatureC: number, skyView: number): number {
  return skyView * skyWm2 + (1 - skyView) * blackBodyWm2(temperatureC)
}
