// Heat that water must give up to become ice.
import { FUSION_J_PER_KG, ICE_HEAT_CAPACITY, WATER_HEAT_CAPACITY } from './constants'
import { inRange } from './check'

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
