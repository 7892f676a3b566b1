// Sunshine when none is reported: position of the sun and cloud.
import { getPosition, getTimes } from 'suncalc'
import { inRange } from './check'

const RADIANS = Math.PI / 180

/**
 * Where the sun stands, refraction included.
 *
 * @param atMillis Instant. [ms since 1970-01-01 UTC]
 * @param latitudeDeg Latitude, north positive. [°], -90 to 90
 * @param longitudeDeg Longitude, east positive. [°], -180 to 180
 * @returns Altitude above the horizon and direction from north clockwise. [°]
 * @throws RangeError for a place off the globe.
 *
 * Source: suncalc 2 (degrees, with refraction).
 */
export function sunPositionDeg(
  atMillis: number,
  latitudeDeg: number,
  longitudeDeg: number,
): { altitudeDeg: number; azimuthDeg: number } {
  inRange('latitudeDeg [°]', latitudeDeg, -90, 90)
  inRange('longitudeDeg [°]', longitudeDeg, -180, 180)
  const { altitude, azimuth } = getPosition(new Date(atMillis), latitudeDeg, longitudeDeg)
  return { altitudeDeg: altitude, azimuthDeg: azimuth }
}

/**
 * Altitude of the sun alone, see sunPositionDeg.
 *
 * @param atMillis Instant. [ms since 1970-01-01 UTC]
 * @param latitudeDeg Latitude. [°], -90 to 90
 * @param longitudeDeg Longitude. [°], -180 to 180
 * @returns Altitude above the horizon. [°]
 * @throws RangeError for a place off the globe.
 *
 * Source: sunPositionDeg.
 */
export function sunAltitudeDeg(atMillis: number, latitudeDeg: number, longitudeDeg: number): number {
  return sunPositionDeg(atMillis, latitudeDeg, longitudeDeg).altitudeDeg
}

/**
 * Global radiation on level ground under a cloudless sky.
 *
 * @param altitudeDeg Sun above the horizon. [°]
 * @returns Flux. [W/m²], 0 when the sun is down
 *
 * Source: Haurwitz 1945, 1098 sin h exp(-0.059 / sin h), coefficients as in pvlib.
 */
export function clearSkyShortwaveWm2(altitudeDeg: number): number {
  const sine = Math.sin(altitudeDeg * RADIANS)
  return sine <= 0 ? 0 : 1098 * sine * Math.exp(-0.059 / sine)
}

// Runs of one forecast ask for the same hours at the same place; the sun does not depend on the run.
const clearSkyAt = new Map<number, number>()
let clearSkyPlace = ''
const MOST_HOURS_KEPT = 5000

/**
 * Sunshine from a clear sky at an instant and place.
 *
 * @param atMillis Instant. [ms since 1970-01-01 UTC]
 * @param latitudeDeg Latitude. [°], -90 to 90
 * @param longitudeDeg Longitude. [°], -180 to 180
 * @returns Flux. [W/m²]
 * @throws RangeError for a place off the globe.
 *
 * Source: clearSkyShortwaveWm2 at the sun's altitude.
 */
export function clearSkyShortwaveAtWm2(atMillis: number, latitudeDeg: number, longitudeDeg: number): number {
  const place = `${latitudeDeg} ${longitudeDeg}`
  if (place !== clearSkyPlace || clearSkyAt.size > MOST_HOURS_KEPT) {
    clearSkyAt.clear()
    clearSkyPlace = place
  }
  let flux = clearSkyAt.get(atMillis)
  if (flux === undefined) {
    flux = clearSkyShortwaveWm2(sunAltitudeDeg(atMillis, latitudeDeg, longitudeDeg))
    clearSkyAt.set(atMillis, flux)
  }
  return flux
}

/**
 * Share of clear-sky radiation that passes cloud.
 *
 * @param cloudCover Share of the sky. [0-1]
 * @returns Factor. [0.25-1]
 * @throws RangeError outside 0-1.
 *
 * Source: Kasten & Czeplak 1980, Solar Energy 24, 177: 1 - 0.75 (N/8)^3.4.
 */
export function cloudShortwaveFactor(cloudCover: number): number {
  return 1 - 0.75 * Math.pow(inRange('cloudCover [0-1]', cloudCover, 0, 1), 3.4)
}

/**
 * Sunrise and sunset of a day.
 *
 * @param atMillis Any instant of that solar day. [ms since 1970-01-01 UTC]
 * @param latitudeDeg Latitude. [°], -90 to 90
 * @param longitudeDeg Longitude. [°], -180 to 180
 * @returns Instants, null where the sun does not rise or set. [ms since 1970-01-01 UTC]
 *
 * Source: suncalc 2.
 */
export function sunUpDownMillis(
  atMillis: number,
  latitudeDeg: number,
  longitudeDeg: number,
): { riseMillis: number | null; setMillis: number | null } {
  const { sunrise, sunset } = getTimes(new Date(atMillis), latitudeDeg, longitudeDeg)
  return { riseMillis: sunrise?.getTime() ?? null, setMillis: sunset?.getTime() ?? null }
}
