'use server'
// The new password behind a reset link; every other browser is signed out.
import { redirect } from 'next/navigation'
import { openContext } from '@/lib/auth/open-context'
import { startSession } from '@/lib/auth/session'
import { formAction } from '@/lib/http/form-action'
import { newPasswordByLinkSchema } from '@/lib/schemas/accounts'
import { resetPassword } from '@/lib/services/accounts'

export const resetPasswordAction = formAction(newPasswordByLinkSchema, async (input) => {
  const { userId, hasRink } = await resetPassword(await openContext(), input)
  await startSession(userId)
  redirect(hasRink ? '/rinks' : '/rinks/new')
})
