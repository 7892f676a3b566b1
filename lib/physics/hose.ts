// The hose: what flows through it, and how long still water in it stays liquid.
import { FUSION_J_PER_KG, HOUR_SECONDS, ICE_CONDUCTIVITY, WATER_DENSITY, WATER_HEAT_CAPACITY } from './constants'
import { cylinderNusselt } from './convection'
import { inRange } from './check'

/**
 * Flow by the bucket test.
 *
 * @param litres Caught. [L], above 0
 * @param seconds Time it took. [s], above 0
 * @returns Flow. [L/min]
 * @throws RangeError at or below 0.
 *
 * Source: definition.
 */
export function bucketFlowLPerMin(litres: number, seconds: number): number {
  return (inRange('litres [L]', litres, 1e-6, 1e6) * 60) / inRange('seconds [s]', seconds, 1e-6, 1e6)
}

/**
 * Time in which still water in a pipe or hose cools to 0 °C (not yet frozen).
 *
 * @param boreM Inside diameter. [m]
 * @param resistance From the water to the air, for a metre of pipe. [K m/W]
 * @param waterC Water at the start. [°C], above 0 to 100
 * @param airC Air. [°C], -80 to below 0
 * @returns Time. [h]
 * @throws RangeError outside the ranges.
 *
 * Source: ASHRAE Handbook - Fundamentals, ch. 23, time to freezing.
 */
export function coolingHours(boreM: number, resistance: number, waterC: number, airC: number): number {
  inRange('waterC [°C]', waterC, 1e-6, 100)
  inRange('airC [°C]', airC, -80, -1e-6)
  const heatPerK = WATER_DENSITY * WATER_HEAT_CAPACITY * Math.PI * (boreM / 2) ** 2
  return (heatPerK * resistance * Math.log((waterC - airC) / -airC)) / HOUR_SECONDS
}

/** A bare hose full of water, left lying. */
export interface BareHose {
  boreM: number
  outsideM: number
  /** Of the wall. [W m⁻¹ K⁻¹] */
  wallConductivity: number
}

/** A common ⅝ inch garden hose. Bore by its name; wall 2.5 mm of PVC at 0.17 W/mK, our estimate. */
export const GARDEN_HOSE: BareHose = { boreM: 0.0159, outsideM: 0.0209, wallConductivity: 0.17 }

/** Air near 0 °C: conductivity [W m⁻¹ K⁻¹], kinematic viscosity [m²/s], Prandtl number. Incropera & DeWitt, table of air; from memory. */
const AIR = { conductivity: 0.0242, viscosity: 1.34e-5, prandtl: 0.712 }
/** Natural convection and radiation of a thin hose in still air. [W m⁻² K⁻¹] About 5 each; our estimate. */
const STILL_FILM_WM2K = 10

/**
 * Heat transfer from wind to a thin round hose lying across it.
 *
 * @param windMps Wind at the hose. [m/s], 0 to 40
 * @param outsideM Its diameter. [m], 0.001 to 0.5
 * @returns Coefficient, never below that of still air. [W m⁻² K⁻¹]
 * @throws RangeError outside the ranges.
 *
 * Source: cylinderNusselt with air near 0 °C, held against Incropera's example 7.4.
 */
export function hoseFilmWm2K(windMps: number, outsideM: number): number {
  const speed = inRange('windMps [m/s]', windMps, 0, 40)
  const reynolds = (speed * inRange('outsideM [m]', outsideM, 0.001, 0.5)) / AIR.viscosity
  return Math.max(STILL_FILM_WM2K, (cylinderNusselt(reynolds, AIR.prandtl) * AIR.conductivity) / outsideM)
}

/**
 * How long water stays liquid in a full hose left lying.
 *
 * @param hose Dimensions.
 * @param waterC Water at the start. [°C], above 0 to 100
 * @param airC Air. [°C], -80 to below 0
 * @param filmWm2K Heat transfer to the air. [W m⁻² K⁻¹], 1 to 500
 * @returns Hours until the water is at 0 °C and ice begins, and until it is solid. [h]
 * @throws RangeError outside the ranges.
 *
 * Source: lumped cooling as in coolingHours; then ρ L A R / ΔT for the heat of fusion, with R of wall and air film, and
 * ρ L d² / 16 k ΔT for the shell of ice that grows inward.
 */
export function stillHoseHours(
  hose: BareHose,
  waterC: number,
  airC: number,
  filmWm2K: number,
): { hoursToIce: number; hoursToSolid: number } {
  const film = 1 / (Math.PI * hose.outsideM * inRange('filmWm2K [W m⁻² K⁻¹]', filmWm2K, 1, 500))
  const resistance = film + Math.log(hose.outsideM / hose.boreM) / (2 * Math.PI * hose.wallConductivity)
  const hoursToIce = coolingHours(hose.boreM, resistance, waterC, airC)
  const latent = WATER_DENSITY * FUSION_J_PER_KG
  const throughWall = (latent * Math.PI * (hose.boreM / 2) ** 2 * resistance) / -airC
  const throughIce = (latent * hose.boreM ** 2) / (16 * ICE_CONDUCTIVITY * -airC)
  return { hoursToIce, hoursToSolid: hoursToIce + (throughWall + throughIce) / HOUR_SECONDS }
}
