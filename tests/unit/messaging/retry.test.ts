// When a failed delivery is tried again.
import { describe, expect, test } from 'vitest'
import { nextAttemptAt } from '@/lib/messaging/retry'

const now = new Date('2026-01-12T20:30:00Z')
const expiresAt = new Date('2026-01-13T06:00:00Z')
const waitSeconds = (attempt: number, more: { key?: string; retryAfterSeconds?: number } = {}) => {
  const nextAt = nextAttemptAt({ attempt, now, expiresAt, key: 'message-1', ...more })
  if (!nextAt) throw new Error('expected another try')
  return (nextAt.getTime() - now.getTime()) / 1000
}

describe('nextAttemptAt', () => {
  // 30 s doubled each time up to 900 s, less up to a quarter: 30, 60, 120, 240, 480, 900, 900.
  test.each([
    [1, 30],
    [2, 60],
    [3, 120],
    [4, 240],
    [5, 480],
    [6, 900],
    [7, 900],
    [1000, 900],
  ])('after try %i it waits at most %i s and at least three quarters of that', (attempt, longest) => {
    expect(waitSeconds(attempt)).toBeLessThanOrEqual(longest)
    expect(waitSeconds(attempt)).toBeGreaterThanOrEqual(longest * 0.75)
  })

  test('the same message waits the same each time it is asked, different messages spread', () => {
    expect(waitSeconds(3)).toBe(waitSeconds(3))
    const waits = new Set(Array.from({ length: 50 }, (_, index) => waitSeconds(3, { key: `message-${index}` })))
    expect(waits.size).toBeGreaterThan(40)
  })

  test('what the server asked for is never undercut', () => {
    expect(waitSeconds(1, { retryAfterSeconds: 120 })).toBe(120)
    expect(waitSeconds(6, { retryAfterSeconds: 5 })).toBeGreaterThanOrEqual(675)
  })

  test('there is no try at or after the expiry', () => {
    const soon = (seconds: number) => new Date(now.getTime() + seconds * 1000)
    const at = (limit: Date) =>
      nextAttemptAt({ attempt: 1, now, expiresAt: limit, retryAfterSeconds: 60, key: 'message-1' })
    expect(at(soon(61))).toEqual(soon(60))
    expect(at(soon(60))).toBeNull()
    expect(at(soon(-1))).toBeNull()
  })
})
