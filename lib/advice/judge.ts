// The one way in: weather, rink and settings go in, scored hours, windows, a plan, the fill and thaws come out.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { prepareHours } from '@/lib/physics/prepare'
import { reportSheet, type SheetState } from '@/lib/physics/sheet'
import { addToTally, bestHour, hourAgreements, otherRuns, startTally, type HourAgreement } from './agreement'
import { describeWindow } from './describe-window'
import { judgeFillStart, type FillStart, type GrowthCache } from './fill-factors'
import { fillOutlook, growthOf, type Grown } from './fill-outlook'
import { carrySheet, type ForecastRun } from './forecast-run'
import { round, scoreHour } from './score-hours'
import { makeSetting, type Setting } from './setting'
import { findThaws } from './thaw'
import { AGREEMENT, VERDICT } from './thresholds'
import { planTonight } from './tonight-plan'
import { findWindows, type HourRange } from './windows'
import { toIso } from './zoned-time'
import type { AdviceWindow, Judgement, JudgeInput, JudgeOptions, ScoredHour } from './types'

/** Changes when the same input may give another judgement. */
export const MODEL_VERSION = 'nightsheet-3'
/** Hours after a window that other runs need, so that its last layer can set in them. */
const HOURS_TO_SET = 24

/**
 * Judges a forecast for one rink.
 *
 * @param input Rink, water, sheet, hours and settings; see JudgeInput. Hours must follow each other without a gap;
 *   what is missing in them is null.
 * @param options Other runs and their seed, and the hour at which the sheet's state is wanted.
 * @returns Scores for every hour given, and from `now` on the windows, the plan of tonight, the fill and thaws.
 * @throws RangeError for values out of range, hours that do not follow each other, or an unknown zone.
 *
 * Source: the functions of this folder that it calls; limits and their sources in thresholds.ts.
 */
export function judge(input: JudgeInput, options: JudgeOptions = {}): Judgement {
  const setting = makeSetting(input)
  const main = carrySheet(setting, prepareHours(input.hours, setting.site))
  const fills = fillStarts(setting, main)
  const hours = main.hours.map((_, index) => scoreHour(setting, main, index, fills[index] ?? null))
  const ranges = openRanges(setting, main, hours)
  const { agreements, runs } = askRuns(setting, options, main, ranges, hours)
  const fillStart = fillStartIndex(ranges, agreements)
  const windows = ranges.map((range, index): AdviceWindow => {
    const ofRange = agreements[index] as HourAgreement[]
    const best = bestHour(ofRange)
    const draft = describeWindow(setting, main, hours, range, best, (at) => skinAtOf(main, fills[at]))
    return { ...draft, agreement: round(ofRange[best]?.share ?? 1, 3), runs }
  })
  const shareAt = new Map(
    ranges.flatMap(({ from }, index) =>
      (agreements[index] ?? []).map(({ share }, hour) => [from + hour, share] as const),
    ),
  )
  return {
    modelVersion: MODEL_VERSION,
    hours,
    windows,
    plan: { passes: planTonight(setting, main, hours, shareAt) },
    fill: fillOutlook(setting, main, growthsFrom(setting, options, main, fillStart), fillStart),
    thaws: thawsOf(main, hours),
    ...(options.stateAt === undefined ? {} : { sheetState: sheetStateAt(main, options.stateAt) }),
  }
}

function scoresOf(hours: readonly ScoredHour[], range: HourRange): number[] {
  return hours.slice(range.from, range.to).map((hour) => hour.scores[range.kind])
}

/** Only rinks that wait for a fill, or are being filled, are asked about filling. */
function fillStarts(setting: Setting, run: ForecastRun): (FillStart | null)[] {
  const { phase } = setting.input.rink
  if (phase !== 'waiting' && phase !== 'filling') return []
  const cache: GrowthCache = new Map()
  return run.hours.map((hour, index) => (hour.isKnown ? judgeFillStart(setting, run, index, cache) : null))
}

function openRanges(setting: Setting, run: ForecastRun, hours: readonly ScoredHour[]): HourRange[] {
  return findWindows(
    hours.map(({ verdict, isAvailable }, index) => {
      const endMillis = (run.hours[index]?.startsAtMillis ?? 0) + HOUR_MILLIS
      return { verdict, isOpen: isAvailable === true && endMillis > setting.nowMillis }
    }),
  )
}

interface Asked {
  /** For each range. */
  agreements: HourAgreement[][]
  runs: number
}

/** Asks the other runs about the windows, where there are any. */
function askRuns(
  setting: Setting,
  options: JudgeOptions,
  main: ForecastRun,
  ranges: readonly HourRange[],
  hours: readonly ScoredHour[],
): Asked {
  const tallies = ranges.map(startTally)
  let runs = 0
  if (ranges.length > 0) {
    for (const run of otherRuns(setting, options, main, hoursNeeded(setting, ranges, main))) {
      runs += 1
      for (const tally of tallies) addToTally(tally, setting, run)
    }
  }
  return { agreements: tallies.map((tally) => hourAgreements(tally, runs, scoresOf(hours, tally.range))), runs }
}

/** How the fill freezes in the forecast's own run and in the others, where something is filled or freezes. */
function growthsFrom(
  setting: Setting,
  options: JudgeOptions,
  main: ForecastRun,
  startIndex: number | null,
): (Grown | null)[] {
  const own = growthOf(setting, main, startIndex)
  if (own === null) return [own]
  const others = otherRuns(setting, options, main, main.hours.length)
  return [own, ...Array.from(others, (run) => growthOf(setting, run, startIndex))]
}

/** A fill is judged by what comes long after it; floods only need their last layer to set. */
function hoursNeeded(setting: Setting, ranges: readonly HourRange[], run: ForecastRun): number {
  const isFloodOnly = ranges.every((range) => range.kind === 'flood')
  return isFloodOnly ? Math.min(run.hours.length, (ranges.at(-1)?.to ?? 0) + HOURS_TO_SET) : run.hours.length
}

function skinAtOf(run: ForecastRun, fill: FillStart | null | undefined): string | null {
  const index = fill?.outcome?.skinIndex
  return index == null ? null : toIso((run.hours[0]?.startsAtMillis ?? 0) + index * HOUR_MILLIS)
}

/** The best hour of the first fill window that enough runs see: a fill that they doubt is no advice to start. */
function fillStartIndex(ranges: readonly HourRange[], agreements: readonly HourAgreement[][]): number | null {
  for (const [index, range] of ranges.entries()) {
    const ofRange = agreements[index] as HourAgreement[]
    const best = bestHour(ofRange)
    if (range.kind === 'fill' && (ofRange[best]?.share ?? 1) >= AGREEMENT.least) return range.from + best
  }
  return null
}

function thawsOf(run: ForecastRun, hours: readonly ScoredHour[]) {
  const startThicknessMm = reportSheet(run.sheets[0] as SheetState).thicknessMm
  return findThaws(
    hours.map(({ isKnown, limits, sheet }, index) => ({
      startMillis: run.hours[index]?.startsAtMillis ?? 0,
      isGood: (limits?.ice ?? 0) >= VERDICT.goodScore,
      isKnown,
      thicknessMm: sheet.thicknessMm,
    })),
    startThicknessMm,
  )
}

function sheetStateAt(run: ForecastRun, at: string): NonNullable<Judgement['sheetState']> {
  const first = run.hours[0]?.startsAtMillis ?? 0
  const index = Math.floor((Date.parse(at) - first) / HOUR_MILLIS)
  if (!(index >= 0 && index <= run.hours.length)) throw new RangeError(`stateAt ${at} lies outside the hours`)
  return { at: toIso(first + index * HOUR_MILLIS), state: run.carried[index] }
}
