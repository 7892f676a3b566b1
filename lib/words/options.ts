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

/** As a person wants figures and the clock; times are told in the rink's zone. */
export function wordsFor({ units, clock }: Pick<WordOptions, 'units' | 'clock'>, timeZone: string): WordOptions {
  return { units, clock, timeZone, locale: 'en' }
}

/** What `npm run score` writes. */
export function plainWords(timeZone: string): WordOptions {
  return { timeZone, units: METRIC, clock: '24', locale: 'en' }
}
