// Times of day that could be those of another day have their weekday.
import { METRIC } from '@/lib/units'
import { expect, test } from 'vitest'
import type { WordOptions } from '@/lib/words/options'
import { doneByDayText } from '@/lib/words/times'

// 12 January 2027 is a Tuesday; Toronto is five hours behind UTC then.
const words: WordOptions = { timeZone: 'America/Toronto', units: METRIC, clock: '12', locale: 'en' }

test.each([
  ['7 pm to 8:50 pm', '2027-01-13T00:00:00Z', '2027-01-13T01:48:00Z', '8:50 pm'],
  ['7 pm to 7 am', '2027-01-13T00:00:00Z', '2027-01-13T12:00:00Z', '7 am'],
  ['7 pm to 6 pm of the next day', '2027-01-13T00:00:00Z', '2027-01-13T23:00:00Z', 'Wed 6 pm'],
  ['9 am to 1 pm, past noon', '2027-01-13T14:00:00Z', '2027-01-13T18:00:00Z', 'Wed 1 pm'],
  ['1 pm to 3 am, long after', '2027-01-12T18:00:00Z', '2027-01-13T08:00:00Z', 'Wed 3 am'],
  ['almost midnight, told as midnight', '2027-01-12T14:00:00Z', '2027-01-13T04:58:00Z', 'Wed midnight'],
])('%s', (_what, begunAt, at, expected) => {
  expect(doneByDayText(at, begunAt, words)).toBe(expected)
})
