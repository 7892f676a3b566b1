// Open-Meteo as a weather provider: https://open-meteo.com/en/docs.
import pRetry from 'p-retry'
import { fetchWithLimit, OutboundError } from '@/lib/http/fetch-with-limit'
import { logFailure } from '@/lib/log'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { HourlyRecord } from '@/lib/physics/types'
import { readBody } from './open-meteo/body'
import { checkHours, toHours } from './open-meteo/hours'
import { ensembleUnitOf, toMembers } from './open-meteo/members'
import { refusalOf } from './open-meteo/refusal'
import { ensembleUrl, FORECAST_UNITS, forecastUrl } from './open-meteo/request'
import { WeatherError, type Forecast, type GridCell, type WeatherProvider } from './port'

/** The service sends no expiry; after six hours two newer runs exist for every place, and tonight may have changed. */
const FRESH_FOR_MS = 6 * HOUR_MILLIS
const BODY_CAP_BYTES = 5 * 1024 * 1024
const ENSEMBLE_MODEL = 'ncep_gefs025'
const TRIES = 3

export interface OpenMeteoSettings {
  baseUrl: string
  /** Sent as a header, never in the address, so that it reaches no log. */
  apiKey?: string
  /** Other runs are asked for only when this is set: they weigh ten times a forecast. */
  ensembleUrl?: string
  /** Names us and says where we can be reached. */
  userAgent: string
  /** For one try. [ms] */
  timeLimitMs?: number
  /** Before the second try; doubled for the third, each lengthened by up to its own length at random. [ms] */
  retryDelayMs?: number
}

interface CallOptions {
  now: Date
  signal?: AbortSignal
}

export function createOpenMeteo(settings: OpenMeteoSettings): WeatherProvider {
  const baseUrl = settings.baseUrl.replace(/\/$/, '')
  const otherRunsUrl = settings.ensembleUrl?.replace(/\/$/, '')
  return {
    id: 'open-meteo',
    fields: FIELDS,
    async fetchHourly(cell, options): Promise<Forecast> {
      const hours = await ask(settings, forecastUrl(baseUrl, cell), options, (text) => readForecast(text, options.now))
      return {
        provider: 'open-meteo',
        issuedAt: null, // One answer is blended from several models, and says neither which nor of when.
        fetchedAt: options.now,
        expiresAt: new Date(options.now.getTime() + FRESH_FOR_MS),
        hours,
        members: otherRunsUrl ? await fetchMembers(settings, otherRunsUrl, cell, hours, options) : null,
        attribution: { text: 'Weather data by Open-Meteo.com', url: 'https://open-meteo.com/', licence: 'CC BY 4.0' },
      }
    },
  }
}

const FIELDS: ReadonlySet<keyof HourlyRecord> = new Set([
  'time',
  'airTemperatureC',
  'dewPointC',
  'windSpeedMps',
  'windGustMps',
  'cloudCover',
  'shortwaveWm2',
  'precipitationMm',
  'rainMm',
  'snowfallCm',
  'pressureHpa',
])

/** The hours of a forecast body. @throws WeatherError malformed */
export function readForecast(text: string, now: Date): HourlyRecord[] {
  const units: Record<string, string> = FORECAST_UNITS
  const hours = toHours(readBody(text, (column) => units[column] ?? null))
  checkHours(hours, now)
  return hours
}

/** A forecast without its other runs is still a forecast. */
async function fetchMembers(
  settings: OpenMeteoSettings,
  url: string,
  cell: GridCell,
  hours: HourlyRecord[],
  options: CallOptions,
): Promise<HourlyRecord[][] | null> {
  try {
    return await ask(settings, ensembleUrl(url, cell, ENSEMBLE_MODEL), options, (text) =>
      toMembers(readBody(text, ensembleUnitOf), hours),
    )
  } catch (error) {
    if (options.signal?.aborted) throw error
    logFailure('weather.ensemble_failed', error, { provider: 'open-meteo' })
    return null
  }
}

/** Asks up to three times, as long as trying again can help. @throws WeatherError */
async function ask<T>(
  settings: OpenMeteoSettings,
  url: URL,
  options: CallOptions,
  read: (text: string) => T,
): Promise<T> {
  try {
    return await pRetry(async () => read(await askOnce(settings, url, options)), {
      retries: TRIES - 1,
      minTimeout: settings.retryDelayMs ?? 1000,
      randomize: true,
      signal: options.signal,
      shouldRetry: ({ error }) =>
        error instanceof WeatherError && (error.kind === 'transient' || error.kind === 'malformed'),
    })
  } catch (error) {
    if (options.signal?.aborted)
      throw new WeatherError('transient', 'Open-Meteo: stopped before it answered', { cause: error })
    throw error
  }
}

async function askOnce(settings: OpenMeteoSettings, url: URL, { now, signal }: CallOptions): Promise<string> {
  const headers: Record<string, string> = { accept: 'application/json', 'user-agent': settings.userAgent }
  if (settings.apiKey) headers['x-api-key'] = settings.apiKey
  const limits = { timeLimitMs: settings.timeLimitMs ?? 20_000, bodyCapBytes: BODY_CAP_BYTES }
  const response = await fetchWithLimit(url, { ...limits, headers, signal }).catch((error: unknown) => {
    if (!(error instanceof OutboundError)) throw error
    const kind = error.fault === 'body_cap' ? 'malformed' : 'transient'
    throw new WeatherError(kind, `Open-Meteo: ${error.message}`, { cause: error })
  })
  const refusal = refusalOf(response, now)
  if (refusal) throw refusal
  return response.body
}
