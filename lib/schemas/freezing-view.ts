// What the Freezing page shows. Instants are ISO text.
import { z } from 'zod'
import type { FreezingOutlook } from '@/lib/advice/freezing'
import type { Phase } from '@/lib/advice/types'
import type { WordOptions } from '@/lib/words/options'
import { rinkIdSchema } from './rinks'
import type { TonightView } from './tonight-view'

export interface FreezingView {
  readAt: string
  rink: { id: string; name: string; phase: Phase; carriesSkaterMm: number }
  reader: WordOptions
  mayWrite: boolean
  mayManage: boolean
  /** Null unless the rink is freezing and a forecast has been read that reaches this hour. */
  outlook: FreezingOutlook | null
  /** The newest one read, however old; null unless the rink is freezing. */
  forecast: TonightView['forecast']
  /** The newest try to read one failed. */
  lastReadFailed: boolean
  /** When the water was in; null when no fill was followed here. */
  sinceAt: string | null
  /** The newest since the fill. */
  reading: { at: string; thicknessMm: number; by: string | null } | null
  /** Ice of the whole rink as last measured or modelled, where there is any. [mm] */
  sheetMm: number | null
  /** Drilled at least as thick as the keeper wants it, so that they may open the rink. */
  isDrilledThick: boolean
}

export const openForSkatingSchema = z.object({ rinkId: rinkIdSchema })
