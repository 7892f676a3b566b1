'use server'
// The press of the button behind the first mail: the address is theirs, and they are in.
import { redirect } from 'next/navigation'
import { openContext } from '@/lib/auth/open-context'
import { startSession } from '@/lib/auth/session'
import { wayIn } from '@/lib/auth/way-in'
import { formAction } from '@/lib/http/form-action'
import { linkSchema } from '@/lib/schemas/accounts'
import { confirmAddress } from '@/lib/services/accounts'
import { readSignedUpAddress, takeComeBackPath } from '../mailed-address'

export const confirmAddressAction = formAction(linkSchema, async ({ key }) => {
  const signedIn = await confirmAddress(await openContext(), key, await readSignedUpAddress())
  await startSession(signedIn.userId)
  redirect(wayIn(signedIn, await takeComeBackPath()))
})
