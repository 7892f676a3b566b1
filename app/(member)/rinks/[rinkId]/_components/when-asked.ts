// When the page asks of a poured pass: whether it is set, and whether it is really to leave the log.
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import type { PouredPassView } from '@/lib/schemas/tonight-view'

/** Asked so long after the pour where nobody knows when it should be set. [ms] */
const ASK_AFTER = 2 * HOUR_MILLIS
/** "Still wet" is no last word: asked again after so long. [ms] */
const ASK_AGAIN = 30 * MINUTE_MILLIS

/** Whether it is time to ask. */
export function isAsked({ entry, outcome, outcomeAt, saidSetByAt, at }: PouredPassView, now: number): boolean {
  if (!entry || outcome === 'set' || outcome === 'spoiled') return false
  if (outcome === 'wet') return now >= Date.parse(outcomeAt ?? at) + ASK_AGAIN
  return now >= (saidSetByAt ? Date.parse(saidSetByAt) : Date.parse(at) + ASK_AFTER)
}

/** A slip is taken back at once; what somebody answered or changed since is not lost by one touch. */
export function hasMoreToLose({ entry, outcome }: PouredPassView): boolean {
  return outcome !== null || (entry !== null && entry.version > 1)
}
