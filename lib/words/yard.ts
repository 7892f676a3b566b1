// What a yard has taught, in sentences.
import type { LearnedYard } from '@/lib/advice/yard/types'
import type { WordOptions } from './options'
import { countText, durationText, numberText } from './quantities'

/** Differences that two digits do not show are not told. */
const DIGITS = 2

/**
 * "Wind reaches your sheet at 0.41 of the open field; you had set 0.55. Across 8 reports the set time was off by 12 min instead
 * of 31 min."
 */
export function yardSentence(learned: LearnedYard, words: WordOptions): string {
  const sentences = learned.isLearned
    ? [windSentence(learned, words), skySentence(learned, words), gainSentence(learned)]
    : [keptSentence(learned)]
  return sentences.filter((sentence) => sentence !== '').join(' ')
}

/** How sure the two factors are: "Give or take 0.07 for the wind and 0.05 for the sky." Empty while nothing is learned. */
export function yardDoubtSentence({ isLearned, sd }: LearnedYard, words: WordOptions): string {
  if (!isLearned) return ''
  const [wind, sky] = [sd.shelter, sd.skyView].map((value) => numberText(Math.max(0.01, value), DIGITS, words))
  return `Give or take ${wind} for the wind and ${sky} for the sky.`
}

function windSentence({ shelter, prior }: LearnedYard, words: WordOptions): string {
  const [now, before] = [shelter, prior.shelter].map((value) => numberText(value, DIGITS, words))
  return now === before ? '' : `Wind reaches your sheet at ${now} of the open field; you had set ${before}.`
}

function skySentence({ skyView, prior }: LearnedYard, words: WordOptions): string {
  const [now, before] = [skyView, prior.skyView].map((value) => numberText(value, DIGITS, words))
  return now === before ? '' : `Your sheet sees ${now} of the sky; you had set ${before}.`
}

function gainSentence({ setTimeError, reportsUsed }: LearnedYard): string {
  if (!setTimeError) return `${reportsUsed} reports say so.`
  const { reports, beforeMinutes, afterMinutes } = setTimeError
  const across = reports === 1 ? 'In one report' : `Across ${reports} reports`
  return `${across} the set time was off by ${durationText(afterMinutes)} instead of ${durationText(beforeMinutes)}.`
}

function keptSentence({ keptBecause, nights, reportsUsed }: LearnedYard): string {
  if (keptBecause === 'no_better') {
    return `${reportsUsed} reports fit the yard as you set it; nothing in them calls for a change.`
  }
  if (nights === 0) return 'Tell when your floods set, and the forecast learns your yard.'
  const nightsText = nights === 1 ? 'one night' : `${countText(nights)} nights`
  return `Reports of ${nightsText} so far; a few more, and the forecast learns your yard.`
}
