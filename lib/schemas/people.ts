// What a keeper says of the people on a rink.
import { z } from 'zod'
import { emailSchema } from './accounts'
import { rinkIdSchema } from './rinks'

export const ROLES = ['keeper', 'crew', 'skater'] as const
export const roleSchema = z.enum(ROLES, 'Choose keeper, crew or skater.')

const userIdSchema = z.uuid('That is nobody.')

export const inviteSchema = z.object({ rinkId: rinkIdSchema, email: emailSchema, role: roleSchema })
export const oneInvitationSchema = z.object({ rinkId: rinkIdSchema, invitationId: z.uuid('That is no invitation.') })
export const changeRoleSchema = z.object({ rinkId: rinkIdSchema, userId: userIdSchema, role: roleSchema })
export const takeOffSchema = z.object({ rinkId: rinkIdSchema, userId: userIdSchema })

export type InviteInput = z.output<typeof inviteSchema>
export type OneInvitationInput = z.output<typeof oneInvitationSchema>
export type ChangeRoleInput = z.output<typeof changeRoleSchema>
export type TakeOffInput = z.output<typeof takeOffSchema>
