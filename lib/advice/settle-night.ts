// What came of a night's advice, once it is over: kept or broken, by people's reports, else by the later weather.
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { FOUND, NEEDED } from './thresholds'
import { instantOfLocal, localDateOf, addDays } from './zoned-time'
import { localMinuteOf } from './night'
import type { Judgement, PlannedPass, ScoredHour } from './types'

/** More than this between pour and set spoils a layer, as in the advice (rule I05: Les Versants). [mm] */
const SPOILS_MM = 0.1

/** What stood when the night's window was to begin. */
export interface SaidNight {
  said: 'flood' | 'fill' | 'hold'
  startsAt: string | null
  endsAt: string | null
  passes: readonly PlannedPass[]
}

/** What somebody found of a layer. "Set" tells that it was set by then, "wet" that it was not. */
export interface LayerReport {
  pouredAt: string
  saidSetBy: string | null
  outcome: 'set' | 'wet' | 'spoiled'
  at: string
}

export interface SettledNight {
  result: 'kept' | 'broken' | 'unknown'
  source: 'report' | 'weather' | 'none'
  /** `code` and numbers; words are made in lib/words. */
  detail: { code: SettledCode; values: Record<string, number | string> }
}

export type SettledCode =
  | 'found_set'
  | 'found_wet'
  | 'found_spoiled'
  | 'would_set'
  | 'too_slow'
  | 'precipitation'
  | 'nothing_missed'
  | 'missed'
  | 'no_weather'

/**
 * Settles one night.
 *
 * A report counts before the weather; wet is broken from a quarter of an hour after what was said. Without one, a flood was good advice when every pass, poured on the hour it was
 * advised for, would have set by 7 am with no more than 0.1 mm of rain or snow before; holding off was good advice
 * when the later weather has no flood window in the keeper's hours.
 *
 * @param night What was said.
 * @param hindsight Judgement of the same night with the weather as it came, from the night's start on.
 * @param reports What people found, of layers poured in this night.
 * @param timeZone IANA zone of the rink.
 * @returns Whether it was good advice, and what settled it.
 * @throws RangeError for an unknown zone.
 *
 * Source: ours.
 */
export function settleNight(
  night: SaidNight,
  hindsight: Pick<Judgement, 'hours' | 'windows'>,
  reports: readonly LayerReport[],
  timeZone: string,
): SettledNight {
  if (night.said === 'flood') {
    return settledByReports(reports) ?? settledByWeather(night, hindsight.hours, timeZone)
  }
  if (!hindsight.hours.some((hour) => hour.isKnown)) return NO_WEATHER
  const missed = hindsight.windows.find((window) => window.kind === 'flood')
  if (!missed) return { result: 'kept', source: 'weather', detail: { code: 'nothing_missed', values: {} } }
  const values = { startsAt: missed.startsAt, endsAt: missed.endsAt }
  return { result: 'broken', source: 'weather', detail: { code: 'missed', values } }
}

const NO_WEATHER: SettledNight = { result: 'unknown', source: 'none', detail: { code: 'no_weather', values: {} } }

function settledByReports(reports: readonly LayerReport[]): SettledNight | null {
  const spoiled = reports.find(({ outcome }) => outcome === 'spoiled')
  if (spoiled) return byReport('broken', 'found_spoiled', spoiled)
  const wet = reports.find(({ outcome, at, saidSetBy }) => outcome === 'wet' && saidSetBy && isLate(at, saidSetBy))
  if (wet) return byReport('broken', 'found_wet', wet)
  const set = reports.findLast(({ outcome }) => outcome === 'set')
  return set ? byReport('kept', 'found_set', set) : null
}

/**
 * Whether somebody looked later than what was said, and the grace that a look without a watch is given.
 *
 * @param at When they looked. ISO 8601
 * @param saidSetBy By when it was said to be set. ISO 8601
 * @returns Whether what they found then tells against what was said.
 *
 * Source: FOUND in thresholds.ts.
 */
export function isLate(at: string, saidSetBy: string): boolean {
  return Date.parse(at) - Date.parse(saidSetBy) > FOUND.graceMinutes * MINUTE_MILLIS
}

function byReport(result: 'kept' | 'broken', code: SettledCode, { at, saidSetBy }: LayerReport): SettledNight {
  return { result, source: 'report', detail: { code, values: { at, ...(saidSetBy ? { saidSetBy } : {}) } } }
}

function settledByWeather(night: SaidNight, hours: readonly ScoredHour[], timeZone: string): SettledNight {
  const starts = night.passes.length > 0 ? night.passes.map(({ startsAt }) => startsAt) : [night.startsAt ?? '']
  let lastSetAt = ''
  for (const startsAt of starts) {
    const index = hourAt(hours, startsAt)
    const hour = hours[index]
    if (!hour?.isKnown) return NO_WEATHER
    const wetAt = precipitationBefore(hours, index, hour.setsAt)
    if (wetAt) return byWeather('broken', 'precipitation', { startsAt, at: wetAt })
    const neededBy = nextSevenAm(Date.parse(startsAt), timeZone)
    if (hour.setsAt === null || Date.parse(hour.setsAt) > neededBy) {
      return byWeather('broken', 'too_slow', { startsAt, ...(hour.setsAt ? { at: hour.setsAt } : {}) })
    }
    if (hour.setsAt > lastSetAt) lastSetAt = hour.setsAt
  }
  return byWeather('kept', 'would_set', { at: lastSetAt })
}

function byWeather(result: 'kept' | 'broken', code: SettledCode, values: Record<string, string>): SettledNight {
  return { result, source: 'weather', detail: { code, values } }
}

function hourAt(hours: readonly ScoredHour[], instant: string): number {
  const millis = Date.parse(instant)
  return hours.findIndex(({ time }) => Date.parse(time) <= millis && millis < Date.parse(time) + HOUR_MILLIS)
}

/** Start of the hour in which precipitation since the pour exceeds what a wet layer bears, if it does before the layer is set. */
function precipitationBefore(hours: readonly ScoredHour[], from: number, setsAt: string | null): string | null {
  let fallenMm = 0
  for (const { time, weather } of hours.slice(from)) {
    if (setsAt !== null && time >= setsAt) return null
    fallenMm += weather?.precipitationMm ?? 0
    if (fallenMm > SPOILS_MM) return time
  }
  return null
}

function nextSevenAm(millis: number, timeZone: string): number {
  const date = localDateOf(millis, timeZone)
  const day = localMinuteOf(millis, timeZone) < NEEDED.readyByMinuteOfDay ? date : addDays(date, 1)
  return instantOfLocal(day, NEEDED.readyByMinuteOfDay, timeZone)
}
