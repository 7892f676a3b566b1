// One night of the week in words: its verdict, what to do or why not, what falls, what it brings, and how many runs agree.
import type { NightAhead } from '@/lib/advice/week'
import { mmToInches } from '@/lib/units'
import type { WordOptions } from './options'
import {
  capitalised,
  durationText,
  numberText,
  rainText,
  signedTemperatureText,
  snowText,
  temperatureText,
} from './quantities'
import { reasonClause } from './reasons'
import { clockText, doneByText } from './times'

export const NIGHT_WORDS: Record<NightAhead['verdict'], string> = {
  flood: 'Flood',
  fill: 'Fill',
  hold: 'Hold off',
  thaw: 'Thaw',
  unknown: 'Unknown',
}

/** What to do in the night, or why to hold off. */
export function nightWhat(night: NightAhead, words: WordOptions): string {
  if (night.verdict === 'flood') return floodText(night, words)
  if (night.verdict === 'fill') return fillText(night, words)
  if (night.verdict === 'thaw') return `Up to ${signedTemperatureText(night.highC ?? 0, words)}; nothing to do`
  if (night.verdict === 'unknown') return 'The forecast has a gap here'
  return night.reason ? capitalised(reasonClause(night.reason, words)) : 'Nothing to do'
}

function floodText({ window, passes, snowToClearCm, isFar }: NightAhead, words: WordOptions): string {
  const clear = snowToClearCm > 0 ? `Clear ${snowText(snowToClearCm, words)} of snow, then ` : ''
  if (!window) return ''
  const span = `${clockText(window.startsAt, words)} to ${clockText(window.endsAt, words)}`
  if (!passes) return capitalised(`${clear}good hours ${span}`)
  const about = passes.isEstimate ? (isFar ? 'room for about ' : 'about ') : ''
  const count = `${passes.count} ${passes.count === 1 ? 'pass' : 'passes'}`
  const when = passes.isEstimate
    ? span
    : `${clockText(passes.startsAt, words)} on, set by ${doneByText(passes.setBy, words)}`
  return capitalised(`${clear}${about}${count}, ${when}`)
}

function fillText({ window }: NightAhead, words: WordOptions): string {
  if (!window) return ''
  return `Start between ${clockText(window.startsAt, words)} and ${clockText(window.latestStartAt, words)}`
}

/** What else is worth knowing: snow and rain with their hours, a thaw that begins or ends, the air, the forecast's end. */
export function nightFacts(night: NightAhead, words: WordOptions): string[] {
  return [fallsText(night, words), thawTurnText(night, words), airText(night, words), endText(night, words)].filter(
    (fact) => fact !== '',
  )
}

function fallsText({ falls }: NightAhead, words: WordOptions): string {
  if (!falls) return ''
  const rain = falls.rainMm >= 0.1 ? `rain ${rainText(falls.rainMm, words)}` : ''
  const snow = falls.snowfallCm >= 0.1 ? `snow ${snowText(falls.snowfallCm, words)}` : ''
  const what = [rain, snow].filter(Boolean).join(' and ')
  return `${what}, ${clockText(falls.startsAt, words)} to ${clockText(falls.endsAt, words)}`
}

function thawTurnText({ thaw, startsAt, endsAt }: NightAhead, words: WordOptions): string {
  if (!thaw) return ''
  const isWithin = (at: string) => at > startsAt && at < endsAt
  if (isWithin(thaw.startsAt)) return `thaw from ${clockText(thaw.startsAt, words)}`
  return isWithin(thaw.endsAt) ? `thaw until ${clockText(thaw.endsAt, words)}` : ''
}

function airText({ lowC, highC, verdict }: NightAhead, words: WordOptions): string {
  if (lowC === null || highC === null) return ''
  return verdict === 'thaw' ? `low ${temperatureText(lowC, words)}` : `${temperatureText(lowC, words)} at the coldest`
}

function endText({ forecastEndsAt }: NightAhead, words: WordOptions): string {
  return forecastEndsAt ? `forecast ends at ${clockText(forecastEndsAt, words)}` : ''
}

/** Ice gained or lost in the night, floods included: "+9.8 mm", "−4.5 mm"; null without a sheet. */
export function iceChangeText({ weatherMm, floodsMm }: NightAhead, words: WordOptions): string | null {
  return weatherMm === null ? null : changeText(weatherMm + floodsMm, words)
}

/** What the change is made of, for a reader who does not see the row: "floods +9.8 mm, weather −0.2 mm". */
export function iceChangeParts({ weatherMm, floodsMm }: NightAhead, words: WordOptions): string {
  if (weatherMm === null || floodsMm === 0) return ''
  return `floods ${changeText(floodsMm, words)}, weather ${changeText(weatherMm, words)}`
}

/** One decimal more than a layer has, so that the figures of a column line up. */
function changeText(changeMm: number, words: WordOptions): string {
  const isInches = words.units.ice === 'in'
  const text = isInches ? numberText(mmToInches(changeMm), 2, words) : numberText(changeMm, 1, words)
  const isGain = /[1-9]/.test(text) && changeMm > 0
  return `${isGain ? '+' : ''}${text} ${isInches ? 'in' : 'mm'}`
}

/** "7 of 10 runs"; null where none were asked. */
export function nightAgreement({ agreement }: NightAhead): string | null {
  return agreement ? `${agreement.agreeing} of ${agreement.runs} runs` : null
}

/** How long a fill's hose runs: "8 h 30 min". */
export const hoseHoursText = (hours: number) => durationText(hours * 60)
