// When a forecast moves a window, is that worth a word? Small shifts are not; a window that closes always is.
import { MINUTE_MILLIS } from '@/lib/physics/constants'
import type { NightSummary } from './night-summary'
import type { AdviceWindow, Reason } from './types'

/** Shifts smaller than this change nobody's evening. Ours. [min] */
const WORTH_TELLING_MINUTES = 60

/** The part of an advised window that a change is measured against. */
export type AdvisedTimes = { state: 'open'; startsAt: Date; endsAt: Date; latestStartAt: Date } | { state: 'closed' }

export type WindowStep =
  { step: 'keep' } | { step: 'open'; window: AdviceWindow } | { step: 'close'; reason: Reason | null }

/**
 * What becomes of the advised window of a night when a new summary arrives.
 *
 * @param advised The version that stands, or undefined when nothing was advised for the night.
 * @param summary The night as the newest forecast has it.
 * @param kind Which advice it is about.
 * @param now A start that has passed is no change: the old window is compared from now on.
 * @returns Keep, open, move or close, with the window it is about.
 *
 * Source: WORTH_TELLING_MINUTES; ours.
 */
export function nextWindowStep(
  advised: AdvisedTimes | undefined,
  summary: Pick<NightSummary, 'window' | 'leadingReason'>,
  kind: 'fill' | 'flood',
  now: Date,
): WindowStep {
  // Only what the verdict stands by: a window that too few forecast runs agree with is shown, and not advised.
  const window = summary.window?.kind === kind ? summary.window : null
  if (advised?.state !== 'open') return window ? { step: 'open', window } : { step: 'keep' }
  // Past its latest start a window has run out; that is the evening passing, not the forecast changing.
  if (now >= advised.latestStartAt) return { step: 'keep' }
  if (!window) return { step: 'close', reason: summary.leadingReason }
  const startedAt = Math.max(advised.startsAt.getTime(), now.getTime())
  const startShift = Math.abs(Math.max(Date.parse(window.startsAt), now.getTime()) - startedAt)
  const endShift = Math.abs(Date.parse(window.endsAt) - advised.endsAt.getTime())
  return Math.max(startShift, endShift) >= WORTH_TELLING_MINUTES * MINUTE_MILLIS
    ? { step: 'open', window }
    : { step: 'keep' }
}
