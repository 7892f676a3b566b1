// The top of the sheet: what it is made of, what it loses, and how sunshine is shared out inside.
import {
  FUSION_J_PER_KG,
  ICE_CONDUCTIVITY,
  ICE_DENSITY,
  SUBLIMATION_J_PER_KG,
  VAPORISATION_J_PER_KG,
} from './constants'
import { cellLiquidKgM2, cellTemperatureC, faceResistance } from './column'
import { snowConductivity } from './snow'
import { surfaceLaw, type SurfaceLaw } from './balance'
import { addToTop } from './sheet-fall'
import { shareSunshine } from './sunshine-in-ice'
import type { PreparedHour } from './types'
import type { SheetState } from './sheet-state'
import type { SurfaceKind } from './albedo'

/** The top boundary of one step, and what is left to do once the step is known. */
export interface ClosedSurface {
  lossAt0Wm2: number
  lossSlopeWm2K: number
  /** Sunshine absorbed in cells, in all cells together, and what comes out at the foot. [W/m²] */
  absorbedWm2: Float64Array | null
  insideWm2: number
  throughWm2: number
  latentWm2: number
  kind: SurfaceKind
  /** Sets the surface temperature, melts snow; returns enthalpy that came in besides the column's flows. [J/m²] */
  finish(state: SheetState, topCellC: number, seconds: number): number
}

/** Snow too thin to count as cover. [kg/m²] */
const TRACE_OF_SNOW_KG = 0.1

/** Closes the balance of the surface for the coming step. */
export function closeSurface(state: SheetState, hour: PreparedHour): ClosedSurface {
  const mass = state.massKgM2[0]!
  const enthalpy = state.enthalpyJM2[0]!
  const topC = cellTemperatureC(mass, enthalpy)
  if (state.snowKgM2 > TRACE_OF_SNOW_KG) return underSnow(state, hour, mass, enthalpy)
  if (topC > 0) return openTop(surfaceLaw(hour, 'wet', topC), 'wet', 0)
  const liquid = cellLiquidKgM2(mass, enthalpy)
  if (liquid > 0) {
    const law = surfaceLaw(hour, 'wet', 0)
    const skin = law.netWm2 > 0 ? (mass - liquid) / ICE_DENSITY / ICE_CONDUCTIVITY : 0
    return openTop(law, 'wet', skin)
  }
  return bareIce(state, hour, mass, enthalpy, topC)
}

function bareIce(state: SheetState, hour: PreparedHour, mass: number, enthalpy: number, topC: number): ClosedSurface {
  const resistance = faceResistance(mass, enthalpy)
  let law = surfaceLaw(hour, 'ice', Math.min(0, state.surfaceTemperatureC))
  let sun = shareSunshine(state, law.parts.shortwave)
  let surfaceC = surfaceTemperature(law, sun.sharedWm2, topC, resistance)
  if (Math.abs(surfaceC - law.aroundC) > 1) {
    law = surfaceLaw(hour, 'ice', Math.min(0, surfaceC))
    sun = shareSunshine(state, law.parts.shortwave)
    surfaceC = surfaceTemperature(law, sun.sharedWm2, topC, resistance)
  }
  const closed = openTop(law, 'ice', surfaceC > 0 ? 0 : resistance)
  const damp = surfaceC > 0 ? 1 : 1 / (1 + law.slopeWm2K * resistance)
  return {
    ...closed,
    lossAt0Wm2: closed.lossAt0Wm2 + sun.sharedWm2 * damp,
    lossSlopeWm2K: surfaceC > 0 ? 0 : closed.lossSlopeWm2K,
    absorbedWm2: sun.absorbedWm2,
    insideWm2: sun.sharedWm2 - sun.throughWm2,
    throughWm2: sun.throughWm2,
    finish(after, topCellC) {
      after.surfaceTemperatureC = Math.min(0, surfaceTemperature(law, sun.sharedWm2, topCellC, resistance))
      return 0
    },
  }
}

/** A surface that passes its loss on to the top cell through a resistance. */
function openTop(law: SurfaceLaw, kind: SurfaceKind, resistance: number): ClosedSurface {
  const damp = 1 / (1 + law.slopeWm2K * resistance)
  const lossAt0 = law.netWm2 - law.slopeWm2K * law.aroundC
  return {
    lossAt0Wm2: lossAt0 * damp,
    lossSlopeWm2K: law.slopeWm2K * damp,
    absorbedWm2: null,
    insideWm2: 0,
    throughWm2: 0,
    latentWm2: law.parts.latent,
    kind,
    finish(after, topCellC) {
      const lossWm2 = (lossAt0 + law.slopeWm2K * topCellC) * damp
      after.surfaceTemperatureC = topCellC - lossWm2 * resistance
      return 0
    },
  }
}

function underSnow(state: SheetState, hour: PreparedHour, mass: number, enthalpy: number): ClosedSurface {
  const topC = cellTemperatureC(mass, enthalpy)
  const density = Math.min(500, Math.max(30, state.snowKgM2 / Math.max(1e-4, state.snowDepthCm / 100)))
  const resistance = state.snowDepthCm / 100 / snowConductivity(density) + faceResistance(mass, enthalpy)
  let law = surfaceLaw(hour, 'snow', Math.min(0, state.surfaceTemperatureC))
  let surfaceC = surfaceTemperature(law, 0, topC, resistance)
  if (Math.abs(surfaceC - law.aroundC) > 1) {
    law = surfaceLaw(hour, 'snow', Math.min(0, surfaceC))
    surfaceC = surfaceTemperature(law, 0, topC, resistance)
  }
  if (surfaceC <= 0) return openTop(law, 'snow', resistance)
  const gainWm2 = -(law.netWm2 - law.slopeWm2K * law.aroundC)
  return {
    ...openTop(law, 'snow', resistance),
    lossAt0Wm2: 0,
    lossSlopeWm2K: 1 / resistance,
    finish: (after, topCellC, seconds) =>
      hour.snowOnIceCm === null ? meltSnow(after, gainWm2 + topCellC / resistance, seconds) : keepSnow(after),
  }
}

/** Melts snow with what the surface gains beyond what it passes down; the water goes to the top cell, which may freeze it. */
function meltSnow(state: SheetState, spareWm2: number, seconds: number): number {
  state.surfaceTemperatureC = 0
  const spareJM2 = Math.max(0, spareWm2) * seconds
  const meltKg = Math.min(state.snowKgM2, spareJM2 / FUSION_J_PER_KG)
  const left = state.snowKgM2 - meltKg
  state.snowDepthCm *= left / state.snowKgM2
  state.snowKgM2 = left
  addToTop(state, meltKg, spareJM2 - meltKg * FUSION_J_PER_KG)
  return spareJM2
}

/** Measured snow says itself what has melted; how much of it went into the ice is not known, so none is added. */
function keepSnow(state: SheetState): number {
  state.surfaceTemperatureC = 0
  return 0
}

/** Where conduction from the top cell meets the law of the surface. [°C] */
function surfaceTemperature(law: SurfaceLaw, sharedWm2: number, topC: number, resistance: number): number {
  const lossAt0 = law.netWm2 + sharedWm2 - law.slopeWm2K * law.aroundC
  return topC - ((lossAt0 + law.slopeWm2K * topC) / (1 + law.slopeWm2K * resistance)) * resistance
}

/** Mass that goes off as vapour, or comes as frost (negative). [kg/m²] */
export function surfaceMassLossKgM2(surface: ClosedSurface, seconds: number): number {
  const heat = surface.kind === 'ice' || surface.kind === 'snow' ? SUBLIMATION_J_PER_KG : VAPORISATION_J_PER_KG
  return (surface.latentWm2 * seconds) / heat
}
