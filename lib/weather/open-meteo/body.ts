// Reads a 200 body of Open-Meteo and refuses anything that is not a sound series of hours.
import { z } from 'zod'
import { HOUR_SECONDS } from '@/lib/physics/constants'
import { WeatherError } from '../port'

const bodySchema = z.object({
  utc_offset_seconds: z.literal(0),
  hourly_units: z.record(z.string(), z.string()),
  hourly: z.object({ time: z.array(z.int()).min(2) }).catchall(z.array(z.number().nullable())),
})

export type Column = (number | null)[]

export interface HourlyBody {
  /** Labels. [unix s] */
  times: number[]
  columns: Record<string, Column>
}

/**
 * The columns of a body whose every unit is as asked for. A column that the model behind the answer lacks has the unit
 * "undefined" and only nulls.
 *
 * @param unitOf the unit that a column must have, or null when nobody asked for the column
 * @throws WeatherError malformed
 */
export function readBody(text: string, unitOf: (column: string) => string | null): HourlyBody {
  const parsed = bodySchema.safeParse(parseJson(text))
  if (!parsed.success) {
    const issue = parsed.error.issues[0]
    throw malformed(`${issue?.path.join('.') || 'body'}: ${issue?.message}`)
  }
  const { time, ...columns } = parsed.data.hourly
  checkTimes(time, parsed.data.hourly_units.time)
  for (const [name, column] of Object.entries(columns)) {
    const unit = parsed.data.hourly_units[name]
    const expected = unitOf(name)
    if (column.length !== time.length) throw malformed(`${name} has ${column.length} values for ${time.length} hours`)
    if (expected !== null && unit !== expected && unit !== 'undefined') {
      throw malformed(`${name} is in "${unit}" instead of "${expected}"`)
    }
  }
  return { times: time, columns }
}

/** The service sometimes begins a 200 and ends it with the text of an error, so broken JSON is an outage, not a bug. */
function parseJson(text: string): unknown {
  try {
    return JSON.parse(text)
  } catch (error) {
    throw new WeatherError('malformed', `Open-Meteo: body is not JSON, ends with "${text.slice(-80)}"`, {
      cause: error,
    })
  }
}

function checkTimes(times: number[], unit: string | undefined): void {
  if (unit !== 'unixtime') throw malformed(`time is in "${unit}" instead of "unixtime"`)
  times.forEach((time, index) => {
    const previous = times[index - 1]
    if (time % HOUR_SECONDS !== 0 || (previous !== undefined && time !== previous + HOUR_SECONDS)) {
      throw malformed(`hour ${index} does not follow the one before it`)
    }
  })
}

export function malformed(what: string): WeatherError {
  return new WeatherError('malformed', `Open-Meteo: ${what}`)
}
