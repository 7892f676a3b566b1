// When the keeper can go out: by weekday, past midnight, and in a night in which the clocks change.
import { describe, expect, test } from 'vitest'
import { isAvailableAt, makeSetting } from '@/lib/advice/setting'
import type { JudgeInput } from '@/lib/advice/types'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { inputOf, steadyHours } from '../../support/advice-weather'

const FRIDAY = 5

/** Those of the instants at which the keeper is free, in Toronto. */
function freeOf(available: JudgeInput['available'], firstHour: string, instants: string[]) {
  const firstMillis = Date.parse(firstHour)
  const timeOf = (index: number) => new Date(firstMillis + index * HOUR_MILLIS).toISOString()
  const hours = steadyHours(96).map((hour, index) => ({ ...hour, time: timeOf(index) }))
  const setting = makeSetting(inputOf(hours, { available, now: firstHour }))
  return instants.filter((at) => isAvailableAt(setting, Date.parse(at)))
}

describe('hours by weekday', () => {
  // 15 January 2027 is a Friday; Toronto is five hours behind UTC.
  const evening = [{ from: '17:00', to: '01:00', weekdays: [FRIDAY] }]

  test('past midnight belongs to the day on which the hours start', () => {
    const asked = [
      '2027-01-15T05:30:00Z', // Fri 0:30, hours of Thursday
      '2027-01-15T21:59:00Z', // Fri 16:59
      '2027-01-15T22:00:00Z', // Fri 17:00
      '2027-01-16T05:59:00Z', // Sat 0:59, hours of Friday
      '2027-01-16T06:00:00Z', // Sat 1:00
      '2027-01-16T22:00:00Z', // Sat 17:00
    ]
    expect(freeOf(evening, '2027-01-15T00:00:00Z', asked)).toEqual(['2027-01-15T22:00:00Z', '2027-01-16T05:59:00Z'])
  })

  test('Sunday’s hours run into Monday', () => {
    const hours = [{ from: '22:00', to: '02:00', weekdays: [7] }]
    // Sunday 17 January, 22:00 is 3:00 UTC on Monday; Monday 1:00 is 6:00 UTC.
    const asked = ['2027-01-17T06:00:00Z', '2027-01-18T03:00:00Z', '2027-01-18T06:00:00Z', '2027-01-19T06:00:00Z']
    expect(freeOf(hours, '2027-01-17T00:00:00Z', asked)).toEqual(['2027-01-18T03:00:00Z', '2027-01-18T06:00:00Z'])
  })

  test('without weekdays every day counts', () => {
    const asked = ['2027-01-15T22:00:00Z', '2027-01-16T22:00:00Z', '2027-01-17T22:00:00Z']
    expect(freeOf([{ from: '17:00', to: '18:00' }], '2027-01-15T00:00:00Z', asked)).toEqual(asked)
  })
})

describe('a clock change', () => {
  test('in March the hour that is skipped ends hours by the clock', () => {
    // Sunday 14 March 2027: 2:00 EST becomes 3:00 EDT at 7:00 UTC. Saturday's hours end at 3:30 by the clock, 7:30 UTC.
    const hours = [{ from: '23:00', to: '03:30', weekdays: [6] }]
    const asked = ['2027-03-14T03:59:00Z', '2027-03-14T04:00:00Z', '2027-03-14T07:29:00Z', '2027-03-14T07:30:00Z']
    expect(freeOf(hours, '2027-03-13T12:00:00Z', asked)).toEqual(['2027-03-14T04:00:00Z', '2027-03-14T07:29:00Z'])
  })

  test('in November the hour that comes twice is free twice', () => {
    // Sunday 1 November 2026: 2:00 EDT becomes 1:00 EST at 6:00 UTC.
    const hours = [{ from: '00:30', to: '01:30', weekdays: [7] }]
    const asked = ['2026-11-01T04:29:00Z', '2026-11-01T05:15:00Z', '2026-11-01T06:15:00Z', '2026-11-01T06:30:00Z']
    expect(freeOf(hours, '2026-10-31T12:00:00Z', asked)).toEqual(['2026-11-01T05:15:00Z', '2026-11-01T06:15:00Z'])
  })
})
