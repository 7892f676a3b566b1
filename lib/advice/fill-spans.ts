// A fill as a keeper sees it: when the hose runs, and how the water stands hour by hour.
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { cornerDepthsM } from '@/lib/physics/floor'
import { levelOf, stageAt } from '@/lib/physics/stage'
import type { PreparedHour } from '@/lib/physics/types'
import { fillSession } from './fill-session'
import { floorOfRink, hosePlanOf } from './fill-water'
import type { ForecastRun } from './forecast-run'
import type { Setting } from './setting'
import { toIso } from './zoned-time'
import type { FillHour, FillSpan } from './types'

/**
 * When the hose runs, neighbouring hours joined. The last span ends in the minute in which the water is in.
 *
 * @param setting Rink, from makeSetting.
 * @param run Forecast run with its sheet.
 * @param startIndex Hour in which the fill starts.
 * @returns Spans with their water [L], in order; none when the forecast ends before the fill is done.
 *
 * Source: fillSession, flow times time.
 */
export function fillSpans(setting: Setting, run: ForecastRun, startIndex: number): FillSpan[] {
  const { litres } = hosePlanOf(setting)
  const { flowLPerMin } = setting.input.water
  const spans: { from: number; to: number }[] = []
  let minutesLeft = litres / flowLPerMin
  for (const index of fillSession(setting, run, startIndex)?.hoseHours ?? []) {
    if (minutesLeft <= 0) break
    const from = (run.hours[index] as PreparedHour).startsAtMillis
    const to = from + Math.min(60, minutesLeft) * MINUTE_MILLIS
    const last = spans.at(-1)
    if (last && last.to === from) last.to = to
    else spans.push({ from, to })
    minutesLeft -= 60
  }
  return spans.map(({ from, to }) => ({
    startsAt: toIso(from),
    endsAt: toIso(Math.round(to / MINUTE_MILLIS) * MINUTE_MILLIS),
    litres: Math.round(((to - from) / MINUTE_MILLIS) * flowLPerMin),
  }))
}

/**
 * How the water stands after each hour of hose, and at the end of each span.
 *
 * @param setting Rink, from makeSetting.
 * @param spans From fillSpans.
 * @returns Level and corner depths [m], water so far [L] and wetted share [0-1], by instant.
 *
 * Source: balance of volume, levelOf.
 */
export function fillHours(setting: Setting, spans: readonly FillSpan[]): FillHour[] {
  const floor = floorOfRink(setting)
  const corners = cornerDepthsM(floor)
  const { flowLPerMin, filledLitres = 0 } = setting.input.water
  let before = filledLitres
  return spans.flatMap(({ startsAt, endsAt, litres }) => {
    const from = Date.parse(startsAt)
    const to = Date.parse(endsAt)
    const first = before
    before += litres
    return stepsBetween(from, to).map((millis): FillHour => {
      const run = ((millis - from) / MINUTE_MILLIS) * flowLPerMin
      const litresSoFar = millis === to ? before : first + run
      const levelM = levelOf(floor, litresSoFar / 1000)
      return {
        at: toIso(millis),
        litresSoFar: Math.round(litresSoFar),
        levelM: rounded(levelM),
        wettedShare: rounded(stageAt(floor, levelM).wetShare),
        cornerDepthsM: corners.map((corner) => rounded(Math.max(0, corner - levelM))) as FillHour['cornerDepthsM'],
      }
    })
  })
}

/** Each full hour after the start, and the end. */
function stepsBetween(from: number, to: number): number[] {
  const steps: number[] = []
  for (let millis = from + HOUR_MILLIS; millis < to; millis += HOUR_MILLIS) steps.push(millis)
  return [...steps, to]
}

/** To the tenth of a millimetre. */
function rounded(value: number): number {
  return Math.round(value * 10_000) / 10_000 + 0
}
