// What came of a night: reports count before the weather; the weather is judged like the good nights of the advice's bench.
import { expect, test } from 'vitest'
import { settleNight, type LayerReport, type SaidNight } from '@/lib/advice/settle-night'
import type { AdviceWindow, ScoredHour } from '@/lib/advice/types'
import { HOUR_MILLIS } from '@/lib/physics/constants'

const ZONE = 'America/Toronto'
/** 7 pm in Toronto. */
const SEVEN_PM = Date.parse('2027-01-13T00:00:00Z')
const at = (hoursAfterSeven: number) => new Date(SEVEN_PM + hoursAfterSeven * HOUR_MILLIS).toISOString()

/** Sixteen hours from 7 pm; by default a layer sets in two hours and nothing falls. */
function hoursOf(change: (index: number) => { setsAt?: string | null; precipitationMm?: number; isKnown?: boolean }) {
  return Array.from({ length: 16 }, (_, index) => {
    const { setsAt = at(index + 2), precipitationMm = 0, isKnown = true } = change(index)
    return { time: at(index), isKnown, setsAt, weather: { precipitationMm } } as ScoredHour
  })
}

const flood = (...starts: number[]): SaidNight => ({
  said: 'flood',
  startsAt: at(0),
  endsAt: at(5),
  passes: starts.map((start) => ({
    startsAt: at(start),
    setBy: at(start + 2),
    layerMm: 3,
    waterL: 300,
    hoseMinutes: 12,
  })),
})
const hold: SaidNight = { said: 'hold', startsAt: null, endsAt: null, passes: [] }
const report = (outcome: LayerReport['outcome'], found: number): LayerReport => ({
  pouredAt: at(0),
  saidSetBy: at(2),
  outcome,
  at: at(found),
})
const settle = (
  night: SaidNight,
  hours: ScoredHour[],
  reports: LayerReport[] = [],
  windows: Partial<AdviceWindow>[] = [],
) => settleNight(night, { hours, windows: windows as AdviceWindow[] }, reports, ZONE)

test('every pass would have set in time and dry: kept', () => {
  expect(
    settle(
      flood(0.25, 3),
      hoursOf(() => ({})),
    ),
  ).toEqual({
    result: 'kept',
    source: 'weather',
    detail: { code: 'would_set', values: { at: at(5) } },
  })
})

test('a layer that was still wet at 7 am breaks the word', () => {
  // 7 am is twelve hours after 7 pm.
  const { result, detail } = settle(
    flood(0, 3),
    hoursOf((index) => (index === 3 ? { setsAt: at(12.5) } : {})),
  )
  expect([result, detail.code]).toEqual(['broken', 'too_slow'])
  expect(
    settle(
      flood(3),
      hoursOf((index) => (index === 3 ? { setsAt: at(12) } : {})),
    ).result,
  ).toBe('kept')
})

test('a layer that never sets breaks it too', () => {
  expect(
    settle(
      flood(0),
      hoursOf(() => ({ setsAt: null })),
    ),
  ).toMatchObject({ result: 'broken' })
})

test('more than a tenth of a millimetre before it is set breaks it, afterwards it does not', () => {
  const snowAt = (hour: number) => hoursOf((index) => ({ precipitationMm: index === hour ? 0.4 : 0 }))
  expect(settle(flood(0), snowAt(1)).detail).toEqual({
    code: 'precipitation',
    values: { startsAt: at(0), at: at(1) },
  })
  expect(settle(flood(0), snowAt(2)).result).toBe('kept')
})

test('holding off was right when no hour was good, and wrong when there was a window', () => {
  expect(
    settle(
      hold,
      hoursOf(() => ({})),
    ),
  ).toMatchObject({ result: 'kept', detail: { code: 'nothing_missed' } })
  const missed = { kind: 'flood' as const, startsAt: at(1), endsAt: at(4) }
  expect(
    settle(
      hold,
      hoursOf(() => ({})),
      [],
      [missed],
    ),
  ).toMatchObject({
    result: 'broken',
    detail: { code: 'missed', values: { startsAt: at(1) } },
  })
})

test('without weather nothing is claimed', () => {
  const unknown = hoursOf(() => ({ isKnown: false }))
  for (const night of [flood(0), hold]) {
    expect(settle(night, unknown)).toMatchObject({ result: 'unknown', source: 'none' })
    expect(settle(night, [])).toMatchObject({ result: 'unknown', source: 'none' })
  }
})

test('a report outranks the weather', () => {
  const slow = hoursOf(() => ({ setsAt: null }))
  const dry = hoursOf(() => ({}))
  expect(settle(flood(0), slow, [report('set', 1.5)])).toMatchObject({ result: 'kept', source: 'report' })
  expect(settle(flood(0), dry, [report('spoiled', 1)])).toMatchObject({ result: 'broken', source: 'report' })
  expect(settle(flood(0), dry, [report('set', 2), report('wet', 2.5)])).toMatchObject({
    result: 'broken',
    detail: { code: 'found_wet' },
  })
})

test('wet before it was said to be set says nothing against the word', () => {
  expect(
    settle(
      flood(0),
      hoursOf(() => ({})),
      [report('wet', 1)],
    ),
  ).toMatchObject({ result: 'kept', source: 'weather' })
})

test('still wet a quarter of an hour after what was said is within its grace, a minute more is not', () => {
  const dry = hoursOf(() => ({}))
  const lateBy = (minutes: number) => settle(flood(0), dry, [report('wet', 2 + minutes / 60)])
  expect(lateBy(15)).toMatchObject({ source: 'weather' })
  expect(lateBy(16)).toMatchObject({ result: 'broken', detail: { code: 'found_wet' } })
})
