// A freezing rink in words: how thick, when it carries, and what to do about snow.
import type { FreezingOutlook } from '@/lib/advice/freezing'
import type { Caution } from '@/lib/advice/types'
import { shareText } from './build-quantities'
import { cautionText } from './cautions'
import { num, text, type ClauseWriter } from './clause'
import { spreadText } from './filling'
import type { WordOptions } from './options'
import { capitalised, iceText, snowText } from './quantities'
import { clockText, weekdayText } from './times'

/** "Carries a skater, 10.0 cm" */
export function carriesName(outlook: FreezingOutlook, words: WordOptions): string {
  return `Carries a skater, ${outlook.isShallow ? 'frozen to the floor' : iceText(outlook.carriesSkaterMm, words)}`
}

/** "4.1 cm of ice on 8.3 cm of water. Carries a skater (10.0 cm) Thursday evening; …" */
export function freezingSentence(outlook: FreezingOutlook, now: Date, words: WordOptions): string {
  const { thicknessMm, waterBelowMm } = outlook.now
  const ice = thicknessMm > 0.5 ? `${iceText(thicknessMm, words)} of ice` : 'No ice yet'
  const below = waterBelowMm > 0.5 ? ` on ${iceText(waterBelowMm, words)} of water` : ', frozen through'
  const limit = iceText(outlook.carriesSkaterMm, words)
  if (thicknessMm >= outlook.carriesSkaterMm)
    return `${ice}${below}. By the model it carries: drill before anyone skates.`
  const when = capitalised(spreadText(outlook.carriesSkaterAt, now, words))
  const what = outlook.isShallow
    ? `Too little water for ${limit} of ice, so it carries a skater once it is frozen to the floor`
    : `${limit} to carry a skater`
  return `${ice}${below}. ${what}: ${when.charAt(0).toLowerCase() + when.slice(1)}.`
}

const SNOW_WRITERS: Record<string, ClauseWriter> = {
  snow_floods_ice: (v, w) =>
    `${snowText(num(v, 'snowCoverCm'), w)} of snow is more than ${iceText(num(v, 'thicknessMm'), w)} of floating ice bears ` +
    `(${snowText(num(v, 'bornCm'), w)}): water comes up through it and freezes as slush. Let that freeze through before you do anything.`,
  clear_snow_now: (v, w) =>
    `Clear ${snowText(num(v, 'snowCoverCm'), w)} of snow now, all of it: under it the ice grows at ${shareText(num(v, 'growthShare'), w)} ` +
    `of its pace. Drill first; one light person with a shovel, nobody near open water.`,
  leave_snow: (v, w) =>
    `Leave the snow: ${iceText(num(v, 'thicknessMm'), w)} does not carry anybody to clear it. The ice grows at ` +
    `${shareText(num(v, 'growthShare'), w)} of its pace under it; what you can reach, pull off from outside the boards.${bearsText(v, w)}`,
  snow_due_on_thin_ice: (v, w) =>
    `${snowText(num(v, 'snowfallCm'), w)} of snow is due from ${weekdayText(text(v, 'startsAt'), w)} ${clockText(text(v, 'startsAt'), w)}, before the ` +
    `ice carries anybody to clear it (${iceText(num(v, 'bearsMm'), w)}). It will slow the freezing.`,
  snow_due_will_flood: (v, w) =>
    `${snowText(num(v, 'snowfallCm'), w)} of snow is due from ${weekdayText(text(v, 'startsAt'), w)} ${clockText(text(v, 'startsAt'), w)}, more than ` +
    `${iceText(num(v, 'thicknessMm'), w)} of floating ice bears (${snowText(num(v, 'bornCm'), w)}): expect water to come up and slush.`,
}

function bearsText(v: Parameters<ClauseWriter>[0], w: WordOptions): string {
  const at = text(v, 'bearsAt')
  const limit = iceText(num(v, 'bearsMm'), w)
  return at
    ? ` It should reach ${limit} by ${weekdayText(at, w)} ${clockText(at, w)}.`
    : ` It does not reach ${limit} within the forecast.`
}

/** What to do about snow on a freezing rink. */
export function snowOnIceText(caution: Caution, words: WordOptions): string {
  return SNOW_WRITERS[caution.code]?.(caution.values, words) ?? cautionText(caution, words)
}
