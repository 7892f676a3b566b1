// A running fill in words: its lead, and its warnings.
import type { FillProgress } from '@/lib/advice/fill-progress'
import type { Caution } from '@/lib/advice/types'
import { num, text, type ClauseWriter } from './clause'
import type { WordOptions } from './options'
import { depthText, shareText } from './build-quantities'
import { durationText, layerText, temperatureText, waterText } from './quantities'
import { clockText, dayPartText } from './times'

/** "5,400 L in, 45 % of the fill. Done by 2:40 am if the hose runs on." */
export function fillProgressSentence(progress: FillProgress, words: WordOptions): string {
  const { litres, doneShare, doneAt, litresLeft, hoursLeft, isRunning } = progress
  const sofar = `${waterText(litres, words)} in, ${shareText(doneShare, words)} of the fill.`
  if (litresLeft <= 0) return `${sofar} ${isRunning ? 'That is all of it: turn the hose off.' : 'That is all of it.'}`
  if (doneAt) return `${sofar} Done by ${clockText(doneAt, words)} if the hose runs on.`
  return `${sofar} ${hoursLeft > 0 ? `${durationText(hoursLeft * 60)} of hose to go.` : 'The hose is off.'}`
}

/** Below this a figure would read as nothing. */
const LEAST_DEPTH_M = 0.0005

/** "Water covers 57 % of the floor, 16.0 cm at the deepest." */
export function fillSpreadSentence({ wettedShare, deepestM }: FillProgress, words: WordOptions): string {
  if (deepestM < LEAST_DEPTH_M) return 'The water has only begun to spread.'
  const part = wettedShare > 0.995 ? 'the whole floor' : `${shareText(wettedShare, words)} of the floor`
  return `Water covers ${part}, ${depthText(deepestM, words)} at the deepest.`
}

/** "Look at hose and liner at 8 pm." Empty while the hose is off. */
export function nextCheckSentence({ nextCheckAt, isCheckDue }: FillProgress, words: WordOptions): string {
  if (!nextCheckAt) return ''
  const what = 'hose and liner: moving water pulls the liner and pops clips off the boards'
  return isCheckDue ? `Look now at ${what}.` : `Look at ${clockText(nextCheckAt, words)} at ${what}.`
}

const WARNINGS: Record<string, ClauseWriter> = {
  level_falls: (v, w) =>
    `The level has fallen ${layerText(-num(v, 'riseMm'), w)} since ${clockText(text(v, 'since'), w)}: water is getting out, about ` +
    `${waterText(num(v, 'lostLPerHour'), w)} an hour. Look along the low side and at the seams and corners before you add more.`,
  level_lags: (v, w) =>
    `The level rose ${layerText(Math.max(0, num(v, 'riseMm')), w)} since ${clockText(text(v, 'since'), w)}, where the hose should have ` +
    `made it ${layerText(num(v, 'expectedRiseMm'), w)}. Look for a leak, or measure the flow again.`,
  running_hose_freezes: (v, w) =>
    `From ${clockText(text(v, 'startsAt'), w)} it is ${temperatureText(num(v, 'airTemperatureC'), w)} or colder: a running cold hose has ` +
    `frozen at that. Stop before, walk the water out of the hose and take it in.`,
  running_hose_freezes_now: (v, w) =>
    `It is ${temperatureText(num(v, 'airTemperatureC'), w)} now: a running cold hose has frozen at that. Stop, walk the water out of the ` +
    `hose and take it in.`,
  still_hose_freezes: (v, w) =>
    `Drain the hose and take it in: left full at ${temperatureText(num(v, 'airTemperatureC'), w)} ice begins in it after ` +
    `${durationText(Math.max(5, Math.round(num(v, 'minutesToIce') / 5) * 5))}.`,
}

export const FILLING_CODES: readonly string[] = Object.keys(WARNINGS)

/** A warning about the level or the hose. */
export function fillWarningText({ code, values }: Caution, words: WordOptions): string {
  return WARNINGS[code]?.(values, words) ?? ''
}

/** When something happens over the runs: "Thursday evening; from Wednesday night to Friday morning over the forecast runs". */
export function spreadText(
  spread: { p10: string | null; p50: string | null; p90: string | null },
  now: Date,
  words: WordOptions,
): string {
  if (spread.p50 && Date.parse(spread.p50) <= now.getTime()) return 'by the model already'
  if (!spread.p50) {
    if (!spread.p10) return 'not within the forecast'
    return `not within the forecast in most runs; ${dayPartText(spread.p10, now, words)} at the earliest`
  }
  const middle = dayPartText(spread.p50, now, words)
  const early = spread.p10 ? dayPartText(spread.p10, now, words) : middle
  if (!spread.p90) return `${middle}, or later than the forecast reaches`
  const late = dayPartText(spread.p90, now, words)
  return early === late ? middle : `${middle}; from ${early} to ${late} over the forecast runs`
}
