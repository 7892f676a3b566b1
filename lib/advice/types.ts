// What the advice takes and gives: the shapes behind `npm run score`, the outlook job and the Tonight page.
import type { FloorShape } from '@/lib/physics/floor'
import type { HeatBalanceParts, HourlyRecord } from '@/lib/physics/types'

export type Phase = 'planning' | 'waiting' | 'filling' | 'freezing' | 'skating' | 'thaw' | 'closed'
export type Base = 'liner' | 'ground' | 'snow'
export type ShelterName = 'open' | 'suburban' | 'tight'
export type Verdict = 'fill' | 'flood' | 'hold'

/** A sheet's state as kept between runs: plain JSON, opaque outside lib/physics. */
export type StoredSheet = unknown

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
    /** Height of the skyline: one all round, or eight from north clockwise. [°] None when absent. */
    horizonDeg?: number | number[]
    /** Share of direct sunshine that trees or a cloth keep off, 0-1. None when absent. */
    shade?: number
    base: Base
    phase: Phase
    /** Below any level line; level ground when absent. The fill's depth is then its mean, and the deepest place freezes last. */
    floor?: FloorShape | null
  }
  /** `filledLitres` is what of the fill is in already. */
  water: { temperatureC: number; flowLPerMin: number; layerMm: number; fillDepthMm: number; filledLitres?: number }
  /** Ice at which the keeper lets people on. [mm] Default 100. */
  carriesSkaterMm?: number
  /** The sheet at `asOf` (default: at the first hour). */
  sheet: {
    thicknessMm: number
    temperatureC: number
    snowCoverCm: number
    liquidMm?: number
    asOf?: string
    /** A state kept from an earlier judgement (`sheetState.state`); it wins over the plain numbers. */
    state?: StoredSheet
  }
  /**
   * When the keeper can go out, local wall time "HH:MM"; `to` before `from` runs past midnight. `weekdays` are the days
   * on which the hours start, Monday 1 to Sunday 7; every day when absent.
   */
  available: { from: string; to: string; weekdays?: readonly number[] }[]
  /** Beyond these the keeper stays in, whatever the ice: wind at the rink [m/s] and wind chill [°C]. */
  limits?: { windMps?: number; windChillC?: number }
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

/** The weather that an hour's score rests on, at the yard. */
export interface HourWeather {
  airTemperatureC: number
  dewPointC: number
  /** At rink height, after the yard's shelter. [m/s] */
  windAtRinkMps: number
  /** 0-1, null when neither cloud nor longwave was given */
  cloudCover: number | null
  precipitationMm: number
  rainMm: number
  snowfallCm: number
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
  /** 0-100 each and never averaged: what the ice allows and what the person and the hose allow. */
  limits?: { ice: number; person: number }
  /** Null when the weather is unknown. */
  weather?: HourWeather | null
  /** Whether the keeper can go out in this hour; windows and plans keep to such hours, scores do not. */
  isAvailable?: boolean
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
  /** Share of forecast runs in which what is started in its best hour comes off, 0-1, and how many runs that is out of. */
  agreement: number
  runs: number
  /** Start of the best hour in it: the one in which most runs come off, of those the one with the highest score. */
  bestStartAt?: string
}

export interface PlannedPass {
  startsAt: string
  setBy: string
  layerMm: number
  waterL: number
  hoseMinutes: number
}

/** When something happens over the forecast runs: by p10 in one run of ten, by p90 in nine; null when not within the forecast. */
export interface Spread {
  p10: string | null
  p50: string | null
  p90: string | null
}

/** One time of running hose. */
export interface FillSpan {
  startsAt: string
  endsAt: string
  litres: number
}

/** The water at the end of an hour of hose, or of the part of it in which the hose runs. */
export interface FillHour {
  at: string
  litresSoFar: number
  /** Water surface below the line that the floor was measured from. [m] */
  levelM: number
  /** 0-1 */
  wettedShare: number
  /** Water at the corners, in the order of the floor; 0 is dry. [m] */
  cornerDepthsM: [number, number, number, number]
}

export interface FillOutlook {
  startsAt: string | null
  /** Of what is still to pour, as `litres` is. */
  hoseHours: number
  litres: number
  /** In the forecast itself. */
  skinAt: string | null
  carriesSkaterAt: Spread
  /** From here on absent in judgements kept from before there were any. */
  skinAtSpread?: Spread
  /** No water left over the deepest place. */
  frozenThroughAt?: Spread
  /** When the hose runs, in the forecast itself. */
  sessions?: FillSpan[]
  hours?: FillHour[]
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
  /** The sheet at `options.stateAt`, plain JSON: feed it back as `sheet.state` with `asOf` set to `at`. */
  sheetState?: { at: string; state: StoredSheet }
}

export interface JudgeOptions {
  /** Perturbed runs to judge when no members are given; 0 turns agreement into the main run's own word. Default: AGREEMENT.defaultRuns. */
  runs?: number
  /** Seed of the perturbed runs. */
  seed?: number
  /** Ask for the sheet's state at the start of this hour. */
  stateAt?: string
}

/** Snow or rain that ends the good hours or comes after them. */
export interface ComingPrecipitation {
  kind: 'snow' | 'rain'
  startsAt: string
  endsAt: string
  rainMm: number
  snowfallCm: number
}

/** Something the keeper must mind tonight; `code` and numbers, words are made in lib/words. */
export interface Caution {
  code: string
  values: Record<string, number | string>
}
