// One hour in the life of a sheet: what falls on it, what it loses, what it gains from below.
import { FUSION_J_PER_KG, HOUR_SECONDS, WATER_HEAT_CAPACITY } from './constants'
import { cellTemperatureC, cellLiquidKgM2, cellThicknessM, stepColumn } from './column'
import { groundHeatWm2, waterToIceWm2 } from './ground'
import { closeSurface, finishSurface, vapourLossKgM2, warmWaterLaw, type ClosedSurface } from './sheet-surface'
import { fallOnSheet, setMeasuredSnow, sinkSnow } from './sheet-fall'
import { freezeOpenWater, growThinIce, isThinIce, type LinearLoss } from './thin-ice'
import { wetLaw } from './balance'
import { settledDepthCm } from './snow'
import { tidyCells } from './grid'
import type { PreparedHour } from './types'
import type { SheetState } from './sheet-state'

/** [kg/m²] */
const DUST_KG = 0.02

export interface HourResult {
  state: SheetState
  /** Enthalpy that came in less what went out, by the flows. [J/m²] */
  receivedJM2: number
}

/**
 * Carries a sheet through a known hour, or through a share of one, and accounts for every joule.
 *
 * @param before Sheet at the start; not changed.
 * @param hour Prepared hour, known.
 * @param share Of the hour. [0-1], above 0
 * @returns Sheet at the end, and the enthalpy that came and went. [J/m²]
 *
 * Source: balance of heat; the parts are in the files it calls.
 */
export function runHour(before: SheetState, hour: PreparedHour, share = 1): HourResult {
  // Written out: a spread costs more than the physics of a quiet hour.
  const state: SheetState = {
    base: before.base,
    massKgM2: before.massKgM2.slice(),
    enthalpyJM2: before.enthalpyJM2.slice(),
    snowKgM2: before.snowKgM2,
    snowDepthCm: before.snowDepthCm,
    belowKgM2: before.belowKgM2,
    belowTemperatureC: before.belowTemperatureC,
    surfaceTemperatureC: before.surfaceTemperatureC,
  }
  let receivedJM2 = setMeasuredSnow(state, hour) + fallOnSheet(state, share === 1 ? hour : fallsIn(hour, share))
  sinkSnow(state)
  const steps = stepsPerHour(state)
  for (let i = 0; i < steps; i++) receivedJM2 += advance(state, hour, (share * HOUR_SECONDS) / steps)
  tidyCells(state)
  state.snowDepthCm = settledDepthCm(state.snowDepthCm, state.snowKgM2)
  return { state, receivedJM2 }
}

function fallsIn(hour: PreparedHour, share: number): PreparedHour {
  return {
    ...hour,
    precipitationMm: hour.precipitationMm * share,
    rainMm: hour.rainMm * share,
    snowfallCm: hour.snowfallCm * share,
  }
}

function advance(state: SheetState, hour: PreparedHour, seconds: number): number {
  const groundWm2 = groundHeatWm2(state.base)
  if (state.belowKgM2 > 0) sinkMeltedFoot(state)
  if (state.massKgM2.length === 0) {
    if (state.belowKgM2 <= 0) return 0
    return freezeOpenWater(state, openWaterLoss(hour, state, seconds), groundWm2, seconds)
  }
  if (isThinIce(state)) return growThinIce(state, youngIceLoss(hour), groundWm2, seconds)
  const surface = closeSurface(state, hour, seconds)
  const conducted = conductThrough(state, surface, groundWm2, seconds)
  const topC = cellTemperatureC(state.massKgM2[0]!, state.enthalpyJM2[0]!)
  return (
    conducted + finishSurface(state, hour, surface, topC, seconds) + loseVapour(state, vapourLossKgM2(surface, seconds))
  )
}

/** A foot that has melted through is water below like the rest. */
function sinkMeltedFoot(state: SheetState): void {
  for (let last = state.massKgM2.length - 1; last >= 0 && state.enthalpyJM2[last]! >= 0; last--) {
    const heatJM2 = state.belowKgM2 * WATER_HEAT_CAPACITY * state.belowTemperatureC + state.enthalpyJM2.pop()!
    state.belowKgM2 += state.massKgM2.pop()!
    state.belowTemperatureC = heatJM2 / (state.belowKgM2 * WATER_HEAT_CAPACITY)
  }
}

/**
 * Conducts for a while under a closed surface and lets the foot grow or melt.
 *
 * @param state Sheet; changed in place.
 * @param surface From closeSurface.
 * @param groundWm2 Heat from below. [W/m²]
 * @param seconds Length of the step. [s], above 0
 * @returns Enthalpy received. [J/m²]
 *
 * Source: stepColumn.
 */
export function conductThrough(state: SheetState, surface: ClosedSurface, groundWm2: number, seconds: number): number {
  const { sharedWm2, throughWm2, absorbedWm2 } = surface.sun
  const isFloating = state.belowKgM2 > 0
  const flows = stepColumn(state, {
    seconds,
    lossAt0Wm2: surface.lossAt0Wm2,
    lossSlopeWm2K: surface.lossSlopeWm2K,
    isBottomAtZero: isFloating,
    bottomGainWm2: groundWm2 + throughWm2,
    absorbedWm2,
  })
  if (isFloating) exchangeWithBelow(state, flows.bottomGainJM2, groundWm2 + throughWm2, seconds)
  return (groundWm2 + sharedWm2) * seconds - flows.topLossJM2
}

function openWaterLoss(hour: PreparedHour, state: SheetState, seconds: number): LinearLoss {
  const capacity = (state.belowKgM2 * WATER_HEAT_CAPACITY) / seconds
  const law = warmWaterLaw(hour, 'water', state.belowTemperatureC, capacity)
  return { lossAt0Wm2: law.netWm2 - law.slopeWm2K * law.aroundC, slopeWm2K: law.slopeWm2K }
}

function youngIceLoss(hour: PreparedHour): LinearLoss {
  const law = wetLaw(hour)
  return { lossAt0Wm2: law.netWm2, slopeWm2K: law.slopeWm2K }
}

/** Ice at the foot grows by what conduction takes up beyond what the water gives, or melts. */
function exchangeWithBelow(state: SheetState, takenJM2: number, intoWaterWm2: number, seconds: number): void {
  const last = state.massKgM2.length - 1
  const heatJM2 = state.belowKgM2 * WATER_HEAT_CAPACITY * state.belowTemperatureC
  const fromWaterJM2 = Math.min(waterToIceWm2(state.belowTemperatureC, state.belowKgM2) * seconds, heatJM2)
  const frozenKg = Math.min(
    state.belowKgM2,
    Math.max(-0.9 * state.massKgM2[last]!, (takenJM2 - fromWaterJM2) / FUSION_J_PER_KG),
  )
  // New ice brings its heat of fusion with it; what could not freeze for want of water was not taken either.
  state.enthalpyJM2[last]! += fromWaterJM2 - takenJM2
  state.massKgM2[last]! += frozenKg
  state.belowKgM2 -= frozenKg
  warmBelow(state, last, heatJM2 - fromWaterJM2 + intoWaterWm2 * seconds)
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
  const enthalpy = state.enthalpyJM2[0]!
  const liquid = cellLiquidKgM2(mass, enthalpy)
  const isMixed = liquid > 0 && liquid < mass
  const taken = Math.min(isMixed ? liquid : 0.9 * mass, lossKgM2)
  // Water at 0 °C carries nothing; ice and warm water carry their share.
  const carried = isMixed ? 0 : taken * (enthalpy / mass)
  state.massKgM2[0]! -= taken
  state.enthalpyJM2[0]! -= carried
  return dropDust(state) - carried
}

/** A film too thin to have a temperature of its own joins what it lies on; the last one is gone. Returns enthalpy received. */
function dropDust(state: SheetState): number {
  if (state.massKgM2[0]! > DUST_KG) return 0
  const massKgM2 = state.massKgM2.shift()!
  const enthalpyJM2 = state.enthalpyJM2.shift()!
  if (state.massKgM2.length > 0) {
    state.massKgM2[0]! += massKgM2
    state.enthalpyJM2[0]! += enthalpyJM2
    return 0
  }
  state.surfaceTemperatureC = 0
  return -enthalpyJM2
}

/**
 * Short steps while water freezes at the top or young ice grows; an implicit hour is enough for a sheet that only
 * breathes.
 *
 * @param state Sheet.
 * @returns Steps. [1/h], 4 or 1
 *
 * Source: ours.
 */
export function stepsPerHour(state: SheetState): number {
  if (state.massKgM2.length === 0) return 4
  const isWet = state.enthalpyJM2[0]! > -FUSION_J_PER_KG * state.massKgM2[0]!
  if (isWet) return 4
  let thicknessM = 0
  for (let i = 0; i < state.massKgM2.length; i++)
    thicknessM += cellThicknessM(state.massKgM2[i]!, state.enthalpyJM2[i]!)
  return state.belowKgM2 > 0 && thicknessM < 0.05 ? 4 : 1
}
