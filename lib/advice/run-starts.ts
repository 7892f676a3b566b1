// Where each perturbed run begins: draws spread evenly over the runs, so that a few runs say what many random ones would.
import { normalOf, seededUniform } from './random'

/** What decides a run's first day: standard normal errors, and the chances of its first spells. */
export interface RunStart {
  timing: number
  amount: number
  air: number
  dew: number
  wind: number
  cloud: number
  /** 0-1: below the chance of a miss, the first spell of rain or snow does not come. */
  miss: number
  /** 0-1: below the chance of a false calm, the first dry hours bring some. */
  unforeseen: number
}

const NAMES = ['timing', 'amount', 'air', 'dew', 'wind', 'cloud', 'miss', 'unforeseen'] as const

/**
 * Starts for a set of runs by Latin hypercube sampling: for each quantity every run has a stratum of its own.
 *
 * @param count Runs.
 * @param seed Same seed, same starts.
 * @returns As many starts as runs. [standard deviations], chances [0-1)
 *
 * Source: McKay, Beckman & Conover 1979, Technometrics 21, 239; from memory.
 */
export function spreadStarts(count: number, seed: number): RunStart[] {
  const uniform = seededUniform(seed)
  const strata = NAMES.map(() => shuffled(count, uniform))
  return Array.from({ length: count }, (_, run) => {
    const [timing, amount, air, dew, wind, cloud, miss, unforeseen] = strata.map(
      (order) => ((order[run] as number) + uniform()) / count,
    ) as [number, number, number, number, number, number, number, number]
    return {
      timing: normalOf(timing),
      amount: normalOf(amount),
      air: normalOf(air),
      dew: normalOf(dew),
      wind: normalOf(wind),
      cloud: normalOf(cloud),
      miss,
      unforeseen,
    }
  })
}

/**
 * One start drawn at random.
 *
 * @param uniform Generator of numbers from 0 to below 1.
 * @param normal Generator of standard normal numbers.
 * @returns Start. [standard deviations], chances [0-1)
 *
 * Source: independent draws.
 */
export function randomStart(uniform: () => number, normal: () => number): RunStart {
  return {
    timing: normal(),
    amount: normal(),
    air: normal(),
    dew: normal(),
    wind: normal(),
    cloud: normal(),
    miss: uniform(),
    unforeseen: uniform(),
  }
}

/** The numbers from 0 to below `count` in an order of chance (Fisher & Yates). */
function shuffled(count: number, uniform: () => number): number[] {
  const order = Array.from({ length: count }, (_, index) => index)
  for (let last = count - 1; last > 0; last -= 1) {
    const other = Math.floor(uniform() * (last + 1))
    const moved = order[last] as number
    order[last] = order[other] as number
    order[other] = moved
  }
  return order
}
