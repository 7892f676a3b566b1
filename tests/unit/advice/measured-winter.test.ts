// The worth of the advice on one measured winter; all three are in `npm run bench:advice`.
import { beforeAll, describe, expect, test } from 'vitest'
import {
  followAdvice,
  followHourly,
  scoreChoices,
  thermometerRule,
  trueNights,
  type BenchNight,
} from '../../support/advice-bench'
import { hasMeasuredWinters } from '../../support/measured-winters'

const MINUTES = 60_000

describe.skipIf(!hasMeasuredWinters)('on the winter of 2013-14 (needs the measured winters in ../shared/data)', () => {
  let nights: BenchNight[] = []
  beforeAll(() => {
    nights = trueNights('2013-12-01', '2014-02-28')
    for (const night of nights) night.isGood()
  }, 10 * MINUTES)

  test(
    'with perfect forecasts nearly every good night is used and next to no flood is spoiled',
    () => {
      const { used, spoiled } = scoreChoices(followAdvice(nights, null))
      expect(used).toBeGreaterThanOrEqual(0.95)
      expect(spoiled).toBeLessThanOrEqual(0.02)
    },
    5 * MINUTES,
  )

  test(
    'with degraded forecasts, told once at 15:30, good nights are used and few floods are spoiled',
    () => {
      const { used, spoiled } = scoreChoices([1, 2, 3].flatMap((seed) => followAdvice(nights, seed)))
      expect(used).toBeGreaterThanOrEqual(0.85)
      expect(spoiled).toBeLessThanOrEqual(0.05)
    },
    5 * MINUTES,
  )

  test(
    'with degraded forecasts, read anew each hour, most are, and few floods are spoiled',
    () => {
      const { used, spoiled } = scoreChoices([1, 2].flatMap((seed) => followHourly(nights, seed)))
      expect(used).toBeGreaterThanOrEqual(0.85)
      expect(spoiled).toBeLessThanOrEqual(0.05)
    },
    5 * MINUTES,
  )

  test('the thermometer rule of -4 °C uses fewer', () => {
    expect(scoreChoices(thermometerRule(nights, -4)).used).toBeLessThan(0.85)
  })
})
