// An hour whose weather nobody knows.
import type { ScoredHour } from './types'

/** What such an hour has in common with any other of its kind. */
export const UNKNOWN_HOUR = {
  isKnown: false,
  netHeatLossWm2: null,
  parts: null,
  freezeRateMmPerH: null,
  windChillC: null,
  setsAt: null,
  scores: { fill: 0, flood: 0, hold: 100 },
  verdict: 'hold',
  weather: null,
} satisfies Partial<ScoredHour>
