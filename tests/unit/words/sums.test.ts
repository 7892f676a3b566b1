// The building plan in words, metric and US units.
import { describe, expect, test } from 'vitest'
import { buildSums } from '@/lib/advice/build-sums'
import { IMPERIAL, METRIC } from '@/lib/units'
import { SUM_CAUTION_CODES, sumCautionText } from '@/lib/words/sum-cautions'
import { orderByText, sumItems, sumsLead } from '@/lib/words/sums'

const metric = { timeZone: 'America/Toronto', units: METRIC, clock: '24' as const, locale: 'en' }
const imperial = { ...metric, units: IMPERIAL }
const sums = buildSums({
  lengthM: 14,
  widthM: 7,
  floor: { cornersM: [0, 0, 0.28, 0.28] },
  leastDepthM: 0.04,
  flow: { bucketL: 10, bucketSeconds: 24 },
  hoursPerSession: 6,
  waterPricePerM3: 3,
  boardHeightM: 0.3,
  seasonYear: 2026,
})
const TODAY = '2026-09-01'
const itemOf = (id: string, words = metric) => sumItems(sums, TODAY, words).find((item) => item.id === id)!

describe('sums in words', () => {
  test('the lead', () => expect(sumsLead(sums, metric)).toBe('17.6 m³ of water, about 12 hours of hose, in two goes.'))
  // 17 640 L / 3.7854 = 4660 US gallons.
  test('the lead in gallons', () => expect(sumsLead(sums, imperial)).toMatch(/^4660 gal of water/))
  test('figures', () => {
    expect(itemOf('water').detail).toBe('Mean depth 18.0 cm, deepest 32.0 cm.')
    expect(itemOf('hose').figure).toBe('11 h 50 min')
    expect(itemOf('hose').detail).toContain('57 % of the floor')
    expect(itemOf('push').figure).toBe('51 kg on each metre')
    expect(itemOf('liner').figure).toBe('16 m × 9 m')
    expect(itemOf('orderBy').figure).toBe('September 30, 2026')
    expect(itemOf('cost').figure).toBe('52.92')
  })
  test('the day to order by, before it and past it', () => {
    const detailOn = (today: string) => sumItems(sums, today, metric).find(({ id }) => id === 'orderBy')?.detail
    expect(detailOn('2026-09-30')).toBe('By late November stock is thin.')
    expect(detailOn('2026-10-01')).toMatch(/^That day is past. Order now/)
    expect(orderByText(metric)).toMatch(/^Order liner, boards and brackets by September 30:/)
  })
  // 502.3 N/m × 0.3048 m / 4.448 N = 34.4 lb; 53.6 N m/m / 4.448 = 12.0 lb ft/ft.
  test('push in pounds', () => {
    expect(itemOf('push', imperial).figure).toBe('34 lb on each foot')
    expect(itemOf('push', imperial).detail).toContain('12 lb ft on each foot')
  })
  test('every sum has a formula, the same with figures, and a source', () => {
    for (const words of [metric, imperial]) {
      for (const { figure, detail, how } of sumItems(sums, TODAY, words)) {
        for (const text of [figure, detail, how.formula, how.worked, how.source]) {
          expect(text.length).toBeGreaterThan(0)
          expect(text).not.toMatch(/NaN|undefined|Infinity/)
        }
      }
    }
    expect(itemOf('flow').how.worked).toBe('10 L in 24 s = 25 L/min')
    expect(itemOf('boards').how.worked).toBe('32.0 cm + 5.0 cm = 37.0 cm')
  })
  test('every caution has words', () => {
    for (const caution of sums.cautions) {
      expect(SUM_CAUTION_CODES).toContain(caution.code)
      expect(sumCautionText(caution, metric)).toMatch(/\.$/)
    }
  })
})
