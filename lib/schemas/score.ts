// The document `npm run score` reads: the contract's field names, checked so that every fault has a JSON path.
import { z } from 'zod'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { dewPointC, saturationOverWaterHpa } from '@/lib/physics/humidity'
import type { HourlyRecord } from '@/lib/physics/types'

/** Rounding in forecasts puts the dew point a little above the air now and then; more means humidity over 107 %. [°C] */
const DEW_POINT_TOLERANCE_C = 1

const between = (low: number, high: number, unit = '') => {
  const expected = `expected a number from ${low} to ${high}${unit ? ` ${unit}` : ''}`
  return z
    .number({ error: (issue) => `${expected}, got ${describeInput(issue.input)}` })
    .refine((value) => value >= low && value <= high, {
      error: (issue) => `${expected}, got ${describeInput(issue.input)}`,
    })
}

function describeInput(input: unknown): string {
  if (input === undefined) return 'nothing'
  return JSON.stringify(input)?.slice(0, 60) ?? typeof input
}

/** A measured or forecast value: absent and null both mean missing. */
const reading = (low: number, high: number, unit: string) =>
  between(low, high, unit)
    .nullish()
    .transform((value) => value ?? null)

const instantSchema = z.iso
  .datetime({
    error: (issue) => `expected an instant in UTC such as 2027-01-12T17:00:00Z, got ${describeInput(issue.input)}`,
  })
  .transform((text) => new Date(text).toISOString().replace('.000Z', 'Z'))

const humiditySchema = reading(0, 100, '%')

const hourSchema = z
  .object({
    time: instantSchema,
    airTemperatureC: reading(-60, 50, '°C'),
    dewPointC: reading(-80, 40, '°C'),
    relativeHumidityPercent: humiditySchema,
    relativeHumidityPct: humiditySchema,
    relativeHumidity: humiditySchema,
    humidity: humiditySchema,
    windSpeedMps: reading(0, 75, 'm/s'),
    windGustMps: reading(0, 120, 'm/s'),
    cloudCover: reading(0, 1, '(share of the sky)'),
    shortwaveWm2: reading(0, 1500, 'W/m²'),
    precipitationMm: reading(0, 200, 'mm'),
    rainMm: reading(0, 200, 'mm'),
    snowfallCm: reading(0, 100, 'cm'),
    pressureHpa: reading(400, 1100, 'hPa'),
    longwaveDownWm2: reading(50, 600, 'W/m²'),
    snowOnIceCm: reading(0, 1000, 'cm'),
  })
  .refine(
    ({ airTemperatureC: air, dewPointC: dew }) => air === null || dew === null || dew <= air + DEW_POINT_TOLERANCE_C,
    { path: ['dewPointC'], error: 'expected at most airTemperatureC: this is a humidity over 100 %' },
  )
  .transform(
    ({ relativeHumidityPercent, relativeHumidityPct, relativeHumidity, humidity, ...record }): HourlyRecord => {
      const percent = relativeHumidityPercent ?? relativeHumidityPct ?? relativeHumidity ?? humidity
      return { ...record, dewPointC: record.dewPointC ?? dewPointFrom(record.airTemperatureC, percent) }
    },
  )

function dewPointFrom(airTemperatureC: number | null, percent: number | null): number | null {
  if (airTemperatureC === null || percent === null) return null
  return dewPointC((saturationOverWaterHpa(airTemperatureC) * Math.max(1, percent)) / 100)
}

/** Hours must follow each other by one hour: no gap, no repeat, no step back. A missing hour is written with nulls. */
const hoursSchema = z
  .array(hourSchema)
  .min(1, { error: 'expected at least one hour' })
  .max(20_000, { error: 'expected at most 20000 hours' })
  .superRefine((hours, context) => {
    for (let index = 1; index < hours.length; index += 1) {
      const due = Date.parse((hours[index - 1] as HourlyRecord).time) + HOUR_MILLIS
      const time = (hours[index] as HourlyRecord).time
      // An unreadable time has its own fault.
      if (Date.parse(time) === due || Number.isNaN(due) || Number.isNaN(Date.parse(time))) continue
      const message = `expected ${new Date(due).toISOString().replace('.000Z', 'Z')}, one hour after the hour before it, got ${time}`
      context.addIssue({ code: 'custom', path: [index, 'time'], message })
      return
    }
  })

const timeZoneSchema = z.string({ error: 'expected an IANA time zone such as America/Toronto' }).refine(isTimeZone, {
  error: (issue) => `expected an IANA time zone such as America/Toronto, got ${describeInput(issue.input)}`,
})

function isTimeZone(name: string): boolean {
  try {
    // An offset such as +05:00 is accepted by the platform but has no clock changes: not a place's zone.
    return /[A-Za-z]/.test(name) && new Intl.DateTimeFormat('en', { timeZone: name }).format(0) !== ''
  } catch {
    return false
  }
}

const clockSchema = z.string().regex(/^([01]\d|2[0-3]):[0-5]\d$|^24:00$/, { error: 'expected a time such as 17:00' })
const shelterSchema = z.union([z.enum(['open', 'suburban', 'tight']), z.number().min(0).max(1)], {
  error: 'expected open, suburban, tight or a number from 0 to 1',
})

const cornerSchema = between(-5, 5, 'm below a level line')

const floorSchema = z.union(
  [
    z.object({ cornersM: z.tuple([cornerSchema, cornerSchema, cornerSchema, cornerSchema]) }),
    z.object({ depthsM: z.array(z.array(cornerSchema).min(2).max(50)).min(2).max(50).refine(isGrid) }),
  ],
  {
    error: 'expected four cornersM going round, or depthsM with rows alike of 2 to 50 points, in m below a level line',
  },
)

function isGrid(rows: readonly (readonly number[])[]): boolean {
  return rows.every((row) => row.length === rows[0]?.length)
}

const EXPECTED_HORIZON = 'expected a number from 0 to 90 ° or eight of them, from north clockwise'

/** One height all round, or eight from north clockwise. */
const horizonSchema = z.union(
  [between(0, 90, '°'), z.array(between(0, 90, '°')).refine((all) => all.length === 8, { error: EXPECTED_HORIZON })],
  { error: EXPECTED_HORIZON },
)

const rinkSchema = z.object({
  latitude: between(-90, 90, '°'),
  longitude: between(-180, 180, '°'),
  timeZone: timeZoneSchema,
  lengthM: between(1, 500, 'm'),
  widthM: between(1, 500, 'm'),
  shelter: shelterSchema,
  skyView: between(0, 1),
  horizonDeg: horizonSchema.optional(),
  shade: between(0, 1).optional(),
  base: z.enum(['liner', 'ground', 'snow']),
  phase: z.enum(['planning', 'waiting', 'filling', 'freezing', 'skating', 'thaw', 'closed']),
  floor: floorSchema.nullish(),
})

const waterSchema = z.object({
  temperatureC: between(0, 95, '°C'),
  flowLPerMin: between(0.5, 400, 'L/min'),
  layerMm: between(0.2, 100, 'mm'),
  fillDepthMm: between(0, 200_000, 'mm'),
  filledLitres: between(0, 1e8, 'L').optional(),
})

const sheetSchema = z.object({
  thicknessMm: between(0, 5000, 'mm'),
  temperatureC: between(-50, 0, '°C'),
  snowCoverCm: between(0, 500, 'cm'),
  liquidMm: between(0, 1000, 'mm').optional(),
  asOf: instantSchema.optional(),
})

const pouredSchema = z.object({
  at: instantSchema,
  layerMm: between(0.2, 100, 'mm'),
  temperatureC: between(0, 95, '°C'),
})

export const scoreInputSchema = z
  .object({
    now: instantSchema,
    rink: rinkSchema,
    water: waterSchema,
    sheet: sheetSchema,
    carriesSkaterMm: between(10, 1000, 'mm').optional(),
    available: z.array(z.object({ from: clockSchema, to: clockSchema })).max(20),
    maxPasses: z.int().min(0).max(12),
    hours: hoursSchema,
    members: z.array(hoursSchema).max(200).optional(),
    poured: z.array(pouredSchema).max(200).optional(),
  })
  .superRefine(({ hours, members }, context) => {
    for (const [index, member] of (members ?? []).entries()) {
      if (member.length === hours.length && member[0]?.time === hours[0]?.time) continue
      const message = `expected the same ${hours.length} hours as in hours, from ${hours[0]?.time}`
      context.addIssue({ code: 'custom', path: ['members', index], message })
    }
  })

/** One line for each fault: `hours[3].airTemperatureC: expected …`. */
export function scoreFaults(error: z.ZodError): string[] {
  return error.issues.map((issue) => `${jsonPath(issue.path)}: ${issue.message.replace(/^Invalid input: /, '')}`)
}

function jsonPath(path: readonly PropertyKey[]): string {
  const text = path.map((key) => (typeof key === 'number' ? `[${key}]` : `.${String(key)}`)).join('')
  return text.replace(/^\./, '') || '(document)'
}

/**
 * Parses text as JSON; the words NaN and Infinity, which some writers put where a number belongs, become strings, so
 * that the schema refuses them at their path rather than the whole text at a column.
 *
 * @throws SyntaxError when it is not JSON even so.
 */
export function parseScoreText(text: string): unknown {
  const quoted = text.replace(/"(?:\\.|[^"\\])*"|-?\b(?:NaN|Infinity)\b/g, (token) =>
    token.startsWith('"') ? token : `"${token}"`,
  )
  return JSON.parse(quoted)
}
