// What to do in a pass, and the line below it.
import { readerOf } from '@/components/rinks/reader'
import type { PouredPassView, TonightPass, TonightView } from '@/lib/schemas/tonight-view'
import type { WordOptions } from '@/lib/words/options'
import { passLayer } from '@/lib/words/pass'
import { durationText, temperatureText, waterText } from '@/lib/words/quantities'
import { clockText, doneByText } from '@/lib/words/times'

/** Water this much warmer than the rink's usual source is worth a word. [°C] */
const WARMER_C = 15

type WordsView = Pick<TonightView, 'viewer' | 'rink'>

export function passWords(pass: TonightPass, view: WordsView): { what: string; detail: string } {
  const reader = readerOf(view)
  const isHot = pass.temperatureC >= view.rink.water.temperatureC + WARMER_C
  const hot = isHot ? `, water at ${temperatureText(pass.temperatureC, reader)}` : ''
  const what = `${passLayer(pass, reader)}${hot}`
  const water = waterText(pass.waterL, reader)
  if (pass.poured) return { what, detail: `${water}, poured${pass.poured.by ? ` by ${pass.poured.by}` : ''}` }
  const set = pass.setBy ? `set by ${doneByText(pass.setBy, reader)}` : 'not set within the forecast'
  return { what, detail: `${water}, ${durationText(pass.hoseMinutes)} of hose; ${set}` }
}

/** A poured pass: how long to keep off, or what somebody found. Empty once it should be set: then the page asks. */
export function setWords(poured: PouredPassView, now: number, reader: WordOptions): string {
  const { outcome, outcomeAt, saidSetByAt } = poured
  if (outcome && outcomeAt) return FOUND[outcome](clockText(outcomeAt, reader))
  if (!saidSetByAt) return 'Keep off: when it sets is not known.'
  if (Date.parse(saidSetByAt) > now) return `Keep off until ${doneByText(saidSetByAt, reader)}.`
  return ''
}

const FOUND: Record<NonNullable<PouredPassView['outcome']>, (at: string) => string> = {
  set: (at) => `Found set at ${at}.`,
  wet: (at) => `Still wet at ${at}: keep off.`,
  spoiled: (at) => `Found spoiled at ${at}.`,
}
