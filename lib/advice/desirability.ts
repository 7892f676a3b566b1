// Desirabilities after Derringer & Suich 1980: each factor 0 to 1, joined by a weighted geometric mean, so that one 0 is fatal.
import type { Ramp } from './thresholds'

/**
 * One-sided desirability: 1 at `one` and beyond, 0 at `zero` and beyond, a straight line between.
 *
 * @param value The factor, in the ramp's unit.
 * @param ramp Its two ends; `one` may lie above or below `zero`.
 * @returns Desirability. [0-1]
 *
 * Source: G. Derringer, R. Suich, J. Quality Technology 12 (1980), one-sided transformation with exponent 1; from
 * memory.
 */
export function rampDesirability(value: number, ramp: Ramp): number {
  return Math.min(1, Math.max(0, (value - ramp.zero) / (ramp.one - ramp.zero)))
}

/**
 * Weighted geometric mean of desirabilities.
 *
 * @param factors 0 to 1 each, by name.
 * @param weights Exponents, above 0, for the same names.
 * @returns Desirability, 0 when any factor is 0. [0-1]
 *
 * Source: as above, with the weights of G. Derringer, Quality Progress 27 (1994); from memory.
 */
export function overallDesirability<Name extends string>(
  factors: Record<Name, number>,
  weights: Record<Name, number>,
): number {
  let logSum = 0
  let weightSum = 0
  for (const name in weights) {
    if (factors[name] <= 0) return 0
    // Most factors are 1, whose logarithm is 0.
    if (factors[name] < 1) logSum += weights[name] * Math.log(factors[name])
    weightSum += weights[name]
  }
  return Math.exp(logSum / weightSum)
}
