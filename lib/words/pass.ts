// One pass in words, for the plan on screen and in messages.
import type { PlannedPass, Reason } from '@/lib/advice/types'
import { num, text, type ClauseWriter } from './clause'
import type { WordOptions } from './options'
import { layerText, temperatureText, waterText, windChillText } from './quantities'
import { reasonText } from './reasons'
import { clockText, doneByText } from './times'

/** "3 mm over the whole sheet" */
export function passLayer(pass: Pick<PlannedPass, 'layerMm'>, words: WordOptions): string {
  return `${layerText(pass.layerMm, words)} over the whole sheet`
}

/** "300 L, 12 min of hose; set by 9:50 pm" */
export function passDetail(pass: PlannedPass, words: WordOptions): string {
  return `${waterText(pass.waterL, words)}, ${Math.round(pass.hoseMinutes)} min of hose; set by ${doneByText(pass.setBy, words)}`
}

/** For a message: when, and what. */
export function passLine(pass: PlannedPass, words: WordOptions): { at: string; what: string } {
  return { at: clockText(pass.startsAt, words), what: `${passLayer(pass, words)}: ${passDetail(pass, words)}` }
}

const WARNINGS: Record<string, ClauseWriter> = {
  not_set_before_next: (v, w) =>
    `It is set by ${doneByText(text(v, 'setsAt'), w)}, after the next pass at ${clockText(text(v, 'nextAt'), w)}.`,
  hose_still_out: (v, w) =>
    `The hose is still out for the pass at ${clockText(text(v, 'startsAt'), w)}, until ${clockText(text(v, 'until'), w)}.`,
  layer_too_thick: (v, w) =>
    `${layerText(num(v, 'layerMm'), w)} at once freezes slowly, takes in air and stays soft. Two thin passes hold better.`,
  outside_hours_you_set: (v, w) => `${clockText(text(v, 'startsAt'), w)} is outside the hours you set.`,
  frostbite: (v, w) =>
    `It feels like ${windChillText(num(v, 'windChillC'), w)} then: bare skin can freeze within ${num(v, 'minutes')} minutes.`,
}

/** Codes that only a moved pass has. */
export const PASS_WARNING_CODES: readonly string[] = Object.keys(WARNINGS)

/** What speaks against a pass, as a sentence. */
export function passWarningText(warning: Reason, words: WordOptions): string {
  return WARNINGS[warning.code]?.(warning.values, words) ?? reasonText(warning, words)
}

const WATERS: Record<string, string> = {
  'cold-tap': 'Cold tap',
  'hot-tap': 'Hot tap',
  hydrant: 'Hydrant',
  tanker: 'Tanker',
}

/** "Hot tap, 45 °C" */
export function waterSourceText(
  { kind, temperatureC }: { kind: string; temperatureC: number },
  words: WordOptions,
): string {
  return `${WATERS[kind] ?? kind}, ${temperatureText(temperatureC, words)}`
}
