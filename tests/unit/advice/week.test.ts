// The nights ahead from hand-built hours: every expected figure is counted in the comment beside it.
import { expect, test } from 'vitest'
import { nightsAhead, type WeekSetting } from '@/lib/advice/week'
import { estimatePasses } from '@/lib/advice/week-passes'
import { summariseWeek } from '@/lib/advice/week-summary'
import type { AdviceWindow, Judgement, ScoredHour } from '@/lib/advice/types'
import { HOUR_MILLIS } from '@/lib/physics/constants'

/** Noon in Toronto, 12 January 2027. */
const NOON = Date.parse('2027-01-12T17:00:00Z')
const at = (hours: number) => new Date(NOON + hours * HOUR_MILLIS).toISOString().replace('.000Z', 'Z')

const SETTING: WeekSetting = {
  now: new Date(NOON + 3 * HOUR_MILLIS),
  timeZone: 'America/Toronto',
  phase: 'skating',
  layerMm: 3,
  maxPasses: 3,
  plannedDate: '2027-01-12',
  otherNights: [],
  nights: 10,
}

/** An hour that holds, at -5 °C; `index` counts from the first noon. */
function hourAt(
  index: number,
  change: Partial<ScoredHour> & { snowfallCm?: number; airTemperatureC?: number } = {},
): ScoredHour {
  const { snowfallCm = 0, airTemperatureC = -5, ...rest } = change
  return {
    time: at(index),
    isKnown: true,
    netHeatLossWm2: 100,
    parts: null,
    freezeRateMmPerH: 1,
    windChillC: -8,
    setsAt: null,
    scores: { fill: 0, flood: 10, hold: 90 },
    verdict: 'hold',
    reasons: [{ code: 'freezes_slowly', factor: 0.1, values: { freezeRateMmPerH: 1 } }],
    sheet: { thicknessMm: 90, temperatureC: -3, liquidMm: 0, snowCoverCm: 0 },
    weather: {
      airTemperatureC,
      dewPointC: -8,
      windAtRinkMps: 1,
      cloudCover: 0,
      precipitationMm: snowfallCm,
      rainMm: 0,
      snowfallCm,
    },
    isAvailable: true,
    ...rest,
  }
}

const floodHour = (index: number, setHours: number, change: Partial<ScoredHour> = {}) =>
  hourAt(index, { verdict: 'flood', setsAt: at(index + setHours), reasons: [], ...change })

function windowAt(from: number, to: number, change: Partial<AdviceWindow> = {}): AdviceWindow {
  return {
    kind: 'flood',
    startsAt: at(from),
    endsAt: at(to),
    latestStartAt: at(to - 0.25),
    setBy: at(to + 1),
    score: 70,
    agreement: 0.9,
    runs: 10,
    ...change,
  }
}

function judgementOf(hours: ScoredHour[], change: Partial<Judgement> = {}): Judgement {
  const never = { p10: null, p50: null, p90: null }
  return {
    modelVersion: 'test',
    hours,
    windows: [],
    plan: { passes: [] },
    fill: { startsAt: null, hoseHours: 0, litres: 0, skinAt: null, carriesSkaterAt: never },
    thaws: [],
    ...change,
  }
}

const hoursOf = (count: number, write: (index: number) => ScoredHour = hourAt) =>
  Array.from({ length: count }, (_, index) => write(index))

test('ten nights are cut to those of which the forecast covers half', () => {
  // Three whole nights and eleven hours of a fourth; then three and thirteen.
  expect(nightsAhead(judgementOf(hoursOf(3 * 24 + 11)), SETTING)).toHaveLength(3)
  const nights = nightsAhead(judgementOf(hoursOf(3 * 24 + 13)), SETTING)
  expect(nights.map(({ nightDate }) => nightDate)).toEqual(['2027-01-12', '2027-01-13', '2027-01-14', '2027-01-15'])
  expect(nights.map(({ isFar }) => isFar)).toEqual([false, false, false, true])
  expect(nights.map(({ forecastEndsAt }) => forecastEndsAt)).toEqual([null, null, null, at(3 * 24 + 13)])
})

test('passes of a later night follow each other, each once the last is set', () => {
  // Layers take 1.6 h: pours at 30, then 31.6 up to the quarter hour 31.75, then 33.35 up to 33.5; set at 35.1.
  const hours = hoursOf(48, (index) => (index >= 30 && index < 36 ? floodHour(index, 1.6) : hourAt(index)))
  const window = windowAt(30, 36)
  expect(estimatePasses(window, hours, 3)).toEqual({ count: 3, startsAt: at(30), setBy: at(35.1), isEstimate: true })
  // The third pour at 33.5 is later than the latest start.
  expect(estimatePasses({ ...window, latestStartAt: at(33.25) }, hours, 3)?.count).toBe(2)
  expect(estimatePasses(window, hours, 0)).toBeNull()
})

test('tonight shows the passes of its plan, a later night those counted from its window', () => {
  const hours = hoursOf(48, (index) => (index % 24 >= 6 && index % 24 < 12 ? floodHour(index, 2) : hourAt(index)))
  const passes = [{ startsAt: at(8), setBy: at(9.5), layerMm: 3, waterL: 300, hoseMinutes: 12 }]
  const windows = [windowAt(6, 12), windowAt(30, 36, { agreement: 0.8 })]
  const [tonight, tomorrow] = nightsAhead(judgementOf(hours, { windows, plan: { passes } }), SETTING)
  expect(tonight).toMatchObject({ verdict: 'flood', agreement: { agreeing: 9, runs: 10 } })
  expect(tonight?.passes).toEqual({ count: 1, startsAt: at(8), setBy: at(9.5), isEstimate: false })
  // 3 mm of water make 3 x 1000/916.721 = 3.2725 mm of ice.
  expect(tonight?.floodsMm).toBeCloseTo(3.2725, 3)
  // Pours at 30, 32 and 34.
  expect(tomorrow?.passes).toMatchObject({ count: 3, setBy: at(36), isEstimate: true })
  expect(tomorrow?.floodsMm).toBeCloseTo(9.8176, 3)
})

test('a plan made for another night counts for none', () => {
  const hours = hoursOf(24, (index) => (index >= 6 && index < 12 ? floodHour(index, 2) : hourAt(index)))
  const judgement = judgementOf(hours, { windows: [windowAt(6, 12)] })
  const passesFor = (plannedDate: string) => nightsAhead(judgement, { ...SETTING, plannedDate })[0]?.passes
  // Pours at 6, 8 and 10; the plan of tonight itself found no pass worth a trip.
  expect(passesFor('2027-01-11')).toMatchObject({ count: 3, isEstimate: true })
  expect(passesFor('2027-01-12')).toBeNull()
})

test('a window that too few runs agree with is no good night, and says how many do', () => {
  const hours = hoursOf(24, (index) => (index >= 6 && index < 12 ? floodHour(index, 2) : hourAt(index)))
  const [night] = nightsAhead(judgementOf(hours, { windows: [windowAt(6, 12, { agreement: 0.4 })] }), SETTING)
  expect(night).toMatchObject({ verdict: 'hold', passes: null, floodsMm: 0, agreement: { agreeing: 4, runs: 10 } })
  expect(night?.reason?.code).toBe('runs_disagree')
})

test('where the forecast has no good hour, no runs were asked', () => {
  expect(nightsAhead(judgementOf(hoursOf(24)), SETTING)[0]?.agreement).toBeNull()
})

test('a night to hold off says how many runs would not', () => {
  const otherNights = [{ nightDate: '2027-01-13', agreeing: 5, runs: 24 }]
  const nights = nightsAhead(judgementOf(hoursOf(48)), { ...SETTING, otherNights })
  expect(nights.map(({ verdict, agreement }) => [verdict, agreement])).toEqual([
    ['hold', null],
    ['hold', { agreeing: 5, runs: 24 }],
  ])
})

test('a night has the time to fill that lies in it most', () => {
  const fill = (from: number, to: number) => windowAt(from, to, { kind: 'fill' })
  // 3 pm to 10 pm, then 8 am to 10 pm of the next day: 7 h and 4 h in the first night, 10 h in the second.
  const windows = [fill(3, 10), fill(20, 34)]
  const nights = nightsAhead(judgementOf(hoursOf(48), { windows }), { ...SETTING, phase: 'waiting' })
  expect(nights.map(({ verdict, window }) => [verdict, window?.startsAt])).toEqual([
    ['fill', at(3)],
    ['fill', at(20)],
  ])
})

test('ice gained or lost is the sheet at the end of the night less that at its start', () => {
  const sheet = (thicknessMm: number) => ({ thicknessMm, temperatureC: 0, liquidMm: 0, snowCoverCm: 0 })
  // 90 mm through the first night, then half a millimetre an hour is lost: 12 mm in the second.
  const hours = hoursOf(48, (index) => hourAt(index, { sheet: sheet(index < 24 ? 90 : 90 - 0.5 * (index - 23)) }))
  expect(nightsAhead(judgementOf(hours), SETTING).map(({ weatherMm }) => weatherMm)).toEqual([0, -12])
  expect(nightsAhead(judgementOf(hours), { ...SETTING, phase: 'waiting' })[0]?.weatherMm).toBeNull()
  const gappy = hours.map((hour, index) => (index === 30 ? { ...hour, isKnown: false, weather: null } : hour))
  expect(nightsAhead(judgementOf(gappy), SETTING).map(({ weatherMm }) => weatherMm)).toEqual([0, null])
})

test('a night is a thaw when twelve hours of it are and its air is mild', () => {
  const mild = (count: number) => hoursOf(24, (index) => hourAt(index, { airTemperatureC: index < count ? 4 : -6 }))
  const thaws = [{ startsAt: at(0), endsAt: at(30), lossMm: 5 }]
  const verdictOf = (hours: ScoredHour[], spells = thaws) =>
    nightsAhead(judgementOf(hours, { thaws: spells }), SETTING)[0]?.verdict
  expect(verdictOf(mild(24))).toBe('thaw')
  expect(verdictOf(mild(10))).toBe('hold')
  expect(verdictOf(mild(24), [{ startsAt: at(0), endsAt: at(11), lossMm: 5 }])).toBe('hold')
})

test('snow is summed from the first wet hour to the last, and only what is still to come', () => {
  // 1 cm each at hours 2 (over), 5 and 8: two remain, from hour 5 to the end of hour 8.
  const hours = hoursOf(24, (index) => hourAt(index, { snowfallCm: [2, 5, 8].includes(index) ? 1 : 0 }))
  expect(nightsAhead(judgementOf(hours), SETTING)[0]?.falls).toEqual({
    startsAt: at(5),
    endsAt: at(9),
    rainMm: 0,
    snowfallCm: 2,
  })
})

test('snow that an earlier night has cleared is not asked for again', () => {
  const covered = { thicknessMm: 90, temperatureC: -3, liquidMm: 0, snowCoverCm: 4 }
  const reasons = [{ code: 'snow_to_clear', factor: 0.6, values: { snowCoverCm: 4 } }]
  const hours = hoursOf(72, (index) => {
    const isGood = index % 24 >= 6 && index % 24 < 12
    const snowfallCm = index === 50 ? 1.5 : 0
    const change = { sheet: covered, reasons, snowfallCm }
    return isGood ? floodHour(index, 2, change) : hourAt(index, change)
  })
  const windows = [windowAt(6, 12), windowAt(30, 36), windowAt(54, 60)]
  const nights = nightsAhead(judgementOf(hours, { windows }), SETTING)
  expect(nights.map(({ snowToClearCm }) => snowToClearCm)).toEqual([4, 0, 1.5])
})

test('nights in which the clocks change have 25 and 23 hours, each once', () => {
  const nightOf = (date: string, now: string) => {
    const first = Date.parse(now)
    const hours = Array.from({ length: 72 }, (_, index) => ({
      ...hourAt(0),
      time: new Date(first + index * HOUR_MILLIS).toISOString().replace('.000Z', 'Z'),
    }))
    const nights = nightsAhead(judgementOf(hours), { ...SETTING, now: new Date(first) })
    return nights.find(({ nightDate }) => nightDate === date)
  }
  // 1 mm/h each hour, so the sum counts the hours.
  expect(nightOf('2026-10-31', '2026-10-31T16:00:00Z')?.freezableMm).toBe(25)
  expect(nightOf('2027-03-13', '2027-03-13T17:00:00Z')?.freezableMm).toBe(23)
})

test('the week counts good nights before and after the thaw, and finds the sheet at its thinnest', () => {
  const sheet = (thicknessMm: number) => ({ thicknessMm, temperatureC: 0, liquidMm: 0, snowCoverCm: 0 })
  const hours = hoursOf(5 * 24, (index) => {
    const thicknessMm = index === 60 ? 82 : 90
    const isGood = index % 24 >= 6 && index % 24 < 10 && Math.floor(index / 24) !== 2
    return isGood ? floodHour(index, 2, { sheet: sheet(thicknessMm) }) : hourAt(index, { sheet: sheet(thicknessMm) })
  })
  const judgement = judgementOf(hours, {
    windows: [windowAt(6, 10), windowAt(30, 34), windowAt(78, 82), windowAt(102, 106)],
    thaws: [{ startsAt: at(40), endsAt: at(70), lossMm: 8 }],
  })
  const summary = summariseWeek(nightsAhead(judgement, SETTING), judgement, SETTING.now)
  expect(summary).toMatchObject({
    nights: 5,
    goodDates: ['2027-01-12', '2027-01-13', '2027-01-15', '2027-01-16'],
    nearGoodDates: ['2027-01-12', '2027-01-13'],
    goodBeforeThaw: 2,
    goodAfterThaw: 2,
    isThawOn: false,
    thinnest: { thicknessMm: 82, at: at(60) },
  })
})
