// How fast the cold stored in a sheet can freeze water poured on it: the heat equation by its decay modes.
import { cellLiquidKgM2, cellTemperatureC } from './column'
import { FUSION_J_PER_KG, ICE_CONDUCTIVITY, ICE_DENSITY, ICE_HEAT_CAPACITY } from './constants'
import type { SheetState } from './sheet-state'

/** Diffusivity of ice. [m²/s] */
const DIFFUSIVITY = ICE_CONDUCTIVITY / (ICE_DENSITY * ICE_HEAT_CAPACITY)
/** Modes kept; what faster ones hold is given at once, which for 0.1 m of ice means within half a minute. */
const MODES = 8
/** A mode with less than this is done: a thousandth of a millimetre of water. [J/m²] */
const SPENT_JM2 = 300
/** Deeper ice does not reach the surface within a night. [m] */
const DEEPEST_M = 0.5

// Asked for hundreds of thousands of times a run: the arrays are the module's own, and one answer lasts until the next.
const shares = new Float64Array(MODES)
const rates = new Float64Array(MODES)
const cosines = new Float64Array(MODES)

/** Heat the sheet has drawn from a surface held at 0 °C: `atOnce + Σ share · (1 - exp(-rate t))`. */
export interface SheetCold {
  /** All it can draw, and what of that the modes left out hold. [J/m²] */
  totalJM2: number
  atOnceJM2: number
  sharesJM2: Float64Array
  /** [1/s] */
  ratesPerS: Float64Array
  /** Water lying on the sheet already. [kg/m²] */
  liquidKgM2: number
  /** Enthalpy above 0 °C in that water. [J/m²] */
  warmthJM2: number
  /** Constant heat that comes through from below once the sheet is spent. [W/m²] */
  bottomWm2: number
}

/**
 * Splits the cold of a sheet into decay modes.
 *
 * @param state Sheet at the time of pouring.
 * @param bottomWm2 Ground heat into its foot (not for a sheet on water, whose foot is at 0 °C). [W/m²]
 * @returns Modes of the heat it can draw from above [J/m²] and their rates [1/s], good until the next call.
 *
 * Source: heat equation on a slab, Carslaw & Jaeger; face at 0 °C, foot insulated (on the ground) or at 0 °C (on
 * water). The front of new ice that moves up from the sheet slows the draw by the Stefan number; see `slowed`.
 */
export function sheetCold(state: SheetState, bottomWm2: number): SheetCold {
  const { massKgM2: mass, enthalpyJM2: enthalpy } = state
  const isFloating = state.belowKgM2 > 0
  let first = 0
  let liquidKgM2 = 0
  let warmthJM2 = 0
  while (first < mass.length && cellLiquidKgM2(mass[first]!, enthalpy[first]!) > 0) {
    liquidKgM2 += cellLiquidKgM2(mass[first]!, enthalpy[first]!)
    warmthJM2 += Math.max(0, enthalpy[first]!)
    first++
  }
  let heightM = 0
  for (let i = first; i < mass.length && heightM < DEEPEST_M; i++) heightM += mass[i]! / ICE_DENSITY
  const cold: SheetCold = {
    totalJM2: 0,
    atOnceJM2: 0,
    sharesJM2: shares.fill(0),
    ratesPerS: rates.fill(0),
    liquidKgM2,
    warmthJM2,
    bottomWm2: isFloating ? 0 : bottomWm2,
  }
  if (heightM > 0) projectOnModes(cold, state, first, heightM, isFloating)
  return cold
}

function projectOnModes(cold: SheetCold, state: SheetState, first: number, heightM: number, isFloating: boolean): void {
  const { massKgM2: mass, enthalpyJM2: enthalpy } = state
  const firstWave = ((isFloating ? 1 : 0.5) * Math.PI) / heightM
  const waveStep = Math.PI / heightM
  cosines.fill(1)
  let depth = 0
  let topC = 0
  for (let i = first; i < mass.length && depth < heightM; i++) {
    const nextDepth = depth + mass[i]! / ICE_DENSITY
    const cellC = cellTemperatureC(mass[i]!, enthalpy[i]!)
    if (i === first) topC = cellC
    const weight = isFloating ? 1 - (depth + nextDepth) / (2 * heightM) : 1
    cold.totalJM2 -= mass[i]! * ICE_HEAT_CAPACITY * cellC * weight
    // cos((m + o) θ) for all modes by the Chebyshev recurrence.
    const turn = 2 * Math.cos(waveStep * nextDepth)
    let current = Math.cos(firstWave * nextDepth)
    let previous = Math.cos((firstWave - waveStep) * nextDepth)
    for (let m = 0; m < MODES; m++) {
      cold.sharesJM2[m]! += cellC * (cosines[m]! - current)
      cosines[m] = current
      const next = turn * current - previous
      previous = current
      current = next
    }
    depth = nextDepth
  }
  const slowing = slowed(topC)
  cold.atOnceJM2 = cold.totalJM2
  for (let m = 0; m < MODES; m++) {
    const wave = firstWave + m * waveStep
    cold.sharesJM2[m]! *= (-2 * ICE_DENSITY * ICE_HEAT_CAPACITY) / (heightM * wave * wave)
    cold.atOnceJM2 -= cold.sharesJM2[m]!
    cold.ratesPerS[m] = DIFFUSIVITY * wave * wave * slowing
  }
}

/**
 * Time runs slower for the sheet because new ice builds up between it and the water. Neumann's solution for freezing onto
 * cold ice has a flux lower by 1/(1 + erf λ), λ near Ste/√π; flux goes as the root of time, so time by twice that.
 */
function slowed(topC: number): number {
  const stefanNumber = (-topC * ICE_HEAT_CAPACITY) / FUSION_J_PER_KG
  return 1 / (1 + (4 / Math.PI) * stefanNumber)
}

/**
 * Heat drawn in a stretch of time.
 *
 * @param cold Modes.
 * @param held Heat the modes still hold at its start. [J/m²]
 * @param seconds Its length. [s]
 * @returns Heat. [J/m²] Never negative: once the ground gives more than the sheet takes, the sheet melts at its foot,
 *   and none of that reaches the layer.
 *
 * Source: exponential decay of the modes of sheetCold.
 */
export function heatDrawnJM2(cold: SheetCold, held: Float64Array, seconds: number): number {
  let drawn = -cold.bottomWm2 * seconds
  for (let m = 0; m < MODES; m++) {
    if (held[m] !== 0) drawn += held[m]! * -Math.expm1(-cold.ratesPerS[m]! * seconds)
  }
  return drawn > 0 ? drawn : 0
}

/**
 * Lets the modes decay for a stretch of time; spent ones become exactly 0.
 *
 * @param cold Modes.
 * @param held Heat the modes hold; changed in place. [J/m²]
 * @param seconds Length of the stretch. [s], 0 or more
 *
 * Source: exponential decay of the modes of sheetCold.
 */
export function decayModes(cold: SheetCold, held: Float64Array, seconds: number): void {
  for (let m = 0; m < MODES; m++) {
    if (held[m] === 0) continue
    const left = held[m]! * Math.exp(-cold.ratesPerS[m]! * seconds)
    held[m] = Math.abs(left) < SPENT_JM2 ? 0 : left
  }
}
