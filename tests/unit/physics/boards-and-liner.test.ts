// Boards, liner, melt water and the still hose, worked out by hand or printed elsewhere.
import { describe, expect, test } from 'vitest'
import { boardHeightM, footMomentNmPerM, freezingRiseM, lumberFor, waterPushNPerM } from '@/lib/physics/boards'
import { GARDEN_HOSE, hoseFilmWm2K, stillHoseHours } from '@/lib/physics/hose'
import { linerAcrossM, linerToOrderM } from '@/lib/physics/liner'
import { meltWaterM3, snowThatFloodsIceCm } from '@/lib/physics/melt-water'
import { snowMeltedCm } from '../../support/published-forms/ice-and-snow'

const N_PER_LB = 4.4482216
const M_PER_FOOT = 0.3048

describe('boards', () => {
  // Hydrostatics in feet: 62.4 lb/ft³ × h²/2: 31 lb on a foot of board at 1 ft, 125 lb at 2 ft.
  test.each([
    [1, 31.2],
    [2, 124.8],
  ])('water %d ft deep pushes %d lb on a foot of board', (feet, pounds) => {
    const perFoot = (waterPushNPerM(feet * M_PER_FOOT) * M_PER_FOOT) / N_PER_LB
    expect(Math.abs(perFoot / pounds - 1)).toBeLessThan(0.005)
  })
  // ½ × 1000 × 9.81 × 0.32² = 502.3 N/m, which weighs as 51.2 kg; a third of 0.32 m up: 53.6 N m/m.
  test('push and moment at the foot, 32 cm of water', () => {
    expect(waterPushNPerM(0.32)).toBeCloseTo(502.272, 2)
    expect(footMomentNmPerM(0.32)).toBeCloseTo(53.576, 2)
  })
  // Ice of 916.7 kg/m³ takes 1/0.9167 of the room: 9.1 % more.
  test('a fill of 32 cm rises 2.9 cm as it freezes', () => expect(freezingRiseM(0.32)).toBeCloseTo(0.0291, 4))
  test('height is water and freeboard', () => {
    expect(boardHeightM(0.32, 0.05)).toBeCloseTo(0.37, 9)
    expect(boardHeightM(-0.1, 0.05)).toBeCloseTo(0.05, 9)
  })
  // Dressed inches: 9¼ + 5½ = 14¾ = 37.5 cm; 7¼ = 18.4 cm; two of 11¼ = 57.2 cm.
  test.each([
    [0.37, ['2×10', '2×6'], 0.3747],
    [0.18, ['2×8'], 0.1842],
    [0.13, ['2×6'], 0.1397],
    [0.57, ['2×12', '2×12'], 0.5715],
  ])('lumber for %d m', (heightM, boards, inAllM) => {
    expect(lumberFor(heightM)?.boards).toEqual(boards)
    expect(lumberFor(heightM)?.heightM).toBeCloseTo(inAllM, 3)
  })
  test('no pair of boards holds 60 cm', () => expect(lumberFor(0.6)).toBeNull())
})

describe('liner', () => {
  const edges = { boardHeightM: 0.4, boardThicknessM: 0.04, tuckM: 0.16 }
  // 10 + 2 × (0.40 + 0.04 + 0.16) = 11.2; 3 % for folds 11.536; 0.2 to spare each side 11.936, cut at 12.
  test('up, over, down outside, folds, to spare, whole half metres', () => {
    expect(linerAcrossM(10, edges)).toBeCloseTo(11.2, 9)
    expect(linerToOrderM(10, { ...edges, foldShare: 0.03, overlapM: 0.2 }, 0.5)).toBeCloseTo(12, 9)
    expect(linerToOrderM(10, { ...edges, foldShare: 0, overlapM: 0.4 }, 0.5)).toBeCloseTo(12, 9)
    expect(linerToOrderM(10, { ...edges, foldShare: 0, overlapM: 0.41 }, 0.5)).toBeCloseTo(12.5, 9)
  })
  test('nonsense is refused', () => {
    expect(() => linerAcrossM(0, edges)).toThrow(RangeError)
    expect(() => linerAcrossM(10, { ...edges, boardHeightM: -1 })).toThrow(RangeError)
  })
})

describe('melt water and snow under water', () => {
  // 12 000 L of fill and 3000 L of floods, less 20 mm × 100 m² = 2000 L into the air.
  test('what was poured and did not leave', () => {
    expect(meltWaterM3(15_000, 100)).toBeCloseTo(15, 9)
    expect(meltWaterM3(15_000, 100, 20)).toBeCloseTo(13, 9)
    expect(meltWaterM3(1000, 100, 20)).toBe(0)
  })
  // 120 kg/m² × 4200 × 6 = 3.02 MJ/m² against 333.6 kJ/kg: 9.06 kg/m², 9.1 cm of snow at 100 kg/m³.
  test('snow that the warmth of a fill melts', () => {
    expect(snowMeltedCm(120, 6, { densityKgM3: 100, temperatureC: 0 })).toBeCloseTo(9.06, 1)
  })
  // h_i (1000 - 917) / 300: 2.77 cm of settled snow on 10 cm of ice.
  test('snow that floods floating ice', () => expect(snowThatFloodsIceCm(100, 917, 300)).toBeCloseTo(2.77, 2))
})

describe('a full hose left lying', () => {
  // Incropera & DeWitt, example 7.4: 12.7 mm cylinder at 10 m/s, about 105 W/m²K.
  test('wind across a thin cylinder', () => expect(Math.abs(hoseFilmWm2K(10, 0.0127) / 105 - 1)).toBeLessThan(0.1))
  test('still air takes less', () => expect(hoseFilmWm2K(0, 0.02)).toBe(10))
  // 15 mm bore, 20 mm outside, 0.17 W/mK, water at 0 °C in air at -10 °C: ρ L A R / ΔT with R = 1/(π 0.02 h) + ln(20/15)/(2 π 0.17),
  // and ρ L d² / 16 k ΔT: 42 + 3.5 min at h 100, 183 + 3.5 min at h 10.
  test.each([
    [100, 45.6],
    [10, 186.3],
  ])('solid at h %d after %d minutes', (film, minutes) => {
    const hose = { boreM: 0.015, outsideM: 0.02, wallConductivity: 0.17 }
    const { hoursToIce, hoursToSolid } = stillHoseHours(hose, 1e-6, -10, film)
    expect(hoursToIce).toBeLessThan(1e-6)
    expect(Math.abs(hoursToSolid * 60 - minutes)).toBeLessThan(0.5)
  })
  test('warmer water buys minutes, not hours', () => {
    // 834 J/K a metre, R = 1/(π 0.0209 × 20) + ln(20.9/15.9)/(2 π 0.17) = 1.0175 m K/W, × ln(13/5): 811 s.
    const { hoursToIce } = stillHoseHours(GARDEN_HOSE, 8, -5, 20)
    expect(hoursToIce).toBeCloseTo(0.2252, 3)
  })
  test('there is no freezing in warm air', () => {
    expect(() => stillHoseHours(GARDEN_HOSE, 8, 1, 20)).toThrow(RangeError)
  })
})
