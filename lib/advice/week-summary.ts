// The week in a few facts, for its headline: good nights, the thaw, and what the sheet would come to.
import type { NightAhead } from './week'
import type { Judgement, ScoredHour, Thaw } from './types'

export interface WeekSummary {
  nights: number
  /** Dates of the nights that are good for a flood or a fill. */
  goodDates: string[]
  goodBeforeThaw: number
  goodAfterThaw: number
  /** The first thaw that is not over. */
  thaw: Thaw | null
  isThawOn: boolean
  /** Good nights near enough to decide on, and what their floods would add. [mm of ice] */
  nearGoodDates: string[]
  nearFloodsMm: number
  /** The sheet at its thinnest from now on, without floods to come. */
  thinnest: { thicknessMm: number; at: string } | null
}

/**
 * What the nights ahead come to.
 *
 * @param nights From nightsAhead.
 * @param judgement Result of `judge`.
 * @param now Nothing before it counts.
 * @returns Good nights, the first thaw and the sheet at its thinnest. [mm]
 *
 * Source: ours.
 */
export function summariseWeek(
  nights: readonly NightAhead[],
  { hours, thaws }: Pick<Judgement, 'hours' | 'thaws'>,
  now: Date,
): WeekSummary {
  const lastEnd = nights.at(-1)?.endsAt ?? ''
  const thaw = thaws.find(({ startsAt, endsAt }) => Date.parse(endsAt) > now.getTime() && startsAt < lastEnd) ?? null
  const good = nights.filter(({ verdict }) => verdict === 'flood' || verdict === 'fill')
  const near = good.filter(({ isFar }) => !isFar)
  const startOf = ({ window, startsAt }: NightAhead) => window?.startsAt ?? startsAt
  return {
    nights: nights.length,
    goodDates: good.map(({ nightDate }) => nightDate),
    goodBeforeThaw: thaw ? good.filter((night) => startOf(night) < thaw.startsAt).length : good.length,
    goodAfterThaw: thaw ? good.filter((night) => startOf(night) >= thaw.endsAt).length : 0,
    thaw,
    isThawOn: thaw !== null && Date.parse(thaw.startsAt) <= now.getTime(),
    nearGoodDates: near.map(({ nightDate }) => nightDate),
    nearFloodsMm: near.reduce((sum, { floodsMm }) => sum + floodsMm, 0),
    thinnest: thinnestOf(hours, now, lastEnd),
  }
}

function thinnestOf(hours: readonly ScoredHour[], now: Date, lastEnd: string): WeekSummary['thinnest'] {
  let thinnest: WeekSummary['thinnest'] = null
  for (const { time, sheet } of hours) {
    if (Date.parse(time) < now.getTime() || time >= lastEnd) continue
    if (!thinnest || sheet.thicknessMm < thinnest.thicknessMm) thinnest = { thicknessMm: sheet.thicknessMm, at: time }
  }
  return thinnest
}
