'use server'
// Changes who is on a rink, and as what.
import { serviceAction } from '@/lib/http/service-action'
import { changeRoleSchema, inviteSchema, oneInvitationSchema, takeOffSchema } from '@/lib/schemas/people'
import { invite, INVITATION_DAYS, sendInvitationAgain, takeInvitationBack } from '@/lib/services/invitations'
import { changeRole, takeOff } from '@/lib/services/people'

export const inviteAction = serviceAction(
  inviteSchema,
  invite,
  ({ email }) => `An invitation is on its way to ${email}. It is good for ${INVITATION_DAYS} days.`,
)

export const sendAgainAction = serviceAction(
  oneInvitationSchema,
  sendInvitationAgain,
  `Sent again. It is good for ${INVITATION_DAYS} days from now.`,
)

export const takeBackAction = serviceAction(oneInvitationSchema, takeInvitationBack)

export const changeRoleAction = serviceAction(changeRoleSchema, changeRole, 'Saved.')

export const takeOffAction = serviceAction(takeOffSchema, takeOff)
