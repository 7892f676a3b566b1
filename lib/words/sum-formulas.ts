// How each sum of the building plan is made: the formula, the same with this rink's figures, and the source.
import type { How, SourceId, SumId } from '@/lib/advice/build-types'
import { depthText, lengthText, momentText, pushText, volumeText } from './build-quantities'
import type { WordOptions } from './options'
import { areaText, durationText, flowText, numberText, waterText } from './quantities'

export interface HowWords {
  formula: string
  /** The formula with the figures of this rink in it. */
  worked: string
  source: string
}

type Values = How['values']
type Writer = (value: (name: string) => number, words: WordOptions) => string

const FORMULAS: Record<SumId, string> = {
  ground: 'Fall = lowest point − highest point below the string; area = length × width',
  water: 'Volume = sum over the floor of (floor − water level) wherever it is wet; mean depth = volume ÷ area',
  flow: 'Flow = bucket ÷ seconds × 60',
  hose: 'Hours = water ÷ flow a minute ÷ 60',
  sessions: 'Times out = hours of hose ÷ hours in one go, rounded up',
  wetted:
    'After each hour: the level at which (flow × time) of water stands on the floor, and the part of the floor below it',
  cost: 'Cost = volume × price',
  boards: 'Boards = water at the low corner + board above the water',
  push: 'Push on a metre of board = ½ ρ g h²; moment at its foot = ρ g h³ ÷ 6; the push acts a third of the way up',
  expansion: 'Rise = depth × (density of water ÷ density of ice − 1)',
  liner: 'Liner = (inside + 2 × (boards + thickness + down the outside)) × (1 + folds) + 2 × spare, rounded up',
  orderBy: 'End of September of the autumn before',
  meltWater: 'Melt water = fill + floods − what left the ice as vapour',
}

const WORKED: Record<SumId, Writer> = {
  ground: (v, w) =>
    `${lengthText(v('lengthM'), w)} × ${lengthText(v('widthM'), w)}; ${depthText(v('lowestM') - v('highestM'), w)} of fall`,
  water: (v, w) => `${areaText(v('areaM2'), w)} × ${depthText(v('meanDepthM'), w)} = ${volumeText(v('volumeM3'), w)}`,
  flow: (v, w) =>
    v('bucketL') > 0
      ? `${waterText(v('bucketL'), w)} in ${numberText(v('bucketSeconds'), 0, w)} s = ${flowText(v('lPerMin'), w)}`
      : `${flowText(v('lPerMin'), w)}, as given`,
  hose: (v, w) => `${waterText(v('litres'), w)} ÷ ${flowText(v('lPerMin'), w)} = ${durationText(v('hours') * 60)}`,
  sessions: (v) => `${durationText(v('hours') * 60)} ÷ ${durationText(v('hoursPerSession') * 60)}, so ${v('count')}`,
  wetted: (v, w) => `${flowText(v('lPerMin'), w)} onto ${areaText(v('areaM2'), w)}`,
  cost: (v, w) =>
    `${numberText(v('volumeM3'), 1, w)} m³ × ${numberText(v('pricePerM3'), 2, w)} = ${numberText(v('amount'), 2, w)}`,
  boards: (v, w) => `${depthText(v('waterM'), w)} + ${depthText(v('freeboardM'), w)} = ${depthText(v('heightM'), w)}`,
  push: (v, w) =>
    `½ × 1000 kg/m³ × ${numberText(v('gravity'), 2, w)} m/s² × (${numberText(v('waterM'), 2, w)} m)² = ` +
    `${numberText(v('pushNPerM'), 0, w)} N/m: ${pushText(v('pushNPerM'), w)}; ${momentText(v('footMomentNmPerM'), w)} at the foot`,
  expansion: (v, w) =>
    `${depthText(v('waterM'), w)} × (${numberText(v('waterDensity'), 0, w)} ÷ ${numberText(v('iceDensity'), 0, w)} − 1) = ${depthText(v('riseM'), w)}`,
  liner: (v, w) =>
    `(${lengthText(v('insideM'), w)} + 2 × (${depthText(v('boardHeightM'), w)} + ${depthText(v('boardThicknessM'), w)} + ` +
    `${depthText(v('tuckM'), w)})) × ${numberText(1 + v('foldShare'), 2, w)} + 2 × ${depthText(v('overlapM'), w)}, up to the next ${lengthText(v('stepM'), w)}`,
  orderBy: (v) => `Season from autumn ${v('seasonYear')}`,
  meltWater: (v, w) =>
    `${volumeText(v('fillM3'), w)} + ${volumeText(v('floodsM3'), w)} − ${volumeText(v('sublimatedM3'), w)} = ${volumeText(v('volumeM3'), w)}`,
}

const SOURCES: Record<SourceId, string> = {
  geometry: 'Geometry.',
  stage_storage: 'Stage and storage over the floor between your points, taken as bilinear and cut into triangles.',
  definition: 'By definition.',
  hydrostatics: 'Hydrostatics of still water; moving water, wind and people leaning come on top.',
  iapws: 'Density of ice at 0 °C: IAPWS R10-06, 916.7 kg/m³.',
  keeper: 'The figure you gave.',
  common_practice: 'Common practice among keepers; we know no published source.',
  mass_balance: 'What was poured and did not leave stays. Without a figure for vapour it is the most there can be.',
}

/** The "how" of a sum in words. */
export function howWords({ formulaId, sourceId, values }: How, words: WordOptions): HowWords {
  const value = (name: string) => (values as Partial<Values>)[name] ?? 0
  return { formula: FORMULAS[formulaId], worked: WORKED[formulaId](value, words), source: SOURCES[sourceId] }
}
