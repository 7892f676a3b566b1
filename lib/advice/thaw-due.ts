// Is there a thaw to tell one person of, now? Once a thaw; then silence until a night is good again.
import { DAY_MILLIS } from '@/lib/physics/constants'
import { isTimeToTell } from './time-to-tell'
import type { Thaw } from './types'

export interface ThawQuestion {
  now: Date
  /** The person's own time of day on the night that people mean by tonight. */
  tellAt: Date
  isMuted: boolean
  /** Advice from an old forecast is shown with its age and never sent. */
  isForecastStale: boolean
  thaws: readonly Thaw[]
  /** Thaws the person was told of on this channel. */
  told: readonly Pick<Thaw, 'startsAt' | 'endsAt'>[]
}

/**
 * The thaw to tell of now, or null: one that begins within a day and is none of those told. A thaw that overlaps one
 * that was told is the same, with other hours. It is asked only while there is ice to skate on.
 *
 * @param question What is forecast and was told, and what is so now.
 * @returns Thaw, or null.
 *
 * Source: ours.
 */
export function dueThaw(question: ThawQuestion): Thaw | null {
  if (question.isMuted || question.isForecastStale) return null
  const nowMillis = question.now.getTime()
  const due = question.thaws.find((thaw) => {
    const startMillis = Date.parse(thaw.startsAt)
    const isNear = startMillis > nowMillis && startMillis <= nowMillis + DAY_MILLIS
    return isNear && !question.told.some((one) => overlap(one, thaw))
  })
  return due && isTimeToTell(question, new Date(due.startsAt)) ? due : null
}

function overlap(one: Pick<Thaw, 'startsAt' | 'endsAt'>, other: Thaw): boolean {
  return Date.parse(one.startsAt) < Date.parse(other.endsAt) && Date.parse(other.startsAt) < Date.parse(one.endsAt)
}
