// Says what an answer of Open-Meteo other than a forecast means, and when asking again makes sense.
import { z } from 'zod'
import type { OutboundResponse } from '@/lib/http/fetch-with-limit'
import { DAY_MILLIS, HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { WeatherError } from '../port'

const refusalSchema = z.object({ reason: z.string() })

/** Null when the answer claims to be a forecast. */
export function refusalOf(response: OutboundResponse, now: Date): WeatherError | null {
  const { status } = response
  if (status === 200) return refusalOfContentType(response.headers.get('content-type') ?? '')
  const reason = readReason(response.body)
  const message = `Open-Meteo answered ${status}: ${reason}`
  if (status === 429) return new WeatherError('throttled', message, { retryAt: retryAt(reason, now) })
  if (status >= 500 || status === 408) return new WeatherError('transient', message)
  if (status === 400 && /^no data is available/i.test(reason)) return new WeatherError('coverage', message)
  return new WeatherError('refused', message)
}

/**
 * The service counts in fixed windows of the UTC clock and sends no Retry-After: the reason names the window, and the
 * wait is to its end. A second is added because its clock is not ours.
 */
export function retryAt(reason: string, now: Date): Date {
  const endOf = (windowMs: number) => new Date((Math.floor(now.getTime() / windowMs) + 1) * windowMs + 1000)
  if (/^daily/i.test(reason)) return endOf(DAY_MILLIS)
  if (/^hourly/i.test(reason)) return endOf(HOUR_MILLIS)
  if (/concurrent/i.test(reason)) return new Date(now.getTime() + 1000 + Math.round(Math.random() * 4000))
  return endOf(MINUTE_MILLIS)
}

function refusalOfContentType(contentType: string): WeatherError | null {
  if (/^application\/json\b/i.test(contentType)) return null
  return new WeatherError('malformed', `Open-Meteo answered 200 with "${contentType}" instead of JSON`)
}

/** The proxy in front of the service answers in HTML; of that only the fact is worth a log line. */
function readReason(body: string): string {
  try {
    return refusalSchema.parse(JSON.parse(body)).reason.slice(0, 300)
  } catch {
    return 'no reason given'
  }
}
