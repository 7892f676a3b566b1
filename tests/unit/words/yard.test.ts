// What a page says of a yard that has been learned, or not.
import { expect, test } from 'vitest'
import { learnYard } from '@/lib/advice/yard/learn'
import type { LearnedYard } from '@/lib/advice/yard/types'
import { plainWords } from '@/lib/words/options'
import { yardDoubtSentence, yardSentence } from '@/lib/words/yard'

const WORDS = plainWords('America/Toronto')
const LEARNED: LearnedYard = {
  shelter: 0.412,
  skyView: 0.848,
  isLearned: true,
  keptBecause: null,
  prior: { shelter: 0.55, skyView: 0.85 },
  sd: { shelter: 0.07, skyView: 0.051 },
  reportsUsed: 9,
  reportsLeftOut: 1,
  nights: 8,
  setTimeError: { reports: 8, beforeMinutes: 31.2, afterMinutes: 12.4 },
  ledBy: 'wind',
}
const KEPT = { ...LEARNED, ...LEARNED.prior, isLearned: false }

test('what was learned is told with what was set and what it gained', () => {
  expect(yardSentence(LEARNED, WORDS)).toBe(
    'Wind reaches your sheet at 0.41 of the open field; you had set 0.55. ' +
      'Across 8 reports the set time was off by 12 min instead of 31 min.',
  )
  expect(yardDoubtSentence(LEARNED, WORDS)).toBe('Give or take 0.07 for the wind and 0.05 for the sky.')
})

test('the sky is told where it moved; without set times only the count is', () => {
  const sentence = yardSentence({ ...LEARNED, shelter: 0.55, skyView: 0.6, setTimeError: null }, WORDS)
  expect(sentence).toBe('Your sheet sees 0.60 of the sky; you had set 0.85. 9 reports say so.')
})

test.each<{ learned: LearnedYard; says: string }>([
  {
    learned: { ...KEPT, keptBecause: 'no_better' },
    says: '9 reports fit the yard as you set it; nothing in them calls for a change.',
  },
  {
    learned: { ...KEPT, keptBecause: 'too_few_nights', nights: 3 },
    says: 'Reports of three nights so far; a few more, and the forecast learns your yard.',
  },
  {
    learned: learnYard({ latitudeDeg: 46, longitudeDeg: -75, prior: LEARNED.prior, reports: [] }),
    says: 'Tell when your floods set, and the forecast learns your yard.',
  },
])('where the setting stands: $says', ({ learned, says }) => {
  expect(yardSentence(learned, WORDS)).toBe(says)
  expect(yardDoubtSentence(learned, WORDS)).toBe('')
})
