// A range of good hours turned into a window: to the quarter hour, with its latest start and when the last layer is set.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { PreparedHour } from '@/lib/physics/types'
import { judgeFloodStart, setsAtOf } from './flood-factors'
import type { ForecastRun } from './forecast-run'
import { isGood } from './score-hours'
import { isAvailableAt, type Setting } from './setting'
import { PLAN } from './thresholds'
import { toIso } from './zoned-time'
import type { HourRange } from './windows'
import type { AdviceWindow, ScoredHour } from './types'

const QUARTERS = Array.from({ length: 60 / PLAN.stepMinutes }, (_, step) => (step * PLAN.stepMinutes) / 60)

/** Without its agreement, which needs the other forecast runs. */
export type WindowDraft = Omit<AdviceWindow, 'agreement' | 'runs'>

/**
 * Puts one window into figures.
 *
 * @param setting Rink, from makeSetting.
 * @param run Forecast run with its sheet.
 * @param scored Hours as scored, one for each hour of the run.
 * @param range Hours of the window.
 * @param bestHour Hour of the range that the forecast runs like best.
 * @param fillSetBy When the water of a fill started in the range is skinned over, for fill windows.
 * @returns Window without its agreement; instants are ISO 8601.
 *
 * Source: ours.
 */
export function describeWindow(
  setting: Setting,
  run: ForecastRun,
  scored: readonly ScoredHour[],
  range: HourRange,
  bestHour: number,
  fillSetBy: (index: number) => string | null,
): WindowDraft {
  const startOf = (index: number) => (run.hours[index] as PreparedHour).startsAtMillis
  const lastIndex = range.to - 1
  const openIn = (index: number) => QUARTERS.filter((q) => isAvailableAt(setting, startOf(index) + q * HOUR_MILLIS))
  const startsAt = startOf(range.from) + (openIn(range.from)[0] ?? 0) * HOUR_MILLIS
  const lastOpen = openIn(lastIndex).at(-1) ?? 0
  const endsAt = startOf(lastIndex) + (lastOpen + PLAN.stepMinutes / 60) * HOUR_MILLIS
  const scores = scored.slice(range.from, range.to).map((hour) => hour.scores[range.kind])
  const common = {
    kind: range.kind,
    startsAt: toIso(startsAt),
    endsAt: toIso(endsAt),
    score: Math.round(scores.reduce((sum, score) => sum + score, 0) / scores.length),
    bestStartAt: toIso(Math.max(startsAt, startOf(range.from + bestHour))),
  }
  if (range.kind === 'fill') {
    return { ...common, latestStartAt: toIso(startOf(lastIndex)), setBy: fillSetBy(lastIndex) ?? toIso(endsAt) }
  }
  const last = openIn(lastIndex)
    .reverse()
    .map((fraction) => judgeFloodStart(setting, run, lastIndex, fraction))
    .find((start) => isGood(start))
  const setBy = (last && setsAtOf(last)) ?? (scored[lastIndex] as ScoredHour).setsAt
  return { ...common, latestStartAt: toIso(last?.startMillis ?? startOf(lastIndex)), setBy: setBy ?? toIso(endsAt) }
}
