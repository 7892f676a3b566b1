// Keeps the cells of a sheet in order: thin where weather acts, thicker further down, never many.
import { FUSION_J_PER_KG, ICE_DENSITY } from './constants'
import type { Column } from './column'

/** Thinnest cell wanted, at the surface. [m] */
const SURFACE_CELL_M = 0.005
/** Growth of the wanted cell with depth. [m/m] */
const CELL_GROWTH = 0.45

/** Cell thickness wanted at a depth. [m] */
function wantedCellM(depthM: number): number {
  return SURFACE_CELL_M + CELL_GROWTH * depthM
}

/**
 * Cell thicknesses for new ice of a given thickness.
 *
 * @param thicknessM Ice. [m], 0 or more
 * @returns Thicknesses from the top down, `thicknessM` in all. [m]
 *
 * Source: ours.
 */
export function cellThicknesses(thicknessM: number): number[] {
  const cells: number[] = []
  let depth = 0
  while (depth < thicknessM) {
    const wanted = wantedCellM(depth)
    const rest = thicknessM - depth
    cells.push(rest < 1.5 * wanted ? rest : wanted)
    depth += cells[cells.length - 1]!
  }
  return cells
}

/**
 * Merges ice cells that have become too thin and splits those too thick; mass and enthalpy stay exactly as they are.
 *
 * @param column Cells from the top down; changed in place.
 *
 * Source: ours; what is conserved is tested in tests/unit/physics/sheet.test.ts.
 */
export function tidyCells(column: Column): void {
  const { massKgM2: mass, enthalpyJM2: enthalpy } = column
  let depth = 0
  for (let i = 0; i < mass.length; i++) {
    const wanted = wantedCellM(depth) * ICE_DENSITY
    while (i + 1 < mass.length && mass[i]! + mass[i + 1]! < 1.2 * wanted && canMerge(column, i))
      mergeWithNext(column, i)
    if (mass[i]! < 1e-6 && mass.length > 1) {
      mergeWithNext(column, i + 1 < mass.length ? i : i - 1)
      i -= 1
      continue
    }
    if (mass[i]! > 2 * wanted && isIce(column, i)) {
      mass.splice(i, 1, mass[i]! / 2, mass[i]! / 2)
      enthalpy.splice(i, 1, enthalpy[i]! / 2, enthalpy[i]! / 2)
    }
    depth += mass[i]! / ICE_DENSITY
  }
}

function mergeWithNext(column: Column, i: number): void {
  const { massKgM2: mass, enthalpyJM2: enthalpy } = column
  mass.splice(i, 2, mass[i]! + mass[i + 1]!)
  enthalpy.splice(i, 2, enthalpy[i]! + enthalpy[i + 1]!)
}

function isIce(column: Column, i: number): boolean {
  return column.enthalpyJM2[i]! <= -FUSION_J_PER_KG * column.massKgM2[i]!
}

/** Ice with ice, wet with wet: mixing wet with cold would freeze water out of turn. */
function canMerge(column: Column, i: number): boolean {
  return isIce(column, i) === isIce(column, i + 1)
}
