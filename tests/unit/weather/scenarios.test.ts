// The made-up nights are what their names say, wherever and whenever they are asked for.
import { describe, expect, test } from 'vitest'
import { weatherAt, type Weather } from '@/fakes/weather/generate'
import { snapToGrid, solarOffsetHours, tonightOf } from '@/fakes/weather/place'
import { SCENARIOS, type ScenarioName } from '@/fakes/weather/scenarios'
import { DAY_MILLIS } from '@/lib/physics/constants'

const PLACES = [
  { name: 'Ontario', latitude: 45.9, longitude: -77.3 },
  { name: 'Minnesota', latitude: 46.5, longitude: -94.25 },
  { name: 'Finland', latitude: 62.2, longitude: 25.7 },
  { name: 'Hokkaido', latitude: 43.8, longitude: 142.4 },
]

/** Weather by clock hour of tonight: 12 is noon, 24 midnight, 35 eleven next morning; 48 and on are later nights. */
function nightOf(
  scenario: ScenarioName,
  place: { latitude: number; longitude: number },
  nowMs = Date.UTC(2027, 0, 12, 12),
) {
  const onGrid = snapToGrid(place.latitude, place.longitude)
  const tonight = tonightOf(nowMs, onGrid)
  return (clockHour: number) =>
    weatherAt({ scenario, place: onGrid, tonight }, 24 * tonight + clockHour - solarOffsetHours(onGrid))
}

function between(read: (hour: number) => Weather | null, from: number, to: number): Weather[] {
  return Array.from({ length: to - from }, (_, index) => read(from + index)).filter((weather) => weather !== null)
}

describe.each(PLACES)('in $name', (place) => {
  test('a clear cold night is cold, clear and calm until 2 am, with snow from 5 to 10', () => {
    const night = nightOf('clear-cold-night', place)
    for (const weather of between(night, 20, 26)) {
      expect(weather.temperatureC).toBeGreaterThan(-11)
      expect(weather.temperatureC).toBeLessThan(-7.5)
      expect(weather.cloud).toBeLessThan(0.15)
      expect(weather.windMps).toBeLessThan(2.6)
      expect(weather.shortwaveWm2).toBe(0)
    }
    expect(between(night, 12, 29).every((weather) => weather.snowCm === 0 && weather.rainMm === 0)).toBe(true)
    expect(between(night, 29, 34).every((weather) => weather.snowCm >= 0.4)).toBe(true)
    expect(between(night, 34, 36).every((weather) => weather.snowCm === 0)).toBe(true)
    expect(between(night, -12, 12).every((weather) => weather.snowCm === 0 && weather.temperatureC < 0)).toBe(true)
  })

  test('a thaw stays above zero day and night for three days, and cold comes back', () => {
    const night = nightOf('thaw-three-days', place)
    for (const weather of between(night, 12, 12 + 72)) expect(weather.temperatureC).toBeGreaterThan(0)
    expect(Math.min(...between(night, 84, 36 + 96).map((weather) => weather.temperatureC))).toBeLessThan(-8)
  })

  test('cold and cloudy is both', () => {
    for (const weather of between(nightOf('cold-and-cloudy', place), 18, 32)) {
      expect(weather.cloud).toBeGreaterThan(0.9)
      expect(weather.temperatureC).toBeLessThan(-3)
    }
  })

  test('snow at 5 am is dry before and heavy after', () => {
    const night = nightOf('snow-at-5am', place)
    expect(between(night, 12, 29).every((weather) => weather.snowCm === 0)).toBe(true)
    expect(between(night, 29, 35).reduce((sum, weather) => sum + weather.snowCm, 0)).toBeGreaterThan(10)
  })

  test('rain into freeze rains at first, some of it below zero, and ends hard', () => {
    const night = nightOf('rain-into-freeze', place)
    expect(between(night, 12, 21).every((weather) => weather.rainMm > 0.5)).toBe(true)
    expect(between(night, 21, 23).some((weather) => weather.rainMm > 0 && weather.temperatureC < 0)).toBe(true)
    expect(between(night, 23, 36).every((weather) => weather.rainMm === 0)).toBe(true)
    expect(night(31)?.temperatureC).toBeLessThan(-9)
  })

  test('deep cold and wind are extreme', () => {
    expect(nightOf('deep-cold', place)(30)?.temperatureC).toBeLessThan(-28)
    for (const weather of between(nightOf('windy', place), 16, 32)) expect(weather.gustMps).toBeGreaterThan(14)
  })

  test('the gap is a gap of one hour at 8 pm and of five from 11 pm', () => {
    const night = nightOf('gap-of-nulls', place)
    const unknown = Array.from({ length: 24 }, (_, index) => 12 + index).filter((hour) => night(hour) === null)
    expect(unknown).toEqual([20, 23, 24, 25, 26, 27])
  })
})

describe('every scenario', () => {
  test.each(Object.keys(SCENARIOS) as ScenarioName[])(
    '%s is plausible at every hour of ten days and tells it twice alike',
    (scenario) => {
      const place = snapToGrid(46.5, -94.25)
      const tonight = tonightOf(Date.UTC(2027, 0, 12, 22), place)
      for (let hour = 24 * tonight - 24; hour < 24 * tonight + 264; hour++) {
        const weather = weatherAt({ scenario, place, tonight }, hour)
        expect(weatherAt({ scenario, place, tonight }, hour)).toEqual(weather)
        if (!weather) continue
        expect(weather.humidity).toBeGreaterThan(0.3)
        expect(weather.humidity).toBeLessThanOrEqual(1)
        expect(weather.gustMps).toBeGreaterThan(weather.windMps)
        expect(weather.pressureMslHpa).toBeGreaterThan(980)
        expect(weather.pressureMslHpa).toBeLessThan(1050)
        expect(weather.snowCm > 0 && weather.temperatureC > 1).toBe(false)
        // The sun stays under 25° at this place in January: 910 sin 25° - 30 = 355 W/m².
        expect(weather.shortwaveWm2).toBeLessThan(355)
        if (!weather.sunUp) expect(weather.shortwaveWm2).toBeLessThan(60)
      }
    },
  )
})

test('tonight turns at six in the morning of the place', () => {
  const place = { longitude: -94.25 } // six hours behind
  const day = Math.floor(Date.UTC(2027, 0, 12) / DAY_MILLIS)
  expect(tonightOf(Date.UTC(2027, 0, 12, 11, 59), place)).toBe(day - 1)
  expect(tonightOf(Date.UTC(2027, 0, 12, 12, 0), place)).toBe(day)
  expect(tonightOf(Date.UTC(2027, 0, 13, 5, 59), place)).toBe(day)
})
