// The headline follows the keeper's own plan.
import { expect, test } from 'vitest'
import { summaryOfPlan } from '@/app/(member)/rinks/[rinkId]/_components/summary-of-plan'
import type { NightSummary } from '@/lib/advice/night-summary'
import type { TonightPass } from '@/lib/schemas/tonight-view'
import { METRIC } from '@/lib/units'
import { sureSentence } from '@/lib/words/night'

const words = { timeZone: 'UTC', units: METRIC, clock: '24', locale: 'en' } as const
const summary = {
  endsAt: '2027-01-13T12:00:00Z',
  passes: [],
  lastSetBy: '2027-01-13T02:05:00Z',
  agreement: 1,
  runs: 24,
  precipitation: null,
} as unknown as NightSummary
const pass = (number: number, setBy: string | null, isPoured = false) =>
  ({ number, setBy, layerMm: 3, poured: isPoured ? {} : null }) as TonightPass

test('to the last of its open passes', () => {
  const own = summaryOfPlan(summary, [pass(1, '2027-01-13T05:00:00Z', true), pass(2, '2027-01-13T02:15:00Z')])
  expect(own.passes).toHaveLength(1)
  expect(sureSentence(own, words)).toBe('All 24 forecast runs agree. The pass is set by 02:15.')
})

test('and promises no time where a pass does not set', () => {
  const own = summaryOfPlan(summary, [pass(1, '2027-01-13T02:15:00Z'), pass(2, null)])
  expect(sureSentence(own, words)).toBe('All 24 forecast runs agree.')
})
