// Published friction in a hose. The product asks for a bucket test instead; this holds trade figures beside its sums.
import { WATER_DENSITY } from '@/lib/physics/constants'

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
