'use server'
// What can be said of freezing ice: how thick it was drilled, and that it is open.
import { refresh } from 'next/cache'
import { requestContext } from '@/lib/auth/request-context'
import { formAction } from '@/lib/http/form-action'
import { openForSkatingSchema } from '@/lib/schemas/freezing-view'
import { writeEntrySchema } from '@/lib/schemas/log'
import { openForSkating } from '@/lib/services/freezing'
import { writeEntry } from '@/lib/services/log'

export const writeReadingAction = formAction(writeEntrySchema, async (input) => {
  await writeEntry(await requestContext(), input)
  refresh()
  return 'Written down. Everything on this page starts from it.'
})

export const openForSkatingAction = formAction(openForSkatingSchema, async (input) => {
  await openForSkating(await requestContext(), input)
  refresh()
})
