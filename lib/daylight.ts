// Whether the sun is down at a place, and when that changes next.
import { getPosition, getTimes } from 'suncalc'
import { DAY_MILLIS } from '@/lib/physics/constants'

export interface ChangeOfLight {
  at: Date
  isDark: boolean
}

/** From the day before to two days ahead: pages are left open overnight, seldom longer. Ours. */
const DAYS = [-1, 0, 1, 2]

/**
 * @returns whether it is dark now, and the coming sunsets and sunrises, oldest first: none in a polar day or night.
 */
export function daylight(
  now: Date,
  { latitudeDeg, longitudeDeg }: { latitudeDeg: number; longitudeDeg: number },
): { isDark: boolean; changes: ChangeOfLight[] } {
  const all = DAYS.flatMap((day) => {
    const { sunrise, sunset } = getTimes(new Date(now.getTime() + day * DAY_MILLIS), latitudeDeg, longitudeDeg)
    return [...(sunrise ? [{ at: sunrise, isDark: false }] : []), ...(sunset ? [{ at: sunset, isDark: true }] : [])]
  }).sort((one, other) => one.at.getTime() - other.at.getTime())
  const last = all.findLast(({ at }) => at <= now)
  return {
    isDark: last?.isDark ?? getPosition(now, latitudeDeg, longitudeDeg).altitude < 0,
    changes: all.filter(({ at }) => at > now),
  }
}
