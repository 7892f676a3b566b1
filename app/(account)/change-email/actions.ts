'use server'
// The press of the button behind the mail to a new address.
import { redirect } from 'next/navigation'
import { openContext } from '@/lib/auth/open-context'
import { requestContext } from '@/lib/auth/request-context'
import { formAction } from '@/lib/http/form-action'
import { linkSchema } from '@/lib/schemas/accounts'
import { takeNewAddress } from '@/lib/services/new-address'

export const takeNewAddressAction = formAction(linkSchema, async ({ key }) => {
  await takeNewAddress({ ...(await openContext()), ...(await requestContext()) }, key)
  redirect('/account/security')
})
