// The plan for tonight: quarter hours as slots, each with a first pass and a pass on a sheet that has just been flooded.
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { advanceSheet, clearSnow, pourLayer, type SheetState } from '@/lib/physics/sheet'
import { minutesToSet } from '@/lib/physics/layer'
import type { PreparedHour } from '@/lib/physics/types'
import { judgeFloodStart } from './flood-factors'
import { judgePasses } from './move-pass'
import type { ForecastRun } from './forecast-run'
import { nightBounds, nightDateOf, tonightDate } from './night'
import type { NightRun } from './night-model'
import { planPasses, type PlannedStart, type PlanSlot, type SlotOutcome } from './plan'
import { isGood, scoreOf } from './score-hours'
import { isAvailableAt, type Setting } from './setting'
import { PLAN } from './thresholds'
import { toIso } from './zoned-time'
import type { PlannedPass, ScoredHour } from './types'

const STEP_MILLIS = PLAN.stepMinutes * MINUTE_MILLIS

/**
 * Passes for the night that `now` is in, poured ones counted against `maxPasses`.
 *
 * @param setting Rink, from makeSetting.
 * @param run Forecast run with its sheet.
 * @param scored Hours as scored, one for each hour of the run.
 * @param shares For hours of windows, the share of forecast runs that find them good: a pass is worth its score times
 *   that.
 * @returns Passes in order of time, with layer [mm], water [L] and hose time [min].
 *
 * Source: planPasses; set times by minutesToSet.
 */
export function planTonight(
  setting: Setting,
  run: ForecastRun,
  scored: readonly ScoredHour[],
  shares: ReadonlyMap<number, number>,
): PlannedPass[] {
  const { input, nowMillis } = setting
  const night = tonightDate(new Date(nowMillis), input.rink.timeZone)
  const bounds = nightBounds(night, input.rink.timeZone)
  const poured = (input.poured ?? []).filter((layer) => nightDateOf(new Date(layer.at), input.rink.timeZone) === night)
  const fromMillis = Math.max(nowMillis, bounds.startsAt.getTime(), poured.length > 0 ? (run.pouredSetMillis ?? 0) : 0)
  const hours: number[] = []
  for (const [index, hour] of run.hours.entries()) {
    const isInNight = hour.startsAtMillis + HOUR_MILLIS > fromMillis && hour.startsAtMillis < bounds.endsAt.getTime()
    if (isInNight && scored[index]?.verdict === 'flood') hours.push(index)
  }
  const maxPasses = input.maxPasses - poured.length
  if (maxPasses <= 0 || hours.length === 0) return []
  const spent = maxPasses > 1 ? spentSheets(setting, run, hours) : new Map<number, SheetState>()
  const slots = hours.flatMap((index) =>
    slotsOfHour(setting, run, index, fromMillis, spent.get(index), shares.get(index) ?? 1),
  )
  const waterL = input.water.layerMm * input.rink.lengthM * input.rink.widthM
  return plannedOn({ setting, run }, slots, maxPasses).map(({ startMillis, setMillis }) => ({
    startsAt: toIso(startMillis),
    setBy: toIso(setMillis),
    layerMm: input.water.layerMm,
    waterL: Math.round(waterL),
    hoseMinutes: Math.ceil(waterL / input.water.flowLPerMin),
  }))
}

/**
 * Plans, and tells when each pass is set on the very sheet that the passes before it leave. Where a pass would start before
 * the one before it is set, or is no longer good on that sheet, the night is planned anew from a later quarter hour on.
 */
function plannedOn(night: NightRun, slots: readonly PlanSlot[], maxPasses: number): PlannedStart[] {
  let starts = truly(night, planPasses(slots, maxPasses))
  // Each round moves a start later or drops it, so that there are no more rounds than quarter hours.
  for (let round = 0; round < slots.length; round += 1) {
    const bad = starts.findIndex(({ startMillis, isAdvisable }, index) => {
      return !isAdvisable || startMillis < (starts[index - 1]?.setMillis ?? 0)
    })
    if (bad < 0) return starts
    const { startMillis } = starts[bad] as TrueStart
    const free = Math.max(startMillis + STEP_MILLIS, starts[bad - 1]?.setMillis ?? 0)
    const later = slots.filter((slot) => slot.startMillis >= free).map((slot) => ({ ...slot, first: slot.later }))
    starts = truly(night, [...starts.slice(0, bad), ...planPasses(later, maxPasses - bad)])
  }
  return starts.filter(({ isAdvisable }) => isAdvisable)
}

interface TrueStart extends PlannedStart {
  isAdvisable: boolean
}

/** Set times as the passes leave the sheet to one another. */
function truly(night: NightRun, starts: readonly PlannedStart[]): TrueStart[] {
  const { layer } = night.setting
  const judged = judgePasses(
    night,
    starts.map(({ startMillis }) => ({ startsAt: toIso(startMillis), ...layer })),
  )
  return starts.map((start, index) => {
    const { setBy, isAdvisable } = judged[index] ?? { setBy: null, isAdvisable: false }
    return { ...start, isAdvisable, setMillis: setBy ? Date.parse(setBy) : start.setMillis }
  })
}

function slotsOfHour(
  setting: Setting,
  run: ForecastRun,
  index: number,
  fromMillis: number,
  spent: SheetState | undefined,
  share: number,
): PlanSlot[] {
  const slots: PlanSlot[] = []
  const { startsAtMillis } = run.hours[index] as PreparedHour
  for (let at = startsAtMillis; at < startsAtMillis + HOUR_MILLIS; at += STEP_MILLIS) {
    if (at < fromMillis || !isAvailableAt(setting, at)) continue
    const fraction = (at - startsAtMillis) / HOUR_MILLIS
    const first = outcomeOf(setting, run, index, fraction, run.sheets[index] as SheetState, share)
    const later = spent ? outcomeOf(setting, run, index, fraction, spent, share) : first
    slots.push({ startMillis: at, first, later })
  }
  return slots
}

function outcomeOf(
  setting: Setting,
  run: ForecastRun,
  index: number,
  fraction: number,
  sheet: SheetState,
  share: number,
): SlotOutcome | null {
  const start = judgeFloodStart(setting, run, index, fraction, sheet)
  if (!isGood(start) || start.setMinutes === null) return null
  const setMillis = Math.ceil(start.startMillis / MINUTE_MILLIS + start.setMinutes) * MINUTE_MILLIS
  return { setMillis, gain: setting.layer.layerMm * (coarse(scoreOf(start) * share) / 100 - PLAN.tripCostShare) }
}

/** A few points more are within the forecast's error; then the earlier start is better for the person. */
function coarse(score: number): number {
  return Math.round(score / PLAN.scoreStep) * PLAN.scoreStep
}

/**
 * For each hour, the sheet as it is when passes have followed each other as fast as they set: the warmest it can be at
 * that hour, so that a later pass is never promised too soon.
 */
function spentSheets(setting: Setting, run: ForecastRun, hours: readonly number[]): Map<number, SheetState> {
  const spent = new Map<number, SheetState>()
  const setMillis = new Map<number, number>()
  for (const index of hours) {
    const { startsAtMillis } = run.hours[index] as PreparedHour
    const before = hours.findLast((one) => one < index && (setMillis.get(one) ?? Infinity) <= startsAtMillis)
    const sheetBefore = (one: number) => clearSnow(spent.get(one) ?? (run.sheets[one] as SheetState))
    if (before !== undefined) {
      let sheet = pourLayer(sheetBefore(before), setting.layer)
      for (let hour = before; hour < index; hour += 1) sheet = advanceSheet(sheet, run.hours[hour] as PreparedHour)
      spent.set(index, sheet)
    }
    const minutes = minutesToSet(sheetBefore(index), run.hours, index, 0, setting.layer)
    if (minutes !== null) setMillis.set(index, startsAtMillis + minutes * MINUTE_MILLIS)
  }
  return spent
}
