// When a failed delivery is tried again, and when it is given up.
import { createHash } from 'node:crypto'

const FIRST_WAIT_SECONDS = 30
const LONGEST_WAIT_SECONDS = 15 * 60
/** Share of the wait that is spread, so that a push service that comes back is not met by everyone at once. */
const SPREAD = 0.25

export interface FailedAttempt {
  /** Tries made so far, from 1. */
  attempt: number
  now: Date
  /** Late news of a night is dropped, not sent. */
  expiresAt: Date
  /** What the server asked for; never undercut. */
  retryAfterSeconds?: number | null
  /** Spreads the waits of different messages, the same way every time: the message's id. */
  key: string
}

/** The next try, or null when it would come at or after the expiry. */
export function nextAttemptAt({ attempt, now, expiresAt, retryAfterSeconds, key }: FailedAttempt): Date | null {
  const doubled = Math.min(FIRST_WAIT_SECONDS * 2 ** (attempt - 1), LONGEST_WAIT_SECONDS)
  const backoffSeconds = doubled * (1 - SPREAD * fraction(`${key}:${attempt}`))
  const waitSeconds = Math.max(backoffSeconds, retryAfterSeconds ?? 0)
  const nextAt = new Date(now.getTime() + Math.round(waitSeconds * 1000))
  return nextAt < expiresAt ? nextAt : null
}

/** A number in [0, 1) that looks random and depends on the key alone. */
function fraction(key: string): number {
  return createHash('sha256').update(key).digest().readUInt32BE(0) / 2 ** 32
}
