// Learning a yard's factors. The truth behind the reports is the explicit column's, never the model's own.
import fc from 'fast-check'
import { beforeAll, describe, expect, test, vi } from 'vitest'
import { learnYard } from '@/lib/advice/yard/learn'
import type { LayerReport, Yard, YardReport } from '@/lib/advice/yard/types'
import { inventedNights, PLACE, PRIOR, reportAfter, setReports, trueMinutes } from '../../../support/yard-reports'

const learn = (reports: readonly YardReport[], prior: Yard = PRIOR) => learnYard({ ...PLACE, prior, reports })
const factors = ({ shelter, skyView }: Yard) => ({ shelter, skyView })

// Explicit columns take their time.
vi.setConfig({ testTimeout: 60_000, hookTimeout: 60_000 })

const OTHER_YARDS: { name: string; yard: Yard }[] = [
  { name: 'behind a high fence', yard: { shelter: 0.3, skyView: 0.8 } },
  { name: 'between houses', yard: { shelter: 0.4, skyView: 0.65 } },
  { name: 'out in a field', yard: { shelter: 0.9, skyView: 0.95 } },
]

describe('without enough to go by, the prior stands exactly', () => {
  test('no reports', () => {
    const learned = learn([])
    expect(factors(learned)).toEqual(PRIOR)
    expect(learned).toMatchObject({ isLearned: false, keptBecause: 'too_few_nights', reportsUsed: 0, ledBy: 'neither' })
  })
  test('three nights, however clear', () => {
    const learned = learn(setReports(inventedNights(1, 3), { shelter: 0.1, skyView: 0.4 }))
    expect(learned).toMatchObject({ ...PRIOR, isLearned: false, keptBecause: 'too_few_nights', nights: 3 })
  })
  test('a dozen reports of one night', () => {
    const [night] = inventedNights(2, 1)
    const reports = Array.from({ length: 12 }, (_, index) => reportAfter(night!, 300 + 10 * index))
    expect(learn(reports)).toMatchObject({ ...PRIOR, isLearned: false, nights: 1 })
  })
  test('a yard that was set right', () => {
    expect(learn(setReports(inventedNights(3, 12), PRIOR))).toMatchObject({
      ...PRIOR,
      isLearned: false,
      keptBecause: 'no_better',
    })
  })
})

describe.each(OTHER_YARDS)('a yard $name', ({ yard }) => {
  const nights = inventedNights(4, 24)
  let reports: LayerReport[] = []
  let learned = learn([])
  beforeAll(() => {
    reports = setReports(nights, yard)
    learned = learn(reports)
  })

  test('is found from 24 scattered reports, within twice the error that is stated', () => {
    expect(learned.isLearned).toBe(true)
    expect(Math.abs(learned.shelter - yard.shelter)).toBeLessThan(2 * learned.sd.shelter)
    expect(Math.abs(learned.skyView - yard.skyView)).toBeLessThan(2 * learned.sd.skyView)
  })
  test('makes the set times of other nights come out nearer', () => {
    const { beforeMinutes, afterMinutes } = learned.setTimeError!
    expect(afterMinutes).toBeLessThan(0.75 * beforeMinutes)
  })
  test('is moved by one wild report by less than the error that is stated', () => {
    const wild = reportAfter(nights[5]!, 25 * 60)
    const misled = learn(reports.map((report) => (report.hours === wild.hours ? wild : report)))
    expect(misled).not.toEqual(learned)
    expect(Math.abs(misled.shelter - learned.shelter)).toBeLessThan(learned.sd.shelter)
    expect(Math.abs(misled.skyView - learned.skyView)).toBeLessThan(learned.sd.skyView)
  })
})

test('still nights say little of the wind, and the stated error says so', () => {
  const windy = inventedNights(6, 16)
  const still = windy.map((night) => ({
    ...night,
    hours: night.hours.map((hour) => ({ ...hour, windSpeedMps: 0.2 })),
  }))
  const yard = { shelter: 0.3, skyView: 0.5 }
  const inWind = learn(setReports(windy, yard))
  const inStillAir = learn(setReports(still, yard))
  expect([inWind.isLearned, inStillAir.isLearned]).toEqual([true, true])
  expect(inWind.sd.shelter).toBeLessThan(0.1)
  expect(inStillAir.sd.shelter).toBeGreaterThan(0.15)
  expect(inStillAir.ledBy).toBe('sky')
})

test('layers still wet and layers set before the first look teach as well', () => {
  const yard = { shelter: 0.2, skyView: 0.5 }
  const reports = inventedNights(7, 24).flatMap((night, index) => {
    const minutes = trueMinutes(night, yard)
    if (minutes === null) return []
    return [
      index % 2 === 0 ? reportAfter(night, minutes * 0.9, 'wet') : reportAfter(night, minutes * 1.1, 'set_before'),
    ]
  })
  const learned = learn(reports)
  expect(learned.isLearned).toBe(true)
  expect(learned.setTimeError).toBeNull()
  const distance = (from: Yard) => Math.hypot(from.shelter - yard.shelter, from.skyView - yard.skyView)
  expect(distance(learned)).toBeLessThan(0.7 * distance(PRIOR))
})

describe('whatever is reported', () => {
  const reports = fc.array(
    fc.record({
      night: fc.integer({ min: 0, max: 9 }),
      minutes: fc.integer({ min: 1, max: 28 * 60 }),
      kind: fc.constantFrom('set' as const, 'set_before' as const, 'wet' as const),
    }),
    { maxLength: 8 },
  )
  const priors = fc.record({
    shelter: fc.double({ min: 0, max: 1, noNaN: true }),
    skyView: fc.double({ min: 0, max: 1, noNaN: true }),
  })
  const nights = inventedNights(8, 10)

  test('the factors stay in their bounds, the same input gives the same answer, and nothing is known worse than before', () =>
    fc.assert(
      fc.property(reports, priors, (told, prior) => {
        const made = told.map(({ night, minutes, kind }) => reportAfter(nights[night]!, minutes, kind))
        const learned = learn(made, prior)
        for (const value of [learned.shelter, learned.skyView]) {
          expect(value).toBeGreaterThanOrEqual(0)
          expect(value).toBeLessThanOrEqual(1)
        }
        if (!learned.isLearned) expect(factors(learned)).toEqual(prior)
        expect(learned.sd.shelter).toBeLessThanOrEqual(0.18 + 1e-9)
        expect(learned.sd.skyView).toBeLessThanOrEqual(0.12 + 1e-9)
        expect(learn(made, prior)).toEqual(learned)
      }),
      { numRuns: 12, seed: 9 },
    ))
})

test('reports without their weather are left out', () => {
  const reports = setReports(inventedNights(10, 6), PRIOR)
  const gap = (report: LayerReport) => ({
    ...report,
    hours: report.hours.map((hour, index) => (index < 3 ? { ...hour, airTemperatureC: null } : hour)),
  })
  const learned = learn(reports.map((report, index) => (index === 0 ? gap(report) : report)))
  expect(learned).toMatchObject({ reportsUsed: reports.length - 1, reportsLeftOut: 1 })
})

test('thirty reports take less than a second of work', () => {
  const reports = setReports(inventedNights(11, 30), { shelter: 0.3, skyView: 0.5 })
  const before = process.cpuUsage()
  learn(reports)
  const { user, system } = process.cpuUsage(before)
  expect((user + system) / 1e6).toBeLessThan(1)
})

describe('bad input is refused', () => {
  const good = reportAfter(inventedNights(12, 1)[0]!, 120)
  const layer = good.poured[0]!
  const drilled = { ...good, kind: 'drilled' as const, thicknessMm: 120 }
  test.each<{ name: string; report: YardReport }>([
    { name: 'no hours', report: { ...good, hours: [] } },
    { name: 'an unreadable moment', report: { ...good, at: 'this morning' } },
    { name: 'a report before its pour', report: { ...good, at: good.hours[0]!.time } },
    { name: 'a report after the hours', report: { ...good, at: '2027-03-01T00:00:00Z' } },
    { name: 'no layer', report: { ...good, poured: [] } },
    { name: 'a pour before the hours', report: { ...good, poured: [{ ...layer, at: '2027-01-01T00:00:00Z' }] } },
    { name: 'a layer of nothing', report: { ...good, poured: [{ ...layer, layerMm: 0 }] } },
    { name: 'boiling off', report: { ...good, poured: [{ ...layer, temperatureC: 140 }] } },
    { name: 'no uncertainty', report: { ...good, uncertaintyMinutes: 0 } },
    { name: 'a hole of no depth', report: { ...drilled, thicknessMm: Number.NaN } },
    { name: 'a sheet that is none', report: { ...good, sheet: { state: { base: 'liner' } } } },
  ])('$name', ({ report }) => expect(() => learn([report])).toThrow(RangeError))

  test.each([
    { shelter: 1.2, skyView: 0.8 },
    { shelter: 0.5, skyView: Number.NaN },
  ])('a prior of $shelter and $skyView', (prior) => expect(() => learn([], prior)).toThrow(RangeError))
  test('a place off the globe', () =>
    expect(() => learnYard({ ...PLACE, latitudeDeg: 91, prior: PRIOR, reports: [] })).toThrow(RangeError))
})
