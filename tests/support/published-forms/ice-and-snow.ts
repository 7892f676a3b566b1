// Published forms of ice growth, of what floating ice bears and of melting snow that the model does not use.
import {
  FUSION_J_PER_KG,
  ICE_CONDUCTIVITY,
  ICE_DENSITY,
  ICE_HEAT_CAPACITY,
  WATER_HEAT_CAPACITY,
} from '@/lib/physics/constants'
import { inRange } from '@/lib/physics/check'

const LATENT = FUSION_J_PER_KG * ICE_DENSITY

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

/**
 * Time in which ice grows from one thickness to another at a steady temperature by the same form.
 *
 * @param fromM Ice at the start. [m]
 * @param toM Ice wanted. [m], at least `fromM`
 * @param kelvinsBelow Freezing point less air. [K], above 0
 * @param bulkWm2K Transfer between surface and air. [W m⁻² K⁻¹]
 * @returns Time. [h]
 * @throws RangeError for arguments out of range.
 *
 * Source: Ashton 1989, integrated here.
 */
export function ashtonHours(fromM: number, toM: number, kelvinsBelow: number, bulkWm2K: number): number {
  inRange('fromM [m]', fromM, 0, toM)
  inRange('kelvinsBelow [K]', kelvinsBelow, 1e-6, 100)
  const path = (toM - fromM) / bulkWm2K + (toM * toM - fromM * fromM) / (2 * ICE_CONDUCTIVITY)
  return (LATENT * path) / kelvinsBelow / 3600
}

/**
 * Ice thickness by a degree-day coefficient.
 *
 * @param coefficient By exposure: windy lake 2.7, average lake with snow 1.7-2.4, river 1.4-1.7. [cm (°C d)^-1/2]
 * @param freezingDegreeDays Degree-days below 0 °C. [°C d], 0 or more
 * @returns Thickness. [cm]
 * @throws RangeError for negative arguments.
 *
 * Source: US Army Corps of Engineers, EM 1110-2-1612 and ERDC/CRREL TN 04-3; season-scale lake ice, poor under 10 cm.
 */
export function degreeDayThicknessCm(coefficient: number, freezingDegreeDays: number): number {
  inRange('coefficient [cm (°C d)^-1/2]', coefficient, 0, 4)
  return coefficient * Math.sqrt(inRange('freezingDegreeDays [°C d]', freezingDegreeDays, 0, 1e5))
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
