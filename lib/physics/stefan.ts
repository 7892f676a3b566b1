// Closed forms of ice growth: a check on the full model, and what is left when only air temperatures are known.
import { FUSION_J_PER_KG, HOUR_SECONDS, ICE_CONDUCTIVITY, ICE_DENSITY, ICE_HEAT_CAPACITY } from './constants'
import { inRange } from './check'

const DAY_SECONDS = 24 * HOUR_SECONDS
const LATENT = FUSION_J_PER_KG * ICE_DENSITY

/**
 * Ice thickness by Stefan's law: conduction through the ice is the only limit. An upper bound.
 *
 * @param startM Ice at the start. [m], 0 or more
 * @param freezingDegreeDays Degree-days below 0 °C. [°C d], 0 or more
 * @returns Thickness. [m]
 * @throws RangeError for negative arguments.
 *
 * Source: Stefan 1891.
 */
export function stefanThicknessM(startM: number, freezingDegreeDays: number): number {
  inRange('startM [m]', startM, 0, 10)
  inRange('freezingDegreeDays [°C d]', freezingDegreeDays, 0, 1e5)
  return Math.sqrt(startM * startM + (2 * ICE_CONDUCTIVITY * DAY_SECONDS * freezingDegreeDays) / LATENT)
}

/**
 * Ice thickness by Ashton's thin-ice form: conduction through ice and snow, then a bulk coefficient to the air.
 *
 * @param startM Ice at the start. [m], 0 or more
 * @param freezingDegreeDays Degree-days below 0 °C. [°C d], 0 or more
 * @param bulkWm2K Transfer between surface and air. [W m⁻² K⁻¹], usually 10-30
 * @param snowResistance Snow depth over its conductivity. [m² K/W], 0 or more
 * @returns Thickness. [m]
 * @throws RangeError for arguments out of range.
 *
 * Source: Ashton 1989, Water Resour. Res.; integrated here.
 */
export function ashtonThicknessM(
  startM: number,
  freezingDegreeDays: number,
  bulkWm2K: number,
  snowResistance = 0,
): number {
  inRange('startM [m]', startM, 0, 10)
  inRange('freezingDegreeDays [°C d]', freezingDegreeDays, 0, 1e5)
  inRange('bulkWm2K [W/m²K]', bulkWm2K, 0.1, 1e6)
  const extra = ICE_CONDUCTIVITY * (1 / bulkWm2K + inRange('snowResistance [m²K/W]', snowResistance, 0, 100))
  const grown = (2 * ICE_CONDUCTIVITY * DAY_SECONDS * freezingDegreeDays) / LATENT
  return Math.sqrt((startM + extra) ** 2 + grown) - extra
}

/**
 * Growth constant λ of Neumann's exact solution, h = 2 λ √(α t), for water at 0 °C.
 *
 * @param kelvinsBelow Freezing point less surface. [K], 0 to 60
 * @returns λ. [-]
 * @throws RangeError outside the range.
 *
 * Source: Neumann about 1860, √π λ exp(λ²) erf λ = c ΔT / L; solved by Newton's method, erf by its series.
 */
export function neumannLambda(kelvinsBelow: number): number {
  const stefanNumber = (ICE_HEAT_CAPACITY * inRange('kelvinsBelow [K]', kelvinsBelow, 0, 60)) / FUSION_J_PER_KG
  let lambda = Math.sqrt(stefanNumber / 2)
  for (let round = 0; round < 20; round++) {
    const bell = Math.exp(lambda * lambda)
    const value = Math.sqrt(Math.PI) * lambda * bell * errorFunction(lambda) - stefanNumber
    const slope = Math.sqrt(Math.PI) * bell * errorFunction(lambda) * (1 + 2 * lambda * lambda) + 2 * lambda
    if (slope > 0) lambda -= value / slope
  }
  return lambda
}

/**
 * Ice thickness by Neumann's exact solution from open water at 0 °C.
 *
 * @param kelvinsBelow Freezing point less surface. [K], 0 to 60
 * @param hours Time. [h], 0 or more
 * @returns Thickness. [m]
 * @throws RangeError outside the ranges.
 *
 * Source: as neumannLambda.
 */
export function neumannThicknessM(kelvinsBelow: number, hours: number): number {
  const diffusivity = ICE_CONDUCTIVITY / (ICE_DENSITY * ICE_HEAT_CAPACITY)
  return 2 * neumannLambda(kelvinsBelow) * Math.sqrt(diffusivity * inRange('hours [h]', hours, 0, 1e6) * HOUR_SECONDS)
}

/** Error function by its power series; for the small arguments of ice growth ten terms are exact to rounding. */
function errorFunction(x: number): number {
  let term = x
  let sum = x
  for (let n = 1; n < 30; n++) {
    term *= (-x * x) / n
    sum += term / (2 * n + 1)
  }
  return (2 / Math.sqrt(Math.PI)) * sum
}

/** Bulk coefficient of the fall-back. [W m⁻² K⁻¹] Middle of Ashton's 10-30. */
const FALL_BACK_BULK_WM2K = 20
/** Conductivity of snow lying on lake ice. [W m⁻¹ K⁻¹] Wind-packed end of the range the NWS Alaska-Pacific River Forecast Center uses. */
const LYING_SNOW_CONDUCTIVITY = 0.2

/**
 * Ice thickness when only daily mean temperatures and snow are known: Ashton's form day by day. It never melts.
 *
 * @param startM Ice at the start. [m], 0 or more
 * @param days Daily mean air [°C] and snow lying on the ice [m], in order.
 * @returns Thickness at the end. [m]
 * @throws RangeError for arguments out of range.
 *
 * Source: Ashton 1989; coefficients as above. Measured lakes in Finland: see `npm run validate`.
 */
export function thicknessFromDaysM(startM: number, days: readonly { airC: number; snowM: number }[]): number {
  return days.reduce(
    (thicknessM, { airC, snowM }) =>
      ashtonThicknessM(thicknessM, Math.max(0, -airC), FALL_BACK_BULK_WM2K, snowM / LYING_SNOW_CONDUCTIVITY),
    inRange('startM [m]', startM, 0, 10),
  )
}
