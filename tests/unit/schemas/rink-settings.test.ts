// Settings forms: what may be typed, what is made of it, and what is refused at which field.
import { describe, expect, test } from 'vitest'
import type { z } from 'zod'
import { faultsByField } from '@/lib/http/errors-by-field'
import {
  changeHoursSchema,
  changeIceSchema,
  changeLimitsSchema,
  changePlaceSchema,
  changeYardSchema,
  deleteRinkSchema,
  saveWaterSchema,
} from '@/lib/schemas/rink-settings'

const rinkId = '4f9e2f4e-51de-4d52-9a7a-3f6c4f8de001'
const faultsOf = (schema: z.ZodType, fields: Record<string, string>) => {
  const { error } = schema.safeParse({ rinkId, units: 'metric', ...fields })
  return Object.keys(error ? faultsByField(error) : {})
}

const PLACE = { name: 'Birch Lane', latitude: '49.9', longitude: '-94.5' }
const YARD = { length: '12', width: '8', base: 'liner', shelter: 'open', sky: 'wide' }

describe('place and clock', () => {
  test('a clock counts only when it was chosen', () => {
    const zone = { timeZone: 'America/Toronto' }
    expect(changePlaceSchema.parse({ rinkId, ...PLACE, ...zone, zoneBy: 'place' }).timeZone).toBeUndefined()
    expect(changePlaceSchema.parse({ rinkId, ...PLACE, ...zone, zoneBy: 'keeper' }).timeZone).toBe('America/Toronto')
  })

  test.each([
    ['a chosen clock without a zone', { zoneBy: 'keeper' }, 'timeZone'],
    ['a zone on the moon', { zoneBy: 'keeper', timeZone: 'Moon/Tranquility' }, 'timeZone'],
    ['a rink without a name', { name: ' ' }, 'name'],
    ['a place off the globe', { latitude: '91' }, 'latitude'],
    ['a forged rink', { rinkId: '1 or 1=1' }, 'rinkId'],
  ])('%s is refused at the field', (_what, fields: Record<string, string>, field) => {
    expect(faultsOf(changePlaceSchema, { ...PLACE, ...fields })).toEqual([field])
  })
})

describe('the yard', () => {
  test('corners in inches, grids in centimetres, level ground as nothing', () => {
    const corners = { floorKind: 'corners', cornerNorth: '0', cornerEast: '4', cornerSouth: '10', cornerWest: '' }
    const parsed = changeYardSchema.parse({ rinkId, units: 'C,in,L,m,km/h', ...YARD, ...corners }).floor
    // 4 in = 0.1016 m, 10 in = 0.254 m.
    expect(parsed && 'cornersM' in parsed ? parsed.cornersM.map((depth) => Number(depth.toFixed(6))) : []).toEqual([
      0, 0.1016, 0.254, 0,
    ])
    const grid = { floorKind: 'grid', grid: '0 5 12,5\n\n2 6 20\n' }
    expect(changeYardSchema.parse({ rinkId, units: 'metric', ...YARD, ...grid }).floor).toEqual({
      depthsM: [
        [0, 0.05, 0.125],
        [0.02, 0.06, 0.2],
      ],
    })
    expect(changeYardSchema.parse({ rinkId, units: 'metric', ...YARD }).floor).toBeNull()
  })

  test.each([
    ['a corner 101 cm down', { floorKind: 'corners', cornerSouth: '101' }, 'cornerSouth'],
    ['words in a grid', { floorKind: 'grid', grid: '0 deep\n1 2' }, 'grid'],
    ['rows that differ', { floorKind: 'grid', grid: '0 1\n1 2 3' }, 'grid'],
    ['a single row', { floorKind: 'grid', grid: '0 1 2' }, 'grid'],
    ['an empty grid', { floorKind: 'grid', grid: '' }, 'grid'],
    ['boards of 2 m', { boardHeight: '200' }, 'boardHeight'],
    ['a sky that was not offered', { sky: 'all' }, 'sky'],
    ['an empty length', { length: '' }, 'length'],
  ])('%s is refused at the field', (_what, fields: Record<string, string>, field) => {
    expect(faultsOf(changeYardSchema, { ...YARD, ...fields })).toEqual([field])
  })
})

describe('hours', () => {
  const row = (n: number, from: string, to: string, ...on: number[]): Record<string, string> => ({
    [`from${n}`]: from,
    [`to${n}`]: to,
    ...Object.fromEntries(on.map((day) => [`day${n}_${day}`, 'on'])),
  })

  test('rows without times are left out, the others keep their days', () => {
    const fields = { ...row(1, '17:00', '01:00', 1, 3), ...row(2, '', '', 1, 2), ...row(4, '06:00', '07:30', 6, 7) }
    expect(changeHoursSchema.parse({ rinkId, maxPasses: '2', ...fields }).available).toEqual([
      { from: '17:00', to: '01:00', weekdays: [1, 3] },
      { from: '06:00', to: '07:30', weekdays: [6, 7] },
    ])
  })

  test.each<[string, Record<string, string>, string[]]>([
    ['no hours at all are refused', {}, ['from1']],
    ['hours without an end are refused', row(1, '17:00', '', 1), ['to1']],
    ['hours on no day are refused', row(1, '17:00', '18:00'), ['from1']],
    ['hours that end when they start are refused', row(1, '17:00', '17:00', 1), ['to1']],
    ['25 o’clock is refused', row(1, '25:00', '17:00', 1), ['from1']],
    [
      'Monday’s night may not run into Tuesday’s early hours',
      { ...row(1, '22:00', '02:00', 1), ...row(2, '01:00', '03:00', 2) },
      ['from2'],
    ],
    [
      'nor Sunday’s night into Monday’s early hours',
      { ...row(1, '22:00', '02:00', 7), ...row(2, '01:00', '03:00', 1) },
      ['from2'],
    ],
    ['hours that touch are fine', { ...row(1, '22:00', '01:00', 1), ...row(2, '01:00', '03:00', 2) }, []],
    ['so are the same hours on other days', { ...row(1, '17:00', '20:00', 1), ...row(2, '17:00', '20:00', 2) }, []],
  ])('%s', (_what, fields, expected) => {
    expect(faultsOf(changeHoursSchema, { maxPasses: '3', ...fields })).toEqual(expected)
  })
})

test('limits may be left open; what is typed is read in the person’s units', () => {
  const open = { windLimit: '', windChillLimit: '', carriesSkater: '10' }
  expect(changeLimitsSchema.parse({ rinkId, units: 'metric', ...open })).toEqual({
    rinkId,
    windLimitMps: null,
    windChillLimitC: null,
    carriesSkaterMm: 100,
  })
  // 36 km/h = 10 m/s; -13 °F = -25 °C; 4 in = 101.6 mm.
  const mixed = { units: 'F,in,L,m,km/h', windLimit: '36', windChillLimit: '-13', carriesSkater: '4' }
  const limits = changeLimitsSchema.parse({ rinkId, ...mixed })
  expect(limits.windLimitMps).toBeCloseTo(10, 9)
  expect(limits.windChillLimitC).toBeCloseTo(-25, 9)
  expect(limits.carriesSkaterMm).toBeCloseTo(101.6, 9)
  expect(faultsOf(changeLimitsSchema, { ...open, carriesSkater: '5' })).toEqual(['carriesSkater'])
  expect(faultsOf(changeLimitsSchema, { ...open, windChillLimit: '3' })).toEqual(['windChillLimit'])
})

test('ice that was not measured stays unsaid; skaters on no ice are refused', () => {
  expect(changeIceSchema.parse({ rinkId, units: 'metric', phase: 'skating', iceThickness: '' })).toEqual({
    rinkId,
    phase: 'skating',
    iceThicknessMm: undefined,
  })
  expect(faultsOf(changeIceSchema, { phase: 'skating', iceThickness: '0' })).toEqual(['iceThickness'])
})

test('a thickness without ice, and a floor measured otherwise, are not judged', () => {
  expect(faultsOf(changeIceSchema, { phase: 'waiting', iceThickness: '-3' })).toEqual([])
  expect(faultsOf(changeIceSchema, { phase: 'thaw', iceThickness: '-3' })).toEqual(['iceThickness'])
  const yard = { length: '10', width: '10', sky: 'yard', cornerNorth: 'deep', grid: 'x'.repeat(4001) }
  expect(faultsOf(changeYardSchema, { ...yard, floorKind: 'level' })).toEqual([])
  expect(faultsOf(changeYardSchema, { ...yard, floorKind: 'corners' })).toEqual(['cornerNorth'])
  expect(faultsOf(changeYardSchema, { ...yard, floorKind: 'grid' })).toEqual(['grid'])
})

test('a source of water is one of the known kinds, and a source of this site', () => {
  expect(faultsOf(saveWaterSchema, { waterKind: 'lake' })).toEqual(['waterKind'])
  expect(faultsOf(saveWaterSchema, { sourceId: 'mine' })).toEqual(['sourceId'])
  expect(faultsOf(saveWaterSchema, { bucketSize: '12' })).toEqual(['bucketSeconds'])
})

test('a rink is deleted by its name', () => {
  expect(faultsOf(deleteRinkSchema, { name: '' })).toEqual(['name'])
})
