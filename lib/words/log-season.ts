// A season in words: the headline of the log, and the sentences beside its charts.
import { localDateOf } from '@/lib/advice/zoned-time'
import { DAY_MILLIS } from '@/lib/physics/constants'
import type { WordOptions } from './options'
import { capitalised, countText, iceText } from './quantities'
import { muchWaterText } from './log'

export interface SeasonFigures {
  floods: number
  nightsFlooded: number
  waterL: number
  thicknessMm: number | null
  lastThawAt: Date | null
}

/** "41 floods, 8.9 cm, nine days since the last thaw." */
export function seasonHeadline(season: SeasonFigures, now: Date, words: WordOptions): string {
  const { floods, thicknessMm, lastThawAt } = season
  if (floods === 0 && lastThawAt === null) {
    const ice =
      thicknessMm === null || thicknessMm <= 0 ? '' : ` The sheet is ${iceText(thicknessMm, words)} by the model.`
    return `No flood in the log yet this season.${ice}`
  }
  const parts = [
    `${countText(floods)} ${floods === 1 ? 'flood' : 'floods'}`,
    thicknessMm === null ? '' : iceText(thicknessMm, words),
    lastThawAt === null ? 'no thaw so far' : sinceText(lastThawAt, now, words),
  ]
  return `${capitalised(parts.filter(Boolean).join(', '))}.`
}

/** "41 floods on 20 nights.", of a season that is over. */
export function pastSeasonHeadline({ floods, nightsFlooded }: SeasonFigures): string {
  if (floods === 0) return 'No flood in the log of that season.'
  const nights = `${countText(nightsFlooded)} ${nightsFlooded === 1 ? 'night' : 'nights'}`
  return `${capitalised(countText(floods))} ${floods === 1 ? 'flood' : 'floods'} on ${nights}.`
}

function sinceText(at: Date, now: Date, { timeZone }: WordOptions): string {
  const day = (instant: Date) => Date.parse(localDateOf(instant.getTime(), timeZone))
  const days = Math.round((day(now) - day(at)) / DAY_MILLIS)
  return days === 0 ? 'a thaw today' : `${countText(days)} ${days === 1 ? 'day' : 'days'} since the last thaw`
}

/** For who cannot see the chart of thickness. */
export function thicknessSummary(
  days: readonly { date: string; modelMm: number | null; readingMm: number | null }[],
  words: WordOptions,
): string {
  const known = days.map(({ modelMm, readingMm }) => readingMm ?? modelMm).filter((mm) => mm !== null)
  const first = known[0]
  const last = known.at(-1)
  if (first === undefined || last === undefined) return 'No thickness on record yet.'
  const readings = days.filter(({ readingMm }) => readingMm !== null).length
  const measured = `${countText(readings)} ${readings === 1 ? 'reading' : 'readings'}`
  if (known.length === 1) return `${iceText(last, words)} on the one day on record, ${measured}.`
  return `From ${iceText(first, words)} to ${iceText(last, words)}, at most ${iceText(Math.max(...known), words)}; ${measured}.`
}

/** For who cannot see the chart of water. */
export function waterSummary(nights: readonly { waterL: number }[], words: WordOptions): string {
  if (nights.length === 0) return 'No water poured yet.'
  const total = nights.reduce((sum, { waterL }) => sum + waterL, 0)
  const most = Math.max(...nights.map(({ waterL }) => waterL))
  const count = `${countText(nights.length)} ${nights.length === 1 ? 'night' : 'nights'}`
  return `${muchWaterText(total, words)} over ${count}, at most ${muchWaterText(most, words)} in one.`
}

/** For who cannot see the chart of weeks. */
export function weeksSummary(weeks: readonly { nights: number }[]): string {
  const total = weeks.reduce((sum, { nights }) => sum + nights, 0)
  if (total === 0) return 'No night flooded yet.'
  const most = Math.max(...weeks.map(({ nights }) => nights))
  return `${capitalised(countText(total))} ${total === 1 ? 'night' : 'nights'} flooded, at most ${countText(most)} in a week.`
}
