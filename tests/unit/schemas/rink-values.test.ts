// What a rink form shows is what it would store: there and back changes nothing a person could see.
import { expect, test } from 'vitest'
import { inUnits, newRinkValues, rinkValues } from '@/components/rinks/form/values'
import { changeRinkSchema, setUpRinkSchema } from '@/lib/schemas/rinks'
import { IMPERIAL, METRIC, unitsCode, type Units } from '@/lib/units'

const KEY = '4f9e2f4e-51de-4d52-9a7a-3f6c4f8de001'
const PLACE = { name: 'Birch Lane', latitude: '45.9', longitude: '-77.3' }

const MIXED: Units = { temperature: 'C', ice: 'in', water: 'gal', size: 'm', wind: 'm/s' }
const ALL = [
  ['metric', METRIC],
  ['US customary', IMPERIAL],
  ['mixed', MIXED],
] as const

test.each(ALL)('the starting values in %s units are accepted as they stand', (_name, units) => {
  const { rink } = setUpRinkSchema.parse({ ...newRinkValues(units, KEY), ...PLACE })
  // 33 ft are 10.06 m, 4 in are 101.6 mm.
  expect(Math.abs(rink.lengthM - 10)).toBeLessThan(0.1)
  expect(Math.abs(rink.water.fillDepthMm - 100)).toBeLessThan(2)
  expect(Math.abs(rink.water.layerMm - 3)).toBeLessThan(0.1)
})

test('starting values stay round when the units are changed, and come back', () => {
  const metric = { ...newRinkValues(METRIC, KEY), ...PLACE }
  expect(inUnits(metric, IMPERIAL)).toMatchObject({ units: unitsCode(IMPERIAL), length: '33', fillDepth: '4' })
  expect(inUnits(inUnits(metric, IMPERIAL), METRIC)).toEqual(metric)
})

test('what was typed is rewritten in the other units; what is no number is left for mending', () => {
  const typed = { ...newRinkValues(METRIC, KEY), length: '12', flow: '25', waterTemperature: '6', width: 'wide' }
  // 12 m = 39.4 ft; 25 L = 6.6 US gal; 6 °C = 43 °F.
  expect(inUnits(typed, IMPERIAL)).toMatchObject({
    length: '39.4',
    flow: '6.6',
    waterTemperature: '43',
    width: 'wide',
  })
})

test('only what is read in other units is rewritten', () => {
  const typed = { ...newRinkValues(METRIC, KEY), length: '12', flow: '25', waterTemperature: '6' }
  expect(inUnits(typed, MIXED)).toMatchObject({ length: '12', flow: '6.6', waterTemperature: '6', fillDepth: '4' })
})

test.each(ALL)('saving a rink’s settings untouched in %s units keeps them, to what is shown', (_name, units) => {
  const more = {
    flow: '24',
    iceThickness: '9',
    phase: 'skating',
    sky: 'yard',
    moreHoursFrom: '05:00',
    moreHoursTo: '06:30',
  }
  const { rink } = setUpRinkSchema.parse({
    ...newRinkValues(METRIC, KEY),
    ...PLACE,
    ...more,
    timeZone: 'America/Toronto',
  })
  const again = changeRinkSchema.parse(rinkValues({ ...rink, id: KEY }, units)).rink
  const shown = rinkValues({ ...again, id: KEY }, units)
  expect(shown).toEqual(rinkValues({ ...rink, id: KEY }, units))
  expect(again.skyView).toBe(rink.skyView)
})
