// How often a visitor may try. Counted in PostgreSQL, so that every web process counts together.
import { createHash } from 'node:crypto'
import type { Db } from '@/db/knex'
import { countHit } from '@/db/queries/rate-limits'
import { RateLimitedError } from '@/lib/errors'
import { HOUR_SECONDS } from '@/lib/physics/constants'

const QUARTER_HOUR_SECONDS = HOUR_SECONDS / 4
const DAY_SECONDS = 24 * HOUR_SECONDS

/** A household, a club or a test suite behind one address stays well below these; a guessing machine does not. */
export const LIMITS = {
  signInByEmail: { hits: 20, seconds: QUARTER_HOUR_SECONDS },
  signInByVisitor: { hits: 300, seconds: QUARTER_HOUR_SECONDS },
  mailByEmail: { hits: 6, seconds: HOUR_SECONDS },
  mailByVisitor: { hits: 200, seconds: HOUR_SECONDS },
  signUpByVisitor: { hits: 100, seconds: HOUR_SECONDS },
  testByUser: { hits: 12, seconds: HOUR_SECONDS },
  passwordChangeByUser: { hits: 10, seconds: QUARTER_HOUR_SECONDS },
  // Each is a mail with words of the sender's to somebody who did not ask for it.
  inviteByRink: { hits: 40, seconds: DAY_SECONDS },
  inviteByUser: { hits: 60, seconds: DAY_SECONDS },
  inviteToEmail: { hits: 6, seconds: DAY_SECONDS },
  // Each may ask for the weather of one more place.
  setUpByUser: { hits: 40, seconds: HOUR_SECONDS },
  // One search per pause in typing; each costs some milliseconds of processor.
  placeSearchByUser: { hits: 600, seconds: QUARTER_HOUR_SECONDS },
  // Each reads everything a person or a rink has.
  exportByUser: { hits: 30, seconds: QUARTER_HOUR_SECONDS },
} as const

export type LimitName = keyof typeof LIMITS

/** Where the visitor's address is unknown, all share one count, and it must not be easy to use up for the others. */
const SHARED_BY_ALL = 10

/** @returns how many seconds are left to wait, 0 when the try is within the limit. */
async function countTry(db: Db, now: Date, limit: LimitName, subject: string, factor: number): Promise<number> {
  const { hits, seconds } = LIMITS[limit]
  const millis = seconds * 1000
  const windowStartsAt = new Date(Math.floor(now.getTime() / millis) * millis)
  // Kept as a hash: the table is no list of who tried what.
  const key = createHash('sha256').update(`${limit}:${subject}`).digest('hex')
  const count = await countHit(db, key, windowStartsAt)
  return count <= hits * factor ? 0 : Math.ceil((windowStartsAt.getTime() + millis - now.getTime()) / 1000)
}

/** Counts a try by address or account. @throws RateLimitedError beyond the limit. */
export async function spend({ db, now }: { db: Db; now: Date }, limit: LimitName, subject: string): Promise<void> {
  const waitSeconds = await countTry(db, now, limit, subject, 1)
  if (waitSeconds > 0) throw new RateLimitedError(waitSeconds)
}

/** Counts a try by where the visitor comes from. @throws RateLimitedError beyond the limit. */
export async function spendByVisitor(
  { db, now, ipAddress }: { db: Db; now: Date; ipAddress: string | undefined },
  limit: LimitName,
): Promise<void> {
  const waitSeconds = await countTry(db, now, limit, ipAddress ?? 'unknown', ipAddress ? 1 : SHARED_BY_ALL)
  if (waitSeconds > 0) throw new RateLimitedError(waitSeconds)
}
