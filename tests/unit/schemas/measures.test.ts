// The ranges that a form names: short figures, all of them accepted.
import { expect, test } from 'vitest'
import {
  fitsMeasure,
  fitted,
  MEASURES,
  parseNumber,
  rangeMessage,
  scaleOf,
  type MeasureName,
} from '@/lib/schemas/measures'
import { typed, unlessAsShown } from '@/lib/schemas/measures'
import { IMPERIAL, METRIC } from '@/lib/units'

test.each([
  // 50 and 1500 mm are 1.97 and 59.06 in; 0.5 and 30 mm 0.02 and 1.18 in; 1 and 400 L 0.26 and 105.7 gal.
  ['boardHeight', 'Between 2 and 59 in.'],
  ['layer', 'Between 0.02 and 1.1 in.'],
  ['fillDepth', 'Between 0.79 and 39 in.'],
  ['side', 'Between 6.6 and 328 ft.'],
  ['flow', 'Between 0.3 and 105 US gal/min.'],
] as const)('of %s in US units', (measure, expected) => {
  expect(rangeMessage(measure, IMPERIAL)).toBe(expected)
})

test.each(Object.keys(MEASURES) as MeasureName[])('both ends named for %s are accepted', (measure) => {
  for (const units of [METRIC, IMPERIAL]) {
    const ends = /^Between (\S+) and (\S+) /.exec(rangeMessage(measure, units))?.slice(1) ?? []
    expect(ends).toHaveLength(2)
    for (const end of ends) expect(fitsMeasure(measure, scaleOf(measure, units).toSi(parseNumber(end)!))).toBe(true)
  }
})

const siOf = (measure: MeasureName, units: typeof METRIC, text: string) =>
  scaleOf(measure, units).toSi(parseNumber(text) ?? NaN)

test.each(Object.keys(MEASURES) as MeasureName[])('%s: a limit is accepted as a form shows it', (measure) => {
  const { least, most } = MEASURES[measure]
  for (const units of [METRIC, IMPERIAL]) {
    for (const limit of [least, most]) {
      const shown = siOf(measure, units, typed(measure, units, limit))
      const taken = fitted(measure, units, shown) ?? NaN
      expect(taken).toBeGreaterThanOrEqual(least)
      expect(taken).toBeLessThanOrEqual(most)
    }
  }
})

test('what lies clearly beyond a limit is refused', () => {
  expect(fitted('leastDepth', IMPERIAL, siOf('leastDepth', IMPERIAL, '0.38'))).toBeUndefined()
  expect(fitted('side', METRIC, 100.1)).toBeUndefined()
  expect(fitted('flow', METRIC, NaN)).toBeUndefined()
})

// 3 mm are shown as 0.118 in, which would be 2.997 mm; 6 °C as 43 °F, which would be 6.1 °C.
test.each([
  ['pouredLayer', 3, '0.118', '0.12'],
  ['waterTemperature', 6, '43', '44'],
  ['iceThickness', 89, '3.5', '3.6'],
  ['pouredWater', 300, '79', '80'],
] as const)('%s: sent back as shown it stays, and moves with what was typed anew', (measure, stored, shown, anew) => {
  expect(typed(measure, IMPERIAL, stored)).toBe(shown)
  expect(unlessAsShown(measure, IMPERIAL, siOf(measure, IMPERIAL, shown), stored)).toBe(stored)
  const moved = siOf(measure, IMPERIAL, anew)
  expect(unlessAsShown(measure, IMPERIAL, moved, stored)).toBe(moved)
})
