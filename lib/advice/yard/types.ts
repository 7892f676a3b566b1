// What a keeper can tell about a yard, and what is learned from it. Plain JSON, in the units of lib/advice/types.ts.
import type { NewSheet } from '@/lib/physics/sheet'
import type { HourlyRecord } from '@/lib/physics/types'
import type { StoredSheet } from '../types'

/** The two factors by which a yard changes the weather; see `Site` in lib/physics/types.ts. */
export interface Yard {
  /** Factor on the wind. [0-1] */
  shelter: number
  /** Open share of the sky. [0-1] */
  skyView: number
}

export interface PouredLayer {
  /** ISO 8601, UTC. */
  at: string
  /** [mm], above 0 to 500 */
  layerMm: number
  /** Of the water. [°C], 0 to 100 */
  temperatureC: number
}

/** The weather and the sheet that a report is held against. */
interface Situation {
  /** Consecutive hours from the one at whose start the sheet is known, on past the report where there are any. */
  hours: HourlyRecord[]
  /** The sheet at the start of the first hour: what is known of it, or a state that `judge` gave out. */
  sheet: NewSheet | { state: StoredSheet }
  /** Layers poured since, oldest first, each within the hours. */
  poured: PouredLayer[]
  /** When the keeper saw it. ISO 8601, UTC. */
  at: string
}

/**
 * What became of the last layer poured: it set about `at`; it had set before somebody looked at `at`; it was still wet then.
 */
export interface LayerReport extends Situation {
  kind: 'set' | 'set_before' | 'wet'
  /** How far off the moment may be. [min], 1 to 600; default 20 for `set`, 10 for the others */
  uncertaintyMinutes?: number
}

/** Thickness in a drilled hole. */
export interface DrilledReport extends Situation {
  kind: 'drilled'
  /** [mm], 0 to 3000 */
  thicknessMm: number
}

export type YardReport = LayerReport | DrilledReport

export interface YardLesson {
  latitudeDeg: number
  longitudeDeg: number
  /** As the keeper set it: what is believed before any report. */
  prior: Yard
  /** In any order; the newest ones count when there are many. */
  reports: readonly YardReport[]
}

/** What to use from now on, and what a page can say of it. */
export interface LearnedYard extends Yard {
  /** False: the factors are the prior's, exactly. */
  isLearned: boolean
  /** Why the prior stands; null when something was learned. */
  keptBecause: 'too_few_nights' | 'no_better' | null
  prior: Yard
  /** Standard deviation of each factor in use. [0-1 scale] */
  sd: Yard
  reportsUsed: number
  /** Weather missing, or older than the newest that count. */
  reportsLeftOut: number
  /** Nights that the used reports speak of. */
  nights: number
  /**
   * Mean of how far off the set time was in reports of kind `set`: by the prior, and by factors learned from the other nights
   * only. Null without such reports or with too few nights.
   */
  setTimeError: { reports: number; beforeMinutes: number; afterMinutes: number } | null
  /** Which factor moved furthest for how well it was known. */
  ledBy: 'wind' | 'sky' | 'neither'
}
