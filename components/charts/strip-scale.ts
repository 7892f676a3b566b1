// Axes of the night strip: round steps, and how far melting may hang under the line.

export interface Scale {
  low: number
  high: number
  ticks: number[]
}

const ROUND_STEPS = [1, 2, 5, 10]

/** The smallest step of 1, 2 or 5 times a power of ten that needs at most `most` steps from `low` to `high`. */
function roundStep(low: number, high: number, most: number): number {
  const rough = Math.max(high - low, Number.EPSILON) / most
  const power = 10 ** Math.floor(Math.log10(rough))
  const factor = ROUND_STEPS.find((step) => step * power >= rough * (1 - 1e-9)) ?? 10
  return factor * power
}

function ticksBetween(low: number, high: number, step: number): number[] {
  const ticks: number[] = []
  const last = Math.floor(high / step + 1e-9)
  for (let n = Math.ceil(low / step - 1e-9); n <= last; n += 1) ticks.push(Number((n * step).toPrecision(12)))
  return ticks
}

/**
 * Scale for freeze rates, zero always on it. On a night that freezes, melting hangs at most 0.6 of the height above the
 * line, so that a sunny noon cannot squash the hours that matter; such bars are drawn cut.
 *
 * @param rates Rates in the reader's unit; melting below zero.
 * @param leastTop Height of the axis when hardly anything freezes, same unit.
 */
export function rateScale(rates: number[], leastTop: number): Scale {
  const most = Math.max(0, ...rates)
  const least = Math.min(0, ...rates)
  const high = Math.max(most, leastTop) * 1.08
  const low = most >= leastTop ? Math.max(least, -0.6 * high) : least
  const step = roundStep(0, Math.max(high, -low), 4)
  return { low, high, ticks: ticksBetween(low, high, step) }
}

/** Scale for air temperatures: half a step of room at both ends, at most five steps of ticks. */
export function airScale(temperatures: number[]): Scale | null {
  if (temperatures.length === 0) return null
  const least = Math.min(...temperatures)
  const most = Math.max(...temperatures)
  const middle = (least + most) / 2
  const half = Math.max((most - least) / 2, 3) * 1.15
  const [low, high] = [middle - half, middle + half]
  return { low, high, ticks: ticksBetween(low, high, roundStep(low, high, 5)) }
}
