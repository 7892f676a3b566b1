// Heat balance of any rink surface, hour by hour; positive parts leave the surface.
import {
  FUSION_J_PER_KG,
  HOUR_SECONDS,
  ICE_HEAT_CAPACITY,
  STEFAN_BOLTZMANN,
  SUBLIMATION_J_PER_KG,
  SURFACE_EMISSIVITY,
  VAPORISATION_J_PER_KG,
  WATER_HEAT_CAPACITY,
  ZERO_CELSIUS_K,
} from './constants'
import { blackBodyWm2 } from './sky'
import { albedo, type SurfaceKind } from './albedo'
import { inRange } from './check'
import { psychrometricHpaPerK, saturationOverIceHpa, saturationOverWaterHpa } from './humidity'
import { transferCoefficient } from './exchange'
import type { HeatBalanceParts, PreparedHour } from './types'

export interface SurfaceBalance {
  netWm2: number
  parts: HeatBalanceParts
}

/** A balance and how fast its loss grows as the surface warms. */
export interface SurfaceLaw extends SurfaceBalance {
  /** [W m⁻² K⁻¹] */
  slopeWm2K: number
  /** Where the law was drawn. [°C] */
  aroundC: number
}

/**
 * What falls in an hour, as heat it takes from a surface at 0 °C: rain brings its warmth, snow takes what melting it
 * costs.
 *
 * @param hour Prepared hour.
 * @returns Flux, positive when it cools. [W/m²]
 *
 * Source: balance of heat, rain at air temperature; ours.
 */
export function precipitationHeatWm2(hour: PreparedHour): number {
  const snowMm = Math.max(0, hour.precipitationMm - hour.rainMm)
  const rainHeat = hour.rainMm * WATER_HEAT_CAPACITY * Math.max(0, hour.airTemperatureC)
  const snowHeat = snowMm * (FUSION_J_PER_KG + ICE_HEAT_CAPACITY * Math.max(0, -hour.airTemperatureC))
  return (snowHeat - rainHeat) / HOUR_SECONDS
}

/**
 * Heat balance of a surface at a given temperature, without precipitation (who gets that heat depends on what it falls on).
 *
 * @param hour Prepared hour; `isKnown` must be true.
 * @param kind What the surface is.
 * @param surfaceTemperatureC Its temperature. [°C], -80 to 100
 * @returns Net loss and its parts. [W/m²]
 * @throws RangeError for an unknown hour or a temperature out of range.
 *
 * Source: longwave by Prata 1996 and Unsworth & Monteith 1975 (see sky.ts); exchange see exchange.ts; latent heat by the Lewis relation.
 */
export function surfaceBalance(hour: PreparedHour, kind: SurfaceKind, surfaceTemperatureC: number): SurfaceBalance {
  if (!hour.isKnown) throw new RangeError(`weather of ${hour.time} is unknown`)
  inRange('surfaceTemperatureC [°C]', surfaceTemperatureC, -80, 100)
  const isFrozen = kind === 'ice' || kind === 'snow'
  const surfaceVapourHpa =
    isFrozen && surfaceTemperatureC <= 0
      ? saturationOverIceHpa(surfaceTemperatureC)
      : saturationOverWaterHpa(surfaceTemperatureC)
  const vapourExcessHpa = surfaceVapourHpa - hour.vapourPressureHpa
  const transfer = transferCoefficient(
    hour.windAtRinkMps,
    hour.airTemperatureC,
    surfaceTemperatureC,
    vapourExcessHpa,
    hour.pressureHpa,
  )
  const psychrometric = psychrometricHpaPerK(hour.pressureHpa, isFrozen ? SUBLIMATION_J_PER_KG : VAPORISATION_J_PER_KG)
  const parts: HeatBalanceParts = {
    longwave: SURFACE_EMISSIVITY * (blackBodyWm2(surfaceTemperatureC) - hour.longwaveDownWm2),
    sensible: transfer * (surfaceTemperatureC - hour.airTemperatureC),
    latent: (transfer * vapourExcessHpa) / psychrometric,
    shortwave: (1 - albedo(kind, surfaceTemperatureC)) * hour.shortwaveWm2,
    precipitation: 0,
  }
  return { netWm2: netOf(parts), parts }
}

// A sheet asks for the same hour several times in a row, and a prepared hour is never changed once made.
let lastHour: PreparedHour | null = null
let lastLaw: SurfaceLaw | null = null

/**
 * The law of a wet surface around 0 °C, without precipitation.
 *
 * @param hour Prepared hour, known.
 * @returns Balance [W/m²] and its slope [W m⁻² K⁻¹] at 0 °C.
 *
 * Source: surfaceLaw.
 */
export function wetLaw(hour: PreparedHour): SurfaceLaw {
  if (lastHour !== hour || lastLaw === null) {
    lastLaw = surfaceLaw(hour, 'wet', 0)
    lastHour = hour
  }
  return lastLaw
}

/**
 * Heat balance of a fresh flood: a wet surface at 0 °C.
 *
 * @param hour Prepared hour; `isKnown` must be true.
 * @returns Net loss and its parts, precipitation included. [W/m²]
 * @throws RangeError for an unknown hour.
 *
 * Source: surfaceBalance at 0 °C with precipitationHeatWm2.
 */
export function wetSurfaceBalance(hour: PreparedHour): SurfaceBalance {
  const { parts } = wetLaw(hour)
  const withRain = { ...parts, precipitation: precipitationHeatWm2(hour) }
  return { netWm2: netOf(withRain), parts: withRain }
}

/**
 * Straight line through the balance near a temperature, for implicit steps.
 *
 * @param hour Prepared hour.
 * @param kind What the surface is.
 * @param aroundC Where the line touches. [°C]
 * @returns Balance there [W/m²] and slope [W m⁻² K⁻¹]. The slope is a secant over one kelvin, at least the radiative
 *   one.
 *
 * Source: linearisation of surfaceBalance; ours.
 */
export function surfaceLaw(hour: PreparedHour, kind: SurfaceKind, aroundC: number): SurfaceLaw {
  const here = surfaceBalance(hour, kind, aroundC)
  const colder = surfaceBalance(hour, kind, Math.max(-79, aroundC - 1))
  const kelvin = aroundC + ZERO_CELSIUS_K
  const radiative = 4 * SURFACE_EMISSIVITY * STEFAN_BOLTZMANN * kelvin * kelvin * kelvin
  return {
    netWm2: here.netWm2,
    parts: here.parts,
    slopeWm2K: Math.max(radiative, here.netWm2 - colder.netWm2),
    aroundC,
  }
}

/**
 * Rate at which a loss of heat freezes water at 0 °C.
 *
 * @param netWm2 Net loss. [W/m²]
 * @returns Rate in liquid water; negative when ice melts. [mm/h]
 *
 * Source: definition of the heat of fusion.
 */
export function freezeRateMmPerH(netWm2: number): number {
  return (netWm2 * HOUR_SECONDS) / FUSION_J_PER_KG
}

function netOf(parts: HeatBalanceParts): number {
  return parts.longwave + parts.sensible + parts.latent - parts.shortwave + parts.precipitation
}
