// Names for the factors of a fill.
import { hosePlanOf } from './fill-water'
import { FILL } from './thresholds'
import type { FigureOfHour, FillFactors, FillOutcome } from './fill-factors'
import type { Setting } from './setting'
import type { Reason } from './types'

export interface FillLimits {
  hose: number
  hands: number
  lowestAirC: FigureOfHour
  lowestWindChillC: FigureOfHour
}

/**
 * All factors of a fill as reasons, the one that lets least through first.
 *
 * @param setting Rink, from makeSetting.
 * @param startsAt Hour of the start: a figure of a later night is told with its day.
 * @param factors Desirabilities. [0-1]
 * @param outcome What becomes of the fill; null when the forecast ends first.
 * @param limits What hose and hands let through. [0-1]
 * @returns Codes and numbers.
 *
 * Source: ours.
 */
export function fillReasons(
  setting: Setting,
  startsAt: string,
  factors: FillFactors,
  outcome: FillOutcome | null,
  limits: FillLimits,
): Reason[] {
  const reasons = [
    hoseReason(limits, startsAt),
    handsReason(limits, startsAt),
    linerReason(factors, outcome, startsAt),
    coldReason(setting, factors, outcome),
    snowReason(factors, outcome, startsAt),
    airReason(factors, outcome, startsAt),
  ]
  return reasons.sort((a, b) => a.factor - b.factor)
}

function hoseReason({ hose, lowestAirC: { figure, at } }: FillLimits, startsAt: string): Reason {
  const values = { airTemperatureC: figure, startsAt, at }
  return { code: hose < 1 ? 'fill_hose_freezes' : 'fill_hose_runs', factor: hose, values }
}

function handsReason({ hands, lowestWindChillC: { figure, at } }: FillLimits, startsAt: string): Reason {
  const values = { windChillC: figure, startsAt, at }
  return { code: hands < 1 ? 'hands_freeze' : 'hands_bear', factor: hands, values }
}

function linerReason({ liner }: FillFactors, outcome: FillOutcome | null, startsAt: string): Reason {
  const { figure, at } = outcome?.highestGustMps ?? { figure: 0, at: startsAt }
  const values = { gustAtRinkMps: figure, startsAt, at }
  return { code: liner < 1 ? 'liner_blown' : 'liner_calm', factor: liner, values }
}

function coldReason(setting: Setting, { cold }: FillFactors, outcome: FillOutcome | null): Reason {
  const { hoseHours } = hosePlanOf(setting)
  if (!outcome) return { code: 'fill_past_forecast', factor: 0, values: { hoseHours } }
  if (outcome.hasGap) return { code: 'weather_unknown', factor: 0, values: {} }
  const values = { hours: outcome.lookAheadHours, iceAfterMm: outcome.iceAfterMm }
  if (outcome.lookAheadHours < FILL.leastLookAheadHours) return { code: 'cold_after_unseen', factor: 0, values }
  return { code: cold < 0.5 ? 'no_cold_after' : 'cold_follows', factor: cold, values }
}

function snowReason({ snow }: FillFactors, outcome: FillOutcome | null, startsAt: string): Reason {
  const snowfallCm = outcome?.snowBeforeSkinCm ?? 0
  const values = { snowfallCm, startsAt, at: outcome?.snowStartsAt ?? startsAt }
  return { code: snow < 1 ? 'snow_before_skin' : 'no_snow_before_skin', factor: snow, values }
}

function airReason({ air }: FillFactors, outcome: FillOutcome | null, startsAt: string): Reason {
  const { figure, at } = outcome?.highestAirC ?? { figure: 0, at: startsAt }
  const values = { airTemperatureC: figure, startsAt, at }
  return { code: air < 1 ? 'fill_air_warm' : 'fill_air_fine', factor: air, values }
}
