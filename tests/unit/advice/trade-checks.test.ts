// What keepers know from practice (common practice, no published source): the model must agree with it.
import { describe, expect, test } from 'vitest'
import { buildSums } from '@/lib/advice/build-sums'
import { fillProgress } from '@/lib/advice/fill-progress'
import { judge } from '@/lib/advice/judge'
import type { ScoredHour } from '@/lib/advice/types'
import { floorFromCorners } from '@/lib/physics/floor'
import { linerAcrossM } from '@/lib/physics/liner'
import { fillByHour, hoseHours, stageAt } from '@/lib/physics/stage'
import { hourOf, inputOf } from '../../support/advice-weather'
import { heatToFreezeJ } from '../../support/published-forms/heat'
import { openHoseFlowLPerMin } from '../../support/published-forms/hose-flow'
import { snowMeltedCm } from '../../support/published-forms/ice-and-snow'

const M_PER_FOOT = 0.3048
const M_PER_INCH = 0.0254
const SIDE_M = 32.5 * M_PER_FOOT
/** A half-inch hose of 100 ft at 40 psi: published as about 6 US gallons a minute, 23 L/min. */
const HOSE_L_PER_MIN = openHoseFlowLPerMin(40 * 6894.757, 0.5 * M_PER_INCH, 100 * M_PER_FOOT)
/** 1 cm of water over the high side, 25 cm over the low one: a fall of 9½ in and 13 cm in the mean. */
const FLOOR = floorFromCorners(SIDE_M, SIDE_M, [0.01, 0.01, 0.25, 0.25])

describe('common practice: the fill', () => {
  test('a lined rink 32.5 ft square takes 8 to 10 hours from one garden hose', () => {
    const hours = hoseHours(stageAt(FLOOR, 0).volumeM3 * 1000, HOSE_L_PER_MIN)
    expect(hours).toBeGreaterThan(8)
    expect(hours).toBeLessThan(10)
  })
  test('after some three hours the water covers about half of a sloping floor', () => {
    const third = fillByHour(FLOOR, HOSE_L_PER_MIN, 12).find(({ hours }) => hours === 3)!
    expect(third.stage.wetShare).toBeGreaterThan(0.45)
    expect(third.stage.wetShare).toBeLessThan(0.65)
  })
  test('somebody looks at hose and liner every two hours', () => {
    const { nextCheckAt } = fillProgress({
      now: '2026-12-20T18:30:00Z',
      lengthM: 10,
      widthM: 10,
      targetL: 12_000,
      sessions: [{ startedAt: '2026-12-20T18:00:00Z', stoppedAt: null, flowLPerMin: 25 }],
    })
    expect(nextCheckAt).toBe('2026-12-20T20:00:00Z')
  })
})

/** A day and night at one temperature, then a week at -9 °C. */
const firstHourAt = (airTemperatureC: number): ScoredHour => {
  const hours = Array.from({ length: 168 }, (_, hour) =>
    hourOf(hour, { airTemperatureC: hour < 24 ? airTemperatureC : -9 }),
  )
  const input = inputOf(hours, { available: [{ from: '00:00', to: '24:00' }] })
  return judge({ ...input, rink: { ...input.rink, phase: 'waiting' } }, { runs: 0 }).hours[0] as ScoredHour
}

describe('common practice: hose and hands', () => {
  test('filling is comfortable from 0 to -1 °C, and scores far above -6 °C', () => {
    for (const comfortable of [0, -1]) {
      expect(firstHourAt(comfortable).verdict).toBe('fill')
      expect(firstHourAt(comfortable).scores.fill).toBeGreaterThan(firstHourAt(-6).scores.fill + 50)
    }
  })
  test.each([-4.5, -5, -6, -10])(
    'no fill at %d °C: a running cold hose has frozen at -4 to -5 °C',
    (airTemperatureC) => {
      const hour = firstHourAt(airTemperatureC)
      expect(hour.verdict).toBe('hold')
      expect(hour.reasons[0]?.code).toBe('fill_hose_freezes')
    },
  )
})

describe('common practice: boards, liner and snow under it', () => {
  // 9¼ in and 5½ in on top are 14¾ in; with 1½ in of board crossed on each side 2 × 16¼ in = 2.71 ft.
  test('a rink 34 ft square needs about 3 ft more of liner than its inside, before folds and overlap', () => {
    const edges = { boardHeightM: 14.75 * M_PER_INCH, boardThicknessM: 1.5 * M_PER_INCH, tuckM: 0 }
    const moreFt = linerAcrossM(34 * M_PER_FOOT, edges) / M_PER_FOOT - 34
    expect(moreFt).toBeCloseTo(2.708, 3)
    expect(Math.round(moreFt)).toBe(3)
  })
  test('a low corner with 12.7 in of water and 2 in of board above it wants a 2×10 with a 2×6 on top', () => {
    const { boards } = buildSums({
      lengthM: 34 * M_PER_FOOT,
      widthM: 34 * M_PER_FOOT,
      floor: { cornersM: [0, 4 * M_PER_INCH, 9 * M_PER_INCH, 4 * M_PER_INCH] },
      leastDepthM: 3.7 * M_PER_INCH,
      flow: { lPerMin: 25 },
      seasonYear: 2026,
    })
    expect(boards.lumber?.boards).toEqual(['2×10', '2×6'])
  })
  test('liners are ordered in September', () => {
    const sums = buildSums({ lengthM: 10, widthM: 10, leastDepthM: 0.1, flow: { lPerMin: 25 }, seasonYear: 2027 })
    expect(sums.orderBy.date.slice(0, 7)).toBe('2027-09')
  })
  // 1 cm of snow at 100 kg/m³ and -5 °C is 1 kg/m²: 333.6 kJ to melt and 10.5 kJ to warm. 13 cm of water at 6 °C hold
  // 130 × 4.2 × 6 = 3276 kJ/m², enough for 9.5 such centimetres.
  test('water poured on a little snow under the liner melts it', () => {
    const meltedCm = snowMeltedCm(130, 6, { densityKgM3: 100, temperatureC: -5 })
    expect(meltedCm).toBeGreaterThan(1)
    expect(meltedCm).toBeCloseTo(3276 / 344.1, 1)
    expect(heatToFreezeJ(1, 0, -5)).toBeCloseTo(344_100, -3)
  })
})
