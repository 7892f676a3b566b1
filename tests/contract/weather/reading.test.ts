// One reading of Open-Meteo bodies, whoever wrote them: by hand, the service's shape as recorded, the fake.
import { existsSync, readFileSync } from 'node:fs'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { startWeatherFake, type WeatherFake } from '@/fakes/weather/server'
import { createOpenMeteo } from '@/lib/weather/open-meteo'
import type { Forecast } from '@/lib/weather/port'
import { startCannedServer, type CannedServer } from './canned-server'
import { TYPED_NOW, typedBody, typedColumn } from './typed-body'

const SAMPLE = '../shared/weather/samples/open-meteo.forecast.unixtime.json'
const CELL = { latitudeDeg: 46.5, longitudeDeg: -94.25 }
const hasSample = existsSync(SAMPLE)
if (!hasSample) console.info(`Skipped: ${SAMPLE} is not here`)

const servers: CannedServer[] = []
afterAll(() => Promise.all(servers.map((server) => server.close())))

async function fetchCanned(body: string, now: Date): Promise<Forecast> {
  const server = await startCannedServer({ status: 200, body })
  servers.push(server)
  return createOpenMeteo({ baseUrl: server.url, userAgent: 'test', retryDelayMs: 1 }).fetchHourly(CELL, { now })
}

function hourAt(forecast: Forecast, time: string) {
  const hour = forecast.hours.find((candidate) => candidate.time === time)
  if (!hour) throw new Error(`no hour ${time}`)
  return hour
}

function expectWholeSeries(forecast: Forecast, now: Date) {
  forecast.hours.forEach((hour, index) => {
    expect(hour.time).toMatch(/^\d{4}-\d\d-\d\dT\d\d:00:00Z$/)
    const previous = forecast.hours[index - 1]
    if (previous) expect(Date.parse(hour.time) - Date.parse(previous.time)).toBe(3_600_000)
  })
  expect(forecast.provider).toBe('open-meteo')
  expect(forecast.issuedAt).toBeNull()
  expect(forecast.fetchedAt).toEqual(now)
  expect(forecast.expiresAt.getTime() - now.getTime()).toBe(6 * 3_600_000)
  expect(forecast.attribution.url).toBe('https://open-meteo.com/')
}

// The worked hour: state from the label 04, gust, rain and snow from the label 05.
const workedHour = {
  time: '2027-01-13T04:00:00Z',
  airTemperatureC: -9.8,
  dewPointC: -11.1,
  windSpeedMps: 3.11,
  windGustMps: 6.35,
  cloudCover: 0.97,
  shortwaveWm2: 0,
  precipitationMm: 0.6,
  rainMm: 0,
  snowfallCm: 0.42,
  pressureHpa: 971.5,
}

test('the fields that the source can fill are the fields of its hours', async () => {
  const { hours } = await fetchCanned(typedBody(), TYPED_NOW)
  const { fields } = createOpenMeteo({ baseUrl: 'http://127.0.0.1:1', userAgent: 'test' })
  expect(new Set(Object.keys(hours[0] ?? {}))).toEqual(fields)
})

describe('the worked hour 2027-01-13T04:00Z', () => {
  test('is read from a body typed by hand', async () => {
    const forecast = await fetchCanned(typedBody(), TYPED_NOW)
    expectWholeSeries(forecast, TYPED_NOW)
    expect(forecast.hours).toHaveLength(25)
    expect(hourAt(forecast, workedHour.time)).toEqual(workedHour)
    expect(hourAt(forecast, '2027-01-13T05:00:00Z')).toMatchObject({
      precipitationMm: 0,
      snowfallCm: 0,
      windGustMps: 2,
    })
  })

  test.skipIf(!hasSample)('is read from a recorded shape', async () => {
    const now = new Date('2027-01-12T00:10:00Z')
    const forecast = await fetchCanned(hasSample ? readFileSync(SAMPLE, 'utf8') : '', now)
    expectWholeSeries(forecast, now)
    expect(forecast.hours).toHaveLength(47)
    expect(hourAt(forecast, workedHour.time)).toEqual(workedHour)
  })
})

describe('the fake', () => {
  let fake: WeatherFake
  beforeAll(async () => {
    fake = await startWeatherFake({ port: 0 })
  })
  afterAll(() => fake.close())

  test('is read to the same hours that its answer in the service’s default units and labels tells', async () => {
    const now = new Date()
    // Held still, so that both answers are of the same hour.
    await fetch(`${fake.url}/__fake/clock`, { method: 'POST', body: JSON.stringify({ now }) })
    const forecast = await createOpenMeteo({ baseUrl: fake.url, userAgent: 'test' }).fetchHourly(CELL, { now })
    expectWholeSeries(forecast, now)
    expect(forecast.hours).toHaveLength(263)

    const raw = (await (
      await fetch(
        `${fake.url}/v1/forecast?latitude=46.5&longitude=-94.25&past_hours=24&forecast_hours=240&timezone=America/Chicago` +
          '&hourly=temperature_2m,wind_speed_10m,wind_gusts_10m,snowfall,shortwave_radiation',
      )
    ).json()) as { utc_offset_seconds: number; hourly: Record<string, number[]> & { time: string[] } }
    const labelled = (time: string, shiftHours: number) => {
      const local = new Date(Date.parse(time) + (raw.utc_offset_seconds + shiftHours * 3600) * 1000)
      return raw.hourly.time.indexOf(local.toISOString().slice(0, 16))
    }
    for (const hour of forecast.hours) {
      const at = labelled(hour.time, 0)
      const next = labelled(hour.time, 1)
      expect(hour.airTemperatureC).toBeCloseTo(raw.hourly.temperature_2m?.[at] ?? NaN, 6)
      // The wire rounds km/h to 0.1.
      expect(Math.abs((hour.windSpeedMps ?? NaN) * 3.6 - (raw.hourly.wind_speed_10m?.[at] ?? NaN))).toBeLessThan(0.07)
      expect(Math.abs((hour.windGustMps ?? NaN) * 3.6 - (raw.hourly.wind_gusts_10m?.[next] ?? NaN))).toBeLessThan(0.07)
      expect(hour.snowfallCm).toBe(raw.hourly.snowfall?.[next])
      expect(hour.shortwaveWm2).toBe(raw.hourly.shortwave_radiation?.[next])
    }
  })

  test('with other runs gives each a full series over the same hours', async () => {
    const provider = createOpenMeteo({ baseUrl: fake.url, ensembleUrl: fake.url, userAgent: 'test' })
    const { hours, members } = await provider.fetchHourly(CELL, { now: new Date() })
    expect(members).toHaveLength(31)
    for (const member of members ?? []) expect(member.map((hour) => hour.time)).toEqual(hours.map((hour) => hour.time))
    const last = members?.map((member) => member.at(-2)?.airTemperatureC) ?? []
    expect(new Set(last).size).toBeGreaterThan(5)
    const humid = members?.flat().filter((h) => h.dewPointC !== null && h.dewPointC > (h.airTemperatureC ?? 99))
    expect(humid).toEqual([])
  })
})

describe('what is unknown or untidy', () => {
  test('nulls stay null, also for a column that the model lacks', async () => {
    const body = typedBody(
      {
        cloud_cover: typedColumn(40, { '06': null }),
        shortwave_radiation: typedColumn(null),
        surface_pressure: undefined,
      },
      { shortwave_radiation: 'undefined' },
    )
    const forecast = await fetchCanned(body, TYPED_NOW)
    expect(hourAt(forecast, '2027-01-13T06:00:00Z')).toMatchObject({
      cloudCover: null,
      shortwaveWm2: null,
      pressureHpa: null,
    })
    expect(hourAt(forecast, '2027-01-13T07:00:00Z').cloudCover).toBe(0.4)
  })

  test('showers count as rain, and rain stands alone where the model has no showers', async () => {
    const rain = typedColumn(0, { '05': 0.4, '07': 0.2 })
    const both = await fetchCanned(typedBody({ rain, showers: typedColumn(0, { '05': 0.3 }) }), TYPED_NOW)
    expect(hourAt(both, '2027-01-13T04:00:00Z').rainMm).toBe(0.7)
    const alone = await fetchCanned(
      typedBody({ rain, showers: typedColumn(null) }, { showers: 'undefined' }),
      TYPED_NOW,
    )
    expect(hourAt(alone, '2027-01-13T06:00:00Z').rainMm).toBe(0.2)
  })

  test('minus zero and small negative amounts become zero, and the dew point is never above the air', async () => {
    const body = typedBody({
      temperature_2m: typedColumn(-3, { '04': -0.04 }),
      dew_point_2m: typedColumn(-5, { '06': -2.9 }),
      shortwave_radiation: typedColumn(-1.2),
      precipitation: typedColumn(-0.01),
    }).replace('-0.04', '-0.0')
    const forecast = await fetchCanned(body, TYPED_NOW)
    expect(hourAt(forecast, '2027-01-13T04:00:00Z').airTemperatureC).toBe(0)
    expect(hourAt(forecast, '2027-01-13T06:00:00Z')).toMatchObject({
      dewPointC: -3,
      shortwaveWm2: 0,
      precipitationMm: 0,
    })
  })

  test('a missing dew point comes from the humidity', async () => {
    // At -3 °C and 80 % the Magnus form 17.625/243.04: gamma = ln 0.8 - 0.22028 = -0.44343; 243.04 x gamma / (17.625 - gamma) = -5.96.
    const forecast = await fetchCanned(typedBody({ dew_point_2m: typedColumn(null) }), TYPED_NOW)
    expect(hourAt(forecast, '2027-01-13T06:00:00Z').dewPointC).toBeCloseTo(-6, 1)
  })
})
