// A thaw ahead: told once, a day ahead at most; silence otherwise.
import { describe, expect, test } from 'vitest'
import { dueThaw, type ThawQuestion } from '@/lib/advice/thaw-due'

// 16:10 in Toronto, five hours behind; told at 15:30.
const NOW = new Date('2027-01-12T21:10:00Z')
const THAW = { startsAt: '2027-01-13T15:00:00Z', endsAt: '2027-01-15T03:00:00Z', lossMm: 12 }
const LATER = { startsAt: '2027-01-15T15:00:00Z', endsAt: '2027-01-17T03:00:00Z', lossMm: 8 }

function ask(changes: Partial<ThawQuestion>) {
  return dueThaw({
    now: NOW,
    tellAt: new Date('2027-01-12T20:30:00Z'),
    isMuted: false,
    isForecastStale: false,
    thaws: [THAW, LATER],
    told: [],
    ...changes,
  })
}

describe('silence', () => {
  test.each<[string, Partial<ThawQuestion>]>([
    ['when muted', { isMuted: true }],
    ['on an old forecast', { isForecastStale: true }],
    ['without a thaw', { thaws: [] }],
    ['about a thaw more than a day off', { thaws: [LATER] }],
    ['about the thaw that is on', { now: new Date('2027-01-13T15:00:00Z'), tellAt: new Date('2027-01-12T20:30:00Z') }],
    ['about a thaw that was told', { told: [THAW] }],
    ['about one that overlaps a thaw that was told', { told: [{ ...THAW, endsAt: '2027-01-13T16:00:00Z' }] }],
    ['before the person’s time of day, when that is early enough', { now: new Date('2027-01-12T17:00:00Z') }],
  ])('%s', (_when, changes) => {
    expect(ask(changes)).toBeNull()
  })
})

describe('speech', () => {
  test.each<[string, Partial<ThawQuestion>]>([
    ['a thaw within a day', {}],
    ['another than the one that was told', { told: [{ startsAt: '2027-01-10T15:00:00Z', endsAt: THAW.startsAt }] }],
    ['a thaw that shows itself at night and begins in the morning', { now: new Date('2027-01-13T08:00:00Z') }],
  ])('%s', (_what, changes) => {
    expect(ask(changes)).toEqual(THAW)
  })
})
