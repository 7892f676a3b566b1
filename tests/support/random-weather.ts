// Seeded weather for tests: any winter, from deep cold to thaw, with snow and rain; the same seed gives the same hours.
import { dewPointFromHumidityC } from '@/lib/physics/humidity'
import type { HourlyRecord } from '@/lib/physics/types'

/** Uniform numbers from a seed (mulberry32). */
export function seeded(seed: number): (from: number, to: number) => number {
  let state = seed | 0
  return (from, to) => {
    state = (state + 0x6d2b79f5) | 0
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state)
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed
    return from + ((to - from) * ((mixed ^ (mixed >>> 14)) >>> 0)) / 4294967296
  }
}

/** Hours of changing weather around a mean temperature, sunshine left to the sun. */
export function randomWeather(seed: number, count: number, meanC?: number): HourlyRecord[] {
  const pick = seeded(seed)
  const mean = meanC ?? pick(-20, 4)
  const swing = pick(1, 7)
  const humidity = pick(0.5, 0.98)
  const wind = pick(0, 8)
  const cloud = pick(0, 1)
  const wet = pick(0, 0.3)
  return Array.from({ length: count }, (_, hour) => {
    const airTemperatureC = mean + swing * Math.sin(((hour + 3) / 24) * 2 * Math.PI) + pick(-1, 1)
    const precipitationMm = pick(0, 1) < wet ? pick(0, 2) : 0
    return {
      time: new Date(Date.UTC(2027, 0, 10, hour)).toISOString(),
      airTemperatureC,
      dewPointC: dewPointFromHumidityC(airTemperatureC, humidity),
      windSpeedMps: Math.max(0, wind + pick(-2, 2)),
      windGustMps: null,
      cloudCover: Math.min(1, Math.max(0, cloud + pick(-0.4, 0.4))),
      shortwaveWm2: null,
      precipitationMm,
      rainMm: null,
      snowfallCm: null,
      pressureHpa: 1005,
    }
  })
}

/** Hours of one night without sun or precipitation. */
export function randomNight(seed: number, count: number, meanC?: number): HourlyRecord[] {
  return randomWeather(seed, count, meanC).map((record) => ({
    ...record,
    shortwaveWm2: 0,
    precipitationMm: 0,
    rainMm: 0,
    snowfallCm: 0,
  }))
}
