// Geometry of the night strip: numbers in, positions out. It knows no words, no units and no zone.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { airScale, rateScale, type Scale } from './strip-scale'

export type StripVerdict = 'flood' | 'fill' | 'hold'

/** One hour to draw; instants in milliseconds, rate and temperature in the reader's units. */
export interface StripHour {
  startsAt: number
  verdict: StripVerdict
  /** Null where the forecast has no weather for the hour. */
  rate: number | null
  air: number | null
  snowCm: number
  rainMm: number
  /** The keeper can go out in it. */
  isOpen: boolean
}

export interface StripPass {
  number: number
  startsAt: number
  setBy: number
  isPoured: boolean
}

export interface StripFrame {
  width: number
  height: number
  left: number
  right: number
  plotTop: number
  plotBottom: number
}

export interface StripInput {
  frame: StripFrame
  startsAt: number
  endsAt: number
  hours: StripHour[]
  passes: StripPass[]
  sunsetAt: number | null
  sunriseAt: number | null
  now: number | null
  /** Least height of the rate axis, in the unit of the rates. */
  leastRateTop: number
}

export interface StripBar {
  index: number
  x: number
  width: number
  y: number
  height: number
  verdict: StripVerdict
  isMelting: boolean
  /** It melts faster than the strip shows; the table has the number. */
  isCut: boolean
}

export interface StripLayout {
  frame: StripFrame
  baselineY: number
  night: { x: number; width: number } | null
  columns: { index: number; x: number; width: number }[]
  bars: StripBar[]
  gaps: { x: number; width: number }[]
  /** The keeper's own hours, neighbours joined; empty when every hour is theirs. */
  openSpans: { x: number; width: number }[]
  airLines: string[]
  rateTicks: { y: number; value: number }[]
  airTicks: { y: number; value: number }[]
  marks: { kind: 'snow' | 'rain'; x: number; radius: number }[]
  brackets: { number: number; x: number; width: number; isPoured: boolean }[]
  nowX: number | null
}

const LEAST_SNOW_CM = 0.05
const LEAST_RAIN_MM = 0.05

const round = (value: number) => Math.round(value * 100) / 100

/** Where an instant lies across the strip, held inside the plot. */
export function xOf(input: Pick<StripInput, 'frame' | 'startsAt' | 'endsAt'>, at: number): number {
  const { frame, startsAt, endsAt } = input
  const share = (Math.min(Math.max(at, startsAt), endsAt) - startsAt) / (endsAt - startsAt)
  return round(frame.left + share * (frame.width - frame.left - frame.right))
}

/** Lays out one night between two instants; hours that only touch the span are cut at its ends. */
export function layOutNightStrip(input: StripInput): StripLayout {
  const { frame, now } = input
  const seen = input.hours.flatMap((hour, index) =>
    hour.startsAt < input.endsAt && hour.startsAt + HOUR_MILLIS > input.startsAt
      ? [{ hour, index, ...spanOf(input, hour) }]
      : [],
  )
  const rates = rateScale(
    seen.flatMap(({ hour }) => (hour.rate === null ? [] : [hour.rate])),
    input.leastRateTop,
  )
  const air = airScale(seen.flatMap(({ hour }) => (hour.air === null ? [] : [hour.air])))
  return {
    frame,
    baselineY: yOf(frame, rates, 0),
    night: nightGround(input),
    columns: seen.map(({ index, x, width }) => ({ index, x, width })),
    bars: seen.flatMap(({ hour, index, x, width }) =>
      hour.rate === null ? [] : [barOf(frame, rates, hour, { index, x, width })],
    ),
    gaps: joined(seen.filter(({ hour }) => hour.rate === null)),
    openSpans: ownHours(seen.filter(({ hour }) => hour.rate !== null)),
    airLines: air ? airLines(frame, air, seen) : [],
    rateTicks: rates.ticks.map((value) => ({ value, y: yOf(frame, rates, value) })),
    airTicks: air ? air.ticks.map((value) => ({ value, y: yOf(frame, air, value) })) : [],
    marks: seen.flatMap(({ hour, x, width }) => marksOf(hour, x + width / 2)),
    brackets: bracketsOf(input),
    nowX: now !== null && now >= input.startsAt && now <= input.endsAt ? xOf(input, now) : null,
  }
}

type Seen = { hour: StripHour; index: number; x: number; width: number }

function spanOf(input: StripInput, hour: StripHour): { x: number; width: number } {
  const x = xOf(input, hour.startsAt)
  return { x, width: round(xOf(input, hour.startsAt + HOUR_MILLIS) - x) }
}

function yOf(frame: StripFrame, scale: Scale, value: number): number {
  const held = Math.min(Math.max(value, scale.low), scale.high)
  const share = (scale.high - held) / (scale.high - scale.low)
  return round(frame.plotTop + share * (frame.plotBottom - frame.plotTop))
}

function barOf(frame: StripFrame, scale: Scale, hour: StripHour, at: Omit<Seen, 'hour'>): StripBar {
  const rate = hour.rate ?? 0
  const [zero, end] = [yOf(frame, scale, 0), yOf(frame, scale, rate)]
  const air = Math.min(at.width * 0.12, 3)
  return {
    index: at.index,
    x: round(at.x + air),
    width: round(Math.max(at.width - 2 * air, 0.5)),
    y: Math.min(zero, end),
    height: round(Math.abs(end - zero)),
    verdict: hour.verdict,
    isMelting: rate < 0,
    isCut: rate < scale.low,
  }
}

function nightGround(input: StripInput): StripLayout['night'] {
  const { sunsetAt, sunriseAt } = input
  if (sunsetAt === null && sunriseAt === null) return null
  const x = xOf(input, sunsetAt ?? input.startsAt)
  const width = round(xOf(input, sunriseAt ?? input.endsAt) - x)
  return width > 0 ? { x, width } : null
}

function ownHours(known: Seen[]): StripLayout['openSpans'] {
  const open = known.filter(({ hour }) => hour.isOpen)
  return open.length === known.length ? [] : joined(open)
}

/** Stretches of hours that follow each other. */
function joined(hours: Seen[]): { x: number; width: number }[] {
  const stretches: { x: number; width: number }[] = []
  for (const { x, width } of hours) {
    const last = stretches.at(-1)
    if (last && Math.abs(last.x + last.width - x) < 0.05) last.width = round(last.width + width)
    else stretches.push({ x, width })
  }
  return stretches
}

/** The air temperature through the middles of the hours, broken where it is missing. */
function airLines(frame: StripFrame, scale: Scale, seen: Seen[]): string[] {
  const runs: string[][] = [[]]
  for (const { hour, x, width } of seen) {
    if (hour.air === null) runs.push([])
    else runs.at(-1)?.push(`${round(x + width / 2)},${yOf(frame, scale, hour.air)}`)
  }
  return runs.filter((run) => run.length > 0).map((run) => run.join(' '))
}

/** Snow and rain stand beside each other where an hour has both. Radius grows with the root, so area tells the amount. */
function marksOf(hour: StripHour, middle: number): StripLayout['marks'] {
  const hasSnow = hour.snowCm >= LEAST_SNOW_CM
  const hasRain = hour.rainMm >= LEAST_RAIN_MM
  const aside = hasSnow && hasRain ? 4 : 0
  const marks: StripLayout['marks'] = []
  if (hasSnow)
    marks.push({ kind: 'snow', x: round(middle - aside), radius: round(Math.min(2 + 2.4 * Math.sqrt(hour.snowCm), 6)) })
  if (hasRain)
    marks.push({ kind: 'rain', x: round(middle + aside), radius: round(Math.min(2 + 1.8 * Math.sqrt(hour.rainMm), 6)) })
  return marks
}

/** Where the passes stand; all that moving one changes. */
export function bracketsOf(
  input: Pick<StripInput, 'frame' | 'startsAt' | 'endsAt' | 'passes'>,
): StripLayout['brackets'] {
  return input.passes
    .filter((pass) => pass.startsAt < input.endsAt && pass.setBy > input.startsAt)
    .map(({ number, startsAt, setBy, isPoured }) => {
      const x = xOf(input, startsAt)
      return { number, x, width: round(xOf(input, setBy) - x), isPoured }
    })
}
