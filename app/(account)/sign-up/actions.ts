'use server'
// Sign-up: the same answer for a new address and for a known one.
import { openContext } from '@/lib/auth/open-context'
import { atLeast, MAIL_ANSWER_MILLIS } from '@/lib/http/at-least'
import { formAction } from '@/lib/http/form-action'
import { signUpFormSchema } from '@/lib/schemas/accounts'
import { signUp } from '@/lib/services/accounts'
import { goToCheckYourMail } from '../mailed-address'

export const signUpAction = formAction(signUpFormSchema, async ({ next, ...input }) => {
  await atLeast(MAIL_ANSWER_MILLIS, signUp(await openContext(), input))
  return goToCheckYourMail(input.email, 'sign-up', next)
})
