// The factors of a fill started in one hour, as numbers from 0 to 1, with what they rest on.
import { growFill, type FillGrowth } from '@/lib/physics/fill'
import { reportSheet } from '@/lib/physics/sheet'
import type { PreparedHour } from '@/lib/physics/types'
import { windChillC } from '@/lib/physics/wind-chill'
import { overallDesirability, rampDesirability } from './desirability'
import { fillReasons } from './fill-reasons'
import { fillSession, hoseAndHands, type FillSession } from './fill-session'
import { deepestFillMm } from './fill-water'
import type { ForecastRun } from './forecast-run'
import type { Setting } from './setting'
import { FILL } from './thresholds'
import type { Reason } from './types'

export interface FillFactors {
  cold: number
  snow: number
  liner: number
  air: number
}

/** A figure and the hour it belongs to: a fill split over days may meet it in a later night than its own. */
export interface FigureOfHour {
  figure: number
  at: string
}

/** What the hours of a fill and after it bring; null where the forecast does not reach. */
export interface FillOutcome {
  session: FillSession
  hasGap: boolean
  lowestAirC: FigureOfHour
  highestAirC: FigureOfHour
  lowestWindChillC: FigureOfHour
  highestGustMps: FigureOfHour
  lookAheadHours: number
  iceAfterMm: number
  snowBeforeSkinCm: number
  /** Hour of its first flake; null without snow. */
  snowStartsAt: string | null
  skinIndex: number | null
}

export interface FillStart {
  ice: number
  person: number
  outcome: FillOutcome | null
  reasons: Reason[]
}

/** Growth by the hour in which the water is in: many starts share one. */
export type GrowthCache = Map<number, FillGrowth>

/**
 * Judges a fill started in an hour.
 *
 * @param setting Rink, from makeSetting.
 * @param run Forecast run with its sheet.
 * @param index Hour of the start; must be known.
 * @param cache Growths of this run already worked out.
 * @returns Shares for ice and person [0-1], what became of the fill, and its reasons.
 *
 * Source: limits in FILL and PERSON; weights as in overallDesirability.
 */
export function judgeFillStart(setting: Setting, run: ForecastRun, index: number, cache: GrowthCache): FillStart {
  const session = fillSession(setting, run, index)
  const outcome = session ? outcomeOf(setting, run, session, cache) : null
  const factors = outcome ? factorsOf(setting, outcome) : { cold: 0, snow: 1, liner: 1, air: 1 }
  const hour = run.hours[index] as PreparedHour
  const lowestAirC = outcome?.lowestAirC ?? lowestOf([hour], airOf)
  const lowestWindChillC = outcome?.lowestWindChillC ?? lowestOf([hour], chillOf)
  const { hose, hands } = hoseAndHands(lowestAirC.figure, lowestWindChillC.figure)
  const limits = { hose, hands, lowestAirC, lowestWindChillC }
  return {
    ice: outcome?.hasGap ? 0 : overallDesirability(factors, FILL.weights),
    person: Math.min(hose, hands),
    outcome,
    reasons: fillReasons(setting, hour.time, factors, outcome, limits),
  }
}

const airOf = (hour: PreparedHour) => hour.airTemperatureC
const chillOf = (hour: PreparedHour) => windChillC(hour.airTemperatureC, hour.windSpeedMps)

/** The earliest hour among equals. */
function lowestOf(hours: readonly PreparedHour[], of: (hour: PreparedHour) => number): FigureOfHour {
  let lowest: FigureOfHour = { figure: Number.POSITIVE_INFINITY, at: '' }
  for (const hour of hours) {
    const figure = of(hour)
    if (figure < lowest.figure) lowest = { figure, at: hour.time }
  }
  return lowest
}

function highestOf(hours: readonly PreparedHour[], of: (hour: PreparedHour) => number): FigureOfHour {
  const { figure, at } = lowestOf(hours, (hour) => -of(hour))
  return { figure: -figure, at }
}

function outcomeOf(setting: Setting, run: ForecastRun, session: FillSession, cache: GrowthCache): FillOutcome {
  const hours = session.hoseHours.map((index) => run.hours[index] as PreparedHour)
  const first = session.hoseHours[0] as number
  const weather = {
    session,
    hasGap: hours.some((hour) => !hour.isKnown),
    lowestAirC: lowestOf(hours, airOf),
    highestAirC: highestOf(hours, airOf),
    lowestWindChillC: lowestOf(hours, chillOf),
    highestGustMps: highestOf(hours, (hour) => hour.windGustMps * setting.gustFactor),
    lookAheadHours: Math.min(FILL.coldLookAheadHours, run.hours.length - session.doneIndex),
  }
  if (weather.lookAheadHours < FILL.leastLookAheadHours || weather.hasGap) {
    return { ...weather, iceAfterMm: 0, snowBeforeSkinCm: 0, snowStartsAt: null, skinIndex: null }
  }
  const grownFrom = growthStart(run, session.doneIndex)
  const growth = growthFrom(setting, run, grownFrom, cache)
  const skinHours = growth.hoursToThickness[0]
  const skinIndex = skinHours == null ? null : grownFrom + Math.ceil(skinHours)
  const untilSkin = run.hours.slice(first, skinIndex ?? session.doneIndex + weather.lookAheadHours)
  return {
    ...weather,
    iceAfterMm: reportSheet(growth.state).thicknessMm,
    snowBeforeSkinCm: untilSkin.reduce((sum, hour) => sum + hour.snowfallCm, 0),
    snowStartsAt: untilSkin.find((hour) => hour.snowfallCm > 0)?.time ?? null,
    skinIndex,
  }
}

/** Fills done within the same few hours share one look at the days after them, from the last of these hours. */
function growthStart(run: ForecastRun, doneIndex: number): number {
  const shared = Math.ceil(doneIndex / FILL.lookEveryHours) * FILL.lookEveryHours
  return Math.min(shared, run.hours.length - FILL.leastLookAheadHours)
}

function growthFrom(setting: Setting, run: ForecastRun, doneIndex: number, cache: GrowthCache): FillGrowth {
  const known = cache.get(doneIndex)
  if (known) return known
  const { temperatureC } = setting.input.water
  const fill = {
    depthMm: Math.max(1, deepestFillMm(setting)),
    waterTemperatureC: Math.min(40, temperatureC),
    base: setting.input.rink.base,
  }
  const hours = run.hours.slice(doneIndex, doneIndex + FILL.coldLookAheadHours)
  const growth = growFill(fill, hours, 0, [FILL.skinMm])
  cache.set(doneIndex, growth)
  return growth
}

function factorsOf(setting: Setting, outcome: FillOutcome): FillFactors {
  const share = outcome.lookAheadHours / FILL.coldLookAheadHours
  // A shallow fill that froze through has all the ice it can have.
  const mostMm = Math.min(FILL.iceAfterMm.one, deepestFillMm(setting))
  const wanted = { one: mostMm * share, zero: Math.min(FILL.iceAfterMm.zero, mostMm / 2) * share }
  return {
    cold: outcome.lookAheadHours < FILL.leastLookAheadHours ? 0 : rampDesirability(outcome.iceAfterMm, wanted),
    snow: rampDesirability(outcome.snowBeforeSkinCm, FILL.snowBeforeSkinCm),
    liner: setting.input.rink.base === 'liner' ? rampDesirability(outcome.highestGustMps.figure, FILL.linerGustMps) : 1,
    air: rampDesirability(outcome.highestAirC.figure, FILL.airTooWarmC),
  }
}
