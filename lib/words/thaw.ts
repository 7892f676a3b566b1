// What is told of a thaw ahead. Days are named by date: such news is read later than it was written.
import type { Thaw } from '@/lib/advice/types'
import type { WordOptions } from './options'
import { layerText } from './quantities'
import { datedPartText } from './times'

export function thawText({ startsAt, endsAt, lossMm }: Thaw, words: WordOptions): { sentence: string; sure: string } {
  const loss = layerText(Math.max(1, Math.round(lossMm)), words)
  return {
    sentence: `Thaw from ${datedPartText(startsAt, words)} until ${datedPartText(endsAt, words)}.`,
    sure: `It takes about ${loss} of ice in this forecast. Keep people off soft ice. You hear nothing more until a night is good to flood.`,
  }
}
