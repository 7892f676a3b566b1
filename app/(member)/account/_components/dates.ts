// Days of an account: it belongs to no rink, so they are told in UTC.
import { formatInTimeZone } from 'date-fns-tz'

export const dayOf = (at: Date) => formatInTimeZone(at, 'UTC', 'd MMMM yyyy')
