// What a run of hours would do to a wet surface at 0 °C, worked out once and asked many times.
import { FUSION_J_PER_KG, HOUR_SECONDS } from './constants'
import { precipitationHeatWm2, surfaceLaw } from './balance'
import type { PreparedHour } from './types'

export interface WetSeason {
  /** Loss of each hour, precipitation included. [W/m²] */
  lossWm2: Float64Array
  /** How much it falls for each kelvin the surface is colder. [W m⁻² K⁻¹] */
  slopeWm2K: Float64Array
  /** Water that falls into the layer, as rain or snow. [kg/m²] */
  fallsKgM2: Float64Array
  isUnknown: Uint8Array
  /** Most a wet surface can lose from the start of each hour until any later one, before an unknown hour; 0 or more. [J/m²] */
  bestFromHereJM2: Float64Array
}

// Keyed by identity: prepared hours are never changed once made, so the same key always means the same answer.
const wetSeasons = new WeakMap<readonly PreparedHour[], WetSeason>()

/**
 * The wet season of a run of hours, kept for as long as the run is.
 *
 * @param hours Prepared hours.
 * @returns Loss [W/m²], its slope [W m⁻² K⁻¹] and what falls [kg/m²], hour by hour.
 *
 * Source: surfaceLaw at 0 °C with precipitationHeatWm2.
 */
export function wetSeason(hours: readonly PreparedHour[]): WetSeason {
  const known = wetSeasons.get(hours)
  if (known && known.lossWm2.length === hours.length) return known
  const season = workOut(hours)
  wetSeasons.set(hours, season)
  return season
}

function workOut(hours: readonly PreparedHour[]): WetSeason {
  const season: WetSeason = {
    lossWm2: new Float64Array(hours.length),
    slopeWm2K: new Float64Array(hours.length),
    fallsKgM2: new Float64Array(hours.length),
    isUnknown: new Uint8Array(hours.length),
    bestFromHereJM2: new Float64Array(hours.length),
  }
  let best = 0
  for (let i = hours.length - 1; i >= 0; i--) {
    const hour = hours[i]!
    if (!hour.isKnown) {
      season.isUnknown[i] = 1
      best = 0
      continue
    }
    const law = surfaceLaw(hour, 'wet', 0)
    const lossWm2 = law.netWm2 + precipitationHeatWm2(hour)
    season.lossWm2[i] = lossWm2
    season.slopeWm2K[i] = law.slopeWm2K
    season.fallsKgM2[i] = hour.precipitationMm
    const gain = lossWm2 * HOUR_SECONDS - hour.precipitationMm * FUSION_J_PER_KG
    best = Math.max(0, best + gain)
    season.bestFromHereJM2[i] = best
  }
  return season
}
