// Repeatable unevenness: the same keys always give the same number.

/** Between -1 and 1. */
export function noise(...keys: number[]): number {
  let mixed = 0x9e3779b9
  for (const key of keys) {
    mixed = Math.imul(mixed ^ Math.round(key * 1000), 0x85ebca6b)
    mixed = Math.imul(mixed ^ (mixed >>> 13), 0xc2b2ae35)
    mixed ^= mixed >>> 16
  }
  return ((mixed >>> 0) / 0xffffffff) * 2 - 1
}
