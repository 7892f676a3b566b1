// Thin ice that floats keeps the person off; a sheet that lies on the floor is as good to stand on as the floor.
import { describe, expect, test } from 'vitest'
import { judge } from '@/lib/advice/judge'
import type { JudgeInput } from '@/lib/advice/types'
import { METRIC } from '@/lib/units'
import { reasonClause } from '@/lib/words/reasons'
import { inputOf, steadyHours } from '../../support/advice-weather'

const words = { timeZone: 'UTC', units: METRIC, clock: '24' as const, locale: 'en' }

/** What a clear night at -8 °C says at 8 pm of standing on a sheet. */
function standing(thicknessMm: number, fillDepthMm: number, rink: Partial<JudgeInput['rink']> = {}) {
  const usual = inputOf(steadyHours(72))
  const input = {
    ...usual,
    rink: { ...usual.rink, phase: 'freezing' as const, ...rink },
    water: { ...usual.water, fillDepthMm },
    sheet: { thicknessMm, temperatureC: -4, snowCoverCm: 0 },
  }
  const hour = judge(input, { runs: 0 }).hours[0]
  const reason = hour?.reasons.find(({ code }) => code === 'sheet_too_thin' || code === 'sheet_bears')
  return { code: reason?.code, factor: reason?.factor, verdict: hour?.verdict, says: reasonClause(reason!, words) }
}

describe('with no water under it', () => {
  // 20 mm of water make 20 × 999.8 / 916.7 = 21.8 mm of ice: at 22 mm nothing is left under the sheet.
  test.each(['liner', 'ground'] as const)('22 mm frozen to the floor on %s carries, and may be flooded', (base) => {
    const through = standing(22, 20, { base })
    expect(through).toMatchObject({ code: 'sheet_bears', factor: 1, verdict: 'flood' })
    expect(through.says).toBe(
      'no water should be left under the 2.2 cm of ice, so the floor carries you and the hose; drill to be sure',
    )
  })

  test('so does a lined sheet of 22 mm from 20 mm of water that is being skated on', () => {
    expect(standing(22, 20, { phase: 'skating' })).toMatchObject({ code: 'sheet_bears', verdict: 'flood' })
  })
})

describe('with water under it', () => {
  // Rule G01: Marsh Canada asks for 2 in, 51 mm, under a person; 22 mm is less than half of it.
  test.each(['liner', 'ground'] as const)('22 mm on 100 mm of water on %s are too thin', (base) => {
    const afloat = standing(22, 120, { base })
    expect(afloat).toMatchObject({ code: 'sheet_too_thin', factor: 0, verdict: 'hold' })
    expect(afloat.says).toBe('the sheet is 2.2 cm thick, too thin to walk on with a hose')
  })

  // A hole tells nothing of the water: 22 mm of ice are 20 of the 120 mm poured, and the other 100 may be under it.
  test.each(['skating', 'thaw'] as const)('a lined sheet of 22 mm on a deep fill keeps people off in %s', (phase) => {
    expect(standing(22, 120, { phase })).toMatchObject({ code: 'sheet_too_thin', factor: 0, verdict: 'hold' })
  })

  test('no ice at all is told as such', () => {
    expect(standing(0, 120)).toMatchObject({
      code: 'sheet_too_thin',
      verdict: 'hold',
      says: 'there is no ice yet to walk on with a hose',
    })
  })
})

test('a bare liner is no sheet either', () => {
  expect(standing(0, 0, { phase: 'skating' })).toMatchObject({ code: 'sheet_too_thin', factor: 0 })
})
