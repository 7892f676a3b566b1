// A night as a screen frames it: noon to noon, with the sun's own times.
import { nightBounds } from '@/lib/advice/night'
import { sunUpDownMillis } from '@/lib/physics/sun'
import type { TonightView } from '@/lib/schemas/tonight-view'

/** Sunset and sunrise are null where they do not fall within the night. */
export function nightFrame(
  rink: { latitudeDeg: number; longitudeDeg: number; timeZone: string },
  date: string,
): TonightView['night'] {
  const { startsAt, endsAt } = nightBounds(date, rink.timeZone)
  const sunAt = (noon: Date) => sunUpDownMillis(noon.getTime(), rink.latitudeDeg, rink.longitudeDeg)
  const within = (millis: number | null) =>
    millis !== null && millis >= startsAt.getTime() && millis <= endsAt.getTime()
      ? new Date(millis).toISOString()
      : null
  return {
    date,
    startsAt: startsAt.toISOString(),
    endsAt: endsAt.toISOString(),
    sunsetAt: within(sunAt(startsAt).setMillis),
    sunriseAt: within(sunAt(endsAt).riseMillis),
  }
}
