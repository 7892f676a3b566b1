// The night plan: which passes to start when, by dynamic programming over quarter hours. Exact for the numbers it is given.

/** One possible start; a pass on a sheet that an earlier pass has just warmed sets later than the first of the night. */
export interface PlanSlot {
  startMillis: number
  /** Null when a pass started here is no good. */
  first: SlotOutcome | null
  later: SlotOutcome | null
}

export interface SlotOutcome {
  setMillis: number
  /** What the pass brings, less what the trip costs. Any unit, the same for all. */
  gain: number
}

export interface PlannedStart {
  startMillis: number
  setMillis: number
}

interface Chain {
  gain: number
  passes: number
  endMillis: number
  start: PlannedStart | null
  next: Chain | null
}

const NOTHING: Chain = { gain: 0, passes: 0, endMillis: Number.NEGATIVE_INFINITY, start: null, next: null }

/**
 * The passes that bring most in all, no pass before the one before it is set. Of plans that bring the same, the one
 * with fewer trips; of those, the one that is done earliest; of those, the one whose passes start earliest.
 *
 * @param slots Possible starts in ascending order.
 * @param maxPasses Most passes, 0 or more.
 * @returns Passes in order of time; none when no pass brings anything.
 *
 * Source: dynamic programming over starts and passes; ours.
 */
export function planPasses(slots: readonly PlanSlot[], maxPasses: number): PlannedStart[] {
  if (maxPasses <= 0) return []
  // later[k][q]: best chain of at most k further passes, none started before slot q.
  let later: Chain[] = new Array<Chain>(slots.length + 1).fill(NOTHING)
  for (let passes = 1; passes < maxPasses; passes += 1) later = extendChains(slots, later)
  let best = NOTHING
  for (let index = slots.length - 1; index >= 0; index -= 1) {
    const slot = slots[index] as PlanSlot
    best = betterOf(best, chainFrom(slots, later, slot, slot.first))
  }
  const starts: PlannedStart[] = []
  for (let chain: Chain | null = best; chain?.start; chain = chain.next) starts.push(chain.start)
  return starts
}

function extendChains(slots: readonly PlanSlot[], fewer: readonly Chain[]): Chain[] {
  const chains = new Array<Chain>(slots.length + 1).fill(NOTHING)
  for (let index = slots.length - 1; index >= 0; index -= 1) {
    const slot = slots[index] as PlanSlot
    chains[index] = betterOf(chains[index + 1] as Chain, chainFrom(slots, fewer, slot, slot.later))
  }
  return chains
}

function chainFrom(
  slots: readonly PlanSlot[],
  rest: readonly Chain[],
  slot: PlanSlot,
  outcome: SlotOutcome | null,
): Chain {
  if (!outcome) return NOTHING
  const next = rest[firstSlotFrom(slots, outcome.setMillis)] as Chain
  return {
    gain: outcome.gain + next.gain,
    passes: 1 + next.passes,
    endMillis: next.start ? next.endMillis : outcome.setMillis,
    start: { startMillis: slot.startMillis, setMillis: outcome.setMillis },
    next,
  }
}

/** Index of the first slot at or after an instant; the number of slots when there is none. */
function firstSlotFrom(slots: readonly PlanSlot[], millis: number): number {
  let low = 0
  let high = slots.length
  while (low < high) {
    const middle = (low + high) >> 1
    if ((slots[middle] as PlanSlot).startMillis >= millis) high = middle
    else low = middle + 1
  }
  return low
}

/** `b` starts no later than `a`, so it wins a full tie. */
function betterOf(a: Chain, b: Chain): Chain {
  const difference = b.gain - a.gain
  if (Math.abs(difference) > 1e-9) return difference > 0 ? b : a
  if (a.passes !== b.passes) return a.passes < b.passes ? a : b
  return b.endMillis <= a.endMillis ? b : a
}
