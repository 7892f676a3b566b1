// The yard teaches the model: site factors from what the keeper reported, kept only when they serve unseen nights better.
import { LEAST_GAIN_SE, LEAST_NIGHTS, MOST_REPORTS, PRIOR_SD } from './figures'
import { checkLesson } from './check-lesson'
import { fitYard, yardSd } from './fit'
import { holdReport, type HeldReport } from './misfit'
import type { LearnedYard, Yard, YardLesson } from './types'

/**
 * Learns a yard's site factors from reports.
 *
 * Each night is foretold from the other nights' reports; what is learned is used only when those foretellings beat the
 * prior's by more than their scatter. Otherwise the prior stands, exactly.
 *
 * @param lesson Place, prior and reports; ranges at the fields.
 * @returns Factors to use [0-1] and what was learned.
 * @throws RangeError for a value out of range, an unreadable time, a report before its pour or a pour outside its
 *   hours.
 *
 * Source: maximum a posteriori estimate with a normal prior; leave-one-out cross-validation after Stone (1974), from
 * memory, by whole nights. Known limit: a layer that is always deeper or warmer than told is learned as part of the
 * yard.
 */
export function learnYard(lesson: YardLesson): LearnedYard {
  checkLesson(lesson)
  const { prior } = lesson
  const newest = [...lesson.reports].sort((a, b) => Date.parse(a.at) - Date.parse(b.at)).slice(-MOST_REPORTS)
  const reports = newest.map((report) => holdReport(report, lesson)).filter((held) => held !== null)
  const nights = new Set(reports.map((report) => report.night)).size
  const counts = { reportsUsed: reports.length, reportsLeftOut: lesson.reports.length - reports.length, nights, prior }
  const kept = { ...prior, ...counts, isLearned: false, sd: { ...PRIOR_SD }, ledBy: 'neither' as const }
  if (nights < LEAST_NIGHTS) return { ...kept, keptBecause: 'too_few_nights', setTimeError: null }
  const foretold = reports.map((report) =>
    fitYard(
      reports.filter((other) => other.night !== report.night),
      prior,
    ),
  )
  const setTimeError = compareSetTimes(reports, foretold, prior)
  if (
    !isBetter(reports, foretold, prior) ||
    (setTimeError && setTimeError.afterMinutes >= setTimeError.beforeMinutes)
  ) {
    return { ...kept, keptBecause: 'no_better', setTimeError }
  }
  const yard = fitYard(reports, prior)
  const sd = yardSd(reports, prior, yard)
  return { ...yard, ...counts, isLearned: true, keptBecause: null, sd, setTimeError, ledBy: leader(yard, prior) }
}

/** Whether the foretellings' gain over the prior, night by night, stands out of its scatter. */
function isBetter(reports: HeldReport[], foretold: Yard[], prior: Yard): boolean {
  const gainOf = new Map<number, number>()
  for (const [index, { night, misfit }] of reports.entries()) {
    const gain = misfit(prior) ** 2 - misfit(foretold[index]!) ** 2
    gainOf.set(night, (gainOf.get(night) ?? 0) + gain)
  }
  const gains = [...gainOf.values()]
  const mean = meanOf(gains)
  const variance = gains.reduce((sum, gain) => sum + (gain - mean) ** 2, 0) / (gains.length - 1)
  return mean > LEAST_GAIN_SE * Math.sqrt(variance / gains.length)
}

function compareSetTimes(reports: HeldReport[], foretold: Yard[], prior: Yard): LearnedYard['setTimeError'] {
  const before = reports.flatMap(({ minutesOff }) => (minutesOff ? [minutesOff(prior)] : []))
  if (before.length === 0) return null
  const after = reports.flatMap(({ minutesOff }, index) => (minutesOff ? [minutesOff(foretold[index]!)] : []))
  return { reports: before.length, beforeMinutes: meanOf(before), afterMinutes: meanOf(after) }
}

function leader(yard: Yard, prior: Yard): LearnedYard['ledBy'] {
  const wind = Math.abs(yard.shelter - prior.shelter) / PRIOR_SD.shelter
  const sky = Math.abs(yard.skyView - prior.skyView) / PRIOR_SD.skyView
  return wind >= sky ? 'wind' : 'sky'
}

const meanOf = (values: number[]) => values.reduce((sum, one) => sum + one, 0) / values.length
