'use server'
// The press of the button behind the mail to a new address.
import { redirect } from 'next/navigation'
import { openContext } from '@/lib/auth/open-context'
import { startSession } from '@/lib/auth/session'
import { formAction } from '@/lib/http/form-action'
import { linkSchema } from '@/lib/schemas/accounts'
import { takeNewAddress } from '@/lib/services/accounts'

export const takeNewAddressAction = formAction(linkSchema, async ({ key }) => {
  const { userId } = await takeNewAddress(await openContext(), key)
  await startSession(userId)
  redirect('/account/security')
})
