// Weather and rinks for tests of the advice: steady hours, and random but physical ones.
import fc from 'fast-check'
import type { JudgeInput } from '@/lib/advice/types'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { HourlyRecord } from '@/lib/physics/types'

/** Noon in Toronto. */
export const FIRST_MILLIS = Date.parse('2027-01-12T17:00:00Z')

export const timeOf = (hour: number) => new Date(FIRST_MILLIS + hour * HOUR_MILLIS).toISOString().replace('.000Z', 'Z')

/** A clear, dry, calm night unless told otherwise; no sun, so that every hour is night. */
export function hourOf(hour: number, given: Partial<HourlyRecord> = {}): HourlyRecord {
  const airTemperatureC = given.airTemperatureC ?? -8
  return {
    time: timeOf(hour),
    airTemperatureC,
    dewPointC: airTemperatureC - 4,
    windSpeedMps: 2,
    windGustMps: 3,
    cloudCover: 0.05,
    shortwaveWm2: 0,
    precipitationMm: 0,
    rainMm: 0,
    snowfallCm: 0,
    pressureHpa: 1008,
    ...given,
  }
}

export function steadyHours(count: number, given: Partial<HourlyRecord> = {}): HourlyRecord[] {
  return Array.from({ length: count }, (_, hour) => hourOf(hour, given))
}

export function inputOf(hours: HourlyRecord[], given: Partial<JudgeInput> = {}): JudgeInput {
  return {
    now: hours[0]?.time ?? timeOf(0),
    rink: {
      latitude: 45.9,
      longitude: -77.3,
      timeZone: 'America/Toronto',
      lengthM: 10,
      widthM: 10,
      shelter: 'suburban',
      skyView: 0.85,
      base: 'liner',
      phase: 'skating',
    },
    water: { temperatureC: 6, flowLPerMin: 25, layerMm: 3, fillDepthMm: 120 },
    sheet: { thicknessMm: 90, temperatureC: -4, snowCoverCm: 0 },
    available: [{ from: '17:00', to: '01:00' }],
    maxPasses: 3,
    hours,
    ...given,
  }
}

/** Readings come to a tenth, as services give them. */
const reading = (low: number, high: number) =>
  fc.integer({ min: Math.round(low * 10), max: Math.round(high * 10) }).map((tenths) => tenths / 10)

const hourArbitrary = fc.record({
  airTemperatureC: reading(-30, 12),
  spread: reading(0, 12),
  windSpeedMps: reading(0, 15),
  cloudCover: fc.integer({ min: 0, max: 100 }).map((percent) => percent / 100),
  shortwaveWm2: fc.oneof(fc.constant(0), reading(0, 600)),
  precipitationMm: fc.oneof({ weight: 4, arbitrary: fc.constant(0) }, { weight: 1, arbitrary: reading(0.1, 4) }),
  isMissing: fc.integer({ min: 0, max: 11 }).map((roll) => roll === 0),
})

/** Random hours, one in twelve of them missing. */
export const randomHours = (count: number) =>
  fc.array(hourArbitrary, { minLength: count, maxLength: count }).map((rows) =>
    rows.map(({ spread, isMissing, ...row }, hour): HourlyRecord => {
      const dewPointC = Math.max(-60, row.airTemperatureC - spread)
      const known = { ...row, dewPointC, windGustMps: row.windSpeedMps * 1.5, rainMm: null, snowfallCm: null }
      return isMissing ? missingHour(hour) : hourOf(hour, known)
    }),
  )

export function missingHour(hour: number): HourlyRecord {
  return {
    time: timeOf(hour),
    airTemperatureC: null,
    dewPointC: null,
    windSpeedMps: null,
    windGustMps: null,
    cloudCover: null,
    shortwaveWm2: null,
    precipitationMm: null,
    rainMm: null,
    snowfallCm: null,
    pressureHpa: null,
  }
}

export const randomRink = fc.record({
  phase: fc.constantFrom('planning', 'waiting', 'filling', 'freezing', 'skating', 'thaw', 'closed') as fc.Arbitrary<
    JudgeInput['rink']['phase']
  >,
  base: fc.constantFrom('liner', 'ground', 'snow') as fc.Arbitrary<JudgeInput['rink']['base']>,
  thicknessMm: fc.constantFrom(0, 8, 40, 90, 200),
  temperatureC: reading(-15, 0),
  snowCoverCm: fc.constantFrom(0, 0, 2, 12),
  layerMm: reading(0.5, 8),
  waterC: reading(0.5, 60),
})

/** A random rink under random weather. */
export const randomInput = (hourCount: number) =>
  fc.tuple(randomHours(hourCount), randomRink).map(([hours, rink]) => {
    const base = inputOf(hours)
    return inputOf(hours, {
      rink: { ...base.rink, phase: rink.phase, base: rink.base },
      water: { ...base.water, layerMm: rink.layerMm, temperatureC: rink.waterC },
      sheet: { thicknessMm: rink.thicknessMm, temperatureC: rink.temperatureC, snowCoverCm: rink.snowCoverCm },
      available: [{ from: '00:00', to: '00:00' }],
    })
  })
