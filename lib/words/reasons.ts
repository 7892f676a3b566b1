// Reasons in plain English: the one place where their codes become words, for screens, messages and `npm run score`.
import type { Reason } from '@/lib/advice/types'
import { num, text, type ClauseWriter } from './clause'
import { FILL_CLAUSES } from './fill-clauses'
import { FLOOD_CLAUSES } from './flood-clauses'
import type { WordOptions } from './options'
import { capitalised } from './quantities'
import { clockText } from './times'

const COMMON_CLAUSES: Record<string, ClauseWriter> = {
  weather_unknown: () => 'the forecast has a gap here',
  runs_disagree: (v) => `only ${num(v, 'agreeing')} of ${num(v, 'runs')} forecast runs see good hours`,
  outside_your_hours: (v, w) =>
    `the good hours, ${clockText(text(v, 'startsAt'), w)} to ${clockText(text(v, 'endsAt'), w)}, fall outside the hours you set`,
}

const CLAUSES: Record<string, ClauseWriter> = { ...COMMON_CLAUSES, ...FLOOD_CLAUSES, ...FILL_CLAUSES }

/** Every code that has words; a test holds it against the codes the advice gives. */
export const REASON_CODES: readonly string[] = Object.keys(CLAUSES)

/** The reason as a clause, to follow "Hold off: ". */
export function reasonClause(reason: Pick<Reason, 'code' | 'values'>, words: WordOptions): string {
  const write = CLAUSES[reason.code]
  return write ? write(reason.values, words) : reason.code.replaceAll('_', ' ')
}

/** The reason as a sentence. */
export function reasonText(reason: Pick<Reason, 'code' | 'values'>, words: WordOptions): string {
  return `${capitalised(reasonClause(reason, words))}.`
}
