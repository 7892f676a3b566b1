// Invented hours for tests: a cold clear night, and what can come of it. Times are UTC.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { HourlyRecord } from '@/lib/physics/types'

/** One cold, clear, dry hour. */
function coldHour(time: string): HourlyRecord {
  return {
    time,
    airTemperatureC: -9,
    dewPointC: -13,
    windSpeedMps: 2,
    windGustMps: 4,
    cloudCover: 0.05,
    shortwaveWm2: 0,
    precipitationMm: 0,
    rainMm: 0,
    snowfallCm: 0,
    pressureHpa: 1010,
  }
}

/** Hours from `fromAt` on; `change` gives what differs from cold and clear, hour by hour. */
export function hoursFrom(
  fromAt: Date,
  count: number,
  change: (at: Date) => Partial<HourlyRecord> = () => ({}),
): HourlyRecord[] {
  return Array.from({ length: count }, (_, index) => {
    const at = new Date(fromAt.getTime() + index * HOUR_MILLIS)
    const time = at.toISOString().replace('.000Z', 'Z')
    return { ...coldHour(time), ...change(at), time }
  })
}

/** A thaw: mild, damp and overcast. */
export const THAW: Partial<HourlyRecord> = { airTemperatureC: 5, dewPointC: 4, cloudCover: 1, windSpeedMps: 4 }

/** Steady snow. */
export const SNOW: Partial<HourlyRecord> = {
  airTemperatureC: -3,
  dewPointC: -4,
  cloudCover: 1,
  precipitationMm: 1,
  snowfallCm: 0.7,
}
