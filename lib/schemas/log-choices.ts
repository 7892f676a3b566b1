// What can be written into the log. No zod in here: screens read it too.

export const LOG_KINDS = ['flood', 'fill', 'scrape', 'clear', 'repair', 'reading', 'thaw', 'note'] as const
export const OUTCOMES = ['set', 'wet', 'spoiled'] as const

export type LogKind = (typeof LOG_KINDS)[number]
export type Outcome = (typeof OUTCOMES)[number]

/** Of an hour that the clock shows twice: the one before it is set back, or the one after. */
export const WHICH_HOURS = ['first', 'second'] as const
export type WhichHour = (typeof WHICH_HOURS)[number]

/** Longest note. The database refuses longer ones too. */
export const NOTE_LENGTH = 500

/** One litre more or less is the rounding of what was typed. [L] Ours. */
const SAME_WATER_L = 1

/** Whether the water is what the layer takes on so large a rink: a form then leaves it to follow the layer. */
export function followsLayer({ layerMm, waterL }: Pick<EntryView, 'layerMm' | 'waterL'>, areaM2: number): boolean {
  return layerMm !== null && waterL !== null && Math.abs(layerMm * areaM2 - waterL) < SAME_WATER_L
}

/** What an entry said: as listed, and as its history keeps it. Instants are ISO text. */
export interface EntryView {
  id: string
  kind: LogKind
  happenedAt: string
  nightDate: string
  layerMm: number | null
  waterL: number | null
  waterTemperatureC: number | null
  waterKind: 'cold-tap' | 'hot-tap' | 'hydrant' | 'tanker' | null
  thicknessMm: number | null
  modelThicknessMm: number | null
  saidSetByAt: string | null
  outcome: Outcome | null
  outcomeAt: string | null
  note: string
  by: string | null
  version: number
  isDeleted: boolean
}
