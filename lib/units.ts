// The only place where units are converted. Inside everything is SI and °C; these are for what people read and type.

/** What each quantity can be read and typed in. `ice` is for ice, layers, snow, rain and depths; `size` for the yard. */
export const UNIT_CHOICES = {
  temperature: ['C', 'F'],
  ice: ['cm', 'in'],
  water: ['L', 'gal'],
  size: ['m', 'ft'],
  wind: ['km/h', 'm/s', 'mph'],
} as const

export type UnitName = keyof typeof UNIT_CHOICES
export type Units = { [Name in UnitName]: (typeof UNIT_CHOICES)[Name][number] }

export const METRIC: Units = { temperature: 'C', ice: 'cm', water: 'L', size: 'm', wind: 'km/h' }
/** United States customary units. */
export const IMPERIAL: Units = { temperature: 'F', ice: 'in', water: 'gal', size: 'ft', wind: 'mph' }

export const UNIT_NAMES: readonly UnitName[] = ['temperature', 'ice', 'water', 'size', 'wind']

/** One word for all five, as a form's hidden field sends them: "C,cm,L,m,km/h". */
export function unitsCode(units: Units): string {
  return UNIT_NAMES.map((name) => units[name]).join(',')
}

const PRESETS: Record<string, Units> = { metric: METRIC, imperial: IMPERIAL }

/** The units of a code, or of "metric" and "imperial"; undefined when it is none. */
export function unitsOfCode(code: string): Units | undefined {
  if (Object.hasOwn(PRESETS, code)) return PRESETS[code]
  const parts = code.split(',')
  const isKnown = UNIT_NAMES.every((name, index) =>
    (UNIT_CHOICES[name] as readonly string[]).includes(parts[index] ?? ''),
  )
  if (!isKnown || parts.length !== UNIT_NAMES.length) return undefined
  return Object.fromEntries(UNIT_NAMES.map((name, index) => [name, parts[index]])) as Units
}

export const celsiusToFahrenheit = (temperatureC: number) => temperatureC * 1.8 + 32
export const fahrenheitToCelsius = (temperatureF: number) => (temperatureF - 32) / 1.8

/** International inch, 25.4 mm by definition. */
export const mmToInches = (mm: number) => mm / 25.4
export const inchesToMm = (inches: number) => inches * 25.4
export const metresToFeet = (metres: number) => metres / 0.3048
export const feetToMetres = (feet: number) => feet * 0.3048

/** US gallon, 3.785411784 L by definition; Canadian keepers who think in gallons mostly mean this one too. */
export const litresToGallons = (litres: number) => litres / 3.785411784
export const gallonsToLitres = (gallons: number) => gallons * 3.785411784

/** International mile, 1609.344 m by definition. */
export const mpsToMph = (mps: number) => (mps * 3600) / 1609.344
export const mphToMps = (mph: number) => (mph * 1609.344) / 3600
export const mpsToKmh = (mps: number) => mps * 3.6
export const kmhToMps = (kmh: number) => kmh / 3.6

export const m2ToFt2 = (m2: number) => m2 / 0.3048 ** 2
