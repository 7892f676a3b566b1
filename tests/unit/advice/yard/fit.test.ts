// The parts of the estimate: reading off between worked-out yards, and the fit against plain trying of all yards.
import { describe, expect, test } from 'vitest'
import { expectedIn, expectedInAny } from '@/lib/advice/yard/expected'
import { PRIOR_SD } from '@/lib/advice/yard/figures'
import { fitYard } from '@/lib/advice/yard/fit'
import { holdReport } from '@/lib/advice/yard/misfit'
import type { LayerReport, Yard, YardReport } from '@/lib/advice/yard/types'
import type { NewSheet } from '@/lib/physics/sheet'
import { seeded } from '../../../support/random-weather'
import { inventedNights, PLACE, PRIOR, reportAfter } from '../../../support/yard-reports'

const NIGHTS = inventedNights(20, 12)
const pick = seeded(21)
const hold = (reports: readonly YardReport[]) => reports.map((report) => holdReport(report, PLACE)!)

test('a set time read off between yards is within 5 % of the one worked out, in the middle within 1 %', () => {
  const errors = NIGHTS.flatMap((night) => {
    const report = reportAfter(night, 120)
    const readOff = expectedInAny(report, PLACE)!
    return Array.from({ length: 6 }, () => {
      const yard = { shelter: pick(0, 1), skyView: pick(0.3, 1) }
      return Math.abs(readOff(yard) / expectedIn(yard, report, PLACE)! - 1)
    })
  }).sort((a, b) => a - b)
  expect(errors[Math.floor(errors.length / 2)]).toBeLessThan(0.01)
  expect(errors[Math.floor(errors.length * 0.95)]).toBeLessThan(0.05)
})

test('no yard on a fine grid fits reports and prior better than the fit', () => {
  const yard = { shelter: 0.3, skyView: 0.6 }
  const scattered = (night: (typeof NIGHTS)[number]) =>
    expectedIn(yard, reportAfter(night, 120), PLACE)! * pick(0.7, 1.4)
  const reports = hold(NIGHTS.map((night) => reportAfter(night, Math.min(1700, scattered(night)))))
  const badness = (yard: Yard) =>
    reports.reduce((sum, { misfit }) => sum + misfit(yard) ** 2, 0) +
    ((yard.shelter - PRIOR.shelter) / PRIOR_SD.shelter) ** 2 +
    ((yard.skyView - PRIOR.skyView) / PRIOR_SD.skyView) ** 2
  let best = Infinity
  for (let shelter = 0; shelter <= 100; shelter += 1)
    for (let skyView = 0; skyView <= 100; skyView += 1)
      best = Math.min(best, badness({ shelter: shelter / 100, skyView: skyView / 100 }))
  expect(badness(fitYard(reports, PRIOR))).toBeLessThan(best + 0.02)
})

describe('one-sided reports', () => {
  const expected = NIGHTS.map((night) => expectedInAny(reportAfter(night, 120), PLACE)!(PRIOR))
  const told = (share: number, kind: LayerReport['kind']) =>
    hold(NIGHTS.map((night, index) => reportAfter(night, expected[index]! * share, kind)))

  test('wet when it should be wet, or set when it should be set, says nothing', () => {
    for (const reports of [told(0.5, 'wet'), told(1.6, 'set_before')]) {
      const fitted = fitYard(reports, PRIOR)
      expect(fitted.shelter).toBeCloseTo(PRIOR.shelter, 6)
      expect(fitted.skyView).toBeCloseTo(PRIOR.skyView, 6)
    }
  })
  test('still wet past its time speaks for a stiller, narrower yard; set early for an opener one', () => {
    const slow = fitYard(told(1.5, 'wet'), PRIOR)
    const fast = fitYard(told(0.7, 'set_before'), PRIOR)
    expect(slow.shelter).toBeLessThan(PRIOR.shelter)
    expect(slow.skyView).toBeLessThan(PRIOR.skyView)
    expect(fast.shelter + fast.skyView).toBeGreaterThan(PRIOR.shelter + PRIOR.skyView)
  })
})

describe('a drilled hole', () => {
  const [night] = NIGHTS
  const drilled = (sheet: NewSheet, poured: YardReport['poured'], thicknessMm: number): YardReport => {
    return { kind: 'drilled', hours: night!.hours, sheet, poured, at: night!.hours.at(-1)!.time, thicknessMm }
  }
  const onLiner: NewSheet = { thicknessMm: 100, temperatureC: -3, snowCoverCm: 0, base: 'liner' }
  const floating: NewSheet = { ...onLiner, thicknessMm: 60, unfrozenBelowMm: 300 }

  test('on a liner grows by what was poured and says next to nothing', () => {
    const poured = [0, 8, 16].map((hour) => ({ at: night!.hours[hour]!.time, layerMm: 5, temperatureC: 6 }))
    const report = drilled(onLiner, poured, 130)
    // Three layers of 5 mm of water are 16.4 mm of ice (917 kg/m³); a night takes or brings a millimetre of vapour at most.
    expect(Math.abs(expectedIn(PRIOR, report, PLACE)! - 116.4)).toBeLessThan(1)
    const fitted = fitYard(hold([report]), PRIOR)
    expect(Math.abs(fitted.shelter - PRIOR.shelter)).toBeLessThan(0.02)
    expect(Math.abs(fitted.skyView - PRIOR.skyView)).toBeLessThan(0.02)
  })
  test('over water speaks for an opener yard when thicker than expected, for a stiller one when thinner', () => {
    const expectedMm = expectedIn(PRIOR, drilled(floating, [], 60), PLACE)!
    const openness = (mm: number) => {
      const fitted = fitYard(hold([drilled(floating, [], expectedMm + mm)]), PRIOR)
      return fitted.shelter + fitted.skyView
    }
    expect(openness(8)).toBeGreaterThan(PRIOR.shelter + PRIOR.skyView + 0.01)
    expect(openness(-8)).toBeLessThan(PRIOR.shelter + PRIOR.skyView - 0.01)
  })
})
