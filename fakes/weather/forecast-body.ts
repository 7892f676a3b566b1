// Writes the answer to a request, byte for byte as a client of the service would meet it.
import { weatherAt, type Story, type Weather } from './generate'
import { asRun } from './models'
import { tonightOf, snapToGrid } from './place'
import type { Query } from './query'
import { SCENARIOS, type Scenario, type ScenarioName } from './scenarios'
import { wireUnits, type WireUnit } from './units'
import { VARIABLES, type Variable } from './variables'

const MODEL_ENDS_AFTER_HOURS = 16 * 24

interface Column {
  key: string
  unit: WireUnit | { name: 'undefined' }
  values: string
}

export type ScenarioAt = (latitude: number, longitude: number) => ScenarioName

/** An object for one place, an array for more. */
export function writeBody(query: Query, now: Date, scenarioAt: ScenarioAt): string {
  const bodies = query.places.map(({ latitude, longitude }, index) => {
    const place = snapToGrid(latitude, longitude)
    const story = { scenario: scenarioAt(latitude, longitude), place, tonight: tonightOf(now.getTime(), place) }
    return writePlace(query, story, Math.floor(now.getTime() / 3_600_000), index)
  })
  return bodies.length === 1 ? (bodies[0] ?? '') : `[${bodies.join(',')}]`
}

function writePlace(query: Query, story: Story, nowHour: number, index: number): string {
  const { place } = story
  const head = [
    `"latitude":${place.latitude}`,
    `"longitude":${place.longitude}`,
    '"generationtime_ms":0.41306018829345703',
    `"utc_offset_seconds":${query.offsetSeconds}`,
    `"timezone":${JSON.stringify(query.timeZone)}`,
    `"timezone_abbreviation":"${abbreviation(query.offsetSeconds)}"`,
    `"elevation":${place.elevationM.toFixed(1)}`,
  ]
  // The first index is zero, and zero is dropped.
  if (index > 0) head.push(`"location_id":${index}`)
  if (query.variables.length === 0) return `{${head.join(',')}}`
  const columns = [timeColumn(query), ...dataColumns(query, story, nowHour)]
  const units = columns.map(({ key, unit }) => `${JSON.stringify(key)}:${JSON.stringify(unit.name)}`)
  const values = columns.map((column) => `${JSON.stringify(column.key)}:[${column.values}]`)
  return `{${head.join(',')},"hourly_units":{${units.join(',')}},"hourly":{${values.join(',')}}}`
}

function timeColumn(query: Query): Column {
  const labels = Array.from({ length: query.hourCount }, (_, index) => {
    const seconds = (query.firstHour + index) * 3600
    if (query.unixTime) return String(seconds)
    return `"${new Date((seconds + query.offsetSeconds) * 1000).toISOString().slice(0, 16)}"`
  })
  return { key: 'time', unit: { name: query.unixTime ? 'unixtime' : 'iso8601', decimals: 0 }, values: labels.join(',') }
}

function dataColumns(query: Query, story: Story, nowHour: number): Column[] {
  const units = wireUnits(query.units)
  // One hour before the first label too: its amounts stand under that label.
  const series = Array.from({ length: query.hourCount + 1 }, (_, index) =>
    knownWeather(story, query.firstHour + index - 1, nowHour),
  )
  return query.models.flatMap((model, modelIndex) =>
    query.variables.flatMap((name) =>
      Array.from({ length: model.members }, (_, member): Column => {
        const variable = VARIABLES[name]
        const suffix =
          (member ? `_member${String(member).padStart(2, '0')}` : '') +
          (query.models.length > 1 ? `_${model.name}` : '')
        if (!variable?.read)
          return {
            key: name + suffix,
            unit: { name: 'undefined' },
            values: Array(query.hourCount).fill('null').join(','),
          }
        const unit: WireUnit = units[variable.quantity]
        const run = modelIndex * 100 + member
        const values = Array.from({ length: query.hourCount }, (_, index) => {
          const at = variable.over === 'hour' ? index : index + 1
          return writeValue(variable, unit, story, series[at] ?? null, run, query.firstHour + index - nowHour)
        })
        return { key: name + suffix, unit, values: values.join(',') }
      }),
    ),
  )
}

function knownWeather(story: Story, hour: number, nowHour: number): Weather | null {
  const scenario: Scenario = SCENARIOS[story.scenario]
  const endsAfter = scenario.endsAfterHours ?? MODEL_ENDS_AFTER_HOURS
  return hour - nowHour > endsAfter ? null : weatherAt(story, hour)
}

function writeValue(
  variable: Variable,
  unit: WireUnit,
  story: Story,
  weather: Weather | null,
  run: number,
  hoursAhead: number,
): string {
  if (!weather || !variable.read) return 'null'
  const value = variable.read(asRun(weather, run, hoursAhead), story.place)
  return (unit.convert ? unit.convert(value) : value).toFixed(unit.decimals)
}

function abbreviation(offsetSeconds: number): string {
  const hours = offsetSeconds / 3600
  return hours === 0 ? 'GMT' : `GMT${hours > 0 ? '+' : ''}${hours}`
}
