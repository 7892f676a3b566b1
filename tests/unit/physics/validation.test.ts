// The bars of the model against measured data and oracle tables; skipped where the data are not at hand.
import { describe, expect, test } from 'vitest'
import { columnThicknessM, NO_RESISTANCE_WM2K } from '@/lib/validation/exact-solutions'
import { ashtonThicknessM, neumannThicknessM } from '@/lib/physics/stefan'
import { hasMeasuredData } from '@/lib/validation/measured'
import { validateClearNights } from '@/lib/validation/clear-nights'
import { validateExactSolutions, validateWetFluxes } from '@/lib/validation/oracle-tables'
import { validateFinland } from '@/lib/validation/finland'
import { validatePyhajarvi } from '@/lib/validation/pyhajarvi'

if (!hasMeasuredData()) console.info('Measured data (../shared/data) are not at hand: those checks are skipped.')

describe.skipIf(!hasMeasuredData())('against measurements and tables', () => {
  // Ice: Finnish Environment Institute, weather: Finnish Meteorological Institute, both CC BY 4.0. Bars in cm.
  test('Pyhäjärvi: intervals, those with little snow, the season of 2015', () => {
    const [all, bare, season] = validatePyhajarvi()
    expect(all!.model.n).toBe(13)
    expect(Math.abs(all!.model.bias)).toBeLessThan(0.6)
    expect(all!.model.rmse).toBeLessThan(2.2)
    expect(bare!.model.n).toBe(8)
    expect(bare!.model.rmse).toBeLessThan(2.0)
    expect(season!.model.rmse).toBeLessThan(1.2)
  })
  // Ice as above, daily air from ERA5 (Copernicus).
  test('Finland: days and snow alone', () => {
    const [bare] = validateFinland()
    expect(bare!.model.n).toBe(49)
    expect(Math.abs(bare!.model.bias)).toBeLessThan(0.6)
    expect(bare!.model.rmse).toBeLessThan(3.9)
  })
  // Jokioinen: Finnish Meteorological Institute; Svartberget: ICOS Sweden.
  test.each(['Jokioinen', 'Svartberget'])('clear nights at %s', (place) => {
    const line = validateClearNights().find(({ set }) => set.includes(place))!
    expect(line.model.n).toBeGreaterThanOrEqual(4)
    expect(line.isMet).toBe(true)
  })
  // FLake (Mironov), run unaltered.
  test('fluxes of a wet surface', () => expect(validateWetFluxes().isMet).toBe(true))
  test('closed forms', () => expect(validateExactSolutions().map(({ isMet }) => isMet)).toEqual([true, true, true]))
})

describe('exact solutions without any data', () => {
  // Neumann holds at any temperature; reached 0.7 %.
  test.each([
    [-2, 48],
    [-10, 24],
    [-10, 120],
    [-30, 24],
  ])('the column at %d °C after %d h is Neumann’s', (airC, hours) => {
    const exact = neumannThicknessM(-airC, hours)
    expect(Math.abs(columnThicknessM(0, airC, NO_RESISTANCE_WM2K, hours) / exact - 1)).toBeLessThan(0.01)
  })
  // Ashton leaves the heat of cooling ice out, 0.5 % at 5 K.
  test.each([
    [10, 0, 48],
    [20, 0.02, 24],
    [30, 0.1, 120],
  ])('the column with H = %d from %d m after %d h is Ashton’s', (bulk, startM, hours) => {
    const exact = ashtonThicknessM(startM, (5 * hours) / 24, bulk)
    expect(Math.abs(columnThicknessM(startM, -5, bulk, hours) / exact - 1)).toBeLessThan(0.01)
  })
})
