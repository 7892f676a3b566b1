// Water that has to go somewhere in spring, and snow that water melts under the liner.
import { FUSION_J_PER_KG, ICE_HEAT_CAPACITY, WATER_DENSITY, WATER_HEAT_CAPACITY } from './constants'
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
 * Depth of snow that a fill can melt with its own warmth alone, while all of it stays liquid.
 *
 * @param waterMm Water over it. [mm], 0 to 3000
 * @param waterC Its temperature. [°C], 0 to 40
 * @param snow Density [kg/m³], 10 to 600, and temperature [°C], -40 to 0, of the snow.
 * @returns Snow melted once the water is down to 0 °C. [cm]
 * @throws RangeError outside the ranges.
 *
 * Source: balance of heat, c_w T of the water against L + c_i |T| of the snow.
 */
export function snowMeltedCm(
  waterMm: number,
  waterC: number,
  snow: { densityKgM3: number; temperatureC: number },
): number {
  const warmthJM2 =
    inRange('waterMm [mm]', waterMm, 0, 3000) * WATER_HEAT_CAPACITY * inRange('waterC [°C]', waterC, 0, 40)
  const coldC = inRange('temperatureC [°C]', snow.temperatureC, -40, 0)
  const meltKgM2 = warmthJM2 / (FUSION_J_PER_KG - ICE_HEAT_CAPACITY * coldC)
  return (meltKgM2 / inRange('densityKgM3 [kg/m³]', snow.densityKgM3, 10, 600)) * 100
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
