// A night in sentences, from summaries written by hand; the sentences are those of the product's voice.
import { IMPERIAL, METRIC } from '@/lib/units'
import { describe, expect, test } from 'vitest'
import type { NightSummary } from '@/lib/advice/night-summary'
import { CAUTION_CODES, cautionText } from '@/lib/words/cautions'
import { sureSentence, verdictParts, verdictSentence } from '@/lib/words/night'
import type { WordOptions } from '@/lib/words/options'
import { reasonClause, REASON_CODES, reasonText } from '@/lib/words/reasons'
import { WHY_CODES, whyList } from '@/lib/words/why'

const words: WordOptions = { timeZone: 'America/Toronto', units: METRIC, clock: '12', locale: 'en' }
const now = new Date('2027-01-12T23:42:00Z')
const pass = (startsAt: string, setBy: string) => ({ startsAt, setBy, layerMm: 3, waterL: 300, hoseMinutes: 12 })

const flood: NightSummary = {
  nightDate: '2027-01-12',
  startsAt: '2027-01-12T17:00:00Z',
  endsAt: '2027-01-13T17:00:00Z',
  verdict: 'flood',
  window: {
    kind: 'flood',
    startsAt: '2027-01-13T01:00:00Z',
    endsAt: '2027-01-13T06:00:00Z',
    latestStartAt: '2027-01-13T05:45:00Z',
    setBy: '2027-01-13T06:48:00Z',
    score: 84,
    agreement: 0.9,
    runs: 10,
  },
  windows: [],
  passes: [
    pass('2027-01-13T01:00:00Z', '2027-01-13T02:50:00Z'),
    pass('2027-01-13T03:00:00Z', '2027-01-13T04:45:00Z'),
    pass('2027-01-13T05:00:00Z', '2027-01-13T06:48:00Z'),
  ],
  lastSetBy: '2027-01-13T06:48:00Z',
  agreement: 0.9,
  runs: 10,
  leadingReason: null,
  nextGoodAt: null,
  nextKind: null,
  holdUntil: null,
  precipitation: {
    kind: 'snow',
    startsAt: '2027-01-13T10:00:00Z',
    endsAt: '2027-01-13T15:00:00Z',
    rainMm: 0,
    snowfallCm: 3.4,
  },
  thaw: null,
  why: [],
  cautions: [],
}

const hold = (given: Partial<NightSummary>): NightSummary => ({
  ...flood,
  verdict: 'hold',
  window: null,
  passes: [],
  lastSetBy: null,
  agreement: null,
  runs: 0,
  ...given,
})

describe('the verdict', () => {
  test('a good night', () => {
    expect(verdictSentence(flood, now, words)).toBe('Flood tonight between 8 pm and 1 am. Three thin passes.')
    expect(verdictParts(flood, now, words).lead).toBe('Flood tonight')
  })

  test('snow on the way', () => {
    const leadingReason = { code: 'snow_before_set', factor: 0, values: { startsAt: '2027-01-13T04:00:00Z' } }
    expect(verdictSentence(hold({ leadingReason }), now, words)).toBe(
      'Hold off: snow from 11 pm would land on wet water.',
    )
  })

  test('a thaw with cold to come', () => {
    const thaw = { startsAt: '2027-01-12T12:00:00Z', endsAt: '2027-01-14T20:00:00Z', lossMm: 8 }
    const summary = hold({ thaw, holdUntil: '2027-01-15T00:00:00Z', nextGoodAt: '2027-01-15T00:00:00Z' })
    expect(verdictSentence(summary, now, words)).toBe('Nothing to do until Thursday evening.')
  })

  test('no forecast', () => {
    expect(verdictSentence(hold({ verdict: 'unknown' }), now, words)).toBe('No forecast for tonight yet.')
  })

  test('a night with neither reason nor next hours', () => {
    expect(verdictSentence(hold({}), now, words)).toBe('Nothing to do tonight.')
  })
})

describe('how sure', () => {
  test('agreement, and the last pass against the snow', () => {
    expect(sureSentence(flood, words)).toBe(
      '9 of 10 forecast runs agree. The last pass is set by 1:50 am, three hours before snow.',
    )
  })

  test.each([
    ['2027-01-13T09:40:00Z', 'more than two hours before snow'],
    ['2027-01-13T08:50:00Z', 'two hours before snow'],
    ['2027-01-13T08:25:00Z', 'more than one hour before snow'],
    ['2027-01-13T07:25:00Z', '30 min before snow'],
  ])('set by 1:50 am, and snow at %s', (startsAt, expected) => {
    const precipitation = { ...flood.precipitation!, startsAt }
    expect(sureSentence({ ...flood, precipitation }, words)).toBe(
      `9 of 10 forecast runs agree. The last pass is set by 1:50 am, ${expected}.`,
    )
  })

  test('all agree, one pass, no snow', () => {
    const summary = { ...flood, agreement: 1, passes: flood.passes.slice(2), precipitation: null }
    expect(sureSentence(summary, words)).toBe('All 10 forecast runs agree. The pass is set by 1:50 am.')
  })

  test('nothing to say on a night of holding off', () => {
    expect(sureSentence(hold({}), words)).toBe('')
  })
})

describe('reasons', () => {
  test('a mild clear night says why the thermometer is not the whole of it', () => {
    const values = { airTemperatureC: 1, ruleC: -4, longwaveWm2: 62.4, latentWm2: 40.2, freezeRateMmPerH: 0.8 }
    expect(reasonText({ code: 'freezes_though_mild', values }, words)).toBe(
      '+1 °C looks too warm beside the usual −4 °C, but a clear sky takes 62 W/m² and dry air takes 40 W/m² from the water: 0.8 mm an hour freezes.',
    )
  })

  test('a damp overcast night says what holds the heat', () => {
    const values = { airTemperatureC: -5, cloudCover: 1, latentWm2: 12, freezeRateMmPerH: 0.3 }
    expect(reasonText({ code: 'slow_though_cold', values }, words)).toBe(
      '−5 °C looks cold enough, but cloud and damp air hold the heat in: only 0.3 mm an hour freezes.',
    )
  })

  test('in Fahrenheit and inches', () => {
    const values = { snowCoverCm: 5 }
    expect(reasonClause({ code: 'snow_to_clear', values }, { ...words, units: IMPERIAL })).toBe(
      '2.0 in of snow lies on the sheet: clear all of it first',
    )
  })

  test('every code has a sentence even when its numbers are missing', () => {
    for (const code of REASON_CODES) {
      const at = '2027-01-13T04:00:00Z'
      const values = { startsAt: at, endsAt: at, setsAt: at, neededAt: at, forecastEndsAt: at }
      expect(reasonText({ code, values }, words)).toMatch(/^\S.*\.$/)
    }
  })
})

test('every line of the list "why" has a label, a detail and a figure', () => {
  const values = {
    startsAt: '2027-01-13T07:00:00Z',
    longwaveWm2: 108,
    cloudCover: 0.05,
    sensibleWm2: 66,
    highC: -8,
    lowC: -10,
    windAtRinkMps: 2,
  }
  const lines = whyList(
    WHY_CODES.map((code) => ({ code, factor: 1, values })),
    words,
  )
  expect(lines).toHaveLength(WHY_CODES.length)
  for (const line of lines) for (const text of Object.values(line)) expect(text).toMatch(/\S/)
  expect(lines[0]).toEqual({
    label: 'Clear sky.',
    detail: 'The sheet loses heat straight to the sky.',
    figure: '108 W/m²',
  })
  expect(lines[1]).toEqual({
    label: 'Cold air, light wind.',
    detail: '−8 to −10 °C, 7 km/h in your yard.',
    figure: '66 W/m²',
  })
})

test('every caution has words', () => {
  for (const code of CAUTION_CODES)
    expect(cautionText({ code, values: { at: '2027-01-13T05:00:00Z' } }, words)).toMatch(/\.$/)
})

test('rain within the night is told by its hour, rain after it with its day', () => {
  // 5 pm on Wednesday 13 January 2027 in Toronto.
  const values = { startsAt: '2027-01-13T22:00:00Z', rainMm: 8.6 }
  const labelOf = (more: Record<string, number>) =>
    whyList([{ code: 'why_rain', factor: 1, values: { ...values, ...more } }], words)[0]?.label
  expect(labelOf({})).toBe('From 5 pm')
  expect(labelOf({ isAfterNight: 1 })).toBe('From Wednesday 5 pm')
})
