// How many forecast runs agree with the hours of a window.
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
  return runs.map((records) => carrySheet(setting, prepareHours(records.slice(0, hourCount), setting.site), false))
}

/**
 * For each hour of a window, the share of runs in which it is good to start in; 1 when there are no other runs. The
 * window's agreement is the largest of them: its best hour is the one most runs find good, and the passes are planned
 * by these shares. Held against measured nights in `npm run bench:advice`.
 */
export function hourShares(setting: Setting, runs: readonly ForecastRun[], range: HourRange): number[] {
  const hourCount = range.to - range.from
  if (runs.length === 0) return new Array<number>(hourCount).fill(1)
  const goodRuns = new Array<number>(hourCount).fill(0)
  for (const run of runs) {
    goodHours(setting, run, range).forEach(
      (isGoodHour, hour) => (goodRuns[hour] = (goodRuns[hour] ?? 0) + Number(isGoodHour)),
    )
  }
  return goodRuns.map((count) => count / runs.length)
}

function goodHours(setting: Setting, run: ForecastRun, range: HourRange): boolean[] {
  const cache: GrowthCache = new Map()
  return Array.from({ length: range.to - range.from }, (_, hour) => {
    const index = range.from + hour
    if (!run.hours[index]?.isKnown) return false
    const isFlood = range.kind === 'flood'
    return isGood(isFlood ? judgeFloodStart(setting, run, index) : judgeFillStart(setting, run, index, cache))
  })
}
