// From tonight's view to the numbers and words of the strip, in the reader's units and the rink's time.
import { UNKNOWN_HOUR } from '@/lib/advice/unknown-hour'
import { addDays, instantOfLocal } from '@/lib/advice/zoned-time'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { TonightHour, TonightView } from '@/lib/schemas/tonight-view'
import { celsiusToFahrenheit, mmToInches, type Units } from '@/lib/units'
import type { StripFrame, StripHour, StripInput, StripPass } from '../charts/night-strip-layout'

export type StripSize = 'wide' | 'narrow'

const FRAMES: Record<StripSize, StripFrame> = {
  wide: { width: 800, height: 274, left: 38, right: 44, plotTop: 52, plotBottom: 214 },
  narrow: { width: 390, height: 268, left: 38, right: 40, plotTop: 52, plotBottom: 208 },
}
/** A phone shows the hours in which floods happen: 3 pm to 9 am. */
const NARROW_FROM_MINUTE = 15 * 60
const NARROW_TO_MINUTE = 9 * 60

export type StripSource = Pick<TonightView, 'rink' | 'viewer' | 'night'> & {
  outlook: Pick<NonNullable<TonightView['outlook']>, 'hours' | 'passes'>
}

/** The hours of the night, oldest first; hours to come that the forecast does not have are there, unknown. */
export function hoursOfNight({ night, outlook }: Pick<StripSource, 'night' | 'outlook'>, now: number): TonightHour[] {
  const [from, to] = [Date.parse(night.startsAt), Date.parse(night.endsAt)]
  const within = outlook.hours.filter(({ time }) => Date.parse(time) + HOUR_MILLIS > from && Date.parse(time) < to)
  const known = new Set(within.map(({ time }) => Date.parse(time)))
  const missing: TonightHour[] = []
  for (let at = Math.floor(Math.max(from, now) / HOUR_MILLIS) * HOUR_MILLIS; at < to; at += HOUR_MILLIS) {
    if (!known.has(at)) missing.push(unknownHour(at))
  }
  return [...within, ...missing].sort((a, b) => Date.parse(a.time) - Date.parse(b.time))
}

function unknownHour(at: number): TonightHour {
  return {
    time: new Date(at).toISOString(),
    ...UNKNOWN_HOUR,
    reasons: [],
    sheet: { thicknessMm: 0, temperatureC: 0, liquidMm: 0, snowCoverCm: 0 },
  }
}

export function stripHours(hours: TonightHour[], units: Units): StripHour[] {
  return hours.map((hour) => ({
    startsAt: Date.parse(hour.time),
    verdict: hour.verdict,
    rate: hour.isKnown ? inUnit(hour.freezeRateMmPerH, units.ice === 'in', mmToInches) : null,
    air: inUnit(hour.weather?.airTemperatureC ?? null, units.temperature === 'F', celsiusToFahrenheit),
    snowCm: hour.weather?.snowfallCm ?? 0,
    rainMm: hour.weather?.rainMm ?? 0,
    isOpen: hour.isAvailable !== false,
  }))
}

function inUnit(value: number | null, isOther: boolean, convert: (value: number) => number): number | null {
  return value === null || !isOther ? value : convert(value)
}

/** First and last instant that a size of the strip shows. */
export function spanOf(
  { night, rink }: Pick<StripSource, 'night' | 'rink'>,
  size: StripSize,
): { startsAt: number; endsAt: number } {
  if (size === 'wide') return { startsAt: Date.parse(night.startsAt), endsAt: Date.parse(night.endsAt) }
  return {
    startsAt: instantOfLocal(night.date, NARROW_FROM_MINUTE, rink.timeZone),
    endsAt: instantOfLocal(addDays(night.date, 1), NARROW_TO_MINUTE, rink.timeZone),
  }
}

export function stripPasses({ night, outlook }: Pick<StripSource, 'night' | 'outlook'>): StripPass[] {
  return outlook.passes.map(({ number, startsAt, setBy, poured }) => ({
    number,
    startsAt: Date.parse(startsAt),
    // A pass that does not set is drawn to the end of the night.
    setBy: Date.parse(setBy ?? night.endsAt),
    isPoured: poured !== null,
  }))
}

export function stripInput(source: StripSource, hours: StripHour[], now: number, size: StripSize): StripInput {
  const { night, viewer } = source
  return {
    frame: FRAMES[size],
    ...spanOf(source, size),
    hours,
    passes: stripPasses(source),
    sunsetAt: night.sunsetAt === null ? null : Date.parse(night.sunsetAt),
    sunriseAt: night.sunriseAt === null ? null : Date.parse(night.sunriseAt),
    now,
    leastRateTop: viewer.units.ice === 'in' ? 0.04 : 1,
  }
}
