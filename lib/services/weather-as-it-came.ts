// The weather of hours that are over, put together from the forecasts that knew them best.
import { findNewestForecast, findOldestForecastSince } from '@/db/queries/forecasts'
import type { Db } from '@/db/knex'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { HourlyRecord } from '@/lib/physics/types'

/** A forecast read so long after an hour still reaches back to it. [h] */
const REACH_HOURS = 20

/**
 * Hours from one instant to another: from a forecast read soon after, and, where that one does not reach back, from the
 * first that was read since. Hours that neither knows are left out at the ends.
 *
 * @param aheadHours So many hours more, as they were forecast then: for what had not ended yet.
 */
export async function weatherAsItCame(
  db: Db,
  cellId: string,
  { from, to, aheadHours = 0 }: { from: Date; to: Date; aheadHours?: number },
): Promise<HourlyRecord[]> {
  const readBy = new Date(to.getTime() + REACH_HOURS * HOUR_MILLIS)
  const [early, late] = await Promise.all([
    findOldestForecastSince(db, cellId, from),
    findNewestForecast(db, cellId, readBy),
  ])
  if (!early || !late) return []
  const reachesFrom = Date.parse(late.hours[0]?.time ?? '')
  const before = early.hours.filter(({ time }) => Date.parse(time) < reachesFrom)
  const first = Math.floor(from.getTime() / HOUR_MILLIS) * HOUR_MILLIS
  const end = to.getTime() + aheadHours * HOUR_MILLIS
  return [...before, ...late.hours].filter(({ time }) => Date.parse(time) >= first && Date.parse(time) < end)
}
