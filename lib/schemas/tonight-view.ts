// What the Tonight page shows, as the route handler sends it. Instants are ISO text.
import type { Role } from '@/lib/access/permissions'
import type { NightSummary } from '@/lib/advice/night-summary'
import type { PlannedPass, ScoredHour, Thaw, Phase } from '@/lib/advice/types'
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
export interface TonightPass extends PlannedPass {
  number: number
  poured: { at: string; by: string | null } | null
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
