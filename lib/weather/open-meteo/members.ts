// Turns the columns of an ensemble into full hourly records, one series a run.
import type { HourlyRecord } from '@/lib/physics/types'
import { malformed, type Column, type HourlyBody } from './body'
import { ENSEMBLE_UNITS, type EnsembleVariable } from './request'

/** Fewer runs than this say too little about how sure a forecast is. */
const LEAST_MEMBERS = 15
const LEAST_HOURS = 24
/** Depth the service gives a millimetre of snow water. [cm/mm] */
const SNOW_CM_PER_MM = 0.7

type MemberColumns = Partial<Record<EnsembleVariable, Column>>

const COLUMN_NAME = new RegExp(`^(${Object.keys(ENSEMBLE_UNITS).join('|')})(?:_member(\\d\\d))?(?:_([a-z].*))?$`)

/** The unit of an ensemble column, whichever member and model its name ends with. */
export function ensembleUnitOf(column: string): string | null {
  const variable = COLUMN_NAME.exec(column)?.[1]
  return variable === undefined ? null : ENSEMBLE_UNITS[variable as EnsembleVariable]
}

/**
 * @param hours the main forecast, from which every run takes what the ensemble was not asked for, and whole hours
 *   where it has none
 * @throws WeatherError malformed when too few runs are whole; a run that is empty or stopped early is left out
 */
export function toMembers(body: HourlyBody, hours: HourlyRecord[]): HourlyRecord[][] {
  const indexOfTime = new Map(body.times.map((time, index) => [time, index]))
  const whole = [...groupByMember(body.columns).values()].filter(
    (member) => countKnown(member.temperature_2m) >= LEAST_HOURS && countKnown(member.wind_speed_10m) >= LEAST_HOURS,
  )
  if (whole.length < LEAST_MEMBERS) throw malformed(`only ${whole.length} runs of the ensemble are whole`)
  return whole.map((member) =>
    hours.map((hour) => {
      const index = indexOfTime.get(Date.parse(hour.time) / 1000)
      return index === undefined ? hour : memberHour(member, index, hour)
    }),
  )
}

/** The control run has no member number and is a run like the others. */
function groupByMember(columns: Record<string, Column>): Map<string, MemberColumns> {
  const members = new Map<string, MemberColumns>()
  for (const [name, column] of Object.entries(columns)) {
    const [, variable, member = '00', model = ''] = COLUMN_NAME.exec(name) ?? []
    if (variable === undefined) continue
    const key = `${model} ${member}`
    members.set(key, { ...members.get(key), [variable]: column })
  }
  return members
}

/** The air keeps its relative humidity when the run is warmer or colder; precipitation is split at 0 °C, as the service does. */
function memberHour(member: MemberColumns, index: number, main: HourlyRecord): HourlyRecord {
  const read = (name: EnsembleVariable, at: number) => member[name]?.[at] ?? null
  const temperature = read('temperature_2m', index) ?? main.airTemperatureC
  const wind = read('wind_speed_10m', index) ?? main.windSpeedMps
  const cloudPercent = read('cloud_cover', index)
  const shiftC = temperature !== null && main.airTemperatureC !== null ? temperature - main.airTemperatureC : 0
  return {
    ...main,
    airTemperatureC: temperature,
    dewPointC: main.dewPointC === null ? null : Math.round((main.dewPointC + shiftC) * 10) / 10,
    windSpeedMps: wind,
    windGustMps: main.windGustMps === null ? null : Math.max(main.windGustMps, wind ?? 0),
    cloudCover: cloudPercent === null ? main.cloudCover : Math.min(1, Math.max(0, cloudPercent / 100)),
    ...precipitation(read('precipitation', index + 1), temperature),
  }
}

function precipitation(amountMm: number | null, temperatureC: number | null) {
  if (amountMm === null || temperatureC === null) return {}
  const precipitationMm = Math.max(0, amountMm)
  const freezes = temperatureC <= 0
  return {
    precipitationMm,
    rainMm: freezes ? 0 : precipitationMm,
    snowfallCm: freezes ? precipitationMm * SNOW_CM_PER_MM : 0,
  }
}

function countKnown(column: Column | undefined): number {
  return column?.filter((value) => value !== null).length ?? 0
}
