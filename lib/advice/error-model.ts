// How wrong an hourly forecast for one place usually is, by lead time. One table, used to perturb and to test alike.

/**
 * Standard errors grow in a straight line: `start` at no lead, plus `perDay` for each day ahead.
 * Temperature: mean absolute errors published for the mountain station Schmittenhöhe (Austria), winter 2011/12, days 1 to 5:
 * 1.03, 1.15, 1.36, 1.82, 2.32 °C (metgis.com, forecast quality); times 1.25 these are standard errors of 1.3 to 2.9, and the
 * line here gives 1.3 to 2.5. All other figures are ours: sizes usual in verification at stations, rounded; timing, misses
 * and false alarms of precipitation guessed.
 */
export interface ErrorGrowth {
  start: number
  perDay: number
}

export const FORECAST_ERROR = {
  /** [°C] */
  airTemperatureC: { start: 1, perDay: 0.3 },
  /** Of the difference between air and dew point. [°C] */
  dewPointSpreadC: { start: 0.7, perDay: 0.15 },
  /** Of the logarithm of the wind. [-] */
  windLog: { start: 0.2, perDay: 0.03 },
  /** [share of the sky] */
  cloudCover: { start: 0.15, perDay: 0.02 },
  /** Of the time at which precipitation comes. [h] */
  timingHours: { start: 0.7, perDay: 0.8 },
  /** Of the logarithm of its amount. [-] */
  amountLog: { start: 0.4, perDay: 0.05 },
  /** Chance that a spell of it does not come. [-] */
  missChance: { start: 0.05, perDay: 0.03 },
  /** Chance that twelve cloudy hours without it bring some; hours under way are left as they are. [-] */
  falseChance: { start: 0.03, perDay: 0.02 },
} satisfies Record<string, ErrorGrowth>

/** Errors of one hour and the next are alike: they fade with this time. [h] Ours. */
export const ERROR_MEMORY_HOURS = 12

/**
 * Value of a growth at a lead time.
 *
 * @param growth Value now and how much it grows in a day.
 * @param leadHours Lead time; before now counts as now. [h]
 * @returns Value, in the unit of the growth.
 *
 * Source: straight line; ours.
 */
export function errorAt(growth: ErrorGrowth, leadHours: number): number {
  return growth.start + (growth.perDay * Math.max(0, leadHours)) / 24
}
