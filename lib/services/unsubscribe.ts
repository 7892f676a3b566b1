// Unsubscribing by the link in a mail: no sign-in, only a signature that nobody else can make.
import { createHmac, hkdfSync, timingSafeEqual } from 'node:crypto'
import { findMailChoice, turnEmailOff } from '@/db/queries/alert-preferences'
import type { Db } from '@/db/knex'
import { InvalidInputError } from '@/lib/errors'
import { unsubscribeTokenSchema } from '@/lib/schemas/alerts'

interface Mailed {
  userId: string
  rinkId: string
}

/** A key for this purpose alone: a signature made for anything else never opens this door. */
function unsubscribeKey(secret: string): Buffer {
  return Buffer.from(hkdfSync('sha256', secret, '', 'nightsheet unsubscribe email', 32))
}

function sign(secret: string, { userId, rinkId }: Mailed): string {
  return createHmac('sha256', unsubscribeKey(secret)).update(`${userId}.${rinkId}.email`).digest('base64url')
}

/** Never expires: mails are kept for years, and their link has to go on working (RFC 8058 sets no end). */
export function unsubscribeToken(secret: string, mailed: Mailed): string {
  return `${mailed.userId}.${mailed.rinkId}.${sign(secret, mailed)}`
}

/** For the List-Unsubscribe header and the foot of a mail: takes the POST of mail programs, and sends people on to a page. */
export function unsubscribeUrl(publicUrl: string, secret: string, mailed: Mailed): string {
  return `${publicUrl}/api/unsubscribe?token=${unsubscribeToken(secret, mailed)}`
}

/** @throws InvalidInputError for a token that is cut off, changed or made by somebody else. */
function readToken(secret: string, token: unknown): Mailed {
  const parsed = unsubscribeTokenSchema.safeParse(token)
  const [userId = '', rinkId = '', signature = ''] = parsed.success ? parsed.data.split('.') : []
  const expected = sign(secret, { userId, rinkId })
  const isOurs = signature.length === expected.length && timingSafeEqual(Buffer.from(signature), Buffer.from(expected))
  if (!isOurs)
    throw new InvalidInputError('This link is broken. Open it from the mail again, or switch mails off under Alerts.')
  return { userId, rinkId }
}

/** What the link is about; a rink that the person has left is told of no more already. */
export async function getMailChoice(
  { db }: { db: Db },
  secret: string,
  token: unknown,
): Promise<{ rinkName: string | null; wantsEmail: boolean }> {
  const choice = await findMailChoice(db, readToken(secret, token))
  return choice ?? { rinkName: null, wantsEmail: false }
}

/** Switches mails about the rink off; again and again is fine. */
export async function unsubscribeByToken(
  { db, now }: { db: Db; now: Date },
  secret: string,
  token: unknown,
): Promise<void> {
  await turnEmailOff(db, readToken(secret, token), now)
}
