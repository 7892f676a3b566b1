'use server'
// Changes to one's own account.
import { refresh } from 'next/cache'
import { redirect } from 'next/navigation'
import { z } from 'zod'
import { goToCheckYourMail } from '@/app/(account)/mailed-address'
import { openContext } from '@/lib/auth/open-context'
import { requestContext } from '@/lib/auth/request-context'
import { startSession } from '@/lib/auth/session'
import { formAction } from '@/lib/http/form-action'
import { serviceAction } from '@/lib/http/service-action'
import {
  accountSchema,
  deletionSchema,
  emailChangeSchema,
  endSessionSchema,
  passwordChangeSchema,
} from '@/lib/schemas/accounts'
import { askForDeletion, keepAccount } from '@/lib/services/account-deletion'
import { requestLink } from '@/lib/services/accounts'
import { askForEmailChange } from '@/lib/services/new-address'
import { changePassword, getAccount, saveAccount } from '@/lib/services/own-account'
import { endOwnSession } from '@/lib/services/own-sessions'

export const saveAccountAction = serviceAction(accountSchema, saveAccount, 'Saved.')

export const changePasswordAction = formAction(passwordChangeSchema, async (input) => {
  const context = await requestContext()
  await changePassword(context, input)
  await startSession(context.viewer.userId)
  refresh()
  return 'Your password is changed, and every other device is signed out.'
})

/** Signing in anew from the mailbox is how somebody without a password shows that the account is theirs. */
export const askMailboxAction = formAction(z.object({}), async () => {
  const { email } = await getAccount(await requestContext())
  await requestLink(await openContext(), { email }, 'sign-in')
  await goToCheckYourMail(email, 'sign-in', '/account/security')
})

export const changeEmailAction = formAction(emailChangeSchema, async (input) => {
  await askForEmailChange(await requestContext(), input)
  return `A mail is on its way to ${input.email}. Open it within a day, in a browser where you are signed in.`
})

export const endSessionAction = serviceAction(endSessionSchema, (context, { handle }) => endOwnSession(context, handle))

export const askForDeletionAction = formAction(deletionSchema, async (input) => {
  await askForDeletion(await requestContext(), input)
  redirect('/account/keep')
})

export const keepAccountAction = formAction(z.object({}), async () => {
  await keepAccount(await requestContext())
  redirect('/account')
})
