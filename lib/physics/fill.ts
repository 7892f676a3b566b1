// A filled rink: open water cools, skins over, thickens, freezes through.
import { advanceSheet, createSheet, reportSheet, type SheetState } from './sheet'
import type { Base, PreparedHour } from './types'

/** Ice that counts as a skin. [mm] Ours: a closed film that a flake of snow no longer breaks. */
const SKIN_MM = 5

export interface FillGrowth {
  /** Hours from the start until a closed skin, until each thickness asked for, until no water is left; null when not within the hours. */
  hoursToSkin: number | null
  hoursToThickness: (number | null)[]
  hoursToFrozen: number | null
  /** At the end of the hours. */
  state: SheetState
}

/**
 * Follows a fill through the hours.
 *
 * @param fill Depth [mm], above 0 to 1e6; water [°C], 0 to 40; base.
 * @param hours Prepared hours; unknown ones stand still.
 * @param startIndex Hour in which the full depth is in.
 * @param thicknessesMm Ice thicknesses to time. [mm]
 * @returns Times, interpolated within the hour; null where the hours end first. [h]
 * @throws RangeError for a value out of range.
 *
 * Source: advanceSheet, hour by hour.
 */
export function growFill(
  fill: { depthMm: number; waterTemperatureC: number; base: Base },
  hours: readonly PreparedHour[],
  startIndex: number,
  thicknessesMm: readonly number[] = [],
): FillGrowth {
  const state = createSheet({
    thicknessMm: 0,
    temperatureC: 0,
    snowCoverCm: 0,
    unfrozenBelowMm: fill.depthMm,
    waterTemperatureC: fill.waterTemperatureC,
    base: fill.base,
  })
  return followGrowth(state, hours, startIndex, thicknessesMm)
}

/**
 * Follows any sheet with water under it through the hours.
 *
 * @param start Sheet at the start of the first hour.
 * @param hours Prepared hours.
 * @param startIndex First hour.
 * @param thicknessesMm Ice thicknesses to time. [mm]
 * @returns As growFill. [h]
 *
 * Source: advanceSheet, hour by hour.
 */
export function followGrowth(
  start: SheetState,
  hours: readonly PreparedHour[],
  startIndex: number,
  thicknessesMm: readonly number[],
): FillGrowth {
  let state = start
  let thickness = reportSheet(state).thicknessMm
  const growth: FillGrowth = {
    hoursToSkin: thickness >= SKIN_MM ? 0 : null,
    hoursToThickness: thicknessesMm.map((wanted) => (thickness >= wanted ? 0 : null)),
    hoursToFrozen: state.belowKgM2 <= 0 ? 0 : null,
    state,
  }
  for (let i = startIndex; i < hours.length; i++) {
    state = advanceSheet(state, hours[i]!)
    const grown = reportSheet(state).thicknessMm
    const hour = i - startIndex
    if (growth.hoursToSkin === null && grown >= SKIN_MM) growth.hoursToSkin = hour + crossing(thickness, grown, SKIN_MM)
    for (let wanted = 0; wanted < thicknessesMm.length; wanted++) {
      if (growth.hoursToThickness[wanted] !== null || grown < thicknessesMm[wanted]!) continue
      growth.hoursToThickness[wanted] = hour + crossing(thickness, grown, thicknessesMm[wanted]!)
    }
    if (growth.hoursToFrozen === null && state.belowKgM2 <= 0) growth.hoursToFrozen = hour + 1
    thickness = grown
  }
  growth.state = state
  return growth
}

function crossing(from: number, to: number, wanted: number): number {
  return to > from ? Math.min(1, Math.max(0, (wanted - from) / (to - from))) : 1
}
