// How a person wants numbers and times written.

export interface WordOptions {
  /** IANA zone of the rink: all times are told in it. */
  timeZone: string
  units: 'metric' | 'imperial'
  clock: '12' | '24'
  /** BCP 47, for names of days and for digits. */
  locale: string
}

/** What `npm run score` writes. */
export function plainWords(timeZone: string): WordOptions {
  return { timeZone, units: 'metric', clock: '24', locale: 'en' }
}
