// The hose hours of a fill: which hours the hose runs when the fill starts at a given one, split over days when needed.
import type { PreparedHour } from '@/lib/physics/types'
import { windChillC } from '@/lib/physics/wind-chill'
import { rampDesirability } from './desirability'
import { hosePlanOf } from './fill-water'
import type { ForecastRun } from './forecast-run'
import { isHourAvailable } from './score-hours'
import type { Setting } from './setting'
import { FILL, PERSON, VERDICT } from './thresholds'

export interface FillSession {
  /** Hours in which the hose runs. */
  hoseHours: number[]
  /** Hour by whose start all the water is in. */
  doneIndex: number
}

/**
 * Hours in which the hose runs: those in which the keeper can go out and the hose and hands bear it. The starting hour
 * counts in any case, since the question is what a start then would be like. Where such hours are too few or too far
 * apart, it is what the keeper's hours give, and the cold in them speaks for itself.
 *
 * @param setting Rink, from makeSetting.
 * @param run Forecast run with its sheet.
 * @param startIndex Hour in which the fill starts.
 * @returns Hours of the run in which the hose runs; null when the forecast ends before the fill is done.
 *
 * Source: ours.
 */
export function fillSession(setting: Setting, run: ForecastRun, startIndex: number): FillSession | null {
  const needed = Math.max(1, Math.ceil(hosePlanOf(setting).hoseHours - 1e-9))
  const { isFree, isBorne } = hourMarks(setting, run)
  const last = Math.min(run.hours.length, startIndex + Math.max(FILL.longestHours, needed))
  return collect(isBorne, startIndex, last, needed) ?? collect(isFree, startIndex, run.hours.length, needed)
}

function collect(marks: readonly boolean[], startIndex: number, last: number, needed: number): FillSession | null {
  const hoseHours: number[] = []
  for (let index = startIndex; index < last && hoseHours.length < needed; index += 1) {
    if (index === startIndex || marks[index]) hoseHours.push(index)
  }
  if (hoseHours.length < needed) return null
  return { hoseHours, doneIndex: (hoseHours.at(-1) as number) + 1 }
}

interface HourMarks {
  isFree: boolean[]
  isBorne: boolean[]
}

/** Every start in a run asks the same of the same hours; a run and its setting live and die together. */
const marksOf = new WeakMap<ForecastRun, HourMarks>()

function hourMarks(setting: Setting, run: ForecastRun): HourMarks {
  const known = marksOf.get(run)
  if (known) return known
  const isFreeAnyTime = setting.ranges.length === 0
  const isFree = run.hours.map((hour) => isFreeAnyTime || isHourAvailable(setting, hour.startsAtMillis))
  const marks = { isFree, isBorne: run.hours.map((hour, index) => isFree[index] === true && isHoseBorne(hour)) }
  marksOf.set(run, marks)
  return marks
}

/** Whether a running cold hose and the hands at it bear an hour well enough for a good score. */
function isHoseBorne(hour: PreparedHour): boolean {
  if (!hour.isKnown) return false
  const { hose, hands } = hoseAndHands(hour.airTemperatureC, windChillC(hour.airTemperatureC, hour.windSpeedMps))
  return 100 * Math.min(hose, hands) >= VERDICT.goodScore
}

/**
 * What the hose and the hands let through.
 *
 * @param airTemperatureC Lowest air. [°C]
 * @param windChill Lowest index of windChillC. [-]
 * @returns Desirabilities. [0-1]
 *
 * Source: ramps in PERSON.
 */
export function hoseAndHands(airTemperatureC: number, windChill: number): { hose: number; hands: number } {
  return {
    hose: rampDesirability(airTemperatureC, PERSON.fillHoseC),
    hands: rampDesirability(windChill, PERSON.fillWindChillC),
  }
}
