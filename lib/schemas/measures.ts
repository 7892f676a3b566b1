// What people type in their own units: which unit, which range, and the way to SI and back.
import {
  celsiusToFahrenheit,
  fahrenheitToCelsius,
  feetToMetres,
  gallonsToLitres,
  inchesToMm,
  litresToGallons,
  metresToFeet,
  mmToInches,
} from '@/lib/units'

export const unitSystems = ['metric', 'imperial'] as const
export type UnitSystem = (typeof unitSystems)[number]

interface Scale {
  unit: string
  /** Decimals shown. */
  decimals: number
  toSi: (value: number) => number
  fromSi: (value: number) => number
}

interface Measure {
  /** Smallest and largest that make sense; the database refuses the rest too. [SI] */
  least: number
  most: number
  scales: Record<UnitSystem, Scale>
}

const same = (value: number) => value
const metric = (unit: string, decimals: number, factor = 1): Scale => ({
  unit,
  decimals,
  toSi: (value) => value * factor,
  fromSi: (value) => value / factor,
})
const inches: Scale = { unit: 'in', decimals: 2, toSi: inchesToMm, fromSi: mmToInches }

/** Keyed by the quantity; SI is m, mm, L/min, L and °C. */
export const MEASURES = {
  side: {
    least: 2,
    most: 100,
    scales: { metric: metric('m', 1), imperial: { unit: 'ft', decimals: 1, toSi: feetToMetres, fromSi: metresToFeet } },
  },
  iceThickness: { least: 0, most: 2000, scales: { metric: metric('cm', 1, 10), imperial: inches } },
  fillDepth: { least: 20, most: 1000, scales: { metric: metric('cm', 1, 10), imperial: inches } },
  layer: { least: 0.5, most: 30, scales: { metric: metric('mm', 1), imperial: inches } },
  flow: {
    least: 1,
    most: 400,
    scales: {
      metric: metric('L/min', 1),
      imperial: { unit: 'US gal/min', decimals: 1, toSi: gallonsToLitres, fromSi: litresToGallons },
    },
  },
  bucket: {
    least: 1,
    most: 1000,
    scales: {
      metric: metric('L', 1),
      imperial: { unit: 'US gal', decimals: 1, toSi: gallonsToLitres, fromSi: litresToGallons },
    },
  },
  waterTemperature: {
    least: 0,
    most: 95,
    scales: {
      metric: { unit: '°C', decimals: 1, toSi: same, fromSi: same },
      imperial: { unit: '°F', decimals: 0, toSi: fahrenheitToCelsius, fromSi: celsiusToFahrenheit },
    },
  },
} satisfies Record<string, Measure>

export type MeasureName = keyof typeof MEASURES

export function unitOf(measure: MeasureName, units: UnitSystem): string {
  return MEASURES[measure].scales[units].unit
}

/** An SI value as a person would type it: "33", "0.12". */
export function typed(measure: MeasureName, units: UnitSystem, valueSi: number): string {
  const { decimals, fromSi } = MEASURES[measure].scales[units]
  return String(Number(fromSi(valueSi).toFixed(decimals)))
}

const NUMBER = /^[+-]?(\d+([.,]\d*)?|[.,]\d+)$/

/** A number as typed, with a point or a comma; undefined when it is none. */
export function parseNumber(text: string): number | undefined {
  const plain = text.trim().replace(/^[\u2212\u2013]/, '-')
  return NUMBER.test(plain) ? Number(plain.replace(',', '.')) : undefined
}

/** Between the limits, also where they look rounded in the person's units. */
export function fitsMeasure(measure: MeasureName, valueSi: number): boolean {
  const { least, most } = MEASURES[measure]
  return valueSi >= least && valueSi <= most
}

/** "Between 2 and 100 m." The limits are rounded inward, so that what they promise is accepted. */
export function rangeMessage(measure: MeasureName, units: UnitSystem): string {
  const { least, most, scales } = MEASURES[measure]
  const { unit, decimals, fromSi } = scales[units]
  const step = 10 ** decimals
  const tidy = (value: number) => Number(value.toFixed(6))
  const low = Math.ceil(tidy(fromSi(least) * step)) / step
  const high = Math.floor(tidy(fromSi(most) * step)) / step
  return `Between ${low} and ${high} ${unit}, please.`
}
