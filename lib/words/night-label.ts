// The name of a night in a heading.
import { formatInTimeZone } from 'date-fns-tz'
import { addDays } from '@/lib/advice/zoned-time'

/** "Tue 12 to Wed 13 January" */
export function nightLabel(nightDate: string): string {
  const next = addDays(nightDate, 1)
  const write = (date: string, pattern: string) => formatInTimeZone(`${date}T12:00:00Z`, 'UTC', pattern)
  const isSameMonth = nightDate.slice(0, 7) === next.slice(0, 7)
  return `${write(nightDate, isSameMonth ? 'EEE d' : 'EEE d MMMM')} to ${write(next, 'EEE d MMMM')}`
}
