// What can be chosen for a rink, in words.
import type { PHASES, WATER_KINDS } from '@/lib/schemas/rink-choices'

export const PHASE_WORDS: Record<(typeof PHASES)[number], string> = {
  planning: 'Nothing built yet',
  waiting: 'Built, waiting for cold to fill',
  filling: 'Filling now',
  freezing: 'Filled, freezing through',
  skating: 'Ice that carries skaters',
  thaw: 'Ice, thawing',
  closed: 'Closed for the season',
}

export const WATER_WORDS: Record<(typeof WATER_KINDS)[number], string> = {
  'cold-tap': 'Cold tap and hose',
  'hot-tap': 'Hot tap and hose',
  hydrant: 'Hydrant',
  tanker: 'Tanker',
}
