// Every hour of a run with its scores, verdict and reasons, as the hour in which the keeper would start.
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { wetSurfaceBalance } from '@/lib/physics/balance'
import { dewPointC } from '@/lib/physics/humidity'
import type { PreparedHour } from '@/lib/physics/types'
import { judgeFloodStart, setsAtOf } from './flood-factors'
import { floodReasons } from './flood-reasons'
import type { FillStart } from './fill-factors'
import type { ForecastRun } from './forecast-run'
import { isAvailableAt, type Setting } from './setting'
import { snowRuleReasons } from './snow-rules'
import { PLAN, VERDICT } from './thresholds'
import { UNKNOWN_HOUR } from './unknown-hour'
import { toIso } from './zoned-time'
import type { HourWeather, Reason, ScoredHour, SheetReport } from './types'

/**
 * Score of a start: the worse of what the ice and what the person allow, never their mean.
 *
 * @param start Shares for ice and person. [0-1]
 * @returns Score, whole. [0-100]
 *
 * Source: ours.
 */
export function scoreOf({ ice, person }: { ice: number; person: number }): number {
  return Math.round(100 * Math.min(ice, person))
}

/**
 * Whether a start is worth getting the hose out for.
 *
 * @param start Shares for ice and person. [0-1]
 * @returns Whether its score is VERDICT.goodScore or more.
 *
 * Source: VERDICT in thresholds.ts.
 */
export function isGood(start: { ice: number; person: number }): boolean {
  return scoreOf(start) >= VERDICT.goodScore
}

/**
 * Whether the keeper can go out in some quarter of an hour.
 *
 * @param setting Rink, from makeSetting.
 * @param startMillis Start of the hour. [ms since the epoch]
 * @returns Whether one quarter is within the keeper's hours.
 *
 * Source: ours.
 */
export function isHourAvailable(setting: Setting, startMillis: number): boolean {
  const step = PLAN.stepMinutes * MINUTE_MILLIS
  for (let at = startMillis; at < startMillis + HOUR_MILLIS; at += step) if (isAvailableAt(setting, at)) return true
  return false
}

/**
 * Scores one hour.
 *
 * @param setting Rink, from makeSetting.
 * @param run Forecast run with its sheet.
 * @param index Hour of the run.
 * @param fill What a fill started in this hour would be, where the phase asks for one.
 * @returns Scores [0-100], verdict, reasons and figures of the hour; units in their names.
 *
 * Source: judgeFloodStart, judgeFillStart.
 */
export function scoreHour(setting: Setting, run: ForecastRun, index: number, fill: FillStart | null): ScoredHour {
  const hour = run.hours[index] as PreparedHour
  const sheet = roundedSheet(run.reports[index] as SheetReport)
  const isAvailable = isHourAvailable(setting, hour.startsAtMillis)
  if (!hour.isKnown) return unknownHour(hour, sheet, isAvailable)
  const flood = judgeFloodStart(setting, run, index)
  const { parts } = wetSurfaceBalance(hour)
  const reasons = fill
    ? fill.reasons
    : [...floodReasons(flood, parts, setting, run, index), ...snowRuleReasons(run, index)]
  const floodScore = scoreOf(flood)
  const fillScore = fill ? scoreOf(fill) : 0
  const best = Math.max(floodScore, fillScore)
  const limits = fill && fillScore >= floodScore ? fill : flood
  return {
    time: toIso(hour.startsAtMillis),
    isKnown: true,
    netHeatLossWm2: round(flood.netWm2, 1),
    parts: {
      longwave: round(parts.longwave, 1),
      sensible: round(parts.sensible, 1),
      latent: round(parts.latent, 1),
      shortwave: round(parts.shortwave, 1),
      precipitation: round(parts.precipitation, 1),
    },
    freezeRateMmPerH: round(flood.rateMmPerH, 3),
    windChillC: round(flood.windChillC, 1),
    setsAt: setsAtOf(flood),
    scores: { fill: fillScore, flood: floodScore, hold: 100 - best },
    verdict: best < VERDICT.goodScore ? 'hold' : floodScore >= fillScore ? 'flood' : 'fill',
    reasons: roundReasons(reasons),
    sheet,
    limits: { ice: Math.round(100 * limits.ice), person: Math.round(100 * limits.person) },
    weather: weatherOf(hour),
    isAvailable,
  }
}

function unknownHour(hour: PreparedHour, sheet: SheetReport, isAvailable: boolean): ScoredHour {
  return {
    time: toIso(hour.startsAtMillis),
    ...UNKNOWN_HOUR,
    reasons: [{ code: 'weather_unknown', factor: 0, values: {} }],
    sheet,
    limits: { ice: 0, person: 0 },
    isAvailable,
  }
}

function weatherOf(hour: PreparedHour): HourWeather {
  return {
    airTemperatureC: hour.airTemperatureC,
    dewPointC: round(dewPointC(hour.vapourPressureHpa), 1),
    windAtRinkMps: round(hour.windAtRinkMps, 2),
    cloudCover: round(hour.cloudCover, 2),
    precipitationMm: hour.precipitationMm,
    rainMm: round(hour.rainMm, 2),
    snowfallCm: round(hour.snowfallCm, 2),
  }
}

function roundedSheet(sheet: SheetReport): SheetReport {
  return {
    thicknessMm: round(sheet.thicknessMm, 2),
    temperatureC: round(sheet.temperatureC, 2),
    liquidMm: round(sheet.liquidMm, 2),
    snowCoverCm: round(sheet.snowCoverCm, 2),
  }
}

/** Rounds in place: the reasons were made for this hour and nobody else holds them. */
function roundReasons(reasons: Reason[]): Reason[] {
  for (const reason of reasons) {
    reason.factor = round(reason.factor, 3)
    for (const name in reason.values) {
      const value = reason.values[name]
      if (typeof value === 'number') reason.values[name] = round(value, 2)
    }
  }
  return reasons
}

const POWERS = [1, 10, 100, 1000] as const

/**
 * Rounded for reading, and never -0.
 *
 * @param value Any finite number.
 * @param digits Decimals kept.
 * @returns The number, in its own unit.
 *
 * Source: ours.
 */
export function round(value: number, digits: 0 | 1 | 2 | 3): number {
  const power = POWERS[digits]
  return Math.round(value * power) / power + 0
}
