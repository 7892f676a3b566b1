// The summary of a night, from judgements written by hand.
import { describe, expect, test } from 'vitest'
import { summariseNight } from '@/lib/advice/night-summary'
import type { AdviceWindow, Judgement, ScoredHour, Verdict } from '@/lib/advice/types'
import { timeOf } from '../../support/advice-weather'

const options = { nightDate: '2027-01-12', now: new Date('2027-01-12T21:00:00Z'), timeZone: 'America/Toronto' }

function hour(
  index: number,
  given: { verdict?: Verdict; code?: string; isAvailable?: boolean; snowfallCm?: number; thicknessMm?: number } = {},
): ScoredHour {
  const { verdict = 'hold', code = 'slow_though_cold', isAvailable = true, snowfallCm = 0, thicknessMm = 90 } = given
  const flood = verdict === 'flood' ? 80 : 0
  return {
    time: timeOf(index),
    isKnown: true,
    netHeatLossWm2: 200,
    parts: { longwave: 100, sensible: 60, latent: 40, shortwave: 0, precipitation: 0 },
    freezeRateMmPerH: 2.1,
    windChillC: -14,
    setsAt: timeOf(index + 2),
    scores: { fill: 0, flood, hold: 100 - flood },
    verdict,
    reasons: [{ code, factor: verdict === 'flood' ? 0.9 : 0, values: { startsAt: timeOf(index) } }],
    sheet: { thicknessMm, temperatureC: -4, liquidMm: 0, snowCoverCm: 0 },
    weather: {
      airTemperatureC: -8,
      dewPointC: -12,
      windAtRinkMps: 1,
      cloudCover: 0.1,
      precipitationMm: snowfallCm * 0.7,
      rainMm: 0,
      snowfallCm,
    },
    isAvailable,
  }
}

function window(from: number, to: number, given: Partial<AdviceWindow> = {}): AdviceWindow {
  return {
    kind: 'flood',
    startsAt: timeOf(from),
    endsAt: timeOf(to),
    latestStartAt: timeOf(to - 1),
    setBy: timeOf(to + 1),
    score: 80,
    agreement: 0.9,
    runs: 10,
    ...given,
  }
}

function judgement(hours: ScoredHour[], windows: AdviceWindow[], given: Partial<Judgement> = {}): Judgement {
  const fill = {
    startsAt: null,
    hoseHours: 8,
    litres: 12_000,
    skinAt: null,
    carriesSkaterAt: { p10: null, p50: null, p90: null },
  }
  return { modelVersion: 'test', hours, windows, plan: { passes: [] }, fill, thaws: [], ...given }
}

const hours48 = (given: (index: number) => Parameters<typeof hour>[1]) =>
  Array.from({ length: 48 }, (_, i) => hour(i, given(i)))
const pass = (index: number) => ({
  startsAt: timeOf(index),
  setBy: timeOf(index + 1),
  layerMm: 3,
  waterL: 300,
  hoseMinutes: 12,
})

describe('a good night', () => {
  const night = judgement(
    hours48((i) => ({ verdict: i >= 8 && i < 13 ? 'flood' : 'hold', snowfallCm: i >= 17 && i < 20 ? 1 : 0 })),
    [window(8, 13), window(32, 36)],
    { plan: { passes: [pass(8), pass(10)] } },
  )
  const summary = summariseNight(night, options)

  test('has its window, passes, agreement and the snow to come', () => {
    expect(summary).toMatchObject({
      verdict: 'flood',
      agreement: 0.9,
      runs: 10,
      lastSetBy: timeOf(11),
      leadingReason: null,
    })
    expect(summary.window?.startsAt).toBe(timeOf(8))
    expect(summary.windows).toHaveLength(1)
    expect(summary.precipitation).toEqual({
      kind: 'snow',
      startsAt: timeOf(17),
      endsAt: timeOf(20),
      rainMm: 0,
      snowfallCm: 3,
    })
    expect(summary.nextGoodAt).toBe(timeOf(32))
  })

  test('says why and what to mind', () => {
    expect(summary.why.map((reason) => reason.code)).toEqual([
      'why_sky',
      'why_air',
      'why_vapour',
      'why_sheet',
      'why_snow',
    ])
    const codes = summary.cautions.map((caution) => caution.code)
    expect(codes.slice(0, 2)).toEqual(['cold_skin', 'hose_freezes_between'])
    expect(codes).toEqual(expect.arrayContaining(['not_alone', 'thickness_is_estimate', 'land_only']))
  })
})

describe('what is said of the sheet and of the day after', () => {
  const whyOf = (fields: Parameters<typeof hours48>[0]) => summariseNight(judgement(hours48(fields), []), options).why

  test('ground without ice gives no help and needs no line', () => {
    expect(whyOf(() => ({})).map(({ code }) => code)).toContain('why_sheet')
    expect(whyOf(() => ({ thicknessMm: 0 })).map(({ code }) => code)).not.toContain('why_sheet')
  })

  // The night has 24 hours from noon: hour 23 is its last, hour 27 is 3 pm the next day.
  test.each([
    [23, undefined],
    [27, 1],
  ])('snow from hour %i on', (from, isAfterNight) => {
    const reason = whyOf((i) => (i >= from ? { snowfallCm: 1 } : {})).find(({ code }) => code === 'why_snow')
    expect(reason?.values.startsAt).toBe(timeOf(from))
    expect(reason?.values.isAfterNight).toBe(isAfterNight)
  })
})

describe('a night to hold off', () => {
  test('leads with the reason of most hours in which the keeper could go out', () => {
    const night = judgement(
      hours48((i) => ({ isAvailable: i >= 5 && i < 13, code: i >= 6 && i < 11 ? 'snow_before_set' : 'windy' })),
      [],
    )
    const summary = summariseNight(night, options)
    expect(summary.verdict).toBe('hold')
    expect(summary.leadingReason).toMatchObject({ code: 'snow_before_set', values: { startsAt: timeOf(6) } })
  })

  test('says when the good hours fall outside the keeper’s', () => {
    const night = judgement(
      hours48((i) => ({ isAvailable: i < 13, verdict: i >= 14 && i < 18 ? 'flood' : 'hold' })),
      [],
    )
    expect(summariseNight(night, options).leadingReason).toMatchObject({
      code: 'outside_your_hours',
      values: { startsAt: timeOf(14), endsAt: timeOf(18) },
    })
  })

  // The keeper's hours, 7 pm to 1 am (7 to 12), part the good ones: four before them, seven after.
  test('good hours on both sides of the keeper’s: the longest unbroken stretch of them', () => {
    const isGood = (i: number) => (i >= 3 && i < 7) || (i >= 13 && i < 20)
    const night = judgement(
      hours48((i) => ({ isAvailable: i >= 7 && i < 13, verdict: isGood(i) ? 'flood' : 'hold' })),
      [],
    )
    const { values } = summariseNight(night, { ...options, now: new Date(timeOf(0)) }).leadingReason ?? {}
    expect(values).toEqual({ startsAt: timeOf(13), endsAt: timeOf(20) })
  })

  test('a window that too few runs see is no advice, and no pass is told', () => {
    const night = judgement(
      hours48((i) => ({ verdict: i === 9 ? 'flood' : 'hold' })),
      [window(9, 10, { agreement: 0.4 })],
      {
        plan: { passes: [pass(9)] },
      },
    )
    const summary = summariseNight(night, options)
    expect(summary).toMatchObject({ verdict: 'hold', window: null, passes: [] })
    expect(summary.leadingReason).toMatchObject({ code: 'runs_disagree', values: { agreeing: 4, runs: 10 } })
  })

  test('in a thaw waits for the next window, else for its end', () => {
    const thaw = { startsAt: timeOf(0), endsAt: timeOf(40), lossMm: 8 }
    const thawing = judgement(
      hours48(() => ({})),
      [],
      { thaws: [thaw] },
    )
    expect(summariseNight(thawing, options)).toMatchObject({ thaw, holdUntil: timeOf(40) })
    const withNext = judgement(
      hours48(() => ({})),
      [window(44, 46)],
      { thaws: [thaw] },
    )
    expect(summariseNight(withNext, options).holdUntil).toBe(timeOf(44))
  })
})

describe('an unknown night', () => {
  test('has no hours, or only unknown ones', () => {
    expect(summariseNight(judgement([], []), options).verdict).toBe('unknown')
    const unknown = hours48(() => ({})).map((one) => ({ ...one, isKnown: false, parts: null, weather: null }))
    const summary = summariseNight(judgement(unknown, []), options)
    expect(summary).toMatchObject({ verdict: 'unknown', leadingReason: null, why: [] })
  })
})
