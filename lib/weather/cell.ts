// Puts a rink on the grid on which forecasts are asked for and stored.
import type { GridCell } from './port'

/**
 * The cell of a place: two decimals, about 1.1 km north to south and 0.8 km east to west at 45°. Finer than the models
 * behind the services (2-3 km at best), so nothing of the forecast is lost and the correction for the height of the
 * place stays right to the nearest slope; coarse enough that the rinks of one neighbourhood share a request.
 *
 * @param latitudeDeg [°], valid -90 to 90
 * @param longitudeDeg [°], valid -180 to 180
 * @throws RangeError off the globe.
 */
export function cellOf(latitudeDeg: number, longitudeDeg: number): GridCell {
  if (!(Math.abs(latitudeDeg) <= 90)) throw new RangeError(`Latitude ${latitudeDeg} is not within -90 to 90`)
  if (!(Math.abs(longitudeDeg) <= 180)) throw new RangeError(`Longitude ${longitudeDeg} is not within -180 to 180`)
  const longitude = roundToCell(longitudeDeg)
  return { latitudeDeg: roundToCell(latitudeDeg), longitudeDeg: longitude === 180 ? -180 : longitude }
}

function roundToCell(degrees: number): number {
  return Math.round(degrees * 100) / 100 + 0
}
