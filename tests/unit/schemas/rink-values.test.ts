// What a rink form shows is what it would store: there and back changes nothing a person could see.
import { expect, test } from 'vitest'
import { inUnits, newRinkValues, rinkValues } from '@/components/rinks/form/values'
import { changeRinkSchema, setUpRinkSchema } from '@/lib/schemas/rinks'

const KEY = '4f9e2f4e-51de-4d52-9a7a-3f6c4f8de001'
const PLACE = { name: 'Birch Lane', latitude: '45.9', longitude: '-77.3' }

test.each(['metric', 'imperial'] as const)('the starting values in %s are accepted as they stand', (units) => {
  const { rink } = setUpRinkSchema.parse({ ...newRinkValues(units, KEY), ...PLACE })
  // 33 ft are 10.06 m, 4 in are 101.6 mm.
  expect(Math.abs(rink.lengthM - 10)).toBeLessThan(0.1)
  expect(Math.abs(rink.water.fillDepthMm - 100)).toBeLessThan(2)
  expect(Math.abs(rink.water.layerMm - 3)).toBeLessThan(0.1)
})

test('starting values stay round when the units are changed, and come back', () => {
  const metric = { ...newRinkValues('metric', KEY), ...PLACE }
  expect(inUnits(metric, 'imperial')).toMatchObject({ units: 'imperial', length: '33', fillDepth: '4' })
  expect(inUnits(inUnits(metric, 'imperial'), 'metric')).toEqual(metric)
})

test('what was typed is rewritten in the other units; what is no number is left for mending', () => {
  const typed = { ...newRinkValues('metric', KEY), length: '12', flow: '25', waterTemperature: '6', width: 'wide' }
  // 12 m = 39.4 ft; 25 L = 6.6 US gal; 6 °C = 43 °F.
  expect(inUnits(typed, 'imperial')).toMatchObject({
    length: '39.4',
    flow: '6.6',
    waterTemperature: '43',
    width: 'wide',
  })
})

test.each(['metric', 'imperial'] as const)(
  'saving a rink’s settings untouched in %s keeps them, to what is shown',
  (units) => {
    const more = {
      flow: '24',
      iceThickness: '9',
      phase: 'skating',
      sky: 'yard',
      moreHoursFrom: '05:00',
      moreHoursTo: '06:30',
    }
    const { rink } = setUpRinkSchema.parse({
      ...newRinkValues('metric', KEY),
      ...PLACE,
      ...more,
      timeZone: 'America/Toronto',
    })
    const again = changeRinkSchema.parse(rinkValues({ ...rink, id: KEY }, units)).rink
    const shown = rinkValues({ ...again, id: KEY }, units)
    expect(shown).toEqual(rinkValues({ ...rink, id: KEY }, units))
    expect(again.skyView).toBe(rink.skyView)
  },
)
