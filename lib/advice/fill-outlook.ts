// What the fill will be: when to start, how much water and hose, when it skins over and when it carries skaters.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { followGrowth, growFill, type FillGrowth } from '@/lib/physics/fill'
import { fillSession } from './fill-session'
import { fillHours, fillSpans } from './fill-spans'
import { deepestFillMm, hosePlanOf } from './fill-water'
import type { ForecastRun } from './forecast-run'
import type { Setting } from './setting'
import { isoOrNull, spreadOf } from './spread'
import { FILL } from './thresholds'
import { toIso } from './zoned-time'
import type { FillOutlook } from './types'

/**
 * Outlook of the fill over all forecast runs.
 *
 * @param setting Rink, from makeSetting.
 * @param main The forecast itself.
 * @param grown How the fill freezes in each run, see growthOf; quantiles are over them, the first is the forecast's
 *   own.
 * @param startIndex Hour in which the fill starts, or null when no hour is good.
 * @returns Water [L], hose time [h] and instants in ISO 8601, null where not known.
 *
 * Source: growFill in each run; quantiles by nearest rank.
 */
export function fillOutlook(
  setting: Setting,
  main: ForecastRun,
  grown: readonly (Grown | null)[],
  startIndex: number | null,
): FillOutlook {
  const { litres, hoseHours } = hosePlanOf(setting)
  const water = { hoseHours: Math.round(hoseHours * 10) / 10, litres: Math.round(litres) }
  const isBeforeFill = setting.input.rink.phase === 'waiting' || setting.input.rink.phase === 'filling'
  const start = isBeforeFill && startIndex !== null ? main.hours[startIndex] : undefined
  const sessions = start && startIndex !== null ? fillSpans(setting, main, startIndex) : []
  const spread = (of: keyof Grown) => spreadOf(grown.map((one) => one?.[of] ?? Number.POSITIVE_INFINITY))
  return {
    startsAt: start ? toIso(start.startsAtMillis) : null,
    ...water,
    skinAt: isoOrNull(grown[0]?.skinMillis ?? Number.POSITIVE_INFINITY),
    carriesSkaterAt: spread('carriesMillis'),
    skinAtSpread: spread('skinMillis'),
    frozenThroughAt: spread('frozenMillis'),
    sessions,
    hours: fillHours(setting, sessions),
  }
}

/** Infinity is not within the forecast. */
export interface Grown {
  skinMillis: number
  carriesMillis: number
  frozenMillis: number
}

/**
 * How the fill freezes in one run; null when there is none.
 *
 * @param setting Rink, from makeSetting.
 * @param run Forecast run with its sheet.
 * @param startIndex Hour of the start; null when no hour is good.
 * @returns Instants of skin and bearing, null when there is no fill to follow. [ms since the epoch]
 *
 * Source: growFill, followGrowth.
 */
export function growthOf(setting: Setting, run: ForecastRun, startIndex: number | null): Grown | null {
  const { phase, base } = setting.input.rink
  const { temperatureC } = setting.input.water
  const depthMm = deepestFillMm(setting)
  const carriesMm = setting.input.carriesSkaterMm ?? FILL.carriesSkaterMm
  const wanted = [FILL.skinMm, carriesMm]
  if (phase === 'freezing') {
    const index = firstIndexFrom(run, setting.nowMillis)
    const sheet = run.sheets[index]
    return sheet ? timesOf(run, index, followGrowth(sheet, run.hours, index, wanted)) : null
  }
  const session = startIndex === null || depthMm <= 0 ? null : fillSession(setting, run, startIndex)
  if (!session || (phase !== 'waiting' && phase !== 'filling')) return null
  const fill = { depthMm, waterTemperatureC: Math.min(40, temperatureC), base }
  return timesOf(run, session.doneIndex, growFill(fill, run.hours, session.doneIndex, wanted))
}

function timesOf(run: ForecastRun, index: number, growth: FillGrowth): Grown {
  const from = (run.hours[0]?.startsAtMillis ?? 0) + index * HOUR_MILLIS
  const [skin, carries] = growth.hoursToThickness
  const instant = (hours: number | null | undefined) =>
    hours == null ? Number.POSITIVE_INFINITY : from + hours * HOUR_MILLIS
  const frozenMillis = instant(growth.hoursToFrozen)
  return { skinMillis: instant(skin), carriesMillis: Math.min(instant(carries), frozenMillis), frozenMillis }
}

function firstIndexFrom(run: ForecastRun, millis: number): number {
  return Math.max(0, Math.floor((millis - (run.hours[0]?.startsAtMillis ?? 0)) / HOUR_MILLIS))
}
