// An invented two days for `npm run score`: a clear cold night, snow towards morning, a grey mild day, a damp second night.
import type { JudgeInput } from '@/lib/advice/types'
import type { HourlyRecord } from '@/lib/physics/types'
import document from '../fixtures/score-example.json'

/** A copy of its own for each caller, to change as the test needs. */
export function scoreExample(): JudgeInput {
  return structuredClone(document) as JudgeInput
}

export function scoreExampleHours(): HourlyRecord[] {
  return scoreExample().hours
}
