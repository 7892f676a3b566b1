// The words along the strip, and its summary for people who do not see it.
import type { TonightHour } from '@/lib/schemas/tonight-view'
import type { StripWords } from '../charts/night-strip-drawing'
import { xOf, type StripHour, type StripInput } from '../charts/night-strip-layout'
import { placeLabels, tickInstants, tickLabel, wetRuns, type WetRun } from '../charts/strip-labels'
import { axisNumber, clockTime, rainText, rateText, snowText, temperatureText, type Reader } from './quantities'

const CHARACTER = 6.3

export const VERDICT_WORDS = { flood: 'flood', fill: 'fill', hold: 'hold off' } as const

export function stripWords(input: StripInput, hours: TonightHour[], reader: Reader): StripWords {
  const middleOf = (run: WetRun) => (xOf(input, run.startsAt) + xOf(input, run.endsAt)) / 2
  const runs = wetRuns(input.hours, input.startsAt, input.endsAt)
  return {
    title: 'How fast water freezes, hour by hour',
    description: describeNight(hours, reader),
    hourTicks: tickInstants(input.startsAt, input.endsAt, reader.timeZone).map(({ at, localHour }) => ({
      x: xOf(input, at),
      text: tickLabel(localHour, reader.clock),
    })),
    amounts: placeLabels(
      runs.map((run) => ({ x: middleOf(run), text: amountText(run, reader) })),
      input.frame.width,
      CHARACTER,
    ),
    rateLabel: axisNumber,
    airLabel: (value) => `${axisNumber(value)}°`,
    passLabel: (number, width) => (width > 44 ? `Pass ${number}` : String(number)),
    now: input.now === null ? '' : `now ${clockTime(input.now, reader)}`,
    gap: 'no forecast',
  }
}

function amountText({ snowCm, rainMm }: WetRun, reader: Reader): string {
  const snow = snowCm >= 0.05 ? `snow ${snowText(snowCm, reader)}` : ''
  const rain = rainMm >= 0.05 ? `rain ${rainText(rainMm, reader)}` : ''
  return [rain, snow].filter(Boolean).join(', ')
}

/** Which hours are good, the fastest one, the span of the air, what falls, what is missing. */
export function describeNight(hours: TonightHour[], reader: Reader): string {
  const known = hours.filter((hour) => hour.isKnown && hour.freezeRateMmPerH !== null)
  const fastest = [...known].sort((a, b) => (b.freezeRateMmPerH ?? 0) - (a.freezeRateMmPerH ?? 0))[0]
  const parts: string[] = (['flood', 'fill'] as const).flatMap((verdict) => {
    const runs = runsOf(hours.filter((hour) => hour.verdict === verdict))
    return runs.length === 0 ? [] : [`Hours to ${verdict}: ${runs.map((run) => spanText(run, reader)).join(', ')}.`]
  })
  if (parts.length === 0) parts.push('No hour is good for flooding or filling.')
  if (fastest)
    parts.push(`Fastest at ${clockTime(fastest.time, reader)}: ${rateText(fastest.freezeRateMmPerH ?? 0, reader)}.`)
  const air = hours
    .flatMap((hour) => (hour.weather ? [hour.weather.airTemperatureC] : []))
    .filter((value) => value !== null)
  if (air.length > 0)
    parts.push(`Air from ${temperatureText(Math.min(...air), reader)} to ${temperatureText(Math.max(...air), reader)}.`)
  for (const run of wetRuns(stripWet(hours), -Infinity, Infinity)) {
    parts.push(
      `From ${clockTime(run.startsAt, reader)} to ${clockTime(run.endsAt, reader)} ${amountText(run, reader)}.`,
    )
  }
  if (known.length < hours.length)
    parts.push(`No forecast for ${hours.length - known.length} of ${hours.length} hours.`)
  return parts.join(' ')
}

function runsOf(hours: TonightHour[]): [number, number][] {
  const runs: [number, number][] = []
  for (const hour of hours) {
    const at = Date.parse(hour.time)
    const last = runs.at(-1)
    if (last && last[1] === at) last[1] = at + 3_600_000
    else runs.push([at, at + 3_600_000])
  }
  return runs
}

const spanText = ([from, to]: [number, number], reader: Reader) =>
  `${clockTime(from, reader)} to ${clockTime(to, reader)}`

function stripWet(hours: TonightHour[]): StripHour[] {
  return hours.map((hour) => ({
    startsAt: Date.parse(hour.time),
    verdict: hour.verdict,
    rate: null,
    air: null,
    snowCm: hour.weather?.snowfallCm ?? 0,
    rainMm: hour.weather?.rainMm ?? 0,
    isOpen: true,
  }))
}
