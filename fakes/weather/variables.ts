// The hourly variables of the pretended model, and how each is read from the weather.
import type { Weather } from './generate'
import type { Place } from './place'
import type { Quantity } from './units'

export interface Variable {
  quantity: Quantity
  /** Sums, means and maxima stand under the label at the END of their hour. */
  over: 'instant' | 'hour'
  /** Null for a variable that the service knows and this model does not have. */
  read: ((weather: Weather, place: Place) => number) | null
}

const instant = (quantity: Quantity, read: Variable['read']): Variable => ({ quantity, over: 'instant', read })
const hour = (quantity: Quantity, read: Variable['read']): Variable => ({ quantity, over: 'hour', read })

export const VARIABLES: Record<string, Variable> = {
  temperature_2m: instant('temperature', (w) => w.temperatureC),
  dew_point_2m: instant('temperature', dewPointC),
  relative_humidity_2m: instant('share', (w) => w.humidity),
  pressure_msl: instant('pressure', (w) => w.pressureMslHpa),
  surface_pressure: instant('pressure', surfacePressureHpa),
  cloud_cover: instant('share', (w) => w.cloud),
  wind_speed_10m: instant('speed', (w) => w.windMps),
  wind_direction_10m: instant('direction', (w) => w.windFromDeg),
  wind_gusts_10m: hour('speed', (w) => w.gustMps),
  shortwave_radiation: hour('radiation', (w) => w.shortwaveWm2),
  precipitation: hour('water', precipitationMm),
  precipitation_probability: hour('share', (w) => (precipitationMm(w) > 0.1 ? 0.86 : 0.08 * w.cloud)),
  rain: hour('water', (w) => w.rainMm),
  showers: hour('water', () => 0),
  snowfall: hour('snow', (w) => w.snowCm),
  weather_code: hour('code', weatherCode),
  snow_depth: instant('depth', (_, place) => 0.08 + place.elevationM / 4000),
  soil_temperature_0cm: instant('temperature', (w) => w.temperatureC - 1.2 * (1 - w.cloud)),
  is_day: instant('flag', (w) => (w.sunUp ? 1 : 0)),
  soil_temperature_18cm: instant('temperature', null),
  soil_temperature_54cm: instant('temperature', null),
}

/** The service's own snow: 0.7 cm for a millimetre of water. */
function precipitationMm(weather: Weather): number {
  return weather.rainMm + weather.snowCm / 0.7
}

/** Magnus form with 17.625 and 243.04. */
function dewPointC({ temperatureC, humidity }: Weather): number {
  const gamma = Math.log(humidity) + (17.625 * temperatureC) / (243.04 + temperatureC)
  return (243.04 * gamma) / (17.625 - gamma)
}

/** Lapse 0.0065 K/m, exponent 5.2558. */
function surfacePressureHpa({ pressureMslHpa, temperatureC }: Weather, { elevationM }: Place): number {
  const drop = 0.0065 * elevationM
  return pressureMslHpa * (1 - drop / (temperatureC + 273.15 + drop)) ** 5.2558
}

/** The highest step that the amount reaches. */
function step(amount: number, steps: [least: number, code: number][]): number | null {
  return steps.reduce<number | null>((code, [least, next]) => (amount >= least ? next : code), null)
}

function weatherCode(weather: Weather): number {
  const snow = step(weather.snowCm, [
    [0.01, 71],
    [0.2, 73],
    [0.8, 75],
  ])
  const rain = step(weather.rainMm, [
    [0.01, 51],
    [0.5, 53],
    [1, 55],
    [1.3, 61],
    [2.5, 63],
    [7.6, 65],
  ])
  if (rain !== null && weather.temperatureC < 0) return weather.rainMm < 1.3 ? 66 : 67
  return (
    snow ??
    rain ??
    step(weather.cloud, [
      [0, 0],
      [0.2, 1],
      [0.5, 2],
      [0.8, 3],
    ]) ??
    0
  )
}
