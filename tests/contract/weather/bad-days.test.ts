// The adapter against the fake's bad days, over real connections.
import { afterAll, afterEach, beforeAll, expect, test } from 'vitest'
import { startWeatherFake, type WeatherFake } from '@/fakes/weather/server'
import { createOpenMeteo, type OpenMeteoSettings } from '@/lib/weather/open-meteo'
import { WeatherError, type WeatherErrorKind } from '@/lib/weather/port'

const CELL = { latitudeDeg: 46.5, longitudeDeg: -94.25 }

let fake: WeatherFake
beforeAll(async () => {
  fake = await startWeatherFake({ port: 0 })
})
afterAll(() => fake.close())
afterEach(async () => {
  await control('DELETE', 'fault')
  await control('DELETE', 'requests')
})

async function control(method: 'POST' | 'DELETE' | 'GET', what: string, body?: object): Promise<unknown> {
  const response = await fetch(`${fake.url}/__fake/${what}`, { method, body: body && JSON.stringify(body) })
  if (!response.ok) throw new Error(`${response.status} ${await response.text()}`)
  return response.json()
}

async function requests(): Promise<Record<string, unknown>[]> {
  return ((await control('GET', 'requests')) as { requests: Record<string, unknown>[] }).requests
}

function provider(settings: Partial<OpenMeteoSettings> = {}) {
  return createOpenMeteo({
    baseUrl: fake.url,
    userAgent: 'Nightsheet (https://rink.example)',
    retryDelayMs: 1,
    ...settings,
  })
}

async function failure(settings: Partial<OpenMeteoSettings> = {}, signal?: AbortSignal): Promise<WeatherError> {
  const error = await provider(settings)
    .fetchHourly(CELL, { now: new Date(), signal })
    .then(
      () => new Error('it answered well'),
      (reason: unknown) => reason,
    )
  if (error instanceof WeatherError) return error
  throw error
}

test.each<[string, WeatherErrorKind, number]>([
  ['429', 'throttled', 1],
  ['400', 'refused', 1],
  ['no-data', 'coverage', 1],
  ['401', 'refused', 1],
  ['403', 'refused', 1],
  ['404', 'refused', 1],
  ['500', 'transient', 3],
  ['503', 'transient', 3],
  ['html-502', 'transient', 3],
  ['html-200', 'malformed', 3],
  ['broken-200', 'malformed', 3],
  ['too-big', 'malformed', 3],
  ['cut-off', 'transient', 3],
])('the fault %s is %s after %i tries', async (kind, expected, tries) => {
  await control('POST', 'fault', { kind })
  expect((await failure()).kind).toBe(expected)
  expect(await requests()).toHaveLength(tries)
})

test.each(['hang', 'slow'])('a service that is %s meets the time limit at every try', async (kind) => {
  await control('POST', 'fault', { kind, delayMs: 2000 })
  const startedAt = performance.now()
  const error = await failure({ timeLimitMs: 100 })
  expect(error).toMatchObject({ kind: 'transient', message: expect.stringContaining('100 ms') as string })
  expect(performance.now() - startedAt).toBeLessThan(1500)
  expect(await requests()).toHaveLength(3)
})

test('a slow answer within the time limit is taken', async () => {
  await control('POST', 'fault', { kind: 'slow', delayMs: 150 })
  expect((await provider().fetchHourly(CELL, { now: new Date() })).hours).toHaveLength(263)
})

test('after one bad answer the next try is taken', async () => {
  await control('POST', 'fault', { kind: 'broken-200', times: 1 })
  expect((await provider().fetchHourly(CELL, { now: new Date() })).hours).toHaveLength(263)
  expect(await requests()).toHaveLength(2)
})

test('a caller that stops is not kept waiting', async () => {
  await control('POST', 'fault', { kind: 'hang' })
  const error = await failure({}, AbortSignal.timeout(50))
  expect(error.kind).toBe('transient')
  expect(await requests()).toHaveLength(1)
})

test('a service that does not listen is an outage', async () => {
  const gone = await startWeatherFake({ port: 0 })
  await gone.close()
  const error = await failure({ baseUrl: gone.url })
  expect(error).toMatchObject({ kind: 'transient', message: expect.stringContaining('ECONNREFUSED') as string })
})

test('without its other runs a forecast is still a forecast', async () => {
  const gone = await startWeatherFake({ port: 0 })
  await gone.close()
  const forecast = await provider({ ensembleUrl: gone.url }).fetchHourly(CELL, { now: new Date() })
  expect(forecast.hours).toHaveLength(263)
  expect(forecast.members).toBeNull()
})

test('a request says who we are, asks in our units, and keeps the key out of the address', async () => {
  await provider({ apiKey: 'secret-key' }).fetchHourly(CELL, { now: new Date() })
  const [request] = await requests()
  expect(request).toMatchObject({
    userAgent: 'Nightsheet (https://rink.example)',
    withKey: true,
    weight: 1.2,
    status: 200,
  })
  expect(request?.query).toContain(
    'wind_speed_unit=ms&timeformat=unixtime&timezone=GMT&past_hours=24&forecast_hours=240',
  )
  expect(JSON.stringify(request)).not.toContain('secret-key')
})
