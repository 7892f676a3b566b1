// The nights ahead, one by one: verdict, ice gained or lost, what falls, and how many forecast runs agree.
import { HOUR_MILLIS, ICE_DENSITY, WATER_DENSITY } from '@/lib/physics/constants'
import { tonightDate } from './night'
import { summariseNight, type NightSummary, type NightVerdict } from './night-summary'
import type { NightRuns } from './night-runs'
import { AGREEMENT, FLOOD } from './thresholds'
import { estimatePasses, type NightPasses } from './week-passes'
import { addDays, toIso } from './zoned-time'
import type { AdviceWindow, Judgement, Phase, Reason, ScoredHour, Thaw } from './types'

/** From the fourth night on people plan with a forecast and do not decide on it. Ours. */
const NEAR_NIGHTS = 3
/** A night of which the forecast covers less than half tells nothing. Ours. */
const LEAST_HOURS = 12
/** A night with this many hours of a thaw belongs to it. Ours. */
const THAW_HOURS = 12
/** A trace below this is not worth a word. [mm, cm] */
const WORTH_SAYING = 0.1

const HAS_ICE: readonly Phase[] = ['freezing', 'skating', 'thaw']

/** Snow and rain of a night, from the first wet hour to the last. */
export interface NightFall {
  startsAt: string
  endsAt: string
  rainMm: number
  snowfallCm: number
}

export interface NightAhead {
  nightDate: string
  startsAt: string
  endsAt: string
  verdict: NightVerdict | 'thaw'
  /** Beyond the horizon of a decision. */
  isFar: boolean
  window: AdviceWindow | null
  /** Runs that find the window good, or the best hour where there is none to advise; null where no run was asked. */
  agreement: { agreeing: number; runs: number } | null
  /** Null when nothing is to be poured. */
  passes: NightPasses | null
  /** What the weather does to the sheet, noon to noon, without floods; null without ice or with hours missing. [mm of ice] */
  weatherMm: number | null
  /** What the passes would add. [mm of ice] */
  floodsMm: number
  /** Water that could freeze in the night; null with hours missing. [mm] */
  freezableMm: number | null
  lowC: number | null
  highC: number | null
  falls: NightFall | null
  /** Snow to clear before the flood. [cm] */
  snowToClearCm: number
  /** Why to hold. */
  reason: Reason | null
  thaw: Thaw | null
  /** Where the forecast ends inside the night. */
  forecastEndsAt: string | null
}

export interface WeekSetting {
  now: Date
  timeZone: string
  phase: Phase
  layerMm: number
  maxPasses: number
  /** The night that the judgement's plan is for; an old one planned for another. */
  plannedDate: string
  /** Of nights without a window, see askOtherNights. */
  otherNights: readonly NightRuns[]
  /** At most so many nights. */
  nights: number
}

/**
 * The nights from tonight on, as far as the forecast covers them.
 *
 * @param judgement Result of `judge`, or the same shape read back from storage.
 * @param setting.layerMm Water of one pass. [mm], above 0
 * @returns Nights in order. Passes of the planned night are the plan's; those of other nights are estimated from the
 *   window.
 * @throws RangeError for an unknown zone.
 *
 * Source: summariseNight; passes by estimatePasses.
 */
export function nightsAhead(judgement: Judgement, setting: WeekSetting): NightAhead[] {
  const tonight = tonightDate(setting.now, setting.timeZone)
  const nights: NightAhead[] = []
  let clearedAt: string | null = null
  for (let index = 0; index < setting.nights; index += 1) {
    const nightDate = addDays(tonight, index)
    const summary = summariseNight(judgement, { nightDate, now: setting.now, timeZone: setting.timeZone })
    const hours = judgement.hours.filter(({ time }) => time >= summary.startsAt && time < summary.endsAt)
    if (hours.length < LEAST_HOURS) break
    const snowToClearCm = snowToClear(judgement.hours, summary, clearedAt)
    if (snowToClearCm > 0) clearedAt = summary.window?.startsAt ?? clearedAt
    nights.push({ ...nightAhead(judgement, setting, summary, hours, index), snowToClearCm })
  }
  return nights
}

function nightAhead(
  judgement: Judgement,
  setting: WeekSetting,
  summary: NightSummary,
  hours: ScoredHour[],
  index: number,
): Omit<NightAhead, 'snowToClearCm'> {
  const passes = passesOf(summary, hours, setting)
  const window = windowOf(summary)
  const isWhole = hours.every((hour) => hour.isKnown)
  const air = hours.flatMap(({ weather }) => (weather ? [weather.airTemperatureC] : []))
  const lastEnd = Date.parse(hours.at(-1)?.time ?? summary.startsAt) + HOUR_MILLIS
  return {
    nightDate: summary.nightDate,
    startsAt: summary.startsAt,
    endsAt: summary.endsAt,
    verdict: verdictOf(summary, hours),
    isFar: index >= NEAR_NIGHTS,
    window,
    agreement: agreementOf(window, summary, setting.otherNights),
    passes,
    weatherMm: isWhole && HAS_ICE.includes(setting.phase) ? weatherChange(judgement.hours, hours) : null,
    floodsMm: ((passes?.count ?? 0) * setting.layerMm * WATER_DENSITY) / ICE_DENSITY,
    freezableMm: isWhole ? hours.reduce((sum, hour) => sum + Math.max(0, hour.freezeRateMmPerH ?? 0), 0) : null,
    lowC: air.length > 0 ? Math.min(...air) : null,
    highC: air.length > 0 ? Math.max(...air) : null,
    falls: fallsOf(hours, setting.now),
    reason: summary.leadingReason,
    thaw: summary.thaw,
    forecastEndsAt: lastEnd < Date.parse(summary.endsAt) ? toIso(lastEnd) : null,
  }
}

/** Cold hours between two mild spells freeze what melted: a thaw that long is the night's only when the air is mild too. */
function verdictOf({ verdict, thaw }: NightSummary, hours: readonly ScoredHour[]): NightAhead['verdict'] {
  if (verdict !== 'hold' || !thaw) return verdict
  const thawing = hours.filter(({ time }) => time >= thaw.startsAt && time < thaw.endsAt)
  const mild = hours.filter(({ weather }) => (weather?.airTemperatureC ?? 0) > 0)
  return thawing.length >= THAW_HOURS && mild.length >= hours.length / 2 ? 'thaw' : 'hold'
}

/** A time to fill is a day's and reaches over noon: of several the night has the one that lies in it most. */
function windowOf({ window, windows, startsAt, endsAt }: NightSummary): AdviceWindow | null {
  if (window?.kind !== 'fill') return window
  const inside = (one: AdviceWindow) =>
    Math.min(Date.parse(one.endsAt), Date.parse(endsAt)) - Math.max(Date.parse(one.startsAt), Date.parse(startsAt))
  const fills = windows.filter(({ kind, agreement }) => kind === 'fill' && agreement >= AGREEMENT.least)
  return fills.reduce((best, one) => (inside(one) > inside(best) ? one : best), fills[0] ?? window)
}

function agreementOf(
  window: AdviceWindow | null,
  { windows, nightDate }: NightSummary,
  otherNights: readonly NightRuns[],
): NightAhead['agreement'] {
  const asked = window ?? [...windows].sort((a, b) => b.agreement - a.agreement)[0]
  if (asked) return asked.runs === 0 ? null : { agreeing: Math.round(asked.agreement * asked.runs), runs: asked.runs }
  const other = otherNights.find((one) => one.nightDate === nightDate)
  return other ? { agreeing: other.agreeing, runs: other.runs } : null
}

function passesOf(summary: NightSummary, hours: ScoredHour[], setting: WeekSetting): NightPasses | null {
  if (summary.window?.kind !== 'flood') return null
  if (summary.nightDate !== setting.plannedDate) return estimatePasses(summary.window, hours, setting.maxPasses)
  const [first] = summary.passes
  if (!first || !summary.lastSetBy) return null
  return { count: summary.passes.length, startsAt: first.startsAt, setBy: summary.lastSetBy, isEstimate: false }
}

/** Thickness at the end of the night less that at its start; before the forecast's first hour it is taken as that hour's. */
function weatherChange(all: readonly ScoredHour[], hours: readonly ScoredHour[]): number {
  const [first, last] = [hours[0], hours.at(-1)]
  if (!first || !last) return 0
  const before = all.findLast((hour) => hour.time < first.time) ?? first
  return last.sheet.thicknessMm - before.sheet.thicknessMm
}

function fallsOf(hours: readonly ScoredHour[], now: Date): NightFall | null {
  let falls: NightFall | null = null
  for (const { time, weather } of hours) {
    const endMillis = Date.parse(time) + HOUR_MILLIS
    if (!weather || endMillis <= now.getTime()) continue
    if (weather.rainMm <= WORTH_SAYING && weather.snowfallCm <= WORTH_SAYING) continue
    falls ??= { startsAt: time, endsAt: time, rainMm: 0, snowfallCm: 0 }
    falls.endsAt = toIso(endMillis)
    falls.rainMm += weather.rainMm
    falls.snowfallCm += weather.snowfallCm
  }
  return falls
}

/**
 * The sheet is carried on as if nobody cleared it. Once an earlier night of the list asks for clearing, only the snow since
 * then is left to clear.
 */
function snowToClear(hours: readonly ScoredHour[], { window }: NightSummary, clearedAt: string | null): number {
  if (window?.kind !== 'flood') return 0
  const start = hours.findLast(({ time }) => time <= window.startsAt)
  if (!start?.reasons.some(({ code }) => code === 'snow_to_clear')) return 0
  if (clearedAt === null) return start.sheet.snowCoverCm
  const since = hours.filter(({ time }) => time >= clearedAt && time < window.startsAt)
  const fallenCm = since.reduce((sum, { weather }) => sum + (weather?.snowfallCm ?? 0), 0)
  return fallenCm > FLOOD.snowToClearCm.one ? Math.min(fallenCm, start.sheet.snowCoverCm) : 0
}
