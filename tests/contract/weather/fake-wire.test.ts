// The fake writes what the service writes: shapes, units, decimals, complaints; and does as it is told.
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest'
import { startWeatherFake, type WeatherFake } from '@/fakes/weather/server'

let fake: WeatherFake
beforeAll(async () => {
  fake = await startWeatherFake({ port: 0 })
})
afterAll(() => fake.close())
beforeEach(async () => {
  await post('scenario', { scenario: 'clear-cold-night' })
  await post('clock', { now: '2027-01-12T21:42:00Z' })
})

interface Body {
  latitude: number
  longitude: number
  location_id?: number
  utc_offset_seconds: number
  timezone_abbreviation: string
  reason?: string
  hourly_units: Record<string, string>
  hourly: Record<string, (number | null)[]> & { time: (string | number)[] }
}

async function ask<T = Body>(query: string, path = '/v1/forecast'): Promise<{ status: number; text: string; body: T }> {
  const response = await fetch(`${fake.url}${path}?${query}`)
  const text = await response.text()
  return { status: response.status, text, body: JSON.parse(text) as T }
}

async function post(what: string, body: object) {
  const response = await fetch(`${fake.url}/__fake/${what}`, { method: 'POST', body: JSON.stringify(body) })
  return response.status
}

const ALL_UNITS =
  'temperature_2m,wind_speed_10m,precipitation,snowfall,snow_depth,surface_pressure,shortwave_radiation,is_day'

describe('wire', () => {
  test('defaults are km/h, local text times and seven days from midnight', async () => {
    const { body } = await ask(`latitude=46.5&longitude=-94.25&hourly=${ALL_UNITS}&timezone=America/Chicago`)
    expect(body.hourly_units).toEqual({
      time: 'iso8601',
      temperature_2m: '°C',
      wind_speed_10m: 'km/h',
      precipitation: 'mm',
      snowfall: 'cm',
      snow_depth: 'm',
      surface_pressure: 'hPa',
      shortwave_radiation: 'W/m²',
      is_day: '',
    })
    expect(body.hourly.time).toHaveLength(168)
    expect(body.hourly.time[0]).toBe('2027-01-12T00:00')
    expect(body).toMatchObject({ utc_offset_seconds: -21600, timezone_abbreviation: 'GMT-6' })
  })

  test('decimals are fixed', async () => {
    const { text } = await ask('latitude=46.5&longitude=-94.25&hourly=temperature_2m,rain,cloud_cover&forecast_hours=4')
    expect(text).toMatch(/"temperature_2m":\[-?\d+\.\d,/)
    expect(text).toMatch(/"rain":\[0\.00,0\.00,0\.00,0\.00\]/)
    expect(text).toMatch(/"cloud_cover":\[\d+,\d+,\d+,\d+\]/)
  })

  test('units follow the parameters', async () => {
    const query =
      'latitude=46.5&longitude=-94.25&hourly=temperature_2m,wind_speed_10m,precipitation,snow_depth&forecast_hours=2'
    const { body } = await ask(
      `${query}&temperature_unit=fahrenheit&wind_speed_unit=mph&precipitation_unit=inch&timeformat=unixtime`,
    )
    expect(body.hourly_units).toEqual({
      time: 'unixtime',
      temperature_2m: '°F',
      wind_speed_10m: 'mp/h',
      precipitation: 'inch',
      snow_depth: 'ft',
    })
    expect(body.hourly.time).toEqual([Date.UTC(2027, 0, 12, 21) / 1000, Date.UTC(2027, 0, 12, 22) / 1000])
  })

  test('two places make an array, of which the first has no index', async () => {
    const { body } = await ask<Body[]>(
      'latitude=46.5,45.42&longitude=-94.25,-75.69&hourly=temperature_2m&forecast_hours=1',
    )
    expect(body.map((place) => place.location_id)).toEqual([undefined, 1])
    expect(body[0]?.latitude).not.toBe(46.5)
    expect(Math.abs((body[0]?.latitude ?? 0) - 46.5)).toBeLessThan(0.02)
  })

  test('a variable that the model lacks is undefined and empty, a variable that does not exist is refused', async () => {
    const { body } = await ask('latitude=46.5&longitude=-94.25&hourly=soil_temperature_18cm&forecast_hours=2')
    expect(body.hourly_units.soil_temperature_18cm).toBe('undefined')
    expect(body.hourly.soil_temperature_18cm).toEqual([null, null])
    const refused = await ask('latitude=46.5&longitude=-94.25&hourly=tempeture_2m')
    expect(refused.status).toBe(400)
    expect(refused.body.reason).toMatch(/from invalid String value tempeture_2m\.$/)
  })

  test.each([
    ['latitude=522.52&longitude=1', 'Latitude must be in range of -90 to 90°. Given: 522.52.'],
    ['latitude=1,2&longitude=3', "Parameter 'latitude' and 'longitude' must have the same number of elements"],
    ['latitude=1&longitude=1&past_days=400', 'Past days is invalid. Allowed range 0 to 93. Given 400.'],
  ])('%s is refused in the service’s words', async (query, reason) => {
    const { status, body } = await ask(`${query}&hourly=temperature_2m`)
    expect({ status, reason: body.reason }).toEqual({ status: 400, reason })
  })

  test('no hourly list gives the head alone, and no answer speaks of caches', async () => {
    expect((await ask('latitude=46.5&longitude=-94.25')).body).not.toHaveProperty('hourly')
    const { headers } = await fetch(`${fake.url}/v1/forecast?latitude=46.5&longitude=-94.25`)
    for (const name of ['etag', 'expires', 'cache-control', 'last-modified']) expect(headers.get(name)).toBeNull()
    expect(headers.get('content-type')).toBe('application/json; charset=utf-8')
  })

  test('hours past the end of the model are null and the length stays', async () => {
    await post('scenario', { scenario: 'gap-of-nulls' })
    const { body } = await ask('latitude=46.5&longitude=-94.25&hourly=temperature_2m&forecast_hours=168')
    expect(body.hourly.temperature_2m).toHaveLength(168)
    expect(body.hourly.temperature_2m?.slice(121).every((value) => value === null)).toBe(true)
    expect(body.hourly.temperature_2m?.slice(48, 120).every((value) => value !== null)).toBe(true)
  })

  test('members carry their number, and models their present name when there are two', async () => {
    const one = await ask(
      'latitude=46.5&longitude=-94.25&hourly=temperature_2m&models=gfs025&forecast_hours=2',
      '/v1/ensemble',
    )
    const keys = Object.keys(one.body.hourly)
    expect(keys).toHaveLength(32)
    expect([keys[1], keys[2], keys[31]]).toEqual([
      'temperature_2m',
      'temperature_2m_member01',
      'temperature_2m_member30',
    ])
    const two = await ask(
      'latitude=46.5&longitude=-94.25&hourly=temperature_2m&models=gfs025,gem_global&forecast_hours=2',
      '/v1/ensemble',
    )
    expect(Object.keys(two.body.hourly)).toContain('temperature_2m_member20_gem_global_ensemble')
    expect(Object.keys(two.body.hourly)).toContain('temperature_2m_ncep_gefs025')
  })
})

describe('control', () => {
  const temperatures = async (latitude: number) =>
    (await ask(`latitude=${latitude}&longitude=-94.25&hourly=temperature_2m&forecast_hours=12`)).body.hourly
      .temperature_2m

  test('a scenario can be set for one place', async () => {
    expect(await post('scenario', { scenario: 'thaw-three-days', latitude: 46.5, longitude: -94.25 })).toBe(200)
    expect((await temperatures(46.51))?.every((value) => (value ?? 0) > 0)).toBe(true)
    expect((await temperatures(47.5))?.every((value) => (value ?? 0) < 0)).toBe(true)
  })

  test('an unknown scenario, half a place, an unknown fault and no JSON at all are refused', async () => {
    expect(await post('scenario', { scenario: 'hail' })).toBe(400)
    expect(await post('scenario', { scenario: 'windy', latitude: 46.5 })).toBe(400)
    expect(await post('fault', { kind: 'mood' })).toBe(400)
    const broken = await fetch(`${fake.url}/__fake/fault`, { method: 'POST', body: '{"kind":' })
    expect(broken.status).toBe(400)
  })

  test('the page shows the weather told and the requests, and its buttons work without a script', async () => {
    const form = new URLSearchParams({ scenario: 'deep-cold', latitude: '', longitude: '' })
    const set = await fetch(`${fake.url}/__fake/scenario`, { method: 'POST', body: form, redirect: 'manual' })
    expect([set.status, set.headers.get('location')]).toEqual([303, '/'])
    await ask('latitude=46.5&longitude=-94.25&hourly=temperature_2m<b>')
    const page = await (await fetch(fake.url)).text()
    expect(page).toMatch(/Deep cold<\/td>.*<b>told now<\/b>/)
    expect(page).toContain('hourly=temperature_2m&lt;b&gt;')
  })
})
