// Published friction in a hose, for which the product asks for a bucket test, and pipes wrapped up, which a rink has none of.
import { WATER_DENSITY } from '@/lib/physics/constants'
import { coolingHours } from '@/lib/physics/hose'

/** Hazen-Williams factor for m and m³/s, from the US form below. */
const HEAD_FACTOR = 10.9617

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

/** A pipe in insulation, full of still water. */
interface WrappedPipe {
  boreM: number
  /** Outside of the wall, where insulation begins. [m] */
  outsideM: number
  /** Outside of the insulation. [m] */
  insulatedM: number
  /** [W m⁻¹ K⁻¹] */
  insulationConductivity: number
}

/**
 * Time in which the water in a wrapped pipe cools to 0 °C, by the product's own cooling.
 *
 * @param pipe Dimensions.
 * @param waterC Water at the start. [°C], above 0
 * @param airC Air. [°C], below 0
 * @returns Time. [h]
 *
 * Source: ASHRAE Handbook - Fundamentals, ch. 23, time to freezing with the insulation as the only resistance.
 */
export function wrappedPipeHoursToCool(pipe: WrappedPipe, waterC: number, airC: number): number {
  const resistance = Math.log(pipe.insulatedM / pipe.outsideM) / (2 * Math.PI * pipe.insulationConductivity)
  return coolingHours(pipe.boreM, resistance, waterC, airC)
}
