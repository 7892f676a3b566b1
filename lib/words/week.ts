// The week in sentences: its headline, and how far to trust it.
import type { AdviceWindow, FillOutlook, Phase } from '@/lib/advice/types'
import type { WeekSummary } from '@/lib/advice/week-summary'
import { addDays, localDateOf } from '@/lib/advice/zoned-time'
import { dayText } from './night-label'
import type { WordOptions } from './options'
import { capitalised, countText, iceText, layerText } from './quantities'
import { dayPartText, nightText, weekdayText } from './times'

/** The headline in parts, so that a page can set off the middle one. */
export interface WeekHeadline {
  before: string
  key: string
  after: string
  tone: 'flood' | 'fill' | 'thaw' | 'plain'
}

interface Week {
  phase: Phase
  summary: WeekSummary
  fill: FillOutlook
  /** Times to fill, with those that too few runs see. */
  fillWindows: readonly AdviceWindow[]
}

const plain = (before: string): WeekHeadline => ({ before, key: '', after: '', tone: 'plain' })

export function weekHeadline(week: Week, now: Date, words: WordOptions): WeekHeadline {
  const { phase, summary, fill } = week
  if (phase === 'waiting' || phase === 'filling') return fillHeadline(week, now, words)
  if (phase === 'freezing') return freezingHeadline(fill, now, words)
  if (summary.thaw) return thawHeadline(summary, now, words)
  return countHeadline(summary.goodDates.length, summary.nights)
}

function countHeadline(good: number, nights: number): WeekHeadline {
  if (nights === 1) return plain(`The one night that the forecast covers is ${good === 1 ? 'good' : 'not good'}.`)
  if (good === 0) return plain(`No good night in the ${countText(nights)} ahead.`)
  if (good === nights)
    return { before: 'All', key: `${countText(good)} nights`, after: ' ahead are good.', tone: 'flood' }
  return { before: '', key: capitalised(nightsText(good)), after: ` of the ${countText(nights)} ahead.`, tone: 'flood' }
}

const nightsText = (count: number) => `${countText(count)} good ${count === 1 ? 'night' : 'nights'}`

function thawHeadline(summary: WeekSummary, now: Date, words: WordOptions): WeekHeadline {
  const { thaw, isThawOn, goodBeforeThaw, goodAfterThaw } = summary
  if (!thaw) return plain('')
  const after = goodAfterThaw > 0 ? ` ${capitalised(nightsText(goodAfterThaw))} after it.` : ''
  if (isThawOn) {
    const key = `thaw until ${dayPartText(thaw.endsAt, now, words)}`
    return { before: 'A', key, after: `.${after || ' No good night after it in this forecast.'}`, tone: 'thaw' }
  }
  const isToday = localDateOf(Date.parse(thaw.startsAt), words.timeZone) === localDateOf(now.getTime(), words.timeZone)
  if (goodBeforeThaw === 0 && isToday) return { before: 'A', key: 'thaw today', after: `.${after}`, tone: 'thaw' }
  const count = goodBeforeThaw === 0 ? 'No good night' : capitalised(nightsText(goodBeforeThaw))
  const key = `thaw ${nearDayText(thaw.startsAt, now, words)}`
  return { before: `${count} before the`, key, after: goodBeforeThaw === 0 ? `.${after}` : '.', tone: 'thaw' }
}

function fillHeadline({ phase, summary, fill, fillWindows }: Week, now: Date, words: WordOptions): WeekHeadline {
  if (!fill.startsAt) {
    const doubt = fillWindows.length > 0 ? ' that enough forecast runs see' : ''
    return plain(`No time to fill${doubt} in the ${countText(summary.nights)} days ahead.`)
  }
  const { p50 } = fill.carriesSkaterAt
  const carries = p50 ? `: skaters from about ${longDayText(p50, words)}.` : '.'
  const when = dayPartText(fill.startsAt, now, words)
  if (phase === 'filling') return { before: 'Go on', key: `filling ${when}`, after: carries, tone: 'fill' }
  return { before: '', key: `Fill ${when}`, after: carries, tone: 'fill' }
}

function freezingHeadline(fill: FillOutlook, now: Date, words: WordOptions): WeekHeadline {
  const { p50 } = fill.carriesSkaterAt
  if (!p50) return plain('Keep off: the sheet will not carry skaters within this forecast.')
  if (Date.parse(p50) <= now.getTime()) return plain('By the forecast the sheet carries. Drill before anyone skates.')
  return { before: 'Keep off: skaters from about', key: longDayText(p50, words), after: '.', tone: 'plain' }
}

/** What stands under the headline: what the near nights could bring, what the thaw takes, how wide the dates are. */
export function weekDetail({ phase, summary, fill }: Omit<Week, 'fillWindows'>, now: Date, words: WordOptions): string {
  if (phase === 'waiting' || phase === 'filling' || phase === 'freezing') return spreadText(fill, phase, now, words)
  return [floodsText(summary, now, words), thawText(summary, words)].filter(Boolean).join(' ')
}

function floodsText({ nearGoodDates, nearFloodsMm, goodDates }: WeekSummary, now: Date, words: WordOptions): string {
  const [firstGood] = goodDates
  if (nearGoodDates.length === 0 || nearFloodsMm === 0)
    return firstGood ? `The first good night is ${nightText(firstGood, now, words)}.` : ''
  const names = nearGoodDates.map((date) => nightText(date, now, words))
  return `Floods ${joined(names)} could add about ${layerText(Math.round(nearFloodsMm), words)} of ice.`
}

function thawText({ thaw, thinnest }: WeekSummary, words: WordOptions): string {
  if (!thaw) return ''
  const loss = `The thaw takes about ${layerText(Math.max(1, Math.round(thaw.lossMm)), words)} in this forecast`
  if (!thinnest) return `${loss}.`
  // Thinnest before it begins: the cold before the thaw brings more than the thaw takes.
  if (Date.parse(thinnest.at) < Date.parse(thaw.startsAt)) return `${loss}, less than the cold before it brings.`
  if (thinnest.thicknessMm < 1) return `${loss}, and with it the whole sheet.`
  return `${loss}; without floods the sheet comes down to ${iceText(thinnest.thicknessMm, words)}.`
}

/** "Nine of ten forecast runs have it carry skaters by Sat 23 January, one of ten by Wed 20 January." */
function spreadText(fill: FillOutlook, phase: Phase, now: Date, words: WordOptions): string {
  const { startsAt, carriesSkaterAt } = fill
  const { p10, p50, p90 } = carriesSkaterAt
  if (!p50) return startsAt ? 'The forecast ends before the ice carries skaters.' : ''
  const early = p10 ? `one forecast run in ten has it carry by ${longDayText(p10, words)}` : ''
  const late = p90 ? `nine in ten by ${longDayText(p90, words)}` : 'one in ten not before the forecast ends'
  // The headline says so of a sheet that carries by now.
  const drill = phase === 'freezing' && Date.parse(p50) <= now.getTime() ? '' : ' Drill before anyone skates.'
  return capitalised(`${[early, late].filter(Boolean).join(', ')}.${drill}`)
}

/** "today", "tomorrow", "on Sunday". */
function nearDayText(at: string, now: Date, words: WordOptions): string {
  const date = localDateOf(Date.parse(at), words.timeZone)
  const today = localDateOf(now.getTime(), words.timeZone)
  if (date === today) return 'today'
  return date === addDays(today, 1) ? 'tomorrow' : `on ${weekdayText(at, words)}`
}

/** "Thu 21 January" */
export function longDayText(at: string, { timeZone }: WordOptions): string {
  return dayText(localDateOf(Date.parse(at), timeZone))
}

function joined(names: string[]): string {
  return names.length < 2 ? names.join('') : `${names.slice(0, -1).join(', ')} and ${names.at(-1)}`
}
