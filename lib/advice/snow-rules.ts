// Two rules of the trade that are about days, not hours: rain as a free flood, and never half-clearing before a wet freeze.
import type { PreparedHour } from '@/lib/physics/types'
import type { ForecastRun } from './forecast-run'
import { FLOOD, SNOW_RULES } from './thresholds'
import type { Reason, SheetReport } from './types'

/**
 * Remarks on an hour; they carry factor 1, because they change no score.
 *
 * @param run Forecast run with its sheet.
 * @param index Hour of the run.
 * @returns One code with its numbers, or none.
 *
 * Source: rules G01 and I08 through the thresholds.
 */
export function snowRuleReasons(run: ForecastRun, index: number): Reason[] {
  const snowCm = (run.reports[index] as SheetReport).snowCoverCm
  const reason = snowCm > FLOOD.snowToClearCm.one ? finishClearing(run, index) : freeFlood(run, index)
  return reason ? [reason] : []
}

/** Snow on the sheet, something wet near 0 °C within hours, then a sharp fall. */
function finishClearing(run: ForecastRun, index: number): Reason | null {
  const wet = findHour(run, index, (hour) => hour.precipitationMm > 0 && hour.airTemperatureC > SNOW_RULES.nearZeroC)
  if (wet === null) return null
  const cold = findHour(run, wet, (hour) => hour.airTemperatureC <= SNOW_RULES.sharpFallC)
  if (cold === null) return null
  const lowC = (run.hours[cold] as PreparedHour).airTemperatureC
  return { code: 'finish_clearing', factor: 1, values: { startsAt: (run.hours[wet] as PreparedHour).time, lowC } }
}

/** Rain on a clear sheet that freezes on it within hours of its end. */
function freeFlood(run: ForecastRun, index: number): Reason | null {
  if ((run.hours[index] as PreparedHour).rainMm <= 0) return null
  let end = index
  let rainMm = 0
  for (; (run.hours[end]?.rainMm ?? 0) > 0; end += 1) rainMm += (run.hours[end] as PreparedHour).rainMm
  if (rainMm < SNOW_RULES.freeFloodMm) return null
  const last = Math.min(run.reports.length, end + SNOW_RULES.withinHours)
  for (let hour = end; hour < last; hour += 1) {
    const { liquidMm, snowCoverCm } = run.reports[hour] as SheetReport
    if (snowCoverCm > FLOOD.snowToClearCm.one) return null
    if (liquidMm < FLOOD.wetMm.one) return { code: 'rain_is_a_flood', factor: 1, values: { rainMm } }
  }
  return null
}

function findHour(run: ForecastRun, from: number, test: (hour: PreparedHour) => boolean): number | null {
  const last = Math.min(run.hours.length, from + SNOW_RULES.withinHours)
  for (let index = from; index < last; index += 1) {
    const hour = run.hours[index] as PreparedHour
    if (hour.isKnown && test(hour)) return index
  }
  return null
}
