// The log in words: entries, times, results of floods, and the season's headline.
import { describe, expect, test } from 'vitest'
import type { EntryView } from '@/lib/schemas/log-choices'
import { IMPERIAL, METRIC } from '@/lib/units'
import { changedSentence, entryFacts, entryRemark, entryTime, floodResult, nightHeading } from '@/lib/words/log'
import {
  pastSeasonHeadline,
  seasonHeadline,
  thicknessSummary,
  waterSummary,
  weeksSummary,
} from '@/lib/words/log-season'
import type { WordOptions } from '@/lib/words/options'

const WORDS: WordOptions = { timeZone: 'America/Toronto', units: METRIC, clock: '12', locale: 'en' }
const NOW = new Date('2027-01-13T03:30:00Z')

const flood = (changes: Partial<EntryView> = {}): EntryView => ({
  id: 'e',
  kind: 'flood',
  happenedAt: '2027-01-13T01:02:00.000Z',
  nightDate: '2027-01-12',
  layerMm: 3,
  waterL: 310,
  waterTemperatureC: 6,
  waterKind: 'cold-tap',
  thicknessMm: null,
  modelThicknessMm: null,
  saidSetByAt: '2027-01-13T02:50:00.000Z',
  outcome: null,
  outcomeAt: null,
  note: '',
  by: 'Theo',
  version: 1,
  isDeleted: false,
  ...changes,
})

test('figures in the reader’s units', () => {
  expect(entryFacts(flood(), WORDS)).toBe('3 mm, 310 L, cold tap')
  expect(entryFacts(flood(), { ...WORDS, units: IMPERIAL })).toBe('0.12 in, 82 gal, cold tap')
  const reading = flood({ kind: 'reading', layerMm: null, waterL: null, waterKind: null, thicknessMm: 89 })
  expect(entryFacts(reading, WORDS)).toBe('8.9 cm')
  expect(entryFacts(flood({ kind: 'fill', layerMm: null, waterL: 24_600 }), WORDS)).toBe('24.6 m³, cold tap')
})

test('what was said and what came', () => {
  expect(entryRemark(flood(), WORDS)).toBe('Said: set by 9:50 pm. Nobody has said yet how it set.')
  const set = flood({ outcome: 'set', outcomeAt: '2027-01-13T02:40:00.000Z' })
  expect(entryRemark(set, WORDS)).toBe('Said: set by 9:50 pm. It was set at 9:40 pm.')
  const reading = flood({ kind: 'reading', thicknessMm: 89, modelThicknessMm: 93 })
  expect(entryRemark(reading, WORDS)).toBe('The model had 9.3 cm; it now follows the measure.')
})

describe('kept or broken', () => {
  const result = (outcome: EntryView['outcome'], outcomeAt: string) =>
    floodResult(flood({ outcome, outcomeAt: `2027-01-13T${outcomeAt}:00.000Z` }))

  test('set by what was said, or a little after', () => {
    expect(result('set', '02:40')).toBe('kept')
    expect(result('set', '03:05')).toBe('kept')
  })
  test('found set long after: it may have been in time, so nothing is said', () => {
    expect(result('set', '05:00')).toBeNull()
  })
  test('still wet before its time says nothing, after it the word is broken', () => {
    expect(result('wet', '02:30')).toBeNull()
    expect(result('wet', '03:06')).toBe('broken')
  })
  test('spoiled is broken, and without a word there is nothing to keep', () => {
    expect(result('spoiled', '02:00')).toBe('broken')
    expect(floodResult(flood({ outcome: 'set', outcomeAt: '2027-01-13T02:40:00.000Z', saidSetByAt: null }))).toBeNull()
  })
})

test('times past midnight name their day, doubled hours their zone', () => {
  expect(entryTime('2027-01-13T01:02:00Z', '2027-01-12', WORDS)).toBe('8:02 pm')
  expect(entryTime('2027-01-13T06:30:00Z', '2027-01-12', WORDS)).toBe('Wed 1:30 am')
  // Clocks were set back at 06:00 UTC on 1 November 2026.
  expect(entryTime('2026-11-01T05:30:00Z', '2026-10-31', WORDS)).toBe('Sun 1:30 am EDT')
  expect(entryTime('2026-11-01T06:30:00Z', '2026-10-31', WORDS)).toBe('Sun 1:30 am EST')
  expect(entryTime('2026-11-01T04:30:00Z', '2026-10-31', WORDS)).toBe('Sun 12:30 am')
  expect(entryTime('2026-11-01T07:30:00Z', '2026-10-31', WORDS)).toBe('Sun 2:30 am')
})

test('headings of nights', () => {
  expect(nightHeading('2027-01-12', NOW, WORDS)).toBe('Tonight, Tue 12 January')
  expect(nightHeading('2027-01-10', NOW, WORDS)).toBe('Sun 10 January')
})

test('who was faster, when, and what it says now', () => {
  const change = {
    by: 'Theo',
    at: new Date('2027-01-13T02:12:00Z'),
    entry: flood({ layerMm: 4, note: 'Gate end twice.' }),
  }
  expect(changedSentence(change, NOW, WORDS)).toBe(
    'Theo changed this at 9:12 pm: Flood, 4 mm, 310 L, cold tap at 6 °C, 8:02 pm. Gate end twice.',
  )
  const earlier = { ...change, at: new Date('2027-01-11T02:12:00Z') }
  expect(changedSentence(earlier, NOW, WORDS)).toMatch(/^Theo changed this on 10 January at 9:12 pm: /)
  const deleted = { ...change, entry: flood({ isDeleted: true }) }
  expect(changedSentence(deleted, NOW, WORDS)).toMatch(/^Theo deleted this at 9:12 pm\./)
})

describe('the season', () => {
  const season = { floods: 41, nightsFlooded: 22, waterL: 24_600, thicknessMm: 89, lastThawAt: null as Date | null }

  test('in one sentence', () => {
    const thawed = { ...season, lastThawAt: new Date('2027-01-03T20:00:00Z') }
    expect(seasonHeadline(thawed, NOW, WORDS)).toBe('41 floods, 8.9 cm, nine days since the last thaw.')
    expect(seasonHeadline({ ...season, floods: 1 }, NOW, WORDS)).toBe('One flood, 8.9 cm, no thaw so far.')
    const today = { ...season, thicknessMm: null, lastThawAt: new Date('2027-01-12T20:00:00Z') }
    expect(seasonHeadline(today, NOW, WORDS)).toBe('41 floods, a thaw today.')
    expect(pastSeasonHeadline({ ...season, floods: 41, nightsFlooded: 20 })).toBe('41 floods on 20 nights.')
    expect(pastSeasonHeadline({ ...season, floods: 0, nightsFlooded: 0 })).toBe('No flood in the log of that season.')
  })
  test('with nothing in it', () => {
    const empty = { ...season, floods: 0, thicknessMm: null }
    expect(seasonHeadline(empty, NOW, WORDS)).toBe('No flood in the log yet this season.')
  })
  test('beside its charts', () => {
    const days = [
      { date: '2027-01-01', modelMm: 80, readingMm: null },
      { date: '2027-01-02', modelMm: 95, readingMm: 89 },
      { date: '2027-01-03', modelMm: 92, readingMm: null },
    ]
    expect(thicknessSummary(days, WORDS)).toBe('From 8.0 cm to 9.2 cm, at most 9.2 cm; one reading.')
    expect(thicknessSummary([], WORDS)).toBe('No thickness on record yet.')
    expect(waterSummary([{ waterL: 300 }, { waterL: 600 }], WORDS)).toBe('900 L over two nights, at most 600 L in one.')
    expect(weeksSummary([{ nights: 3 }, { nights: 0 }, { nights: 5 }])).toBe(
      'Eight nights flooded, at most five in a week.',
    )
  })
})
