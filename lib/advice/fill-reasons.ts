// Names for the factors of a fill.
import { hosePlanOf } from './fill-water'
import { FILL } from './thresholds'
import type { FillFactors, FillOutcome } from './fill-factors'
import type { Setting } from './setting'
import type { Reason } from './types'

export interface FillLimits {
  hose: number
  hands: number
  lowestAirC: number
  lowestWindChillC: number
}

/**
 * All factors of a fill as reasons, the one that lets least through first.
 *
 * @param setting Rink, from makeSetting.
 * @param factors Desirabilities. [0-1]
 * @param outcome What becomes of the fill; null when the forecast ends first.
 * @param limits What hose and hands let through. [0-1]
 * @returns Codes and numbers.
 *
 * Source: ours.
 */
export function fillReasons(
  setting: Setting,
  factors: FillFactors,
  outcome: FillOutcome | null,
  limits: FillLimits,
): Reason[] {
  const reasons = [
    hoseReason(limits),
    handsReason(limits),
    linerReason(factors, outcome),
    coldReason(setting, factors, outcome),
    snowReason(factors, outcome),
    airReason(factors, outcome),
  ]
  return reasons.sort((a, b) => a.factor - b.factor)
}

function hoseReason({ hose, lowestAirC }: FillLimits): Reason {
  return {
    code: hose < 1 ? 'fill_hose_freezes' : 'fill_hose_runs',
    factor: hose,
    values: { airTemperatureC: lowestAirC },
  }
}

function handsReason({ hands, lowestWindChillC }: FillLimits): Reason {
  return { code: hands < 1 ? 'hands_freeze' : 'hands_bear', factor: hands, values: { windChillC: lowestWindChillC } }
}

function linerReason({ liner }: FillFactors, outcome: FillOutcome | null): Reason {
  const gustAtRinkMps = outcome?.highestGustMps ?? 0
  return { code: liner < 1 ? 'liner_blown' : 'liner_calm', factor: liner, values: { gustAtRinkMps } }
}

function coldReason(setting: Setting, { cold }: FillFactors, outcome: FillOutcome | null): Reason {
  const { hoseHours } = hosePlanOf(setting)
  if (!outcome) return { code: 'fill_past_forecast', factor: 0, values: { hoseHours } }
  if (outcome.hasGap) return { code: 'weather_unknown', factor: 0, values: {} }
  const values = { hours: outcome.lookAheadHours, iceAfterMm: outcome.iceAfterMm }
  if (outcome.lookAheadHours < FILL.leastLookAheadHours) return { code: 'cold_after_unseen', factor: 0, values }
  return { code: cold < 0.5 ? 'no_cold_after' : 'cold_follows', factor: cold, values }
}

function snowReason({ snow }: FillFactors, outcome: FillOutcome | null): Reason {
  const snowfallCm = outcome?.snowBeforeSkinCm ?? 0
  return { code: snow < 1 ? 'snow_before_skin' : 'no_snow_before_skin', factor: snow, values: { snowfallCm } }
}

function airReason({ air }: FillFactors, outcome: FillOutcome | null): Reason {
  const values = { airTemperatureC: outcome?.highestAirC ?? 0 }
  return { code: air < 1 ? 'fill_air_warm' : 'fill_air_fine', factor: air, values }
}
