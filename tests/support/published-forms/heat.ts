// Published forms of heat that the model does not use, kept to be held beside it: Nusselt numbers of plain shapes, heat of freezing.
import { FUSION_J_PER_KG, ICE_HEAT_CAPACITY, WATER_HEAT_CAPACITY } from '@/lib/physics/constants'
import { inRange } from '@/lib/physics/check'

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
 * Heat to take from water until it is ice of a given temperature.
 *
 * @param massKg Water. [kg], or [kg/m²] for a result per square metre (1 mm is 1 kg/m²); 0 or more
 * @param fromC Water temperature. [°C], 0 to 100
 * @param toC Ice temperature. [°C], -60 to 0
 * @returns Heat. [J] or [J/m²]
 * @throws RangeError outside the ranges.
 *
 * Source: definition; ASHRAE writes the same as 1000 [4.2 tf + 334 + 2.0 (0 - ts)] kJ/m³.
 */
export function heatToFreezeJ(massKg: number, fromC: number, toC = 0): number {
  inRange('massKg [kg]', massKg, 0, 1e12)
  inRange('fromC [°C]', fromC, 0, 100)
  inRange('toC [°C]', toC, -60, 0)
  return massKg * (WATER_HEAT_CAPACITY * fromC + FUSION_J_PER_KG - ICE_HEAT_CAPACITY * toC)
}

/**
 * Water that a sheet's own cold can freeze from below.
 *
 * @param thicknessM Ice. [m], 0 to 10
 * @param meanC Mean temperature of the ice. [°C], -60 to 0
 * @returns Water. [mm]
 * @throws RangeError outside the ranges.
 *
 * Source: heat capacity of the ice over the heat of fusion.
 */
export function frozenByColdMm(thicknessM: number, meanC: number, iceDensity: number): number {
  inRange('thicknessM [m]', thicknessM, 0, 10)
  inRange('meanC [°C]', meanC, -60, 0)
  return (-meanC * ICE_HEAT_CAPACITY * thicknessM * iceDensity) / FUSION_J_PER_KG
}

/** Convection over an indoor rink, ASHRAE Refrigeration, Ice Rinks: 3.41 + 3.55 V. [W m⁻² K⁻¹] From memory. */
export function indoorRinkTransfer(windMps: number): number {
  return 3.41 + 3.55 * windMps
}
