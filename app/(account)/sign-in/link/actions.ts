'use server'
// The press of the button behind a sign-in link.
import { redirect } from 'next/navigation'
import { openContext } from '@/lib/auth/open-context'
import { startSession } from '@/lib/auth/session'
import { wayIn } from '@/lib/auth/way-in'
import { formAction } from '@/lib/http/form-action'
import { linkSchema } from '@/lib/schemas/accounts'
import { signInWithLink } from '@/lib/services/accounts'
import { takeComeBackPath } from '../../mailed-address'

export const signInWithLinkAction = formAction(linkSchema, async ({ key }) => {
  const signedIn = await signInWithLink(await openContext(), key)
  await startSession(signedIn.userId)
  redirect(wayIn(signedIn, await takeComeBackPath()))
})
