// When the hose of a fill is in danger of freezing, running or left lying.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { GARDEN_HOSE, hoseFilmWm2K, stillHoseHours } from '@/lib/physics/hose'
import { FILLING } from './thresholds'
import type { Caution } from './types'

/** An hour of the forecast at the rink. */
export interface HoseHour {
  time: string
  airTemperatureC: number | null
  /** Where the hose lies. [m/s] Missing is taken as calm. */
  windAtRinkMps?: number | null
}

export interface HoseQuestion {
  hours: readonly HoseHour[]
  nowMillis: number
  isRunning: boolean
  waterTemperatureC: number
}

/**
 * Warns of frost in the hose within the next day.
 *
 * @param question Hours ahead, now [ms since the epoch], whether the hose runs, and its water. [°C]
 * @returns 'running_hose_freezes' from when a running hose is in danger, '…_now' when it is already; 'still_hose_freezes' while it is off, with
 *   how long a full hose has from the first hour of frost; null when neither is in sight.
 *
 * Source: the running hose by common practice (FILLING.hoseFreezesC); the still one by its heat, see stillHoseHours.
 */
export function hoseWarning({ hours, nowMillis, isRunning, waterTemperatureC }: HoseQuestion): Caution | null {
  const ahead = hours.filter(({ time }) => {
    const startMillis = Date.parse(time)
    return startMillis + HOUR_MILLIS > nowMillis && startMillis < nowMillis + FILLING.hoseAheadHours * HOUR_MILLIS
  })
  return isRunning ? runningHose(ahead, nowMillis) : stillHose(ahead, waterTemperatureC)
}

function runningHose(ahead: readonly HoseHour[], nowMillis: number): Caution | null {
  const first = ahead.find(({ airTemperatureC }) => airTemperatureC !== null && airTemperatureC <= FILLING.hoseFreezesC)
  if (!first) return null
  const lowestC = Math.min(...ahead.map(({ airTemperatureC }) => airTemperatureC ?? Number.POSITIVE_INFINITY))
  const values = { startsAt: first.time, airTemperatureC: first.airTemperatureC ?? 0, lowestC }
  const isNow = Date.parse(first.time) <= nowMillis
  return { code: isNow ? 'running_hose_freezes_now' : 'running_hose_freezes', values }
}

function stillHose(ahead: readonly HoseHour[], waterTemperatureC: number): Caution | null {
  const first = ahead.find(({ airTemperatureC }) => airTemperatureC !== null && airTemperatureC < 0)
  if (!first) return null
  const coldest = ahead.reduce((a, b) => ((b.airTemperatureC ?? 0) < (a.airTemperatureC ?? 0) ? b : a))
  const airTemperatureC = coldest.airTemperatureC ?? -0.1
  const film = hoseFilmWm2K(coldest.windAtRinkMps ?? 0, GARDEN_HOSE.outsideM)
  const still = stillHoseHours(GARDEN_HOSE, Math.max(0.1, waterTemperatureC), airTemperatureC, film)
  const values = {
    startsAt: first.time,
    airTemperatureC,
    minutesToIce: still.hoursToIce * 60,
    hoursToSolid: still.hoursToSolid,
  }
  return { code: 'still_hose_freezes', values }
}
