// Random numbers from a seed, so that perturbed forecasts are the same for the same input.

/**
 * Uniform numbers from 0 to below 1, by the 32-bit mixing generator known as mulberry32 (public domain; from memory).
 *
 * @param seed Any integer.
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

/** Standard normal numbers from uniform ones (Box & Muller 1958). */
export function normalFrom(uniform: () => number): () => number {
  return () => Math.sqrt(-2 * Math.log(1 - uniform())) * Math.cos(2 * Math.PI * uniform())
}
