// How many forecast runs agree with a window.
import { prepareHours } from '@/lib/physics/prepare'
import type { HourlyRecord } from '@/lib/physics/types'
import { judgeFillStart, type GrowthCache } from './fill-factors'
import { judgeFloodStart } from './flood-factors'
import { carrySheet, type ForecastRun } from './forecast-run'
import { perturbRun } from './runs'
import { isGood } from './score-hours'
import { AGREEMENT } from './thresholds'
import type { HourRange } from './windows'
import type { Setting } from './setting'
import type { JudgeOptions } from './types'

/** Members of the forecast, or runs perturbed by the error model where it has none. */
export function otherRuns(setting: Setting, options: JudgeOptions): HourlyRecord[][] {
  const { members, hours } = setting.input
  if (members && members.length > 0) return members
  const count = options.runs ?? AGREEMENT.defaultRuns
  const seed = options.seed ?? 1
  return Array.from({ length: count }, (_, run) => perturbRun(hours, setting.nowMillis, seed * 1009 + run))
}

/** Prepares the runs and carries the sheet through each, as far as anybody asks. */
export function carryRuns(setting: Setting, runs: HourlyRecord[][], hourCount: number): ForecastRun[] {
  return runs.map((records) => carrySheet(setting, prepareHours(records.slice(0, hourCount), setting.site)))
}

/** Share of runs in which at least AGREEMENT.goodShare of the window's hours are good to start in. */
export function agreementOf(setting: Setting, runs: readonly ForecastRun[], range: HourRange): number {
  if (runs.length === 0) return 1
  const needed = Math.max(1, Math.ceil((range.to - range.from) * AGREEMENT.goodShare))
  const agreeing = runs.filter((run) => goodHours(setting, run, range, needed) >= needed)
  return agreeing.length / runs.length
}

/** Counts good hours in the range, no further than `enough`. */
function goodHours(setting: Setting, run: ForecastRun, range: HourRange, enough: number): number {
  const cache: GrowthCache = new Map()
  let good = 0
  for (let index = range.from; index < range.to && good < enough; index += 1) {
    if (!run.hours[index]?.isKnown) continue
    const start =
      range.kind === 'flood' ? judgeFloodStart(setting, run, index) : judgeFillStart(setting, run, index, cache)
    if (isGood(start)) good += 1
  }
  return good
}
