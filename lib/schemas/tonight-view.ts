// What the Tonight page shows, as the route handler sends it. Instants are ISO text.
import type { Role } from '@/lib/access/permissions'
import type { NightModel } from '@/lib/advice/night-model'
import type { NightSummary } from '@/lib/advice/night-summary'
import type { PlannedPass, Reason, ScoredHour, Thaw, Phase } from '@/lib/advice/types'
import type { WhatWouldTurn } from '@/lib/advice/what-would-change'
import type { Units } from '@/lib/units'

/** One hour of the night sheet: what the model made of it, with the weather it rests on. */
export type TonightHour = ScoredHour

/** One calendar day in the rink's zone, for the ten-day chart. Null where hours are missing. */
export interface DayAhead {
  date: string
  lowC: number | null
  highC: number | null
  /** Ice that a wet sheet could freeze in the day's freezing hours. [mm] */
  freezableMm: number | null
  snowCm: number | null
  rainMm: number | null
  floodHours: number
}

/** A pass of tonight: planned ones can be checked off, poured ones say who did it. */
export interface TonightPass extends Omit<PlannedPass, 'setBy'> {
  number: number
  /** Null when it would not set within the forecast: only passes that the keeper moved can be so. */
  setBy: string | null
  /** Of the water. [°C] */
  temperatureC: number
  flowLPerMin: number
  /** What speaks against a pass that the keeper moved: for the ice, and for the person. */
  warnings: Reason[]
  limits: Reason[]
  poured: PouredPassView | null
}

export interface PouredPassView {
  at: string
  by: string | null
  /** Null while the check-off is on its way, or waits on this device for a network. */
  entry: { id: string; version: number } | null
  /** When it was said to be set: keep off until then. */
  saidSetByAt: string | null
  outcome: 'set' | 'wet' | 'spoiled' | null
  outcomeAt: string | null
}

export interface WaterChoice {
  kind: 'cold-tap' | 'hot-tap' | 'hydrant' | 'tanker'
  temperatureC: number
  flowLPerMin: number
}

/** Fetched when the keeper opens a pass to change it. */
export interface MovableNight {
  model: NightModel
  waters: WaterChoice[]
  areaM2: number
}

export interface TonightView {
  /** When the server put this together. */
  readAt: string
  rink: {
    id: string
    name: string
    placeName: string
    timeZone: string
    phase: Phase
    people: number
    water: { temperatureC: number; flowLPerMin: number; layerMm: number }
  }
  viewer: {
    id: string
    role: Role
    units: Units
    clock: '12' | '24'
    /** Silent up to and including this night. */
    mutedThrough: string | null
  }
  night: { date: string; startsAt: string; endsAt: string; sunsetAt: string | null; sunriseAt: string | null }
  /** Null until the first forecast has been read and scored. */
  outlook: {
    judgedAt: string
    modelVersion: string
    summary: NightSummary
    hours: TonightHour[]
    passes: TonightPass[]
    /** The passes are the keeper's, not the advised ones. */
    ownPlan: { by: string | null } | null
    /** On a night to hold off: what would make an hour good, each change alone, the smallest that does it. */
    wouldTurn: WhatWouldTurn[]
    days: DayAhead[]
    thaws: Thaw[]
  } | null
  forecast: {
    provider: string
    issuedAt: string | null
    fetchedAt: string
    isStale: boolean
    attribution: { text: string; url: string; licence: string }
  } | null
  /** The newest try to read the forecast failed. */
  lastReadFailed: boolean
}
