// Windows: the longest runs of good hours of one kind, inside the hours in which the keeper can go out.
import type { Verdict } from './types'

/** An hour as the search for windows sees it. */
export interface WindowHour {
  verdict: Verdict
  /** Whether the keeper can go out in it, and it is not over yet. */
  isOpen: boolean
}

export interface HourRange {
  kind: 'fill' | 'flood'
  /** First hour. */
  from: number
  /** Hour after the last. */
  to: number
}

/**
 * Maximal runs of open hours with the same verdict, fill or flood. A window is about the ice and about the person who
 * goes out, so hours that are good but in which nobody can go out end it; they keep their scores and verdicts.
 *
 * @param hours In order of time, without gaps.
 * @returns Runs in order of time; places in the list, the end not part of them.
 *
 * Source: ours.
 */
export function findWindows(hours: readonly WindowHour[]): HourRange[] {
  const ranges: HourRange[] = []
  let current: HourRange | null = null
  for (const [index, { verdict, isOpen }] of hours.entries()) {
    const kind = isOpen && verdict !== 'hold' ? verdict : null
    if (current && current.kind === kind) {
      current.to = index + 1
      continue
    }
    current = kind ? { kind, from: index, to: index + 1 } : null
    if (current) ranges.push(current)
  }
  return ranges
}
