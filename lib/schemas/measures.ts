// What people type in their own units: which unit, which range, and the way to SI and back.
import {
  celsiusToFahrenheit,
  fahrenheitToCelsius,
  feetToMetres,
  gallonsToLitres,
  inchesToMm,
  kmhToMps,
  litresToGallons,
  metresToFeet,
  mmToInches,
  mphToMps,
  mpsToKmh,
  mpsToMph,
  type Units,
} from '@/lib/units'

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
  scaleIn: (units: Units) => Scale
}

const same = (value: number) => value
const plain = (unit: string, decimals: number): Scale => ({ unit, decimals, toSi: same, fromSi: same })

const INCHES: Scale = { unit: 'in', decimals: 2, toSi: inchesToMm, fromSi: mmToInches }
/** A tenth of a millimetre is 0.004 in. */
const FINE_INCHES: Scale = { ...INCHES, decimals: 3 }
const CENTIMETRES: Scale = { unit: 'cm', decimals: 1, toSi: (cm) => cm * 10, fromSi: (mm) => mm / 10 }
const FEET: Scale = { unit: 'ft', decimals: 1, toSi: feetToMetres, fromSi: metresToFeet }
const FAHRENHEIT: Scale = { unit: '°F', decimals: 0, toSi: fahrenheitToCelsius, fromSi: celsiusToFahrenheit }
const WINDS: Record<Units['wind'], Scale> = {
  'km/h': { unit: 'km/h', decimals: 0, toSi: kmhToMps, fromSi: mpsToKmh },
  'm/s': plain('m/s', 1),
  mph: { unit: 'mph', decimals: 0, toSi: mphToMps, fromSi: mpsToMph },
}
const gallons = (unit: string): Scale => ({ unit, decimals: 1, toSi: gallonsToLitres, fromSi: litresToGallons })

/** A thousand gallons are 3.785 m³. */
const PER_1000_GALLONS: Scale = {
  unit: 'per 1000 US gal',
  decimals: 2,
  toSi: litresToGallons,
  fromSi: gallonsToLitres,
}

const thickness = ({ ice }: Units) => (ice === 'in' ? INCHES : CENTIMETRES)
const film = ({ ice }: Units) => (ice === 'in' ? INCHES : plain('mm', 1))
const warmth = ({ temperature }: Units) => (temperature === 'F' ? FAHRENHEIT : plain('°C', 1))

/** Keyed by the quantity; SI is m, mm, L/min, L, m/s and °C. */
export const MEASURES = {
  side: { least: 2, most: 100, scaleIn: ({ size }) => (size === 'ft' ? FEET : plain('m', 1)) },
  iceThickness: { least: 0, most: 2000, scaleIn: thickness },
  fillDepth: { least: 20, most: 1000, scaleIn: thickness },
  /** As the rink's usual one is set. */
  layer: { least: 0.5, most: 30, scaleIn: film },
  /** As one pour came out: little water on a large rink, or a corner that took much. */
  pouredLayer: { least: 0.1, most: 100, scaleIn: (units) => (units.ice === 'in' ? FINE_INCHES : film(units)) },
  /** How far the ground lies below its highest point. */
  drop: { least: 0, most: 1000, scaleIn: thickness },
  boardHeight: { least: 50, most: 1500, scaleIn: thickness },
  /** Board above the water. */
  freeboard: { least: 0, most: 500, scaleIn: thickness },
  /** Water over the highest point of the floor. */
  leastDepth: { least: 10, most: 1000, scaleIn: thickness },
  lowCornerDepth: { least: 0, most: 1500, scaleIn: thickness },
  carriesSkater: { least: 70, most: 300, scaleIn: thickness },
  flow: {
    least: 1,
    most: 400,
    scaleIn: ({ water }) => (water === 'gal' ? gallons('US gal/min') : plain('L/min', 1)),
  },
  /** Of one entry of the log; at most a first fill of the largest rink we take, 100 m by 100 m, 10 cm deep. Ours. */
  pouredWater: {
    least: 1,
    most: 1_000_000,
    scaleIn: ({ water }) => (water === 'gal' ? { ...gallons('US gal'), decimals: 0 } : plain('L', 0)),
  },
  bucket: { least: 1, most: 1000, scaleIn: ({ water }) => (water === 'gal' ? gallons('US gal') : plain('L', 1)) },
  /** In the keeper's money for a cubic metre; with gallons, for a thousand of them. */
  waterPrice: {
    least: 0,
    most: 1000,
    scaleIn: ({ water }) => (water === 'gal' ? PER_1000_GALLONS : plain('per m³', 2)),
  },
  waterTemperature: { least: 0, most: 95, scaleIn: warmth },
  windChill: { least: -60, most: 0, scaleIn: warmth },
  windLimit: { least: 1, most: 30, scaleIn: ({ wind }) => WINDS[wind] },
} satisfies Record<string, Measure>

export type MeasureName = keyof typeof MEASURES

export function scaleOf(measure: MeasureName, units: Units): Scale {
  return MEASURES[measure].scaleIn(units)
}

export function unitOf(measure: MeasureName, units: Units): string {
  return scaleOf(measure, units).unit
}

/** An SI value as a person would type it: "33", "0.12". */
export function typed(measure: MeasureName, units: Units, valueSi: number): string {
  const { decimals, fromSi } = scaleOf(measure, units)
  return String(Number(fromSi(valueSi).toFixed(decimals)))
}

const NUMBER = /^[+-]?(\d+([.,]\d*)?|[.,]\d+)$/

/** A number as typed, with a point or a comma; undefined when it is none. */
export function parseNumber(text: string): number | undefined {
  const tidy = text.trim().replace(/^[\u2212\u2013]/, '-')
  return NUMBER.test(tidy) ? Number(tidy.replace(',', '.')) : undefined
}

/** Between the limits. */
export function fitsMeasure(measure: MeasureName, valueSi: number): boolean {
  const { least, most } = MEASURES[measure]
  return valueSi >= least && valueSi <= most
}

/** The value where it fits; a limit where the value looks like it in the person's units, as 9.906 mm does of 10 in inches. */
export function fitted(measure: MeasureName, units: Units, valueSi: number): number | undefined {
  if (fitsMeasure(measure, valueSi)) return valueSi
  const { least, most } = MEASURES[measure]
  const limit = valueSi < least ? least : most
  return typed(measure, units, valueSi) === typed(measure, units, limit) ? limit : undefined
}

/** What is stored where the value sent is only its rounding that a form showed: else a mended note would move figures. */
export function unlessAsShown(measure: MeasureName, units: Units, sentSi: number, storedSi: number): number {
  const shownSi = scaleOf(measure, units).toSi(Number(typed(measure, units, storedSi)))
  return sentSi === fitted(measure, units, shownSi) ? storedSi : sentSi
}

/** Decimals that a limit is told with: hundredths of an inch matter of a film of water, not of a board. */
function limitDecimals(value: number, decimals: number): number {
  const size = Math.abs(value)
  return Math.min(decimals, size >= 20 ? 0 : size >= 1 ? 1 : 2)
}

function rounded(value: number, decimals: number, round: (value: number) => number): number {
  const step = 10 ** limitDecimals(value, decimals)
  // Six decimals are enough of a unit that was reckoned over: 0.3 is not to become 0.30000000000000004.
  return round(Number((value * step).toFixed(6))) / step
}

/** "Between 2 and 100 m." The limits are rounded inward, so that what they promise is accepted. */
export function rangeMessage(measure: MeasureName, units: Units): string {
  const { least, most } = MEASURES[measure]
  const { unit, decimals, fromSi } = scaleOf(measure, units)
  const low = rounded(fromSi(least), decimals, Math.ceil)
  const high = rounded(fromSi(most), decimals, Math.floor)
  return `Between ${low} and ${high} ${unit}.`
}
