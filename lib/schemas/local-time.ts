// Times of day, zones and dates as a rink's people type them.
import { z } from 'zod'
import { minuteOf, MINUTES_A_DAY } from '@/lib/advice/time-of-day'

const CLOCK_TIME = /^([01][0-9]|2[0-3]):[0-5][0-9]$/

export const clockTimeSchema = z.string('Type a time, like 17:00.').regex(CLOCK_TIME, 'Type a time, like 17:00.')

export const dateSchema = z.iso.date('Choose a date.')

/** Names of the IANA database only: an offset like "+05:00" knows no summer time. */
export function isTimeZone(name: string): boolean {
  if (!/^[A-Z][A-Za-z0-9_+\-/]{2,63}$/.test(name)) return false
  try {
    new Intl.DateTimeFormat('en', { timeZone: name })
    return true
  } catch {
    return false
  }
}

export const timeZoneSchema = z
  .string()
  .trim()
  .refine(isTimeZone, 'Choose a time zone from the list, like America/Toronto.')

export interface Hours {
  from: string
  to: string
}

/** Hours that start on some days of the week only: Monday 1 to Sunday 7. */
export interface WeekHours extends Hours {
  weekdays: number[]
}

const WEEK_MINUTES = 7 * MINUTES_A_DAY
export const EVERY_DAY = [1, 2, 3, 4, 5, 6, 7]

/** Spans in minutes of the week; the last one may run over its end. */
function weekSpans({ from, to, weekdays }: WeekHours): [start: number, end: number][] {
  const length = (minuteOf(to) - minuteOf(from) + MINUTES_A_DAY) % MINUTES_A_DAY || MINUTES_A_DAY
  return weekdays.map((day) => {
    const start = (day - 1) * MINUTES_A_DAY + minuteOf(from)
    return [start, start + length]
  })
}

/** Whether two rows of hours share a minute of the week; an end before the start runs past midnight. */
export function shareAMinute(a: WeekHours, b: WeekHours): boolean {
  const apart = (startA: number, endA: number, startB: number, endB: number) => endA <= startB || endB <= startA
  return weekSpans(a).some(([startA, endA]) =>
    weekSpans(b).some(([startB, endB]) =>
      [-WEEK_MINUTES, 0, WEEK_MINUTES].some((shift) => !apart(startA, endA, startB + shift, endB + shift)),
    ),
  )
}

/** The same of hours that are the same every day. */
export function doOverlap(a: Hours, b: Hours): boolean {
  return shareAMinute({ ...a, weekdays: EVERY_DAY }, { ...b, weekdays: EVERY_DAY })
}
