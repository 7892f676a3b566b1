// What the fill will be: when to start, how much water and hose, when it skins over and when it carries skaters.
import { followGrowth, growFill, type FillGrowth } from '@/lib/physics/fill'
import { fillSession, hosePlanOf } from './fill-session'
import type { ForecastRun } from './forecast-run'
import type { Setting } from './setting'
import { FILL } from './thresholds'
import { toIso } from './zoned-time'
import type { FillOutlook } from './types'

const HOUR_MILLIS = 3_600_000
/** Ice of this many millimetres a millimetre of water: 999.8 / 916.7 kg/m³ (IAPWS). */
const ICE_PER_WATER = 1.09

/**
 * Outlook of the fill over all forecast runs.
 *
 * @param runs The runs to take quantiles from; the first is the forecast itself.
 * @param startIndex Hour in which the fill starts, or null when no hour is good.
 */
export function fillOutlook(setting: Setting, runs: readonly ForecastRun[], startIndex: number | null): FillOutlook {
  const { litres, hoseHours } = hosePlanOf(setting)
  const water = { hoseHours: Math.round(hoseHours * 10) / 10, litres: Math.round(litres) }
  const grown = runs.map((run) => growthOf(setting, run, startIndex))
  const isBeforeFill = setting.input.rink.phase === 'waiting' || setting.input.rink.phase === 'filling'
  const start = isBeforeFill && startIndex !== null ? runs[0]?.hours[startIndex] : undefined
  const carries = grown.map((one) => one?.carriesMillis ?? Number.POSITIVE_INFINITY).sort((a, b) => a - b)
  return {
    startsAt: start ? toIso(start.startsAtMillis) : null,
    ...water,
    skinAt: isoOrNull(grown[0]?.skinMillis ?? Number.POSITIVE_INFINITY),
    carriesSkaterAt: { p10: quantile(carries, 0.1), p50: quantile(carries, 0.5), p90: quantile(carries, 0.9) },
  }
}

interface Grown {
  skinMillis: number
  carriesMillis: number
}

function growthOf(setting: Setting, run: ForecastRun, startIndex: number | null): Grown | null {
  const { phase, base } = setting.input.rink
  const { fillDepthMm, temperatureC } = setting.input.water
  const carriesMm = Math.min(FILL.carriesSkaterMm, Math.floor(fillDepthMm * ICE_PER_WATER))
  const wanted = [FILL.skinMm, carriesMm]
  if (phase === 'freezing') {
    const index = firstIndexFrom(run, setting.nowMillis)
    const sheet = run.sheets[index]
    return sheet ? timesOf(run, index, followGrowth(sheet, run.hours, index, wanted)) : null
  }
  const session = startIndex === null || fillDepthMm <= 0 ? null : fillSession(setting, run, startIndex)
  if (!session || (phase !== 'waiting' && phase !== 'filling')) return null
  const fill = { depthMm: fillDepthMm, waterTemperatureC: Math.min(40, temperatureC), base }
  return timesOf(run, session.doneIndex, growFill(fill, run.hours, session.doneIndex, wanted))
}

function timesOf(run: ForecastRun, index: number, growth: FillGrowth): Grown {
  const from = (run.hours[0]?.startsAtMillis ?? 0) + index * HOUR_MILLIS
  const [skin, carries] = growth.hoursToThickness
  const instant = (hours: number | null | undefined) =>
    hours == null ? Number.POSITIVE_INFINITY : from + hours * HOUR_MILLIS
  return { skinMillis: instant(skin), carriesMillis: Math.min(instant(carries), instant(growth.hoursToFrozen)) }
}

function firstIndexFrom(run: ForecastRun, millis: number): number {
  return Math.max(0, Math.floor((millis - (run.hours[0]?.startsAtMillis ?? 0)) / HOUR_MILLIS))
}

/** Nearest-rank quantile; a run in which it does not happen within the forecast counts as never. */
function quantile(sorted: readonly number[], share: number): string | null {
  return isoOrNull(sorted[Math.max(0, Math.ceil(sorted.length * share) - 1)] ?? Number.POSITIVE_INFINITY)
}

function isoOrNull(millis: number): string | null {
  return Number.isFinite(millis) ? toIso(Math.ceil(millis / 60_000) * 60_000) : null
}
