// Nusselt numbers of plain shapes: what a surface or a hose loses to moving or still air.
import { inRange } from './check'

/**
 * Mean Nusselt number of a flat plate in laminar flow.
 *
 * @param reynolds Reynolds number over the length. [-], 0 to 5e5
 * @param prandtl Prandtl number. [-]
 * @returns Nusselt number. [-]
 * @throws RangeError outside the range.
 *
 * Source: Churchill & Ozoe 1973, uniform wall temperature, twice the local value.
 */
export function plateNusselt(reynolds: number, prandtl: number): number {
  inRange('reynolds [-]', reynolds, 0, 5e5)
  const local =
    (0.3387 * Math.sqrt(reynolds) * Math.cbrt(prandtl)) / Math.pow(1 + Math.pow(0.0468 / prandtl, 2 / 3), 0.25)
  return 2 * local
}

/**
 * Nusselt number of free convection over a warm face turned up.
 *
 * @param grashof Grashof number. [-]
 * @param prandtl Prandtl number. [-]; Gr Pr 1e7 to 1e11
 * @returns Nusselt number. [-]
 * @throws RangeError outside the range.
 *
 * Source: McAdams 1954, 0.15 Ra^(1/3).
 */
export function warmFaceUpNusselt(grashof: number, prandtl: number): number {
  const rayleigh = inRange('grashof × prandtl [-]', grashof * prandtl, 1e7, 1e11)
  return 0.15 * Math.cbrt(rayleigh)
}

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
