// What must hold for every judgement, whatever the weather and the rink.
import fc from 'fast-check'
import { expect, test, vi } from 'vitest'
import { judge } from '@/lib/advice/judge'
import { summariseNight } from '@/lib/advice/night-summary'
import type { JudgeInput, Judgement, ScoredHour } from '@/lib/advice/types'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { REASON_CODES, reasonText } from '@/lib/words/reasons'
import { plainWords } from '@/lib/words/options'
import { verdictSentence } from '@/lib/words/night'
import { inputOf, randomHours, randomInput } from '../../support/advice-weather'

// Sixty judgements of two days each, on a machine that may be busy.
vi.setConfig({ testTimeout: 120_000 })

const words = plainWords('America/Toronto')
/** Shrinking two days of weather takes minutes and tells little: the seed of a failure is enough. */
const quiet = { numRuns: 60, endOnFailure: true }

function everyNumber(value: unknown, visit: (number: number) => void): void {
  if (typeof value === 'number') visit(value)
  else if (value !== null && typeof value === 'object') Object.values(value).forEach((one) => everyNumber(one, visit))
}

/** Hours whose weather matters between two instants, whole hours at both ends. */
function hoursBetween(input: JudgeInput, from: string, to: string) {
  return input.hours.filter((hour) => {
    const start = Date.parse(hour.time)
    return start + HOUR_MILLIS > Date.parse(from) && start < Date.parse(to)
  })
}

test('scores stay in 0-100, add up, and no number is NaN', () => {
  fc.assert(
    fc.property(randomInput(40), (input) => {
      const judgement = judge(input, { runs: 2 })
      let odd = 0
      everyNumber(judgement, (number) => (odd += Number.isFinite(number) ? 0 : 1))
      expect(odd).toBe(0)
      for (const { scores, reasons } of judgement.hours) {
        const all = [...Object.values(scores), ...reasons.map((reason) => 100 * reason.factor)]
        expect(all.filter((one) => one < 0 || one > 100)).toEqual([])
        expect(scores.hold).toBe(100 - Math.max(scores.fill, scores.flood))
        const factors = reasons.map((reason) => reason.factor)
        expect(factors).toEqual([...factors].sort((a, b) => a - b))
      }
    }),
    quiet,
  )
})

test('nothing is advised on missing data', () => {
  fc.assert(
    fc.property(randomInput(40), (input) => {
      const judgement = judge(input, { runs: 0 })
      for (const hour of judgement.hours) if (!hour.isKnown) expect(hour.verdict).toBe('hold')
      for (const hour of judgement.hours) {
        if (hour.verdict !== 'flood') continue
        const untilSet = judgement.hours.filter((one) => one.time >= hour.time && one.time < (hour.setsAt ?? ''))
        expect(hour.setsAt).not.toBeNull()
        expect(untilSet.every((one) => one.isKnown)).toBe(true)
      }
    }),
    quiet,
  )
})

test('no flood window, and no pass, overlaps more than a trace of precipitation before it is set', () => {
  const wetMm = (input: JudgeInput, from: string, to: string) =>
    hoursBetween(input, from, to).reduce((sum, hour) => sum + (hour.precipitationMm ?? 0), 0)
  fc.assert(
    fc.property(randomInput(40), (input) => {
      const { windows, plan, hours } = judge(input, { runs: 0 })
      for (const window of windows.filter((one) => one.kind === 'flood')) {
        expect(wetMm(input, window.latestStartAt, window.setBy)).toBeLessThanOrEqual(0.1)
        const starts = hours.filter((hour) => hour.time >= window.startsAt && hour.time < window.endsAt)
        for (const hour of starts) expect(wetMm(input, hour.time, hour.setsAt ?? '')).toBeLessThanOrEqual(0.1)
      }
      for (const pass of plan.passes) expect(wetMm(input, pass.startsAt, pass.setBy)).toBeLessThanOrEqual(0.1)
    }),
    quiet,
  )
})

test('the same input gives the same judgement, perturbed runs included, and the input is left as it was', () => {
  fc.assert(
    fc.property(randomInput(30), (input) => {
      const before = structuredClone(input)
      const first = judge(input)
      expect(judge(structuredClone(input))).toEqual(first)
      expect(input).toEqual(before)
    }),
    { numRuns: 15, endOnFailure: true },
  )
})

test('every reason and every night has words', () => {
  fc.assert(
    fc.property(randomInput(40), (input) => {
      const judgement = judge(input, { runs: 0 })
      const reasons = judgement.hours.flatMap((hour) => hour.reasons)
      expect(reasons.filter((reason) => !REASON_CODES.includes(reason.code))).toEqual([])
      const odd = /NaN|undefined|null|Infinity|^\s|[^.]$/
      expect(reasons.map((reason) => reasonText(reason, words)).filter((text) => odd.test(text))).toEqual([])
      const now = new Date(input.now)
      const summary = summariseNight(judgement, { nightDate: '2027-01-12', now, timeZone: 'America/Toronto' })
      expect(verdictSentence(summary, now, words)).toMatch(/\.$/)
    }),
    quiet,
  )
})

const setMillis = (judgement: Judgement, hour: number) => {
  const setsAt = (judgement.hours[hour] as ScoredHour).setsAt
  return setsAt === null ? Number.POSITIVE_INFINITY : Date.parse(setsAt)
}

test('a thicker or a warmer layer never sets sooner', () => {
  fc.assert(
    fc.property(randomHours(24), fc.integer({ min: 0, max: 10 }), (hours, index) => {
      const plain = inputOf(hours)
      const thick = inputOf(hours, { water: { ...plain.water, layerMm: 5 } })
      const warm = inputOf(hours, { water: { ...plain.water, temperatureC: 30 } })
      const sets = setMillis(judge(plain, { runs: 0 }), index)
      expect(setMillis(judge(thick, { runs: 0 }), index)).toBeGreaterThanOrEqual(sets)
      expect(setMillis(judge(warm, { runs: 0 }), index)).toBeGreaterThanOrEqual(sets)
    }),
    quiet,
  )
})

const milder = (hour: JudgeInput['hours'][number], change: number) =>
  hour.airTemperatureC === null || hour.dewPointC === null
    ? hour
    : { ...hour, airTemperatureC: hour.airTemperatureC + change, dewPointC: hour.dewPointC + change }

test('colder, drier or clearer weather never sets a layer later on the same sheet, nor more wind below -2 °C', () => {
  // Measured longwave and sunshine would outweigh cloud and are absent; precipitation and gaps have tests of their own.
  const nights = randomHours(24).map((hours) =>
    hours.map((hour) => ({ ...hour, precipitationMm: hour.precipitationMm === null ? null : 0, shortwaveWm2: 0 })),
  )
  fc.assert(
    fc.property(nights, (hours) => {
      // Poured at once: weather that came before the pour changes the sheet below it, in one night of 300 by a minute or more.
      const setsWith = (changed: JudgeInput['hours']) => setMillis(judge(inputOf(changed), { runs: 0 }), 0)
      const sets = setsWith(hours)
      expect(setsWith(hours.map((hour) => milder(hour, -2)))).toBeLessThanOrEqual(sets)
      expect(
        setsWith(hours.map((hour) => ({ ...hour, dewPointC: hour.dewPointC === null ? null : hour.dewPointC - 2 }))),
      ).toBeLessThanOrEqual(sets)
      expect(
        setsWith(hours.map((hour) => ({ ...hour, cloudCover: hour.cloudCover === null ? null : hour.cloudCover / 2 }))),
      ).toBeLessThanOrEqual(sets)
      const cold = hours.map((hour) => milder(hour, Math.min(0, -2.1 - (hour.airTemperatureC ?? 0))))
      const windy = cold.map((hour) => ({
        ...hour,
        windSpeedMps: hour.windSpeedMps === null ? null : hour.windSpeedMps + 1,
      }))
      expect(setsWith(windy)).toBeLessThanOrEqual(setsWith(cold))
    }),
    quiet,
  )
})
