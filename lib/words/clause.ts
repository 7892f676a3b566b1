// The shape of a clause writer, and how it reads the numbers of a reason.
import type { Reason } from '@/lib/advice/types'
import type { WordOptions } from './options'

export type ClauseWriter = (values: Reason['values'], words: WordOptions) => string

/** A number of the reason; 0 when an old record lacks it, so that a page never fails over one figure. */
export function num(values: Reason['values'], name: string): number {
  const value = values[name]
  return typeof value === 'number' && Number.isFinite(value) ? value : 0
}

export function text(values: Reason['values'], name: string): string {
  const value = values[name]
  return value === undefined ? '' : String(value)
}
