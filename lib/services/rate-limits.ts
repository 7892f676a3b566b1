// How often a visitor may try. Counted in PostgreSQL, so that every web process counts together.
import { createHash } from 'node:crypto'
import type { Db } from '@/db/knex'
import { countHit, takeBackHit } from '@/db/queries/rate-limits'
import { RateLimitedError } from '@/lib/errors'
import { HOUR_SECONDS } from '@/lib/physics/constants'

const QUARTER_HOUR_SECONDS = HOUR_SECONDS / 4
const DAY_SECONDS = 24 * HOUR_SECONDS

/** A household, a club or a test suite behind one address stays well below these; a guessing machine does not. */
export const LIMITS = {
  // Wrong passwords only. Slows guessing from many places; from one alone nobody shuts the owner out.
  signInByEmail: { hits: 100, seconds: QUARTER_HOUR_SECONDS },
  signInByEmailAndVisitor: { hits: 20, seconds: QUARTER_HOUR_SECONDS },
  signInByVisitor: { hits: 300, seconds: QUARTER_HOUR_SECONDS },
  // A mailbox shall not be flooded, and nobody shall use up all the mails that its owner may ask for.
  mailByEmail: { hits: 24, seconds: HOUR_SECONDS },
  mailByEmailAndVisitor: { hits: 6, seconds: HOUR_SECONDS },
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

function counterOf(now: Date, limit: LimitName, subject: string) {
  const millis = LIMITS[limit].seconds * 1000
  const windowStartsAt = new Date(Math.floor(now.getTime() / millis) * millis)
  // Kept as a hash: the table is no list of who tried what.
  const key = createHash('sha256').update(`${limit}:${subject}`).digest('hex')
  return { key, windowStartsAt, endsAtMillis: windowStartsAt.getTime() + millis }
}

/** @returns how many seconds are left to wait, 0 when the try is within the limit. */
async function countTry(db: Db, now: Date, limit: LimitName, subject: string, factor: number): Promise<number> {
  const { key, windowStartsAt, endsAtMillis } = counterOf(now, limit, subject)
  const count = await countHit(db, key, windowStartsAt)
  return count <= LIMITS[limit].hits * factor ? 0 : Math.ceil((endsAtMillis - now.getTime()) / 1000)
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

interface TryOnEmail {
  limit: 'signInByEmail' | 'mailByEmail'
  email: string
  /** Where it comes from; undefined where nothing reliable says it: then the wide limit stands alone. */
  from: string | undefined
}

/** First by who tries: beyond their own limit they use up nothing more of what the address's owner may need. */
const countersOf = ({ limit, email, from }: TryOnEmail): [LimitName, string][] =>
  from === undefined
    ? [[limit, email]]
    : [
        [`${limit}AndVisitor`, `${email} ${from}`],
        [limit, email],
      ]

/** Counts a try that concerns somebody's e-mail address. @throws RateLimitedError beyond the limit. */
export async function spendOnEmail(context: { db: Db; now: Date }, one: TryOnEmail): Promise<void> {
  for (const [limit, subject] of countersOf(one)) await spend(context, limit, subject)
}

/** The try was right after all, and counts for nothing. Counted before it was judged, or many at once would slip past. */
export async function giveBackOnEmail({ db, now }: { db: Db; now: Date }, one: TryOnEmail): Promise<void> {
  for (const [limit, subject] of countersOf(one)) {
    const { key, windowStartsAt } = counterOf(now, limit, subject)
    await takeBackHit(db, key, windowStartsAt)
  }
}
