// Nights: a night runs from local noon to the next local noon and is named by the date it begins on.
import { MINUTE_MILLIS } from '@/lib/physics/constants'
import { MINUTES_A_DAY } from './time-of-day'
import { addDays, instantOfLocal, localDateOf, zoneOffsetMinutes } from './zoned-time'

const NOON_MINUTE = 12 * 60
/** Up to this hour "tonight" is the night that is ending; from it on, the one to come. */
const TONIGHT_TURNS_AT_MINUTE = 9 * 60

/**
 * Minutes on the rink's clock since local midnight.
 *
 * @param atMillis Instant. [ms since the epoch]
 * @param timeZone IANA zone of the rink.
 * @returns Minutes. [min], 0 to 1439
 * @throws RangeError for an unknown zone.
 *
 * Source: definition.
 */
export function localMinuteOf(atMillis: number, timeZone: string): number {
  const local = Math.floor(atMillis / MINUTE_MILLIS) + zoneOffsetMinutes(atMillis, timeZone)
  return ((local % MINUTES_A_DAY) + MINUTES_A_DAY) % MINUTES_A_DAY
}

/**
 * The night an instant lies in.
 *
 * @param instant Any instant.
 * @param timeZone IANA zone of the rink.
 * @returns Date of the noon the night began at, 'yyyy-MM-dd'.
 * @throws RangeError for an unknown zone.
 *
 * Source: ours: a night runs from noon to noon.
 */
export function nightDateOf(instant: Date, timeZone: string): string {
  const atMillis = instant.getTime()
  const date = localDateOf(atMillis, timeZone)
  return localMinuteOf(atMillis, timeZone) < NOON_MINUTE ? addDays(date, -1) : date
}

/**
 * The night people mean by "tonight": before 9 am by the rink's clock the one still running, from 9 am the one to
 * come. The hour is ours: floods of the early shift end by then, and plans for the evening have not begun.
 *
 * @param now Instant of asking.
 * @param timeZone IANA zone of the rink.
 * @returns Date of the noon the night began at, 'yyyy-MM-dd'.
 * @throws RangeError for an unknown zone.
 *
 * Source: ours.
 */
export function tonightDate(now: Date, timeZone: string): string {
  const atMillis = now.getTime()
  const date = localDateOf(atMillis, timeZone)
  return localMinuteOf(atMillis, timeZone) < TONIGHT_TURNS_AT_MINUTE ? addDays(date, -1) : date
}

/**
 * When a night becomes what people mean by "tonight"; passes of it may be poured from then on.
 *
 * @param nightDate 'yyyy-MM-dd'
 * @param timeZone IANA zone of the rink.
 * @returns 9 am of that date by the rink's clock, three hours before the night begins.
 * @throws RangeError for an unknown zone.
 *
 * Source: ours, as in `tonightDate`.
 */
export function tonightStartsAt(nightDate: string, timeZone: string): Date {
  return new Date(instantOfLocal(nightDate, TONIGHT_TURNS_AT_MINUTE, timeZone))
}

/**
 * First and last instant of a night. A night is 23 or 25 hours long when the clocks change in it.
 *
 * @param nightDate 'yyyy-MM-dd'
 * @param timeZone IANA zone of the rink.
 * @returns Local noon of that date, and of the next (not part of the night).
 * @throws RangeError for an unknown zone.
 *
 * Source: ours: a night runs from noon to noon.
 */
export function nightBounds(nightDate: string, timeZone: string): { startsAt: Date; endsAt: Date } {
  return {
    startsAt: new Date(instantOfLocal(nightDate, NOON_MINUTE, timeZone)),
    endsAt: new Date(instantOfLocal(addDays(nightDate, 1), NOON_MINUTE, timeZone)),
  }
}
