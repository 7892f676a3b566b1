// The night plan against every possible plan.
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { planPasses, type PlanSlot, type PlannedStart, type SlotOutcome } from '@/lib/advice/plan'

const QUARTER = 900_000

/** Value of the best plan, found by trying every one. */
function bestGain(
  slots: readonly PlanSlot[],
  passesLeft: number,
  freeMillis: number,
  isFirst: boolean,
  from = 0,
): number {
  if (passesLeft === 0) return 0
  let best = 0
  for (let index = from; index < slots.length; index += 1) {
    const slot = slots[index] as PlanSlot
    const outcome = isFirst ? slot.first : slot.later
    if (!outcome || slot.startMillis < freeMillis) continue
    best = Math.max(best, outcome.gain + bestGain(slots, passesLeft - 1, outcome.setMillis, false, index + 1))
  }
  return best
}

function gainOf(slots: readonly PlanSlot[], starts: readonly PlannedStart[]): number {
  return starts.reduce((sum, { startMillis }, index) => {
    const slot = slots.find((one) => one.startMillis === startMillis) as PlanSlot
    return sum + ((index === 0 ? slot.first : slot.later) as SlotOutcome).gain
  }, 0)
}

const outcome = fc.option(
  fc.record({ quarters: fc.integer({ min: 1, max: 9 }), gain: fc.integer({ min: -2, max: 9 }) }),
  { freq: 4 },
)
const slotsArbitrary = fc.array(fc.tuple(outcome, outcome), { maxLength: 12 }).map((rows) =>
  rows.map(([first, later], index): PlanSlot => {
    const startMillis = index * QUARTER
    const of = (one: typeof first) => one && { setMillis: startMillis + one.quarters * QUARTER, gain: one.gain }
    return { startMillis, first: of(first), later: of(later) }
  }),
)

describe('the plan of a night', () => {
  test('brings as much as the best of all possible plans, whatever the night', () => {
    fc.assert(
      fc.property(slotsArbitrary, fc.integer({ min: 0, max: 4 }), (slots, maxPasses) => {
        const starts = planPasses(slots, maxPasses)
        expect(gainOf(slots, starts)).toBeCloseTo(bestGain(slots, maxPasses, Number.NEGATIVE_INFINITY, true), 9)
      }),
      { numRuns: 500 },
    )
  })

  test('starts no pass before the last is set, and never more than allowed', () => {
    fc.assert(
      fc.property(slotsArbitrary, fc.integer({ min: 0, max: 4 }), (slots, maxPasses) => {
        const starts = planPasses(slots, maxPasses)
        expect(starts.length).toBeLessThanOrEqual(maxPasses)
        starts.slice(1).forEach((pass, index) => {
          expect(pass.startMillis).toBeGreaterThanOrEqual((starts[index] as PlannedStart).setMillis)
        })
      }),
    )
  })

  const same = (startQuarter: number, setQuarter: number, gain: number): PlanSlot => {
    const result = { setMillis: setQuarter * QUARTER, gain }
    return { startMillis: startQuarter * QUARTER, first: result, later: result }
  }

  test('is not greedy: two short passes beat the one long pass that looks best alone', () => {
    const starts = planPasses([same(0, 2, 2), same(1, 8, 3), same(4, 6, 2)], 3)
    expect(starts.map((pass) => pass.startMillis / QUARTER)).toEqual([0, 4])
  })

  test('of two plans that bring the same takes the one with fewer trips', () => {
    const starts = planPasses([same(0, 2, 2), same(1, 9, 4), same(2, 3, 2)], 2)
    expect(starts.map((pass) => pass.startMillis / QUARTER)).toEqual([1])
  })

  test('of equal plans takes the one that is done earliest', () => {
    const starts = planPasses([same(3, 5, 2), same(4, 6, 2)], 1)
    expect(starts[0]?.startMillis).toBe(3 * QUARTER)
  })
})
