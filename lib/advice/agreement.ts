// How many forecast runs agree with the hours of a window.
import { prepareHours } from '@/lib/physics/prepare'
import type { HourlyRecord } from '@/lib/physics/types'
import { judgeFillStart, type GrowthCache } from './fill-factors'
import { judgeFloodStart } from './flood-factors'
import { carrySheet, type ForecastRun } from './forecast-run'
import { perturbRun } from './runs'
import { scoreOf } from './score-hours'
import { AGREEMENT, VERDICT } from './thresholds'
import type { HourRange } from './windows'
import type { Setting } from './setting'
import type { JudgeOptions } from './types'

/** How many other runs there are to ask: the members of the forecast, or perturbed ones where it has none. */
function countRuns({ input }: Setting, options: JudgeOptions): number {
  return input.members?.length || (options.runs ?? AGREEMENT.defaultRuns)
}

/** The other runs, with the sheet carried through each, as far as anybody asks. */
export function otherRuns(setting: Setting, options: JudgeOptions, hourCount: number): ForecastRun[] {
  const { members, hours } = setting.input
  const carry = (records: HourlyRecord[]) => carrySheet(setting, prepareHours(records, setting.site), false)
  if (members && members.length > 0) return members.map((member) => carry(member.slice(0, hourCount)))
  const asked = hours.slice(0, hourCount)
  const seed = (options.seed ?? 1) * 1009
  return Array.from({ length: countRuns(setting, options) }, (_, run) =>
    carry(perturbRun(asked, setting.nowMillis, seed + run)),
  )
}

/** How the runs see one hour of a window. */
export interface HourAgreement {
  /** Share of runs in which it is good to start in. 0-1 */
  share: number
  /** Mean over the runs of its score, in which a bad hour counts nothing. 0-100 */
  meanScore: number
}

/**
 * How the runs see each hour of a window. The window's best hour is the one with the highest mean score, and the share at
 * that hour is the window's agreement; held against measured nights in `npm run bench:advice`.
 *
 * @param scores The forecast's own scores for the range, which stand where there are no other runs.
 */
export function hourAgreements(
  setting: Setting,
  runs: readonly ForecastRun[],
  range: HourRange,
  scores: readonly number[],
): HourAgreement[] {
  if (runs.length === 0) return scores.map((score) => ({ share: 1, meanScore: score }))
  const sums = scores.map(() => ({ share: 0, meanScore: 0 }))
  for (const run of runs) {
    for (const [hour, score] of runScores(setting, run, range).entries()) {
      const sum = sums[hour] as HourAgreement
      if (score < VERDICT.goodScore) continue
      sum.share += 1 / runs.length
      sum.meanScore += score / runs.length
    }
  }
  return sums.map(({ share, meanScore }) => ({ share: Math.min(1, share), meanScore }))
}

/** Hour of the window with the highest mean score; the earliest of equals. */
export function bestHour(agreements: readonly HourAgreement[]): number {
  const scores = agreements.map(({ meanScore }) => meanScore)
  return scores.indexOf(Math.max(...scores))
}

function runScores(setting: Setting, run: ForecastRun, range: HourRange): number[] {
  const cache: GrowthCache = new Map()
  return Array.from({ length: range.to - range.from }, (_, hour) => {
    const index = range.from + hour
    if (!run.hours[index]?.isKnown) return 0
    const isFlood = range.kind === 'flood'
    return scoreOf(isFlood ? judgeFloodStart(setting, run, index) : judgeFillStart(setting, run, index, cache))
  })
}
