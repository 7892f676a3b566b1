// How the reader of a night sheet wants figures, and the few words of dates that only screens need.
import { formatInTimeZone } from 'date-fns-tz'
import { addDays } from '@/lib/advice/zoned-time'
import type { TonightView } from '@/lib/schemas/tonight-view'
import type { WordOptions } from '@/lib/words/options'

/** Units and clock are the person's; times are told in the rink's zone. */
export function readerOf({ viewer, rink }: Pick<TonightView, 'viewer' | 'rink'>): WordOptions {
  return { units: viewer.units, clock: viewer.clock, timeZone: rink.timeZone, locale: 'en' }
}

const dateText = (date: string, form: string) => formatInTimeZone(`${date}T12:00:00Z`, 'UTC', form)

/** "Fri 15 January"; a calendar date has no zone. */
export const dayText = (date: string) => dateText(date, 'EEE d MMMM')

/** "Fri 15" */
export const shortDayText = (date: string) => dateText(date, 'EEE d')

/** "Tue 12 to Wed 13 January" */
export function nightLabel(date: string): string {
  const next = addDays(date, 1)
  return `${date.slice(0, 7) === next.slice(0, 7) ? shortDayText(date) : dayText(date)} to ${dayText(next)}`
}

/** How long ago, in the largest unit that fits. */
export function ageText(from: string, now: number): string {
  const minutes = Math.max(0, Math.round((now - Date.parse(from)) / 60_000))
  if (minutes < 1) return 'just now'
  if (minutes < 60) return `${minutes} ${minutes === 1 ? 'minute' : 'minutes'} ago`
  const hours = Math.round(minutes / 60)
  if (hours < 48) return `${hours} ${hours === 1 ? 'hour' : 'hours'} ago`
  return `${Math.round(hours / 24)} days ago`
}
