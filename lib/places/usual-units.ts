// The units that most people of a country read; each person may choose others, one by one.
import { IMPERIAL, METRIC, type Units } from '@/lib/units'

/** The United States and what it administers. */
const CUSTOMARY = ['US', 'PR', 'GU', 'VI', 'AS', 'MP']
/** Weather is told in metres a second there: the Nordic and Baltic services, and those east of them. */
const METRES_A_SECOND = ['NO', 'SE', 'FI', 'DK', 'IS', 'EE', 'LV', 'LT', 'RU', 'BY', 'UA', 'KZ', 'MN', 'CN', 'JP', 'KR']

/** @param countryCode ISO 3166-1, two letters. */
export function usualUnits(countryCode: string): Units {
  if (CUSTOMARY.includes(countryCode)) return IMPERIAL
  if (METRES_A_SECOND.includes(countryCode)) return { ...METRIC, wind: 'm/s' }
  return countryCode === 'GB' ? { ...METRIC, wind: 'mph' } : METRIC
}
