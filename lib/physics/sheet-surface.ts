// The top of the sheet: what it is made of, what it loses, and how sunshine is shared out inside.
import {
  FUSION_J_PER_KG,
  ICE_CONDUCTIVITY,
  ICE_DENSITY,
  SUBLIMATION_J_PER_KG,
  VAPORISATION_J_PER_KG,
  WATER_HEAT_CAPACITY,
} from './constants'
import { addToTop } from './sheet-fall'
import { cellLiquidKgM2, cellTemperatureC, faceResistance } from './column'
import { NO_SUNSHINE, shareSunshine, type SharedSunshine } from './sunshine-in-ice'
import { snowConductivity } from './snow'
import { surfaceLaw, wetLaw, type SurfaceLaw } from './balance'
import type { PreparedHour } from './types'
import type { SheetState } from './sheet-state'
import type { SurfaceKind } from './albedo'

/** The top boundary of one step. The column loses `lossAt0Wm2 + lossSlopeWm2K · T` of its top cell. */
export interface ClosedSurface {
  kind: SurfaceKind
  lossAt0Wm2: number
  lossSlopeWm2K: number
  latentWm2: number
  /** Between the surface and the middle of the top cell. [m² K/W] */
  resistance: number
  sun: SharedSunshine
  /** Held at 0 °C by melting. */
  isMelting: boolean
  /** What melting snow gains from above, 0 otherwise. [W/m²] */
  snowGainWm2: number
}

/** Snow too thin to count as cover. [kg/m²] */
const TRACE_OF_SNOW_KG = 0.1
/** No surface law is drawn below this. [°C] Ours; colder than any rink. */
const COLDEST_SURFACE_C = -75
/** A film of water in the sun gets no warmer. [°C] Ours, against runaway steps. */
const WARMEST_FILM_C = 60
/** The law is drawn anew when the surface turns out further than this from where it was drawn. [K] */
const REDRAW_K = 1

/**
 * Closes the balance of the surface for the coming step.
 *
 * @param state Sheet.
 * @param hour Prepared hour, known.
 * @param seconds Length of the step. [s], above 0
 * @returns What it is, and its loss [W/m²] as a straight line of the top cell's temperature.
 *
 * Source: surfaceLaw through the resistances above the top cell.
 */
export function closeSurface(state: SheetState, hour: PreparedHour, seconds: number): ClosedSurface {
  const mass = state.massKgM2[0]!
  const enthalpy = state.enthalpyJM2[0]!
  const topC = cellTemperatureC(mass, enthalpy)
  if (state.snowKgM2 > TRACE_OF_SNOW_KG) {
    return frozenSurface(state, hour, 'snow', topC, snowResistance(state) + faceResistance(mass, enthalpy), seconds)
  }
  const liquid = cellLiquidKgM2(mass, enthalpy)
  if (liquid <= 0) return frozenSurface(state, hour, 'ice', topC, faceResistance(mass, enthalpy), seconds)
  if (liquid >= mass)
    return passedThrough('wet', warmWaterLaw(hour, 'wet', topC, (mass * WATER_HEAT_CAPACITY) / seconds), NO_SUNSHINE, 0)
  const law = wetLaw(hour)
  // What is frozen of a wet cell that loses heat is its skin; while it melts, the water is on top.
  const skin = law.netWm2 > 0 ? (mass - liquid) / ICE_DENSITY / ICE_CONDUCTIVITY : 0
  return passedThrough('wet', law, NO_SUNSHINE, skin)
}

/**
 * Sets the surface temperature once the step is known and melts snow.
 *
 * @param state Sheet; changed in place.
 * @param hour Prepared hour, known.
 * @param surface From closeSurface.
 * @param topC Top cell at the end of the step. [°C]
 * @param seconds Length of the step. [s], above 0
 * @returns Enthalpy besides the column's flows. [J/m²]
 *
 * Source: balance of heat at the surface.
 */
export function finishSurface(
  state: SheetState,
  hour: PreparedHour,
  surface: ClosedSurface,
  topC: number,
  seconds: number,
): number {
  if (!surface.isMelting) {
    const lossWm2 = surface.lossAt0Wm2 + surface.lossSlopeWm2K * topC
    state.surfaceTemperatureC = topC - lossWm2 * surface.resistance
    return 0
  }
  state.surfaceTemperatureC = 0
  // Measured snow says itself what has melted; how much of it went into the ice is not known, so none is added.
  if (surface.kind !== 'snow' || hour.snowOnIceCm !== null) return 0
  return meltSnow(state, Math.max(0, surface.snowGainWm2 + topC / surface.resistance) * seconds)
}

/**
 * Mass that goes off as vapour, or comes as frost (negative).
 *
 * @param surface From closeSurface.
 * @param seconds Length of the step. [s], above 0
 * @returns Mass. [kg/m²]
 *
 * Source: latent flux over the latent heat.
 */
export function vapourLossKgM2(surface: ClosedSurface, seconds: number): number {
  const heat = surface.kind === 'wet' ? VAPORISATION_J_PER_KG : SUBLIMATION_J_PER_KG
  return (surface.latentWm2 * seconds) / heat
}

/**
 * The law of a film of water, drawn where the step will end: a thin film warms or cools fast within it.
 *
 * @param hour Prepared hour, known.
 * @param kind Film on ice or open water.
 * @param waterC Water at the start. [°C], 0 or more
 * @param capacityWm2K Heat capacity of the film over the step. [W m⁻² K⁻¹], above 0
 * @returns Balance [W/m²] and slope [W m⁻² K⁻¹].
 *
 * Source: surfaceLaw, iterated; ours.
 */
export function warmWaterLaw(
  hour: PreparedHour,
  kind: 'wet' | 'water',
  waterC: number,
  capacityWm2K: number,
): SurfaceLaw {
  let law = surfaceLaw(hour, kind, Math.min(WARMEST_FILM_C, waterC))
  for (let round = 0; round < 4; round++) {
    const endsC = waterC - (law.netWm2 + law.slopeWm2K * (waterC - law.aroundC)) / (capacityWm2K + law.slopeWm2K)
    const towardsC = Math.min(WARMEST_FILM_C, Math.max(0, (endsC + law.aroundC) / 2))
    if (Math.abs(towardsC - law.aroundC) < REDRAW_K) break
    law = surfaceLaw(hour, kind, towardsC)
  }
  return law
}

function frozenSurface(
  state: SheetState,
  hour: PreparedHour,
  kind: 'ice' | 'snow',
  topC: number,
  resistance: number,
  seconds: number,
): ClosedSurface {
  let law = surfaceLaw(hour, kind, Math.max(COLDEST_SURFACE_C, Math.min(0, state.surfaceTemperatureC)))
  let sun = kind === 'ice' ? shareSunshine(state, law.parts.shortwave) : NO_SUNSHINE
  let surfaceC = surfaceTemperature(law, sun, topC, resistance)
  if (Math.abs(surfaceC - law.aroundC) > REDRAW_K) {
    law = surfaceLaw(hour, kind, Math.max(COLDEST_SURFACE_C, Math.min(0, surfaceC)))
    if (kind === 'ice') sun = shareSunshine(state, law.parts.shortwave)
    surfaceC = surfaceTemperature(law, sun, topC, resistance)
  }
  if (surfaceC <= 0) return passedThrough(kind, law, sun, resistance)
  if (kind === 'snow') return meltingSnow(law, resistance)
  const meltsAll = -lossAt0(law, sun) * seconds > FUSION_J_PER_KG * state.massKgM2[0]!
  return meltingIce(law, sun, meltsAll ? law.slopeWm2K : 0)
}

/**
 * A surface that passes its loss on to the top cell through a resistance.
 *
 * @param kind What the surface is.
 * @param law Its law.
 * @param sun Sunshine shared out below it. [W/m²]
 * @param resistance Between surface and top cell. [m² K/W], 0 or more
 * @returns Surface as the top cell sees it. [W/m²]
 *
 * Source: resistances in series.
 */
export function passedThrough(
  kind: SurfaceKind,
  law: SurfaceLaw,
  sun: SharedSunshine,
  resistance: number,
): ClosedSurface {
  const damp = 1 / (1 + law.slopeWm2K * resistance)
  return {
    kind,
    lossAt0Wm2: lossAt0(law, sun) * damp,
    lossSlopeWm2K: law.slopeWm2K * damp,
    latentWm2: law.parts.latent,
    resistance,
    sun,
    isMelting: false,
    snowGainWm2: 0,
  }
}

/** Melting ice loses what it does at 0 °C. Where the whole cell may melt and warm up within the step, the slope keeps it in bounds. */
function meltingIce(law: SurfaceLaw, sun: SharedSunshine, slopeWm2K: number): ClosedSurface {
  return {
    kind: 'ice',
    lossAt0Wm2: lossAt0(law, sun),
    lossSlopeWm2K: slopeWm2K,
    latentWm2: law.parts.latent,
    resistance: 0,
    sun,
    isMelting: true,
    snowGainWm2: 0,
  }
}

function meltingSnow(law: SurfaceLaw, resistance: number): ClosedSurface {
  return {
    kind: 'snow',
    lossAt0Wm2: 0,
    lossSlopeWm2K: 1 / resistance,
    latentWm2: law.parts.latent,
    resistance,
    sun: NO_SUNSHINE,
    isMelting: true,
    snowGainWm2: -lossAt0(law, NO_SUNSHINE),
  }
}

/** The water of melting snow goes to the top cell, which may freeze it again. */
function meltSnow(state: SheetState, offeredJM2: number): number {
  const spareJM2 = Math.min(offeredJM2, heatToMeltAllJM2(state))
  const meltKg = Math.min(state.snowKgM2, spareJM2 / FUSION_J_PER_KG)
  const left = state.snowKgM2 - meltKg
  state.snowDepthCm *= left / state.snowKgM2
  state.snowKgM2 = left
  addToTop(state, meltKg, spareJM2 - meltKg * FUSION_J_PER_KG)
  if (left === 0) passWarmthDown(state)
  return spareJM2
}

/** A sheet of water at 0 °C takes no more in the rest of the step: it would warm and give it back. */
function heatToMeltAllJM2(state: SheetState): number {
  return state.enthalpyJM2.reduce((sum, one) => sum + Math.max(0, -one), state.snowKgM2 * FUSION_J_PER_KG)
}

/** Heat left when the last snow is gone melts the ice below it rather than boil a film of melt water. */
function passWarmthDown(state: SheetState): void {
  for (let i = 0; i + 1 < state.massKgM2.length && state.enthalpyJM2[i]! > 0; i++) {
    const next = state.enthalpyJM2[i + 1]!
    const passed = Math.min(state.enthalpyJM2[i]!, Math.max(0, -next))
    state.enthalpyJM2[i]! -= passed
    state.enthalpyJM2[i + 1]! = next + passed
    if (passed === 0) return
  }
}

function snowResistance(state: SheetState): number {
  const depthM = state.snowDepthCm / 100
  const density = Math.min(500, Math.max(30, state.snowKgM2 / Math.max(1e-4, depthM)))
  return depthM / snowConductivity(density)
}

function lossAt0(law: SurfaceLaw, sun: SharedSunshine): number {
  return law.netWm2 + sun.sharedWm2 - law.slopeWm2K * law.aroundC
}

/** Where conduction from the top cell meets the law of the surface. [°C] */
function surfaceTemperature(law: SurfaceLaw, sun: SharedSunshine, topC: number, resistance: number): number {
  const lossWm2 = (lossAt0(law, sun) + law.slopeWm2K * topC) / (1 + law.slopeWm2K * resistance)
  return topC - lossWm2 * resistance
}
