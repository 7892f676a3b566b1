// What all parts of one judgement share: the rink's clock, its site, its layer, when the keeper can go out.
import { DAY_MILLIS, HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { RINK_WIND_RATIO, shelterFactor } from '@/lib/physics/site'
import { NEEDED } from './thresholds'
import { minuteOf, MINUTES_A_DAY } from './time-of-day'
import { addDays, instantOfLocal, localDateOf, steadyOffsetMinutes, zoneOffsetsMinutes } from './zoned-time'
import type { Site } from '@/lib/physics/types'
import type { JudgeInput } from './types'

/** Half-open, in minutes of the local day; `days` has bit 0 for Monday to bit 6 for Sunday. */
interface MinuteRange {
  from: number
  to: number
  days: number
}

export interface Setting {
  input: JudgeInput
  site: Site
  /** Factor from a gust at 10 m to one at the rink. */
  gustFactor: number
  layer: { layerMm: number; temperatureC: number }
  nowMillis: number
  firstMillis: number
  /** The rink's offset at each hour. [min] */
  offsets: number[]
  /** The instants, ascending, at which floods must be set: each 7 am from the first hour to two days past the last. */
  readyMillis: number[]
  /** When the keeper can go out. */
  ranges: MinuteRange[]
}

/**
 * Works out what all hours of a judgement share: site, clock, the keeper's hours and when ice is needed.
 *
 * @param input Input of `judge`.
 * @returns Rink, ready for the other functions.
 * @throws RangeError for an unknown zone, a shelter out of range or an unreadable time.
 *
 * Source: ours.
 */
export function makeSetting(input: JudgeInput): Setting {
  const { rink, water } = input
  const shelter = shelterFactor(rink.shelter)
  const starts = input.hours.map((hour) => Date.parse(hour.time))
  const nowMillis = Date.parse(input.now)
  if (Number.isNaN(nowMillis)) throw new RangeError(`now must be an ISO 8601 instant, got ${input.now}`)
  const firstMillis = starts[0]
  if (firstMillis === undefined) throw new RangeError('hours must not be empty')
  return {
    input,
    site: {
      latitudeDeg: rink.latitude,
      longitudeDeg: rink.longitude,
      shelter,
      skyView: rink.skyView,
      ...(rink.horizonDeg === undefined ? {} : { horizonDeg: rink.horizonDeg }),
      ...(rink.shade === undefined ? {} : { shade: rink.shade }),
    },
    gustFactor: RINK_WIND_RATIO * shelter,
    layer: { layerMm: water.layerMm, temperatureC: water.temperatureC },
    nowMillis,
    firstMillis,
    offsets: zoneOffsetsMinutes(starts, rink.timeZone),
    readyMillis: readyInstants(firstMillis, starts.length, rink.timeZone),
    ranges: input.available.flatMap(toRanges),
  }
}

function readyInstants(firstMillis: number, hourCount: number, timeZone: string): number[] {
  const instants: number[] = []
  const endMillis = firstMillis + (hourCount + 48) * HOUR_MILLIS
  const steady = steadyOffsetMinutes(firstMillis - DAY_MILLIS, endMillis + DAY_MILLIS, timeZone)
  if (steady !== null) return readyWithoutChange(firstMillis, endMillis, steady)
  let date = localDateOf(firstMillis, timeZone)
  for (let millis = 0; millis < endMillis; date = addDays(date, 1)) {
    millis = instantOfLocal(date, NEEDED.readyByMinuteOfDay, timeZone)
    instants.push(millis)
  }
  return instants
}

/** The same where no clock changes: a day apart. */
function readyWithoutChange(firstMillis: number, endMillis: number, offsetMinutes: number): number[] {
  const offsetMillis = offsetMinutes * MINUTE_MILLIS
  const midnight = Math.floor((firstMillis + offsetMillis) / DAY_MILLIS) * DAY_MILLIS - offsetMillis
  const instants: number[] = []
  for (let at = midnight + NEEDED.readyByMinuteOfDay * MINUTE_MILLIS; ; at += DAY_MILLIS) {
    instants.push(at)
    if (at >= endMillis) return instants
  }
}

const EVERY_DAY = 0b111_1111

/** "HH:MM" to "HH:MM" as ranges of minutes; past midnight it is two, the second a day later, and equal ends mean a whole day. */
function toRanges({ from, to, weekdays }: JudgeInput['available'][number]): MinuteRange[] {
  const start = minuteOf(from)
  const end = minuteOf(to)
  const days = weekdays ? weekdays.reduce((bits, day) => bits | (1 << (day - 1)), 0) : EVERY_DAY
  if (start === end) return [{ from: 0, to: MINUTES_A_DAY, days }]
  if (start < end) return [{ from: start, to: end, days }]
  const daysAfter = ((days << 1) | (days >> 6)) & EVERY_DAY
  return [
    { from: start, to: MINUTES_A_DAY, days },
    { from: 0, to: end, days: daysAfter },
  ]
}

/**
 * Whether the keeper can go out at an instant.
 *
 * @param setting Rink, from makeSetting.
 * @param atMillis Instant. [ms since the epoch]
 * @returns Whether it is within the keeper's hours.
 *
 * Source: ours.
 */
export function isAvailableAt(setting: Setting, atMillis: number): boolean {
  const index = Math.floor((atMillis - setting.firstMillis) / HOUR_MILLIS)
  const offset = setting.offsets[Math.min(Math.max(0, index), setting.offsets.length - 1)] ?? 0
  const localMinutes = Math.floor(atMillis / MINUTE_MILLIS) + offset
  const day = Math.floor(localMinutes / MINUTES_A_DAY)
  const minute = localMinutes - day * MINUTES_A_DAY
  // 1 January 1970 was a Thursday.
  const weekday = (((day + 3) % 7) + 7) % 7
  return setting.ranges.some(({ from, to, days }) => minute >= from && minute < to && (days >> weekday) % 2 === 1)
}

/**
 * When a flood started at an instant must be set: the first 7 am that leaves it a fair time.
 *
 * @param setting Rink, from makeSetting.
 * @param startMillis Start of the flood. [ms since the epoch]
 * @returns Instant. [ms since the epoch]
 *
 * Source: NEEDED in thresholds.ts.
 */
export function neededMillis(setting: Setting, startMillis: number): number {
  const least = startMillis + NEEDED.leastMinutesAhead * MINUTE_MILLIS
  const days = setting.readyMillis
  // The instants are a day apart to the hour, so a guess by division is off by one at most.
  let index = Math.max(0, Math.floor((least - (days[0] as number)) / (24 * HOUR_MILLIS)) - 1)
  while (index < days.length - 1 && (days[index] as number) < least) index += 1
  return days[index] as number
}
