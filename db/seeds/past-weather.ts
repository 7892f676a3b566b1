// Invented weather of the three weeks before today, for the demo's record: as it was forecast, and as it came.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { HourlyRecord } from '@/lib/physics/types'

interface PastNight {
  lowC: number
  cloudCover: number
  windSpeedMps: number
  /** Hours after noon from which it snows or rains for four hours. */
  snowFrom?: number
  rainFrom?: number
  /** What the forecast of that afternoon did not see. */
  unseen?: 'precipitation' | 'cloud'
}

const clear = (lowC: number, more: Partial<PastNight> = {}): PastNight => ({
  lowC,
  cloudCover: 0.1,
  windSpeedMps: 2,
  ...more,
})
const overcast = (lowC: number, more: Partial<PastNight> = {}): PastNight => ({
  lowC,
  cloudCover: 1,
  windSpeedMps: 3,
  ...more,
})

/** Oldest first; the last is the night before today. */
const NIGHTS: readonly PastNight[] = [
  clear(-9),
  clear(-12),
  overcast(-3, { snowFrom: 7 }),
  clear(-14),
  clear(-8),
  overcast(1, { rainFrom: 9 }),
  overcast(3),
  overcast(-1),
  clear(-7),
  clear(-10, { snowFrom: 6, unseen: 'precipitation' }),
  clear(-16),
  clear(-11),
  overcast(-2, { snowFrom: 6 }),
  clear(-9),
  overcast(2, { unseen: 'cloud' }),
  clear(-13),
  clear(-15),
  clear(-10),
  overcast(-4, { snowFrom: 4 }),
  clear(-12),
]
export const PAST_NIGHTS = NIGHTS.length

/** Six degrees between the warmest hour, 2 pm, and the coldest, 5 am. */
function airAt(night: PastNight, hourAfterNoon: number): number {
  const turn = ((hourAfterNoon - 2) / 15) * Math.PI
  return night.lowC + 3 + 3 * Math.cos(Math.min(turn, Math.PI))
}

function hourOf(night: PastNight, hourAfterNoon: number, at: number, isForecast: boolean): HourlyRecord {
  const isUnseen = (what: PastNight['unseen']) => isForecast && night.unseen === what
  const falls = (from: number | undefined) =>
    from !== undefined && !isUnseen('precipitation') && hourAfterNoon >= from && hourAfterNoon < from + 4
  const snows = falls(night.snowFrom)
  const rains = falls(night.rainFrom)
  const air = airAt(night, hourAfterNoon) - (isUnseen('cloud') ? 7 : 0)
  const cloudCover = snows || rains ? 1 : isUnseen('cloud') ? 0.1 : night.cloudCover
  return {
    time: new Date(at).toISOString().replace('.000Z', 'Z'),
    airTemperatureC: air,
    dewPointC: air - (cloudCover > 0.5 ? 1 : 4),
    windSpeedMps: night.windSpeedMps,
    windGustMps: night.windSpeedMps * 1.8,
    cloudCover,
    shortwaveWm2: null,
    precipitationMm: snows ? 0.8 : rains ? 1.5 : 0,
    rainMm: rains ? 1.5 : 0,
    snowfallCm: snows ? 0.9 : 0,
    pressureHpa: 1008,
  }
}

/**
 * The forecast read in the afternoon of a night: the day before as it came, the two days ahead as they were foreseen.
 *
 * @param index Of the night in the list; the last one's day ahead repeats it.
 * @param noon Start of that night.
 */
export function pastForecast(index: number, noon: Date): HourlyRecord[] {
  return Array.from({ length: 72 }, (_, hour) => {
    const nightIndex = Math.min(PAST_NIGHTS - 1, Math.max(0, index - 1 + Math.floor(hour / 24)))
    const at = noon.getTime() + (hour - 24) * HOUR_MILLIS
    return hourOf(NIGHTS[nightIndex]!, hour % 24, at, hour >= 27)
  })
}
