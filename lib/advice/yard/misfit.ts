// How badly a yard fits a report, in standard deviations, soft towards wild ones.
import { DAY_MILLIS, HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { reportSheet } from '@/lib/physics/sheet'
import { DRILLED, MOMENT_MINUTES, SET_TIME_LOG_SD, WILD_BEYOND_SD } from './figures'
import { expectedInAny, startingSheet, type Place } from './expected'
import type { LayerReport, Yard, YardReport } from './types'

/** A report ready to be held against any yard. */
export interface HeldReport {
  /** From solar noon to solar noon: reports of one night share its weather and stand or fall together. */
  night: number
  /** Softened misfit. [standard deviations] */
  misfit: (yard: Yard) => number
  /** How far off the set time is; null for what is not a report of kind `set`. [min] */
  minutesOff: ((yard: Yard) => number) | null
}

/**
 * Readies a report; null when weather is missing.
 *
 * @param report Report; ranges at the fields.
 * @param place Latitude and longitude. [°]
 * @returns Night and misfit [standard deviations], or null.
 *
 * Source: normal errors with the standard deviations of figures.ts.
 */
export function holdReport(report: YardReport, place: Place): HeldReport | null {
  const expected = expectedInAny(report, place)
  if (!expected) return null
  const night = nightOf(report, place)
  if (report.kind === 'drilled') return { night, misfit: drilledMisfit(report, expected), minutesOff: null }
  const observed = observedMinutes(report)
  const moment = report.uncertaintyMinutes ?? MOMENT_MINUTES[report.kind]
  const sd = Math.hypot(SET_TIME_LOG_SD, moment / observed)
  return {
    night,
    misfit: (yard) => soften(oneSided(report.kind, Math.log(expected(yard) / observed)) / sd),
    minutesOff: report.kind === 'set' ? (yard) => Math.abs(expected(yard) - observed) : null,
  }
}

/** A layer seen wet says nothing against yards in which it sets later still; one found set, nothing against earlier. */
function oneSided(kind: LayerReport['kind'], logRatio: number): number {
  if (kind === 'wet') return Math.min(0, logRatio)
  return kind === 'set_before' ? Math.max(0, logRatio) : logRatio
}

function drilledMisfit(
  report: YardReport & { kind: 'drilled' },
  expected: (yard: Yard) => number,
): HeldReport['misfit'] {
  const growthMm = report.thicknessMm - reportSheet(startingSheet(report)).thicknessMm
  const sdMm = Math.hypot(DRILLED.readingSdMm, DRILLED.growthSd * growthMm)
  return (yard) => soften((expected(yard) - report.thicknessMm) / sdMm)
}

function observedMinutes(report: LayerReport): number {
  return (Date.parse(report.at) - Date.parse(report.poured.at(-1)!.at)) / MINUTE_MILLIS
}

function nightOf(report: YardReport, { longitudeDeg }: Place): number {
  const atMillis = Date.parse(report.kind === 'drilled' ? report.at : report.poured.at(-1)!.at)
  const solarMillis = atMillis + (longitudeDeg / 15) * HOUR_MILLIS
  return Math.floor((solarMillis - DAY_MILLIS / 2) / DAY_MILLIS)
}

/**
 * Square-summed, this is the loss named after Cauchy: quadratic near 0, hardly rising far out, so that a slip of the pen
 * neither pulls the fit nor hides what the other nights gain. Source: Holland & Welsch (1977), from memory.
 */
function soften(deviations: number): number {
  const scaled = deviations / WILD_BEYOND_SD
  return Math.sign(scaled) * WILD_BEYOND_SD * Math.sqrt(Math.log1p(scaled * scaled))
}
