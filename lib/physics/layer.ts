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
import { decayModes, heatDrawnJM2, sheetCold, type SheetCold } from './sheet-cold'
import { inRange } from './check'
import { wetSeason, type WetSeason } from './wet-season'
import type { PreparedHour } from './types'
import type { SheetState } from './sheet-state'

export interface Layer {
  /** [mm], above 0 to 500 */
  layerMm: number
  /** Of the water poured. [°C], 0 to 100 */
  temperatureC: number
}

/** Heat from a well-mixed warm layer to ice at 0 °C below it: see WATER_FACE in column.ts. */
const WATER_FACE = (Math.PI ** 2 / 4) * WATER_DENSITY * WATER_CONDUCTIVITY
const LATENT_JM3 = ICE_DENSITY * FUSION_J_PER_KG
/** Heat that does not matter to the second. [J/m²] */
const CLOSE_JM2 = 10

/**
 * Minutes from pouring until the last liquid in a layer is gone.
 *
 * @param state Sheet at the time of pouring; snow on it counts as cleared, water on it must freeze as well.
 * @param hours Prepared hours.
 * @param startIndex Hour in which the layer is poured.
 * @param startFraction Share of that hour already past. [0-1)
 * @param layer Depth and temperature of the water; ranges at the fields.
 * @returns Time, or null when it does not set within the hours or an unknown hour comes first. [min]
 * @throws RangeError for arguments out of range.
 *
 * Source: energy of the layer against the loss of its surface (through the skin that forms: h + G h²/2k, Ashton 1989)
 * and the decay modes of the sheet (sheet-cold.ts). Holds within the tolerance shown in
 * tests/unit/physics/layer.test.ts.
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
  const wet = wetSeason(hours)
  if (!(startIndex >= 0 && startIndex < hours.length) || wet.isUnknown[startIndex]) return null
  const cold = sheetCold(state, groundHeatWm2(state.base))
  const wantedJM2 = heatToLose(layer, cold, wet.slopeWm2K[startIndex]!) - cold.atOnceJM2
  if (wantedJM2 <= 0) return 0
  // No later hour brings enough loss: most of a thaw is answered here. A late start may skip the bad part of its hour.
  const best = Math.max(wet.bestFromHereJM2[startIndex]!, wet.bestFromHereJM2[startIndex + 1] ?? 0)
  if (wantedJM2 > cold.totalJM2 - cold.atOnceJM2 + best) return null
  return march(wet, cold, wantedJM2, startIndex, startFraction)
}

function march(
  wet: WetSeason,
  cold: SheetCold,
  wantedJM2: number,
  first: number,
  firstFraction: number,
): number | null {
  const held = cold.sharesJM2
  let restJM2 = wantedJM2
  let skinM = 0
  let elapsed = 0
  for (let i = first; i < wet.lossWm2.length; i++) {
    if (wet.isUnknown[i]) return null
    const seconds = i === first ? (1 - firstFraction) * HOUR_SECONDS : HOUR_SECONDS
    const loss = wet.lossWm2[i]!
    const slope = wet.slopeWm2K[i]!
    restJM2 += (wet.fallsKgM2[i]! * FUSION_J_PER_KG * seconds) / HOUR_SECONDS
    const grownM = grownSkin(loss, slope, skinM, seconds)
    const lost = skinLoss(loss, skinM, grownM, seconds) + heatDrawnJM2(cold, held, seconds)
    if (lost >= restJM2) return (elapsed + timeWithin(loss, slope, skinM, cold, restJM2, seconds, lost)) / 60
    decayModes(cold, held, seconds)
    skinM = grownM
    restJM2 -= lost
    elapsed += seconds
  }
  return null
}

/** Latent heat of all the water, and its warmth less what leaves faster because the surface is warm. [J/m²] */
function heatToLose(layer: Layer, cold: SheetCold, slopeWm2K: number): number {
  const waterKg = layer.layerMm + cold.liquidKgM2
  const warmthJM2 = layer.layerMm * WATER_HEAT_CAPACITY * layer.temperatureC + cold.warmthJM2
  const toSheet = WATER_FACE / waterKg
  const extraAtTop = Math.min(0.9, ((Math.PI / 2) * slopeWm2K) / (toSheet + slopeWm2K))
  return waterKg * FUSION_J_PER_KG + warmthJM2 * (1 - extraAtTop)
}

function skinLoss(lossWm2: number, skinM: number, grownM: number, seconds: number): number {
  return lossWm2 <= 0 ? lossWm2 * seconds : (grownM - skinM) * LATENT_JM3
}

function grownSkin(lossWm2: number, slopeWm2K: number, skinM: number, seconds: number): number {
  if (lossWm2 <= 0) return Math.max(0, skinM + (lossWm2 * seconds) / LATENT_JM3)
  const bulk = ICE_CONDUCTIVITY / slopeWm2K
  const start = skinM + bulk
  return Math.sqrt(start * start + (2 * bulk * lossWm2 * seconds) / LATENT_JM3) - bulk
}

/** Moment within a stretch at which the rest is gone by false position with the Illinois rule. [s] */
function timeWithin(
  loss: number,
  slope: number,
  skinM: number,
  cold: SheetCold,
  restJM2: number,
  seconds: number,
  lostAtEnd: number,
): number {
  let early = 0
  let late = seconds
  let below = restJM2
  let above = lostAtEnd - restJM2
  let side = 0
  for (let round = 0; round < 40 && late - early > 0.01; round++) {
    const middle = early + ((late - early) * below) / (below + above)
    const grown = skinLoss(loss, skinM, grownSkin(loss, slope, skinM, middle), middle)
    const missing = restJM2 - grown - heatDrawnJM2(cold, cold.sharesJM2, middle)
    if (Math.abs(missing) < CLOSE_JM2) return middle
    if (missing > 0) {
      early = middle
      below = missing
      if (side === 1) above /= 2
      side = 1
    } else {
      late = middle
      above = -missing
      if (side === -1) below /= 2
      side = -1
    }
  }
  return (early + late) / 2
}
