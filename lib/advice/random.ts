// Random numbers from a seed, so that perturbed forecasts are the same for the same input.

/**
 * Uniform numbers from 0 to below 1, the same for the same seed.
 *
 * @param seed Any integer.
 * @returns Generator; each call gives the next number. [0-1)
 *
 * Source: the 32-bit mixing generator known as mulberry32 (public domain; from memory).
 */
export function seededUniform(seed: number): () => number {
  let state = seed >>> 0
  return () => {
    state = (state + 0x6d2b79f5) >>> 0
    let mixed = Math.imul(state ^ (state >>> 15), state | 1)
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61)
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296
  }
}

/**
 * Standard normal numbers from uniform ones.
 *
 * @param uniform Generator of numbers from 0 to below 1.
 * @returns Generator; each call gives the next number. [-]
 *
 * Source: Box & Muller 1958; from memory.
 */
export function normalFrom(uniform: () => number): () => number {
  return () => Math.sqrt(-2 * Math.log(1 - uniform())) * Math.cos(2 * Math.PI * uniform())
}

/**
 * Standard normal number below which a share of all lies.
 *
 * @param share Above 0 to below 1.
 * @returns Number, 0 for half. [standard deviations]
 *
 * Source: Winitzki 2008, closed form for the inverse error function with a = 0.147; off by 0.2 % at most; from memory.
 */
export function normalOf(share: number): number {
  const a = 0.147
  const x = 2 * Math.min(1 - 1e-9, Math.max(1e-9, share)) - 1
  const log = Math.log(1 - x * x)
  const first = 2 / (Math.PI * a) + log / 2
  return Math.SQRT2 * Math.sign(x) * Math.sqrt(Math.sqrt(first * first - log / a) - first)
}
