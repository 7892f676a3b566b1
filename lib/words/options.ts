// How a person wants numbers and times written.
import { METRIC, type Units } from '@/lib/units'

export interface WordOptions {
  /** IANA zone of the rink: all times are told in it. */
  timeZone: string
  units: Units
  clock: '12' | '24'
  /** BCP 47, for names of days and for digits. */
  locale: string
}

/** What `npm run score` writes. */
export function plainWords(timeZone: string): WordOptions {
  return { timeZone, units: METRIC, clock: '24', locale: 'en' }
}
