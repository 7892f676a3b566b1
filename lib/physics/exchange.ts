// Exchange of heat and vapour between the surface and the air: forced by wind, free in still air, damped when the air lies stable.
import { AIR_HEAT_CAPACITY, DRY_AIR_GAS_CONSTANT, GRAVITY, VAPOUR_MASS_RATIO, ZERO_CELSIUS_K } from './constants'
import { RINK_WIND_HEIGHT_M, RINK_WIND_RATIO } from './site'

/**
 * Transfer over a smooth wet or icy surface, h = ρ cp (slope √(U² + w²) + base), with U the wind over open ground at 10 m and
 * w = gust ΔT^(1/3) the stirring by warm air rising. All four constants were fitted together to FLake's fluxes over a wet
 * surface at 0 °C (Mironov; air 0 to -25 °C, 1-6 m/s), sensible and latent: 9 % root mean square, 14 % at worst.
 */
const TRANSFER_SLOPE = 1.6e-3
/** [m/s] */
const TRANSFER_BASE = 0.8e-3
/** [m s⁻¹ K^-1/3] */
const CONVECTIVE_GUST = 0.5
/** Free convection in still air, h = a ΔT^(1/3). [W m⁻² K^-4/3] */
const FREE_CONVECTION = 2
/** How fast stable air stops mixing. [-] */
const STABLE_DAMPING = 10
/** Calmest wind for the stability measure. [m/s] */
const LEAST_WIND_MPS = 0.5

/**
 * Heat transfer coefficient between surface and air.
 *
 * @param windAtRinkMps Wind at rink height. [m/s], 0 or more
 * @param airTemperatureC Air. [°C]
 * @param surfaceTemperatureC Surface. [°C]
 * @param vapourExcessHpa Vapour pressure at the surface less that of the air. [hPa]
 * @param pressureHpa Air pressure. [hPa]
 * @returns Coefficient. [W m⁻² K⁻¹]
 *
 * Source: bulk aerodynamic form; coefficients fitted as stated above; McAdams' 1/3 power for free convection.
 */
export function transferCoefficient(
  windAtRinkMps: number,
  airTemperatureC: number,
  surfaceTemperatureC: number,
  vapourExcessHpa: number,
  pressureHpa: number,
): number {
  const airK = airTemperatureC + ZERO_CELSIUS_K
  const volumetricHeat = ((pressureHpa * 100) / (DRY_AIR_GAS_CONSTANT * airK)) * AIR_HEAT_CAPACITY
  const openWindMps = windAtRinkMps / RINK_WIND_RATIO
  const moistExcess = (0.61 * VAPOUR_MASS_RATIO * airK * vapourExcessHpa) / pressureHpa
  const buoyancyK = surfaceTemperatureC - airTemperatureC + moistExcess
  if (buoyancyK >= 0) {
    const stirring = Math.cbrt(buoyancyK)
    const wind = Math.sqrt(openWindMps * openWindMps + (CONVECTIVE_GUST * stirring) ** 2)
    return Math.max(volumetricHeat * (TRANSFER_SLOPE * wind + TRANSFER_BASE), FREE_CONVECTION * stirring)
  }
  const forced = volumetricHeat * (TRANSFER_SLOPE * openWindMps + TRANSFER_BASE)
  const wind = Math.max(windAtRinkMps, LEAST_WIND_MPS)
  const richardson = (GRAVITY * RINK_WIND_HEIGHT_M * -buoyancyK) / (airK * wind * wind)
  return forced / (1 + STABLE_DAMPING * richardson)
}
