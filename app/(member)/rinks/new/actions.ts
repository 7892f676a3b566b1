'use server'
// Sets up a rink, then goes on: to this device's notifications where they are wanted, else straight to Tonight.
import { redirect } from 'next/navigation'
import { requestContext } from '@/lib/auth/request-context'
import { formAction } from '@/lib/http/form-action'
import { setUpRinkSchema } from '@/lib/schemas/rinks'
import { setUpRink } from '@/lib/services/rinks'

export const setUpRinkAction = formAction(setUpRinkSchema, async (input) => {
  const { rinkId } = await setUpRink(await requestContext(), input)
  redirect(input.told.wantsPush ? `/rinks/${rinkId}/alerts/this-device` : `/rinks/${rinkId}`)
})
