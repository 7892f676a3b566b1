// The log in words: what an entry says, when, and what came of a flood.
import { formatInTimeZone } from 'date-fns-tz'
import { tonightDate } from '@/lib/advice/night'
import { isLate } from '@/lib/advice/settle-night'
import { localDateOf, zoneOffsetMinutes } from '@/lib/advice/zoned-time'
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import type { EntryView, LogKind, Outcome } from '@/lib/schemas/log-choices'
import { dayText } from './night-label'
import type { WordOptions } from './options'
import { capitalised, iceText, layerText, numberText, temperatureText, waterText } from './quantities'
import { clockText } from './times'

const HALF_DAY_MILLIS = 12 * HOUR_MILLIS
/** From here on cubic metres are read more easily. [L] */
const MANY_LITRES = 2000

export const KIND_WORDS: Record<LogKind, string> = {
  flood: 'Flood',
  fill: 'Fill',
  scrape: 'Scrape',
  clear: 'Clear snow',
  repair: 'Repair',
  reading: 'Measure',
  thaw: 'Thaw',
  note: 'Note',
}

export const OUTCOME_WORDS: Record<Outcome, string> = { set: 'Set', wet: 'Still wet', spoiled: 'Spoiled' }

export const WATER_KIND_WORDS: Record<NonNullable<EntryView['waterKind']>, string> = {
  'cold-tap': 'cold tap',
  'hot-tap': 'hot tap',
  hydrant: 'hydrant',
  tanker: 'tanker',
}

/** Ice is as safe as its thinnest place, and clear ice carries what white ice does not. */
export const READING_HINT = 'The thinnest of several holes, clear ice only.'

/** Litres, or cubic metres when there are many; gallons for those who read gallons. */
export function muchWaterText(litres: number, words: WordOptions): string {
  if (words.units.water === 'gal' || litres < MANY_LITRES) return waterText(litres, words)
  return `${numberText(litres / 1000, 1, words)} m³`
}

/** "3 mm, 310 L, cold tap"; "8.9 cm"; empty for what has no figures. */
export function entryFacts(entry: EntryView, words: WordOptions): string {
  const { layerMm, waterL, waterKind, thicknessMm } = entry
  const parts = [
    layerMm === null ? '' : layerText(layerMm, words),
    waterL === null ? '' : muchWaterText(waterL, words),
    waterKind === null ? '' : WATER_KIND_WORDS[waterKind],
    thicknessMm === null ? '' : iceText(thicknessMm, words),
  ]
  return parts.filter(Boolean).join(', ')
}

/** "Flood, 3 mm, 310 L, cold tap at 6 °C, 8:02 pm. Two low spots by the gate." */
export function entrySentence(entry: EntryView, words: WordOptions): string {
  const { waterTemperatureC } = entry
  const warmth = waterTemperatureC === null ? '' : ` at ${temperatureText(waterTemperatureC, words)}`
  const facts = `${entryFacts(entry, words)}${warmth}`
  const what = `${KIND_WORDS[entry.kind]}${facts ? `, ${facts}` : ''}, ${entryTime(entry.happenedAt, entry.nightDate, words)}.`
  return [what, outcomeText(entry, words), entry.note].filter(Boolean).join(' ')
}

/** What was said of a flood, what came of it, and what the model had for a reading. */
export function entryRemark(entry: EntryView, words: WordOptions): string {
  if (entry.kind === 'reading') return readingRemark(entry, words)
  if (entry.kind !== 'flood') return ''
  const said = entry.saidSetByAt ? `Said: set by ${clockText(entry.saidSetByAt, words)}.` : ''
  const came = outcomeText(entry, words) || 'Nobody has said yet how it set.'
  return [said, came].filter(Boolean).join(' ')
}

function readingRemark({ thicknessMm, modelThicknessMm }: EntryView, words: WordOptions): string {
  if (thicknessMm === null || modelThicknessMm === null) return ''
  return `The model had ${iceText(modelThicknessMm, words)}; it now follows the measure.`
}

function outcomeText({ outcome, outcomeAt }: EntryView, words: WordOptions): string {
  if (!outcome || !outcomeAt) return ''
  const at = clockText(outcomeAt, words)
  if (outcome === 'set') return `It was set at ${at}.`
  return outcome === 'wet' ? `It was still wet at ${at}.` : `It was found spoiled at ${at}.`
}

/**
 * Whether a flood came as it was said. Found set long after, it may have been set in time: that says nothing, and null.
 */
export function floodResult({ outcome, outcomeAt, saidSetByAt }: EntryView): 'kept' | 'broken' | null {
  if (!outcome || !outcomeAt || !saidSetByAt) return null
  if (outcome === 'spoiled') return 'broken'
  if (isLate(outcomeAt, saidSetByAt)) return outcome === 'wet' ? 'broken' : null
  return outcome === 'set' ? 'kept' : null
}

/** "9:12 pm"; "Wed 1:30 am" past midnight; with the zone's letters in an hour that the clock shows twice. */
export function entryTime(at: string, nightDate: string, words: WordOptions): string {
  const millis = Date.parse(at)
  const isNextDay = localDateOf(millis, words.timeZone) !== nightDate
  const day = isNextDay ? `${formatInTimeZone(millis, words.timeZone, 'EEE')} ` : ''
  return `${day}${clockText(at, words)}${isDoubled(millis, words.timeZone) ? ` ${zoneLetters(millis, words)}` : ''}`
}

function isDoubled(millis: number, timeZone: string): boolean {
  const offset = zoneOffsetMinutes(millis, timeZone)
  const before = zoneOffsetMinutes(millis - HALF_DAY_MILLIS, timeZone)
  const after = zoneOffsetMinutes(millis + HALF_DAY_MILLIS, timeZone)
  const setBackMillis = (before - after) * MINUTE_MILLIS
  if (setBackMillis <= 0) return false
  const twin = offset === before ? millis + setBackMillis : millis - setBackMillis
  return zoneOffsetMinutes(twin, timeZone) !== offset
}

function zoneLetters(millis: number, { locale, timeZone }: WordOptions): string {
  const parts = new Intl.DateTimeFormat(`${locale}-CA`, { timeZone, timeZoneName: 'short' }).formatToParts(millis)
  return parts.find(({ type }) => type === 'timeZoneName')?.value ?? ''
}

/** "Tonight, Tue 12 January"; "Sun 10 January" */
export function nightHeading(nightDate: string, now: Date, words: WordOptions): string {
  const day = dayText(nightDate)
  return nightDate === tonightDate(now, words.timeZone) ? `Tonight, ${day}` : day
}

/** For who finds an entry changed under their hands: who did it, when, and what it says now. */
export function changedSentence(
  change: { by: string | null; at: Date; entry: EntryView },
  now: Date,
  words: WordOptions,
): string {
  const who = change.by ?? 'Somebody'
  const isToday = localDateOf(change.at.getTime(), words.timeZone) === localDateOf(now.getTime(), words.timeZone)
  const day = isToday ? '' : `${formatInTimeZone(change.at, words.timeZone, 'd MMMM')} at `
  const when = `${isToday ? 'at ' : 'on '}${day}${clockText(change.at, words)}`
  if (change.entry.isDeleted) return `${who} deleted this ${when}. Bring it back first, then change it.`
  return `${who} changed this ${when}: ${capitalised(entrySentence(change.entry, words))}`
}
