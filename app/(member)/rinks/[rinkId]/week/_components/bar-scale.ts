// One scale for the bars of all nights, so that they can be compared.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { WeekNight } from '@/lib/schemas/week-view'

export const BAR_FRAME = { width: 300, height: 44, baseline: 30 }

/** Lowest top of the scale: a night that hardly freezes shall look like one. Ours. [mm/h] */
const LEAST_TOP_MM_PER_H = 2.5

export interface BarScale {
  /** Freeze rate at the top of the frame. [mm/h] */
  topMmPerH: number
}

export function barScale(nights: readonly WeekNight[]): BarScale {
  const rates = nights.flatMap(({ bars }) => bars.map(({ freezeRateMmPerH }) => freezeRateMmPerH ?? 0))
  return { topMmPerH: Math.max(LEAST_TOP_MM_PER_H, ...rates) * 1.05 }
}

export interface Bar {
  x: number
  y: number
  width: number
  height: number
  verdict: WeekNight['bars'][number]['verdict']
  /** It melts faster than the frame shows. */
  isCut: boolean
}

/** To a tenth of a unit of the frame. */
export const round = (value: number) => Math.round(value * 10) / 10

/** Where an instant of the night lies across the frame. */
export function placeOf(night: Pick<WeekNight, 'startsAt' | 'endsAt'>, at: string): number {
  const [from, to] = [Date.parse(night.startsAt), Date.parse(night.endsAt)]
  return round(((Date.parse(at) - from) / (to - from)) * BAR_FRAME.width)
}

export function barsOf(night: WeekNight, { topMmPerH }: BarScale): Bar[] {
  const { width, height, baseline } = BAR_FRAME
  const column = (HOUR_MILLIS / (Date.parse(night.endsAt) - Date.parse(night.startsAt))) * width
  return night.bars.flatMap(({ startsAt, verdict, freezeRateMmPerH }) => {
    if (freezeRateMmPerH === null) return []
    const tall = (Math.abs(freezeRateMmPerH) / topMmPerH) * baseline
    const room = height - baseline - 1
    const isMelting = freezeRateMmPerH < 0
    const tallShown = isMelting ? Math.min(tall, room) : tall
    return {
      x: round(placeOf(night, startsAt) + column * 0.14),
      y: round(isMelting ? baseline : baseline - tallShown),
      width: round(column * 0.72),
      height: round(tallShown),
      verdict,
      isCut: isMelting && tall > room,
    }
  })
}
