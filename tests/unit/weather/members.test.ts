// How one run of an ensemble becomes a full series of hours.
import { expect, test } from 'vitest'
import type { HourlyRecord } from '@/lib/physics/types'
import { ensembleUnitOf, toMembers } from '@/lib/weather/open-meteo/members'
import { WeatherError } from '@/lib/weather/port'

const FIRST = Date.UTC(2027, 0, 12, 18) / 1000
const LABELS = 30

const hours: HourlyRecord[] = Array.from({ length: 40 }, (_, index) => ({
  time: new Date((FIRST + 3600 * index) * 1000).toISOString().replace('.000Z', 'Z'),
  airTemperatureC: -4,
  dewPointC: -6,
  windSpeedMps: 2,
  windGustMps: 3,
  cloudCover: 0.2,
  shortwaveWm2: 10,
  precipitationMm: 0,
  rainMm: 0,
  snowfallCm: 0,
  pressureHpa: 990,
}))

function bodyOf(memberCount: number, change: Record<string, (number | null)[]> = {}) {
  const columns: Record<string, (number | null)[]> = {}
  for (let member = 0; member < memberCount; member++) {
    const suffix = member ? `_member${String(member).padStart(2, '0')}` : ''
    columns[`temperature_2m${suffix}`] = Array(LABELS).fill(-4)
    columns[`wind_speed_10m${suffix}`] = Array(LABELS).fill(2)
    columns[`cloud_cover${suffix}`] = Array(LABELS).fill(20)
    columns[`precipitation${suffix}`] = Array(LABELS).fill(0)
  }
  const times = Array.from({ length: LABELS }, (_, index) => FIRST + 3600 * index)
  return { times, columns: { ...columns, ...change } }
}

const at = (index: number, value: number, flat: number) =>
  Array.from({ length: LABELS }, (_, i) => (i === index ? value : flat))

test('a run brings its own temperature, wind, cloud and snow and takes the rest from the forecast', () => {
  const members = toMembers(
    bodyOf(20, {
      temperature_2m_member03: at(5, -7, -4),
      wind_speed_10m_member03: at(5, 4.5, 2),
      cloud_cover_member03: at(5, 90, 20),
      precipitation_member03: at(6, 1, 0), // under the label at the end of its hour
    }),
    hours,
  )
  expect(members).toHaveLength(20)
  expect(members[3]?.[5]).toEqual({
    ...hours[5],
    airTemperatureC: -7,
    dewPointC: -9, // as dry relative to the air as before
    windSpeedMps: 4.5,
    windGustMps: 4.5,
    cloudCover: 0.9,
    precipitationMm: 1,
    rainMm: 0,
    snowfallCm: 0.7,
  })
  expect(members[3]?.[4]).toEqual(hours[4])
})

test('above zero it rains', () => {
  const members = toMembers(bodyOf(15, { temperature_2m: at(5, 0.5, -4), precipitation: at(6, 1, 0) }), hours)
  expect(members[0]?.[5]).toMatchObject({ precipitationMm: 1, rainMm: 1, snowfallCm: 0 })
})

test('hours that the ensemble does not reach are those of the forecast', () => {
  const members = toMembers(bodyOf(15), hours)
  expect(members[7]).toHaveLength(40)
  expect(members[7]?.[35]).toEqual(hours[35])
})

test('an empty run is left out, and too few runs are refused', () => {
  const empty = Array<number | null>(LABELS).fill(null)
  expect(toMembers(bodyOf(16, { temperature_2m_member02: empty }), hours)).toHaveLength(15)
  expect(() => toMembers(bodyOf(15, { temperature_2m_member02: empty }), hours)).toThrow(WeatherError)
})

test('runs of two models are told apart', () => {
  const one = bodyOf(15)
  const columns = Object.fromEntries(
    Object.entries(one.columns).flatMap(([name, column]) => [
      [`${name}_ncep_gefs025`, column],
      [`${name}_gem_global_ensemble`, column],
    ]),
  )
  expect(toMembers({ times: one.times, columns }, hours)).toHaveLength(30)
})

test.each([
  ['temperature_2m', '°C'],
  ['wind_speed_10m_member07', 'm/s'],
  ['precipitation_member30_gem_global_ensemble', 'mm'],
  ['snow_depth', null],
])('the unit of %s is %s', (column, unit) => {
  expect(ensembleUnitOf(column)).toBe(unit)
})
