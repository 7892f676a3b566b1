// The day to fill: every way to be silent, and every way to speak once.
import { describe, expect, test } from 'vitest'
import { dueFillDay, isFillNear, type FillDayQuestion, type ToldFillDay } from '@/lib/advice/fill-day-due'

// Tuesday 12 January, 16:10 in Toronto, five hours behind; told at 15:30.
const NOW = new Date('2027-01-12T21:10:00Z')
const TELL_AT = new Date('2027-01-12T20:30:00Z')
const TONIGHT = '2027-01-12'

/** A start at 17:00 on a day of January. */
const on = (day: number) => ({ fillDate: `2027-01-${day}`, startsAt: new Date(`2027-01-${day}T22:00:00Z`) })
const told = (kind: ToldFillDay['kind'], day: number, toldAt = '2027-01-11T20:30:00Z'): ToldFillDay => ({
  kind,
  ...on(day),
  toldAt: new Date(toldAt),
})

function ask(changes: Partial<FillDayQuestion>) {
  return dueFillDay({
    now: NOW,
    tonightDate: TONIGHT,
    tellAt: TELL_AT,
    isMuted: false,
    isForecastStale: false,
    start: on(15),
    told: [],
    ...changes,
  })
}

const at = (instant: string) => ({ now: new Date(instant) })
const THREE_CHANGES = [
  told('fill-changed', 16),
  told('fill-closed', 15),
  told('fill-changed', 15),
  told('fill-ahead', 14),
]

describe('silence', () => {
  test.each<[string, Partial<FillDayQuestion>]>([
    ['when muted', { isMuted: true }],
    ['on an old forecast', { isForecastStale: true }],
    ['without a start', { start: null }],
    ['about a start more than five days off', { start: on(18) }],
    ['before the person’s time of day', at('2027-01-12T20:00:00Z')],
    ['at night, of a day that is far', at('2027-01-13T08:00:00Z')],
    ['about a date that was told', { told: [told('fill-ahead', 15)] }],
    [
      'about another hour of the night that was told',
      { start: { fillDate: '2027-01-15', startsAt: new Date('2027-01-16T04:00:00Z') }, told: [told('fill-ahead', 15)] },
    ],
    [
      'once the start that was told has come',
      { ...at('2027-01-12T22:10:00Z'), start: on(13), told: [told('fill-ahead', 12)] },
    ],
    ['about a day that was called off and stays off', { start: null, told: [told('fill-closed', 15)] }],
    [
      'about a far move before the person’s time of day',
      { ...at('2027-01-12T20:00:00Z'), start: on(16), told: [told('fill-ahead', 15)] },
    ],
    [
      'about a day that comes back after three changes',
      { start: on(15), told: [told('fill-closed', 16), ...THREE_CHANGES] },
    ],
    ['about a new far day after three changes', { start: on(17), told: [told('fill-closed', 16), ...THREE_CHANGES] }],
  ])('%s', (_when, changes) => {
    expect(ask(changes)).toBeNull()
  })
})

describe('speech', () => {
  test.each<[string, Partial<FillDayQuestion>, string]>([
    ['the first word of a day', {}, 'fill-ahead'],
    ['the last day that is near enough', { start: on(17) }, 'fill-ahead'],
    [
      'a day that would be over before the person’s time of day',
      { ...at('2027-01-12T15:00:00Z'), start: { fillDate: '2027-01-12', startsAt: new Date('2027-01-12T18:00:00Z') } },
      'fill-ahead',
    ],
    ['a new day when the one told has passed unfilled', { told: [told('fill-ahead', 11)] }, 'fill-ahead'],
    ['another day after one was called off', { told: [told('fill-closed', 13), told('fill-ahead', 13)] }, 'fill-ahead'],
    ['a day that moves back', { start: on(16), told: [told('fill-ahead', 15)] }, 'fill-changed'],
    ['a day that moves forward', { start: on(14), told: [told('fill-ahead', 15)] }, 'fill-changed'],
    [
      'a day that was called off and holds again',
      { told: [told('fill-closed', 15), told('fill-ahead', 15)] },
      'fill-changed',
    ],
    ['no day any more', { start: null, told: [told('fill-ahead', 15)] }, 'fill-closed'],
    ['no day within five', { start: on(19), told: [told('fill-changed', 15)] }, 'fill-closed'],
    [
      'a near day that falls away, at any hour',
      { ...at('2027-01-13T14:00:00Z'), start: null, told: [told('fill-ahead', 13)] },
      'fill-closed',
    ],
    ['a move after three changes takes the day back', { start: on(14), told: THREE_CHANGES }, 'fill-closed'],
    [
      'a new near day after three changes',
      { ...at('2027-01-12T22:10:00Z'), start: on(13), told: [told('fill-closed', 16), ...THREE_CHANGES] },
      'fill-ahead',
    ],
    [
      'a move when the changes are a week old',
      { start: on(14), told: THREE_CHANGES.map((one) => ({ ...one, toldAt: new Date('2027-01-05T20:30:00Z') })) },
      'fill-changed',
    ],
  ])('%s', (_what, changes, kind) => {
    expect(ask(changes)).toBe(kind)
  })

  test('a start is near from a day before it on', () => {
    expect(isFillNear(new Date(NOW.getTime() + 24 * 3_600_000), NOW)).toBe(true)
    expect(isFillNear(new Date(NOW.getTime() + 24 * 3_600_000 + 1), NOW)).toBe(false)
  })
})
