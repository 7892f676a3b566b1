// What somebody who was invited holds: the mail as it would go out, and the key in its link.
import type { Knex } from 'knex'
import { findMessageToDeliver } from '@/db/queries/deliveries'
import type { EmailMessage } from '@/lib/messaging/port'
import { renderEmail } from '@/lib/services/render-message'
import { SETTINGS } from './night-at-the-rink'

async function newestMessageId(db: Knex, email: string): Promise<string> {
  const row = await db('messages as m')
    .join('invitations as i', db.raw(`i.id::text = m.content->>'invitationId'`))
    .where({ 'i.email': email, 'm.kind': 'rink-invitation' })
    .orderBy('m.created_at', 'desc')
    .first('m.id')
  return String(row?.id)
}

/** The newest invitation mail to an address, as the job that delivers it finds it. */
export async function invitationTo(db: Knex, email: string) {
  return findMessageToDeliver(db, await newestMessageId(db, email))
}

export async function invitationMailTo(db: Knex, email: string): Promise<EmailMessage> {
  const message = await invitationTo(db, email)
  if (!message) throw new Error(`No invitation to ${email} is on its way`)
  return renderEmail(message, SETTINGS)
}

/** The key in the link of the mail. */
export async function invitationKey(db: Knex, email: string): Promise<string> {
  const { text } = await invitationMailTo(db, email)
  const key = /\/invitation\?key=(\S+)/.exec(text)?.[1]
  if (!key) throw new Error(`No link in: ${text}`)
  return key
}
