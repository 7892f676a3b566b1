// One hour in the life of a sheet: what falls on it, what it loses, what it gains from below.
import { FUSION_J_PER_KG, HOUR_SECONDS, ICE_DENSITY, ICE_HEAT_CAPACITY, WATER_HEAT_CAPACITY } from './constants'
import { cellThicknessM, stepColumn } from './column'
import { groundHeatWm2, waterToIceWm2 } from './ground'
import { closeSurface, surfaceMassLossKgM2 } from './sheet-surface'
import { fallOnSheet, setMeasuredSnow } from './sheet-fall'
import { freezeOpenWater, growThinIce, isThinIce } from './thin-ice'
import { settledDepthCm } from './snow'
import { tidyCells } from './grid'
import type { PreparedHour } from './types'
import type { SheetState } from './sheet-state'

export interface HourResult {
  state: SheetState
  /** Enthalpy that came in less what went out, by the flows. [J/m²] */
  receivedJM2: number
}

/** Carries a sheet through a known hour and accounts for every joule. */
export function runHour(before: SheetState, hour: PreparedHour): HourResult {
  const state: SheetState = {
    ...before,
    massKgM2: before.massKgM2.slice(),
    enthalpyJM2: before.enthalpyJM2.slice(),
  }
  let receivedJM2 = setMeasuredSnow(state, hour) + fallOnSheet(state, hour)
  const steps = stepsPerHour(state)
  for (let i = 0; i < steps; i++) receivedJM2 += advance(state, hour, HOUR_SECONDS / steps)
  tidyCells(state)
  state.snowDepthCm = settledDepthCm(state.snowDepthCm, state.snowKgM2)
  return { state, receivedJM2 }
}

function advance(state: SheetState, hour: PreparedHour, seconds: number): number {
  if (state.massKgM2.length === 0) return state.belowKgM2 > 0 ? freezeOpenWater(state, hour, seconds) : 0
  if (isThinIce(state)) return growThinIce(state, hour, seconds)
  const surface = closeSurface(state, hour)
  const isFloating = state.belowKgM2 > 0
  const flows = stepColumn(state, {
    seconds,
    lossAt0Wm2: surface.lossAt0Wm2,
    lossSlopeWm2K: surface.lossSlopeWm2K,
    isBottomAtZero: isFloating,
    bottomGainWm2: groundHeatWm2(state.base) + (isFloating ? 0 : surface.throughWm2),
    absorbedWm2: surface.absorbedWm2,
  })
  const last = state.massKgM2.length - 1
  const insideWm2 = surface.insideWm2
  let receivedJM2 = (groundHeatWm2(state.base) + surface.throughWm2 + insideWm2) * seconds - flows.topLossJM2
  if (isFloating) exchangeWithBelow(state, last, flows.bottomGainJM2, surface.throughWm2, seconds)
  receivedJM2 += surface.finish(state, flows.topCellC, seconds)
  receivedJM2 += loseVapour(state, surfaceMassLossKgM2(surface, seconds))
  return receivedJM2
}

/** Ice at the foot grows by what conduction takes up beyond what the water gives, or melts. */
function exchangeWithBelow(
  state: SheetState,
  last: number,
  gainJM2: number,
  throughWm2: number,
  seconds: number,
): void {
  const fromWaterJM2 = Math.min(
    waterToIceWm2(state.belowTemperatureC, state.belowKgM2) * seconds,
    state.belowKgM2 * WATER_HEAT_CAPACITY * state.belowTemperatureC,
  )
  const wantedKg = (gainJM2 - fromWaterJM2) / FUSION_J_PER_KG
  const mostMelt = Math.max(0, state.massKgM2[last]! * 0.9)
  const frozenKg = Math.min(state.belowKgM2, Math.max(-mostMelt, wantedKg))
  const givenJM2 = frozenKg * FUSION_J_PER_KG + fromWaterJM2
  state.enthalpyJM2[last]! += givenJM2 - gainJM2 - FUSION_J_PER_KG * frozenKg
  state.massKgM2[last]! += frozenKg
  const heatJM2 =
    state.belowKgM2 * WATER_HEAT_CAPACITY * state.belowTemperatureC -
    fromWaterJM2 +
    (groundHeatWm2(state.base) + throughWm2) * seconds
  state.belowKgM2 -= frozenKg
  warmBelow(state, last, heatJM2)
}

function warmBelow(state: SheetState, last: number, heatJM2: number): void {
  if (state.belowKgM2 > 1e-3) {
    state.belowTemperatureC = heatJM2 / (state.belowKgM2 * WATER_HEAT_CAPACITY)
    return
  }
  state.massKgM2[last]! += state.belowKgM2
  state.enthalpyJM2[last]! += heatJM2
  state.belowKgM2 = 0
  state.belowTemperatureC = 0
}

/** Mass that leaves as vapour (or comes as frost) carries the enthalpy of what it leaves. */
function loseVapour(state: SheetState, lossKgM2: number): number {
  if (state.snowKgM2 > 0) {
    const fromSnow = Math.min(state.snowKgM2, lossKgM2)
    if (state.snowKgM2 > 1e-9) state.snowDepthCm *= (state.snowKgM2 - fromSnow) / state.snowKgM2
    state.snowKgM2 -= fromSnow
    return fromSnow * FUSION_J_PER_KG
  }
  const mass = state.massKgM2[0]!
  const taken = Math.min(mass * 0.9, lossKgM2)
  const isWet = state.enthalpyJM2[0]! > -FUSION_J_PER_KG * mass
  const carried = isWet ? 0 : taken * (state.enthalpyJM2[0]! / mass)
  state.massKgM2[0]! -= taken
  state.enthalpyJM2[0]! -= carried
  return -carried
}

/** Short steps while water freezes at the top or young ice grows; an implicit hour is enough for a sheet that only breathes. */
function stepsPerHour(state: SheetState): number {
  if (state.massKgM2.length === 0) return 4
  const isWet = state.enthalpyJM2[0]! > -FUSION_J_PER_KG * state.massKgM2[0]!
  if (isWet) return 4
  let thicknessM = 0
  for (let i = 0; i < state.massKgM2.length; i++)
    thicknessM += cellThicknessM(state.massKgM2[i]!, state.enthalpyJM2[i]!)
  return state.belowKgM2 > 0 && thicknessM < 0.05 ? 4 : 1
}

/** Enthalpy of ice. [J/kg] */
export function iceEnthalpyJKg(temperatureC: number): number {
  return ICE_HEAT_CAPACITY * temperatureC - FUSION_J_PER_KG
}

/** Thickness of a mass of ice. [m] */
export function iceThicknessM(massKgM2: number): number {
  return massKgM2 / ICE_DENSITY
}
