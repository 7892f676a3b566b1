// What falls on the sheet: rain joins the surface, snow lies on ice and melts into water.
import { FUSION_J_PER_KG, ICE_HEAT_CAPACITY, WATER_HEAT_CAPACITY } from './constants'
import { SETTLED_SNOW_DENSITY } from './snow'
import type { PreparedHour } from './types'
import type { SheetState } from './sheet-state'

/** Water on top that swallows snow instead of carrying it. [kg/m²] Ours. */
const SWALLOWS_KG = 0.3
/** Rain that makes a cell of its own on dry ice. [kg/m²] Less is mixed into the top cell, where the cold freezes it. */
const OWN_CELL_KG = 1

/**
 * Puts the hour's rain and snow on the sheet.
 *
 * @param state Sheet; changed in place.
 * @param hour Prepared hour, known.
 * @returns Enthalpy they bring. [J/m²]
 *
 * Source: balance of mass and heat; rain comes at air temperature, snow that lies at 0 °C; ours.
 */
export function fallOnSheet(state: SheetState, hour: PreparedHour): number {
  const snowKg = Math.max(0, hour.precipitationMm - hour.rainMm)
  let broughtJM2 = 0
  if (hour.rainMm > 0) {
    const warmth = hour.rainMm * WATER_HEAT_CAPACITY * Math.max(0, hour.airTemperatureC)
    addToTop(state, hour.rainMm, warmth)
    broughtJM2 += warmth
  }
  if (snowKg > 0 && hour.snowOnIceCm === null) {
    const cold = snowKg * (ICE_HEAT_CAPACITY * Math.min(0, hour.airTemperatureC) - FUSION_J_PER_KG)
    if (isSwallowed(state)) {
      addToTop(state, snowKg, cold)
      broughtJM2 += cold
    } else {
      state.snowKgM2 += snowKg
      state.snowDepthCm += hour.snowfallCm
      broughtJM2 -= FUSION_J_PER_KG * snowKg
    }
  }
  return broughtJM2
}

/**
 * Snow whose ice has melted away under it falls into the water.
 *
 * @param state Sheet; changed in place.
 *
 * Source: ours; mass and enthalpy are kept.
 */
export function sinkSnow(state: SheetState): void {
  if (state.snowKgM2 <= 0 || state.massKgM2.length > 0 || state.belowKgM2 <= 0) return
  mixIntoOpenWater(state, state.snowKgM2, -FUSION_J_PER_KG * state.snowKgM2)
  state.snowKgM2 = 0
  state.snowDepthCm = 0
}

/**
 * A measured snow depth replaces the modelled one.
 *
 * @param state Sheet; changed in place.
 * @param hour Prepared hour; `snowOnIceCm` null changes nothing. [cm]
 * @returns Enthalpy that comes with the change. [J/m²]
 *
 * Source: depth by SETTLED_SNOW_DENSITY.
 */
export function setMeasuredSnow(state: SheetState, hour: PreparedHour): number {
  if (hour.snowOnIceCm === null) return 0
  const massKgM2 = (hour.snowOnIceCm / 100) * SETTLED_SNOW_DENSITY
  const broughtJM2 = -FUSION_J_PER_KG * (massKgM2 - state.snowKgM2)
  state.snowKgM2 = massKgM2
  state.snowDepthCm = hour.snowOnIceCm
  return broughtJM2
}

/**
 * Adds mass to whatever the top is: a wet cell, ice (as a wet cell of its own when there is enough), open water, bare
 * ground.
 *
 * @param state Sheet; changed in place.
 * @param massKgM2 Mass to add. [kg/m²], above 0
 * @param enthalpyJM2 Its enthalpy, 0 for water at 0 °C. [J/m²]
 *
 * Source: ours; mass and enthalpy are kept.
 */
export function addToTop(state: SheetState, massKgM2: number, enthalpyJM2: number): void {
  const top = state.massKgM2[0]
  if (top === undefined) {
    if (state.belowKgM2 > 0) return mixIntoOpenWater(state, massKgM2, enthalpyJM2)
    state.massKgM2.push(massKgM2)
    state.enthalpyJM2.push(enthalpyJM2)
    return
  }
  const isIce = state.enthalpyJM2[0]! <= -FUSION_J_PER_KG * top
  if (isIce && massKgM2 >= OWN_CELL_KG) {
    state.massKgM2.unshift(massKgM2)
    state.enthalpyJM2.unshift(enthalpyJM2)
    return
  }
  state.massKgM2[0] = top + massKgM2
  state.enthalpyJM2[0]! += enthalpyJM2
}

function isSwallowed(state: SheetState): boolean {
  if (state.massKgM2.length === 0) return state.belowKgM2 > 0
  const mass = state.massKgM2[0]!
  return mass + state.enthalpyJM2[0]! / FUSION_J_PER_KG > SWALLOWS_KG
}

/** Snow in open water melts while the water has warmth to give; beyond that it floats as the first ice. */
function mixIntoOpenWater(state: SheetState, massKgM2: number, enthalpyJM2: number): void {
  const total = state.belowKgM2 * WATER_HEAT_CAPACITY * state.belowTemperatureC + enthalpyJM2
  if (total >= 0) {
    state.belowKgM2 += massKgM2
    state.belowTemperatureC = total / (state.belowKgM2 * WATER_HEAT_CAPACITY)
    return
  }
  const iceKg = Math.min(state.belowKgM2 + massKgM2, -total / FUSION_J_PER_KG)
  state.belowKgM2 += massKgM2 - iceKg
  state.belowTemperatureC = 0
  state.massKgM2.push(iceKg)
  state.enthalpyJM2.push(total)
}
