// One implicit step of heat conduction and phase change through a stack of ice and water cells.
import {
  FUSION_J_PER_KG,
  ICE_CONDUCTIVITY,
  ICE_DENSITY,
  ICE_HEAT_CAPACITY,
  WATER_CONDUCTIVITY,
  WATER_DENSITY,
  WATER_HEAT_CAPACITY,
} from './constants'

/** Cells from the top down. Enthalpy is 0 for liquid water at 0 °C. */
export interface Column {
  massKgM2: number[]
  enthalpyJM2: number[]
}

/** Boundary of a step: loss at the top is `lossAt0 + lossSlope · T` of the top cell; the bottom lies at 0 °C or gets a flux. */
export interface ColumnStep {
  seconds: number
  lossAt0Wm2: number
  lossSlopeWm2K: number
  /** True: the bottom face is held at 0 °C by water below. */
  isBottomAtZero: boolean
  /** Into the bottom cell. [W/m²] */
  bottomGainWm2: number
  /** Sunshine absorbed inside, cell by cell, or null. [W/m²] */
  absorbedWm2: Float64Array | null
}

export interface ColumnFlows {
  /** Out of the top. [J/m²] */
  topLossJM2: number
  /** In through a bottom at 0 °C. [J/m²] */
  bottomGainJM2: number
  /** Of the top cell at the end of the step. [°C] */
  topCellC: number
}

const enum Phase {
  Ice,
  Mixed,
  Water,
}

const LARGEST = 64
const phase = new Uint8Array(LARGEST)
const temperature = new Float64Array(LARGEST)
const conductance = new Float64Array(LARGEST)
const upper = new Float64Array(LARGEST)
const right = new Float64Array(LARGEST)
const updated = new Float64Array(LARGEST)
/** Conduction from the mean of a water layer to a face at 0 °C: π²/4 k/h, the first decay mode of a slab warm on one side. */
const WATER_FACE = Math.PI ** 2 / 4

/**
 * Temperature of a cell.
 *
 * @param massKgM2 Mass of the cell. [kg/m²], above 0
 * @param enthalpyJM2 Its enthalpy, 0 for water at 0 °C. [J/m²]
 * @returns Temperature. [°C]
 *
 * Source: definition of enthalpy: sensible heat of ice, heat of fusion, sensible heat of water.
 */
export function cellTemperatureC(massKgM2: number, enthalpyJM2: number): number {
  const frozen = -FUSION_J_PER_KG * massKgM2
  if (enthalpyJM2 < frozen) return (enthalpyJM2 - frozen) / (massKgM2 * ICE_HEAT_CAPACITY)
  return enthalpyJM2 > 0 ? enthalpyJM2 / (massKgM2 * WATER_HEAT_CAPACITY) : 0
}

/**
 * Liquid in a cell.
 *
 * @param massKgM2 Mass of the cell. [kg/m²], above 0
 * @param enthalpyJM2 Its enthalpy, 0 for water at 0 °C. [J/m²]
 * @returns Liquid, 0 to the mass of the cell. [kg/m²]
 *
 * Source: definition of enthalpy.
 */
export function cellLiquidKgM2(massKgM2: number, enthalpyJM2: number): number {
  return Math.min(massKgM2, Math.max(0, massKgM2 + enthalpyJM2 / FUSION_J_PER_KG))
}

/**
 * Thickness of a cell.
 *
 * @param massKgM2 Mass of the cell. [kg/m²], above 0
 * @param enthalpyJM2 Its enthalpy, 0 for water at 0 °C. [J/m²]
 * @returns Thickness. [m]
 *
 * Source: densities of ice and water.
 */
export function cellThicknessM(massKgM2: number, enthalpyJM2: number): number {
  const liquid = cellLiquidKgM2(massKgM2, enthalpyJM2)
  return liquid / WATER_DENSITY + (massKgM2 - liquid) / ICE_DENSITY
}

/**
 * Resistance between the middle of a cell and its face. A cell at 0 °C holds its faces there.
 *
 * @param massKgM2 Mass of the cell. [kg/m²], above 0
 * @param enthalpyJM2 Its enthalpy, 0 for water at 0 °C. [J/m²]
 * @returns Resistance, 0 for a mixed cell. [m² K/W]
 *
 * Source: conduction over half a cell of ice; of water by its first decay mode, WATER_FACE.
 */
export function faceResistance(massKgM2: number, enthalpyJM2: number): number {
  const kind = phaseOf(massKgM2, enthalpyJM2)
  if (kind === Phase.Mixed) return 0
  return kind === Phase.Ice
    ? massKgM2 / (2 * ICE_DENSITY * ICE_CONDUCTIVITY)
    : massKgM2 / (WATER_FACE * WATER_DENSITY * WATER_CONDUCTIVITY)
}

/**
 * Advances a column by one implicit (backward Euler) step. Enthalpy changes only by the flows returned, whatever the
 * phase changes inside, so energy is conserved to rounding.
 *
 * @param column Cells from the top down; enthalpies change in place.
 * @param step Length [s], law at the top, heat at the foot and inside [W/m²].
 * @returns Enthalpy out of the top and in at the foot [J/m²], and the top cell's temperature [°C].
 *
 * Source: enthalpy method with backward Euler, textbook form; from memory.
 */
export function stepColumn(column: Column, step: ColumnStep): ColumnFlows {
  const { massKgM2: mass, enthalpyJM2: enthalpy } = column
  const count = mass.length
  for (let i = 0; i < count; i++) phase[i] = phaseOf(mass[i]!, enthalpy[i]!)
  const footC = cellTemperatureC(mass[count - 1]!, enthalpy[count - 1]!)
  let isSettled = false
  for (let round = 0; round < 8 && !isSettled; round++) {
    fillConductances(mass, count, step, footC)
    solveTemperatures(mass, enthalpy, count, step)
    isSettled = settleEnthalpies(mass, enthalpy, count, step)
  }
  for (let i = 0; i < count; i++) enthalpy[i] = updated[i]!
  return {
    topLossJM2: (step.lossAt0Wm2 + step.lossSlopeWm2K * temperature[0]!) * step.seconds,
    bottomGainJM2: step.isBottomAtZero ? -conductance[count]! * temperature[count - 1]! * step.seconds : 0,
    topCellC: temperature[0]!,
  }
}

function phaseOf(mass: number, enthalpy: number): Phase {
  if (enthalpy <= -FUSION_J_PER_KG * mass) return Phase.Ice
  return enthalpy < 0 ? Phase.Mixed : Phase.Water
}

function resistanceOf(mass: number, kind: number): number {
  if (kind === Phase.Mixed) return 0
  return kind === Phase.Ice
    ? mass / (2 * ICE_DENSITY * ICE_CONDUCTIVITY)
    : mass / (WATER_FACE * WATER_DENSITY * WATER_CONDUCTIVITY)
}

function fillConductances(mass: number[], count: number, step: ColumnStep, footC: number): void {
  let above = resistanceOf(mass[0]!, phase[0]!)
  for (let i = 1; i < count; i++) {
    const below = resistanceOf(mass[i]!, phase[i]!)
    const resistance = above + below
    // Two cells at 0 °C exchange nothing.
    conductance[i] = resistance > 0 ? 1 / resistance : 0
    above = below
  }
  conductance[count] = step.isBottomAtZero && above > 0 ? 1 / (above + halfNewIce(above, footC, step.seconds)) : 0
}

/** Resistance of half the ice that will grow at the foot in this step: q (R + q dt / 2Lρk) = -T, solved for q. [m² K/W] */
function halfNewIce(resistance: number, footC: number, seconds: number): number {
  if (footC >= 0) return 0
  const perFlux = seconds / (2 * FUSION_J_PER_KG * ICE_DENSITY * ICE_CONDUCTIVITY)
  return (Math.sqrt(resistance * resistance - 4 * perFlux * footC) - resistance) / 2
}

function solveTemperatures(mass: number[], enthalpy: number[], count: number, step: ColumnStep): void {
  const { seconds } = step
  for (let i = 0; i < count; i++) {
    if (phase[i] === Phase.Mixed) {
      upper[i] = 0
      right[i] = 0
      continue
    }
    const isIce = phase[i] === Phase.Ice
    const capacity = (mass[i]! * (isIce ? ICE_HEAT_CAPACITY : WATER_HEAT_CAPACITY)) / seconds
    const offset = isIce ? FUSION_J_PER_KG * mass[i]! : 0
    const toAbove = i > 0 ? conductance[i]! : step.lossSlopeWm2K
    const toBelow = conductance[i + 1] ?? 0
    const isLast = i === count - 1
    let known = (enthalpy[i]! + offset) / seconds + (step.absorbedWm2 ? step.absorbedWm2[i]! : 0)
    if (i === 0) known -= step.lossAt0Wm2
    if (isLast && !step.isBottomAtZero) known += step.bottomGainWm2
    let diagonal = capacity + toAbove + (isLast && !step.isBottomAtZero ? 0 : toBelow)
    if (i > 0) {
      diagonal -= conductance[i]! * upper[i - 1]!
      known += conductance[i]! * right[i - 1]!
    }
    upper[i] = isLast ? 0 : toBelow / diagonal
    right[i] = known / diagonal
  }
  temperature[count - 1] = right[count - 1]!
  for (let i = count - 2; i >= 0; i--) temperature[i] = right[i]! + upper[i]! * temperature[i + 1]!
}

function settleEnthalpies(mass: number[], enthalpy: number[], count: number, step: ColumnStep): boolean {
  let isSettled = true
  let fromAbove = -(step.lossAt0Wm2 + step.lossSlopeWm2K * temperature[0]!)
  for (let i = 0; i < count; i++) {
    const isLast = i === count - 1
    const toBelow = isLast
      ? step.isBottomAtZero
        ? conductance[count]! * temperature[i]!
        : -step.bottomGainWm2
      : conductance[i + 1]! * (temperature[i]! - temperature[i + 1]!)
    const inside = step.absorbedWm2 ? step.absorbedWm2[i]! : 0
    updated[i] = enthalpy[i]! + (fromAbove - toBelow + inside) * step.seconds
    fromAbove = toBelow
    const kind = phaseOf(mass[i]!, updated[i]!)
    // Rounding may leave a pure cell a hair across its border; only a real crossing asks for another round.
    if (kind !== phase[i] && Math.abs(temperature[i]!) + crossing(mass[i]!, updated[i]!) > 1e-9) {
      phase[i] = kind
      isSettled = false
    }
  }
  return isSettled
}

function crossing(mass: number, enthalpy: number): number {
  return Math.min(Math.abs(enthalpy), Math.abs(enthalpy + FUSION_J_PER_KG * mass)) / (FUSION_J_PER_KG * mass)
}
