// Whether the sun is down at a rink. In Ottawa it rises at about 7:40 and sets at about 16:42 EST (UTC-5) in mid-January.
import { expect, test } from 'vitest'
import { daylight } from '@/lib/daylight'

const OTTAWA = { latitudeDeg: 45.42, longitudeDeg: -75.7 }
const TROMSO = { latitudeDeg: 69.65, longitudeDeg: 18.96 }

test.each([
  ['2027-01-12T21:00:00Z', false],
  ['2027-01-12T22:15:00Z', true],
  ['2027-01-13T05:00:00Z', true],
  ['2027-01-13T12:15:00Z', true],
  ['2027-01-13T13:15:00Z', false],
])('at %s in Ottawa', (at, isDark) => {
  expect(daylight(new Date(at), OTTAWA).isDark).toBe(isDark)
})

test('the next changes are told in turn', () => {
  const { changes } = daylight(new Date('2027-01-12T17:00:00Z'), OTTAWA)
  expect(changes.slice(0, 3).map(({ isDark }) => isDark)).toEqual([true, false, true])
  expect(changes[0]?.at.toISOString().slice(0, 13)).toBe('2027-01-12T21')
})

test('a polar night is dark at noon, a polar day light at midnight, and neither changes', () => {
  expect(daylight(new Date('2026-12-20T11:00:00Z'), TROMSO)).toEqual({ isDark: true, changes: [] })
  expect(daylight(new Date('2026-06-20T23:00:00Z'), TROMSO)).toEqual({ isDark: false, changes: [] })
})
