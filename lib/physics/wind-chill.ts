// How cold the wind feels on skin, and how long bare skin lasts.
import { inRange } from './check'

const KMH_PER_MPS = 3.6

/**
 * Wind chill index of Canada and the United States (2001).
 *
 * @param airTemperatureC Air. [°C], -60 to 50; above 10 °C the index is the air temperature
 * @param windSpeedMps Wind at 10 m. [m/s], 0 to 100
 * @returns Index, on a scale like °C. [-]
 * @throws RangeError outside the ranges.
 *
 * Source: Environment Canada 2001, 13.12 + 0.6215 T - 11.37 V^0.16 + 0.3965 T V^0.16 (V in km/h); below 5 km/h T + V
 * (-1.59 + 0.1345 T) / 5, from memory.
 */
export function windChillC(airTemperatureC: number, windSpeedMps: number): number {
  inRange('airTemperatureC [°C]', airTemperatureC, -60, 50)
  const windKmh = inRange('windSpeedMps [m/s]', windSpeedMps, 0, 100) * KMH_PER_MPS
  if (airTemperatureC > 10) return airTemperatureC
  if (windKmh < 5 - 1e-9)
    return Math.min(airTemperatureC, airTemperatureC + (windKmh * (-1.59 + 0.1345 * airTemperatureC)) / 5)
  const power = Math.pow(windKmh, 0.16)
  return Math.min(airTemperatureC, 13.12 + 0.6215 * airTemperatureC - 11.37 * power + 0.3965 * airTemperatureC * power)
}

/** Minutes in which bare skin freezes: from, to; null when it does not within half an hour. */
export type FrostbiteBand = { fromMinutes: number; toMinutes: number } | null

/**
 * Time to frostbite by wind chill.
 *
 * @param windChill Index. [-]
 * @returns Band, or null when bare skin lasts more than half an hour. [min]
 *
 * Source: Environment Canada bands: -28 to -39 10-30 min, -40 to -47 5-10, -48 to -54 2-5, -55 and colder under 2.
 */
export function frostbiteBand(windChill: number): FrostbiteBand {
  const rounded = Math.round(windChill)
  if (rounded > -28) return null
  if (rounded > -40) return { fromMinutes: 10, toMinutes: 30 }
  if (rounded > -48) return { fromMinutes: 5, toMinutes: 10 }
  if (rounded > -55) return { fromMinutes: 2, toMinutes: 5 }
  return { fromMinutes: 0, toMinutes: 2 }
}
