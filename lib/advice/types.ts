// What the advice takes and gives: the shapes behind `npm run score`, the outlook job and the Tonight page.
import type { HeatBalanceParts, HourlyRecord } from '@/lib/physics/types'

export type Phase = 'planning' | 'waiting' | 'filling' | 'freezing' | 'skating' | 'thaw' | 'closed'
export type Base = 'liner' | 'ground' | 'snow'
export type ShelterName = 'open' | 'suburban' | 'tight'
export type Verdict = 'fill' | 'flood' | 'hold'

/** One request for judgement. Everything it depends on is in here: same input, same output. */
export interface JudgeInput {
  /** Nothing before this hour is advised. ISO 8601, UTC. */
  now: string
  rink: {
    latitude: number
    longitude: number
    /** IANA zone of the rink; available hours and nights are in it. */
    timeZone: string
    lengthM: number
    widthM: number
    shelter: ShelterName | number
    /** 0-1 */
    skyView: number
    base: Base
    phase: Phase
  }
  water: { temperatureC: number; flowLPerMin: number; layerMm: number; fillDepthMm: number }
  /** The sheet at `asOf` (default: at the first hour). */
  sheet: { thicknessMm: number; temperatureC: number; snowCoverCm: number; liquidMm?: number; asOf?: string }
  /** When the keeper can go out, local wall time "HH:MM"; `to` before `from` runs past midnight. */
  available: { from: string; to: string }[]
  maxPasses: number
  hours: HourlyRecord[]
  /** Other runs of the same forecast, same hours. Without them the runs are perturbed from a stated error model. */
  members?: HourlyRecord[][]
  /** Layers already poured, oldest first: the sheet has them, the plan counts them. */
  poured?: { at: string; layerMm: number; temperatureC: number }[]
}

/** Why an hour is as it is. `code` and the numbers are data; words are made in lib/words. */
export interface Reason {
  code: string
  /** 0-1: how much this factor lets through; the lowest leads. */
  factor: number
  /** The numbers the sentence needs, each named with its unit; instants as ISO text. */
  values: Record<string, number | string>
}

export interface SheetReport {
  thicknessMm: number
  temperatureC: number
  liquidMm: number
  snowCoverCm: number
}

export interface ScoredHour {
  time: string
  /** False when weather is missing for longer than one hour: scores are 0/0/100 and the verdict is hold. */
  isKnown: boolean
  /** For a wet surface at 0 °C in that hour; null when unknown. */
  netHeatLossWm2: number | null
  parts: HeatBalanceParts | null
  freezeRateMmPerH: number | null
  windChillC: number | null
  /** When a layer poured at the start of this hour is solid; null when it does not set within the hours given. */
  setsAt: string | null
  scores: { fill: number; flood: number; hold: number }
  verdict: Verdict
  /** Leading reason first. */
  reasons: Reason[]
  /** At the end of the hour. */
  sheet: SheetReport
}

export interface AdviceWindow {
  kind: 'fill' | 'flood'
  startsAt: string
  /** End of the last good hour. */
  endsAt: string
  /** Last moment to start and still be set in time. */
  latestStartAt: string
  /** When the last layer started inside the window is set. */
  setBy: string
  /** 0-100 */
  score: number
  /** Share of forecast runs that agree, 0-1, and how many runs that is out of. */
  agreement: number
  runs: number
}

export interface PlannedPass {
  startsAt: string
  setBy: string
  layerMm: number
  waterL: number
  hoseMinutes: number
}

export interface FillOutlook {
  startsAt: string | null
  hoseHours: number
  litres: number
  skinAt: string | null
  carriesSkaterAt: { p10: string | null; p50: string | null; p90: string | null }
}

export interface Thaw {
  startsAt: string
  endsAt: string
  lossMm: number
}

export interface Judgement {
  modelVersion: string
  hours: ScoredHour[]
  windows: AdviceWindow[]
  /** Passes for the night that `now` is in (see lib/advice/night.ts), already poured ones left out. */
  plan: { passes: PlannedPass[] }
  fill: FillOutlook
  thaws: Thaw[]
}
