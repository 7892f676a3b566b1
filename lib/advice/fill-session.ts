// The hose hours of a fill: which hours the hose runs when the fill starts at a given one, split over days when needed.
import { isHourAvailable } from './score-hours'
import type { ForecastRun } from './forecast-run'
import type { Setting } from './setting'
import type { PreparedHour } from '@/lib/physics/types'

export interface HosePlan {
  litres: number
  hoseHours: number
}

/** Water and hose time of the whole fill. 1 mm on 1 m² is 1 L. */
export function hosePlanOf({ input }: Setting): HosePlan {
  const litres = input.water.fillDepthMm * input.rink.lengthM * input.rink.widthM
  return { litres, hoseHours: litres / input.water.flowLPerMin / 60 }
}

export interface FillSession {
  /** Hours in which the hose runs. */
  hoseHours: number[]
  /** Hour by whose start all the water is in. */
  doneIndex: number
}

/**
 * Hours in which the hose runs. The starting hour counts whether or not the keeper is free in it, since the question is
 * what a start then would be like; the others are hours in which the keeper can go out.
 *
 * @returns Null when the forecast ends before the fill is done.
 */
export function fillSession(setting: Setting, run: ForecastRun, startIndex: number): FillSession | null {
  const needed = Math.max(1, Math.ceil(hosePlanOf(setting).hoseHours - 1e-9))
  const hoseHours: number[] = []
  const isFreeAnyTime = setting.ranges.length === 0
  for (let index = startIndex; index < run.hours.length && hoseHours.length < needed; index += 1) {
    const isFree = isFreeAnyTime || isHourAvailable(setting, (run.hours[index] as PreparedHour).startsAtMillis)
    if (index === startIndex || isFree) hoseHours.push(index)
  }
  if (hoseHours.length < needed) return null
  return { hoseHours, doneIndex: (hoseHours.at(-1) as number) + 1 }
}
