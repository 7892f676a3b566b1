// Judgements of plain nights: what the verdict is, and that the reason says why.
import { describe, expect, test } from 'vitest'
import { judge } from '@/lib/advice/judge'
import type { Judgement, ScoredHour } from '@/lib/advice/types'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { hourOf, inputOf, missingHour, steadyHours, timeOf } from '../../support/advice-weather'
import { scoreExample } from '../../support/score-example'

/** 8 pm local is the eighth hour after noon. */
const EIGHT_PM = 8
const at = (judgement: Judgement, hour: number) => judgement.hours[hour] as ScoredHour
const alone = { runs: 0 }

describe('the verdict of an hour', () => {
  test('a clear dry night at +1 °C is good to flood, and the reason says that it freezes though mild', () => {
    const clear = { airTemperatureC: 1, dewPointC: -9, windSpeedMps: 0.5, windGustMps: 1, cloudCover: 0 }
    const hour = at(judge(inputOf(steadyHours(36, clear)), alone), EIGHT_PM)
    expect(hour.verdict).toBe('flood')
    expect(hour.reasons.map((reason) => reason.code)).toContain('freezes_though_mild')
  })

  test('an overcast damp night at -2 °C is poorer, and the leading reason is the slow freezing', () => {
    const damp = { airTemperatureC: -2, dewPointC: -2.2, windSpeedMps: 0.5, windGustMps: 1, cloudCover: 1 }
    const clear = { airTemperatureC: 1, dewPointC: -9, windSpeedMps: 0.5, windGustMps: 1, cloudCover: 0 }
    const sheet = { thicknessMm: 90, temperatureC: -0.5, snowCoverCm: 0 }
    const dampHour = at(judge(inputOf(steadyHours(36, damp), { sheet }), alone), EIGHT_PM)
    const clearHour = at(judge(inputOf(steadyHours(36, clear), { sheet }), alone), EIGHT_PM)
    expect(dampHour.scores.flood).toBeLessThan(clearHour.scores.flood)
    expect(dampHour.reasons[0]?.code).toBe('slow_though_cold')
  })

  test('snow before the layer sets is fatal, with the hour it starts', () => {
    const hours = steadyHours(36)
    hours[9] = hourOf(9, { precipitationMm: 0.7, snowfallCm: 1 })
    const hour = at(judge(inputOf(hours), alone), 9)
    expect(hour.verdict).toBe('hold')
    expect(hour.reasons[0]).toMatchObject({ code: 'snow_before_set', factor: 0, values: { startsAt: timeOf(9) } })
  })

  test.each([
    ['rain', { precipitationMm: 0.5, rainMm: 0.5 }, 'rain_before_set'],
    ['a strong wind', { windSpeedMps: 30, windGustMps: 45 }, 'windy'],
    ['deep cold, for the hose', { airTemperatureC: -24 }, 'hose_freezes'],
    ['a warm night', { airTemperatureC: 7, dewPointC: 4, cloudCover: 1 }, 'not_freezing'],
  ])('%s holds, and leads the reasons', (_, weather, code) => {
    const hour = at(judge(inputOf(steadyHours(36, weather)), alone), EIGHT_PM)
    expect(hour.verdict).toBe('hold')
    expect(hour.reasons[0]?.code).toBe(code)
  })

  test('what the person cannot bear caps the score and is not averaged with the ice', () => {
    // -19 °C lies two fifths of the way from -17 to -22, so the hose lets 60 through.
    const hour = at(judge(inputOf(steadyHours(36, { airTemperatureC: -19 })), alone), EIGHT_PM)
    expect(hour.limits?.person).toBe(60)
    expect(hour.limits?.ice).toBeGreaterThan(60)
    expect(hour.scores.flood).toBe(60)
  })

  test('snow on the sheet is to be cleared first; more than can be cleared in an evening holds', () => {
    const withSnow = (snowCoverCm: number) =>
      at(judge(inputOf(steadyHours(36), { sheet: { thicknessMm: 90, temperatureC: -4, snowCoverCm } }), alone), 0)
    expect(withSnow(3).verdict).toBe('flood')
    expect(withSnow(3).reasons.find((reason) => reason.code === 'snow_to_clear')?.factor).toBeLessThan(1)
    expect(withSnow(14).verdict).toBe('hold')
    expect(withSnow(14).reasons[0]?.code).toBe('snow_to_clear')
  })

  test.each(['planning', 'waiting', 'filling', 'closed'] as const)('nothing is flooded in the phase %s', (phase) => {
    const input = inputOf(steadyHours(30))
    const judgement = judge({ ...input, rink: { ...input.rink, phase } }, alone)
    expect(judgement.hours.every((hour) => hour.scores.flood === 0)).toBe(true)
  })

  test('a lone missing hour is bridged, a longer gap is unknown and never a flood', () => {
    const hours = steadyHours(36)
    hours[4] = missingHour(4)
    hours[9] = missingHour(9)
    hours[10] = missingHour(10)
    const judgement = judge(inputOf(hours), alone)
    expect(at(judgement, 4).isKnown).toBe(true)
    for (const hour of [9, 10]) {
      expect(at(judgement, hour)).toMatchObject({
        isKnown: false,
        verdict: 'hold',
        scores: { fill: 0, flood: 0, hold: 100 },
      })
      expect(at(judgement, hour).reasons[0]?.code).toBe('weather_unknown')
    }
  })
})

describe('rules about days', () => {
  const codesOf = (hour: ScoredHour) => hour.reasons.map((reason) => reason.code)

  test('rain on a clear sheet before cold is a flood for nothing', () => {
    const hours = steadyHours(48, { airTemperatureC: -7 })
    for (const hour of [3, 4])
      hours[hour] = hourOf(hour, { airTemperatureC: 1, dewPointC: 1, precipitationMm: 1, rainMm: 1 })
    const judgement = judge(inputOf(hours), alone)
    expect(codesOf(at(judgement, 3))).toContain('rain_is_a_flood')
    expect(at(judgement, 3).verdict).toBe('hold')
    expect(codesOf(at(judgement, 20))).not.toContain('rain_is_a_flood')
  })

  test('snow on the sheet, then wet, then a sharp fall: finish clearing or leave it', () => {
    const hours = steadyHours(48, { airTemperatureC: -8 })
    for (let hour = 0; hour < 6; hour += 1) {
      hours[hour] = hourOf(hour, {
        airTemperatureC: 0.5,
        dewPointC: 0,
        cloudCover: 1,
        precipitationMm: 0.5,
        rainMm: 0.5,
      })
    }
    const sheet = { thicknessMm: 90, temperatureC: -1, snowCoverCm: 6 }
    expect(codesOf(at(judge(inputOf(hours, { sheet }), alone), 0))).toContain('finish_clearing')
    const clear = { ...sheet, snowCoverCm: 0 }
    expect(codesOf(at(judge(inputOf(hours, { sheet: clear }), alone), 0))).not.toContain('finish_clearing')
  })
})

describe('windows and the plan', () => {
  test('windows keep to the hours in which the keeper can go out', () => {
    const [window] = judge(inputOf(steadyHours(24)), alone).windows
    // 17:00 to 01:00 in Toronto is 22:00Z to 06:00Z.
    expect(window).toMatchObject({ kind: 'flood', startsAt: '2027-01-12T22:00:00Z', endsAt: '2027-01-13T06:00:00Z' })
  })

  test('hours outside keep their verdict but are in no window', () => {
    const judgement = judge(inputOf(steadyHours(24)), alone)
    expect(at(judgement, 14)).toMatchObject({ verdict: 'flood', isAvailable: false })
  })

  test('availability to the quarter hour trims both ends', () => {
    const [window] = judge(inputOf(steadyHours(24), { available: [{ from: '18:15', to: '21:40' }] }), alone).windows
    expect(window).toMatchObject({ startsAt: '2027-01-12T23:15:00Z', endsAt: '2027-01-13T02:45:00Z' })
  })

  test('each pass is 3 mm on 100 m²: 300 L and 12 minutes of a 25 L/min hose', () => {
    const { passes } = judge(inputOf(steadyHours(24)), alone).plan
    expect(passes).toHaveLength(3)
    for (const pass of passes) expect(pass).toMatchObject({ layerMm: 3, waterL: 300, hoseMinutes: 12 })
  })

  test('no pass starts before the one before it is set, nor before now', () => {
    const now = '2027-01-13T00:07:00Z'
    const { passes } = judge(inputOf(steadyHours(24), { now }), alone).plan
    expect(passes[0]?.startsAt).toBe('2027-01-13T00:15:00Z')
    passes.slice(1).forEach((pass, index) => expect(pass.startsAt >= (passes[index]?.setBy ?? '')).toBe(true))
  })

  test('poured layers count against the passes and delay the next one until they are set', () => {
    const poured = [{ at: '2027-01-13T00:10:00Z', layerMm: 3, temperatureC: 6 }]
    const input = inputOf(steadyHours(24), { now: '2027-01-13T00:20:00Z', poured })
    const { passes } = judge(input, alone).plan
    expect(passes).toHaveLength(2)
    // At -8 °C, clear and light wind, 3 mm takes at least half an hour.
    expect(Date.parse(passes[0]?.startsAt ?? '')).toBeGreaterThan(Date.parse('2027-01-13T00:40:00Z'))
  })

  test('the window of a member that disagrees is not agreed with', () => {
    const good = steadyHours(30)
    const wet = steadyHours(30, { airTemperatureC: 6, dewPointC: 5, cloudCover: 1 })
    const [window] = judge(inputOf(good, { members: [good, good, good, wet] })).windows
    expect(window).toMatchObject({ agreement: 0.75, runs: 4 })
  })
})

describe('the other results', () => {
  test('three warm days are a thaw with a loss', () => {
    const warm = { airTemperatureC: 6, dewPointC: 4, cloudCover: 1, windSpeedMps: 4, windGustMps: 6 }
    const [thaw] = judge(inputOf(steadyHours(72, warm)), alone).thaws
    expect(thaw?.lossMm).toBeGreaterThan(5)
    expect(Date.parse(thaw?.endsAt ?? '') - Date.parse(thaw?.startsAt ?? '')).toBeGreaterThan(48 * HOUR_MILLIS)
  })

  test('a rink that waits gets a fill: a mild dry day before a week of cold', () => {
    const hours = Array.from({ length: 168 }, (_, hour) => hourOf(hour, { airTemperatureC: hour < 24 ? -1 : -9 }))
    const input = inputOf(hours, { available: [{ from: '08:00', to: '20:00' }] })
    const judgement = judge({ ...input, rink: { ...input.rink, phase: 'waiting' } }, alone)
    const { fill } = judgement
    // 100 m² by 120 mm is 12,000 L, which 25 L/min bring in 8 h.
    expect(fill).toMatchObject({ litres: 12_000, hoseHours: 8, startsAt: timeOf(0) })
    expect(judgement.windows[0]?.kind).toBe('fill')
    expect(fill.skinAt && fill.carriesSkaterAt.p50 && fill.skinAt < fill.carriesSkaterAt.p50).toBe(true)
  })

  test('a fill is not advised when the hose would freeze, the wind would lift the liner, or no cold follows', () => {
    const verdicts = [
      { airTemperatureC: -12 },
      { windSpeedMps: 12, windGustMps: 25 },
      { airTemperatureC: 2, dewPointC: 1.5, cloudCover: 1 },
    ].map((weather) => {
      const input = inputOf(steadyHours(120, weather))
      return judge({ ...input, rink: { ...input.rink, phase: 'waiting' } }, alone).windows.length
    })
    expect(verdicts).toEqual([0, 0, 0])
  })

  test('a fill that the hose forbids still says that the cold would follow', () => {
    const input = inputOf(steadyHours(120, { airTemperatureC: -12 }))
    const hour = at(judge({ ...input, rink: { ...input.rink, phase: 'waiting' } }, alone), 0)
    expect(hour.reasons[0]?.code).toBe('fill_hose_freezes')
    expect(hour.reasons.find((reason) => reason.code === 'cold_follows')?.factor).toBeGreaterThan(0.5)
    expect(hour.limits?.person).toBe(0)
    expect(hour.limits?.ice).toBeGreaterThan(50)
  })

  test('a state kept at an hour and taken up again gives what one run gives', () => {
    const input = scoreExample()
    const poured = [{ at: '2027-01-13T01:10:00Z', layerMm: 3, temperatureC: 6 }]
    const whole = judge({ ...input, poured }, { ...alone, stateAt: '2027-01-13T12:00:00Z' })
    const { at: asOf, state } = whole.sheetState ?? { at: '', state: undefined }
    const stored: unknown = JSON.parse(JSON.stringify(state))
    const later = judge(
      { ...input, poured, hours: input.hours.slice(19), sheet: { ...input.sheet, asOf, state: stored } },
      alone,
    )
    later.hours.forEach((hour, index) => expect(hour.sheet).toEqual(whole.hours[index + 19]?.sheet))
  })

  test('hours before asOf report the sheet as given', () => {
    const sheet = { thicknessMm: 70, temperatureC: -3, snowCoverCm: 0, asOf: timeOf(5) }
    const judgement = judge(inputOf(steadyHours(12), { sheet }), alone)
    for (const hour of [0, 4]) {
      expect(at(judgement, hour).sheet.thicknessMm).toBeCloseTo(70, 6)
      expect(at(judgement, hour).sheet.temperatureC).toBeCloseTo(-3, 6)
    }
    expect(at(judgement, 8).sheet.temperatureC).not.toBeCloseTo(-3, 1)
  })

  test('works at 78° N in the polar night and without sunshine given', () => {
    const hours = steadyHours(48, { shortwaveWm2: null, airTemperatureC: -12 })
    const input = inputOf(hours)
    const judgement = judge({
      ...input,
      rink: { ...input.rink, latitude: 78.2, longitude: 15.6, timeZone: 'Arctic/Longyearbyen' },
    })
    expect(at(judgement, EIGHT_PM).parts?.shortwave).toBe(0)
    expect(judgement.windows.length).toBeGreaterThan(0)
  })
})
