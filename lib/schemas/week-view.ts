// What the Week page shows: the nights ahead, one of them opened to its hours. Instants are ISO text.
import type { NightAhead } from '@/lib/advice/week'
import type { WeekSummary } from '@/lib/advice/week-summary'
import type { AdviceWindow, FillOutlook, ScoredHour } from '@/lib/advice/types'
import type { TonightView } from './tonight-view'

/** One bar of a row. */
export interface WeekBar {
  startsAt: string
  verdict: ScoredHour['verdict']
  /** Null where the forecast is missing. [mm/h] */
  freezeRateMmPerH: number | null
}

export interface WeekNight extends NightAhead {
  sunsetAt: string | null
  sunriseAt: string | null
  bars: WeekBar[]
}

export interface WeekView {
  readAt: string
  rink: Pick<TonightView['rink'], 'id' | 'name' | 'timeZone' | 'phase'>
  viewer: Pick<TonightView['viewer'], 'units' | 'clock'>
  /** Null until the first forecast has been read and scored. */
  outlook: {
    judgedAt: string
    modelVersion: string
    nights: WeekNight[]
    summary: WeekSummary
    fill: FillOutlook
    fillWindows: AdviceWindow[]
    /** The night that was asked for, hour by hour. */
    open: { nightDate: string; hours: ScoredHour[] } | null
  } | null
  forecast: TonightView['forecast']
  lastReadFailed: boolean
}
