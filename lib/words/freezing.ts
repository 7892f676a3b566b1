// A freezing rink in words: how thick, when it carries, and what to do about snow.
import type { FreezingOutlook } from '@/lib/advice/freezing'
import type { Caution } from '@/lib/advice/types'
import { localDateOf } from '@/lib/advice/zoned-time'
import { shareText } from './build-quantities'
import { cautionText } from './cautions'
import { num, text, type ClauseWriter } from './clause'
import { spreadText } from './filling'
import { dayText } from './night-label'
import type { WordOptions } from './options'
import { iceText, snowText } from './quantities'
import { clockText, weekdayText } from './times'

/** "Carries a skater, 10.0 cm" */
export function carriesName(outlook: FreezingOutlook, words: WordOptions): string {
  return `Carries a skater, ${outlook.isShallow ? 'frozen to the floor' : iceText(outlook.carriesSkaterMm, words)}`
}

/** Below this a figure would read as no ice, or no water. [mm] */
const LEAST_MM = 0.5

/** Whether the weather behind an estimate is as new as can be, or older than it was to be used. */
export type WeatherAge = 'fresh' | 'stale'

/** Whether the estimate is as thick as wanted, or has no more water to freeze. The keeper still drills and opens. */
function isReached({ now, carriesSkaterMm, isShallow }: FreezingOutlook): boolean {
  const isThrough = now.thicknessMm > LEAST_MM && now.waterBelowMm <= LEAST_MM
  return now.thicknessMm >= carriesSkaterMm || (isShallow && isThrough)
}

/** "4.1 cm of ice on 8.3 cm of water. Carries a skater (10.0 cm) Thursday evening; …" */
export function freezingSentence(
  outlook: FreezingOutlook,
  now: Date,
  words: WordOptions,
  weather: WeatherAge = 'fresh',
): string {
  const { thicknessMm, waterBelowMm } = outlook.now
  const ice = thicknessMm > LEAST_MM ? `${iceText(thicknessMm, words)} of ice` : 'No ice yet'
  const below = waterBelowMm > LEAST_MM ? ` on ${iceText(waterBelowMm, words)} of water` : ', frozen through'
  const limit = iceText(outlook.carriesSkaterMm, words)
  if (isReached(outlook)) {
    const word = weather === 'stale' ? 'From old weather, so it proves nothing' : 'By the model it carries'
    return `${ice}${below}. ${word}: drill before anyone skates.`
  }
  const what = outlook.isShallow
    ? `Too little water for ${limit} of ice, so it carries a skater once it is frozen to the floor`
    : `${limit} to carry a skater`
  return `${ice}${below}. ${what}: ${spreadText(outlook.carriesSkaterAt, now, words)}.`
}

/**
 * What the sign for the gate says large: ice that may be thick enough is not called thin, and is still not open. Of ice
 * that only old weather makes thick nothing is known.
 */
export function signTitle(outlook: FreezingOutlook, weather: WeatherAge = 'fresh'): string {
  if (!isReached(outlook)) return 'Keep off: thin ice'
  return weather === 'stale' ? 'Keep off: nobody knows the ice' : 'Keep off until it is opened'
}

/** "4.1 cm of ice with water under it. It wants 10.0 cm to carry a skater."; empty where old weather makes it thick. */
export function signEstimate(outlook: FreezingOutlook, words: WordOptions, weather: WeatherAge = 'fresh'): string {
  const { thicknessMm, waterBelowMm } = outlook.now
  const ice = `${iceText(thicknessMm, words)} of ice${waterBelowMm > LEAST_MM ? ' with water under it' : ''}.`
  if (isReached(outlook)) return weather === 'stale' ? '' : ice
  const wanted = outlook.isShallow ? 'has to freeze to the floor' : `wants ${iceText(outlook.carriesSkaterMm, words)}`
  return `${ice} It ${wanted} to carry a skater.`
}

/** "The weather behind this was read at 6:05 am on Sat 9 January; none newer could be had." */
export function oldWeatherText(fetchedAt: string, words: WordOptions): string {
  const date = dayText(localDateOf(Date.parse(fetchedAt), words.timeZone))
  return `The weather behind this was read at ${clockText(fetchedAt, words)} on ${date}; none newer could be had.`
}

const SNOW_WRITERS: Record<string, ClauseWriter> = {
  snow_floods_ice: (v, w) =>
    `${snowText(num(v, 'snowCoverCm'), w)} of snow is more than ${iceOrSkin(v, w, ' of floating ice')} bears` +
    `${bornText(v, w)}: water comes up through it and freezes as slush. Let that freeze through before you do anything.`,
  clear_snow_now: (v, w) =>
    `Clear ${snowText(num(v, 'snowCoverCm'), w)} of snow now, all of it: under it the ice grows at ${shareText(num(v, 'growthShare'), w)} ` +
    `of its pace. Drill first; one light person with a shovel, nobody near open water.`,
  clear_snow_on_floor: (v, w) =>
    `Clear ${snowText(num(v, 'snowCoverCm'), w)} of snow, all of it, before the next flood. No water should be left under ` +
    `the ${iceText(num(v, 'thicknessMm'), w)} of ice; drill first to be sure.`,
  leave_snow: (v, w) =>
    `Leave the snow: ${iceOrSkin(v, w)} does not carry anybody to clear it. The ice grows at ` +
    `${shareText(num(v, 'growthShare'), w)} of its pace under it; what you can reach, pull off from outside the boards.${bearsText(v, w)}`,
  snow_due_on_thin_ice: (v, w) =>
    `${dueText(v, w)}, before the ice carries anybody to clear it (${iceText(num(v, 'bearsMm'), w)}). It will slow the freezing.`,
  snow_due_will_flood: (v, w) =>
    num(v, 'thicknessMm') < LEAST_MM
      ? `${dueText(v, w)}, and no ice is there to hold it: expect it to sink into the water and freeze as slush.`
      : `${dueText(v, w)}, more than ${iceOrSkin(v, w, ' of floating ice')} bears${bornText(v, w)}: expect water to come up and slush.`,
}

/** "4.1 cm of floating ice", never "0.0 cm". */
function iceOrSkin(v: Parameters<ClauseWriter>[0], w: WordOptions, what = ''): string {
  return num(v, 'thicknessMm') < LEAST_MM ? 'so thin a skin' : `${iceText(num(v, 'thicknessMm'), w)}${what}`
}

function bornText(v: Parameters<ClauseWriter>[0], w: WordOptions): string {
  return num(v, 'thicknessMm') < LEAST_MM ? '' : ` (${snowText(num(v, 'bornCm'), w)})`
}

/** "3.0 cm of snow is due from Friday 5 pm" */
function dueText(v: Parameters<ClauseWriter>[0], w: WordOptions): string {
  const startsAt = text(v, 'startsAt')
  return `${snowText(num(v, 'snowfallCm'), w)} of snow is due from ${weekdayText(startsAt, w)} ${clockText(startsAt, w)}`
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
