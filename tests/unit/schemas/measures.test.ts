// The ranges that a form names: short figures, all of them accepted.
import { expect, test } from 'vitest'
import { fitsMeasure, MEASURES, parseNumber, rangeMessage, scaleOf, type MeasureName } from '@/lib/schemas/measures'
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
