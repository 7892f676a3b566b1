'use server'
// The press of the button on an invitation: the signed-in account joins the rink.
import type { Route } from 'next'
import { redirect } from 'next/navigation'
import { openContext } from '@/lib/auth/open-context'
import { requestContext } from '@/lib/auth/request-context'
import { formAction } from '@/lib/http/form-action'
import { linkSchema } from '@/lib/schemas/accounts'
import { join } from '@/lib/services/joining'

export const joinAction = formAction(linkSchema, async ({ key }) => {
  const { viewer } = await requestContext()
  const { rinkId } = await join(await openContext(), viewer, key)
  redirect(`/rinks/${rinkId}` as Route)
})
