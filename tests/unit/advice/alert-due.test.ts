// What is due to one person: every way to be silent, and every way to speak once.
import { describe, expect, test } from 'vitest'
import { dueAlert, type AlertQuestion } from '@/lib/advice/alert-due'

const NOW = new Date('2027-01-12T21:00:00Z')
const LATER = new Date('2027-01-13T04:00:00Z')
const EARLIER = new Date('2027-01-12T20:30:00Z')

const open = (version: number) => ({ version, state: 'open' as const, latestStartAt: LATER })
const closed = (version: number) => ({ version, state: 'closed' as const, latestStartAt: null })

function ask(changes: Partial<AlertQuestion>) {
  return dueAlert({
    now: NOW,
    tellAt: EARLIER,
    isMuted: false,
    isForecastStale: false,
    window: open(1),
    told: null,
    changesTold: 0,
    hasPoured: false,
    ...changes,
  })
}

describe('silence', () => {
  test.each<[string, Partial<AlertQuestion>]>([
    ['before the person’s time of day', { tellAt: LATER }],
    ['without a window', { window: null }],
    ['when muted', { isMuted: true }],
    ['on an old forecast', { isForecastStale: true }],
    ['once somebody has poured', { hasPoured: true }],
    ['past the latest start', { now: LATER }],
    ['when the version was told', { told: { version: 1, kind: 'flood-tonight' } }],
    ['about a window that closed before anyone was told of it', { window: closed(2) }],
    ['about a closed window that is still closed', { window: closed(3), told: { version: 2, kind: 'flood-closed' } }],
    [
      'after three changes in a night',
      { window: open(5), told: { version: 4, kind: 'flood-changed' }, changesTold: 3 },
    ],
  ])('%s', (_when, changes) => {
    expect(ask(changes)).toBeNull()
  })
})

describe('speech', () => {
  test.each<[string, Partial<AlertQuestion>, string]>([
    ['the first word of a good night', {}, 'flood-tonight'],
    ['a window that moved', { window: open(2), told: { version: 1, kind: 'flood-tonight' } }, 'flood-changed'],
    ['a window that closed', { window: closed(2), told: { version: 1, kind: 'flood-tonight' } }, 'flood-closed'],
    [
      'a closing, also after three changes',
      { window: closed(5), told: { version: 4, kind: 'flood-changed' }, changesTold: 3 },
      'flood-closed',
    ],
    ['a window that opened again', { window: open(3), told: { version: 2, kind: 'flood-closed' } }, 'flood-changed'],
    ['a good night that shows itself only in the evening', { window: open(3) }, 'flood-tonight'],
  ])('%s', (_what, changes, kind) => {
    expect(ask(changes)).toBe(kind)
  })
})
