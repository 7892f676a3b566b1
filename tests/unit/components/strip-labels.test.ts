// Hour ticks on ordinary nights, on nights that change the clocks and in zones off by half an hour; amounts; collisions.
import { describe, expect, test } from 'vitest'
import { placeLabels, tickInstants, tickLabel, wetRuns } from '@/components/charts/strip-labels'
import { HOUR_MILLIS } from '@/lib/physics/constants'

const at = (iso: string) => Date.parse(iso)

describe('hour ticks', () => {
  test('every third hour from noon to noon', () => {
    const ticks = tickInstants(at('2027-01-12T17:00:00Z'), at('2027-01-13T17:00:00Z'), 'America/Toronto')
    expect(ticks.map((tick) => tickLabel(tick.localHour, '12'))).toEqual([
      'noon',
      '3 pm',
      '6 pm',
      '9 pm',
      'midnight',
      '3 am',
      '6 am',
      '9 am',
      'noon',
    ])
  })

  // Clocks in Toronto go forward at 02:00 on 14 March 2027 and back at 02:00 on 7 November 2027.
  test('a night of 23 hours has 3 am two hours after midnight', () => {
    const ticks = tickInstants(at('2027-03-13T17:00:00Z'), at('2027-03-14T16:00:00Z'), 'America/Toronto')
    const [midnight, three] = [ticks.find((t) => t.localHour === 0), ticks.find((t) => t.localHour === 3)]
    expect(ticks).toHaveLength(9)
    expect(((three?.at ?? 0) - (midnight?.at ?? 0)) / HOUR_MILLIS).toBe(2)
  })

  test('a night of 25 hours has 3 am four hours after midnight', () => {
    const ticks = tickInstants(at('2027-11-06T16:00:00Z'), at('2027-11-07T17:00:00Z'), 'America/Toronto')
    const [midnight, three] = [ticks.find((t) => t.localHour === 0), ticks.find((t) => t.localHour === 3)]
    expect(ticks).toHaveLength(9)
    expect(((three?.at ?? 0) - (midnight?.at ?? 0)) / HOUR_MILLIS).toBe(4)
  })

  test("St. John's, three and a half hours behind, ticks on its own hours", () => {
    const ticks = tickInstants(at('2027-01-12T15:30:00Z'), at('2027-01-13T15:30:00Z'), 'America/St_Johns')
    expect(ticks[0]).toEqual({ at: at('2027-01-12T15:30:00Z'), localHour: 12 })
    expect(ticks).toHaveLength(9)
  })

  test('the 24-hour clock has no noon', () => {
    expect([0, 12, 15].map((hour) => tickLabel(hour, '24'))).toEqual(['00:00', '12:00', '15:00'])
  })
})

test('snow with one dry hour between is one run with one amount', () => {
  const start = at('2027-01-13T04:00:00Z')
  const hours = [0.4, 0, 0.6, 0, 0, 1].map((snowCm, index) => ({
    startsAt: start + index * HOUR_MILLIS,
    verdict: 'hold' as const,
    rate: 1,
    air: -3,
    snowCm,
    rainMm: 0,
    isOpen: true,
  }))
  const runs = wetRuns(hours, start, start + 24 * HOUR_MILLIS)
  expect(runs.map((run) => run.snowCm)).toEqual([1, 1])
  expect(runs[0]).toMatchObject({ startsAt: start, endsAt: start + 3 * HOUR_MILLIS })
})

test('a run that begins before the strip keeps its whole amount', () => {
  const start = at('2027-01-13T04:00:00Z')
  const hours = [0.4, 0.6, 1].map((snowCm, index) => ({ startsAt: start + index * HOUR_MILLIS, snowCm, rainMm: 0 }))
  const [run] = wetRuns(hours, start + 2 * HOUR_MILLIS, start + 9 * HOUR_MILLIS)
  expect(run).toEqual({ startsAt: start + 2 * HOUR_MILLIS, endsAt: start + 3 * HOUR_MILLIS, snowCm: 2, rainMm: 0 })
  expect(wetRuns(hours, start + 3 * HOUR_MILLIS, start + 9 * HOUR_MILLIS)).toEqual([])
})

test('labels stay inside the width and never overlap', () => {
  const placed = placeLabels(
    [
      { x: 2, text: 'abcd' },
      { x: 30, text: 'efgh' },
      { x: 199, text: 'ij' },
    ],
    200,
    10,
  )
  expect(placed).toEqual([
    { x: 20, text: 'abcd' },
    { x: 190, text: 'ij' },
  ])
})
