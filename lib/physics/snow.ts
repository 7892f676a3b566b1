// Snow: how it falls, how it lies and how well it insulates.
import { isNumber } from './gaps'
import { inRange } from './check'
import type { HourlyRecord } from './types'

/** Air temperature that parts rain from snow where the service does not. [°C] Usual value near 1; from memory. */
const RAIN_ABOVE_C = 1
/** Density that lying snow settles to. [kg/m³] Settled snow about 300 (reference text), lake snow somewhat less. */
export const SETTLED_SNOW_DENSITY = 250
/** Time in which snow loses 1/e of its looseness. [h] Ours. */
const SETTLING_HOURS = 48

/**
 * Density of new snow.
 *
 * @param airTemperatureC Air while it falls. [°C]
 * @returns Density. [kg/m³]
 *
 * Source: Anderson 1976, as in CLM: 50 + 1.7 (T + 15)^1.5 above -15 °C, held at its value for 2 °C above that.
 */
export function newSnowDensity(airTemperatureC: number): number {
  return 50 + 1.7 * Math.pow(Math.min(17, Math.max(0, airTemperatureC + 15)), 1.5)
}

/**
 * Conductivity of snow.
 *
 * @param density Density. [kg/m³], 10 to 600
 * @returns Conductivity. [W m⁻¹ K⁻¹]
 * @throws RangeError outside the range.
 *
 * Source: Sturm et al. 1997: 0.023 + 0.234 ρ below 156 kg/m³, 0.138 - 1.01 ρ + 3.233 ρ² above (ρ in g/cm³); from memory.
 */
export function snowConductivity(density: number): number {
  const heavy = inRange('density [kg/m³]', density, 10, 600) / 1000
  return heavy < 0.156 ? 0.023 + 0.234 * heavy : 0.138 - 1.01 * heavy + 3.233 * heavy * heavy
}

/**
 * Depth of snow one hour later as it settles, its mass unchanged.
 *
 * @param depthCm Depth now. [cm], 0 or more
 * @param massKgM2 Mass of the snow. [kg/m²], 0 or more
 * @returns Depth. [cm]
 *
 * Source: exponential approach to SETTLED_SNOW_DENSITY; ours.
 */
export function settledDepthCm(depthCm: number, massKgM2: number): number {
  const floorCm = (massKgM2 / SETTLED_SNOW_DENSITY) * 100
  return depthCm <= floorCm ? depthCm : floorCm + (depthCm - floorCm) * Math.exp(-1 / SETTLING_HOURS)
}

/** Depth of new snow from its water. [cm] */
function newSnowDepthCm(snowMm: number, airTemperatureC: number): number {
  return snowMm > 0 ? (snowMm * 100) / newSnowDensity(airTemperatureC) : 0
}

/**
 * Splits what falls into rain and snow where the record does not.
 *
 * @param record The hour; what it says of rain and snow itself comes first.
 * @param airTemperatureC Its air. [°C]
 * @param precipitationMm What falls in all, as water. [mm]
 * @returns Rain as water [mm] and the depth of new snow [cm].
 * @throws RangeError for rain outside 0-200 mm or snow outside 0-100 cm.
 *
 * Source: what the record says, else by air temperature; RAIN_ABOVE_C and newSnowDensity in this file.
 */
export function precipitationPhase(
  record: HourlyRecord,
  airTemperatureC: number,
  precipitationMm: number,
): { rainMm: number; snowfallCm: number } {
  if (isNumber(record.rainMm)) {
    const rainMm = Math.min(inRange('rainMm [mm]', record.rainMm, 0, 200), precipitationMm)
    const snowfallCm = record.snowfallCm ?? newSnowDepthCm(precipitationMm - rainMm, airTemperatureC)
    return { rainMm, snowfallCm: inRange('snowfallCm [cm]', snowfallCm, 0, 100) }
  }
  if (isNumber(record.snowfallCm)) {
    const snowfallCm = inRange('snowfallCm [cm]', record.snowfallCm, 0, 100)
    const snowMm = (snowfallCm * newSnowDensity(airTemperatureC)) / 100
    return {
      rainMm: snowfallCm > 0 ? Math.max(0, precipitationMm - snowMm) : precipitationMm,
      snowfallCm,
    }
  }
  return airTemperatureC > RAIN_ABOVE_C
    ? { rainMm: precipitationMm, snowfallCm: 0 }
    : { rainMm: 0, snowfallCm: newSnowDepthCm(precipitationMm, airTemperatureC) }
}
