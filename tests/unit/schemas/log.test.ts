// What the log's forms accept, and the words at the field for what they do not.
import { describe, expect, test } from 'vitest'
import { answerSetSchema, writeEntrySchema } from '@/lib/schemas/log'
import { logExportSchema, logQuerySchema } from '@/lib/schemas/log-query'
import { IMPERIAL, METRIC, unitsCode } from '@/lib/units'
import { faultsByField } from '@/lib/http/errors-by-field'

const RINK = '6a2f4a0e-3c1b-4a7c-9d55-0f1e2d3c4b01'
const form = (changes: Record<string, string> = {}) => ({
  rinkId: RINK,
  entryKey: RINK,
  units: unitsCode(METRIC),
  kind: 'flood',
  ...changes,
})
const faults = (changes: Record<string, string>) => {
  const result = writeEntrySchema.safeParse(form(changes))
  return result.success ? {} : faultsByField(result.error)
}

test('empty fields are left to the service', () => {
  expect(writeEntrySchema.parse(form({ layer: '', water: ' ', note: '' }))).toMatchObject({
    layerMm: undefined,
    waterL: undefined,
    note: '',
  })
})

test('units are the person’s', () => {
  const imperial = { units: unitsCode(IMPERIAL), layer: '0.12', water: '80', waterTemperature: '43' }
  const entry = writeEntrySchema.parse(form(imperial))
  // 0.12 in are 3.048 mm, 80 US gal are 302.8 L, 43 °F are 6.11 °C.
  expect(entry.layerMm).toBeCloseTo(3.048, 6)
  expect(entry.waterL).toBeCloseTo(302.833, 2)
  expect(entry.waterTemperatureC).toBeCloseTo(6.111, 2)
})

test('what belongs to another kind is left out', () => {
  const entry = writeEntrySchema.parse(form({ kind: 'scrape', layer: '3', water: '300', thickness: '8' }))
  expect(entry).toMatchObject({ layerMm: undefined, waterL: undefined, thicknessMm: undefined })
})

describe('words at the field', () => {
  test.each([
    [{ layer: 'thin' }, { layer: 'Type a number here.' }],
    [{ layer: '200' }, { layer: 'Between 0.1 and 100 mm.' }],
    [{ kind: 'reading' }, { thickness: 'How thick is the ice?' }],
    [{ kind: 'reading', thickness: '-2' }, { thickness: 'Between 0 and 200 cm.' }],
    [{ kind: 'fill' }, { water: 'How much water went in?' }],
    [{ kind: 'note', note: '  ' }, { note: 'Write what there is to note.' }],
    [{ note: 'x'.repeat(501) }, { note: 'At most 500 characters.' }],
    [{ onDate: '2027-01-12' }, { atTime: 'At what time?' }],
    [{ atTime: '25:00' }, { atTime: 'Type a time, like 17:00.' }],
    [{ minutesAgo: '-5' }, { minutesAgo: 'A number of minutes, or give date and time.' }],
    [{ kind: 'dance' }, { kind: 'Choose what was done.' }],
    [{ waterKind: 'lake' }, { waterKind: 'Choose where the water came from.' }],
    [{ units: 'cubits' }, { units: 'Choose your units.' }],
  ])('%j', (changes, expected) => {
    expect(faults(changes)).toEqual(expected)
  })
})

test('notes keep their lines', () => {
  expect(writeEntrySchema.parse(form({ note: ' one\r\ntwo ' })).note).toBe('one\ntwo')
})

test('answers are one of a few', () => {
  const answer = { rinkId: RINK, entryId: RINK, version: '2', outcome: 'set', atTime: '' }
  expect(answerSetSchema.parse(answer)).toMatchObject({ version: 2, atTime: undefined })
  expect(answerSetSchema.safeParse({ ...answer, outcome: 'perhaps' }).success).toBe(false)
})

test('addresses: a filter that cannot be read is none, a file format must be known', () => {
  expect(logQuerySchema.parse({ kind: ['flood', 'note'], person: 'x', from: '2027-13-01' })).toMatchObject({
    kind: 'flood',
    person: undefined,
    from: undefined,
  })
  expect(logExportSchema.safeParse({ format: 'xlsx' }).success).toBe(false)
  expect(logExportSchema.parse({ format: 'csv', season: '2026' })).toEqual({ format: 'csv', season: 2026 })
})
