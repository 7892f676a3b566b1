// Units by country, until somebody chooses their own.
import { expect, test } from 'vitest'
import { usualUnits } from '@/lib/places/usual-units'
import { IMPERIAL, METRIC, unitsCode, unitsOfCode } from '@/lib/units'

test.each([
  ['US', IMPERIAL],
  ['CA', METRIC],
  ['NO', { ...METRIC, wind: 'm/s' }],
  ['GB', { ...METRIC, wind: 'mph' }],
  ['', METRIC],
])('people in %s', (country, units) => {
  expect(usualUnits(country)).toEqual(units)
})

test('a code says all five, and nothing else is one', () => {
  expect(unitsCode(IMPERIAL)).toBe('F,in,gal,ft,mph')
  expect(unitsOfCode('C,in,L,ft,m/s')).toEqual({ temperature: 'C', ice: 'in', water: 'L', size: 'ft', wind: 'm/s' })
  expect(unitsOfCode('metric')).toEqual(METRIC)
  for (const code of ['', 'cubits', 'toString', 'C,cm,L,m', 'C,cm,L,m,km/h,', 'in,C,L,m,km/h']) {
    expect(unitsOfCode(code)).toBeUndefined()
  }
})
