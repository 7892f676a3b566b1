// Quantities in words: a number, rounded as people read it, with its unit.
import {
  celsiusToFahrenheit,
  litresToGallons,
  m2ToFt2,
  metresToFeet,
  mmToInches,
  mpsToKmh,
  mpsToMph,
} from '@/lib/units'
import type { WordOptions } from './options'

// Making a formatter takes a tenth of a millisecond: too long for every figure of a page that follows a thumb.
const formatters = new Map<string, Intl.NumberFormat>()

function formatterOf(locale: string, digits: number, useGrouping: boolean): Intl.NumberFormat {
  const key = `${locale} ${digits} ${useGrouping}`
  let formatter = formatters.get(key)
  if (!formatter) {
    const format = { minimumFractionDigits: digits, maximumFractionDigits: digits, useGrouping }
    formatter = new Intl.NumberFormat(locale, format)
    formatters.set(key, formatter)
  }
  return formatter
}

/** A real minus sign, and no "−0". */
export function numberText(value: number, digits: number, { locale }: Pick<WordOptions, 'locale'>): string {
  const rounded = Number(value.toFixed(digits)) + 0
  return formatterOf(locale, digits, Math.abs(rounded) >= 10_000)
    .format(rounded)
    .replace('-', '−')
}

export function temperatureText(temperatureC: number, words: WordOptions): string {
  return words.units.temperature === 'F'
    ? `${numberText(celsiusToFahrenheit(temperatureC), 0, words)} °F`
    : `${numberText(temperatureC, 0, words)} °C`
}

/** "−2 to −9 °C", or one figure where both read alike. */
export function temperatureRangeText(fromC: number, toC: number, words: WordOptions): string {
  const [from, to] = [temperatureText(fromC, words), temperatureText(toC, words)]
  return from === to ? to : `${from.replace(/ °[CF]$/, '')} to ${to}`
}

/** Warm temperatures with their plus sign, where the sign is the point. */
export function signedTemperatureText(temperatureC: number, words: WordOptions): string {
  const isAbove = words.units.temperature === 'C' && Math.round(temperatureC) > 0
  return (isAbove ? '+' : '') + temperatureText(temperatureC, words)
}

/** Wind chill is an index: a number without a unit in Canada, degrees Fahrenheit in the United States. */
export function windChillText(windChillC: number, words: WordOptions): string {
  return words.units.temperature === 'F' ? temperatureText(windChillC, words) : numberText(windChillC, 0, words)
}

export function windText(mps: number, words: WordOptions): string {
  const { wind } = words.units
  if (wind === 'm/s') return `${numberText(mps, 0, words)} m/s`
  return `${numberText(wind === 'mph' ? mpsToMph(mps) : mpsToKmh(mps), 0, words)} ${wind}`
}

const inchesText = (mm: number, digits: number, words: WordOptions) => `${numberText(mmToInches(mm), digits, words)} in`

/** Films and layers: millimetres, or hundredths of an inch. */
export function layerText(mm: number, words: WordOptions): string {
  if (words.units.ice === 'in') return inchesText(mm, 2, words)
  return `${numberText(mm, mm < 10 && !Number.isInteger(Math.round(mm * 10) / 10) ? 1 : 0, words)} mm`
}

/** Ice: centimetres, or inches. */
export function iceText(mm: number, words: WordOptions): string {
  return words.units.ice === 'in' ? inchesText(mm, 1, words) : `${numberText(mm / 10, 1, words)} cm`
}

export function snowText(cm: number, words: WordOptions): string {
  if (words.units.ice === 'in') return inchesText(cm * 10, 1, words)
  return `${numberText(cm, cm < 10 ? 1 : 0, words)} cm`
}

export function rainText(mm: number, words: WordOptions): string {
  return words.units.ice === 'in' ? inchesText(mm, 2, words) : `${numberText(mm, 1, words)} mm`
}

export function rateText(mmPerH: number, words: WordOptions): string {
  return words.units.ice === 'in'
    ? `${inchesText(mmPerH, 2, words)} an hour`
    : `${numberText(mmPerH, 1, words)} mm an hour`
}

export function fluxText(wm2: number, words: WordOptions): string {
  return `${numberText(wm2, 0, words)} W/m²`
}

export function waterText(litres: number, words: WordOptions): string {
  return words.units.water === 'gal'
    ? `${numberText(litresToGallons(litres), 0, words)} gal`
    : `${numberText(litres, 0, words)} L`
}

/** What a hose gives: litres, or US gallons to the tenth, a minute. */
export function flowText(lPerMin: number, words: WordOptions): string {
  return words.units.water === 'gal'
    ? `${numberText(litresToGallons(lPerMin), 1, words)} gal/min`
    : `${numberText(lPerMin, 0, words)} L/min`
}

/** Sides of the yard. */
export function sizeText(metres: number, words: WordOptions): string {
  return words.units.size === 'ft'
    ? `${numberText(metresToFeet(metres), 0, words)} ft`
    : `${numberText(metres, 1, words)} m`
}

export function areaText(m2: number, words: WordOptions): string {
  return words.units.size === 'ft' ? `${numberText(m2ToFt2(m2), 0, words)} ft²` : `${numberText(m2, 0, words)} m²`
}

/** "40 min", "1 h 50 min", "3 h". */
export function durationText(minutes: number): string {
  const whole = Math.max(0, Math.round(minutes))
  const hours = Math.floor(whole / 60)
  const rest = whole % 60
  if (hours === 0) return `${rest} min`
  return rest === 0 ? `${hours} h` : `${hours} h ${rest} min`
}

const NUMBER_WORDS = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten']

/** Small counts as words, larger ones in figures. */
export function countText(count: number): string {
  return NUMBER_WORDS[count] ?? String(count)
}

export function capitalised(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1)
}
