'use server'
// What can be said of freezing ice: how thick it was drilled, and that it is open.
import { serviceAction } from '@/lib/http/service-action'
import { openForSkatingSchema } from '@/lib/schemas/freezing-view'
import { writeEntrySchema } from '@/lib/schemas/log'
import { openForSkating } from '@/lib/services/freezing'
import { writeEntry } from '@/lib/services/log'

export const writeReadingAction = serviceAction(
  writeEntrySchema,
  writeEntry,
  'Written down. Everything on this page starts from it.',
)
export const openForSkatingAction = serviceAction(openForSkatingSchema, openForSkating)
