// What a yard does to the wind: shelter by name or number, and the step from 10 m down to the rink.
import { inRange } from './check'
import type { ShelterName } from './types'

/** Height at which a rink feels the wind. [m] Ours: head height of a person, the reference height of FAO-56. */
export const RINK_WIND_HEIGHT_M = 2
/** Roughness length of open ground. [m] WMO-No. 8 class "open". */
export const OPEN_GROUND_ROUGHNESS_M = 0.03

/**
 * Factors on the wind at rink height. Ours, set between the windbreak table of Brandle & Finch (reductions of 15-65 % within
 * 10 heights of a dense belt) and a guess for yards behind a 2 m fence, 0.25-0.5.
 */
const SHELTER_FACTORS: Record<ShelterName, number> = { open: 1, suburban: 0.6, tight: 0.3 }

/**
 * Factor on the wind for a named or numeric shelter.
 *
 * @param shelter Name, or the factor itself. [0-1]
 * @returns Factor on the wind at rink height over open ground. [0-1]
 * @throws RangeError for a number outside 0-1 or an unknown name.
 *
 * Source: SHELTER_FACTORS in this file.
 */
export function shelterFactor(shelter: ShelterName | number): number {
  if (typeof shelter === 'number') return inRange('shelter [0-1]', shelter, 0, 1)
  const factor = SHELTER_FACTORS[shelter]
  if (factor === undefined) throw new RangeError(`shelter must be open, suburban or tight, got ${String(shelter)}`)
  return factor
}

/**
 * Ratio of the wind at one height to that at another by the logarithmic profile.
 *
 * @param toHeightM Height wanted. [m], above the roughness length
 * @param fromHeightM Height measured. [m], above the roughness length
 * @param roughnessM Roughness length. [m]
 * @returns Ratio. [-]
 * @throws RangeError when a height is not above the roughness length.
 *
 * Source: logarithmic wind law, for instance FAO-56 eq. 47 in another form.
 */
export function logLawRatio(toHeightM: number, fromHeightM: number, roughnessM: number): number {
  inRange('roughnessM [m]', roughnessM, 1e-6, Math.min(toHeightM, fromHeightM) * 0.999)
  return Math.log(toHeightM / roughnessM) / Math.log(fromHeightM / roughnessM)
}

/** Wind at the rink over the wind at 10 m, open ground. [-] 0.723 */
export const RINK_WIND_RATIO = logLawRatio(RINK_WIND_HEIGHT_M, 10, OPEN_GROUND_ROUGHNESS_M)

/**
 * Wind at the rink.
 *
 * @param windSpeedMps Wind at 10 m. [m/s], 0 or more
 * @param shelter Factor of the yard. [0-1]
 * @returns Wind at rink height. [m/s]
 *
 * Source: RINK_WIND_RATIO, log law over open ground, times the yard's factor.
 */
export function windAtRinkMps(windSpeedMps: number, shelter: number): number {
  return windSpeedMps * RINK_WIND_RATIO * shelter
}
