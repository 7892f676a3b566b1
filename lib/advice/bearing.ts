// Whether the sheet carries a person with a hose: by its thickness where it floats, by the floor where it lies on it.
import type { SheetState } from '@/lib/physics/sheet'
import { rampDesirability } from './desirability'
import { deepestFillMm } from './fill-water'
import { ICE_TO_WATER } from './forecast-run'
import type { Setting } from './setting'
import { FLOOD } from './thresholds'
import type { SheetReport } from './types'

/**
 * Water that is, or may be, under the ice. While a rink freezes it is followed. Later a sheet starts from a hole, which
 * tells nothing of the water: on a liner what the ice does not account for of the fill may still be under it.
 *
 * @param setting Rink, from makeSetting.
 * @param state Sheet.
 * @param report What a keeper would measure of it. [mm]
 * @returns Water. [mm]
 *
 * Source: balance of mass; what may have gone otherwise in FLOOD.
 */
export function waterBelowMm(setting: Setting, { belowKgM2 }: SheetState, report: SheetReport): number {
  const { phase, base } = setting.input.rink
  if (phase === 'freezing' || base !== 'liner' || report.thicknessMm >= FLOOD.bearsMm.one) return belowKgM2
  const missingMm = deepestFillMm(setting) - report.thicknessMm * ICE_TO_WATER - report.liquidMm
  return missingMm > FLOOD.lostOfFillMm ? Math.max(belowKgM2, missingMm) : belowKgM2
}

/**
 * How well the sheet carries whoever floods it. On bare ground and on snow the sheet is built up by floods; a fill, or a
 * lined sheet, has to be ice that bears the person.
 *
 * @param setting Rink, from makeSetting.
 * @param thicknessMm Ice. [mm]
 * @param belowMm Water under it, from waterBelowMm. [mm]
 * @returns Share. [0-1]
 *
 * Source: rule G01 through FLOOD where it floats; the floor carries where it does not.
 */
export function bearsFlood({ input }: Setting, thicknessMm: number, belowMm: number): number {
  const { phase, base } = input.rink
  if (phase === 'planning' || phase === 'waiting' || phase === 'filling' || phase === 'closed') {
    const isBuiltByFloods = base !== 'liner' && phase === 'filling'
    return isBuiltByFloods ? 1 : 0
  }
  if (base !== 'liner' && phase !== 'freezing') return 1
  if (belowMm > 0) return rampDesirability(thicknessMm, FLOOD.bearsMm)
  return thicknessMm >= FLOOD.leastIceMm ? 1 : 0
}
