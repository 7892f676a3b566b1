'use server'
// What can be done to the log: write, change, delete, bring back, and say how a flood set.
import { refresh } from 'next/cache'
import { requestContext } from '@/lib/auth/request-context'
import { formAction } from '@/lib/http/form-action'
import { answerSetSchema, changeEntrySchema, entrySchema, writeEntrySchema } from '@/lib/schemas/log'
import { KIND_WORDS, OUTCOME_WORDS } from '@/lib/words/log'
import { answerSet, changeEntry, deleteEntry, restoreEntry, writeEntry } from '@/lib/services/log'

export const writeEntryAction = formAction(writeEntrySchema, async (input) => {
  await writeEntry(await requestContext(), input)
  refresh()
  return `${KIND_WORDS[input.kind]}: written down.`
})

export const changeEntryAction = formAction(changeEntrySchema, async (input) => {
  await changeEntry(await requestContext(), input)
  refresh()
  return 'Saved. What it said before is kept below.'
})

export const deleteEntryAction = formAction(entrySchema, async (input) => {
  await deleteEntry(await requestContext(), input)
  refresh()
  return 'Deleted.'
})

export const restoreEntryAction = formAction(entrySchema, async (input) => {
  await restoreEntry(await requestContext(), input)
  refresh()
  return 'It is back in the log.'
})

export const answerSetAction = formAction(answerSetSchema, async (input) => {
  await answerSet(await requestContext(), input)
  refresh()
  return input.outcome === 'none' ? 'The answer is taken back.' : `${OUTCOME_WORDS[input.outcome]}: written down.`
})
