// One-time links that were mailed. The row knows what a link is for and whether it still works, not its token.
import type { Db } from '@/db/knex'
import type { AccountLinkRow } from '@/db/types'

export type LinkPurpose = AccountLinkRow['purpose']

interface LinkReference {
  id: string
  purpose: LinkPurpose
}

export async function insertAccountLink(
  db: Db,
  link: { userId: string; purpose: LinkPurpose; expiresAt: Date; newEmail?: string },
  now: Date,
): Promise<{ id: string }> {
  const [stored] = await db('account_links')
    .insert({
      user_id: link.userId,
      purpose: link.purpose,
      created_at: now,
      expires_at: link.expiresAt,
      new_email: link.newEmail ?? null,
    })
    .returning('id')
  if (!stored) throw new Error('An insert returned no row')
  return stored
}

const stillGood = (db: Db, link: LinkReference, now: Date) =>
  db('account_links').where({ id: link.id, purpose: link.purpose, used_at: null }).where('expires_at', '>', now)

/** Whose link it is, while it still works. */
export async function findGoodAccountLink(
  db: Db,
  link: LinkReference,
  now: Date,
): Promise<{ userId: string; newEmail: string | null } | undefined> {
  return stillGood(db, link, now).first({ userId: 'user_id', newEmail: 'new_email' })
}

/** Uses a link up: of two who try at once, one gets the person and the other nothing. */
export async function consumeAccountLink(
  db: Db,
  link: LinkReference,
  now: Date,
): Promise<{ userId: string; newEmail: string | null } | undefined> {
  const [used] = await stillGood(db, link, now).update({ used_at: now }).returning(['user_id', 'new_email'])
  return used && { userId: used.user_id, newEmail: used.new_email }
}

/** Makes every outstanding link of a person worthless. */
export async function voidAccountLinks(db: Db, userId: string, now: Date): Promise<void> {
  await db('account_links').where({ user_id: userId, used_at: null }).update({ used_at: now })
}
