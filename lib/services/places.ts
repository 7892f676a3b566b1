// Finding the place of a rink: by name, or by position. For signed-in people, and not without end.
import type { ServiceContext } from '@/lib/context'
import { findNearestPlace, findPlaces, type Place } from '@/lib/places/gazetteer'
import { timeZoneAt } from '@/lib/places/time-zone'
import { usualUnits } from '@/lib/places/usual-units'
import { unitsCode } from '@/lib/units'
import { spend } from './rate-limits'

export interface PlaceSuggestion {
  /** Name and region, as the rink's place is called. */
  placeName: string
  country: string
  latitudeDeg: number
  longitudeDeg: number
  timeZone: string
  /** The usual ones there, as a form sends them. */
  units: string
}

function placeName({ name, region, country }: Place): string {
  return `${name}, ${region || country}`
}

function toSuggestion(place: Place): PlaceSuggestion {
  const { latitudeDeg, longitudeDeg, country, countryCode } = place
  return {
    placeName: placeName(place),
    country,
    latitudeDeg,
    longitudeDeg,
    timeZone: timeZoneAt(latitudeDeg, longitudeDeg),
    units: unitsCode(usualUnits(countryCode)),
  }
}

export async function searchPlaces(context: ServiceContext, query: string): Promise<PlaceSuggestion[]> {
  await spend(context, 'placeSearchByUser', context.viewer.userId)
  return (await findPlaces(query)).map(toSuggestion)
}

/** The position itself, called after the nearest town. */
export async function describePosition(
  context: ServiceContext,
  position: { latitudeDeg: number; longitudeDeg: number },
): Promise<PlaceSuggestion> {
  await spend(context, 'placeSearchByUser', context.viewer.userId)
  const nearest = await findNearestPlace(position.latitudeDeg, position.longitudeDeg)
  return {
    ...position,
    placeName: nearest ? `Near ${placeName(nearest)}` : '',
    country: nearest?.country ?? '',
    timeZone: timeZoneAt(position.latitudeDeg, position.longitudeDeg),
    units: unitsCode(usualUnits(nearest?.countryCode ?? '')),
  }
}
