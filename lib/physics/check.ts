// Range checks for the arguments of physics functions.

/**
 * Passes a number through when it lies in its range.
 *
 * @param name What it is, with its unit, for the message.
 * @param value Number to check, in the unit that `name` gives.
 * @param min Least allowed.
 * @param max Most allowed.
 * @returns The same number.
 * @throws RangeError when it is not a finite number from `min` to `max`.
 *
 * Source: ours.
 */
export function inRange(name: string, value: number, min: number, max: number): number {
  if (!(value >= min && value <= max)) throw new RangeError(`${name} must be from ${min} to ${max}, got ${value}`)
  return value
}
