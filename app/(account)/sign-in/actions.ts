'use server'
// Sign-in by password, or by a link that we mail.
import type { Route } from 'next'
import { redirect } from 'next/navigation'
import { localPath } from '@/lib/auth/next-path'
import { openContext } from '@/lib/auth/open-context'
import { startSession } from '@/lib/auth/session'
import { atLeast, MAIL_ANSWER_MILLIS } from '@/lib/http/at-least'
import { formAction } from '@/lib/http/form-action'
import { passwordSignInSchema, signInFormSchema } from '@/lib/schemas/accounts'
import { requestLink, signInWithPassword } from '@/lib/services/accounts'
import { goToCheckYourMail } from '../mailed-address'

export const signInAction = formAction(signInFormSchema, async ({ by, next, ...input }) => {
  const context = await openContext()
  if (by === 'link') {
    await atLeast(MAIL_ANSWER_MILLIS, requestLink(context, input, 'sign-in'))
    return goToCheckYourMail(input.email, 'sign-in')
  }
  const { userId, hasRink } = await signInWithPassword(context, passwordSignInSchema.parse(input))
  await startSession(userId)
  redirect((localPath(next) ?? (hasRink ? '/rinks' : '/rinks/new')) as Route)
})
