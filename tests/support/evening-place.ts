// A place where it is early evening now: the product runs on the real clock, and so do the tests of the whole.
import { formatInTimeZone } from 'date-fns-tz'

const PLACES = [
  { placeName: 'Tanana Valley', latitudeDeg: 64.7, longitudeDeg: -148.3, timeZone: 'America/Anchorage' },
  { placeName: 'Upper Ottawa Valley', latitudeDeg: 45.9, longitudeDeg: -77.3, timeZone: 'America/Toronto' },
  { placeName: 'Gudbrandsdalen', latitudeDeg: 61.3, longitudeDeg: 10.2, timeZone: 'Europe/Oslo' },
  { placeName: 'West of Khovd', latitudeDeg: 48.0, longitudeDeg: 91.4, timeZone: 'Asia/Hovd' },
  { placeName: 'Northern Hokkaido', latitudeDeg: 44.0, longitudeDeg: 142.8, timeZone: 'Asia/Tokyo' },
]

/** The places' clocks are at most six hours apart, so one of them shows 16:00 to 22:00 at any instant. */
export function eveningPlace(now: Date): (typeof PLACES)[number] {
  const hoursFromSeven = (zone: string) => Math.abs(Number(formatInTimeZone(now, zone, 'H')) - 19)
  const [evening] = [...PLACES].sort((a, b) => hoursFromSeven(a.timeZone) - hoursFromSeven(b.timeZone))
  if (!evening) throw new Error('No places')
  return evening
}
