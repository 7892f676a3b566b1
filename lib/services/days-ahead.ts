// Ten days at a glance, each by the rink's own calendar.
import { localDateOf } from '@/lib/advice/zoned-time'
import type { ScoredHour } from '@/lib/advice/types'
import type { DayAhead } from '@/lib/schemas/tonight-view'

const DAYS = 10

/** Sums scored hours from today on into days. A sum over a day with unknown hours is null, never too small. */
export function daysAhead(hours: readonly ScoredHour[], now: Date, timeZone: string): DayAhead[] {
  const today = localDateOf(now.getTime(), timeZone)
  const byDate = new Map<string, ScoredHour[]>()
  for (const hour of hours) {
    const date = localDateOf(Date.parse(hour.time), timeZone)
    if (date >= today) byDate.set(date, [...(byDate.get(date) ?? []), hour])
  }
  return [...byDate].slice(0, DAYS).map(([date, ofDay]) => sumDay(date, ofDay))
}

function sumDay(date: string, hours: readonly ScoredHour[]): DayAhead {
  const weather = hours.flatMap((hour) => (hour.weather ? [hour.weather] : []))
  const isWhole = weather.length === hours.length
  const total = (values: number[]) => (isWhole ? values.reduce((sum, value) => sum + value, 0) : null)
  const air = weather.map((w) => w.airTemperatureC)
  return {
    date,
    lowC: isWhole ? Math.min(...air) : null,
    highC: isWhole ? Math.max(...air) : null,
    freezableMm: total(hours.map((hour) => Math.max(0, hour.freezeRateMmPerH ?? 0))),
    snowCm: total(weather.map((w) => w.snowfallCm)),
    rainMm: total(weather.map((w) => w.rainMm)),
    floodHours: hours.filter((hour) => hour.verdict === 'flood').length,
  }
}
