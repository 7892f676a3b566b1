// Open water and the first centimetres of ice, where the film freezes faster than a grid could follow.
import { FUSION_J_PER_KG, ICE_CONDUCTIVITY, ICE_DENSITY, ICE_HEAT_CAPACITY, WATER_HEAT_CAPACITY } from './constants'
import { groundHeatWm2, waterToIceWm2 } from './ground'
import { surfaceLaw } from './balance'
import type { PreparedHour } from './types'
import type { SheetState } from './sheet-state'

/** Ice thinner than this on water grows by the closed form. [kg/m²] 15 mm */
const THIN_KG = 15e-3 * ICE_DENSITY

/** Thin, bare, without water on it, afloat, and not melting from the last hour. */
export function isThinIce(state: SheetState): boolean {
  if (state.belowKgM2 <= 0 || state.snowKgM2 > 0) return false
  let mass = 0
  for (let i = 0; i < state.massKgM2.length; i++) mass += state.massKgM2[i]!
  return mass < THIN_KG
}

/** Cools open water; what it cannot give becomes the first ice. Returns enthalpy received. [J/m²] */
export function freezeOpenWater(state: SheetState, hour: PreparedHour, seconds: number): number {
  const law = surfaceLaw(hour, 'water', state.belowTemperatureC)
  const capacity = state.belowKgM2 * WATER_HEAT_CAPACITY
  const gainWm2 = groundHeatWm2(state.base) - law.netWm2
  const change = (gainWm2 * seconds) / (capacity + law.slopeWm2K * seconds)
  const receivedJM2 = change * capacity
  const total = capacity * state.belowTemperatureC + receivedJM2
  if (total >= 0) {
    state.belowTemperatureC = total / capacity
    state.surfaceTemperatureC = state.belowTemperatureC
    return receivedJM2
  }
  const iceKg = Math.min(state.belowKgM2, -total / FUSION_J_PER_KG)
  state.massKgM2.push(iceKg)
  state.enthalpyJM2.push(total)
  state.belowKgM2 -= iceKg
  state.belowTemperatureC = 0
  state.surfaceTemperatureC = 0
  return receivedJM2
}

/**
 * Grows (or melts) thin floating ice by the closed form h + G h²/2k: exact for a steady loss at 0 °C that falls off with slope G.
 * Returns enthalpy received. [J/m²]
 */
export function growThinIce(state: SheetState, hour: PreparedHour, seconds: number): number {
  const law = surfaceLaw(hour, 'wet', 0)
  const iceKg = sum(state.massKgM2)
  const oldJM2 = sum(state.enthalpyJM2)
  const capacity = state.belowKgM2 * WATER_HEAT_CAPACITY
  const fromWaterJM2 = Math.min(
    waterToIceWm2(state.belowTemperatureC, state.belowKgM2) * seconds,
    capacity * state.belowTemperatureC,
  )
  const groundJM2 = groundHeatWm2(state.base) * seconds
  const lossJM2 = lossOver(law.netWm2, law.slopeWm2K, iceKg / ICE_DENSITY, seconds)
  const total = oldJM2 - lossJM2 + fromWaterJM2
  let heatBelow = capacity * state.belowTemperatureC - fromWaterJM2 + groundJM2
  state.massKgM2.length = 0
  state.enthalpyJM2.length = 0
  if (total < 0) {
    const meanC = meanIceTemperature(law.netWm2, law.slopeWm2K, iceKg / ICE_DENSITY)
    const newKg = Math.min(state.belowKgM2 + iceKg, total / (ICE_HEAT_CAPACITY * meanC - FUSION_J_PER_KG))
    state.massKgM2.push(newKg)
    state.enthalpyJM2.push(total)
    state.belowKgM2 += iceKg - newKg
    state.surfaceTemperatureC = 2 * meanC
  } else {
    state.belowKgM2 += iceKg
    heatBelow += total
    state.surfaceTemperatureC = 0
  }
  settleBelow(state, heatBelow)
  return groundJM2 - lossJM2
}

function settleBelow(state: SheetState, heatJM2: number): void {
  if (state.belowKgM2 > 1e-3) {
    state.belowTemperatureC = heatJM2 / (state.belowKgM2 * WATER_HEAT_CAPACITY)
    return
  }
  state.massKgM2[0]! += state.belowKgM2
  state.enthalpyJM2[0]! += heatJM2
  state.belowKgM2 = 0
  state.belowTemperatureC = 0
}

/** Heat lost through thickening ice. [J/m²] */
function lossOver(netWm2: number, slopeWm2K: number, thicknessM: number, seconds: number): number {
  if (netWm2 <= 0) return netWm2 * seconds
  const latent = FUSION_J_PER_KG * ICE_DENSITY
  const bulk = ICE_CONDUCTIVITY / slopeWm2K
  const start = thicknessM + bulk
  const grown = Math.sqrt(start * start + (2 * bulk * netWm2 * seconds) / latent) - start
  return grown * latent
}

function meanIceTemperature(netWm2: number, slopeWm2K: number, thicknessM: number): number {
  if (netWm2 <= 0) return 0
  return (-0.5 * netWm2 * thicknessM) / (ICE_CONDUCTIVITY + slopeWm2K * thicknessM)
}

function sum(values: number[]): number {
  let total = 0
  for (const value of values) total += value
  return total
}
