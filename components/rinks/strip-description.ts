// The night in a few sentences, for people who do not see the strip.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { TonightHour } from '@/lib/schemas/tonight-view'
import type { WordOptions } from '@/lib/words/options'
import { rateText, temperatureText } from '@/lib/words/quantities'
import { clockText } from '@/lib/words/times'
import { wetRuns } from '../charts/strip-labels'
import { amountText } from './amount-text'

type Write = (hours: TonightHour[], reader: WordOptions) => string[]

/** Which hours are good, the fastest one, the span of the air, what falls, what is missing. */
export function describeNight(hours: TonightHour[], reader: WordOptions): string {
  const parts: Write[] = [goodHours, fastestHour, airSpan, whatFalls, whatIsMissing]
  return parts.flatMap((write) => write(hours, reader)).join(' ')
}

const goodHours: Write = (hours, reader) => {
  const sentences = (['flood', 'fill'] as const).flatMap((verdict) => {
    const runs = runsOf(hours.filter((hour) => hour.verdict === verdict))
    return runs.length === 0 ? [] : [`Hours to ${verdict}: ${runs.map((run) => spanText(run, reader)).join(', ')}.`]
  })
  return sentences.length > 0 ? sentences : ['No hour is good for flooding or filling.']
}

const fastestHour: Write = (hours, reader) => {
  const [fastest] = [...hours].sort((a, b) => (b.freezeRateMmPerH ?? -Infinity) - (a.freezeRateMmPerH ?? -Infinity))
  const rate = fastest?.freezeRateMmPerH ?? 0
  return fastest && rate > 0 ? [`Fastest at ${clockText(fastest.time, reader)}: ${rateText(rate, reader)}.`] : []
}

const airSpan: Write = (hours, reader) => {
  const air = hours.flatMap(({ weather }) => (weather?.airTemperatureC == null ? [] : [weather.airTemperatureC]))
  if (air.length === 0) return []
  return [`Air from ${temperatureText(Math.min(...air), reader)} to ${temperatureText(Math.max(...air), reader)}.`]
}

const whatFalls: Write = (hours, reader) => {
  const wet = hours.map(({ time, weather }) => ({
    startsAt: Date.parse(time),
    snowCm: weather?.snowfallCm ?? 0,
    rainMm: weather?.rainMm ?? 0,
  }))
  return wetRuns(wet, -Infinity, Infinity).map(
    (run) => `From ${spanText([run.startsAt, run.endsAt], reader)} ${amountText(run, reader)}.`,
  )
}

const whatIsMissing: Write = (hours) => {
  const missing = hours.filter((hour) => !hour.isKnown).length
  return missing > 0 ? [`No forecast for ${missing} of ${hours.length} hours.`] : []
}

/** Stretches of hours that follow each other, as start and end. */
function runsOf(hours: TonightHour[]): [number, number][] {
  const runs: [number, number][] = []
  for (const hour of hours) {
    const at = Date.parse(hour.time)
    const last = runs.at(-1)
    if (last && last[1] === at) last[1] = at + HOUR_MILLIS
    else runs.push([at, at + HOUR_MILLIS])
  }
  return runs
}

function spanText([from, to]: [number, number], reader: WordOptions): string {
  return `${clockText(new Date(from), reader)} to ${clockText(new Date(to), reader)}`
}
