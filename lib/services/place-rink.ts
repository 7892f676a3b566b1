// What follows from a rink's position: its clock, unless the keeper chose one, and the name of the place.
import { findNearestPlace } from '@/lib/places/gazetteer'
import { timeZoneAt } from '@/lib/places/time-zone'

export interface Position {
  latitudeDeg: number
  longitudeDeg: number
  placeName?: string
  /** As chosen; without one the clock follows from the position. */
  timeZone?: string
}

export interface Placed {
  placeName: string
  timeZone: string
  /** A chosen clock outlives a move of the rink, also across the border of a zone. */
  timeZoneBy: 'place' | 'keeper'
}

/** Reads files, so it happens before any transaction. */
export async function placeOf({ latitudeDeg, longitudeDeg, placeName, timeZone }: Position): Promise<Placed> {
  const zoneThere = timeZoneAt(latitudeDeg, longitudeDeg)
  return {
    placeName: placeName || (await nameOf(latitudeDeg, longitudeDeg)),
    timeZone: timeZone ?? zoneThere,
    timeZoneBy: timeZone === undefined ? 'place' : 'keeper',
  }
}

async function nameOf(latitudeDeg: number, longitudeDeg: number): Promise<string> {
  const nearest = await findNearestPlace(latitudeDeg, longitudeDeg)
  return nearest ? `Near ${nearest.name}` : `${latitudeDeg.toFixed(2)}, ${longitudeDeg.toFixed(2)}`
}
