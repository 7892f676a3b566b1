// News that can wait keeps until the person's time of day.
import { DAY_MILLIS, HOUR_MILLIS } from '@/lib/physics/constants'

/** News that can wait is told in these hours from the person's time of day on, and not at night. Ours. */
const LISTENING_MILLIS = 6 * HOUR_MILLIS

/**
 * Whether it is time to tell of something that is to come: at the person's time of day, or when the next would come
 * after it.
 *
 * @param now Instant of asking.
 * @param tellAt The person's own time of day on the night that people mean by tonight.
 * @param startsAt When it is to come.
 * @returns True when it is time.
 *
 * Source: ours.
 */
export function isTimeToTell({ now, tellAt }: { now: Date; tellAt: Date }, startsAt: Date): boolean {
  const since = now.getTime() - tellAt.getTime()
  if (since >= 0 && since < LISTENING_MILLIS) return true
  const nextMillis = since < 0 ? tellAt.getTime() : tellAt.getTime() + DAY_MILLIS
  return startsAt.getTime() <= nextMillis
}
