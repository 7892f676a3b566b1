'use server'
// The new password behind a reset link; every other browser is signed out.
import { redirect } from 'next/navigation'
import { openContext } from '@/lib/auth/open-context'
import { startSession } from '@/lib/auth/session'
import { wayIn } from '@/lib/auth/way-in'
import { formAction } from '@/lib/http/form-action'
import { newPasswordByLinkSchema } from '@/lib/schemas/accounts'
import { resetPassword } from '@/lib/services/accounts'

export const resetPasswordAction = formAction(newPasswordByLinkSchema, async (input) => {
  const signedIn = await resetPassword(await openContext(), input)
  await startSession(signedIn.userId)
  redirect(wayIn(signedIn))
})
