// One missing hour is bridged by its neighbours; longer gaps stay gaps.
import type { HourlyRecord } from './types'

const NEEDED = ['airTemperatureC', 'dewPointC', 'windSpeedMps'] as const
const BRIDGED = [
  ...NEEDED,
  'windGustMps',
  'cloudCover',
  'shortwaveWm2',
  'precipitationMm',
  'rainMm',
  'snowfallCm',
  'pressureHpa',
  'longwaveDownWm2',
] as const

/**
 * Fills single missing values from the hour before and the hour after.
 *
 * @param records Hours in order.
 * @returns Copies, in the units of the records, with every lone gap filled by the mean of its neighbours; longer gaps
 *   stay null.
 *
 * Source: ours.
 */
export function bridgeLoneGaps(records: readonly HourlyRecord[]): HourlyRecord[] {
  const bridged = records.slice()
  for (let i = 1; i + 1 < records.length; i++) {
    if (isComplete(records[i]!)) continue
    bridged[i] = bridge(records[i - 1]!, records[i]!, records[i + 1]!)
  }
  return bridged
}

/** Written out, because it is asked of every hour of every run. */
function isComplete(record: HourlyRecord): boolean {
  return (
    isNumber(record.airTemperatureC) &&
    isNumber(record.dewPointC) &&
    isNumber(record.windSpeedMps) &&
    isNumber(record.windGustMps) &&
    isNumber(record.cloudCover) &&
    isNumber(record.shortwaveWm2) &&
    isNumber(record.precipitationMm) &&
    isNumber(record.rainMm) &&
    isNumber(record.snowfallCm) &&
    isNumber(record.pressureHpa) &&
    isNumber(record.longwaveDownWm2)
  )
}

function bridge(before: HourlyRecord, record: HourlyRecord, after: HourlyRecord): HourlyRecord {
  let filled: HourlyRecord | null = null
  for (const field of BRIDGED) {
    if (isNumber(record[field])) continue
    const from = before[field]
    const to = after[field]
    if (!isNumber(from) || !isNumber(to)) continue
    filled ??= { ...record }
    filled[field] = (from + to) / 2
  }
  return filled ?? record
}

/**
 * True when the model can work with the hour.
 *
 * @param record Hour of a forecast.
 * @returns Whether sky, precipitation and the other needed fields are there.
 *
 * Source: ours.
 */
export function hasNeeded(record: HourlyRecord): boolean {
  const hasSky = isNumber(record.cloudCover) || isNumber(record.longwaveDownWm2)
  return hasSky && isNumber(record.precipitationMm) && NEEDED.every((field) => isNumber(record[field]))
}

/**
 * False for what is missing, and for what is no number.
 *
 * @param value Number, null or undefined.
 * @returns Whether it is a finite number.
 *
 * Source: ours.
 */
export function isNumber(value: number | null | undefined): value is number {
  return typeof value === 'number' && Number.isFinite(value)
}
