// Which zone a place is in, and which zones exist.
import { find } from 'geo-tz/all'

/**
 * The IANA zone at a position. `geo-tz/all` keeps zones apart that agree since 1970; its default export would call Atikokan's Panama.
 *
 * @param latitudeDeg [°], valid -90 to 90
 * @param longitudeDeg [°], valid -180 to 180
 */
export function timeZoneAt(latitudeDeg: number, longitudeDeg: number): string {
  const [zone] = find(latitudeDeg, longitudeDeg)
  return zone ?? 'UTC'
}
