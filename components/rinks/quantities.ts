// Figures for people: one quantity, one form, in the reader's units and by the rink's clock.
import { formatInTimeZone } from 'date-fns-tz'
import type { TonightView } from '@/lib/schemas/tonight-view'
import { celsiusToFahrenheit, mmToInches } from '@/lib/units'

export interface Reader {
  units: 'metric' | 'imperial'
  clock: '12' | '24'
  timeZone: string
}

export function readerOf({ viewer, rink }: Pick<TonightView, 'viewer' | 'rink'>): Reader {
  return { units: viewer.units, clock: viewer.clock, timeZone: rink.timeZone }
}

/** "9 pm", "9:42 pm"; or "21:42". */
export function clockTime(at: string | number, { clock, timeZone }: Reader): string {
  const instant = new Date(at)
  if (clock === '24') return formatInTimeZone(instant, timeZone, 'H:mm')
  const isWhole = formatInTimeZone(instant, timeZone, 'mm') === '00'
  return formatInTimeZone(instant, timeZone, isWhole ? 'h aaa' : 'h:mm aaa')
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
