'use server'
// Changes to one's own account.
import { refresh } from 'next/cache'
import { requestContext } from '@/lib/auth/request-context'
import { startSession } from '@/lib/auth/session'
import { formAction } from '@/lib/http/form-action'
import { accountSchema, passwordChangeSchema } from '@/lib/schemas/accounts'
import { changePassword, saveAccount } from '@/lib/services/own-account'

export const saveAccountAction = formAction(accountSchema, async (input) => {
  await saveAccount(await requestContext(), input)
  refresh()
  return 'Saved.'
})

export const changePasswordAction = formAction(passwordChangeSchema, async (input) => {
  const context = await requestContext()
  await changePassword(context, input)
  await startSession(context.viewer.userId)
  refresh()
  return 'Your password is changed, and every other device is signed out.'
})
