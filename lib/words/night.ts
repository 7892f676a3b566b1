// A night in sentences: the verdict, and how sure it is.
import type { NightSummary } from '@/lib/advice/night-summary'
import { MINUTE_MILLIS } from '@/lib/physics/constants'
import type { WordOptions } from './options'
import { capitalised, countText, durationText } from './quantities'
import { reasonClause } from './reasons'
import { dayPartText, doneBy, doneByText, nightText, spanText } from './times'

/** Layers up to this depth are called thin. [mm] */
const THIN_MM = 5

/** The verdict in two parts, so that a page can set off the first: "Flood tonight" + "between 8 pm and 1 am. Three thin passes." */
export interface VerdictWords {
  lead: string
  rest: string
}

export function verdictParts(summary: NightSummary, now: Date, words: WordOptions): VerdictWords {
  const { verdict, window } = summary
  if (window && (verdict === 'flood' || verdict === 'fill')) {
    const verb = verdict === 'flood' ? 'Flood' : 'Fill'
    const span = spanText(window.startsAt, window.endsAt, now, words)
    return { lead: `${verb} ${whenText(summary, now, words)}`, rest: `${span}.${passesText(summary)}` }
  }
  if (verdict === 'unknown')
    return { lead: 'No forecast', rest: `for ${nightText(summary.nightDate, now, words)} yet.` }
  return holdParts(summary, now, words)
}

/** The verdict as one text. */
export function verdictSentence(summary: NightSummary, now: Date, words: WordOptions): string {
  const { lead, rest } = verdictParts(summary, now, words)
  return rest.startsWith(':') || rest.startsWith('.') ? lead + rest : `${lead} ${rest}`
}

function whenText(summary: NightSummary, now: Date, words: WordOptions): string {
  const startsAt = summary.window?.startsAt ?? summary.startsAt
  const part = dayPartText(startsAt, now, words)
  return /afternoon|morning/.test(part) ? part : nightText(summary.nightDate, now, words)
}

function passesText({ passes }: NightSummary): string {
  if (passes.length === 0) return ''
  const thin = passes.every((pass) => pass.layerMm <= THIN_MM) ? ' thin' : ''
  return ` ${capitalised(countText(passes.length))}${thin} ${passes.length === 1 ? 'pass' : 'passes'}.`
}

function holdParts(summary: NightSummary, now: Date, words: WordOptions): VerdictWords {
  const { leadingReason, holdUntil, nextGoodAt, thaw } = summary
  if (thaw || !leadingReason) {
    const until = holdUntil
      ? ` until ${dayPartText(holdUntil, now, words)}`
      : ` ${nightText(summary.nightDate, now, words)}`
    return { lead: 'Nothing to do', rest: `${until.trim()}.` }
  }
  const next = nextGoodAt ? ` Next good hours: ${dayPartText(nextGoodAt, now, words)}.` : ''
  return { lead: 'Hold off', rest: `: ${reasonClause(leadingReason, words)}.${next}` }
}

/** "9 of 10 forecast runs agree. The last pass is set by 1:50 am, three hours before snow." Empty when there is nothing to say. */
export function sureSentence(summary: NightSummary, words: WordOptions): string {
  const sentences = [agreementText(summary), lastPassText(summary, words)]
  return sentences.filter((sentence) => sentence !== '').join(' ')
}

/** "9 of 10 forecast runs agree." Empty where no other run was asked. */
export function agreementText({ agreement, runs }: Pick<NightSummary, 'agreement' | 'runs'>): string {
  if (agreement === null || runs === 0) return ''
  const agreeing = Math.round(agreement * runs)
  if (agreeing === runs) return runs === 1 ? '' : `All ${runs} forecast runs agree.`
  return `${agreeing} of ${runs} forecast runs agree.`
}

function lastPassText({ passes, lastSetBy, precipitation }: NightSummary, words: WordOptions): string {
  if (!lastSetBy) return ''
  const which = passes.length === 1 ? 'The pass' : 'The last pass'
  return `${which} is set by ${doneByText(lastSetBy, words)}${beforeText(lastSetBy, precipitation)}.`
}

/** A few minutes over are not worth a word; more would be lost in a whole number of hours. [min] */
const HOURS_ARE_EXACT_WITHIN = 10

/** Counted from the time that is told, so that both agree. */
function beforeText(setBy: string, precipitation: NightSummary['precipitation']): string {
  if (!precipitation) return ''
  const minutes = (Date.parse(precipitation.startsAt) - doneBy(setBy).getTime()) / MINUTE_MILLIS
  if (minutes < 0) return ''
  if (minutes < 90) return `, ${durationText(Math.floor(minutes / 10) * 10)} before ${precipitation.kind}`
  const hours = Math.floor(minutes / 60)
  const more = minutes - hours * 60 > HOURS_ARE_EXACT_WITHIN ? 'more than ' : ''
  return `, ${more}${countText(hours)} ${hours === 1 ? 'hour' : 'hours'} before ${precipitation.kind}`
}
