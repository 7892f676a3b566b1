// Wall clocks: a zone's offset at an instant, and the instant of a local date and time, right on clock-change nights.
import { DAY_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'

// Making a formatter takes a tenth of a millisecond, using one a few microseconds.
const formatters = new Map<string, Intl.DateTimeFormat>()

function formatterOf(timeZone: string): Intl.DateTimeFormat {
  let formatter = formatters.get(timeZone)
  if (!formatter) {
    formatter = new Intl.DateTimeFormat('en-US', { timeZone, timeZoneName: 'longOffset' })
    formatters.set(timeZone, formatter)
  }
  return formatter
}

// Clocks change on the quarter hour, so an offset holds for all of one; the same few nights are asked for over and over.
const QUARTER = 15 * MINUTE_MILLIS
const MOST_OFFSETS = 10_000
const offsets = new Map<string, number>()

/**
 * Offset of a zone from UTC at an instant, from the platform's own zone data.
 *
 * @param atMillis Instant. [ms since the epoch]
 * @param timeZone IANA zone.
 * @returns Offset, positive east. [min]
 * @throws RangeError for an unknown zone.
 *
 * Source: the platform's IANA data.
 */
export function zoneOffsetMinutes(atMillis: number, timeZone: string): number {
  const quarter = Math.floor(atMillis / QUARTER)
  const key = `${timeZone} ${quarter}`
  const known = offsets.get(key)
  if (known !== undefined) return known
  const offset = readOffset(quarter * QUARTER, timeZone)
  if (offsets.size >= MOST_OFFSETS) offsets.clear()
  offsets.set(key, offset)
  return offset
}

function readOffset(atMillis: number, timeZone: string): number {
  const found = /GMT([+-])(\d\d):(\d\d)/.exec(formatterOf(timeZone).format(atMillis))
  if (!found) return 0
  return (found[1] === '-' ? -1 : 1) * (Number(found[2]) * 60 + Number(found[3]))
}

/**
 * The offset of a whole stretch when it begins and ends with the same and is too short to change and change back.
 *
 * @param fromMillis Start. [ms since the epoch]
 * @param toMillis End. [ms since the epoch]
 * @param timeZone IANA zone of the rink.
 * @returns Offset, positive east; null when it may change. [min]
 * @throws RangeError for an unknown zone.
 *
 * Source: ours.
 */
export function steadyOffsetMinutes(fromMillis: number, toMillis: number, timeZone: string): number | null {
  const atFirst = zoneOffsetMinutes(fromMillis, timeZone)
  const isShort = toMillis - fromMillis < 25 * DAY_MILLIS
  return isShort && atFirst === zoneOffsetMinutes(toMillis, timeZone) ? atFirst : null
}

/**
 * Offsets of many ascending instants, cheaply where no clock changes between them.
 *
 * @param atMillis Instants, ascending. [ms since the epoch]
 * @param timeZone IANA zone of the rink.
 * @returns Offsets, positive east, one for each instant. [min]
 * @throws RangeError for an unknown zone.
 *
 * Source: zoneOffsetMinutes.
 */
export function zoneOffsetsMinutes(atMillis: readonly number[], timeZone: string): number[] {
  const first = atMillis[0]
  const last = atMillis[atMillis.length - 1]
  if (first === undefined || last === undefined) return []
  const steady = steadyOffsetMinutes(first, last, timeZone)
  return atMillis.map((millis) => steady ?? zoneOffsetMinutes(millis, timeZone))
}

/**
 * Local calendar date of an instant.
 *
 * @param atMillis Instant. [ms since the epoch]
 * @param timeZone IANA zone of the rink.
 * @returns Date, 'yyyy-MM-dd'.
 * @throws RangeError for an unknown zone.
 *
 * Source: zoneOffsetMinutes.
 */
export function localDateOf(atMillis: number, timeZone: string): string {
  return toIso(atMillis + zoneOffsetMinutes(atMillis, timeZone) * MINUTE_MILLIS).slice(0, 10)
}

/**
 * Instant at which a zone's clock shows a date and time. A time that a clock change skips gives the first instant
 * after the gap; a time that occurs twice gives the first.
 *
 * @param date 'yyyy-MM-dd'
 * @param minuteOfDay Minutes after local midnight by the clock, 0-1439.
 * @param timeZone IANA zone of the rink.
 * @returns Instant. [ms since the epoch]
 * @throws RangeError for an unknown zone.
 *
 * Source: ours.
 */
export function instantOfLocal(date: string, minuteOfDay: number, timeZone: string): number {
  const wall = Date.parse(`${date}T00:00:00Z`) + minuteOfDay * MINUTE_MILLIS
  const before = zoneOffsetMinutes(wall - DAY_MILLIS, timeZone)
  const after = zoneOffsetMinutes(wall + DAY_MILLIS, timeZone)
  const early = wall - Math.max(before, after) * MINUTE_MILLIS
  const late = wall - Math.min(before, after) * MINUTE_MILLIS
  for (const candidate of [early, late]) {
    if (candidate + zoneOffsetMinutes(candidate, timeZone) * MINUTE_MILLIS === wall) return candidate
  }
  // In the gap: the change itself is the first moment whose clock shows more than asked.
  return firstInstantOfOffset(early, late, after, timeZone)
}

function firstInstantOfOffset(low: number, high: number, offset: number, timeZone: string): number {
  let from = low
  let to = high
  while (to - from > MINUTE_MILLIS) {
    const middle = from + Math.floor((to - from) / 2 / MINUTE_MILLIS) * MINUTE_MILLIS
    if (zoneOffsetMinutes(middle, timeZone) === offset) to = middle
    else from = middle
  }
  return to
}

/**
 * The calendar date some days later.
 *
 * @param date 'yyyy-MM-dd'
 * @param days Whole days, negative for earlier. [d]
 * @returns Date, 'yyyy-MM-dd'.
 *
 * Source: Gregorian calendar.
 */
export function addDays(date: string, days: number): string {
  return toIso(Date.parse(`${date}T00:00:00Z`) + days * DAY_MILLIS).slice(0, 10)
}

const TWO_DIGITS = Array.from({ length: 60 }, (_, number) => String(number).padStart(2, '0'))
let cachedDay = Number.NaN
let cachedDate = ''

/**
 * ISO 8601 in UTC without milliseconds, as in the records of the forecast. A judgement writes thousands of these, so
 * the date of the day last written is kept.
 *
 * @param atMillis Instant. [ms since the epoch]
 * @returns Instant to the second, ISO 8601.
 *
 * Source: ours.
 */
export function toIso(atMillis: number): string {
  const day = Math.floor(atMillis / DAY_MILLIS)
  if (day !== cachedDay) {
    cachedDate = new Date(atMillis).toISOString().slice(0, 11)
    cachedDay = day
  }
  const second = Math.floor((atMillis - day * DAY_MILLIS) / 1000)
  const minute = Math.floor(second / 60)
  const clock = `${TWO_DIGITS[Math.floor(minute / 60)]}:${TWO_DIGITS[minute % 60]}:${TWO_DIGITS[second % 60]}`
  return `${cachedDate}${clock}Z`
}
