// A rink that freezes: how thick it is, how thick it will be, when it carries a skater, and what to do about snow on it.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { prepareHours } from '@/lib/physics/prepare'
import { reportSheet, type SheetState } from '@/lib/physics/sheet'
import { otherRuns } from './agreement'
import { growthOf, type Grown } from './fill-outlook'
import { ICE_TO_WATER, carrySheet, type ForecastRun } from './forecast-run'
import { round } from './score-hours'
import { makeSetting, type Setting } from './setting'
import { snowOnThinIce } from './snow-on-thin-ice'
import { quantile, spreadOf } from './spread'
import { FILL } from './thresholds'
import { toIso } from './zoned-time'
import type { Caution, JudgeInput, JudgeOptions, Spread } from './types'

/** The chart of the days ahead has a value each so many hours. */
const EVERY_HOURS = 3

/** Ice over the runs. [mm] In nine runs of ten it is at least p10. */
export interface ThicknessAhead {
  at: string
  p10: number
  p50: number
  p90: number
}

export interface FreezingOutlook {
  now: {
    at: string
    thicknessMm: number
    /** Still liquid under the ice, over the deepest place. [mm] */
    waterBelowMm: number
    snowCoverCm: number
    /** Standing on the ice. [mm] */
    liquidMm: number
  }
  carriesSkaterMm: number
  /** There is too little water for ice of that thickness: it carries once it is frozen to the floor. */
  isShallow: boolean
  ahead: ThicknessAhead[]
  skinAt: Spread
  carriesSkaterAt: Spread
  frozenThroughAt: Spread
  /** What to do about snow, the most pressing first; words in lib/words/freezing.ts. */
  snow: Caution[]
  /** Forecast runs behind the spreads, the forecast itself among them. */
  runs: number
}

/**
 * Follows a freezing rink through the forecast and its other runs.
 *
 * A drilled reading corrects it: give the reading as `input.sheet` (thickness, temperature, snow) with `asOf` its hour
 * and no `state`, and everything starts from there.
 *
 * @param input As for `judge`, phase 'freezing'.
 * @param options Other runs and their seed, as for `judge`.
 * @returns The sheet at `now` and ahead to the end of the forecast. [mm], [°C] and instants in ISO 8601
 * @throws RangeError as `judge` does.
 *
 * Source: advanceSheet in each run; quantiles by nearest rank.
 */
export function freezingOutlook(input: JudgeInput, options: JudgeOptions = {}): FreezingOutlook {
  const setting = makeSetting({ ...input, rink: { ...input.rink, phase: 'freezing' } })
  const main = carrySheet(setting, prepareHours(input.hours, setting.site))
  const nowIndex = Math.min(
    main.hours.length,
    Math.max(0, Math.floor((setting.nowMillis - setting.firstMillis) / HOUR_MILLIS)),
  )
  const steps = stepsFrom(nowIndex, main.hours.length)
  const traces = [traceOf(setting, main, steps)]
  for (const run of otherRuns(setting, options, main, main.hours.length)) traces.push(traceOf(setting, run, steps))
  const spread = (of: keyof Grown) => spreadOf(traces.map(({ grown }) => grown?.[of] ?? Number.POSITIVE_INFINITY))
  const carriesSkaterMm = input.carriesSkaterMm ?? FILL.carriesSkaterMm
  const ahead = steps.map((index, step) =>
    aheadAt(
      setting,
      index,
      traces.map((trace) => trace.thicknessMm[step] ?? 0),
    ),
  )
  const sheet = main.carried[nowIndex] as SheetState
  const now = sheetNow(setting, sheet, nowIndex)
  return {
    now,
    carriesSkaterMm,
    isShallow: now.thicknessMm * ICE_TO_WATER + now.waterBelowMm < carriesSkaterMm * ICE_TO_WATER,
    ahead,
    skinAt: spread('skinMillis'),
    carriesSkaterAt: spread('carriesMillis'),
    frozenThroughAt: spread('frozenMillis'),
    snow: snowOnThinIce({ sheet, run: main, nowIndex, ahead }),
    runs: traces.length,
  }
}

function stepsFrom(nowIndex: number, end: number): number[] {
  const steps: number[] = []
  for (let index = nowIndex; index <= end; index += EVERY_HOURS) steps.push(index)
  return steps
}

interface Trace {
  thicknessMm: number[]
  grown: Grown | null
}

function traceOf(setting: Setting, run: ForecastRun, steps: readonly number[]): Trace {
  const thicknessMm = steps.map((index) => reportSheet(run.carried[index] as SheetState).thicknessMm)
  return { thicknessMm, grown: growthOf(setting, run, null) }
}

function aheadAt(setting: Setting, index: number, thicknesses: readonly number[]): ThicknessAhead {
  const ascending = [...thicknesses].sort((a, b) => a - b)
  const at = (share: number) => round(quantile(ascending, share), 1)
  return { at: toIso(setting.firstMillis + index * HOUR_MILLIS), p10: at(0.1), p50: at(0.5), p90: at(0.9) }
}

function sheetNow(setting: Setting, sheet: SheetState, nowIndex: number): FreezingOutlook['now'] {
  const { thicknessMm, snowCoverCm, liquidMm } = reportSheet(sheet)
  return {
    at: toIso(setting.firstMillis + nowIndex * HOUR_MILLIS),
    thicknessMm: round(thicknessMm, 1),
    waterBelowMm: round(sheet.belowKgM2, 1),
    snowCoverCm: round(snowCoverCm, 1),
    liquidMm: round(liquidMm, 1),
  }
}
