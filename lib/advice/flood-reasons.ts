// Names for the factors of a flood: each becomes a reason with its code, its value and the numbers its sentence needs.
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import type { HeatBalanceParts } from '@/lib/physics/types'
import { wetMmOf, type ForecastRun } from './forecast-run'
import { toIso } from './zoned-time'
import { FLOOD } from './thresholds'
import { setsAtOf, type FloodStart } from './flood-factors'
import type { Setting } from './setting'
import type { Reason } from './types'

/**
 * All factors of a flood as reasons, the one that lets least through first; limits of the person are among them, each
 * with its own value.
 *
 * @param start From judgeFloodStart.
 * @param parts Parts of the heat balance. [W/m²]
 * @param setting Rink, from makeSetting.
 * @param run Forecast run with its sheet.
 * @param index Hour of the run.
 * @returns Codes and numbers.
 *
 * Source: ours.
 */
export function floodReasons(
  start: FloodStart,
  parts: HeatBalanceParts,
  setting: Setting,
  run: ForecastRun,
  index: number,
): Reason[] {
  const setsAt = setsAtOf(start)
  const reasons = [
    bearsReason(start, setting),
    lastLayerReason(start),
    rateReason(start, parts),
    dryReason(start, run, index),
    setReason(start, setsAt, run),
    slackReason(start, setsAt),
    airReason(start),
    windReason(start),
    gustReason(start),
    snowReason(start),
    hoseReason(start),
    skinReason(start),
  ]
  // Array.sort is stable: among equals the order above tells.
  return reasons.sort((a, b) => a.factor - b.factor)
}

function bearsReason({ factors, sheet, waterBelowMm }: FloodStart, { input }: Setting): Reason {
  const { phase } = input.rink
  const values = { thicknessMm: sheet.thicknessMm, waterBelowMm, neededMm: FLOOD.bearsMm.one, phase }
  const isWrongPhase = !['freezing', 'skating', 'thaw'].includes(phase)
  if (factors.bears === 0 && isWrongPhase) return { code: 'phase_not_flooding', factor: 0, values }
  return { code: factors.bears < 1 ? 'sheet_too_thin' : 'sheet_bears', factor: factors.bears, values }
}

function lastLayerReason({ factors, sheet }: FloodStart): Reason {
  const code = factors.lastLayer < 1 ? 'last_layer_wet' : 'last_layer_set'
  return { code, factor: factors.lastLayer, values: { liquidMm: sheet.liquidMm, temperatureC: sheet.temperatureC } }
}

/** Where the balance and the thermometer rule disagree, the code says which way. */
function rateReason({ factors, hour, rateMmPerH }: FloodStart, parts: HeatBalanceParts): Reason {
  const isLate = factors.slack === 0 || factors.set < 0.5
  const values = {
    freezeRateMmPerH: rateMmPerH,
    airTemperatureC: hour.airTemperatureC,
    ruleC: FLOOD.thermometerRuleC,
    cloudCover: hour.cloudCover,
    vapourPressureHpa: hour.vapourPressureHpa,
    longwaveWm2: parts.longwave,
    sensibleWm2: parts.sensible,
    latentWm2: parts.latent,
    shortwaveWm2: parts.shortwave,
  }
  return { code: rateCode(values, isLate), factor: factors.rate, values }
}

function rateCode(
  values: Record<'freezeRateMmPerH' | 'airTemperatureC' | 'ruleC' | 'longwaveWm2' | 'shortwaveWm2', number>,
  isLate: boolean,
) {
  const isMild = values.airTemperatureC > values.ruleC
  if (values.freezeRateMmPerH >= FLOOD.freezesWellMmPerH) {
    if (isMild) return 'freezes_though_mild'
    return isLate && values.freezeRateMmPerH < FLOOD.slowForColdMmPerH ? 'slow_though_cold' : 'freezes_well'
  }
  if (values.shortwaveWm2 > Math.max(0, values.longwaveWm2)) return 'sun_warms'
  if (values.airTemperatureC < 0) return 'slow_though_cold'
  return values.freezeRateMmPerH > 0 ? 'freezes_slowly' : 'not_freezing'
}

function dryReason({ factors, wetMm, hour, startMillis }: FloodStart, run: ForecastRun, index: number): Reason {
  if (factors.dry === 1) return { code: 'dry_until_set', factor: 1, values: { precipitationMm: 0 } }
  let first = index
  while (first < run.hours.length - 1 && wetMmOf(run.hours[first] ?? hour) <= 0) first += 1
  const wet = run.hours[first] ?? hour
  const isSnow = wet.snowfallCm > 0 || (wet.rainMm <= 0 && wet.airTemperatureC < 0)
  const values: Reason['values'] = {
    startsAt: toIso(Math.max(wet.startsAtMillis, startMillis)),
    precipitationMm: wetMm,
    snowfallCm: wet.snowfallCm,
    rainMm: wet.rainMm,
  }
  if (factors.dry > 0) return { code: 'trace_before_set', factor: factors.dry, values }
  return { code: isSnow ? 'snow_before_set' : 'rain_before_set', factor: 0, values }
}

function setReason(
  { factors, setMinutes, startMillis, neededMillis }: FloodStart,
  setsAt: string | null,
  run: ForecastRun,
): Reason {
  if (setMinutes === null || setsAt === null) {
    const last = run.hours.at(-1)
    const endMillis = (last?.startsAtMillis ?? startMillis) + HOUR_MILLIS
    const values = { forecastEndsAt: toIso(endMillis), neededAt: toIso(neededMillis) }
    return { code: endMillis < neededMillis ? 'forecast_ends_first' : 'does_not_set', factor: 0, values }
  }
  return { code: factors.set < 0.5 ? 'sets_slowly' : 'sets_soon', factor: factors.set, values: { setMinutes, setsAt } }
}

function slackReason({ factors, setMinutes, startMillis, neededMillis }: FloodStart, setsAt: string | null): Reason {
  const values: Reason['values'] = { neededAt: toIso(neededMillis) }
  if (setMinutes !== null && setsAt !== null) {
    values.slackMinutes = (neededMillis - startMillis) / MINUTE_MILLIS - setMinutes
    values.setsAt = setsAt
  }
  const code = factors.slack === 0 ? 'not_set_in_time' : factors.slack < 1 ? 'barely_in_time' : 'set_in_time'
  return { code, factor: factors.slack, values }
}

function airReason({ factors, hour }: FloodStart): Reason {
  const isCold = hour.airTemperatureC < FLOOD.airTooColdC.one
  const code = factors.air === 1 ? 'air_fine' : isCold ? 'layer_cracks' : 'air_mild'
  return { code, factor: factors.air, values: { airTemperatureC: hour.airTemperatureC } }
}

function windReason({ factors, windAtRinkMps }: FloodStart): Reason {
  return { code: factors.wind < 1 ? 'windy' : 'wind_light', factor: factors.wind, values: { windAtRinkMps } }
}

function gustReason({ factors, gustAtRinkMps }: FloodStart): Reason {
  return { code: factors.gust < 1 ? 'gusty' : 'gusts_light', factor: factors.gust, values: { gustAtRinkMps } }
}

function snowReason({ factors, sheet }: FloodStart): Reason {
  const code = factors.snow < 1 ? 'snow_to_clear' : 'surface_clear'
  return { code, factor: factors.snow, values: { snowCoverCm: sheet.snowCoverCm } }
}

function hoseReason({ hose, hour }: FloodStart): Reason {
  return {
    code: hose < 1 ? 'hose_freezes' : 'hose_runs',
    factor: hose,
    values: { airTemperatureC: hour.airTemperatureC },
  }
}

function skinReason({ skin, windChillC }: FloodStart): Reason {
  return { code: skin < 1 ? 'skin_freezes' : 'skin_bears', factor: skin, values: { windChillC } }
}
