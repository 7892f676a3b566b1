// A season on one page: what was done, what it took, how the ice stood, how the advice held, and what next year needs.
import { listEntries } from '@/db/queries/log-lists'
import { findLimits, sumWaterByKind } from '@/db/queries/log-season'
import type { WaterSource } from '@/db/queries/water-sources'
import { listNightOutcomes } from '@/db/queries/night-outcomes'
import { requireRink } from '@/lib/access/require-rink'
import { keptRates, type KeptRates } from '@/lib/advice/kept-rates'
import { seasonOfYear } from '@/lib/advice/season'
import type { ServiceContext } from '@/lib/context'
import type { EntryView } from '@/lib/schemas/log-choices'
import { logFrame, seasonTotals, type LogFrame, type SeasonTotals } from './log-book'
import { thicknessDays, type ThicknessDay } from './log-charts'
import { entryView } from './log-view'

export interface SeasonView extends LogFrame {
  presentYear: number
  totals: SeasonTotals
  /** By the flow of each source as it is set now; null when nothing was poured. */
  hoseHours: number | null
  /** Null when the keeper gave no price. */
  waterCost: number | null
  thickness: ThicknessDay[]
  thaws: EntryView[]
  repairs: EntryView[]
  rates: KeptRates
}

/** @param year The season that begins in that year; the present one by default. */
export async function getSeason(context: ServiceContext, rinkId: string, year?: number): Promise<SeasonView> {
  const access = await requireRink(context, rinkId, 'view')
  const { db } = context
  const frame = await logFrame(context, access)
  const season = year === undefined ? frame.season : seasonOfYear(year)
  const { from, to } = season
  const [thickness, thaws, repairs, outcomes, byKind, limits] = await Promise.all([
    thicknessDays(db, access, season, frame.rink.timeZone),
    listEntries(db, access, { kind: 'thaw', from, to }),
    listEntries(db, access, { kind: 'repair', from, to }),
    listNightOutcomes(db, access, season),
    sumWaterByKind(db, access, season),
    findLimits(db, access),
  ])
  const totals = await seasonTotals(context, access, season, thickness)
  const price = limits?.waterPricePerM3 ?? null
  return {
    ...frame,
    season,
    presentYear: frame.season.year,
    // The ice of today is none of a season that is over.
    totals: season.year < frame.season.year ? { ...totals, thicknessMm: null } : totals,
    hoseHours: totals.waterL > 0 ? hoursOf(byKind, frame.usual.sources) : null,
    waterCost: price === null ? null : (totals.waterL / 1000) * price,
    thickness,
    thaws: thaws.map(entryView).reverse(),
    repairs: repairs.map(entryView).reverse(),
    rates: keptRates(outcomes),
  }
}

/** Water whose source is not known, or gone, ran from the one that is usual. */
function hoursOf(
  byKind: readonly { waterKind: string | null; waterL: number }[],
  sources: readonly WaterSource[],
): number | null {
  const usual = sources[0]
  if (!usual) return null
  return byKind.reduce((hours, { waterKind, waterL }) => {
    const { flowLPerMin } = sources.find(({ kind }) => kind === waterKind) ?? usual
    return hours + waterL / flowLPerMin / 60
  }, 0)
}
