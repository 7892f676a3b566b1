// The sheet: energy and mass are kept, a stored sheet goes on where it stopped, and thaw and frost do what they must.
import { describe, expect, test } from 'vitest'
import { advanceSheet, advanceSheetPart, clearSnow, createSheet, pourLayer, reportSheet } from '@/lib/physics/sheet'
import { FUSION_J_PER_KG, WATER_HEAT_CAPACITY } from '@/lib/physics/constants'
import { prepareHours } from '@/lib/physics/prepare'
import { runHour } from '@/lib/physics/sheet-hour'
import { randomWeather, seeded } from '../../support/random-weather'
import { steadyHour, steadyHours } from '@/lib/validation/steady-hours'
import type { SheetState } from '@/lib/physics/sheet'

const SITE = { latitudeDeg: 46, longitudeDeg: -77, shelter: 0.6, skyView: 0.85 }
const WEEK = 168

function randomSheet(seed: number): SheetState {
  const pick = seeded(seed)
  const isFloating = pick(0, 1) < 0.4
  return createSheet({
    thicknessMm: pick(0, 1) < 0.2 ? 0 : pick(1, 300),
    temperatureC: pick(-15, 0),
    snowCoverCm: pick(0, 1) < 0.3 ? pick(0, 12) : 0,
    liquidMm: pick(0, 1) < 0.3 ? pick(0, 8) : 0,
    unfrozenBelowMm: isFloating ? pick(20, 1500) : 0,
    waterTemperatureC: isFloating ? pick(0, 8) : 0,
    base: 'liner',
  })
}

/** All that is in and on the sheet and in the water below; 0 for liquid water at 0 °C. [J/m²] */
function sheetEnthalpyJM2(state: SheetState): number {
  const inCells = state.enthalpyJM2.reduce((sum, one) => sum + one, 0)
  return inCells - FUSION_J_PER_KG * state.snowKgM2 + state.belowKgM2 * WATER_HEAT_CAPACITY * state.belowTemperatureC
}

describe('conservation', () => {
  test.each(Array.from({ length: 60 }, (_, seed) => seed))(
    'energy over random week %i closes to a thousandth',
    (seed) => {
      let state = randomSheet(seed)
      let received = 0
      let turnedOver = 0
      const start = sheetEnthalpyJM2(state)
      for (const hour of prepareHours(randomWeather(seed, WEEK), SITE)) {
        const result = runHour(state, hour)
        received += result.receivedJM2
        turnedOver += Math.abs(result.receivedJM2)
        state = result.state
      }
      const error = Math.abs(sheetEnthalpyJM2(state) - start - received)
      expect(error).toBeLessThan(0.001 * Math.max(turnedOver, 1000))
    },
  )

  test('a poured layer brings its mass and its warmth and nothing else', () => {
    const before = createSheet({ thicknessMm: 80, temperatureC: -4, snowCoverCm: 0, base: 'liner' })
    const after = pourLayer(before, { layerMm: 3, temperatureC: 8 })
    // 3 kg/m² at 8 °C with 4200 J/kgK.
    expect(sheetEnthalpyJM2(after) - sheetEnthalpyJM2(before)).toBeCloseTo(3 * 4200 * 8, 3)
    expect(reportSheet(after).liquidMm).toBeCloseTo(3, 9)
  })
})

describe('resuming', () => {
  test.each([1, 2, 3, 4, 5])('run %i in two parts through stored text equals the run in one go', (seed) => {
    const hours = prepareHours(randomWeather(seed, 96), SITE)
    const whole = hours.reduce(advanceSheet, randomSheet(seed + 100))
    const half = hours.slice(0, 48).reduce(advanceSheet, randomSheet(seed + 100))
    const stored = JSON.parse(JSON.stringify(half)) as SheetState
    expect(hours.slice(48).reduce(advanceSheet, stored)).toEqual(whole)
  })

  test('a wet hour in two parts freezes what it freezes in one, to a hundredth of a millimetre', () => {
    const hour = { ...steadyHour({ airTemperatureC: -8 }) }
    const bare = createSheet({ thicknessMm: 80, temperatureC: -4, snowCoverCm: 0, base: 'liner' })
    const wet = pourLayer(bare, { layerMm: 3, temperatureC: 6 })
    const whole = reportSheet(advanceSheet(wet, hour))
    const parts = reportSheet(advanceSheetPart(advanceSheetPart(wet, hour, 0.4), hour, 0.6))
    expect(Math.abs(parts.liquidMm - whole.liquidMm)).toBeLessThan(0.01)
    expect(Math.abs(parts.temperatureC - whole.temperatureC)).toBeLessThan(0.05)
    expect(advanceSheetPart(wet, hour, 0)).toBe(wet)
  })

  test('an unknown hour leaves the sheet as it is', () => {
    const state = createSheet({ thicknessMm: 80, temperatureC: -4, snowCoverCm: 0, base: 'liner' })
    expect(advanceSheet(state, { ...steadyHour({ airTemperatureC: -5 }), isKnown: false })).toBe(state)
  })

  test('advancing does not change the state it was given', () => {
    const state = pourLayer(createSheet({ thicknessMm: 80, temperatureC: -4, snowCoverCm: 2, base: 'liner' }), {
      layerMm: 2,
      temperatureC: 5,
    })
    const copy = structuredClone(state)
    advanceSheet(state, steadyHour({ airTemperatureC: -5, precipitationMm: 1, rainMm: 0, snowfallCm: 1 }))
    expect(state).toEqual(copy)
  })
})

describe('what weather does', () => {
  const bare = createSheet({ thicknessMm: 80, temperatureC: -3, snowCoverCm: 0, base: 'liner' })

  test('reports what it was made of', () => {
    const report = reportSheet(
      createSheet({ thicknessMm: 90, temperatureC: -4, snowCoverCm: 3, liquidMm: 2, base: 'liner' }),
    )
    expect(report.thicknessMm).toBeCloseTo(90, 6)
    expect(report.temperatureC).toBeCloseTo(-4, 6)
    expect(report.liquidMm).toBeCloseTo(2, 6)
    expect(report.snowCoverCm).toBe(3)
  })

  test('ice on water is as cold in the mean as it was said to be', () => {
    const report = reportSheet(
      createSheet({ thicknessMm: 90, temperatureC: -4, snowCoverCm: 0, unfrozenBelowMm: 50, base: 'liner' }),
    )
    expect(report.temperatureC).toBeCloseTo(-4, 6)
  })

  test('a cold night cools it and a warm day melts it', () => {
    const cold = steadyHours(12, { airTemperatureC: -15 }).reduce(advanceSheet, bare)
    expect(reportSheet(cold).temperatureC).toBeLessThan(-8)
    const warm = steadyHours(48, { airTemperatureC: 6, windSpeedMps: 4, cloudCover: 1 }).reduce(advanceSheet, bare)
    expect(reportSheet(warm).thicknessMm).toBeLessThan(75)
    expect(reportSheet(warm).liquidMm).toBeGreaterThan(3)
  })

  test('melt water stays and freezes again', () => {
    const thawed = steadyHours(36, { airTemperatureC: 6, windSpeedMps: 4, cloudCover: 1 }).reduce(advanceSheet, bare)
    const frozen = steadyHours(48, { airTemperatureC: -15, windSpeedMps: 4 }).reduce(advanceSheet, thawed)
    expect(reportSheet(frozen).liquidMm).toBe(0)
    expect(reportSheet(frozen).thicknessMm).toBeGreaterThan(reportSheet(thawed).thicknessMm)
  })

  test('what the ground melts under the ice is not water on it', () => {
    const mild = steadyHours(48, { airTemperatureC: -0.5, cloudCover: 1, windSpeedMps: 3 })
    const soft = createSheet({ thicknessMm: 80, temperatureC: 0, snowCoverCm: 0, base: 'liner' })
    const after = reportSheet(mild.reduce(advanceSheet, soft))
    expect(after.liquidMm).toBe(0)
    expect(after.thicknessMm).toBeLessThan(80)
  })

  test('rain adds its water', () => {
    const rained = advanceSheet(bare, steadyHour({ airTemperatureC: 3, precipitationMm: 4, rainMm: 4 }))
    const { thicknessMm, liquidMm } = reportSheet(rained)
    // 80 mm of ice are 73.3 kg/m²; 4 mm of rain make it 77.3, less what the air took or gave as vapour.
    expect(Math.abs((thicknessMm * 916.721) / 1000 + liquidMm - 77.34)).toBeLessThan(0.2)
  })

  test('dry cold air takes ice away slowly', () => {
    const days = steadyHours(240, { airTemperatureC: -8, relativeHumidity: 0.5, windSpeedMps: 4, cloudCover: 1 })
    const lossMm = 80 - reportSheet(days.reduce(advanceSheet, bare)).thicknessMm
    expect(lossMm).toBeGreaterThan(1)
    expect(lossMm).toBeLessThan(15)
  })

  test('snow lies, insulates and can be cleared', () => {
    const snowy = advanceSheet(bare, steadyHour({ airTemperatureC: -6, precipitationMm: 4, rainMm: 0, snowfallCm: 5 }))
    expect(reportSheet(snowy).snowCoverCm).toBeGreaterThan(4.5)
    const night = steadyHours(12, { airTemperatureC: -18 })
    const under = night.reduce(advanceSheet, snowy)
    const cleared = night.reduce(advanceSheet, clearSnow(snowy))
    expect(reportSheet(under).temperatureC).toBeGreaterThan(reportSheet(cleared).temperatureC + 3)
  })

  test('snow on a fresh flood is swallowed', () => {
    const wet = pourLayer(bare, { layerMm: 3, temperatureC: 5 })
    const after = advanceSheet(wet, steadyHour({ airTemperatureC: -2, precipitationMm: 1, rainMm: 0, snowfallCm: 1 }))
    expect(reportSheet(after).snowCoverCm).toBe(0)
  })

  test('measured snow replaces the modelled cover', () => {
    const hour = {
      ...steadyHour({ airTemperatureC: -6, precipitationMm: 3, rainMm: 0, snowfallCm: 4 }),
      snowOnIceCm: 2,
    }
    expect(reportSheet(advanceSheet(bare, hour)).snowCoverCm).toBeCloseTo(2, 1)
  })

  test('a floating sheet grows at its foot by what it loses at its top', () => {
    const afloat = createSheet({
      thicknessMm: 60,
      temperatureC: -4,
      snowCoverCm: 0,
      unfrozenBelowMm: 500,
      base: 'liner',
    })
    const grown = steadyHours(24, { airTemperatureC: -12 }).reduce(advanceSheet, afloat)
    expect(reportSheet(grown).thicknessMm).toBeGreaterThan(75)
    expect(grown.belowKgM2).toBeLessThan(500)
    expect(FUSION_J_PER_KG * (500 - grown.belowKgM2)).toBeGreaterThan(5e6)
  })
})

describe('bad input', () => {
  const good = { thicknessMm: 80, temperatureC: -4, snowCoverCm: 0, base: 'liner' as const }
  test.each([
    { ...good, thicknessMm: -1 },
    { ...good, thicknessMm: Number.NaN },
    { ...good, temperatureC: 60 },
    { ...good, snowCoverCm: -2 },
    { ...good, unfrozenBelowMm: -5 },
  ])('%o is refused', (sheet) => expect(() => createSheet(sheet)).toThrow(RangeError))
  test('a layer of no depth or boiling water is refused', () => {
    expect(() => pourLayer(createSheet(good), { layerMm: -1, temperatureC: 5 })).toThrow(RangeError)
    expect(() => pourLayer(createSheet(good), { layerMm: 3, temperatureC: 130 })).toThrow(RangeError)
  })
})
