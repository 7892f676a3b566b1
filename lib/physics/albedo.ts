// How much sunshine a surface turns back.

/** Open water on liner, a wet film on ice, bare ice, snow. */
export type SurfaceKind = 'water' | 'wet' | 'ice' | 'snow'

/** FLake reference value for water; the same number as the usual one for a high sun. [0-1] */
const WATER_ALBEDO = 0.07
/** A film of water over white or grey ice. [0-1] Ours, between FLake's water 0.07 and GLM's melting ice 0.44. */
const WET_FILM_ALBEDO = 0.35
/** Snow: FLake and GLM print 0.60-0.70 when dry; 0.50 when melting (GLM). [0-1] */
const DRY_SNOW_ALBEDO = 0.75
const MELTING_SNOW_ALBEDO = 0.5

/**
 * Albedo of a surface.
 *
 * @param kind What the surface is.
 * @param surfaceTemperatureC Its temperature. [°C]
 * @returns Share of sunshine turned back. [0-1]
 *
 * Source: bare ice as in GLM (0.60 at -5 °C and colder, 0.44 - 0.032 T up to 0 °C); others see above.
 */
export function albedo(kind: SurfaceKind, surfaceTemperatureC: number): number {
  if (kind === 'water') return WATER_ALBEDO
  if (kind === 'wet') return WET_FILM_ALBEDO
  if (kind === 'ice') return Math.min(0.6, Math.max(0.44, 0.44 - 0.032 * surfaceTemperatureC))
  return surfaceTemperatureC < -0.5 ? DRY_SNOW_ALBEDO : MELTING_SNOW_ALBEDO
}
