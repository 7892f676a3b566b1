// The open record: what was said of each night of a season, and what came of it.
import { listNightOutcomes, type NightOutcome } from '@/db/queries/night-outcomes'
import { getRinkHead } from '@/db/queries/rinks'
import { findYardEstimate } from '@/db/queries/yards'
import { requireRink } from '@/lib/access/require-rink'
import { keptRates, type KeptRates } from '@/lib/advice/kept-rates'
import { nightDateOf } from '@/lib/advice/night'
import { seasonOf, seasonOfYear, type Season } from '@/lib/advice/season'
import type { LearnedYard } from '@/lib/advice/yard/types'
import type { ServiceContext } from '@/lib/context'
import type { WordOptions } from '@/lib/words/options'
import { readerOf } from './rink-and-reader'

export interface KeptView {
  rink: { id: string; name: string; timeZone: string }
  reader: WordOptions
  season: Season
  rates: KeptRates
  nights: NightOutcome[]
  /** What the yard's reports have taught; null before the first look. */
  learned: LearnedYard | null
}

/** @param year The season that begins in that year; the present one by default. */
export async function getKeptNights(context: ServiceContext, rinkId: string, year?: number): Promise<KeptView> {
  const access = await requireRink(context, rinkId, 'view')
  const { db, now } = context
  const rink = await getRinkHead(db, access)
  const season = year === undefined ? seasonOf(nightDateOf(now, rink.timeZone)) : seasonOfYear(year)
  const [reader, nights, estimate] = await Promise.all([
    readerOf(context, rink.timeZone),
    listNightOutcomes(db, access, season),
    findYardEstimate(db, access.rinkId),
  ])
  return {
    rink: { id: rinkId, ...rink },
    reader,
    season,
    rates: keptRates(nights),
    nights,
    learned: estimate?.learned ?? null,
  }
}
