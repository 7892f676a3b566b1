// Desirability: ramps by hand, and the fatal factor of the geometric mean.
import fc from 'fast-check'
import { expect, test } from 'vitest'
import { overallDesirability, rampDesirability } from '@/lib/advice/desirability'

test.each([
  [-20, { one: -17, zero: -22 }, 0.4], // two of the five degrees from 0
  [-17, { one: -17, zero: -22 }, 1],
  [-30, { one: -17, zero: -22 }, 0],
  [3, { one: 0, zero: 12 }, 0.75],
  [99, { one: 12, zero: 0 }, 1],
])('%d on %o is %d', (value, ramp, expected) => {
  expect(rampDesirability(value, ramp)).toBeCloseTo(expected, 12)
})

test('the overall value is the weighted geometric mean', () => {
  // (0.25^2 · 1^1 · 0.5^1)^(1/4) = (0.03125)^0.25
  const overall = overallDesirability({ a: 0.25, b: 1, c: 0.5 }, { a: 2, b: 1, c: 1 })
  expect(overall).toBeCloseTo(Math.sqrt(Math.sqrt(0.03125)), 12)
})

test('one fatal factor is fatal, and the mean lies between the least and the most', () => {
  const share = fc.double({ min: 0, max: 1, noNaN: true })
  fc.assert(
    fc.property(share, share, share, (a, b, c) => {
      const overall = overallDesirability({ a, b, c }, { a: 1, b: 2, c: 3 })
      if (Math.min(a, b, c) === 0) expect(overall).toBe(0)
      else {
        expect(overall).toBeGreaterThanOrEqual(Math.min(a, b, c) - 1e-12)
        expect(overall).toBeLessThanOrEqual(Math.max(a, b, c) + 1e-12)
      }
    }),
  )
})
