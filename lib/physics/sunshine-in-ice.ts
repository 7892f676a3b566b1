// Sunshine that passes the surface of bare ice and is absorbed on its way down.
import { cellThicknessM } from './column'
import type { SheetState } from './sheet-state'

/** Share of what bare ice absorbs that passes its first centimetre. [0-1] Grenfell & Maykut 1977 give about 0.2-0.6 by ice type; from memory. */
const PASSING_SHARE = 0.35
/** Extinction below that. [1/m] 1.5, Grenfell & Maykut 1977; from memory. */
const EXTINCTION_PER_M = 1.5

export interface SharedSunshine {
  /** Passed by the surface. [W/m²] */
  sharedWm2: number
  /** Absorbed in each cell, or null at night. [W/m²] */
  absorbedWm2: Float64Array | null
  /** Leaves at the foot. [W/m²] */
  throughWm2: number
}

/** Night, or a surface that keeps all sunshine to itself. */
export const NO_SUNSHINE: SharedSunshine = { sharedWm2: 0, absorbedWm2: null, throughWm2: 0 }

/**
 * Shares absorbed sunshine out over the cells of a bare sheet.
 *
 * @param state Sheet.
 * @param absorbedAtAllWm2 Sunshine that is not thrown back. [W/m²]
 * @returns What goes below the surface, per cell and through the foot. [W/m²]
 *
 * Source: Beer's law; PASSING_SHARE and EXTINCTION_PER_M in this file.
 */
export function shareSunshine(state: SheetState, absorbedAtAllWm2: number): SharedSunshine {
  if (absorbedAtAllWm2 <= 0) return NO_SUNSHINE
  const sharedWm2 = absorbedAtAllWm2 * PASSING_SHARE
  const absorbedWm2 = new Float64Array(state.massKgM2.length)
  let left = sharedWm2
  for (let i = 0; i < absorbedWm2.length; i++) {
    const passes = left * Math.exp(-EXTINCTION_PER_M * cellThicknessM(state.massKgM2[i]!, state.enthalpyJM2[i]!))
    absorbedWm2[i] = left - passes
    left = passes
  }
  return { sharedWm2, absorbedWm2, throughWm2: left }
}
