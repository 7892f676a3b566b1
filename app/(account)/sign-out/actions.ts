'use server'
// Ends the session of this browser, or of all of them.
import { redirect } from 'next/navigation'
import { z } from 'zod'
import { requestContext } from '@/lib/auth/request-context'
import { endSession } from '@/lib/auth/session'
import { formAction } from '@/lib/http/form-action'
import { signOutEverywhere } from '@/lib/services/own-sessions'

const nothing = z.object({})

export const signOutAction = formAction(nothing, async () => {
  await endSession()
  redirect('/')
})

export const signOutEverywhereAction = formAction(nothing, async () => {
  await signOutEverywhere(await requestContext())
  await endSession()
  redirect('/')
})
