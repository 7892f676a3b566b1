// Snow on ice that does not carry anybody yet: clear it, or leave it, and what it does meanwhile.
import { ICE_CONDUCTIVITY, ICE_DENSITY } from '@/lib/physics/constants'
import { snowThatFloodsIceCm } from '@/lib/physics/melt-water'
import { snowConductivity } from '@/lib/physics/snow'
import { reportSheet, type SheetState } from '@/lib/physics/sheet'
import type { ForecastRun } from './forecast-run'
import { snowRuleReasons } from './snow-rules'
import { FLOOD, SNOW_ON_THIN_ICE } from './thresholds'
import type { Caution } from './types'

/** Heat transfer from bare ice to the air in winter weather. [W m⁻² K⁻¹] Ashton, Britannica: 10 to 30. */
const ICE_TO_AIR_WM2K = 20

export interface SnowQuestion {
  sheet: SheetState
  run: ForecastRun
  nowIndex: number
  /** Over the runs, from now on. [mm] */
  ahead: readonly { at: string; p10: number; p50: number }[]
}

/**
 * What snow means for a sheet that still floats or is thin.
 *
 * @param question Sheet now, run, its hour, and the ice ahead. [mm]
 * @returns Codes and numbers, the most pressing first; empty when there is nothing to do.
 *
 * Source: Archimedes for the load; Ashton 1989 for the growth under snow; Village of Fox Point (snow cannot be cleared
 * while the ice does not carry a person); rules G01 and I08 through the thresholds.
 */
export function snowOnThinIce({ sheet, run, nowIndex, ahead }: SnowQuestion): Caution[] {
  const { thicknessMm, snowCoverCm } = reportSheet(sheet)
  return [
    floodedBySnow(sheet, thicknessMm, snowCoverCm),
    clearOrLeave(sheet, thicknessMm, snowCoverCm, ahead),
    snowDue(run, nowIndex, thicknessMm),
    ...snowRuleReasons(run, Math.min(nowIndex, run.reports.length - 1)),
  ].flatMap((one) => (one ? [{ code: one.code, values: one.values }] : []))
}

/**
 * Share of its bare growth that ice keeps under snow.
 *
 * @param thicknessMm Ice. [mm]
 * @param snowCm Snow. [cm]
 * @param densityKgM3 Of the snow. [kg/m³], 10 to 600
 * @returns Share. [0-1]
 *
 * Source: Ashton 1989: growth goes with 1 / (1/H + h/k + h_s/k_s), H of 20 W/m²K taken.
 */
export function growthUnderSnow(thicknessMm: number, snowCm: number, densityKgM3: number): number {
  const bare = 1 / ICE_TO_AIR_WM2K + thicknessMm / 1000 / ICE_CONDUCTIVITY
  return bare / (bare + snowCm / 100 / snowConductivity(densityKgM3))
}

function densityOf(sheet: SheetState): number {
  return Math.min(600, Math.max(10, (sheet.snowKgM2 / sheet.snowDepthCm) * 100))
}

/** On water, the ice carries only so much snow before it goes under. */
function floodedBySnow(sheet: SheetState, thicknessMm: number, snowCoverCm: number): Caution | null {
  if (sheet.belowKgM2 <= 0 || snowCoverCm <= 0) return null
  const bornCm = snowThatFloodsIceCm(thicknessMm, ICE_DENSITY, densityOf(sheet))
  return snowCoverCm > bornCm ? { code: 'snow_floods_ice', values: { snowCoverCm, bornCm, thicknessMm } } : null
}

/** With no water under it the floor carries whoever clears the sheet, and nothing is left to freeze. */
function liesOnFloor({ belowKgM2 }: SheetState, thicknessMm: number): boolean {
  return belowKgM2 <= 0 && thicknessMm >= FLOOD.leastIceMm
}

function clearOrLeave(
  sheet: SheetState,
  thicknessMm: number,
  snowCoverCm: number,
  ahead: SnowQuestion['ahead'],
): Caution | null {
  if (snowCoverCm <= FLOOD.snowToClearCm.one) return null
  if (liesOnFloor(sheet, thicknessMm)) return { code: 'clear_snow_on_floor', values: { snowCoverCm, thicknessMm } }
  const growthShare = growthUnderSnow(thicknessMm, snowCoverCm, densityOf(sheet))
  const values = { snowCoverCm, thicknessMm, growthShare, bearsMm: FLOOD.bearsMm.one }
  if (thicknessMm >= FLOOD.bearsMm.one) return { code: 'clear_snow_now', values }
  const bearsAt = ahead.find(({ p50 }) => p50 >= FLOOD.bearsMm.one)?.at
  return { code: 'leave_snow', values: { ...values, ...(bearsAt ? { bearsAt } : {}) } }
}

/** More snow is coming before the ice holds a shovel, or more than it floats. */
function snowDue(run: ForecastRun, nowIndex: number, thicknessMm: number): Caution | null {
  const coming = run.hours.slice(nowIndex, nowIndex + SNOW_ON_THIN_ICE.aheadHours)
  const snowfallCm = coming.reduce((sum, hour) => sum + hour.snowfallCm, 0)
  if (snowfallCm < SNOW_ON_THIN_ICE.leastCm || thicknessMm >= FLOOD.bearsMm.one) return null
  const sheet = run.carried[nowIndex]
  if (sheet && liesOnFloor(sheet, thicknessMm)) return null
  const startsAt = coming.find((hour) => hour.snowfallCm > 0)?.time ?? ''
  const bornCm = snowThatFloodsIceCm(thicknessMm, ICE_DENSITY, SNOW_ON_THIN_ICE.newSnowKgM3)
  const isFloating = (sheet?.belowKgM2 ?? 0) > 0
  const code = isFloating && snowfallCm > bornCm ? 'snow_due_will_flood' : 'snow_due_on_thin_ice'
  return { code, values: { snowfallCm, startsAt, thicknessMm, bornCm, bearsMm: FLOOD.bearsMm.one } }
}
