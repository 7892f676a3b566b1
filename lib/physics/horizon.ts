// What a hill, a house or a shade cloth keeps of the sunshine: the direct part is cut, the rest comes from the sky that is left.
import { inRange } from './check'
import { sunPositionDeg } from './sun'
import type { Site } from './types'

const QUARTER_MILLIS = 900_000
const OCTANT_DEG = 45

/** Whether a site keeps any sunshine off. */
function isShaded(site: Site): boolean {
  return site.horizonDeg !== undefined || (site.shade ?? 0) > 0
}

/**
 * Height of the skyline in one direction.
 *
 * @param horizonDeg One height all round, or eight from north clockwise (N, NE, E, SE, S, SW, W, NW). [°], 0-90
 * @param azimuthDeg Direction, from north clockwise. [°]
 * @returns Height, between two of the eight by a straight line. [°]
 * @throws RangeError for a height out of range or a list that is not eight long.
 *
 * Source: straight line between octants; ours.
 */
export function skylineDeg(horizonDeg: number | readonly number[], azimuthDeg: number): number {
  if (typeof horizonDeg === 'number') return inRange('horizonDeg [°]', horizonDeg, 0, 90)
  if (horizonDeg.length !== 8) throw new RangeError(`horizonDeg must have 8 heights, got ${horizonDeg.length}`)
  const steps = (((azimuthDeg % 360) + 360) % 360) / OCTANT_DEG
  const before = Math.floor(steps)
  const from = inRange('horizonDeg [°]', horizonDeg[before % 8]!, 0, 90)
  const to = inRange('horizonDeg [°]', horizonDeg[(before + 1) % 8]!, 0, 90)
  return from + (to - from) * (steps - before)
}

/**
 * Share of global radiation that comes from the whole sky instead of straight from the sun.
 *
 * @param cloudCover Share of the sky. [0-1]
 * @returns Share. [0.3-1]
 * @throws RangeError outside 0-1.
 *
 * Source: Kasten & Czeplak 1980, Solar Energy 24, 177: 0.3 + 0.7 (N/8)²; from memory.
 */
export function diffuseShare(cloudCover: number): number {
  return 0.3 + 0.7 * inRange('cloudCover [0-1]', cloudCover, 0, 1) ** 2
}

/**
 * Sunshine that reaches a rink with a skyline or shade. A site without either takes the record's sunshine as it is.
 *
 * @param globalWm2 Mean of the hour on open level ground. [W/m²]
 * @param cloudCover Share of the sky. [0-1]
 * @param startsAtMillis Start of the hour. [ms since 1970-01-01 UTC]
 * @param site Place, skyline, `shade` (share of direct sunshine that trees or a cloth keep off, 0-1), `skyView`.
 * @returns Flux on the rink. [W/m²]
 * @throws RangeError for a cloud cover, shade or skyline out of range.
 *
 * Source: direct sunshine over the skyline, diffuse by the open share of the sky; ours.
 */
export function sunshineOnRinkWm2(globalWm2: number, cloudCover: number, startsAtMillis: number, site: Site): number {
  if (globalWm2 <= 0 || !isShaded(site)) return globalWm2
  const diffuse = globalWm2 * diffuseShare(cloudCover)
  const through = 1 - inRange('shade [0-1]', site.shade ?? 0, 0, 1)
  return (globalWm2 - diffuse) * through * shareOverSkyline(startsAtMillis, site) + diffuse * site.skyView
}

/** Share of the hour's quarters with the sun up in which it stands over the skyline. */
function shareOverSkyline(startsAtMillis: number, site: Site): number {
  let up = 0
  let over = 0
  for (let quarter = 0; quarter < 4; quarter += 1) {
    const at = startsAtMillis + (quarter + 0.5) * QUARTER_MILLIS
    const { altitudeDeg, azimuthDeg } = sunPositionDeg(at, site.latitudeDeg, site.longitudeDeg)
    if (altitudeDeg <= 0) continue
    up += 1
    if (altitudeDeg > skylineDeg(site.horizonDeg ?? 0, azimuthDeg)) over += 1
  }
  return up === 0 ? 0 : over / up
}
