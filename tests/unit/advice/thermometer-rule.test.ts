// Where the heat balance and the thermometer rule of -4 °C part, the reason says so in words.
import { describe, expect, test } from 'vitest'
import { judge } from '@/lib/advice/judge'
import { summariseNight } from '@/lib/advice/night-summary'
import type { Judgement, ScoredHour } from '@/lib/advice/types'
import { plainWords } from '@/lib/words/options'
import { reasonText } from '@/lib/words/reasons'
import { whyList } from '@/lib/words/why'
import { inputOf, steadyHours } from '../../support/advice-weather'

const words = plainWords('America/Toronto')
/** 8 pm at the rink, with the first hour at noon. */
const EVENING = 8

const eveningOf = (judgement: Judgement) => judgement.hours[EVENING] as ScoredHour
const sentences = (hour: ScoredHour) => hour.reasons.map((reason) => reasonText(reason, words)).join(' ')

function whyTexts(judgement: Judgement, now: string) {
  const summary = summariseNight(judgement, {
    nightDate: '2027-01-12',
    now: new Date(now),
    timeZone: 'America/Toronto',
  })
  return whyList(summary.why, words).map(({ label, detail }) => `${label} ${detail}`)
}

// Steady hours: the sums are those of the reference, 85-120 W/m² of longwave alone from a wet sheet under a clear sky.
describe.each([1, -2])('a clear dry night at %d °C', (airTemperatureC) => {
  const input = inputOf(steadyHours(48, { airTemperatureC, dewPointC: airTemperatureC - 8, cloudCover: 0 }))
  const judgement = judge(input, { runs: 0 })

  test('is good to flood though the rule says wait, and says what cools the water', () => {
    expect(eveningOf(judgement).verdict).toBe('flood')
    expect(sentences(eveningOf(judgement))).toMatch(/looks too warm beside the usual -?−?4 °C, but a clear sky takes/)
    expect(whyTexts(judgement, input.now).join('\n')).toMatch(
      /Warmer than the usual rule\. The rule waits for .4 °C, but/,
    )
  })
})

describe('a damp overcast night at -5 °C in a tight yard', () => {
  const input = inputOf(
    steadyHours(48, { airTemperatureC: -5, dewPointC: -5.1, cloudCover: 1, windSpeedMps: 1, windGustMps: 2 }),
  )
  input.rink = { ...input.rink, shelter: 'tight', skyView: 0.4 }
  input.water = { ...input.water, layerMm: 10, temperatureC: 12 }
  input.sheet = { ...input.sheet, temperatureC: -1 }
  const judgement = judge(input, { runs: 0 })

  test('is held though the rule says flood, and says what keeps the heat in', () => {
    expect(eveningOf(judgement).verdict).toBe('hold')
    expect(sentences(eveningOf(judgement))).toMatch(/looks cold enough, but cloud and damp air hold the heat in/)
    expect(whyTexts(judgement, input.now).join('\n')).toMatch(
      /Cold enough by the usual rule\. But cloud and damp air hold the heat in/,
    )
  })
})
