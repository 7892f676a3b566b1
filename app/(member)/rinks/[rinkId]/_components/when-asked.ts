// When the page asks whether a poured pass is set.
import type { PouredPassView } from '@/lib/schemas/tonight-view'

/** Asked so long after the pour where nobody knows when it should be set. [ms] */
const ASK_AFTER = 2 * 3_600_000
/** "Still wet" is no last word: asked again after so long. [ms] */
const ASK_AGAIN = 30 * 60_000

/** Whether it is time to ask. */
export function isAsked({ entry, outcome, outcomeAt, saidSetByAt, at }: PouredPassView, now: number): boolean {
  if (!entry || outcome === 'set' || outcome === 'spoiled') return false
  if (outcome === 'wet') return now >= Date.parse(outcomeAt ?? at) + ASK_AGAIN
  return now >= (saidSetByAt ? Date.parse(saidSetByAt) : Date.parse(at) + ASK_AFTER)
}
