// When something happened, from what a person typed: minutes ago, or a time by the rink's clock.
import { localMinuteOf, nightDateOf } from '@/lib/advice/night'
import { seasonOf } from '@/lib/advice/season'
import { minuteOf } from '@/lib/advice/time-of-day'
import { addDays, instantOfLocal, localDateOf, zoneOffsetMinutes } from '@/lib/advice/zoned-time'
import { InvalidInputError } from '@/lib/errors'
import { DAY_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import type { When } from '@/lib/schemas/log'
import type { WhichHour } from '@/lib/schemas/log-choices'

/** Clocks of phones and servers differ by this much without anybody minding. [min] Ours. */
const FUTURE_SLACK_MINUTES = 5

interface Frame {
  now: Date
  timeZone: string
}

const refuse = (field: string, message: string) =>
  new InvalidInputError('Something here needs another look.', { [field]: message })

/**
 * The instant at which the rink's clock showed a date and time.
 *
 * @param known What an entry said before: a time left as it was stays the same instant, in a doubled hour too.
 * @throws InvalidInputError for a time that a clock change skipped, and for one that it showed twice when nobody said which.
 */
function instantByClock(
  clock: { date: string; time: string; which?: WhichHour },
  timeZone: string,
  known?: Date,
): Date {
  const { date, time, which } = clock
  const minute = minuteOf(time)
  const shows = (atMillis: number) =>
    localDateOf(atMillis, timeZone) === date && localMinuteOf(atMillis, timeZone) === minute
  if (known && which === undefined && shows(known.getTime())) return known
  const first = instantOfLocal(date, minute, timeZone)
  if (!shows(first)) throw refuse('atTime', 'The clock skipped that time: it was set forward that night.')
  const setBackMinutes = zoneOffsetMinutes(first, timeZone) - zoneOffsetMinutes(first + DAY_MILLIS, timeZone)
  const second = first + setBackMinutes * MINUTE_MILLIS
  if (setBackMinutes <= 0 || !shows(second)) return new Date(first)
  if (which === undefined) {
    throw refuse('whichHour', 'The clock showed that time twice, because it was set back. Choose which one.')
  }
  return new Date(which === 'first' ? first : second)
}

/** A time alone is the last time the clock showed it. */
function dateOfTime(time: string, { now, timeZone }: Frame): string {
  const today = localDateOf(now.getTime(), timeZone)
  const isToCome = minuteOf(time) > localMinuteOf(now.getTime(), timeZone) + FUTURE_SLACK_MINUTES
  return isToCome ? addDays(today, -1) : today
}

function read(when: When, frame: Frame, known?: Date): Date {
  const { onDate, atTime, minutesAgo = 0, whichHour } = when
  if (atTime === undefined) return new Date(frame.now.getTime() - minutesAgo * MINUTE_MILLIS)
  const date = onDate ?? dateOfTime(atTime, frame)
  return instantByClock({ date, time: atTime, which: whichHour }, frame.timeZone, known)
}

/**
 * When it happened, and the night that it belongs to.
 *
 * @throws InvalidInputError at the field, for what is still to come and for what belongs to another season.
 */
export function happened(when: When, frame: Frame, known?: Date): { happenedAt: Date; nightDate: string } {
  const { now, timeZone } = frame
  const at = read(when, frame, known)
  if (at.getTime() > now.getTime() + FUTURE_SLACK_MINUTES * MINUTE_MILLIS) {
    throw refuse(when.onDate === undefined ? 'atTime' : 'onDate', 'That is still to come.')
  }
  const happenedAt = at > now ? now : at
  const nightDate = nightDateOf(happenedAt, timeZone)
  const season = seasonOf(nightDateOf(known ?? now, timeZone))
  if (nightDate < season.from || nightDate > season.to) {
    throw refuse('onDate', 'That night belongs to another season.')
  }
  return { happenedAt, nightDate }
}

/** The first time after an instant that the clock showed a time of day. */
export function firstAfter(instant: Date, time: string, timeZone: string): Date {
  const date = localDateOf(instant.getTime(), timeZone)
  const onDay = (days: number) => instantOfLocal(addDays(date, days), minuteOf(time), timeZone)
  // To the minute, as the clock shows it: what set in the minute it was poured is not a day late.
  const from = Math.floor(instant.getTime() / MINUTE_MILLIS) * MINUTE_MILLIS
  const candidates = [onDay(0), onDay(1)]
  return new Date(Math.max(instant.getTime(), candidates.find((atMillis) => atMillis >= from) ?? from))
}
