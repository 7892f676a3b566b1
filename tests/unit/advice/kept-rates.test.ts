// Rates and seasons, counted by hand.
import { expect, test } from 'vitest'
import { keptRates } from '@/lib/advice/kept-rates'
import { seasonName, seasonOf, seasonOfYear } from '@/lib/advice/season'
import { keptSentence } from '@/lib/words/kept'

test('rates leave out what nobody knows', () => {
  const rates = keptRates([
    { said: 'flood', result: 'kept', agreement: 0.95 },
    { said: 'flood', result: 'broken', agreement: 0.85 },
    { said: 'flood', result: 'kept', agreement: 1 },
    { said: 'flood', result: 'unknown', agreement: 0.9 },
    { said: 'hold', result: 'kept', agreement: null },
    { said: 'hold', result: 'broken', agreement: null },
  ])
  expect(rates.flood).toEqual({ kept: 2, of: 3 })
  expect(rates.hold).toEqual({ kept: 1, of: 2 })
  expect(rates.unknown).toBe(1)
  expect(rates.bands.map(({ rate }) => rate)).toEqual([
    { kept: 0, of: 0 },
    { kept: 0, of: 1 },
    { kept: 2, of: 2 },
  ])
  expect(keptSentence(rates)).toBe(
    'A flood was advised on 3 nights, and 2 came as said; holding off was right on 1 of 2.',
  )
})

test('a season runs from July to June', () => {
  expect(seasonOf('2027-06-30')).toEqual({ year: 2026, from: '2026-07-01', to: '2027-06-30' })
  expect(seasonOf('2026-07-01').year).toBe(2026)
  expect(seasonName(seasonOfYear(2026))).toBe('2026–27')
  expect(seasonName(seasonOfYear(2099))).toBe('2099–00')
})
