// A night to hold off: until when, and what would turn it.
import type { NightSummary } from '@/lib/advice/night-summary'
import type { WhatWouldTurn } from '@/lib/advice/what-would-change'
import { num, text } from './clause'
import { dayText } from './night-label'
import type { WordOptions } from './options'
import { layerText } from './quantities'
import { clockText, dayPartText } from './times'

/** "The next good hours are on Thursday evening." or that the forecast has none, and how far it reaches. */
export function holdUntilText(
  summary: NightSummary,
  lastDate: string | undefined,
  now: Date,
  words: WordOptions,
): string {
  if (summary.nextGoodAt) return `The next good hours come ${dayPartText(summary.nextGoodAt, now, words)}.`
  const reach = lastDate ? `, which reaches to ${dayText(lastDate)}` : ''
  return `No good hour lies within the forecast${reach}.`
}

type TurnWriter = (values: WhatWouldTurn['values'], words: WordOptions) => string

const TURNS: Record<WhatWouldTurn['code'], TurnWriter> = {
  thinner: (v, w) => `A layer of only ${layerText(num(v, 'layerMm'), w)}`,
  clear_sky: () => 'A clear sky',
  dry: () => 'No snow and no rain',
  calm: () => 'Calm air',
  colder: (v, w) => `Air ${degreesText(num(v, 'byC'), w)} colder`,
}

/** "Air 3 °C colder would make 9 pm good." */
export function wouldTurnText({ code, values }: WhatWouldTurn, words: WordOptions): string {
  return `${TURNS[code](values, words)} would make ${clockText(text(values, 'goodAt'), words)} good.`
}

/** A difference of temperatures, not a temperature. */
function degreesText(byC: number, { units }: WordOptions): string {
  return units.temperature === 'F' ? `${Math.round(byC * 1.8)} °F` : `${byC} °C`
}
