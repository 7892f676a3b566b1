'use server'
// The press of the button behind the first mail: the address is theirs, and they are in.
import { redirect } from 'next/navigation'
import { openContext } from '@/lib/auth/open-context'
import { startSession } from '@/lib/auth/session'
import { formAction } from '@/lib/http/form-action'
import { linkSchema } from '@/lib/schemas/accounts'
import { confirmAddress } from '@/lib/services/accounts'

export const confirmAddressAction = formAction(linkSchema, async ({ key }) => {
  const { userId, hasRink } = await confirmAddress(await openContext(), key)
  await startSession(userId)
  redirect(hasRink ? '/rinks' : '/rinks/new')
})
