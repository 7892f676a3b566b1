// The sheet: made, carried through an hour of weather, poured on, cleared, reported.
import { cellLiquidKgM2, cellTemperatureC } from './column'
import { cellThicknesses, tidyCells } from './grid'
import { FUSION_J_PER_KG, ICE_DENSITY, ICE_HEAT_CAPACITY, WATER_HEAT_CAPACITY } from './constants'
import { inRange } from './check'
import { SETTLED_SNOW_DENSITY } from './snow'
import { runHour } from './sheet-hour'
import type { SheetState } from './sheet-state'
import type { Base, PreparedHour } from './types'

export type { SheetState } from './sheet-state'

export interface NewSheet {
  /** Ice. [mm], 0 to 3000 */
  thicknessMm: number
  /** Mean of the ice. [°C], -50 to 0 (above 0 counts as 0) */
  temperatureC: number
  /** Lying on it. [cm], 0 to 300 */
  snowCoverCm: number
  /** Water standing on it. [mm], 0 to 1000 */
  liquidMm?: number
  /** Unfrozen water under it. [mm], 0 to 1e6 */
  unfrozenBelowMm?: number
  /** Of that water. [°C], 0 to 40 */
  waterTemperatureC?: number
  base: Base
}

/**
 * Makes a sheet from what a keeper knows of it. Ice on the ground has one temperature; ice on water is 0 °C at its
 * foot and twice as cold at its top as in the mean.
 *
 * @param sheet What is known; ranges at the fields.
 * @returns State to carry forward; masses [kg/m²] and enthalpies [J/m²] per cell.
 * @throws RangeError for a value out of range.
 *
 * Source: mean of a straight profile; ours.
 */
export function createSheet(sheet: NewSheet): SheetState {
  const thicknessM = inRange('thicknessMm [mm]', sheet.thicknessMm, 0, 3000) / 1000
  const meanC = Math.min(0, inRange('temperatureC [°C]', sheet.temperatureC, -50, 50))
  const snowDepthCm = inRange('snowCoverCm [cm]', sheet.snowCoverCm, 0, 300)
  const liquidMm = inRange('liquidMm [mm]', sheet.liquidMm ?? 0, 0, 1000)
  const belowKgM2 = inRange('unfrozenBelowMm [mm]', sheet.unfrozenBelowMm ?? 0, 0, 1e6)
  const belowTemperatureC = inRange('waterTemperatureC [°C]', sheet.waterTemperatureC ?? 0, 0, 40)
  const massKgM2: number[] = []
  const enthalpyJM2: number[] = []
  let depth = 0
  for (const cellM of cellThicknesses(thicknessM)) {
    const share = (depth + cellM / 2) / thicknessM
    const temperatureC = belowKgM2 > 0 ? 2 * meanC * (1 - share) : meanC
    massKgM2.push(cellM * ICE_DENSITY)
    enthalpyJM2.push(cellM * ICE_DENSITY * (ICE_HEAT_CAPACITY * temperatureC - FUSION_J_PER_KG))
    depth += cellM
  }
  if (liquidMm > 0) {
    massKgM2.unshift(liquidMm)
    enthalpyJM2.unshift(0)
  }
  return {
    base: sheet.base,
    massKgM2,
    enthalpyJM2,
    snowKgM2: (snowDepthCm / 100) * SETTLED_SNOW_DENSITY,
    snowDepthCm,
    belowKgM2,
    belowTemperatureC,
    surfaceTemperatureC: massKgM2.length > 0 ? meanC : belowTemperatureC,
  }
}

/**
 * Carries a sheet through one hour of weather.
 *
 * @param state Sheet at the start of the hour.
 * @param hour Prepared hour; an unknown one leaves the sheet as it is.
 * @returns Sheet at the end of the hour; the state given is not changed.
 *
 * Source: runHour.
 */
export function advanceSheet(state: SheetState, hour: PreparedHour): SheetState {
  return hour.isKnown ? runHour(state, hour).state : state
}

/**
 * Carries a sheet through part of an hour of weather, to the minute at which something is poured on it.
 *
 * @param state Sheet at the start of the part.
 * @param hour Prepared hour; an unknown one leaves the sheet as it is.
 * @param share Of the hour, 0 to 1; 0 leaves the sheet as it is.
 * @returns Sheet at the end of the part; the state given is not changed.
 * @throws RangeError for a share out of range.
 *
 * Source: runHour.
 */
export function advanceSheetPart(state: SheetState, hour: PreparedHour, share: number): SheetState {
  inRange('share [0-1]', share, 0, 1)
  return hour.isKnown && share > 0 ? runHour(state, hour, share).state : state
}

/**
 * Pours a layer. Snow still lying is soaked and becomes part of it.
 *
 * @param state Sheet before.
 * @param layer Depth [mm], above 0 to 500, and water temperature [°C], 0 to 100.
 * @returns Sheet after, the water on top.
 * @throws RangeError for a value out of range.
 *
 * Source: balance of mass and heat.
 */
export function pourLayer(state: SheetState, layer: { layerMm: number; temperatureC: number }): SheetState {
  const layerKgM2 = inRange('layerMm [mm]', layer.layerMm, 0, 500)
  const warmth = layerKgM2 * WATER_HEAT_CAPACITY * inRange('temperatureC [°C]', layer.temperatureC, 0, 100)
  const column = {
    massKgM2: [layerKgM2 + state.snowKgM2, ...state.massKgM2],
    enthalpyJM2: [warmth - FUSION_J_PER_KG * state.snowKgM2, ...state.enthalpyJM2],
  }
  tidyCells(column)
  return { ...state, ...column, snowKgM2: 0, snowDepthCm: 0, surfaceTemperatureC: 0 }
}

/**
 * Clears the snow off.
 *
 * @param state Sheet; not changed.
 * @returns The same sheet without snow.
 *
 * Source: ours; clearing is taken as complete.
 */
export function clearSnow(state: SheetState): SheetState {
  return { ...state, snowKgM2: 0, snowDepthCm: 0 }
}

/**
 * What a keeper would measure.
 *
 * @param state Sheet.
 * @returns Ice [mm], mean temperature of the ice [°C], water on or in the sheet (not what ground heat melts under it)
 *   [mm], snow [cm].
 *
 * Source: definition of enthalpy; densities of ice and water.
 */
export function reportSheet(state: SheetState): {
  thicknessMm: number
  temperatureC: number
  liquidMm: number
  snowCoverCm: number
} {
  let iceKgM2 = 0
  let liquidMm = 0
  let coldKKgM2 = 0
  for (let i = 0; i < state.massKgM2.length; i++) {
    const mass = state.massKgM2[i]!
    const liquid = cellLiquidKgM2(mass, state.enthalpyJM2[i]!)
    if (!isFootFilm(state, i)) liquidMm += liquid
    iceKgM2 += mass - liquid
    coldKKgM2 += (mass - liquid) * cellTemperatureC(mass, state.enthalpyJM2[i]!)
  }
  return {
    thicknessMm: (iceKgM2 / ICE_DENSITY) * 1000,
    temperatureC: iceKgM2 > 0 ? coldKKgM2 / iceKgM2 : 0,
    liquidMm,
    snowCoverCm: state.snowDepthCm,
  }
}

/** What ground heat has melted under frozen ice: it is under the sheet, and no layer waits for it. */
function isFootFilm(state: SheetState, cell: number): boolean {
  if (cell === 0 || cell !== state.massKgM2.length - 1) return false
  return cellLiquidKgM2(state.massKgM2[cell - 1]!, state.enthalpyJM2[cell - 1]!) === 0
}
