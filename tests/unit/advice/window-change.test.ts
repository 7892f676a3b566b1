// Which moves of a window are news.
import { describe, expect, test } from 'vitest'
import type { AdviceWindow } from '@/lib/advice/types'
import { nextWindowStep } from '@/lib/advice/window-change'

const at = (clock: string) => `2027-01-${clock < '12' ? '13' : '12'}T${clock}:00Z`
const NOW = new Date(at('18:00'))

function windowOf(startsAt: string, endsAt: string, kind: 'flood' | 'fill' = 'flood'): AdviceWindow {
  return {
    kind,
    startsAt: at(startsAt),
    endsAt: at(endsAt),
    latestStartAt: at(endsAt),
    setBy: at(endsAt),
    score: 80,
    agreement: 1,
    runs: 10,
  }
}

const summaryOf = (window: AdviceWindow | null = null) => ({ window, leadingReason: null })
const advised = {
  state: 'open' as const,
  startsAt: new Date(at('20:00')),
  endsAt: new Date(at('02:00')),
  latestStartAt: new Date(at('01:30')),
}

type Advised = NonNullable<Parameters<typeof nextWindowStep>[0]>

/** `null`: nothing was advised for the night so far. */
const stepOf = (summary: ReturnType<typeof summaryOf>, before: Advised | null = advised, now = NOW) =>
  nextWindowStep(before ?? undefined, summary, 'flood', now).step

describe('a first window', () => {
  test('opens', () => expect(stepOf(summaryOf(windowOf('20:00', '02:00')), null)).toBe('open'))
  test('that closed opens again', () =>
    expect(stepOf(summaryOf(windowOf('20:00', '02:00')), { state: 'closed' })).toBe('open'))
  test('is not made of a window of another kind', () =>
    expect(stepOf(summaryOf(windowOf('20:00', '02:00', 'fill')), null)).toBe('keep'))
  test('stays closed while there is none', () => expect(stepOf(summaryOf(), { state: 'closed' })).toBe('keep'))
})

describe('an advised window', () => {
  test('that moves by less than an hour is kept', () =>
    expect(stepOf(summaryOf(windowOf('20:30', '01:15')))).toBe('keep'))
  test('that begins an hour later is news', () => expect(stepOf(summaryOf(windowOf('21:00', '02:00')))).toBe('open'))
  test('that ends an hour earlier is news', () => expect(stepOf(summaryOf(windowOf('20:00', '01:00')))).toBe('open'))
  test('that is gone closes', () => expect(stepOf(summaryOf())).toBe('close'))
  test('that has begun is compared from now on', () =>
    expect(stepOf(summaryOf(windowOf('23:00', '02:00')), advised, new Date(at('23:00')))).toBe('keep'))
  test('past its latest start has run out, which is no news', () =>
    expect(stepOf(summaryOf(), advised, new Date(at('01:45')))).toBe('keep'))
})
