// What floating ice bears. It says nothing about a rink on the ground, and a rink is never cleared for loads by it.
import { inRange } from './check'

/** Gold's coefficient as the cautious public tables use it. [N/m²] 50 psi. Other tables print up to 100 psi, so it is always named. */
export const CAUTIOUS_GOLD_PA = 50 * 6894.757

/**
 * Load that clear floating ice bears for a short time.
 *
 * @param thicknessM Clear ice (white ice counts half). [m], 0 to 3
 * @param goldPa Coefficient. [N/m²], 3e5 to 8e5
 * @returns Load. [kg]
 * @throws RangeError outside the ranges.
 *
 * Source: Gold 1971, Can. Geotech. J. 8, 170, P = A h².
 */
export function floatingLoadKg(thicknessM: number, goldPa = CAUTIOUS_GOLD_PA): number {
  inRange('thicknessM [m]', thicknessM, 0, 3)
  inRange('goldPa [N/m²]', goldPa, 3e5, 8e5)
  return (goldPa * thicknessM * thicknessM) / 9.80665
}
