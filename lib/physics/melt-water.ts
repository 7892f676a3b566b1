// Water that has to go somewhere in spring, and snow that brings water up over floating ice.
import { WATER_DENSITY } from './constants'
import { inRange } from './check'

/**
 * Melt water of a whole sheet.
 *
 * @param pouredL Water of the fill and of all floods. [L], 0 or more
 * @param areaM2 Floor. [m²], above 0
 * @param sublimatedMm Water that left as vapour over the season. [mm], 0 to 500; 0 gives the most there can be
 * @param shavedL Snow and shavings thrown over the boards, as water. [L]
 * @returns [m³]
 * @throws RangeError outside the ranges.
 *
 * Source: balance of mass; what was poured and did not leave stays.
 */
export function meltWaterM3(pouredL: number, areaM2: number, sublimatedMm = 0, shavedL = 0): number {
  const lostL = inRange('sublimatedMm [mm]', sublimatedMm, 0, 500) * inRange('areaM2 [m²]', areaM2, 0.01, 1e6)
  const keptL = inRange('pouredL [L]', pouredL, 0, 1e9) - lostL - inRange('shavedL [L]', shavedL, 0, 1e9)
  return Math.max(0, keptL) / 1000
}

/**
 * Snow that just brings water up over floating ice.
 *
 * @param iceMm Ice. [mm], 0 to 3000
 * @param iceDensity Of the ice. [kg/m³]
 * @param snowDensity Of the snow. [kg/m³], 10 to 600
 * @returns Depth of snow. [cm]
 * @throws RangeError outside the ranges.
 *
 * Source: Archimedes, h_i (ρ_w - ρ_i) / ρ_s.
 */
export function snowThatFloodsIceCm(iceMm: number, iceDensity: number, snowDensity: number): number {
  inRange('iceMm [mm]', iceMm, 0, 3000)
  return ((iceMm / 10) * (WATER_DENSITY - iceDensity)) / inRange('snowDensity [kg/m³]', snowDensity, 10, 600)
}
