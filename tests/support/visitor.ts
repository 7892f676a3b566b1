// Somebody at the door: the context of a visitor, and what was mailed to an address.
import { randomUUID } from 'node:crypto'
import type { Knex } from 'knex'
import { linkKey } from '@/lib/auth/account-links'
import type { LinkPurpose } from '@/db/queries/account-links'
import type { OpenContext } from '@/lib/context'
import { MINUTE_MILLIS } from '@/lib/physics/constants'
import { confirmAddress, signUp } from '@/lib/services/accounts'

export const SECRET = 'a secret that only these tests use, long enough'
export const NOW = new Date('2027-01-12T20:00:00Z')
export const PASSWORD = 'twelve litres a minute'

export const minutesLater = (minutes: number): Date => new Date(NOW.getTime() + minutes * MINUTE_MILLIS)
export const newEmail = (): string => `anna-${randomUUID()}@nightsheet.example`

/** A visitor from an address of their own, so that tests do not use up each other's limits. */
export function visitor(db: Knex, now = NOW, ipAddress: string | undefined = randomUUID()): OpenContext {
  return { db, now, secret: SECRET, ipAddress }
}

/** The account mails to an address, oldest first, with the link of each. */
export async function mailsTo(db: Knex, email: string): Promise<{ kind: string; linkId: string | undefined }[]> {
  const rows = await db('messages as m')
    .join('users as u', 'u.id', 'm.user_id')
    .where('u.email', email)
    .orderBy(['m.created_at', 'm.id'])
    .select('m.kind', 'm.content')
  return rows.map(({ kind, content }) => ({ kind, linkId: (content as { linkId?: string }).linkId }))
}

/** What the newest mailed link of a purpose carries. */
export async function newestKey(db: Knex, email: string, purpose: LinkPurpose): Promise<string> {
  const row = await db('account_links as l')
    .join('users as u', 'u.id', 'l.user_id')
    .where('u.email', email)
    .where('l.purpose', purpose)
    .orderBy('l.created_at', 'desc')
    .first('l.id')
  return linkKey(SECRET, { id: String(row?.id), purpose })
}

/** Signs up and confirms. */
export async function newMember(db: Knex, email = newEmail()): Promise<{ email: string; userId: string }> {
  await signUp(visitor(db), { name: 'Anna', email, password: PASSWORD })
  const { userId } = await confirmAddress(visitor(db), await newestKey(db, email, 'verify'), email)
  return { email, userId }
}
