'use server'
// What can be done to the log: write, change, delete, bring back, and say how a flood set.
import { serviceAction } from '@/lib/http/service-action'
import { answerSetSchema, changeEntrySchema, entrySchema, writeEntrySchema } from '@/lib/schemas/log'
import { KIND_WORDS, OUTCOME_WORDS } from '@/lib/words/log'
import { answerSet, changeEntry, deleteEntry, restoreEntry, writeEntry } from '@/lib/services/log'

export const writeEntryAction = serviceAction(
  writeEntrySchema,
  writeEntry,
  (input) => `${KIND_WORDS[input.kind]}: written down.`,
)
export const changeEntryAction = serviceAction(
  changeEntrySchema,
  changeEntry,
  'Saved. What it said before is kept below.',
)
export const deleteEntryAction = serviceAction(entrySchema, deleteEntry, 'Deleted.')
export const restoreEntryAction = serviceAction(entrySchema, restoreEntry, 'It is back in the log.')
export const answerSetAction = serviceAction(answerSetSchema, answerSet, (input) =>
  input.outcome === 'none' ? 'The answer is taken back.' : `${OUTCOME_WORDS[input.outcome]}: written down.`,
)
