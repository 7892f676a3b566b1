// Times of day, zones and dates as a rink's people type them.
import { z } from 'zod'

const CLOCK_TIME = /^([01][0-9]|2[0-3]):[0-5][0-9]$/
const DAY_MINUTES = 24 * 60

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

function minuteOf(time: string): number {
  const [hours = 0, minutes = 0] = time.split(':').map(Number)
  return hours * 60 + minutes
}

/** Whether two spans of the day share a minute; a span whose end is before its start runs past midnight. */
export function doOverlap(a: Hours, b: Hours): boolean {
  const spans = ({ from, to }: Hours): [number, number][] => {
    const [start, end] = [minuteOf(from), minuteOf(to)]
    return end > start
      ? [[start, end]]
      : [
          [start, DAY_MINUTES],
          [0, end],
        ]
  }
  return spans(a).some(([startA, endA]) => spans(b).some(([startB, endB]) => startA < endB && startB < endA))
}
