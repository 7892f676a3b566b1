// A time of day as people and forms write it, counted in minutes.

/** Minutes of a day by the clock, when no clock changes. [min] */
export const MINUTES_A_DAY = 24 * 60

/**
 * Minutes after midnight of a time of day.
 *
 * @param time 'HH:MM', 00:00 to 23:59.
 * @returns Minutes. [min], 0 to 1439
 *
 * Source: definition.
 */
export function minuteOf(time: string): number {
  return Number(time.slice(0, 2)) * 60 + Number(time.slice(3, 5))
}
