// One night in data: the verdict, its window and passes, why, and what to mind. Page, alerts and words all use this.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { nightBounds } from './night'
import { cautionsOf, whyOf } from './night-why'
import { AGREEMENT } from './thresholds'
import { toIso } from './zoned-time'
import type {
  AdviceWindow,
  Caution,
  ComingPrecipitation,
  Judgement,
  PlannedPass,
  Reason,
  ScoredHour,
  Thaw,
} from './types'

export type NightVerdict = 'flood' | 'fill' | 'hold' | 'unknown'

export interface NightSummary {
  nightDate: string
  startsAt: string
  endsAt: string
  verdict: NightVerdict
  /** The longest window that enough forecast runs agree with, the better one of two equals. */
  window: AdviceWindow | null
  /** All windows that touch the night, in order of time. */
  windows: AdviceWindow[]
  /** Passes planned in this night. */
  passes: PlannedPass[]
  lastSetBy: string | null
  /** Share of forecast runs that agree with the window, and out of how many; null without a window. */
  agreement: number | null
  runs: number
  /** Why to hold, when the verdict is hold. */
  leadingReason: Reason | null
  /** Start of the first window after this night. */
  nextGoodAt: string | null
  nextKind: 'fill' | 'flood' | null
  /** Until when nothing needs doing: the next window, else the end of the thaw, else unknown. */
  holdUntil: string | null
  /** First snow or rain after now within the night and the twelve hours after it. */
  precipitation: ComingPrecipitation | null
  thaw: Thaw | null
  /** Reasons for the list "why these hours", weightiest first. */
  why: Reason[]
  cautions: Caution[]
}

const PRECIPITATION_LOOKAHEAD_MILLIS = 12 * HOUR_MILLIS
/** A trace below this is not worth a word; the limit of the advice is in thresholds.ts. */
const WORTH_SAYING_MM = 0.1

/**
 * What a judgement says of one night.
 *
 * @param judgement Result of `judge`, or the same shape read back from storage.
 * @param options.nightDate 'yyyy-MM-dd', see night.ts.
 * @param options.now Nothing before it is advised.
 * @param options.timeZone IANA zone of the rink.
 * @returns Verdict, window, passes, reasons and cautions of the night; instants in ISO 8601.
 * @throws RangeError for an unknown zone.
 *
 * Source: ours.
 */
export function summariseNight(
  judgement: Judgement,
  options: { nightDate: string; now: Date; timeZone: string },
): NightSummary {
  const bounds = nightBounds(options.nightDate, options.timeZone)
  const fromMillis = Math.max(bounds.startsAt.getTime(), options.now.getTime())
  const toMillis = bounds.endsAt.getTime()
  const hours = judgement.hours.filter((hour) => {
    const startsAt = Date.parse(hour.time)
    return startsAt + HOUR_MILLIS > fromMillis && startsAt < toMillis
  })
  const windows = judgement.windows.filter(
    (w) => Date.parse(w.endsAt) > fromMillis && Date.parse(w.startsAt) < toMillis,
  )
  const window = longestOf(windows.filter((one) => one.agreement >= AGREEMENT.least))
  const planned = judgement.plan.passes.filter((pass) => isWithin(pass.startsAt, fromMillis - 900_000, toMillis))
  const passes = window?.kind === 'flood' ? planned : []
  const verdict = window?.kind ?? (hours.some((hour) => hour.isKnown) ? 'hold' : 'unknown')
  const next =
    judgement.windows.find((w) => Date.parse(w.startsAt) >= toMillis && w.agreement >= AGREEMENT.least) ?? null
  const thaw =
    judgement.thaws.find((t) => Date.parse(t.endsAt) > fromMillis && Date.parse(t.startsAt) < toMillis) ?? null
  const precipitation = nextPrecipitation(judgement.hours, fromMillis, toMillis + PRECIPITATION_LOOKAHEAD_MILLIS)
  return {
    nightDate: options.nightDate,
    startsAt: toIso(bounds.startsAt.getTime()),
    endsAt: toIso(bounds.endsAt.getTime()),
    verdict,
    window,
    windows,
    passes,
    lastSetBy: passes.at(-1)?.setBy ?? null,
    agreement: window?.agreement ?? null,
    runs: window?.runs ?? 0,
    leadingReason: verdict === 'hold' ? (doubtReason(windows) ?? leadingHoldReason(hours)) : null,
    nextGoodAt: next?.startsAt ?? null,
    nextKind: next?.kind ?? null,
    holdUntil: verdict === 'hold' ? (next?.startsAt ?? thaw?.endsAt ?? null) : null,
    precipitation,
    thaw,
    why: whyOf(hours, window, precipitation),
    cautions: cautionsOf(hours, window, passes),
  }
}

function isWithin(time: string, fromMillis: number, toMillis: number): boolean {
  const at = Date.parse(time)
  return at >= fromMillis && at < toMillis
}

function longestOf(windows: AdviceWindow[]): AdviceWindow | null {
  const lengthOf = (w: AdviceWindow) => Date.parse(w.endsAt) - Date.parse(w.startsAt)
  return [...windows].sort((a, b) => lengthOf(b) - lengthOf(a) || b.score - a.score)[0] ?? null
}

/** Good hours that too few forecast runs see are no advice to go out. */
function doubtReason(windows: AdviceWindow[]): Reason | null {
  const [best] = [...windows].sort((a, b) => b.agreement - a.agreement)
  if (!best) return null
  const values = { agreeing: Math.round(best.agreement * best.runs), runs: best.runs, startsAt: best.startsAt }
  return { code: 'runs_disagree', factor: best.agreement, values }
}

/** The reason that leads in most of the hours in which the keeper could go out; earliest first among equals. */
function leadingHoldReason(hours: ScoredHour[]): Reason | null {
  const known = hours.filter((hour) => hour.isKnown)
  const outside = longestStretch(known.filter((hour) => hour.verdict !== 'hold' && hour.isAvailable === false))
  const [first, last] = [outside[0], outside.at(-1)]
  if (first && last) {
    const endsAt = toIso(Date.parse(last.time) + HOUR_MILLIS)
    return { code: 'outside_your_hours', factor: 0, values: { startsAt: first.time, endsAt } }
  }
  const reachable = known.filter((hour) => hour.isAvailable !== false)
  const leads = (reachable.length > 0 ? reachable : known).flatMap((hour) => hour.reasons.slice(0, 1))
  const counts = new Map<string, number>()
  for (const lead of leads) counts.set(lead.code, (counts.get(lead.code) ?? 0) + 1)
  const most = Math.max(0, ...counts.values())
  return leads.find((lead) => counts.get(lead.code) === most) ?? null
}

/** The longest run of hours that follow one another, the earliest of equals: good hours can lie on both sides of the keeper's. */
function longestStretch(hours: readonly ScoredHour[]): ScoredHour[] {
  const stretches: ScoredHour[][] = []
  for (const hour of hours) {
    const current = stretches.at(-1)
    const before = current?.at(-1)
    if (before && Date.parse(hour.time) - Date.parse(before.time) === HOUR_MILLIS) current?.push(hour)
    else stretches.push([hour])
  }
  return stretches.reduce((longest, one) => (one.length > longest.length ? one : longest), [])
}

function nextPrecipitation(hours: ScoredHour[], fromMillis: number, toMillis: number): ComingPrecipitation | null {
  let coming: ComingPrecipitation | null = null
  for (const { time, weather } of hours) {
    const startsAt = Date.parse(time)
    if (startsAt + HOUR_MILLIS <= fromMillis || startsAt >= toMillis) continue
    const isWet = weather != null && (weather.precipitationMm > WORTH_SAYING_MM || weather.snowfallCm > WORTH_SAYING_MM)
    if (!isWet) {
      if (coming) break
      continue
    }
    const kind = weather.snowfallCm > 0 ? 'snow' : 'rain'
    coming ??= { kind, startsAt: time, endsAt: time, rainMm: 0, snowfallCm: 0 }
    coming.endsAt = toIso(startsAt + HOUR_MILLIS)
    coming.rainMm += weather.rainMm
    coming.snowfallCm += weather.snowfallCm
  }
  return coming
}
