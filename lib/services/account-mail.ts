// Promises the mails about an account. The job that delivers them makes the link's secret part from its id.
import type { Db } from '@/db/knex'
import { insertAccountLink, type LinkPurpose } from '@/db/queries/account-links'
import { promiseMessage, type MessageKind } from '@/db/queries/messages'
import { LINK_LIFETIME_SECONDS } from '@/lib/auth/account-links'
import type { AddressChangedContent } from '@/lib/schemas/alert-content'

const KINDS: Record<LinkPurpose, MessageKind> = {
  verify: 'verify-address',
  'sign-in': 'sign-in-link',
  reset: 'reset-password',
  'change-email': 'change-address',
}

const NOTE_LIFETIME_SECONDS = 24 * 60 * 60

function later(now: Date, seconds: number): Date {
  return new Date(now.getTime() + seconds * 1000)
}

/** A new link and its mail; the mail is dropped when it could only arrive with a dead link. */
export async function promiseLink(
  trx: Db,
  userId: string,
  purpose: LinkPurpose,
  now: Date,
  newEmail?: string,
): Promise<void> {
  const expiresAt = later(now, LINK_LIFETIME_SECONDS[purpose])
  const link = await insertAccountLink(trx, { userId, purpose, expiresAt, newEmail }, now)
  const kind = KINDS[purpose]
  const content = { linkId: link.id }
  await promiseMessage(
    trx,
    { dedupeKey: `${kind}:${link.id}`, userId, channel: 'email', kind, content, sendAt: now, expiresAt },
    now,
  )
}

/** Tells the owner of a known address that somebody signed up with it; the visitor learns nothing. */
export async function promiseAlreadyRegistered(trx: Db, userId: string, now: Date): Promise<void> {
  const kind = 'address-already-registered'
  const dedupeKey = `${kind}:${userId}:${now.toISOString()}`
  const expiresAt = later(now, NOTE_LIFETIME_SECONDS)
  await promiseMessage(trx, { dedupeKey, userId, channel: 'email', kind, content: {}, sendAt: now, expiresAt }, now)
}

/** Tells the address that an account had: its owner may not be who changed it. */
export async function promiseAddressChangedMail(trx: Db, userId: string, oldEmail: string, now: Date): Promise<void> {
  const kind = 'address-changed'
  const dedupeKey = `${kind}:${userId}:${now.toISOString()}`
  const expiresAt = later(now, NOTE_LIFETIME_SECONDS)
  const content: AddressChangedContent = { oldEmail }
  await promiseMessage(trx, { dedupeKey, userId, channel: 'email', kind, content, sendAt: now, expiresAt }, now)
}

/** Confirms that an account is to go, with the way to keep it. */
export async function promiseDeletionMail(trx: Db, userId: string, dueAt: Date, now: Date): Promise<void> {
  const kind = 'deletion-asked'
  const dedupeKey = `${kind}:${userId}:${now.toISOString()}`
  const expiresAt = later(now, NOTE_LIFETIME_SECONDS)
  const content = { dueAt: dueAt.toISOString() }
  await promiseMessage(trx, { dedupeKey, userId, channel: 'email', kind, content, sendAt: now, expiresAt }, now)
}
