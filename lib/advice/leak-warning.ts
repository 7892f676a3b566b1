// Whether the level that was read falls, or rises less than the hose should make it.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { cornerDepthsM, floorExtremesM, type FloorGrid } from '@/lib/physics/floor'
import { levelOf, stageAt } from '@/lib/physics/stage'
import { FILLING } from './thresholds'
import type { Caution } from './types'

const MM_PER_M = 1000

/** A level as a keeper reads it. */
export type LevelReading =
  /** Water on a stick at the lowest point of the floor. */
  | { at: string; lowestDepthMm: number }
  /** Water on a stick at a corner, 0-3 in the order of the floor. */
  | { at: string; corner: 0 | 1 | 2 | 3; depthMm: number }
  /** Water surface below the string line. */
  | { at: string; belowLineMm: number }

export interface LeakQuestion {
  floor: FloorGrid
  readings: readonly LevelReading[]
  /** Water brought by the hose until an instant. [L] */
  pouredLBy: (atMillis: number) => number
  evaporationMmPerDay: number
}

/**
 * Water surface below the line, from a reading.
 *
 * @param floor Floor.
 * @param reading Distance below the line, or depth at a corner or the lowest place. [mm]
 * @returns Level below the line. [m]
 *
 * Source: geometry.
 */
export function levelOfReading(floor: FloorGrid, reading: LevelReading): number {
  if ('belowLineMm' in reading) return reading.belowLineMm / MM_PER_M
  if ('lowestDepthMm' in reading) return floorExtremesM(floor).lowestM - reading.lowestDepthMm / MM_PER_M
  return (cornerDepthsM(floor)[reading.corner] as number) - reading.depthMm / MM_PER_M
}

/**
 * Compares the latest reading with each one of the last day that is old enough for a rate: where should the level be
 * by now, and where is it?
 *
 * @param question Floor, readings [mm], water brought by an instant [L] and evaporation. [mm/d]
 * @returns 'level_falls' when less water stands than before, 'level_lags' when it rises less than the hose should make
 *   it, null when all is well within what readings, bucket test and evaporation allow.
 *
 * Source: balance of volume; tolerances in FILLING.
 */
export function leakWarning(question: LeakQuestion): Caution | null {
  const ascending = [...question.readings].sort((a, b) => Date.parse(a.at) - Date.parse(b.at))
  const latest = ascending.pop()
  if (!latest) return null
  const hoursBefore = ({ at }: LevelReading) => (Date.parse(latest.at) - Date.parse(at)) / HOUR_MILLIS
  const found = ascending
    .filter((earlier) => hoursBefore(earlier) >= FILLING.leastHoursBetweenReadings)
    .filter((earlier) => hoursBefore(earlier) <= FILLING.leakLookBackHours)
    .map((earlier) => compare(question, earlier, latest))
    .filter((one) => one.excessMm > 0)
    .sort((a, b) => b.excessMm - a.excessMm)
  return found[0]?.caution ?? null
}

function compare({ floor, pouredLBy, evaporationMmPerDay }: LeakQuestion, earlier: LevelReading, latest: LevelReading) {
  const fromMillis = Date.parse(earlier.at)
  const toMillis = Date.parse(latest.at)
  const hours = (toMillis - fromMillis) / HOUR_MILLIS
  const before = levelOfReading(floor, earlier)
  const after = levelOfReading(floor, latest)
  const volumeBeforeM3 = stageAt(floor, before).volumeM3
  const broughtM3 = (pouredLBy(toMillis) - pouredLBy(fromMillis)) / 1000
  const expected = levelOf(floor, volumeBeforeM3 + broughtM3) + ((evaporationMmPerDay / 24) * hours) / MM_PER_M
  const riseMm = (before - after) * MM_PER_M
  const expectedRiseMm = (before - expected) * MM_PER_M
  const shortfallMm = expectedRiseMm - riseMm
  const toleranceMm = FILLING.readingToleranceMm + FILLING.flowTolerance * Math.max(0, expectedRiseMm)
  const lostL = Math.max(0, volumeBeforeM3 + broughtM3 - stageAt(floor, after).volumeM3) * 1000
  const isFalling = riseMm < -FILLING.readingToleranceMm
  const values = { riseMm, expectedRiseMm, shortfallMm, hours, lostLPerHour: lostL / hours }
  const code = isFalling ? 'level_falls' : 'level_lags'
  return {
    excessMm: shortfallMm - toleranceMm,
    caution: { code, values: { ...values, since: earlier.at } } satisfies Caution,
  }
}
