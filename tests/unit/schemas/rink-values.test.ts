// What a rink form shows is what it would store: there and back changes nothing a person could see.
import { expect, test } from 'vitest'
import {
  hoursValues,
  iceValues,
  limitsValues,
  placeValues,
  waterValues,
  yardValues,
} from '@/components/rinks/form/settings-values'
import { inUnits, newRinkValues } from '@/components/rinks/form/values'
import {
  changeHoursSchema,
  changeIceSchema,
  changeLimitsSchema,
  changePlaceSchema,
  changeYardSchema,
  saveWaterSchema,
} from '@/lib/schemas/rink-settings'
import { setUpRinkSchema } from '@/lib/schemas/rinks'
import type { RinkSettings } from '@/lib/services/rink-settings'
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

const STORED: RinkSettings = {
  id: KEY,
  settingsVersion: 4,
  name: 'Birch Lane',
  placeName: 'Upper Ottawa Valley',
  latitudeDeg: 45.9,
  longitudeDeg: -77.3,
  gridCellId: KEY,
  cell: { latitudeDeg: 45.9, longitudeDeg: -77.3 },
  timeZone: 'America/Winnipeg',
  timeZoneBy: 'keeper',
  lengthM: 12,
  widthM: 8,
  base: 'liner',
  phase: 'skating',
  shelter: 'tight',
  skyView: 0.72,
  maxPasses: 2,
  floor: { cornersM: [0, 0.12, 0.28, 0.15] },
  boardHeightMm: 400,
  carriesSkaterMm: 120,
  windLimitMps: 10,
  windChillLimitC: -25,
  water: { kind: 'cold-tap', flowLPerMin: 24, temperatureC: 6, layerMm: 3, fillDepthMm: 100 },
  sources: [
    { id: KEY, isDefault: true, kind: 'cold-tap', flowLPerMin: 24, temperatureC: 6, layerMm: 3, fillDepthMm: 100 },
  ],
  available: [
    { from: '17:00', to: '01:00', weekdays: [1, 2, 3, 4, 5] },
    { from: '08:00', to: '11:00', weekdays: [6, 7] },
  ],
}

/** To what is shown: tenths of a foot are three centimetres. */
const near = (value: number | null | undefined, stored: number, share = 0.02) =>
  expect(Math.abs((value ?? NaN) - stored)).toBeLessThan(Math.abs(stored) * share + 1e-9)

test.each(ALL)('saving a rink’s settings untouched in %s units keeps them, to what is shown', (_name, units) => {
  const yard = changeYardSchema.parse(yardValues(STORED, units))
  // A share of sky that no picture stands for is left as it was.
  expect(yard).toMatchObject({ base: 'liner', shelter: 'tight', skyView: undefined })
  near(yard.lengthM, 12)
  near(yard.boardHeightMm, 400)
  const corners = yard.floor && 'cornersM' in yard.floor ? yard.floor.cornersM : []
  expect(corners.map((depth) => Number(depth.toFixed(2)))).toEqual([0, 0.12, 0.28, 0.15])
  const limits = changeLimitsSchema.parse(limitsValues(STORED, units))
  near(limits.carriesSkaterMm, 120)
  near(limits.windLimitMps, 10, 0.05)
  near(limits.windChillLimitC, -25)
  const { water, sourceId } = saveWaterSchema.parse(waterValues(STORED, units, KEY))
  expect(sourceId).toBe(KEY)
  near(water.flowLPerMin, 24)
  near(water.layerMm, 3)
  expect(changeIceSchema.parse(iceValues(STORED, units))).toEqual({
    rinkId: KEY,
    phase: 'skating',
    iceThicknessMm: undefined,
  })
})

test('hours, name, place and a chosen clock come back as they are', () => {
  expect(changeHoursSchema.parse(hoursValues(STORED))).toEqual({
    rinkId: KEY,
    maxPasses: 2,
    available: STORED.available,
  })
  expect(changePlaceSchema.parse(placeValues(STORED))).toMatchObject({
    name: 'Birch Lane',
    placeName: 'Upper Ottawa Valley',
    latitudeDeg: 45.9,
    timeZone: 'America/Winnipeg',
  })
})

test('a new source starts with what the usual one pours, and flow and warmth left open', () => {
  const { water, sourceId } = saveWaterSchema.parse(waterValues(STORED, METRIC, undefined))
  expect(sourceId).toBeUndefined()
  // What a hot tap usually gives.
  expect(water).toEqual({ kind: 'hot-tap', flowLPerMin: 12, temperatureC: 45, layerMm: 3, fillDepthMm: 100 })
})
