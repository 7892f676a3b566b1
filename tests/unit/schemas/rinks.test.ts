// The set-up form: what may be typed, what is made of it, and what is refused at which field.
import { expect, test } from 'vitest'
import { faultsByField } from '@/lib/http/errors-by-field'
import { setUpRinkSchema } from '@/lib/schemas/rinks'

const MUSTS = {
  units: 'metric',
  creationKey: '4f9e2f4e-51de-4d52-9a7a-3f6c4f8de001',
  name: 'Birch Lane',
  latitude: '45.9',
  longitude: '-77.3',
}

const faultsOf = (fields: Record<string, string>) => {
  const { error } = setUpRinkSchema.safeParse({ ...MUSTS, ...fields })
  return error ? faultsByField(error) : {}
}

test('name and place are the only musts', () => {
  const { rink, told } = setUpRinkSchema.parse(MUSTS)
  expect(rink).toMatchObject({
    name: 'Birch Lane',
    latitudeDeg: 45.9,
    longitudeDeg: -77.3,
    lengthM: 10,
    widthM: 10,
    base: 'liner',
    phase: 'waiting',
    available: [{ from: '17:00', to: '23:00', weekdays: [1, 2, 3, 4, 5, 6, 7] }],
    maxPasses: 3,
  })
  expect(told).toEqual({ tellAt: '15:30', wantsPush: false, wantsEmail: false })
})

test('without them, every missing one is named at once', () => {
  const { error } = setUpRinkSchema.safeParse({ units: 'metric', creationKey: MUSTS.creationKey })
  expect(Object.keys(error ? faultsByField(error) : {}).sort()).toEqual(['latitude', 'longitude', 'name'])
})

test.each([
  ['a bucket of 12 L in 30 s', { bucketSize: '12', bucketSeconds: '30' }, 24],
  ['a flow that was typed, whatever the bucket says', { flow: '18', bucketSize: '12', bucketSeconds: '30' }, 18],
  ['a decimal comma', { flow: '18,5' }, 18.5],
  // 5 US gal = 18.92705892 L; in 60 s.
  ['a five-gallon bucket in a minute', { units: 'imperial', bucketSize: '5', bucketSeconds: '60' }, 18.92705892],
])('%s gives the flow', (_what, fields, flowLPerMin) => {
  expect(setUpRinkSchema.parse({ ...MUSTS, ...fields }).rink.water.flowLPerMin).toBeCloseTo(flowLPerMin, 8)
})

test.each([
  ['45.9 N', '77.3 W', 45.9, -77.3],
  ['45,9', '−77,3', 45.9, -77.3],
  ['33.9° S', '18.4° e', -33.9, 18.4],
  ['-90', '180', -90, 180],
])('%s, %s is read as a position', (latitude, longitude, latitudeDeg, longitudeDeg) => {
  expect(setUpRinkSchema.parse({ ...MUSTS, latitude, longitude }).rink).toMatchObject({ latitudeDeg, longitudeDeg })
})

test.each([
  ['latitude beyond the pole', { latitude: '90.01' }, 'latitude'],
  ['longitude off the globe', { longitude: '-180.5' }, 'longitude'],
  ['east where north belongs', { latitude: '45 E' }, 'latitude'],
  ['words for a latitude', { latitude: 'north' }, 'latitude'],
  ['infinity', { latitude: 'Infinity' }, 'latitude'],
  ['a size of zero', { length: '0' }, 'length'],
  ['a rink of 101 m', { width: '101' }, 'width'],
  ['a rink of 329 ft', { units: 'imperial', width: '329' }, 'width'],
  ['an empty length', { length: '' }, 'length'],
  ['a flow of 0', { flow: '0' }, 'flow'],
  ['a flow of 500 L/min', { flow: '500' }, 'flow'],
  ['a flow of 106 US gal/min', { units: 'imperial', flow: '106' }, 'flow'],
  ['a bucket that fills in no time', { bucketSize: '12', bucketSeconds: '0' }, 'bucketSeconds'],
  ['a bucket that fills in half a second', { bucketSize: '2', bucketSeconds: '0.5' }, 'bucketSeconds'],
  ['a bucket that fills too fast for any hose', { bucketSize: '100', bucketSeconds: '1' }, 'bucketSeconds'],
  ['a bucket without a time', { bucketSize: '12' }, 'bucketSeconds'],
  ['a time without a bucket', { bucketSeconds: '30' }, 'bucketSize'],
  ['boiling water', { waterTemperature: '96' }, 'waterTemperature'],
  ['a pass of 31 mm', { layer: '31' }, 'layer'],
  ['seven passes', { maxPasses: '7' }, 'maxPasses'],
  ['hours that end where they start', { hoursFrom: '17:00', hoursTo: '17:00' }, 'hoursTo'],
  ['25 o’clock', { hoursFrom: '25:00' }, 'hoursFrom'],
  ['more hours without an end', { moreHoursFrom: '05:00' }, 'moreHoursTo'],
  [
    'hours that overlap over midnight',
    { hoursTo: '01:00', moreHoursFrom: '00:30', moreHoursTo: '02:00' },
    'moreHoursFrom',
  ],
  ['skaters on no ice', { phase: 'skating', iceThickness: '0' }, 'iceThickness'],
  ['skaters on ice nobody measured', { phase: 'skating' }, 'iceThickness'],
  ['a zone on the moon', { timeZone: 'Moon/Tranquility' }, 'timeZone'],
  ['an offset for a zone', { timeZone: '+05:00' }, 'timeZone'],
  ['a name of blanks', { name: '   ' }, 'name'],
  ['a name of 61 letters', { name: 'x'.repeat(61) }, 'name'],
  ['a line break in the name', { name: 'Birch\nLane' }, 'name'],
  ['a sky that was not offered', { sky: '0.5' }, 'sky'],
  ['units that were not offered', { units: 'cubits' }, 'units'],
  ['a key that is none', { creationKey: 'again' }, 'creationKey'],
])('%s is refused at the field', (_what, fields: Record<string, string>, field) => {
  expect(Object.keys(faultsOf(fields))).toEqual([field])
})

test('what the form hides is not judged', () => {
  const { rink } = setUpRinkSchema.parse({
    ...MUSTS,
    phase: 'waiting',
    iceThickness: '-3',
    base: 'ground',
    fillDepth: '?',
  })
  expect(rink.iceThicknessMm).toBeUndefined()
  expect(Object.keys(faultsOf({ phase: 'freezing', iceThickness: '-3' }))).toEqual(['iceThickness'])
  expect(Object.keys(faultsOf({ fillDepth: '?' }))).toEqual(['fillDepth'])
})

test('the limits themselves are accepted', () => {
  expect(
    faultsOf({ length: '2', width: '100', flow: '400', layer: '0.5', waterTemperature: '95', fillDepth: '100' }),
  ).toEqual({})
  expect(
    faultsOf({ units: 'imperial', length: '6.6', width: '328', flow: '105.6', layer: '0.02', fillDepth: '39.37' }),
  ).toEqual({})
})

test('hours that touch do not overlap', () => {
  expect(faultsOf({ hoursTo: '01:00', moreHoursFrom: '01:00', moreHoursTo: '02:00' })).toEqual({})
})
