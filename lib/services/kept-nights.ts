// The open record: what was said of each night of a season, and what came of it.
import { listNightOutcomes, type NightOutcome } from '@/db/queries/night-outcomes'
import { getRinkHead } from '@/db/queries/rinks'
import { findAccount } from '@/db/queries/users'
import { findYardEstimate } from '@/db/queries/yards'
import { requireRink } from '@/lib/access/require-rink'
import { keptRates, type KeptRates } from '@/lib/advice/kept-rates'
import { nightDateOf } from '@/lib/advice/night'
import { seasonOf, seasonOfYear, type Season } from '@/lib/advice/season'
import type { LearnedYard } from '@/lib/advice/yard/types'
import type { ServiceContext } from '@/lib/context'
import { NotFoundError } from '@/lib/errors'
import { wordsFor, type WordOptions } from '@/lib/words/options'

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
  const { db, now, viewer } = context
  const [rink, account] = await Promise.all([getRinkHead(db, access), findAccount(db, viewer.userId)])
  if (!account) throw new NotFoundError('Account')
  const season = year === undefined ? seasonOf(nightDateOf(now, rink.timeZone)) : seasonOfYear(year)
  const [nights, estimate] = await Promise.all([
    listNightOutcomes(db, access, season),
    findYardEstimate(db, access.rinkId),
  ])
  return {
    rink: { id: rinkId, ...rink },
    reader: wordsFor(account, rink.timeZone),
    season,
    rates: keptRates(nights),
    nights,
    learned: estimate?.learned ?? null,
  }
}
