// A night as a screen frames it: noon to noon, with the sun's own times.
import { nightBounds } from '@/lib/advice/night'
import { sunUpDownMillis } from '@/lib/physics/sun'

export interface NightFrame {
  date: string
  startsAt: string
  endsAt: string
  /** Null where the sun does not set or rise within the night. */
  sunsetAt: string | null
  sunriseAt: string | null
}

export function nightFrame(
  rink: { latitudeDeg: number; longitudeDeg: number; timeZone: string },
  date: string,
): NightFrame {
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
