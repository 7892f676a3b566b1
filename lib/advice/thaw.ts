// Thaw spells: a day or more in which no hour is good for flooding and the sheet loses ice.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { THAW } from './thresholds'
import { toIso } from './zoned-time'
import type { Thaw } from './types'

/** An hour as the search for thaws sees it. */
export interface ThawHour {
  startMillis: number
  /** Whether the ice would take a flood, whoever is at home. */
  isGood: boolean
  isKnown: boolean
  /** At the end of the hour. [mm] */
  thicknessMm: number
}

/**
 * Finds thaws. Within each run of hours without a good one, the thaw is the part from the first loss of ice to the
 * last.
 *
 * @param hours In order of time, without gaps.
 * @param startThicknessMm Ice at the start of the first hour. [mm]
 * @returns Thaws in order, each of at least THAW.leastHours with a loss of at least THAW.leastLossMm. [mm]
 *
 * Source: THAW in thresholds.ts; ours.
 */
export function findThaws(hours: readonly ThawHour[], startThicknessMm: number): Thaw[] {
  const thaws: Thaw[] = []
  let from = 0
  for (let index = 0; index <= hours.length; index += 1) {
    const hour = hours[index]
    if (hour && !hour.isGood && hour.isKnown) continue
    const thaw = thawWithin(hours, from, index, startThicknessMm)
    if (thaw) thaws.push(thaw)
    from = index + 1
  }
  return thaws
}

function thawWithin(hours: readonly ThawHour[], from: number, to: number, startThicknessMm: number): Thaw | null {
  // No spell this short is a thaw, and most stretches are.
  if (to - from < THAW.leastHours) return null
  let first = from
  while (first < to && lossMm(hours, first, startThicknessMm) <= THAW.losingMmPerH) first += 1
  let last = to - 1
  while (last >= first && lossMm(hours, last, startThicknessMm) <= THAW.losingMmPerH) last -= 1
  if (last < first || last + 1 - first < THAW.leastHours) return null
  const beforeMm = thicknessBefore(hours, first, startThicknessMm)
  let leastMm = beforeMm
  for (let index = first; index <= last; index += 1) leastMm = Math.min(leastMm, (hours[index] as ThawHour).thicknessMm)
  const lostMm = beforeMm - leastMm
  if (lostMm < THAW.leastLossMm) return null
  return {
    startsAt: toIso((hours[first] as ThawHour).startMillis),
    endsAt: toIso((hours[last] as ThawHour).startMillis + HOUR_MILLIS),
    lossMm: Math.round(lostMm * 10) / 10,
  }
}

function thicknessBefore(hours: readonly ThawHour[], index: number, startThicknessMm: number): number {
  return index === 0 ? startThicknessMm : (hours[index - 1] as ThawHour).thicknessMm
}

function lossMm(hours: readonly ThawHour[], index: number, startThicknessMm: number): number {
  return thicknessBefore(hours, index, startThicknessMm) - (hours[index] as ThawHour).thicknessMm
}
