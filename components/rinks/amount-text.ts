// What falls in a stretch of hours, in words.
import type { WordOptions } from '@/lib/words/options'
import { rainText, snowText } from '@/lib/words/quantities'
import type { WetRun } from '../charts/strip-labels'

/** "rain 2.1 mm, snow 3.4 cm"; empty for less than a trace. */
export function amountText({ snowCm, rainMm }: Pick<WetRun, 'snowCm' | 'rainMm'>, reader: WordOptions): string {
  const snow = snowCm >= 0.05 ? `snow ${snowText(snowCm, reader)}` : ''
  const rain = rainMm >= 0.05 ? `rain ${rainText(rainMm, reader)}` : ''
  return [rain, snow].filter(Boolean).join(', ')
}
