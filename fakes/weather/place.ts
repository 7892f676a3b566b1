// The grid of the pretended model, and the clock of a place.

export interface Place {
  latitude: number
  longitude: number
  elevationM: number
}

/** About 3 km: answers carry the middle of a grid cell, not what was asked for. */
const GRID_DEG = 0.03

export function snapToGrid(latitude: number, longitude: number): Place {
  const snap = (degrees: number) => Number((Math.round(degrees / GRID_DEG) * GRID_DEG + 0.000816).toFixed(6))
  const place = { latitude: snap(latitude), longitude: snap(longitude) }
  const hills = Math.abs(Math.sin(place.latitude * 7.1) * Math.cos(place.longitude * 5.3))
  return { ...place, elevationM: Math.round(90 + 280 * hills) }
}

/** Mean solar time to the whole hour, so that what happens "at 5" happens on a clock's hour in most zones. */
export function solarOffsetHours(place: Pick<Place, 'longitude'>): number {
  return Math.round(place.longitude / 15)
}

/**
 * The solar date (days since 1970) of "tonight". It turns at 6 in the morning: until then the night under way is
 * tonight, from then on the coming one.
 */
export function tonightOf(nowMs: number, place: Pick<Place, 'longitude'>): number {
  return Math.floor((nowMs / 3_600_000 + solarOffsetHours(place) - 6) / 24)
}
