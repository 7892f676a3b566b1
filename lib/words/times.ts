// Times in words, always by the rink's clock.
import { localMinuteOf, nightDateOf, tonightDate } from '@/lib/advice/night'
import { addDays, localDateOf } from '@/lib/advice/zoned-time'
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import type { WordOptions } from './options'

/** "8 pm", "1:50 am", "midnight"; on a 24-hour clock "20:00". */
export function clockText(at: string | Date, words: WordOptions): string {
  const minute = localMinuteOf(Math.round(new Date(at).getTime() / MINUTE_MILLIS) * MINUTE_MILLIS, words.timeZone)
  const hour = Math.floor(minute / 60)
  const twoDigits = (number: number) => String(number).padStart(2, '0')
  if (words.clock === '24') return `${twoDigits(hour)}:${twoDigits(minute % 60)}`
  if (minute === 0) return 'midnight'
  if (minute === 720) return 'noon'
  const past = minute % 60 === 0 ? '' : `:${twoDigits(minute % 60)}`
  return `${hour % 12 || 12}${past} ${hour < 12 ? 'am' : 'pm'}`
}

/** To the next five minutes, so that a promise holds. */
export function doneBy(at: string): Date {
  return new Date(Math.ceil(Date.parse(at) / (5 * MINUTE_MILLIS)) * 5 * MINUTE_MILLIS)
}

/** A moment by which something is done. */
export function doneByText(at: string, words: WordOptions): string {
  return clockText(doneBy(at), words)
}

/** After so long a time of day alone may be that of another day. */
const SAME_NIGHT_MILLIS = 12 * HOUR_MILLIS

/** The same of what was begun at a moment: "1:50 am"; with its weekday, "Wed 6 pm", in another night or long after. */
export function doneByDayText(at: string, begunAt: string, words: WordOptions): string {
  const done = doneBy(at)
  const begun = new Date(begunAt)
  const isSameNight =
    nightDateOf(done, words.timeZone) === nightDateOf(begun, words.timeZone) &&
    done.getTime() - begun.getTime() <= SAME_NIGHT_MILLIS
  if (isSameNight) return clockText(done, words)
  const weekday = new Intl.DateTimeFormat(words.locale, { weekday: 'short', timeZone: words.timeZone })
  return `${weekday.format(done)} ${clockText(done, words)}`
}

/** Name of the weekday of an instant, by the rink's clock. */
export function weekdayText(at: string | Date, words: WordOptions): string {
  return new Intl.DateTimeFormat(words.locale, { weekday: 'long', timeZone: words.timeZone }).format(new Date(at))
}

const PARTS: [fromMinute: number, name: string][] = [
  [17 * 60, 'evening'],
  [12 * 60, 'afternoon'],
  [5 * 60, 'morning'],
]

/** Undefined from 9 pm to 5 am. */
function partOfDay(instant: number, { timeZone }: WordOptions): string | undefined {
  const minute = localMinuteOf(instant, timeZone)
  return minute >= 21 * 60 ? undefined : PARTS.find(([from]) => minute >= from)?.[1]
}

/** "Thursday evening", "tomorrow morning", "this evening", "Wednesday night" for the small hours. */
export function dayPartText(at: string, now: Date, words: WordOptions): string {
  const instant = Date.parse(at)
  const part = partOfDay(instant, words)
  const nightDate = nightDateOf(new Date(instant), words.timeZone)
  if (!part) return nightText(nightDate, now, words)
  const date = localDateOf(instant, words.timeZone)
  const today = localDateOf(now.getTime(), words.timeZone)
  if (date === today) return `this ${part}`
  if (date === addDays(today, 1)) return `tomorrow ${part}`
  return `${weekdayText(at, words)} ${part}`
}

/** "Thursday evening, 14 January", for what is read on another day than it was written on. */
export function datedPartText(at: string, words: WordOptions): string {
  const instant = Date.parse(at)
  const part = partOfDay(instant, words)
  const date = part ? localDateOf(instant, words.timeZone) : nightDateOf(new Date(instant), words.timeZone)
  const dayAndMonth = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', timeZone: 'UTC' })
  return `${weekdayOfDate(date, words)} ${part ?? 'night'}, ${dayAndMonth.format(Date.parse(`${date}T00:00:00Z`))}`
}

/** "tonight", "tomorrow night", "Thursday night"; in the small hours, which are still tonight, "the coming night". */
export function nightText(nightDate: string, now: Date, words: WordOptions): string {
  const tonight = tonightDate(now, words.timeZone)
  if (nightDate === tonight) return 'tonight'
  const today = localDateOf(now.getTime(), words.timeZone)
  if (nightDate === today) return 'the coming night'
  if (nightDate === addDays(today, 1)) return 'tomorrow night'
  return `${weekdayOfDate(nightDate, words)} night`
}

function weekdayOfDate(date: string, { locale }: WordOptions): string {
  return new Intl.DateTimeFormat(locale, { weekday: 'long', timeZone: 'UTC' }).format(Date.parse(`${date}T00:00:00Z`))
}

/** "between 8 pm and 1 am"; "until 1 am" once it has begun. */
export function spanText(startsAt: string, endsAt: string, now: Date, words: WordOptions): string {
  if (Date.parse(startsAt) <= now.getTime()) return `until ${clockText(endsAt, words)}`
  return `between ${clockText(startsAt, words)} and ${clockText(endsAt, words)}`
}
