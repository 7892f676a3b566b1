'use server'
// Sign-in by password, or by a link that we mail.
import { redirect } from 'next/navigation'
import { openContext } from '@/lib/auth/open-context'
import { startSession } from '@/lib/auth/session'
import { wayIn } from '@/lib/auth/way-in'
import { atLeast, MAIL_ANSWER_MILLIS } from '@/lib/http/at-least'
import { formAction } from '@/lib/http/form-action'
import { passwordSignInSchema, signInFormSchema } from '@/lib/schemas/accounts'
import { requestLink, signInWithPassword } from '@/lib/services/accounts'
import { goToCheckYourMail } from '../mailed-address'

export const signInAction = formAction(signInFormSchema, async ({ by, next, ...input }) => {
  const context = await openContext()
  if (by === 'link') {
    await atLeast(MAIL_ANSWER_MILLIS, requestLink(context, input, 'sign-in'))
    return goToCheckYourMail(input.email, 'sign-in', next)
  }
  const signedIn = await signInWithPassword(context, passwordSignInSchema.parse(input))
  await startSession(signedIn.userId)
  redirect(wayIn(signedIn, next))
})
