// What the sums of the Plan page take and give.
import type { FloorShape } from '@/lib/physics/floor'
import type { SectionPoint } from '@/lib/physics/section'
import type { Caution } from './types'

export interface BuildInput {
  /** Between the boards. [m], 0.1 to 500 */
  lengthM: number
  widthM: number
  /** Below the string; level ground when absent. */
  floor?: FloorShape | null
  /** Water wanted over the highest point. [m], above 0 to 1 */
  leastDepthM: number
  /** Known, or by the bucket test. */
  flow: { lPerMin: number } | { bucketL: number; bucketSeconds: number }
  /** How long the hose can run in one go. [h] Absent: in one go. */
  hoursPerSession?: number
  /** In the keeper's money. */
  waterPricePerM3?: number | null
  /** Boards the rink has. [m] */
  boardHeightM?: number | null
  /** Board above the water. [m] Default 0.05. */
  freeboardM?: number
  /** Default 0.038, the dressed thickness of nominal two-inch lumber. [m] */
  boardThicknessM?: number
  /** Liner down the outside, each side. [m] Default 0.15. */
  tuckM?: number
  /** More liner for folds and creases. [0-0.5] Default 0.03. */
  foldShare?: number
  /** Liner to spare, each side. [m] Default 0.15. */
  overlapM?: number
  /** Liners are cut to whole steps. [m] Default 0.5; a foot is 0.3048. */
  linerStepM?: number
  /** Water of the season's floods on top of the fill. [L] Default 0. */
  floodsL?: number
  /** Water that leaves the ice as vapour over the season. [mm] Default 0, which gives the most there can be. */
  sublimatedMm?: number
  /** Autumn in which the season begins. */
  seasonYear: number
}

/** Where a figure comes from: words for both ids are in lib/words/sum-formulas.ts. Values are named with their unit. */
export interface How {
  formulaId: SumId
  values: Record<string, number>
  sourceId: SourceId
}

export type SumId =
  | 'ground'
  | 'water'
  | 'flow'
  | 'hose'
  | 'sessions'
  | 'wetted'
  | 'cost'
  | 'boards'
  | 'push'
  | 'expansion'
  | 'liner'
  | 'orderBy'
  | 'meltWater'

export type SourceId =
  'geometry' | 'stage_storage' | 'definition' | 'hydrostatics' | 'iapws' | 'keeper' | 'common_practice' | 'mass_balance'

export interface CornerSum {
  /** Floor below the string. [m] */
  floorM: number
  /** 0 is dry. [m] */
  waterM: number
  /** Height of board wanted there, all boards level on top. [m] */
  boardM: number
}

/** The water after so many hours of hose. */
export interface WettedHour {
  hours: number
  litres: number
  /** Below the string. [m] */
  levelM: number
  /** 0-1 */
  wettedShare: number
  wettedM2: number
  cornerDepthsM: number[]
}

/** Every sum as data, each with how it was made. */
export interface BuildSums {
  ground: { areaM2: number; fallM: number; how: How }
  water: { volumeM3: number; meanDepthM: number; deepestM: number; levelM: number; how: How }
  corners: [CornerSum, CornerSum, CornerSum, CornerSum]
  /** From the highest point to the lowest, for the drawing; water stands at `water.levelM`. */
  section: SectionPoint[]
  flow: { lPerMin: number; how: How }
  hose: { hours: number; how: How }
  sessions: { count: number; hoursEach: number; how: How }
  wetted: { byHour: WettedHour[]; how: How }
  /** Null without a price. */
  cost: { amount: number; how: How } | null
  /** At the low corner. `lumber` is null when no pair of usual boards reaches. */
  boards: { heightM: number; lumber: { boards: string[]; heightM: number } | null; how: How }
  /** On a metre of board at the low corner. */
  push: { pushNPerM: number; pushKgPerM: number; footMomentNmPerM: number; how: How }
  /** How far the surface rises as it freezes, over the deepest place. */
  expansion: { riseM: number; how: How }
  liner: { lengthM: number; widthM: number; lengthBeforeFoldsM: number; widthBeforeFoldsM: number; how: How }
  /** 'yyyy-MM-dd' */
  orderBy: { date: string; how: How }
  meltWater: { volumeM3: number; how: How }
  /** Codes and numbers; words in lib/words/sum-cautions.ts. */
  cautions: Caution[]
}
