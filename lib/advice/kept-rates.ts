// How often a season's advice was kept, and whether "nine runs in ten" meant nine nights in ten.

export interface KeptNight {
  said: 'flood' | 'fill' | 'hold'
  result: 'kept' | 'broken' | 'unknown'
  /** 0-1, of a flood */
  agreement: number | null
}

export interface Rate {
  kept: number
  of: number
}

export interface KeptRates {
  flood: Rate
  hold: Rate
  /** Nights called good, by the share of runs that agreed. */
  bands: { from: number; to: number; rate: Rate }[]
  /** Nights that could not be told. */
  unknown: number
}

const BANDS = [
  [0.7, 0.8],
  [0.8, 0.9],
  [0.9, 1],
] as const

/**
 * Rates over settled nights; nights whose outcome nobody knows are counted apart.
 *
 * @param nights Settled nights; agreement [0-1] or null.
 * @returns Counts and shares [0-1], by what was said and by band of agreement.
 *
 * Source: count of those that came true over those known.
 */
export function keptRates(nights: readonly KeptNight[]): KeptRates {
  const known = nights.filter(({ result }) => result !== 'unknown')
  const floods = known.filter(({ said }) => said === 'flood')
  return {
    flood: rateOf(floods),
    hold: rateOf(known.filter(({ said }) => said === 'hold')),
    bands: BANDS.map(([from, to]) => ({
      from,
      to,
      rate: rateOf(floods.filter(({ agreement }) => agreement !== null && isWithin(agreement, from, to))),
    })),
    unknown: nights.length - known.length,
  }
}

/** The highest band has its upper end. */
function isWithin(agreement: number, from: number, to: number): boolean {
  return agreement >= from && (agreement < to || to === 1)
}

function rateOf(nights: readonly KeptNight[]): Rate {
  return { kept: nights.filter(({ result }) => result === 'kept').length, of: nights.length }
}
