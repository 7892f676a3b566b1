// Passes that the keeper moves: the same set times as the whole judgement gives, and the right warnings.
import { describe, expect, test } from 'vitest'
import { judge } from '@/lib/advice/judge'
import { judgePasses, type WantedPass } from '@/lib/advice/move-pass'
import { packNight, unpackNight, type NightModel } from '@/lib/advice/night-model'
import type { JudgeInput } from '@/lib/advice/types'
import { MINUTE_MILLIS } from '@/lib/physics/constants'
import { hourOf, inputOf, steadyHours, timeOf } from '../../support/advice-weather'
import { randomNight } from '../../support/random-weather'

const NIGHT = '2027-01-12'

/** As the browser gets it: through JSON. */
const nightOf = (input: JudgeInput, nightDate = NIGHT) => {
  const packed = packNight(input, nightDate)
  if (!packed) throw new Error('the forecast has no hour of the night')
  return unpackNight(JSON.parse(JSON.stringify(packed)) as NightModel)
}
const pass = (startsAt: string, given: Partial<WantedPass> = {}): WantedPass => ({
  startsAt,
  layerMm: 3,
  temperatureC: 6,
  ...given,
})
const judgeOne = (input: JudgeInput, wanted: WantedPass) => judgePasses(nightOf(input), [wanted])[0] ?? null
const minutesBetween = (from: string | null | undefined, to: string | null | undefined) =>
  from && to ? (Date.parse(to) - Date.parse(from)) / MINUTE_MILLIS : Number.NaN

describe('against the whole judgement', () => {
  test.each([1, 2, 3, 4, 5, 6, 7, 8])('a lone pass on the hour sets when the hour says, random night %i', (seed) => {
    const input = inputOf(randomNight(seed, 96, -6))
    const from = input.hours.findIndex(({ time }) => time.includes('T17:00:00'))
    const night = nightOf(input, input.hours[from]?.time.slice(0, 10))
    const hours = judge(input, { runs: 0 }).hours.slice(from, from + 24)
    expect(hours).toHaveLength(24)
    expect(hours.filter(({ setsAt }) => setsAt !== null).length).toBeGreaterThan(0)
    for (const hour of hours) {
      const [judged] = judgePasses(night, [pass(hour.time)])
      expect(judged?.setBy ?? null).toBe(hour.setsAt)
      expect(judged?.windChillC).toBeCloseTo(hour.windChillC ?? Number.NaN, 1)
    }
  })

  test.each([-4, -9, -14])('the advised passes, left where they are, set when advised, at %d °C', (airTemperatureC) => {
    const input = inputOf(steadyHours(72, { airTemperatureC }))
    const advised = judge(input, { runs: 0 }).plan.passes
    expect(advised).toHaveLength(3)
    const judged = judgePasses(
      nightOf(input),
      advised.map(({ startsAt }) => pass(startsAt)),
    )
    expect(judged.map((one) => one?.setBy)).toEqual(advised.map(({ setBy }) => setBy))
    expect(judged.flatMap((one) => one?.warnings)).toEqual([])
  })

  test('a layer poured already is in the sheet', () => {
    const poured = [{ at: timeOf(6.25), layerMm: 3, temperatureC: 6 }]
    const input = inputOf(steadyHours(72), { now: timeOf(6.5), poured })
    const hours = judge(input, { runs: 0 }).hours
    expect(judgeOne(input, pass(timeOf(9)))?.setBy).toBe(hours[9]?.setsAt)
  })

  test('a sheet reported in the evening counts from then on', () => {
    const input = inputOf(steadyHours(72), {
      sheet: { thicknessMm: 60, temperatureC: -2, snowCoverCm: 0, asOf: timeOf(6) },
    })
    const hours = judge(input, { runs: 0 }).hours
    expect(judgeOne(input, pass(timeOf(8)))?.setBy).toBe(hours[8]?.setsAt)
  })
})

describe('what changes with the pass', () => {
  const input = inputOf(steadyHours(72))
  const lasts = (given: Partial<WantedPass>) => {
    const wanted = pass(timeOf(8), given)
    return minutesBetween(wanted.startsAt, judgeOne(input, wanted)?.setBy)
  }

  test('thicker takes longer, hot water takes longer, thinner is sooner', () => {
    expect(lasts({ layerMm: 6 })).toBeGreaterThan(lasts({}))
    expect(lasts({ temperatureC: 45 })).toBeGreaterThan(lasts({}))
    expect(lasts({ layerMm: 1.5 })).toBeLessThan(lasts({}))
  })

  test('a pass soon after another sets later than one on a cold sheet', () => {
    const night = nightOf(input)
    const alone = judgePasses(night, [pass(timeOf(9.75))])[0]
    const [, after] = judgePasses(night, [pass(timeOf(8)), pass(timeOf(9.75))])
    expect(minutesBetween(alone?.setBy, after?.setBy)).toBeGreaterThan(0)
  })

  test('the order of the list does not matter', () => {
    const night = nightOf(input)
    const [a, b] = judgePasses(night, [pass(timeOf(8)), pass(timeOf(10))])
    expect(judgePasses(night, [pass(timeOf(10)), pass(timeOf(8))])).toEqual([b, a])
  })
})

describe('warnings', () => {
  const codes = (input: JudgeInput, ...wanted: WantedPass[]) =>
    judgePasses(nightOf(input), wanted).map((one) => ({
      ice: one?.warnings.map(({ code }) => code),
      person: one?.limits.map(({ code }) => code),
    }))
  const clear = inputOf(steadyHours(72))

  test('none for a good pass', () => {
    expect(codes(clear, pass(timeOf(8)))).toEqual([{ ice: [], person: [] }])
  })

  test('not set before the next', () => {
    const [first, second] = codes(clear, pass(timeOf(8), { layerMm: 6 }), pass(timeOf(8.25)))
    expect(first?.ice).toContain('not_set_before_next')
    expect(second?.ice).toContain('last_layer_wet')
  })

  // 800 L at 8 L/min are 100 min of hose: from 8 pm (hour 8) until 9:40 pm.
  test('the hose is still out for the pass before', () => {
    const night = nightOf(clear)
    const long = pass(timeOf(8), { hoseMinutes: 100 })
    const warned = (...wanted: WantedPass[]) =>
      judgePasses(night, wanted).map((one) => one?.warnings.find(({ code }) => code === 'hose_still_out')?.values)
    const until = { startsAt: timeOf(8), until: '2027-01-13T02:40:00Z' }
    expect(warned(long, pass(timeOf(9.5)))).toEqual([undefined, until])
    expect(warned(pass(timeOf(9.5)), long)).toEqual([until, undefined])
    // A short pass in between does not take the long one's hose in.
    expect(warned(long, pass(timeOf(8.5), { hoseMinutes: 12 }), pass(timeOf(9)))).toEqual([undefined, until, until])
    // In by 9:40, so the pass at 9:45 has it, and so has any where no hose time is known.
    expect(warned(long, pass(timeOf(9.75)))).toEqual([undefined, undefined])
    expect(warned(pass(timeOf(8)), pass(timeOf(9.5)))).toEqual([undefined, undefined])
  })

  test('not set before snow', () => {
    const snowy = steadyHours(72).map((hour, index) =>
      index < 10 ? hour : hourOf(index, { precipitationMm: 1, snowfallCm: 1 }),
    )
    expect(codes(inputOf(snowy), pass(timeOf(9.75)))[0]?.ice).toContain('snow_before_set')
    expect(codes(inputOf(snowy), pass(timeOf(6)))[0]?.ice).toEqual([])
  })

  test('not set by 7 am', () => {
    // 16.5 hours after noon is 4:30 am; less than three hours before 7 am counts for the next day, so just before 4.
    const mild = inputOf(steadyHours(72, { airTemperatureC: -3, cloudCover: 0.8 }))
    expect(codes(mild, pass(timeOf(15.75), { layerMm: 8 }))[0]?.ice).toContain('not_set_in_time')
  })

  test('outside the hours that the keeper set, a matter of the person', () => {
    expect(codes(clear, pass(timeOf(14)))[0]).toEqual({ ice: [], person: ['outside_hours_you_set'] })
  })

  test('half an inch at once', () => {
    expect(codes(clear, pass(timeOf(8), { layerMm: 13 }))[0]?.ice).toContain('layer_too_thick')
  })

  test('frostbite: -25 °C in 30 km/h is wind chill -39, ten to thirty minutes by the table of Environment Canada', () => {
    const bitter = inputOf(steadyHours(72, { airTemperatureC: -25, windSpeedMps: 30 / 3.6 }))
    const [judged] = judgePasses(nightOf(bitter), [pass(timeOf(8))])
    expect(Math.round(judged?.windChillC ?? 0)).toBe(-39)
    expect(judged?.limits.find(({ code }) => code === 'frostbite')?.values).toMatchObject({ minutes: 30 })
  })
})

test('an hour outside the forecast is nobody’s to judge', () => {
  expect(judgeOne(inputOf(steadyHours(30)), pass(timeOf(31)))).toBeNull()
  expect(packNight(inputOf(steadyHours(30)), '2027-01-20')).toBeNull()
})

test('a packed night stays small: under 40 kB of JSON', () => {
  expect(JSON.stringify(packNight(inputOf(steadyHours(240)), NIGHT)).length).toBeLessThan(40_000)
})
