// How many passes a later night has room for: a count from the window, until the plan of that day is made.
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { PLAN } from './thresholds'
import { toIso } from './zoned-time'
import type { AdviceWindow, ScoredHour } from './types'

const STEP_MILLIS = PLAN.stepMinutes * MINUTE_MILLIS

export interface NightPasses {
  count: number
  /** First pour and last set. */
  startsAt: string
  setBy: string
  /** Counted from the window; only tonight has a plan. */
  isEstimate: boolean
}

/**
 * Passes one after the other from the start of the window, each once the last is set. Every pass is taken to set as
 * fast as the first one of its hour would; on a sheet that the pass before has warmed it takes somewhat longer, so
 * the count is an upper one.
 *
 * @param window Window of the night.
 * @param hours The night's hours, in order.
 * @param maxPasses Most passes of a night, 0 or more.
 * @returns Number of passes, first pour and last set in ISO 8601; null when no pass fits.
 *
 * Source: ours.
 */
export function estimatePasses(
  window: AdviceWindow,
  hours: readonly ScoredHour[],
  maxPasses: number,
): NightPasses | null {
  const lastStart = Date.parse(window.latestStartAt)
  let at = Date.parse(window.startsAt)
  let count = 0
  let setMillis = at
  while (count < maxPasses && at <= lastStart) {
    const hour = hours.find(({ time }) => Date.parse(time) <= at && at < Date.parse(time) + HOUR_MILLIS)
    if (hour?.verdict !== 'flood' || hour.setsAt === null) break
    setMillis = at + Date.parse(hour.setsAt) - Date.parse(hour.time)
    count += 1
    at = Math.ceil(setMillis / STEP_MILLIS) * STEP_MILLIS
  }
  return count === 0 ? null : { count, startsAt: window.startsAt, setBy: toIso(setMillis), isEstimate: true }
}
