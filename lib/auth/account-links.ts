// The secret part of a mailed link is computed from its id and the server's secret, whenever it is needed, and stored nowhere.
import { createHmac, hkdfSync, timingSafeEqual } from 'node:crypto'
import type { LinkPurpose } from '@/db/queries/account-links'

/** What a mailed key is good for; one made for one purpose opens no other. */
export type KeyPurpose = LinkPurpose | 'invitation'

export interface MailedLink<Purpose extends KeyPurpose = KeyPurpose> {
  id: string
  purpose: Purpose
}

const MINUTE_SECONDS = 60
export const LINK_LIFETIME_SECONDS: Record<LinkPurpose, number> = {
  verify: 24 * 60 * MINUTE_SECONDS,
  'sign-in': 30 * MINUTE_SECONDS,
  reset: 30 * MINUTE_SECONDS,
  'change-email': 24 * 60 * MINUTE_SECONDS,
}

/** Pages with a button: mail scanners that open every link use none of them up. */
const PATHS: Record<KeyPurpose, string> = {
  verify: '/verify',
  'sign-in': '/sign-in/link',
  reset: '/reset/new',
  'change-email': '/change-email',
  invitation: '/invitation',
}

const KEY = /^([0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12})\.([A-Za-z0-9_-]{43})$/

function seal(secret: string, { id, purpose }: MailedLink): Buffer {
  const key = Buffer.from(hkdfSync('sha256', secret, '', 'nightsheet account links', 32))
  return createHmac('sha256', key).update(`${purpose}:${id}`).digest()
}

/** What the link carries: its id, and the proof that we made it. */
export function linkKey(secret: string, link: MailedLink): string {
  return `${link.id}.${seal(secret, link).toString('base64url')}`
}

/** The address that goes into the mail. */
export function linkUrl(publicUrl: string, secret: string, link: MailedLink): string {
  return `${publicUrl}${PATHS[link.purpose]}?key=${linkKey(secret, link)}`
}

/** The link that a key stands for, or undefined when we did not make it for this purpose. */
export function openLinkKey<Purpose extends KeyPurpose>(
  secret: string,
  purpose: Purpose,
  key: string,
): MailedLink<Purpose> | undefined {
  const [, id, proof] = KEY.exec(key) ?? []
  if (!id || !proof) return undefined
  const link = { id, purpose }
  return timingSafeEqual(Buffer.from(proof, 'base64url'), seal(secret, link)) ? link : undefined
}
