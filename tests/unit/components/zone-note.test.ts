// Whose clock is told: named when the reader's shows something else at either end of the night.
import { afterEach, expect, test, vi } from 'vitest'
import { zoneText } from '@/app/(member)/rinks/[rinkId]/_components/status-notices'
import { tonightView } from '../../fixtures/tonight-view'

afterEach(() => vi.unstubAllEnvs())

const inLondon = (startsAt: string, endsAt: string) => {
  vi.stubEnv('TZ', 'UTC')
  const view = tonightView()
  return zoneText({
    ...view,
    rink: { ...view.rink, timeZone: 'Europe/London' },
    night: { ...view.night, startsAt, endsAt },
  })
}

// London's clock goes from UTC to an hour ahead on Sunday, 28 March 2027, at 1 am.
test('a reader in another zone is told when the clocks part in the night', () => {
  expect(inLondon('2027-03-26T12:00:00Z', '2027-03-27T12:00:00Z')).toBeNull()
  expect(inLondon('2027-03-27T12:00:00Z', '2027-03-28T11:00:00Z')).toMatch(/^All times are the rink’s: /)
  expect(inLondon('2027-03-28T11:00:00Z', '2027-03-29T11:00:00Z')).toMatch(/^All times are the rink’s: /)
})
