// What a keeper must mind before building: too much fall, boards that will not hold, where the melt water goes.
import { BUILD } from './thresholds'
import type { BuildSums } from './build-types'
import type { Caution } from './types'

/**
 * Cautions of the sums, those that stop a build first.
 *
 * @param sums Sums of the Plan page; units in their names.
 * @param boards Freeboard and the boards the keeper has. [m], height null when none are
 * @returns Codes and numbers, gravest first.
 *
 * Source: limits in BUILD.
 */
export function buildCautions(
  sums: Omit<BuildSums, 'cautions'>,
  { freeboardM, boardHeightM }: { freeboardM: number; boardHeightM: number | null },
): Caution[] {
  const { ground, water, boards, push, expansion, meltWater } = sums
  const cautions: (Caution | null)[] = [
    ground.fallM > BUILD.mostFallM
      ? { code: 'too_much_fall', values: { fallM: ground.fallM, mostM: BUILD.mostFallM } }
      : null,
    boardHeightM !== null && boardHeightM < boards.heightM
      ? { code: 'boards_too_low', values: { haveM: boardHeightM, wantedM: boards.heightM } }
      : null,
    { code: 'brace_low_side', values: { pushKgPerM: push.pushKgPerM, waterM: water.deepestM } },
    (boards.lumber?.boards.length ?? 2) > 1 ? { code: 'fill_half_first', values: { heightM: boards.heightM } } : null,
    expansion.riseM > freeboardM
      ? { code: 'ice_over_boards', values: { riseM: expansion.riseM, freeboardM } }
      : { code: 'ice_rises', values: { riseM: expansion.riseM, freeboardM } },
    { code: 'melt_water_goes', values: { volumeM3: meltWater.volumeM3 } },
  ]
  return cautions.filter((caution) => caution !== null)
}
