// The factors of a flood started at one moment, as numbers from 0 to 1; flood-reasons.ts puts names to them.
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { minutesToSet } from '@/lib/physics/layer'
import { freezeRateMmPerH } from '@/lib/physics/balance'
import { clearSnow, reportSheet, type SheetState } from '@/lib/physics/sheet'
import type { PreparedHour } from '@/lib/physics/types'
import { wetSeason } from '@/lib/physics/wet-season'
import { windChillC } from '@/lib/physics/wind-chill'
import { bearsFlood, waterBelowMm } from './bearing'
import { overallDesirability, rampDesirability } from './desirability'
import type { ForecastRun } from './forecast-run'
import { neededMillis, type Setting } from './setting'
import { FLOOD, PERSON } from './thresholds'
import { toIso } from './zoned-time'
import type { SheetReport } from './types'

/** Sums of tenths are a hair off. */
const ROUNDING_MM = 1e-6

export interface FloodFactors {
  bears: number
  rate: number
  dry: number
  set: number
  slack: number
  air: number
  wind: number
  gust: number
  lastLayer: number
  snow: number
}

/** Everything known of a flood started at one moment. */
export interface FloodStart {
  startMillis: number
  hour: PreparedHour
  /** Of a wet surface at 0 °C. */
  netWm2: number
  rateMmPerH: number
  windChillC: number
  windAtRinkMps: number
  gustAtRinkMps: number
  sheet: SheetReport
  /** Unfrozen water that is, or may be, under the ice. [mm] */
  waterBelowMm: number
  setMinutes: number | null
  neededMillis: number
  /** From pour to set and a margin, or to when it is needed if it does not set. [mm] */
  wetMm: number
  factors: FloodFactors
  hose: number
  skin: number
  /** 0-1 */
  ice: number
  /** 0-1, the worse of hose and skin */
  person: number
}

/**
 * Judges a flood started in a known hour.
 *
 * @param setting The rink.
 * @param run Forecast run with its sheet.
 * @param index Hour of the start; must be known.
 * @param fraction Share of that hour gone by, 0 to below 1.
 * @param sheet The sheet to pour on, when it is not the run's own.
 * @returns Shares for ice and person [0-1], their factors, and the set time. [min]
 *
 * Source: limits in FLOOD and PERSON; set time by minutesToSet; weights as in overallDesirability.
 */
export function judgeFloodStart(
  setting: Setting,
  run: ForecastRun,
  index: number,
  fraction = 0,
  sheet: SheetState = run.sheets[index] as SheetState,
): FloodStart {
  const hour = run.hours[index] as PreparedHour
  const startMillis = hour.startsAtMillis + fraction * HOUR_MILLIS
  const netWm2 = wetSeason(run.hours).lossWm2[index] as number
  const report = reportSheet(sheet)
  const cleared = report.snowCoverCm > 0 ? clearSnow(sheet) : sheet
  const rateMmPerH = freezeRateMmPerH(netWm2)
  const needed = neededMillis(setting, startMillis)
  const setMinutes = knownMinutesToSet(setting, run, index, fraction, cleared)
  const untilMillis = setMinutes === null ? needed : startMillis + setMinutes * (1 + FLOOD.setMargin) * MINUTE_MILLIS
  const chill = windChillC(hour.airTemperatureC, hour.windSpeedMps)
  const hose = rampDesirability(hour.airTemperatureC, PERSON.floodHoseC)
  const skin = isBeyondLimit(setting, 'windChillC', chill) ? 0 : rampDesirability(chill, PERSON.windChillC)
  const start: FloodStart = {
    startMillis,
    hour,
    netWm2,
    rateMmPerH,
    windChillC: chill,
    windAtRinkMps: hour.windAtRinkMps,
    gustAtRinkMps: hour.windGustMps * setting.gustFactor,
    sheet: report,
    waterBelowMm: waterBelowMm(setting, sheet, report),
    setMinutes,
    neededMillis: needed,
    wetMm: wetBetween(run, index, untilMillis),
    factors: NO_FACTORS,
    hose,
    skin,
    ice: 0,
    person: Math.min(hose, skin),
  }
  start.factors = floodFactors(start, setting)
  start.ice = overallDesirability(start.factors, FLOOD.weights)
  return start
}

/**
 * When a flood has set, told to the minute and never too early.
 *
 * @param start Start [ms since the epoch] and set time [min], null when it does not set.
 * @returns Instant in ISO 8601, or null.
 *
 * Source: ours.
 */
export function setsAtOf({ startMillis, setMinutes }: Pick<FloodStart, 'startMillis' | 'setMinutes'>): string | null {
  return setMinutes === null ? null : toIso(Math.ceil(startMillis / MINUTE_MILLIS + setMinutes) * MINUTE_MILLIS)
}

const NO_FACTORS: FloodFactors = {
  bears: 0,
  rate: 0,
  dry: 0,
  set: 0,
  slack: 0,
  air: 0,
  wind: 0,
  gust: 0,
  lastLayer: 0,
  snow: 0,
}

/** Null also when the weather is unknown before the layer is set: no flood is advised into a gap. */
function knownMinutesToSet(
  setting: Setting,
  run: ForecastRun,
  index: number,
  fraction: number,
  sheet: SheetState,
): number | null {
  const minutes = minutesToSet(sheet, run.hours, index, fraction, setting.layer)
  if (minutes === null) return null
  const lastHour = Math.min(run.hours.length, Math.ceil(index + fraction + minutes / 60))
  return (run.unknownBefore[lastHour] as number) > (run.unknownBefore[index] as number) ? null : minutes
}

/** Whole hours are counted, the first and the last too: when in the hour it falls is not known. */
function wetBetween(run: ForecastRun, index: number, untilMillis: number): number {
  const first = run.hours[0] as PreparedHour
  const end = Math.ceil((untilMillis - first.startsAtMillis) / HOUR_MILLIS)
  const last = Math.min(run.hours.length, Math.max(index + 1, end))
  return (run.wetBefore[last] as number) - (run.wetBefore[index] as number)
}

/** Whether the keeper said that they stay in at such wind or cold. */
function isBeyondLimit({ input }: Setting, limit: 'windMps' | 'windChillC', value: number): boolean {
  const { windMps = Infinity, windChillC: leastC = -Infinity } = input.limits ?? {}
  return limit === 'windMps' ? value > windMps : value < leastC
}

function floodFactors(start: FloodStart, setting: Setting): FloodFactors {
  const { setMinutes, sheet } = start
  const isDry = start.wetMm <= FLOOD.precipitationMm + ROUNDING_MM
  const slack = setMinutes === null ? 0 : (start.neededMillis - start.startMillis) / MINUTE_MILLIS - setMinutes
  return {
    bears: bearsFlood(setting, sheet.thicknessMm, start.waterBelowMm),
    rate: rampDesirability(start.rateMmPerH, FLOOD.freezeRateMmPerH),
    dry: isDry ? 1 - (1 - FLOOD.traceFactor) * (start.wetMm / FLOOD.precipitationMm) : 0,
    set: setDesirability(setMinutes),
    slack: rampDesirability(slack, FLOOD.slackMinutes),
    air: Math.min(
      rampDesirability(start.hour.airTemperatureC, FLOOD.airTooWarmC),
      rampDesirability(start.hour.airTemperatureC, FLOOD.airTooColdC),
    ),
    wind: isBeyondLimit(setting, 'windMps', start.windAtRinkMps)
      ? 0
      : rampDesirability(start.windAtRinkMps, FLOOD.windAtRinkMps),
    gust: rampDesirability(start.gustAtRinkMps, FLOOD.gustAtRinkMps),
    lastLayer: rampDesirability(sheet.liquidMm, FLOOD.wetMm),
    snow: rampDesirability(sheet.snowCoverCm, FLOOD.snowToClearCm),
  }
}

function setDesirability(setMinutes: number | null): number {
  if (setMinutes === null || setMinutes > FLOOD.longestSetMinutes) return 0
  return Math.min(1, Math.exp(-(setMinutes - FLOOD.set.quickMinutes) / FLOOD.set.fadeMinutes))
}
