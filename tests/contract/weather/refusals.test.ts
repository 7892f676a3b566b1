// What the adapter does with everything that is not a sound forecast.
import { existsSync, readdirSync, readFileSync } from 'node:fs'
import { afterEach, describe, expect, test } from 'vitest'
import { createOpenMeteo } from '@/lib/weather/open-meteo'
import { WeatherError, type WeatherErrorKind } from '@/lib/weather/port'
import { startCannedServer, type CannedAnswer, type CannedServer } from './canned-server'
import { TYPED_COLUMNS, TYPED_NOW, typedBody, typedColumn } from './typed-body'

const SAMPLES = '../shared/weather/samples'
const CELL = { latitudeDeg: 46.5, longitudeDeg: -94.25 }

let server: CannedServer | undefined
afterEach(async () => {
  await server?.close()
  server = undefined
})

async function refusalOf(...answers: [CannedAnswer, ...CannedAnswer[]]) {
  server = await startCannedServer(...answers)
  const provider = createOpenMeteo({ baseUrl: server.url, userAgent: 'test', retryDelayMs: 1 })
  const error = await provider.fetchHourly(CELL, { now: TYPED_NOW }).then(
    () => new Error('it was taken for a forecast'),
    (reason: unknown) => reason,
  )
  if (!(error instanceof WeatherError)) throw error
  return { kind: error.kind, retryAt: error.retryAt, message: error.message, tries: server.requests.length }
}

const reason = (text: string) => JSON.stringify({ error: true, reason: text })

describe('statuses', () => {
  test.each<[number, string, WeatherErrorKind, number]>([
    [400, "Parameter 'hourly' could not be read", 'refused', 1],
    [400, 'No data is available for this location', 'coverage', 1],
    [401, 'API key required. Please add &apikey= to the URL.', 'refused', 1],
    [403, 'This API endpoint requires the API Professional or Enterprise plan', 'refused', 1],
    [404, 'Not Found', 'refused', 1],
    [500, 'Internal server error', 'transient', 3],
    [503, 'The service is overloaded', 'transient', 3],
  ])('%i "%s" is %s after %i tries', async (status, text, kind, tries) => {
    const refusal = await refusalOf({ status, body: reason(text) })
    expect(refusal).toMatchObject({ kind, tries, retryAt: null })
    expect(refusal.message).toContain(text)
  })

  test('the HTML page of the proxy is an outage', async () => {
    const page = { status: 502, type: 'text/html', body: '<html><body><h1>502 Bad Gateway</h1></body></html>' }
    expect(await refusalOf(page)).toMatchObject({ kind: 'transient', tries: 3 })
  })

  test('a redirect is not followed', async () => {
    expect(await refusalOf({ status: 302, body: '' })).toMatchObject({ kind: 'refused', tries: 1 })
  })

  test.each([
    ['Minutely API request limit exceeded. Please try again in one minute.', '2027-01-13T03:11:01.000Z'],
    ['Hourly API request limit exceeded. Please try again in the next hour.', '2027-01-13T04:00:01.000Z'],
    ['Daily API request limit exceeded. Please try again tomorrow.', '2027-01-14T00:00:01.000Z'],
  ])('429 "%s" waits for the end of its window without trying again', async (text, at) => {
    const refusal = await refusalOf({ status: 429, body: reason(text) })
    expect(refusal).toMatchObject({ kind: 'throttled', tries: 1 })
    expect(refusal.retryAt?.toISOString()).toBe(at)
  })

  test('429 for too many at once waits one to five seconds', async () => {
    const { retryAt } = await refusalOf({ status: 429, body: reason('Too many concurrent requests') })
    const waitMs = (retryAt?.getTime() ?? 0) - TYPED_NOW.getTime()
    expect(waitMs).toBeGreaterThanOrEqual(1000)
    expect(waitMs).toBeLessThanOrEqual(5000)
  })
})

describe('a 200 that is not a forecast', () => {
  const times = TYPED_COLUMNS.time ?? []
  test.each<[string, string]>([
    [
      'breaks off in an error text',
      `${typedBody().slice(0, 300)}Unexpected error while streaming data: timeoutReached`,
    ],
    ['is an error', reason('anything')],
    ['is an array', `[${typedBody()}]`],
    ['has wind in km/h', typedBody({}, { wind_speed_10m: 'km/h' })],
    ['has snow in metres', typedBody({}, { snowfall: 'm' })],
    ['has local times', typedBody({}, { time: 'iso8601' })],
    ['is in another zone', typedBody().replace('"utc_offset_seconds":0', '"utc_offset_seconds":-21600')],
    ['has a column that is too short', typedBody({ rain: [0, 0, 0] })],
    ['skips an hour', typedBody({ time: times.map((time, index) => (index > 5 ? (time ?? 0) + 3600 : time)) })],
    ['has text for numbers', typedBody().replace('-9.8', '"cold"')],
    ['is hotter than any place', typedBody({ temperature_2m: typedColumn(-3, { '09': 71 }) })],
    ['has no temperatures', typedBody({ temperature_2m: typedColumn(null) })],
    ['has wind for only half a day', typedBody({ wind_speed_10m: times.map((_, index) => (index < 12 ? 2 : null)) })],
    ['is of yesterday', typedBody({ time: times.map((time) => (time ?? 0) - 30 * 3600) })],
    ['begins tomorrow', typedBody({ time: times.map((time) => (time ?? 0) + 24 * 3600) })],
  ])('because it %s is malformed after three tries', async (_, body) => {
    expect(await refusalOf({ status: 200, body })).toMatchObject({ kind: 'malformed', tries: 3 })
  })

  test('by its content type is malformed', async () => {
    const refusal = await refusalOf({ status: 200, type: 'text/html', body: typedBody() })
    expect(refusal).toMatchObject({ kind: 'malformed', tries: 3 })
  })

  test('by its size is malformed', async () => {
    const refusal = await refusalOf({ status: 200, body: typedBody() + ' '.repeat(6 * 1024 * 1024) })
    expect(refusal).toMatchObject({ kind: 'malformed', tries: 3 })
  })
})

test('a forecast that comes at the third try is taken', async () => {
  server = await startCannedServer(
    { status: 503, body: reason('The service is overloaded') },
    { status: 200, body: '{"latitude":46.5,' },
    { status: 200, body: typedBody() },
  )
  const provider = createOpenMeteo({ baseUrl: server.url, userAgent: 'test', retryDelayMs: 1 })
  const forecast = await provider.fetchHourly(CELL, { now: TYPED_NOW })
  expect(forecast.hours).toHaveLength(25)
  expect(server.requests).toHaveLength(3)
})

describe('recorded errors', () => {
  const isHere = existsSync(SAMPLES)
  if (!isHere) console.info(`Skipped: ${SAMPLES} is not here`)
  const files = isHere ? readdirSync(SAMPLES).filter((name) => name.startsWith('open-meteo.error.')) : []

  test.skipIf(!isHere).each(files.length ? files : ['none'])('%s', async (file) => {
    const status = Number(/error\.(\d{3})/.exec(file)?.[1])
    const type = file.endsWith('.html') ? 'text/html' : 'application/json; charset=utf-8'
    const refusal = await refusalOf({ status, type, body: readFileSync(`${SAMPLES}/${file}`, 'utf8') })
    expect(refusal.kind).toBe(expectedKind(status, file))
  })

  function expectedKind(status: number, file: string): WeatherErrorKind {
    if (file.includes('no-data')) return 'coverage'
    if (status === 200) return 'malformed'
    if (status === 429) return 'throttled'
    return status >= 500 ? 'transient' : 'refused'
  }
})
