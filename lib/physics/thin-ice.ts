// Open water and the first centimetres of ice, where the film freezes faster than a grid could follow.
import { FUSION_J_PER_KG, ICE_CONDUCTIVITY, ICE_DENSITY, ICE_HEAT_CAPACITY, WATER_HEAT_CAPACITY } from './constants'
import { waterToIceWm2 } from './ground'
import type { SheetState } from './sheet-state'

/** A surface that loses `lossAt0Wm2` at 0 °C and `slopeWm2K` more for each kelvin above. */
export interface LinearLoss {
  lossAt0Wm2: number
  slopeWm2K: number
}

/** Ice thinner than this on water grows by the closed form. [kg/m²] 25 mm */
const THIN_KG = 25e-3 * ICE_DENSITY

/**
 * Thin, bare, without water on it, afloat, and not melting from the last hour.
 *
 * @param state Sheet.
 * @returns Whether it is all of that.
 *
 * Source: ours.
 */
export function isThinIce(state: SheetState): boolean {
  if (state.belowKgM2 <= 0 || state.snowKgM2 > 0) return false
  let mass = 0
  for (let i = 0; i < state.massKgM2.length; i++) mass += state.massKgM2[i]!
  return mass < THIN_KG
}

/**
 * Cools open water to 0 °C and freezes it in what is left of the step.
 *
 * @param state Sheet without ice; changed in place.
 * @param law Loss at 0 °C [W/m²] and its slope [W m⁻² K⁻¹].
 * @param groundWm2 Heat from below. [W/m²]
 * @param seconds Length of the step. [s], above 0
 * @returns Enthalpy received. [J/m²]
 *
 * Source: balance of heat of a mixed layer, backward Euler.
 */
export function freezeOpenWater(state: SheetState, law: LinearLoss, groundWm2: number, seconds: number): number {
  const capacity = state.belowKgM2 * WATER_HEAT_CAPACITY
  const gainWm2 = groundWm2 - law.lossAt0Wm2 - law.slopeWm2K * state.belowTemperatureC
  const change = (gainWm2 * seconds) / (capacity + law.slopeWm2K * seconds)
  if (state.belowTemperatureC + change >= 0) {
    state.belowTemperatureC += change
    state.surfaceTemperatureC = state.belowTemperatureC
    return change * capacity
  }
  const coolingShare = -state.belowTemperatureC / change
  const coolingJM2 = -state.belowTemperatureC * capacity
  state.belowTemperatureC = 0
  return coolingJM2 + growThinIce(state, law, groundWm2, seconds * (1 - coolingShare))
}

/**
 * Grows (or melts) thin floating ice by the closed form h + G h²/2k: exact for a steady loss at 0 °C that falls off
 * with slope G.
 *
 * @param state Sheet; changed in place.
 * @param law Loss at 0 °C [W/m²] and its slope [W m⁻² K⁻¹].
 * @param groundWm2 Heat from below. [W/m²]
 * @param seconds Length of the step. [s], above 0
 * @returns Enthalpy received. [J/m²]
 *
 * Source: Ashton 1989, integrated here.
 */
export function growThinIce(state: SheetState, law: LinearLoss, groundWm2: number, seconds: number): number {
  const { lossAt0Wm2, slopeWm2K } = law
  const iceKg = sum(state.massKgM2)
  const oldJM2 = sum(state.enthalpyJM2)
  const capacity = state.belowKgM2 * WATER_HEAT_CAPACITY
  const fromWaterJM2 = Math.min(
    waterToIceWm2(state.belowTemperatureC, state.belowKgM2) * seconds,
    capacity * state.belowTemperatureC,
  )
  const groundJM2 = groundWm2 * seconds
  const lossJM2 = lossOver(lossAt0Wm2, slopeWm2K, iceKg / ICE_DENSITY, seconds)
  const total = oldJM2 - lossJM2 + fromWaterJM2
  let heatBelow = capacity * state.belowTemperatureC - fromWaterJM2 + groundJM2
  state.massKgM2.length = 0
  state.enthalpyJM2.length = 0
  if (total < 0) {
    const meanC = meanIceTemperature(lossAt0Wm2, slopeWm2K, iceKg / ICE_DENSITY)
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
