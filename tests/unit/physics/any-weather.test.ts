// Weather at the edges of what prepareHours takes: whatever comes, numbers stay numbers and ice stays below 0 °C.
import { expect, test } from 'vitest'
import { advanceSheet, clearSnow, createSheet, pourLayer, reportSheet } from '@/lib/physics/sheet'
import { minutesToSet } from '@/lib/physics/layer'
import { prepareHours } from '@/lib/physics/prepare'
import { seeded } from '../../support/random-weather'
import type { HourlyRecord } from '@/lib/physics/types'

const RUNS = 250
const BASES = ['liner', 'ground', 'snow'] as const

function wildWeather(seed: number): HourlyRecord[] {
  const pick = seeded(seed)
  const maybe = (share: number, from: number, to: number) => (pick(0, 1) < share ? pick(from, to) : null)
  const mean = pick(-60, 50)
  const isWild = pick(0, 1) < 0.3
  return Array.from({ length: 60 }, (_, hour) => {
    const airTemperatureC = Math.max(-60, Math.min(50, isWild ? pick(-60, 50) : mean + pick(-5, 5)))
    return {
      time: new Date(Date.UTC(2027, 0, 10, hour)).toISOString(),
      airTemperatureC: pick(0, 1) < 0.02 ? null : airTemperatureC,
      dewPointC: Math.max(-80, airTemperatureC - pick(0, 30)),
      windSpeedMps: pick(0, 75) * pick(0, 1),
      windGustMps: maybe(0.5, 0, 100),
      cloudCover: pick(0, 1),
      shortwaveWm2: maybe(0.5, 0, 1200),
      precipitationMm: maybe(0.2, 0, 50) ?? 0,
      rainMm: maybe(0.5, 0, 10),
      snowfallCm: maybe(0.5, 0, 20),
      pressureHpa: pick(400, 1100),
      longwaveDownWm2: maybe(0.5, 60, 550),
      snowOnIceCm: maybe(0.1, 0, 50),
    }
  })
}

test.each(Array.from({ length: RUNS / 50 }, (_, block) => block * 50))('runs from %i on stay sound', (first) => {
  for (let seed = first; seed < first + 50; seed++) {
    const pick = seeded(seed + 31)
    const site = { latitudeDeg: pick(-90, 90), longitudeDeg: pick(-180, 180), shelter: pick(0, 1), skyView: pick(0, 1) }
    const hours = prepareHours(wildWeather(seed), site)
    let state = createSheet({
      thicknessMm: pick(0, 1) < 0.2 ? 0 : pick(0, 400),
      temperatureC: pick(-50, 5),
      snowCoverCm: pick(0, 60),
      liquidMm: pick(0, 30),
      unfrozenBelowMm: pick(0, 1) < 0.5 ? 0 : pick(0, 3000),
      waterTemperatureC: pick(0, 30),
      base: BASES[Math.floor(pick(0, 2.99))]!,
    })
    hours.forEach((hour, index) => {
      if (index % 17 === 5) state = pourLayer(state, { layerMm: pick(0.01, 60), temperatureC: pick(0, 100) })
      if (index % 29 === 3) state = clearSnow(state)
      const layer = { layerMm: pick(0.01, 60), temperatureC: pick(0, 100) }
      expect(minutesToSet(state, hours, index, pick(0, 0.99), layer) ?? 0).toBeGreaterThanOrEqual(0)
      state = advanceSheet(state, hour)
      const { thicknessMm, temperatureC, liquidMm, snowCoverCm } = reportSheet(state)
      expect(thicknessMm).toBeGreaterThanOrEqual(-1e-9)
      expect(temperatureC).toBeGreaterThan(-90)
      expect(temperatureC).toBeLessThanOrEqual(1e-6)
      expect(liquidMm).toBeGreaterThanOrEqual(-1e-9)
      expect(snowCoverCm).toBeGreaterThanOrEqual(0)
    })
  }
})
