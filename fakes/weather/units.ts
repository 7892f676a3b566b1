// How the wire writes each quantity: its unit by the parameters of the request, and its fixed number of decimals.

export interface UnitChoice {
  temperature: 'celsius' | 'fahrenheit'
  windSpeed: 'kmh' | 'ms' | 'mph' | 'kn'
  precipitation: 'mm' | 'inch'
}

export interface WireUnit {
  name: string
  decimals: number
  /** From our own unit: °C, m/s, mm, cm, 0-1, hPa. */
  convert?: (value: number) => number
}

export type Quantity = keyof ReturnType<typeof wireUnits>

export function wireUnits(choice: UnitChoice) {
  const inch = choice.precipitation === 'inch'
  return {
    temperature:
      choice.temperature === 'celsius'
        ? { name: '°C', decimals: 1 }
        : { name: '°F', decimals: 1, convert: (celsius: number) => celsius * 1.8 + 32 },
    speed: WIND_UNITS[choice.windSpeed],
    water: inch ? { name: 'inch', decimals: 3, convert: (mm: number) => mm / 25.4 } : { name: 'mm', decimals: 2 },
    snow: inch ? { name: 'inch', decimals: 3, convert: (cm: number) => cm / 2.54 } : { name: 'cm', decimals: 2 },
    depth: inch ? { name: 'ft', decimals: 3, convert: (m: number) => m / 0.3048 } : { name: 'm', decimals: 2 },
    share: { name: '%', decimals: 0, convert: (share: number) => share * 100 },
    pressure: { name: 'hPa', decimals: 1 },
    radiation: { name: 'W/m²', decimals: 1 },
    direction: { name: '°', decimals: 0 },
    code: { name: 'wmo code', decimals: 0 },
    flag: { name: '', decimals: 0 },
  } satisfies Record<string, WireUnit>
}

const WIND_UNITS: Record<UnitChoice['windSpeed'], WireUnit> = {
  kmh: { name: 'km/h', decimals: 1, convert: (ms) => ms * 3.6 },
  ms: { name: 'm/s', decimals: 2 },
  mph: { name: 'mp/h', decimals: 1, convert: (ms) => ms / 0.44704 },
  kn: { name: 'kn', decimals: 1, convert: (ms) => ms * 1.943844 },
}
