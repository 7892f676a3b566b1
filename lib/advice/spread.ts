// Quantiles over forecast runs.
import { MINUTE_MILLIS } from '@/lib/physics/constants'
import { toIso } from './zoned-time'
import type { Spread } from './types'

/**
 * Nearest-rank quantile.
 *
 * @param ascending Values of all runs, at least one.
 * @param share 0-1
 * @returns The value at that rank, in the unit of the values.
 *
 * Source: nearest-rank definition.
 */
export function quantile(ascending: readonly number[], share: number): number {
  return ascending[Math.max(0, Math.ceil(ascending.length * share) - 1)] as number
}

/**
 * When something happens over the runs; a run in which it does not within the forecast has Infinity.
 *
 * @param millis One instant per run. [ms since the epoch]
 * @returns Tenth, half and nine tenths of the runs, ISO 8601; null where a run of that rank has none.
 *
 * Source: quantile.
 */
export function spreadOf(millis: readonly number[]): Spread {
  const ascending = [...millis].sort((a, b) => a - b)
  const at = (share: number) => (ascending.length > 0 ? isoOrNull(quantile(ascending, share)) : null)
  return { p10: at(0.1), p50: at(0.5), p90: at(0.9) }
}

/**
 * An instant told to the minute and never too early; null for Infinity.
 *
 * @param millis Instant, or Infinity. [ms since the epoch]
 * @returns ISO 8601, or null.
 *
 * Source: ours.
 */
export function isoOrNull(millis: number): string | null {
  return Number.isFinite(millis) ? toIso(Math.ceil(millis / MINUTE_MILLIS) * MINUTE_MILLIS) : null
}
