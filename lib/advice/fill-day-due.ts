// Is there something to tell one person about the day to fill, now? Once a date; silence otherwise.
import { DAY_MILLIS } from '@/lib/physics/constants'
import { isTimeToTell } from './time-to-tell'
import { addDays } from './zoned-time'

export type FillDayKind = 'fill-ahead' | 'fill-changed' | 'fill-closed'

export interface FillStart {
  /** The night it lies in, noon to noon, 'yyyy-MM-dd'. */
  fillDate: string
  startsAt: Date
}

export interface ToldFillDay extends FillStart {
  kind: FillDayKind
  toldAt: Date
}

export interface FillDayQuestion {
  now: Date
  /** The night that people mean by tonight, and the person's own time of day on it. */
  tonightDate: string
  tellAt: Date
  isMuted: boolean
  /** Advice from an old forecast is shown with its age and never sent. */
  isForecastStale: boolean
  /** The best start that enough forecast runs see. */
  start: FillStart | null
  /** What the person was told on this channel, newest first. */
  told: readonly ToldFillDay[]
}

/** A rink that is laid out and waits needs its people ready, and no forecast decides further ahead. Ours. */
const FILL_DAYS_AHEAD = 5
/** A forecast that moves the day about must not ring every day; counted are moves and closings. Ours. */
const MOST_CHANGES_A_WEEK = 3
/** From a day before the start on, a plan becomes a decision: changes are told at once. Ours. */
const DECISION_MILLIS = DAY_MILLIS

/**
 * Whether a start is near enough to be decided on rather than planned with.
 *
 * @param startsAt Start of the fill.
 * @param now Instant of asking.
 * @returns True from a day before it on.
 *
 * Source: ours.
 */
export function isFillNear(startsAt: Date, now: Date): boolean {
  return startsAt.getTime() - now.getTime() <= DECISION_MILLIS
}

/**
 * What to tell now about the day to fill, or null. Same question, same answer; the caller's unique key makes it happen
 * once. It is asked only while the rink waits for its fill.
 *
 * @param question What is seen and was told, and what is so now.
 * @returns Kind of message, or null.
 * @throws RangeError for a date that is none.
 *
 * Source: ours.
 */
export function dueFillDay(question: FillDayQuestion): FillDayKind | null {
  const { tonightDate, told } = question
  if (question.isMuted || question.isForecastStale) return null
  const lastDate = addDays(tonightDate, FILL_DAYS_AHEAD)
  const seen = question.start && question.start.fillDate <= lastDate ? question.start : null
  const [last] = told
  if (last && last.kind !== 'fill-closed' && last.fillDate >= tonightDate) return dueChange(question, last, seen)
  if (!seen || !isTimeToTell(question, seen.startsAt)) return null
  // A date that was told and called off before has come back.
  if (told.some(({ fillDate }) => fillDate === seen.fillDate)) return isSpent(question) ? null : 'fill-changed'
  return isSpent(question) && !isFillNear(seen.startsAt, question.now) ? null : 'fill-ahead'
}

/** A day that was told stands, moves, or falls away. */
function dueChange(question: FillDayQuestion, standing: FillStart, seen: FillStart | null): FillDayKind | null {
  // Once its start has come the keeper sees for himself; and a shift within the night changes nobody's day.
  if (question.now >= standing.startsAt || seen?.fillDate === standing.fillDate) return null
  const first = seen && seen.startsAt < standing.startsAt ? seen.startsAt : standing.startsAt
  if (!isFillNear(first, question.now) && !isTimeToTell(question, first)) return null
  // A day that does not hold is always taken back: somebody may be about to lay the liner.
  return seen && !isSpent(question) ? 'fill-changed' : 'fill-closed'
}

function isSpent({ now, told }: FillDayQuestion): boolean {
  const weekAgo = now.getTime() - 7 * DAY_MILLIS
  const changes = told.filter(({ kind, toldAt }) => kind !== 'fill-ahead' && toldAt.getTime() > weekAgo)
  return changes.length >= MOST_CHANGES_A_WEEK
}
