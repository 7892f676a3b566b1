// Heat that reaches the ice or the water from below.
import { WATER_CONDUCTIVITY, WATER_DENSITY } from './constants'
import type { Base } from './types'

/**
 * Heat from the ground. [W/m²] Ours: 1.5 W/mK and 2 K over 0.3 m make 10 W/m² on fresh ground; half of that once the frost has
 * gone in. A liner adds less than 0.001 m² K/W (0.2 mm polyethylene). Packed snow insulates.
 */
const GROUND_HEAT_WM2: Record<Base, number> = { liner: 5, ground: 5, snow: 2 }

/**
 * Heat into the ice or water from what it lies on.
 *
 * @param base What it lies on.
 * @returns Flux, positive upwards. [W/m²]
 *
 * Source: GROUND_HEAT_WM2 in this file.
 */
export function groundHeatWm2(base: Base): number {
  return GROUND_HEAT_WM2[base]
}

/**
 * Heat from warm water to the ice above it, by conduction through a stratified layer.
 *
 * @param temperatureC Mean of the water. [°C], 0 or more
 * @param massKgM2 Water under the ice. [kg/m²], above 0
 * @returns Flux into the ice. [W/m²]
 *
 * Source: first decay mode of a slab held at 0 °C on one face, π²/4 k T/h.
 */
export function waterToIceWm2(temperatureC: number, massKgM2: number): number {
  return ((Math.PI ** 2 / 4) * WATER_CONDUCTIVITY * temperatureC * WATER_DENSITY) / massKgM2
}
