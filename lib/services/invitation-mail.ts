// Promises the mail of an invitation. It belongs to who sent it, and goes to the address of the invitation's row.
import type { Db } from '@/db/knex'
import { findInvitation } from '@/db/queries/invitations'
import { promiseMessage } from '@/db/queries/messages'
import { NotFoundError } from '@/lib/errors'
import { DAY_MILLIS } from '@/lib/physics/constants'
import type { InvitationContent } from '@/lib/schemas/alert-content'

/** A mail server that is down for longer is told of on the people page; sending again is one tap. */
const TRIED_FOR_MILLIS = DAY_MILLIS

/** No rink on the message: whether its sender wants alerts has nothing to do with it. */
export async function promiseInvitationMail(
  trx: Db,
  { invitationId, invitedBy }: { invitationId: string; invitedBy: string },
  now: Date,
): Promise<void> {
  const invitation = await findInvitation(trx, invitationId)
  if (!invitation) throw new NotFoundError('Invitation')
  const { rinkName, inviterName, role } = invitation
  const content: InvitationContent = { invitationId, words: { rinkName, inviterName, role } }
  await promiseMessage(
    trx,
    {
      dedupeKey: `rink-invitation:${invitationId}:${now.toISOString()}`,
      userId: invitedBy,
      channel: 'email',
      kind: 'rink-invitation',
      content: { ...content },
      sendAt: now,
      expiresAt: new Date(now.getTime() + TRIED_FOR_MILLIS),
    },
    now,
  )
}
