'use server'
// Leaves a rink.
import { redirect } from 'next/navigation'
import { requestContext } from '@/lib/auth/request-context'
import { formAction } from '@/lib/http/form-action'
import { leaveRinkSchema } from '@/lib/schemas/rink-settings'
import { leaveRink } from '@/lib/services/rink-end'

export const leaveRinkAction = formAction(leaveRinkSchema, async ({ rinkId }) => {
  await leaveRink(await requestContext(), rinkId)
  redirect('/rinks')
})
