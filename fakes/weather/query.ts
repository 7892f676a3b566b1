// Reads a request the way the service does, with its defaults and its complaints.
import { getTimezoneOffset } from 'date-fns-tz'
import { ENSEMBLES, MODELS } from './models'
import { solarOffsetHours } from './place'
import type { UnitChoice } from './units'
import { VARIABLES } from './variables'

/** Becomes a 400 with this reason. */
export class BadRequest extends Error {}

export interface Query {
  places: { latitude: number; longitude: number }[]
  variables: string[]
  /** With two or more, every column ends with the name of its model. */
  models: { name: string; members: number }[]
  units: UnitChoice
  unixTime: boolean
  timeZone: string
  /** Of the zone at this moment, for the whole series, as the service does it. */
  offsetSeconds: number
  firstHour: number
  hourCount: number
}

export function readQuery(params: URLSearchParams, kind: 'forecast' | 'ensemble', nowHour: number): Query {
  const list = (name: string) => params.getAll(name).flatMap((value) => value.split(',').filter(Boolean))
  const variables = list('hourly')
  for (const name of variables) {
    if (!Object.hasOwn(VARIABLES, name)) throw new BadRequest(invalidValue(VARIABLE_TYPE, name))
  }
  const places = readPlaces(list('latitude'), list('longitude'))
  const { timeZone, offsetSeconds } = readZone(params.get('timezone') ?? 'GMT', places[0]?.longitude ?? 0, nowHour)
  return {
    places,
    variables,
    models: readModels(list('models'), kind),
    units: {
      temperature: oneOf(params, 'temperature_unit', ['celsius', 'fahrenheit']),
      windSpeed: oneOf(params, 'wind_speed_unit', ['kmh', 'ms', 'mph', 'kn']),
      precipitation: oneOf(params, 'precipitation_unit', ['mm', 'inch']),
    },
    unixTime: oneOf(params, 'timeformat', ['iso8601', 'unixtime']) === 'unixtime',
    timeZone,
    offsetSeconds,
    ...readRange(params, nowHour, offsetSeconds),
  }
}

/** Calls that the request counts for against the quota. */
export function weightOf(query: Query): number {
  const columns = query.variables.length * query.models.reduce((sum, model) => sum + model.members, 0)
  const days = Math.floor(query.hourCount / 24)
  return query.places.length * Math.max(1, (columns / 10) * Math.max(1, days / 14))
}

const VARIABLE_TYPE =
  'SurfacePressureAndHeightVariable<VariableAndPreviousDay, VariableOrSpread<ForecastPressureVariable>, ForecastHeightVariable>'

function invalidValue(type: string, value: string): string {
  return `Data corrupted at path ''. Cannot initialize ${type} from invalid String value ${value}.`
}

function readPlaces(latitudes: string[], longitudes: string[]): Query['places'] {
  if (latitudes.length !== longitudes.length || latitudes.length === 0) {
    throw new BadRequest("Parameter 'latitude' and 'longitude' must have the same number of elements")
  }
  if (latitudes.length > 1000) throw new BadRequest('Only up to 1000 locations can be requested at once')
  return latitudes.map((text, index) => ({
    latitude: degrees('Latitude', text, 90),
    longitude: degrees('Longitude', longitudes[index] ?? '', 180),
  }))
}

function degrees(name: string, text: string, most: number): number {
  const value = Number(text)
  if (Math.abs(value) <= most) return value
  throw new BadRequest(`${name} must be in range of -${most} to ${most}°. Given: ${text}.`)
}

function readModels(names: string[], kind: 'forecast' | 'ensemble'): Query['models'] {
  if (kind === 'forecast') {
    return (names.length ? names : ['best_match']).map((name) => {
      if (!MODELS.has(name)) throw new BadRequest(invalidValue('MultiDomains', name))
      return { name, members: 1 }
    })
  }
  return (names.length ? names : ['ncep_gefs025']).map((name) => {
    const ensemble = Object.hasOwn(ENSEMBLES, name) ? ENSEMBLES[name] : undefined
    if (!ensemble) throw new BadRequest(invalidValue('EnsembleMultiDomains', name))
    return ensemble
  })
}

function oneOf<T extends string>(params: URLSearchParams, name: string, values: [T, ...T[]]): T {
  const given = params.get(name) ?? values[0]
  const value = values.find((candidate) => candidate === given)
  if (!value) throw new BadRequest(invalidValue(name, given))
  return value
}

function readZone(zone: string, longitude: number, nowHour: number) {
  const west = -solarOffsetHours({ longitude })
  const timeZone = zone === 'auto' ? `Etc/GMT${west < 0 ? west : `+${west}`}` : zone
  const offsetMs = timeZone === 'GMT' ? 0 : getTimezoneOffset(timeZone, new Date(nowHour * 3_600_000))
  if (Number.isNaN(offsetMs)) throw new BadRequest('Invalid timezone')
  return { timeZone, offsetSeconds: offsetMs / 1000 }
}

function readRange(params: URLSearchParams, nowHour: number, offsetSeconds: number) {
  if (params.has('past_hours') || params.has('forecast_hours')) {
    const past = wholeNumber(params, 'past_hours', 0, 93 * 24, 'Past hours')
    return {
      firstHour: nowHour - past,
      hourCount: past + wholeNumber(params, 'forecast_hours', 168, 384, 'Forecast hours'),
    }
  }
  const past = wholeNumber(params, 'past_days', 0, 93, 'Past days')
  const ahead = wholeNumber(params, 'forecast_days', 7, 16, 'Forecast days')
  const offsetHours = Math.floor(offsetSeconds / 3600)
  const midnight = Math.floor((nowHour + offsetHours) / 24) * 24 - offsetHours
  return { firstHour: midnight - past * 24, hourCount: (past + ahead) * 24 }
}

function wholeNumber(params: URLSearchParams, name: string, otherwise: number, most: number, title: string): number {
  const value = Number(params.get(name) ?? otherwise)
  if (Number.isInteger(value) && value >= 0 && value <= most) return value
  throw new BadRequest(`${title} is invalid. Allowed range 0 to ${most}. Given ${params.get(name)}.`)
}
