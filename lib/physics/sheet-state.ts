// The sheet as it is stored between hours and between runs: plain numbers, fit for JSON.
import type { Base } from './types'

export interface SheetState {
  base: Base
  /** Cells from the top down: ice, water or a mixture. [kg/m²] */
  massKgM2: number[]
  /** Their enthalpy, 0 for liquid water at 0 °C. [J/m²] */
  enthalpyJM2: number[]
  snowKgM2: number
  snowDepthCm: number
  /** Unfrozen water under the ice. [kg/m²] */
  belowKgM2: number
  belowTemperatureC: number
  /** Of whatever meets the air. [°C] */
  surfaceTemperatureC: number
}
