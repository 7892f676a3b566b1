// When a poured layer is solid, with the air above and the cold sheet below it.
import {
  FUSION_J_PER_KG,
  HOUR_SECONDS,
  ICE_CONDUCTIVITY,
  ICE_DENSITY,
  WATER_CONDUCTIVITY,
  WATER_DENSITY,
  WATER_HEAT_CAPACITY,
} from './constants'
import { groundHeatWm2 } from './ground'
import { heatDrawnJM2, sheetCold, type SheetCold } from './sheet-cold'
import { inRange } from './check'
import { precipitationHeatWm2, surfaceLaw } from './balance'
import type { PreparedHour } from './types'
import type { SheetState } from './sheet-state'

export interface Layer {
  /** [mm], above 0 to 500 */
  layerMm: number
  /** Of the water poured. [°C], 0 to 100 */
  temperatureC: number
}

/** What an hour does to a wet surface at 0 °C. */
interface WetHour {
  lossWm2: number
  slopeWm2K: number
  /** Water that falls into the layer, as rain or snow. [kg/m²] */
  fallsKgM2: number
}

/** Heat from a well-mixed warm layer to ice at 0 °C below it: see WATER_FACE in column.ts. */
const WATER_FACE = (Math.PI ** 2 / 4) * WATER_DENSITY * WATER_CONDUCTIVITY
/** Hours are prepared once and asked many times. The law of an hour depends on nothing but the hour. */
const wetHours = new WeakMap<PreparedHour, WetHour>()

/**
 * Minutes from pouring until the last liquid in a layer is gone.
 *
 * @param state Sheet at the time of pouring; snow on it counts as cleared, water on it must freeze as well.
 * @param hours Prepared hours.
 * @param startIndex Hour in which the layer is poured.
 * @param startFraction Share of that hour already past. [0-1)
 * @param layer Depth and temperature of the water; ranges at the fields.
 * @returns Minutes, or null when it does not set within the hours or an unknown hour comes first.
 * @throws RangeError for arguments out of range.
 *
 * Source: energy of the layer against the loss of its surface (through the skin that forms: h + G h²/2k, Ashton 1989) and
 * the decay modes of the sheet (sheet-cold.ts). Holds within the tolerance shown in tests/unit/physics/layer.test.ts.
 */
export function minutesToSet(
  state: SheetState,
  hours: readonly PreparedHour[],
  startIndex: number,
  startFraction: number,
  layer: Layer,
): number | null {
  inRange('layerMm [mm]', layer.layerMm, 0.01, 500)
  inRange('temperatureC [°C]', layer.temperatureC, 0, 100)
  inRange('startFraction [0-1)', startFraction, 0, 0.999999)
  const firstHour = hours[startIndex]
  if (!firstHour?.isKnown) return null
  const cold = sheetCold(state, groundHeatWm2(state.base))
  const budget = {
    restJM2: heatToLose(layer, cold, wetHour(firstHour)),
    skinM: 0,
  }
  let elapsed = 0
  let drawn = 0
  let fraction = startFraction
  for (let i = startIndex; i < hours.length; i++) {
    const hour = hours[i]!
    if (!hour.isKnown) return null
    const wet = wetHour(hour)
    const seconds = (1 - fraction) * HOUR_SECONDS
    budget.restJM2 += wet.fallsKgM2 * (1 - fraction) * FUSION_J_PER_KG
    fraction = 0
    // Once the ground gives more than the sheet still takes, the sheet melts at its foot; none of that reaches the layer.
    const drawnAfter = Math.max(drawn, heatDrawnJM2(cold, elapsed + seconds))
    const lost = skinLoss(wet, budget.skinM, seconds) + drawnAfter - drawn
    if (lost >= budget.restJM2) {
      return (elapsed + timeWithin(wet, budget.skinM, cold, elapsed, drawn, budget.restJM2, seconds)) / 60
    }
    budget.skinM = grownSkin(wet, budget.skinM, seconds)
    budget.restJM2 -= lost
    elapsed += seconds
    drawn = drawnAfter
  }
  return null
}

/** The law of an hour for a wet surface at 0 °C, worked out once. */
export function wetHour(hour: PreparedHour): WetHour {
  let wet = wetHours.get(hour)
  if (!wet) {
    const law = surfaceLaw(hour, 'wet', 0)
    wet = {
      lossWm2: law.netWm2 + precipitationHeatWm2(hour),
      slopeWm2K: law.slopeWm2K,
      fallsKgM2: hour.precipitationMm,
    }
    wetHours.set(hour, wet)
  }
  return wet
}

/** Latent heat of all the water, and its warmth less what leaves faster because the surface is warm. [J/m²] */
function heatToLose(layer: Layer, cold: SheetCold, wet: WetHour): number {
  const waterKg = layer.layerMm + cold.liquidKgM2
  const warmthJM2 = layer.layerMm * WATER_HEAT_CAPACITY * layer.temperatureC + cold.warmthJM2
  const toSheet = WATER_FACE / waterKg
  const extraAtTop = Math.min(0.9, ((Math.PI / 2) * wet.slopeWm2K) / (toSheet + wet.slopeWm2K))
  return waterKg * FUSION_J_PER_KG + warmthJM2 * (1 - extraAtTop)
}

function skinLoss(wet: WetHour, skinM: number, seconds: number): number {
  if (wet.lossWm2 <= 0) return wet.lossWm2 * seconds
  return (grownSkin(wet, skinM, seconds) - skinM) * ICE_DENSITY * FUSION_J_PER_KG
}

function grownSkin(wet: WetHour, skinM: number, seconds: number): number {
  const latent = ICE_DENSITY * FUSION_J_PER_KG
  if (wet.lossWm2 <= 0) return Math.max(0, skinM + (wet.lossWm2 * seconds) / latent)
  const bulk = ICE_CONDUCTIVITY / wet.slopeWm2K
  const start = skinM + bulk
  return Math.sqrt(start * start + (2 * bulk * wet.lossWm2 * seconds) / latent) - bulk
}

/** Moment within an hour at which the rest is gone, by bisection; the loss may dip first, so no faster method is safe. [s] */
function timeWithin(
  wet: WetHour,
  skinM: number,
  cold: SheetCold,
  elapsed: number,
  drawn: number,
  restJM2: number,
  seconds: number,
): number {
  let early = 0
  let late = seconds
  for (let round = 0; round < 12; round++) {
    const middle = (early + late) / 2
    const lost = skinLoss(wet, skinM, middle) + Math.max(0, heatDrawnJM2(cold, elapsed + middle) - drawn)
    if (lost >= restJM2) late = middle
    else early = middle
  }
  return (early + late) / 2
}
