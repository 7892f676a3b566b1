// The strip's geometry, by hand: a frame of 26 hours' width makes every hour 10 units wide.
import { describe, expect, test } from 'vitest'
import { layOutNightStrip, type StripHour, type StripInput } from '@/components/charts/night-strip-layout'
import { HOUR_MILLIS } from '@/lib/physics/constants'

const NOON = Date.parse('2027-01-12T17:00:00Z')
const frame = { width: 280, height: 200, left: 20, right: 20, plotTop: 40, plotBottom: 140 }

function hour(index: number, change: Partial<StripHour> = {}): StripHour {
  return {
    startsAt: NOON + index * HOUR_MILLIS,
    verdict: 'hold',
    rate: 1,
    air: -5,
    snowCm: 0,
    rainMm: 0,
    isOpen: true,
    ...change,
  }
}

function night(change: Partial<StripInput> = {}): StripInput {
  const hours = Array.from({ length: 24 }, (_, index) => hour(index))
  return {
    frame,
    startsAt: NOON,
    endsAt: NOON + 24 * HOUR_MILLIS,
    hours,
    passes: [],
    sunsetAt: NOON + 5 * HOUR_MILLIS,
    sunriseAt: NOON + 19.5 * HOUR_MILLIS,
    now: null,
    leastRateTop: 1,
    ...change,
  }
}

describe('across', () => {
  test('24 hours share the 240 units of the plot', () => {
    const { columns } = layOutNightStrip(night())
    expect(columns).toHaveLength(24)
    expect(columns[0]).toEqual({ index: 0, x: 20, width: 10 })
    expect(columns[23]).toEqual({ index: 23, x: 250, width: 10 })
  })

  test.each([23, 25])('a night of %i hours fills the width', (count) => {
    const hours = Array.from({ length: count }, (_, index) => hour(index))
    const { columns } = layOutNightStrip(night({ hours, endsAt: NOON + count * HOUR_MILLIS }))
    const last = columns.at(-1)
    expect(columns).toHaveLength(count)
    expect((last?.x ?? 0) + (last?.width ?? 0)).toBeCloseTo(260, 1)
  })

  test('hours that reach over the ends are cut there, hours outside are left out', () => {
    const hours = [hour(-1), hour(-0.5), hour(0.5), hour(23.5), hour(24)]
    const { columns } = layOutNightStrip(night({ hours }))
    expect(columns).toEqual([
      { index: 1, x: 20, width: 5 },
      { index: 2, x: 25, width: 10 },
      { index: 3, x: 255, width: 5 },
    ])
  })

  test('the night ground runs from sunset to sunrise', () => {
    expect(layOutNightStrip(night()).night).toEqual({ x: 70, width: 145 })
  })

  test('without a sunset there is no ground, with one only it runs to the end', () => {
    expect(layOutNightStrip(night({ sunsetAt: null, sunriseAt: null })).night).toBeNull()
    expect(layOutNightStrip(night({ sunriseAt: null })).night).toEqual({ x: 70, width: 190 })
  })

  test('a pass is a bracket from pour to set', () => {
    const pass = { number: 1, startsAt: NOON + 8 * HOUR_MILLIS, setBy: NOON + 9.5 * HOUR_MILLIS, isPoured: false }
    expect(layOutNightStrip(night({ passes: [pass] })).brackets).toEqual([
      { number: 1, x: 100, width: 15, isPoured: false },
    ])
  })

  test('the keeper’s hours are one stretch, and nothing when every hour is theirs', () => {
    const hours = Array.from({ length: 24 }, (_, index) => hour(index, { isOpen: index >= 5 && index < 13 }))
    expect(layOutNightStrip(night({ hours })).openSpans).toEqual([{ x: 70, width: 80 }])
    expect(layOutNightStrip(night()).openSpans).toEqual([])
  })

  test('now is a line inside the night and nothing outside it', () => {
    expect(layOutNightStrip(night({ now: NOON + 6 * HOUR_MILLIS })).nowX).toBe(80)
    expect(layOutNightStrip(night({ now: NOON - 1 })).nowX).toBeNull()
  })
})

describe('upward', () => {
  test('freezing stands on the line, melting hangs under it, in proportion', () => {
    const hours = [hour(0, { rate: 2 }), hour(1, { rate: 1 }), hour(2, { rate: -1 })]
    const { bars, baselineY } = layOutNightStrip(night({ hours }))
    const [two, one, melting] = bars
    expect((two?.y ?? 0) + (two?.height ?? 0)).toBeCloseTo(baselineY, 1)
    expect(two?.height).toBeCloseTo(2 * (one?.height ?? 0), 1)
    expect(melting?.y).toBe(baselineY)
    expect(melting?.height).toBeCloseTo(one?.height ?? 0, 1)
    expect(melting?.isMelting).toBe(true)
  })

  test('melting beyond 0.6 of the height above is cut and says so', () => {
    const hours = [hour(0, { rate: 2 }), hour(1, { rate: -9 })]
    const { bars, baselineY } = layOutNightStrip(night({ hours }))
    expect(bars[1]?.isCut).toBe(true)
    expect(bars[1]?.height).toBeCloseTo(0.6 * (baselineY - frame.plotTop), 1)
  })

  test('a night that only melts is shown in full', () => {
    const { bars } = layOutNightStrip(night({ hours: [hour(0, { rate: -6 }), hour(1, { rate: -3 })] }))
    expect(bars.map((bar) => bar.isCut)).toEqual([false, false])
  })

  test('the ticks of rate are round and lie on the scale', () => {
    const { rateTicks, baselineY } = layOutNightStrip(night({ hours: [hour(0, { rate: 2.3 })] }))
    expect(rateTicks.map((tick) => tick.value)).toEqual([0, 1, 2])
    expect(rateTicks[0]?.y).toBe(baselineY)
  })

  test('the air line has its own axis: the colder hour lies lower', () => {
    const { airLines, airTicks } = layOutNightStrip(night({ hours: [hour(0, { air: 2 }), hour(1, { air: -8 })] }))
    const [first, second] = (airLines[0] ?? '').split(' ').map((point) => Number(point.split(',')[1]))
    expect(first).toBeLessThan(second ?? 0)
    expect(airTicks.map((tick) => tick.value)).toEqual([-5, 0])
  })
})

describe('what is missing or falls', () => {
  test('missing hours make one gap, no bar, and break the air line', () => {
    const hours = [hour(0), hour(1), hour(2, { rate: null, air: null }), hour(3, { rate: null, air: null }), hour(4)]
    const layout = layOutNightStrip(night({ hours }))
    expect(layout.gaps).toEqual([{ x: 40, width: 20 }])
    expect(layout.bars.map((bar) => bar.index)).toEqual([0, 1, 4])
    expect(layout.airLines).toHaveLength(2)
  })

  test('a night without any forecast still has its frame', () => {
    const hours = Array.from({ length: 24 }, (_, index) => hour(index, { rate: null, air: null }))
    const layout = layOutNightStrip(night({ hours }))
    expect(layout.gaps).toEqual([{ x: 20, width: 240 }])
    expect(layout.airTicks).toEqual([])
    expect(layout.rateTicks.length).toBeGreaterThan(1)
  })

  test('snow and rain of one hour stand side by side, a trace is left out', () => {
    const hours = [hour(0, { snowCm: 1, rainMm: 1 }), hour(1, { snowCm: 0.01 })]
    const { marks } = layOutNightStrip(night({ hours }))
    expect(marks.map(({ kind, x }) => ({ kind, x }))).toEqual([
      { kind: 'snow', x: 21 },
      { kind: 'rain', x: 29 },
    ])
  })
})
