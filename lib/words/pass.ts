// One pass in words, for the plan on screen and in messages.
import type { PlannedPass } from '@/lib/advice/types'
import type { WordOptions } from './options'
import { layerText, waterText } from './quantities'
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
