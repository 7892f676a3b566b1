// The fields of the building plan: read in the person's units, refused with words at the field.
import { describe, expect, test } from 'vitest'
import { buildPlanSchema } from '@/lib/schemas/build-plan'
import { IMPERIAL, METRIC, type Units } from '@/lib/units'
import { planForm } from '@/tests/support/plan-form'

const read = (changes: Record<string, string>, units: Units = METRIC) =>
  buildPlanSchema(units).safeParse(planForm(changes))
const faults = (changes: Record<string, string>) =>
  Object.fromEntries((read(changes).error?.issues ?? []).map(({ path, message }) => [path.join('.'), message]))

describe('what is read', () => {
  test('centimetres become metres, empty fields are left to the defaults', () => {
    expect(read({ leastDepth: '4', freeboard: '', boardHeight: '37' }).data).toMatchObject({
      leastDepthM: 0.04,
      boardHeightM: 0.37,
      waterPricePerM3: null,
      floor: null,
      flow: { lPerMin: 25 },
    })
  })

  test('feet, inches and gallons, with whole feet of liner', () => {
    const typed = { length: '33', leastDepth: '4', flow: '6.6', waterPrice: '10' }
    const plan = read({ ...typed, width: '33', freeboard: '2' }, IMPERIAL).data
    // By definition: a foot is 0.3048 m, an inch 25.4 mm, a US gallon 3.785411784 L.
    expect(plan?.lengthM).toBeCloseTo(10.0584, 6)
    expect(plan?.leastDepthM).toBeCloseTo(0.1016, 6)
    expect(plan?.flow).toEqual({ lPerMin: 6.6 * 3.785411784 })
    expect(plan?.waterPricePerM3).toBeCloseTo(10 / 3.785411784, 6)
    expect(plan?.linerStepM).toBe(0.3048)
  })

  test('a bucket that was timed counts before the flow', () => {
    expect(read({ bucketSize: '10', bucketSeconds: '24' }).data?.flow).toEqual({ bucketL: 10, bucketSeconds: 24 })
  })

  test('a grid of points row by row, empty ones at the string', () => {
    const grid = { floorKind: 'grid', rows: '2', columns: '3', 'point-1-2': '5', 'point-2-3': '12,5' }
    expect(read(grid).data?.floor).toEqual({
      depthsM: [
        [0, 0.05, 0],
        [0, 0, 0.125],
      ],
    })
  })
})

describe('what is refused', () => {
  test.each([
    [{ length: 'ten' }, { length: 'Type a number here.' }],
    [{ leastDepth: '0' }, { leastDepth: 'Between 1 and 100 cm.' }],
    [{ bucketSeconds: '20' }, { bucketSize: 'How big is the bucket?' }],
    [{ flow: '' }, { flow: 'Type the flow, or time a bucket.' }],
    [{ hoursInOneGo: '30' }, { hoursInOneGo: 'Between a quarter of an hour and 24 hours.' }],
    [{ floorKind: 'corners', cornerEast: 'deep', rows: '1' }, { cornerEast: 'Type a number here.' }],
    [{ floorKind: 'level', cornerEast: 'deep', rows: '1' }, {}],
    [{ floorKind: 'grid', rows: '1', columns: '3' }, { rows: 'At least 2.' }],
    [{ floorKind: 'grid', rows: '2', columns: '2', 'point-2-1': 'deep' }, { 'point-2-1': 'Type a number here.' }],
  ])('%j', (changes, expected) => {
    expect(faults(changes as Record<string, string>)).toEqual(expected)
  })
})
