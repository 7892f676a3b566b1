// Calendar dates in words, for headings and lists; a date has no zone.
import { addDays } from '@/lib/advice/zoned-time'

const part = (date: string, form: Intl.DateTimeFormatOptions) =>
  new Intl.DateTimeFormat('en', { ...form, timeZone: 'UTC' }).format(Date.parse(`${date}T12:00:00Z`))

/** "Fri 15" */
export const shortDayText = (date: string) => `${part(date, { weekday: 'short' })} ${part(date, { day: 'numeric' })}`

/** "Fri 15 January" */
export const dayText = (date: string) => `${shortDayText(date)} ${part(date, { month: 'long' })}`

/** "Fri 15 Jan" */
export const shortDateText = (date: string) => `${shortDayText(date)} ${part(date, { month: 'short' })}`

/** "Tue 12 to Wed 13 January" */
export function nightLabel(nightDate: string): string {
  const next = addDays(nightDate, 1)
  const isSameMonth = nightDate.slice(0, 7) === next.slice(0, 7)
  return `${isSameMonth ? shortDayText(nightDate) : dayText(nightDate)} to ${dayText(next)}`
}
