// What came of a night, in words: what was said, and what weather or people showed.
import type { KeptRates, Rate } from '@/lib/advice/kept-rates'
import type { SettledNight } from '@/lib/advice/settle-night'
import type { WordOptions } from './options'
import { clockText } from './times'

/** "Flood, 8 pm to 1 am" or "Hold off". */
export function saidText(
  night: { said: 'flood' | 'fill' | 'hold'; startsAt: string | null; endsAt: string | null },
  words: WordOptions,
): string {
  if (night.said === 'hold' || night.startsAt === null || night.endsAt === null) return 'Hold off'
  const what = night.said === 'flood' ? 'Flood' : 'Fill'
  return `${what}, ${clockText(night.startsAt, words)} to ${clockText(night.endsAt, words)}`
}

/** One sentence on what came. */
export function cameText({ detail }: Pick<SettledNight, 'detail'>, words: WordOptions): string {
  const time = (key: string) => clockText(String(detail.values[key]), words)
  switch (detail.code) {
    case 'found_set':
      return `Found set at ${time('at')}.`
    case 'found_wet':
      return `Still wet at ${time('at')}, though it was said to be set by ${time('saidSetBy')}.`
    case 'found_spoiled':
      return `Found spoiled at ${time('at')}.`
    case 'would_set':
      return `By the weather that came, the last pass was set by ${time('at')}.`
    case 'too_slow':
      return detail.values.at === undefined
        ? `By the weather that came, the pass at ${time('startsAt')} did not set.`
        : `By the weather that came, the pass at ${time('startsAt')} set only by ${time('at')}.`
    case 'precipitation':
      return `Rain or snow from ${time('at')} reached the pass of ${time('startsAt')} before it was set.`
    case 'nothing_missed':
      return 'By the weather that came, no hour was good.'
    case 'missed':
      return `The weather that came would have been good from ${time('startsAt')} to ${time('endsAt')}.`
    case 'no_weather':
      return 'No weather was read for this night.'
  }
}

/** "37 of 41" */
export function rateText({ kept, of }: Rate): string {
  return `${kept} of ${of}`
}

/** The headline of the record. */
export function keptSentence({ flood, hold }: KeptRates): string {
  if (flood.of + hold.of === 0) return 'No night of this season has been settled yet.'
  if (flood.of === 0) return `Holding off was right on ${rateText(hold)} nights.`
  const floods = `A flood was advised on ${flood.of === 1 ? 'one night' : `${flood.of} nights`}, and ${flood.kept} came as said`
  return hold.of === 0 ? `${floods}.` : `${floods}; holding off was right on ${rateText(hold)}.`
}
