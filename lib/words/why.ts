// The list "why these hours": a label, what it means here, and the figure beside it.
import type { Reason } from '@/lib/advice/types'
import { num, text } from './clause'
import { coolingText, holdingText } from './flood-clauses'
import type { WordOptions } from './options'
import {
  fluxText,
  iceText,
  rainText,
  rateText,
  snowText,
  temperatureRangeText,
  temperatureText,
  windText,
} from './quantities'
import { clockText, weekdayText } from './times'

export interface WhyItem {
  label: string
  detail: string
  figure: string
}

type WhyWriter = (values: Reason['values'], words: WordOptions) => WhyItem

const WRITERS: Record<string, WhyWriter> = {
  why_sky: (v, w) => ({
    ...skyWords(num(v, 'longwaveWm2'), v.cloudCover === undefined ? null : num(v, 'cloudCover')),
    figure: fluxText(num(v, 'longwaveWm2'), w),
  }),
  why_air: (v, w) => ({
    label: airLabel(num(v, 'highC'), num(v, 'windAtRinkMps')),
    detail: `${temperatureRangeText(num(v, 'highC'), num(v, 'lowC'), w)}, ${windText(num(v, 'windAtRinkMps'), w)} in your yard.`,
    figure: fluxText(num(v, 'sensibleWm2'), w),
  }),
  why_vapour: (v, w) => ({ ...vapourWords(num(v, 'latentWm2')), figure: fluxText(num(v, 'latentWm2'), w) }),
  why_sun: (v, w) => ({
    label: 'Sun on the sheet.',
    detail: 'It warms the water.',
    figure: fluxText(-num(v, 'shortwaveWm2'), w),
  }),
  why_sheet: (v, w) => ({
    label: num(v, 'temperatureC') <= -1 ? 'Cold sheet.' : 'Sheet near melting.',
    detail:
      num(v, 'temperatureC') <= -1
        ? `${iceText(num(v, 'thicknessMm'), w)} of it draws heat from below.`
        : `${iceText(num(v, 'thicknessMm'), w)} of it gives no help from below.`,
    figure: temperatureText(num(v, 'temperatureC'), w),
  }),
  why_warmer_than_rule: (v, w) => ({
    label: 'Warmer than the usual rule.',
    detail: `The rule waits for ${temperatureText(num(v, 'ruleC'), w)}, but ${coolingText(v, w)}: water freezes all the same.`,
    figure: rateText(num(v, 'freezeRateMmPerH'), w),
  }),
  why_slow_for_cold: (v, w) => ({
    label: 'Cold enough by the usual rule.',
    detail: `But ${holdingText(v)}, so little water freezes in an hour.`,
    figure: rateText(num(v, 'freezeRateMmPerH'), w),
  }),
  why_slower_later: (v, w) => ({
    label: `After ${clockText(text(v, 'startsAt'), w)}`,
    detail: num(v, 'cloudCover') >= 0.6 ? 'cloud closes in and the rate halves.' : 'the rate falls to half.',
    figure: rateText(num(v, 'freezeRateMmPerH'), w),
  }),
  why_snow: (v, w) => ({
    label: fromText(v, w),
    detail: 'snow; a wet pass would crust.',
    figure: snowText(num(v, 'snowfallCm'), w),
  }),
  why_rain: (v, w) => ({
    label: fromText(v, w),
    detail: 'rain; nothing sets under it.',
    figure: rainText(num(v, 'rainMm'), w),
  }),
}

export const WHY_CODES: readonly string[] = Object.keys(WRITERS)

/** The list in words, in the order of the summary. */
export function whyList(why: readonly Reason[], words: WordOptions): WhyItem[] {
  return why.flatMap(({ code, values }) => WRITERS[code]?.(values, words) ?? [])
}

/** "From 5 am"; "From Wednesday 5 pm" once the night is over. */
function fromText(v: Reason['values'], w: WordOptions): string {
  const startsAt = text(v, 'startsAt')
  const day = v.isAfterNight === 1 ? `${weekdayText(startsAt, w)} ` : ''
  return `From ${day}${clockText(startsAt, w)}`
}

function skyWords(longwaveWm2: number, cloudCover: number | null): Pick<WhyItem, 'label' | 'detail'> {
  if (longwaveWm2 < 20) return { label: 'Low cloud.', detail: 'It gives back nearly all the heat the sheet sends up.' }
  if ((cloudCover ?? 0.5) <= 0.3) return { label: 'Clear sky.', detail: 'The sheet loses heat straight to the sky.' }
  return { label: 'Some cloud.', detail: 'Part of the heat the sheet sends up comes back.' }
}

function airLabel(highC: number, windMps: number): string {
  const air = highC > 0 ? 'Mild air' : highC > -4 ? 'Cool air' : 'Cold air'
  const wind = windMps < 0.7 ? 'hardly any wind' : windMps < 3 ? 'light wind' : 'wind'
  return `${air}, ${wind}.`
}

function vapourWords(latentWm2: number): Pick<WhyItem, 'label' | 'detail'> {
  if (latentWm2 >= 25) return { label: 'Dry air.', detail: 'Evaporation carries heat away.' }
  if (latentWm2 >= 8) return { label: 'Rather damp air.', detail: 'Evaporation carries little heat away.' }
  return { label: 'Damp air.', detail: 'Nothing evaporates, so no heat goes that way.' }
}
