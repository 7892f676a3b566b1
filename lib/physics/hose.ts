// The hose: what flows through it, and how long still water in it stays liquid.
import { WATER_DENSITY, WATER_HEAT_CAPACITY } from './constants'
import { inRange } from './check'

/** Hazen-Williams factor for m and m³/s, from the US form below. */
const HEAD_FACTOR = 10.9617

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
 * Head lost to friction in a pipe or hose.
 *
 * @param flowM3PerS Flow. [m³/s]
 * @param diameterM Bore. [m]
 * @param lengthM Length. [m]
 * @param smoothness Hazen-Williams coefficient. [-], 140-150 for plastic and rubber
 * @returns Head. [m of water]
 *
 * Source: Hazen-Williams as printed in US units, 0.2083 (100/C)^1.852 q^1.852 / d^4.8655 ft per 100 ft, converted.
 */
export function frictionHeadM(flowM3PerS: number, diameterM: number, lengthM: number, smoothness = 140): number {
  return (HEAD_FACTOR * lengthM * Math.pow(flowM3PerS / smoothness, 1.852)) / Math.pow(diameterM, 4.8655)
}

/**
 * Flow of an open-ended hose when friction takes all the pressure.
 *
 * @param pressurePa Pressure at the tap. [Pa]
 * @param diameterM Bore. [m]
 * @param lengthM Length. [m]
 * @param smoothness Hazen-Williams coefficient. [-]
 * @returns Flow. [L/min]; fittings left out, so an upper bound
 *
 * Source: Hazen-Williams solved for the flow.
 */
export function openHoseFlowLPerMin(pressurePa: number, diameterM: number, lengthM: number, smoothness = 140): number {
  const headM = pressurePa / (WATER_DENSITY * 9.80665)
  const flow = smoothness * Math.pow((headM * Math.pow(diameterM, 4.8655)) / (HEAD_FACTOR * lengthM), 1 / 1.852)
  return flow * 60_000
}

/** A pipe or hose as a thermal resistance around still water. */
export interface StillPipe {
  boreM: number
  /** Outside of the wall, where insulation begins (or the air, without any). [m] */
  outsideM: number
  /** Outside of the insulation. [m], at least `outsideM` */
  insulatedM: number
  /** [W m⁻¹ K⁻¹] */
  insulationConductivity: number
}

/**
 * Time in which still water in a pipe cools to 0 °C (not yet frozen).
 *
 * @param pipe Dimensions.
 * @param waterC Water at the start. [°C], above 0
 * @param airC Air. [°C], below 0
 * @returns Time. [h]
 * @throws RangeError when the water is not above or the air not below 0 °C.
 *
 * Source: ASHRAE Handbook - Fundamentals, ch. 23, time to freezing with the insulation as the only resistance.
 */
export function hoursToCool(pipe: StillPipe, waterC: number, airC: number): number {
  inRange('waterC [°C]', waterC, 1e-6, 100)
  inRange('airC [°C]', airC, -80, -1e-6)
  const resistance = Math.log(pipe.insulatedM / pipe.outsideM) / (2 * Math.PI * pipe.insulationConductivity)
  const heatPerK = WATER_DENSITY * WATER_HEAT_CAPACITY * Math.PI * (pipe.boreM / 2) ** 2
  return (heatPerK * resistance * Math.log((waterC - airC) / -airC)) / 3600
}
