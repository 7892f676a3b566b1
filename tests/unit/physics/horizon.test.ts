// Skyline and shade: what they keep of the sunshine, worked out by hand.
import { describe, expect, test } from 'vitest'
import { diffuseShare, skylineDeg, sunshineOnRinkWm2 } from '@/lib/physics/horizon'
import { prepareHours } from '@/lib/physics/prepare'
import type { HourlyRecord, Site } from '@/lib/physics/types'

const STOCKHOLM: Site = { latitudeDeg: 59.32938, longitudeDeg: 18.06871, shelter: 1, skyView: 0.8 }
// JPL Horizons: at 12:00 UTC on 2026-12-21 the sun stands 5.97° high in the direction 197.07°, a little west of south.
const AROUND_NOON = Date.parse('2026-12-21T11:30:00Z')

describe('the skyline', () => {
  test('is one height all round, or goes by a straight line between eight', () => {
    expect(skylineDeg(12, 200)).toBe(12)
    const heights = [0, 0, 0, 10, 20, 40, 0, 0]
    expect(skylineDeg(heights, 180)).toBe(20)
    expect(skylineDeg(heights, 202.5)).toBeCloseTo(30, 9)
    expect(skylineDeg(heights, 337.5)).toBe(0)
    expect(skylineDeg(heights, -180)).toBe(20)
  })

  test('out of range or not eight long is refused', () => {
    expect(() => skylineDeg(91, 0)).toThrow(RangeError)
    expect(() => skylineDeg([0, 0], 0)).toThrow(RangeError)
  })
})

describe('sunshine on a rink', () => {
  // Kasten & Czeplak 1980: 0.3 of the radiation of a cloudless sky is diffuse, all of it under full cloud.
  test.each([
    [0, 0.3],
    [0.5, 0.475],
    [1, 1],
  ])('cloud %d makes %d of it diffuse', (cloud, share) => {
    expect(diffuseShare(cloud)).toBeCloseTo(share, 9)
  })

  test('without skyline and shade it is what the record says', () => {
    expect(sunshineOnRinkWm2(100, 0, AROUND_NOON, STOCKHOLM)).toBe(100)
  })

  test('behind a skyline above the sun only the diffuse part of the open sky is left', () => {
    // 100 W/m² × 0.3 diffuse × 0.8 of the sky.
    expect(sunshineOnRinkWm2(100, 0, AROUND_NOON, { ...STOCKHOLM, horizonDeg: 7 })).toBeCloseTo(24, 9)
  })

  test('over a skyline below the sun the direct part comes through', () => {
    // 70 direct + 24 diffuse.
    expect(sunshineOnRinkWm2(100, 0, AROUND_NOON, { ...STOCKHOLM, horizonDeg: 3 })).toBeCloseTo(94, 9)
  })

  test('a house to the south takes the noon sun, one to the north does not', () => {
    const south = [0, 0, 0, 0, 30, 30, 0, 0]
    const north = [30, 30, 0, 0, 0, 0, 0, 30]
    expect(sunshineOnRinkWm2(100, 0, AROUND_NOON, { ...STOCKHOLM, horizonDeg: south })).toBeCloseTo(24, 9)
    expect(sunshineOnRinkWm2(100, 0, AROUND_NOON, { ...STOCKHOLM, horizonDeg: north })).toBeCloseTo(94, 9)
  })

  test('shade takes its share of the direct part', () => {
    // 70 × (1 - 0.5) + 24.
    expect(sunshineOnRinkWm2(100, 0, AROUND_NOON, { ...STOCKHOLM, shade: 0.5 })).toBeCloseTo(59, 9)
  })

  test('under full cloud there is no direct part to cut', () => {
    expect(sunshineOnRinkWm2(50, 1, AROUND_NOON, { ...STOCKHOLM, horizonDeg: 60, shade: 1 })).toBeCloseTo(40, 9)
  })

  test('counts for measured and for derived sunshine alike', () => {
    const hour = (shortwaveWm2: number | null): HourlyRecord => ({
      time: '2026-12-21T11:00:00Z',
      airTemperatureC: -5,
      dewPointC: -9,
      windSpeedMps: 2,
      windGustMps: 3,
      cloudCover: 0,
      shortwaveWm2,
      precipitationMm: 0,
      rainMm: 0,
      snowfallCm: 0,
      pressureHpa: 1010,
    })
    const on = (record: HourlyRecord, horizonDeg?: number) =>
      prepareHours([record], { ...STOCKHOLM, ...(horizonDeg === undefined ? {} : { horizonDeg }) })[0]!.shortwaveWm2
    expect(on(hour(100), 45)).toBeCloseTo(24, 9)
    expect(on(hour(null), 45)).toBeCloseTo(0.24 * on(hour(null)), 9)
  })
})
