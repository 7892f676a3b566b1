// How many forecast runs agree with the hours of a window.
import { bridgeLoneGaps } from '@/lib/physics/gaps'
import { prepareHours, prepareLike } from '@/lib/physics/prepare'
import { judgeFillStart, type GrowthCache } from './fill-factors'
import { judgeFloodStart } from './flood-factors'
import { carrySheet, type ForecastRun } from './forecast-run'
import { spreadStarts } from './run-starts'
import { firstPerturbed, perturbRun } from './runs'
import { scoreOf } from './score-hours'
import { AGREEMENT, VERDICT } from './thresholds'
import type { HourRange } from './windows'
import type { Setting } from './setting'
import type { JudgeOptions } from './types'

/** How many other runs there are to ask: the members of the forecast, or perturbed ones where it has none. */
function countRuns({ input }: Setting, options: JudgeOptions): number {
  return input.members?.length || (options.runs ?? AGREEMENT.defaultRuns)
}

/**
 * The other runs one after the other, with the sheet carried through each as far as anybody asks; one at a time, so
 * that none needs to be kept. Perturbed runs differ from now on: what lies before is the main run's.
 *
 * @param setting Rink, from makeSetting.
 * @param options Members or the number of perturbed runs, and their seed.
 * @param main Run of the forecast itself.
 * @param hourCount How far the sheets are carried. [h]
 * @returns Runs, made as they are asked for.
 *
 * Source: ours.
 */
export function* otherRuns(
  setting: Setting,
  options: JudgeOptions,
  main: ForecastRun,
  hourCount: number,
): Generator<ForecastRun> {
  const { members, hours } = setting.input
  if (members && members.length > 0) {
    for (const member of members) {
      yield carrySheet(setting, prepareHours(member.slice(0, hourCount), setting.site), { run: main, count: 0 })
    }
    return
  }
  const asked = bridgeLoneGaps(hours.slice(0, hourCount))
  const count = firstPerturbed(asked, setting.nowMillis)
  const seed = (options.seed ?? 1) * 1009
  for (const [run, start] of spreadStarts(countRuns(setting, options), seed).entries()) {
    const records = perturbRun(asked, setting.nowMillis, seed + run, start)
    yield carrySheet(setting, prepareLike(records, main.hours, count, setting.site), { run: main, count })
  }
}

/** How the runs see one hour of a window. */
export interface HourAgreement {
  /** Share of runs in which what is started in it comes off. 0-1 */
  share: number
  /** Mean over the runs of its score, counted nothing where it does not come off. 0-100 */
  meanScore: number
}

/** What the runs asked so far say of the hours of a window. */
export type RangeTally = { range: HourRange; shares: Float64Array; scoreSums: Float64Array }

/**
 * A tally of which no run has been asked yet.
 *
 * @param range Hours of the window.
 * @returns Shares and sums of scores, all 0.
 *
 * Source: ours.
 */
export function startTally(range: HourRange): RangeTally {
  const length = range.to - range.from
  return { range, shares: new Float64Array(length), scoreSums: new Float64Array(length) }
}

/**
 * Asks one run about the hours of a window.
 *
 * @param tally Tally; changed in place.
 * @param setting Rink, from makeSetting.
 * @param run Forecast run with its sheet.
 *
 * Source: ours.
 */
export function addToTally({ range, shares, scoreSums }: RangeTally, setting: Setting, run: ForecastRun): void {
  const cache: GrowthCache = new Map()
  for (let index = range.from; index < range.to; index += 1) {
    if (!run.hours[index]?.isKnown) continue
    const score = range.kind === 'flood' ? floodScore(setting, run, index) : fillScore(setting, run, index, cache)
    if (score === null) continue
    shares[index - range.from]! += 1
    scoreSums[index - range.from]! += score
  }
}

/**
 * A flood comes off when it sets in time and dry and nothing else about it is fatal, and the person can be out. How well
 * it scores is another matter: a slow flood that is set at dawn is no disagreement. Null when it does not come off.
 */
function floodScore(setting: Setting, run: ForecastRun, index: number): number | null {
  const start = judgeFloodStart(setting, run, index)
  return start.ice > 0 && 100 * start.person >= VERDICT.goodScore ? scoreOf(start) : null
}

function fillScore(setting: Setting, run: ForecastRun, index: number, cache: GrowthCache): number | null {
  const score = scoreOf(judgeFillStart(setting, run, index, cache))
  return score >= VERDICT.goodScore ? score : null
}

/**
 * How the runs see each hour of a window. The window's best hour is the one in which most runs come off, and the share
 * at that hour is the window's agreement; held against measured nights in `npm run bench:advice`.
 *
 * @param tally Counts of the window.
 * @param runs How many have been asked.
 * @param scores The forecast's own scores for the range, which stand where there are no other runs.
 * @returns For each hour the share of runs that come off [0-1] and their mean score [0-100].
 *
 * Source: ours.
 */
export function hourAgreements(tally: RangeTally, runs: number, scores: readonly number[]): HourAgreement[] {
  if (runs === 0) return scores.map((score) => ({ share: 1, meanScore: score }))
  return scores.map((_, hour) => ({
    share: (tally.shares[hour] ?? 0) / runs,
    meanScore: (tally.scoreSums[hour] ?? 0) / runs,
  }))
}

/**
 * Hour of the window in which most runs come off; of equals the one with the highest mean score, then the earliest.
 *
 * @param agreements Of the window's hours, in order.
 * @returns Place in the list, from 0.
 *
 * Source: ours.
 */
export function bestHour(agreements: readonly HourAgreement[]): number {
  let best = 0
  for (const [index, { share, meanScore }] of agreements.entries()) {
    const lead = agreements[best]
    if (lead && (share > lead.share || (share === lead.share && meanScore > lead.meanScore))) best = index
  }
  return best
}
