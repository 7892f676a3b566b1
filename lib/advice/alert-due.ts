// Is there something to tell one person about tonight, now? Once per thing worth saying, silence otherwise.

export type AlertKind = 'flood-tonight' | 'flood-changed' | 'flood-closed'

export interface AlertQuestion {
  now: Date
  /** The person's own time of day on this night. */
  tellAt: Date
  isMuted: boolean
  /** Advice from an old forecast is shown with its age and never sent. */
  isForecastStale: boolean
  /** The advised flood window that stands, by version. */
  window: { version: number; state: 'open' | 'closed'; latestStartAt: Date | null } | null
  /** What the person was told last for this night. */
  told: { version: number; kind: AlertKind } | null
  /** Change messages sent for this night so far. */
  changesTold: number
  /** Somebody is out flooding: from here on the crew sees for itself. */
  hasPoured: boolean
}

/**
 * Whether a night is silent for a person.
 *
 * @param mutedThroughDate The last silent night, 'yyyy-MM-dd'; null when nothing is silent.
 * @param nightDate The night in question, 'yyyy-MM-dd'.
 * @returns Whether nothing may be sent about it.
 *
 * Source: definition.
 */
export function isMuted(mutedThroughDate: string | null, nightDate: string): boolean {
  return mutedThroughDate !== null && mutedThroughDate >= nightDate
}

/** A forecast that flips all evening must not ring all evening. Ours. */
const MOST_CHANGES_A_NIGHT = 3

/**
 * What to tell now, or null. Same question, same answer; the caller's unique key makes it happen once. In a thaw no
 * window is advised, so nothing is due: that is the silence.
 *
 * @param question What was said and told, and what is so now.
 * @returns Kind of alert, or null.
 *
 * Source: ours.
 */
export function dueAlert(question: AlertQuestion): AlertKind | null {
  const { now, tellAt, window, told } = question
  if (!window || question.isMuted || question.isForecastStale || question.hasPoured || now < tellAt) return null
  if (window.state === 'open' && window.latestStartAt && now >= window.latestStartAt) return null
  if (!told) return window.state === 'open' ? 'flood-tonight' : null
  if (told.version >= window.version) return null
  // A closing is always told: somebody may be about to pour into snow.
  if (window.state === 'closed') return told.kind === 'flood-closed' ? null : 'flood-closed'
  return question.changesTold >= MOST_CHANGES_A_NIGHT ? null : 'flood-changed'
}
