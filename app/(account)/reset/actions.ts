'use server'
// Asks for the mail that lets choose a new password.
import { openContext } from '@/lib/auth/open-context'
import { atLeast, MAIL_ANSWER_MILLIS } from '@/lib/http/at-least'
import { formAction } from '@/lib/http/form-action'
import { mailRequestSchema } from '@/lib/schemas/accounts'
import { requestLink } from '@/lib/services/accounts'
import { goToCheckYourMail } from '../mailed-address'

export const sendResetLinkAction = formAction(mailRequestSchema, async (input) => {
  await atLeast(MAIL_ANSWER_MILLIS, requestLink(await openContext(), input, 'reset'))
  return goToCheckYourMail(input.email, 'reset')
})
