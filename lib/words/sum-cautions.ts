// What to mind before building, in words, by code.
import type { Caution } from '@/lib/advice/types'
import { depthText, volumeText } from './build-quantities'
import { num, type ClauseWriter } from './clause'
import type { WordOptions } from './options'

const CAUTIONS: Record<string, ClauseWriter> = {
  too_much_fall: (v, w) =>
    `${depthText(num(v, 'fallM'), w)} of fall is too much: one city that allows rinks stops at ${depthText(num(v, 'mostM'), w)}. Level the ground rather than raise the boards.`,
  boards_too_low: (v, w) =>
    `Your boards of ${depthText(num(v, 'haveM'), w)} are too low: the low corner wants ${depthText(num(v, 'wantedM'), w)}.`,
  brace_low_side: (v, w) =>
    `Brace the low side first: twice the depth pushes four times as hard, and a board that gave way at the end of a fill let ${volumeText(70, w)} go in seconds. ` +
    `Yours holds ${depthText(num(v, 'waterM'), w)} of water.`,
  fill_half_first: () => 'With one board on another, fill half and let that freeze before the rest.',
  ice_rises: (v, w) =>
    `The surface rises ${depthText(num(v, 'riseM'), w)} as it freezes, and ice pushes outward on the boards as it grows.`,
  ice_over_boards: (v, w) =>
    `The surface rises ${depthText(num(v, 'riseM'), w)} as it freezes, more than the ${depthText(num(v, 'freeboardM'), w)} you left: raise the boards or fill less.`,
  melt_water_goes: (v, w) => `${volumeText(num(v, 'volumeM3'), w)} of water has to go somewhere in spring.`,
}

export const SUM_CAUTION_CODES: readonly string[] = Object.keys(CAUTIONS)

/** One caution of the sums. */
export function sumCautionText({ code, values }: Caution, words: WordOptions): string {
  return CAUTIONS[code]?.(values, words) ?? ''
}
