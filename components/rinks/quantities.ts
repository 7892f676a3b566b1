// Figures for people: one quantity, one form, in the reader's units and by the rink's clock.
import { formatInTimeZone } from 'date-fns-tz'
import type { TonightView } from '@/lib/schemas/tonight-view'
import { addDays } from '@/lib/advice/zoned-time'
import { celsiusToFahrenheit, litresToGallons, mmToInches } from '@/lib/units'

export interface Reader {
  units: 'metric' | 'imperial'
  clock: '12' | '24'
  timeZone: string
}

export function readerOf({ viewer, rink }: Pick<TonightView, 'viewer' | 'rink'>): Reader {
  return { units: viewer.units, clock: viewer.clock, timeZone: rink.timeZone }
}

// A page shows some hundred times of day; making a formatter for each would take a quarter of a second.
const clocks = new Map<string, Intl.DateTimeFormat>()

function clockOf(timeZone: string): Intl.DateTimeFormat {
  const made =
    clocks.get(timeZone) ??
    new Intl.DateTimeFormat('en', { timeZone, hour: '2-digit', minute: '2-digit', hourCycle: 'h23' })
  clocks.set(timeZone, made)
  return made
}

/** "9 pm", "9:42 pm", "noon", "midnight"; or "21:42". */
export function clockTime(at: string | number, { clock, timeZone }: Reader): string {
  const [hour = 0, minute = 0] = clockOf(timeZone).format(new Date(at)).split(':').map(Number)
  const minutes = String(minute).padStart(2, '0')
  if (clock === '24') return `${hour}:${minutes}`
  if (minute === 0 && hour % 12 === 0) return hour === 0 ? 'midnight' : 'noon'
  const half = hour < 12 ? 'am' : 'pm'
  return minute === 0 ? `${hour % 12 || 12} ${half}` : `${hour % 12 || 12}:${minutes} ${half}`
}

const minus = (text: string) => text.replace('-', '−')
const fixed = (value: number, digits: number) =>
  minus((Math.abs(value) < 0.5 * 10 ** -digits ? 0 : value).toFixed(digits))

/** Freeze rate; below zero it melts. */
export function rateText(mmPerH: number, { units }: Reader): string {
  return units === 'imperial' ? `${fixed(mmToInches(mmPerH), 2)} in/h` : `${fixed(mmPerH, 1)} mm/h`
}

export function temperatureText(celsius: number, { units }: Reader): string {
  return units === 'imperial' ? `${fixed(celsiusToFahrenheit(celsius), 0)} °F` : `${fixed(celsius, 0)} °C`
}

export function snowText(cm: number, { units }: Reader): string {
  return units === 'imperial' ? `${fixed(mmToInches(cm * 10), 1)} in` : `${fixed(cm, 1)} cm`
}

export function rainText(mm: number, { units }: Reader): string {
  return units === 'imperial' ? `${fixed(mmToInches(mm), 2)} in` : `${fixed(mm, 1)} mm`
}

/** A part of the heat balance, with its sign. */
export function heatText(wattsPerM2: number): string {
  return `${fixed(wattsPerM2, 0)} W/m²`
}

export const axisNumber = (value: number) => minus(String(value))

export function waterText(litres: number, { units }: Reader): string {
  const amount = units === 'imperial' ? litresToGallons(litres) : litres
  return `${amount.toLocaleString('en', { maximumFractionDigits: 0 })} ${units === 'imperial' ? 'gal' : 'L'}`
}

export function flowText(litresPerMin: number, reader: Reader): string {
  return `${waterText(litresPerMin, reader)} a minute`
}

/** "Fri 15 January"; a calendar date has no zone. */
export function dayText(date: string): string {
  return formatInTimeZone(`${date}T12:00:00Z`, 'UTC', 'EEE d MMMM')
}

/** "Tue 12 to Wed 13 January" */
export function nightText(date: string): string {
  const next = addDays(date, 1)
  const isSameMonth = date.slice(0, 7) === next.slice(0, 7)
  return `${formatInTimeZone(`${date}T12:00:00Z`, 'UTC', isSameMonth ? 'EEE d' : 'EEE d MMMM')} to ${dayText(next)}`
}

/** How long ago, in the largest unit that fits. */
export function ageText(from: string, now: number): string {
  const minutes = Math.max(0, Math.round((now - Date.parse(from)) / 60_000))
  if (minutes < 1) return 'just now'
  if (minutes < 60) return `${minutes} ${minutes === 1 ? 'minute' : 'minutes'} ago`
  const hours = Math.round(minutes / 60)
  if (hours < 48) return `${hours} ${hours === 1 ? 'hour' : 'hours'} ago`
  return `${Math.round(hours / 24)} days ago`
}
