// What a round thing across the wind, a hose, loses to it.
import { inRange } from './check'

/**
 * Mean Nusselt number of a cylinder (a hose) across the flow.
 *
 * @param reynolds Reynolds number over the diameter. [-], 0 to 1e7
 * @param prandtl Prandtl number. [-]; Re Pr above 0.2
 * @returns Nusselt number. [-]
 * @throws RangeError outside the range.
 *
 * Source: Churchill & Bernstein 1977.
 */
export function cylinderNusselt(reynolds: number, prandtl: number): number {
  inRange('reynolds [-]', reynolds, 0, 1e7)
  const start = (0.62 * Math.sqrt(reynolds) * Math.cbrt(prandtl)) / Math.pow(1 + Math.pow(0.4 / prandtl, 2 / 3), 0.25)
  return 0.3 + start * Math.pow(1 + Math.pow(reynolds / 282_000, 5 / 8), 4 / 5)
}
