// What the Filling page shows. Instants are ISO text.
import type { FillProgress } from '@/lib/advice/fill-progress'
import type { Phase } from '@/lib/advice/types'
import type { WordOptions } from '@/lib/words/options'

export interface FillingView {
  readAt: string
  rink: { id: string; name: string; phase: Phase }
  reader: WordOptions
  mayWrite: boolean
  /** What a fill starts with when nothing is typed. */
  usual: { fillDepthMm: number; flowLPerMin: number }
  /** Null when none is open. */
  fill: OpenFillView | null
  /** The newest one that is over. */
  last: { finishedAt: string; litres: number } | null
}

export interface OpenFillView {
  startedAt: string
  startedBy: string | null
  targetDepthMm: number
  targetL: number
  /** Of the hose that runs, or of the last that did. */
  flowLPerMin: number
  progress: FillProgress
  /** As in the floor: north, east, south, west. */
  lowCorner: number
  sessions: { startedAt: string; stoppedAt: string | null; litres: number }[]
  /** Newest first. */
  checks: FillLook[]
}

export interface FillLook {
  at: string
  by: string | null
  lowCornerDepthMm: number | null
  /** What the flow should have made it by then. */
  reckonedDepthMm: number
  note: string
}
