// A night to hold off, in words; warnings of a moved pass; and which cautions are the person's.
import { describe, expect, test } from 'vitest'
import { IMPERIAL, METRIC } from '@/lib/units'
import { CAUTION_CODES, isForPerson } from '@/lib/words/cautions'
import { holdUntilText, wouldTurnText } from '@/lib/words/hold'
import type { WordOptions } from '@/lib/words/options'
import { PASS_WARNING_CODES, passWarningText, waterSourceText } from '@/lib/words/pass'
import { summaryOf } from '../../fixtures/tonight-view'

const words: WordOptions = { timeZone: 'America/Toronto', units: METRIC, clock: '12', locale: 'en' }
const NOW = new Date('2027-01-12T22:00:00Z')
const goodAt = '2027-01-13T02:00:00Z'

describe('until when', () => {
  test('the next good hours, or that the forecast has none and how far it reaches', () => {
    const next = summaryOf({ verdict: 'hold', nextGoodAt: '2027-01-14T23:00:00Z' })
    expect(holdUntilText(next, '2027-01-22', NOW, words)).toBe('The next good hours come Thursday evening.')
    const none = summaryOf({ verdict: 'hold', nextGoodAt: null })
    expect(holdUntilText(none, '2027-01-22', NOW, words)).toBe(
      'No good hour lies within the forecast, which reaches to Fri 22 January.',
    )
  })
})

describe('what would turn it', () => {
  test('a difference of 3 °C is one of 5 °F', () => {
    const colder = { code: 'colder', values: { byC: 3, goodAt } } as const
    expect(wouldTurnText(colder, words)).toBe('Air 3 °C colder would make 9 pm good.')
    expect(wouldTurnText(colder, { ...words, units: IMPERIAL })).toBe('Air 5 °F colder would make 9 pm good.')
  })

  test('what the keeper can do is said with its figure', () => {
    const thinner = { code: 'thinner', values: { layerMm: 1.5, goodAt } } as const
    expect(wouldTurnText(thinner, words)).toBe('A layer of only 1.5 mm would make 9 pm good.')
  })
})

test('every warning of a moved pass has words of its own', () => {
  const values = {
    setsAt: goodAt,
    nextAt: goodAt,
    startsAt: goodAt,
    until: '2027-01-13T02:40:00Z',
    at: goodAt,
    layerMm: 13,
    windChillC: -30,
    minutes: 30,
  }
  const said = PASS_WARNING_CODES.map((code) => passWarningText({ code, factor: 0, values }, words))
  expect(new Set(said).size).toBe(PASS_WARNING_CODES.length)
  expect(said[0]).toBe('It is set by 9 pm, after the next pass at 9 pm.')
  // 02:40 in UTC is 9:40 pm in Toronto.
  expect(said).toContain('The hose is still out for the pass at 9 pm, until 9:40 pm.')
  expect(waterSourceText({ kind: 'hot-tap', temperatureC: 45 }, words)).toBe('Hot tap, 45 °C')
})

test('cautions of the person stand apart from those of the ice', () => {
  expect(CAUTION_CODES.filter((code) => !isForPerson({ code }))).toEqual([
    'clear_snow_first',
    'finish_clearing',
    'rain_is_a_flood',
    'backflow',
    'run_off',
    'thickness_is_estimate',
    'land_only',
  ])
})
