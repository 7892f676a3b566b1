// The nights ahead in sentences.
import { expect, test } from 'vitest'
import type { AdviceWindow, FillOutlook } from '@/lib/advice/types'
import type { NightAhead } from '@/lib/advice/week'
import type { WeekSummary } from '@/lib/advice/week-summary'
import { IMPERIAL, METRIC } from '@/lib/units'
import { weekDetail, weekHeadline } from '@/lib/words/week'
import { iceChangeParts, iceChangeText, nightAgreement, nightFacts, nightWhat } from '@/lib/words/week-night'

const READER = { timeZone: 'America/Toronto', units: METRIC, clock: '12', locale: 'en' } as const
/** Tuesday 12 January 2027, 4 pm in Toronto. */
const NOW = new Date('2027-01-12T21:00:00Z')

const NEVER = { p10: null, p50: null, p90: null }
const FILL: FillOutlook = { startsAt: null, hoseHours: 8, litres: 12_000, skinAt: null, carriesSkaterAt: NEVER }

const SUMMARY: WeekSummary = {
  nights: 10,
  goodDates: ['2027-01-12', '2027-01-14', '2027-01-15'],
  goodBeforeThaw: 3,
  goodAfterThaw: 0,
  thaw: null,
  isThawOn: false,
  nearGoodDates: ['2027-01-12', '2027-01-14'],
  nearFloodsMm: 16.4,
  thinnest: { thicknessMm: 82, at: '2027-01-18T17:00:00Z' },
}
/** From Sunday 17 January 9 am to Tuesday 19 January 6 pm. */
const THAW = { startsAt: '2027-01-17T14:00:00Z', endsAt: '2027-01-19T23:00:00Z', lossMm: 7.6 }

function headline(
  summary: Partial<WeekSummary>,
  phase: 'skating' | 'waiting' | 'freezing' = 'skating',
  fill = FILL,
  fillWindows: AdviceWindow[] = [],
) {
  const week = { phase, summary: { ...SUMMARY, ...summary }, fill, fillWindows }
  const { before, key, after } = weekHeadline(week, NOW, READER)
  return [before, key && before ? ' ' : '', key, after].join('')
}

test('the headline counts the good nights and names the thaw', () => {
  expect(headline({ thaw: THAW })).toBe('Three good nights before the thaw on Sunday.')
  expect(headline({ thaw: THAW, goodBeforeThaw: 1 })).toBe('One good night before the thaw on Sunday.')
  expect(headline({ thaw: THAW, goodBeforeThaw: 0, goodAfterThaw: 2 })).toBe(
    'No good night before the thaw on Sunday. Two good nights after it.',
  )
  expect(headline({ thaw: { ...THAW, startsAt: '2027-01-13T14:00:00Z' }, goodBeforeThaw: 1 })).toBe(
    'One good night before the thaw tomorrow.',
  )
  const today = { ...THAW, startsAt: '2027-01-12T23:00:00Z' }
  expect(headline({ thaw: today, goodBeforeThaw: 0, goodAfterThaw: 2 })).toBe('A thaw today. Two good nights after it.')
  expect(headline({ thaw: THAW, isThawOn: true, goodAfterThaw: 1 })).toBe(
    'A thaw until Tuesday evening. One good night after it.',
  )
})

test('without a thaw the headline counts what there is', () => {
  expect(headline({})).toBe('Three good nights of the ten ahead.')
  expect(headline({ goodDates: [] })).toBe('No good night in the ten ahead.')
  expect(headline({ nights: 3 })).toBe('All three nights ahead are good.')
  expect(headline({ nights: 1, goodDates: ['2027-01-12'] })).toBe('The one night that the forecast covers is good.')
})

test('before the fill the headline says when to fill and when skaters may come', () => {
  const carriesSkaterAt = { p10: '2027-01-18T12:00:00Z', p50: '2027-01-19T12:00:00Z', p90: '2027-01-21T12:00:00Z' }
  const fill = { ...FILL, startsAt: '2027-01-14T15:00:00Z', carriesSkaterAt }
  expect(headline({}, 'waiting', fill)).toBe('Fill Thursday morning: skaters from about Tue 19 January.')
  expect(headline({}, 'waiting')).toBe('No time to fill in the ten days ahead.')
  const doubtful = { kind: 'fill', agreement: 0.2, runs: 10 } as AdviceWindow
  expect(headline({}, 'waiting', FILL, [doubtful])).toBe(
    'No time to fill that enough forecast runs see in the ten days ahead.',
  )
  const carries = {
    ...fill,
    carriesSkaterAt: { ...carriesSkaterAt, p10: '2027-01-11T12:00:00Z', p50: '2027-01-12T12:00:00Z' },
  }
  const said =
    headline({}, 'freezing', carries) + weekDetail({ phase: 'freezing', summary: SUMMARY, fill: carries }, NOW, READER)
  expect(said.match(/Drill before anyone skates/g)).toHaveLength(1)
  expect(headline({}, 'freezing', fill)).toBe('Keep off: skaters from about Tue 19 January.')
  expect(weekDetail({ phase: 'waiting', summary: SUMMARY, fill }, NOW, READER)).toBe(
    'One forecast run in ten has it carry by Mon 18 January, nine in ten by Thu 21 January. Drill before anyone skates.',
  )
})

test('the line under it adds up near floods and says what the thaw takes', () => {
  const detail = (summary: WeekSummary) => weekDetail({ phase: 'skating', summary, fill: FILL }, NOW, READER)
  expect(detail({ ...SUMMARY, thaw: THAW })).toBe(
    'Floods tonight and Thursday night could add about 16 mm of ice. The thaw takes about 8 mm in this forecast; ' +
      'without floods the sheet comes down to 8.2 cm.',
  )
  const nowThinnest = { thicknessMm: 90, at: '2027-01-12T22:00:00Z' }
  expect(detail({ ...SUMMARY, thaw: THAW, thinnest: nowThinnest })).toMatch(/, less than the cold before it brings\.$/)
  expect(detail({ ...SUMMARY, nearGoodDates: [], goodDates: ['2027-01-16'] })).toBe(
    'The first good night is Saturday night.',
  )
})

const NIGHT: NightAhead = {
  nightDate: '2027-01-13',
  startsAt: '2027-01-13T17:00:00Z',
  endsAt: '2027-01-14T17:00:00Z',
  verdict: 'hold',
  isFar: false,
  window: null,
  agreement: null,
  passes: null,
  weatherMm: -0.2,
  floodsMm: 0,
  freezableMm: 12,
  lowC: -9.4,
  highC: 3.4,
  falls: null,
  snowToClearCm: 0,
  reason: { code: 'rain_before_set', factor: 0, values: { startsAt: '2027-01-14T03:00:00Z' } },
  thaw: null,
  forecastEndsAt: null,
}

const FLOOD: NightAhead = {
  ...NIGHT,
  verdict: 'flood',
  reason: null,
  window: {
    kind: 'flood',
    startsAt: '2027-01-14T01:00:00Z',
    endsAt: '2027-01-14T06:00:00Z',
    latestStartAt: '2027-01-14T05:45:00Z',
    setBy: '2027-01-14T07:30:00Z',
    score: 70,
    agreement: 0.7,
    runs: 10,
  },
  agreement: { agreeing: 7, runs: 10 },
  passes: { count: 3, startsAt: '2027-01-14T01:00:00Z', setBy: '2027-01-14T06:47:00Z', isEstimate: true },
  floodsMm: 9.82,
}

test('a night says what to do, or why not', () => {
  expect(nightWhat(NIGHT, READER)).toBe('Rain from 10 pm would fall on a layer that is not set')
  expect(nightWhat(FLOOD, READER)).toBe('About 3 passes, 8 pm to 1 am')
  expect(nightWhat({ ...FLOOD, isFar: true, snowToClearCm: 4 }, READER)).toBe(
    'Clear 4.0 cm of snow, then room for about 3 passes, 8 pm to 1 am',
  )
  const planned = { ...FLOOD, passes: { ...FLOOD.passes!, count: 1, isEstimate: false } }
  expect(nightWhat(planned, READER)).toBe('1 pass, 8 pm on, set by 1:50 am')
  expect(nightWhat({ ...NIGHT, verdict: 'thaw' }, READER)).toBe('Up to +3 °C; nothing to do')
})

test('facts name what falls, a thaw that begins or ends, and the end of the forecast', () => {
  const falls = { startsAt: '2027-01-14T04:00:00Z', endsAt: '2027-01-14T12:00:00Z', rainMm: 2.1, snowfallCm: 4 }
  const thaw = { startsAt: '2027-01-14T14:00:00Z', endsAt: '2027-01-16T14:00:00Z', lossMm: 4 }
  expect(nightFacts({ ...NIGHT, falls, thaw, forecastEndsAt: '2027-01-14T15:00:00Z' }, READER)).toEqual([
    'rain 2.1 mm and snow 4.0 cm, 11 pm to 7 am',
    'thaw from 9 am',
    '−9 °C at the coldest',
    'forecast ends at 10 am',
  ])
})

test('ice gained or lost carries its sign, in the reader’s unit', () => {
  expect(iceChangeText(FLOOD, READER)).toBe('+9.6 mm')
  expect(iceChangeText(NIGHT, READER)).toBe('−0.2 mm')
  expect(iceChangeText({ ...NIGHT, weatherMm: 0.01 }, READER)).toBe('0.0 mm')
  expect(iceChangeText({ ...NIGHT, weatherMm: null }, READER)).toBeNull()
  // 9.62 mm / 25.4 = 0.379 in
  expect(iceChangeText(FLOOD, { ...READER, units: IMPERIAL })).toBe('+0.38 in')
  expect(iceChangeParts(FLOOD, READER)).toBe('floods +9.8 mm, weather −0.2 mm')
})

test('runs are named only where they were asked', () => {
  expect(nightAgreement(FLOOD)).toBe('7 of 10 runs')
  expect(nightAgreement(NIGHT)).toBeNull()
})
