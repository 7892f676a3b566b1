// Reasons of a fill that runs over several days: what a later night brings is told with its day.
import { describe, expect, test } from 'vitest'
import { judge } from '@/lib/advice/judge'
import { METRIC } from '@/lib/units'
import { reasonText } from '@/lib/words/reasons'
import { hourOf, inputOf, timeOf } from '../../support/advice-weather'

const words = { timeZone: 'America/Toronto', units: METRIC, clock: '12' as const, locale: 'en' }

/** Tuesday's reasons for a fill of 8 h of hose, 12 000 L at 25 L/min. The first hour is noon. */
function tuesday(airAt: (hour: number) => number, range: { from: string; to: string }) {
  const hours = Array.from({ length: 168 }, (_, hour) => hourOf(hour, { airTemperatureC: airAt(hour) }))
  const input = inputOf(hours, { available: [range] })
  const judged = judge({ ...input, rink: { ...input.rink, phase: 'waiting' } }, { runs: 0 })
  return (hour: number, code: string) => judged.hours[hour]?.reasons.find((reason) => reason.code === code)
}

describe('a fill of four hours a night takes Tuesday’s and Wednesday’s', () => {
  // Tuesday is -1 °C throughout; of Wednesday's hours from 8 pm (hour 32) to midnight the one from 10 pm is the coldest.
  const airAt = (hour: number) => (hour < 24 ? -1 : hour === 34 ? -9 : -7)
  const reasonOf = tuesday(airAt, { from: '20:00', to: '24:00' })

  test('the cold that stops the hose is Wednesday’s', () => {
    const reason = reasonOf(8, 'fill_hose_freezes')
    expect(reason?.values).toMatchObject({ airTemperatureC: -9, startsAt: timeOf(8), at: timeOf(34) })
    expect(reasonText(reason!, words)).toBe('A running cold hose freezes at −9 °C on Wednesday night.')
  })

  test('started on Wednesday it is that night’s own, and needs no day', () => {
    expect(reasonText(reasonOf(32, 'fill_hose_freezes')!, words)).toBe('A running cold hose freezes at −9 °C.')
  })
})

test.each([
  ['hands_freeze', { windChillC: -20 }, 'It would feel like −20 with wet hands for hours on Thursday morning.'],
  ['hands_bear', { windChillC: -9 }, 'It feels like −9 at the coldest on Thursday morning.'],
  ['liner_blown', { gustAtRinkMps: 10 }, 'Gusts of 36 km/h in your yard would lift the liner on Thursday morning.'],
  ['fill_air_warm', { airTemperatureC: 4 }, 'At +4 °C the water only warms on Thursday morning.'],
  [
    'snow_before_skin',
    { snowfallCm: 3 },
    '3.0 cm of snow from Thursday morning would sink into the water before a skin bears it.',
  ],
])('%s of a later night names it', (code, values, says) => {
  // Noon of Tuesday and 7 am of Thursday, by the rink's clock.
  const when = { startsAt: timeOf(0), at: timeOf(43) }
  expect(reasonText({ code, values: { ...values, ...when } }, words)).toBe(says)
})

test('a reason kept before its hours were says the figure alone', () => {
  const reason = { code: 'fill_hose_freezes', values: { airTemperatureC: -9 } }
  expect(reasonText(reason, words)).toBe('A running cold hose freezes at −9 °C.')
})
