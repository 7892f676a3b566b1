// Sun position and clear-sky radiation against observatories. The source stands beside each value.
import { describe, expect, test } from 'vitest'
import {
  clearSkyShortwaveWm2,
  cloudShortwaveFactor,
  sunAltitudeDeg,
  sunPositionDeg,
  sunUpDownMillis,
} from '@/lib/physics/sun'
import { extraterrestrialMj, julianDate } from '../support/published-forms/sky-and-sun'

const PLACES: Record<string, [number, number]> = {
  Stockholm: [59.32938, 18.06871],
  Kyiv: [50.45466, 30.5238],
  Reykjavik: [64.13548, -21.89541],
  Tromso: [69.6489, 18.95508],
}
const minutesOfDay = (millis: number | null, date: string) => (millis! - Date.parse(`${date}T00:00Z`)) / 60_000

describe('rising and setting', () => {
  // US Naval Observatory rise/set service, UTC, whole minutes after midnight.
  test.each([
    { place: 'Stockholm', date: '2026-12-21', rise: 463, set: 828 },
    { place: 'Stockholm', date: '2026-01-10', rise: null, set: 854 },
    { place: 'Kyiv', date: '2026-01-10', rise: 356, set: 855 },
    { place: 'Reykjavik', date: '2026-12-21', rise: 682, set: 929 },
    { place: 'Tromso', date: '2026-01-25', rise: 543, set: 771 },
  ])('$place on $date', ({ place, date, rise, set }) => {
    const { riseMillis, setMillis } = sunUpDownMillis(Date.parse(`${date}T12:00Z`), ...PLACES[place]!)
    if (rise !== null) expect(Math.abs(minutesOfDay(riseMillis, date) - rise)).toBeLessThanOrEqual(1)
    expect(Math.abs(minutesOfDay(setMillis, date) - set)).toBeLessThanOrEqual(1)
  })
  // US Naval Observatory: polar night at Tromsø, the sun is back by 18 January.
  test('polar night', () => {
    for (const date of ['2026-12-21', '2026-01-10']) {
      expect(sunUpDownMillis(Date.parse(`${date}T12:00Z`), ...PLACES.Tromso!).riseMillis).toBeNull()
    }
    expect(sunUpDownMillis(Date.parse('2026-01-18T12:00Z'), ...PLACES.Tromso!).riseMillis).not.toBeNull()
  })
  test.each([
    // Finnish Meteorological Institute: 09:23 to 15:12.
    { place: 'Helsinki', at: [60.17, 24.94], date: '2022-12-21T10:00Z', minutes: 349, tolerance: 1.5 },
    // Almanac: 8 h 45 min 56 s.
    { place: 'Minneapolis', at: [44.98, -93.27], date: '2008-12-21T18:00Z', minutes: 525.93, tolerance: 0.6 },
  ])('length of the day at $place', ({ at, date, minutes, tolerance }) => {
    const { riseMillis, setMillis } = sunUpDownMillis(Date.parse(date), at[0]!, at[1]!)
    expect(Math.abs((setMillis! - riseMillis!) / 60_000 - minutes)).toBeLessThan(tolerance)
  })
})

describe('altitude', () => {
  // Reda & Andreas 2003, NREL/TP-560-34302, test case 2003-10-17 12:30:30 UTC-7: refracted zenith 50.11162°.
  test('NREL solar position test case', () => {
    const altitude = sunAltitudeDeg(Date.parse('2003-10-17T19:30:30Z'), 39.742476, -105.1786)
    expect(Math.abs(90 - altitude - 50.11162)).toBeLessThan(0.02)
  })
  // JPL Horizons, topocentric apparent, refracted.
  test.each([
    { at: PLACES.Stockholm!, when: '2026-12-21T12:00:00Z', degrees: 5.971745 },
    { at: PLACES.Reykjavik!, when: '2026-03-20T12:00:00Z', degrees: 23.525223 },
  ])('JPL Horizons at $when', ({ at, when, degrees }) => {
    expect(Math.abs(sunAltitudeDeg(Date.parse(when), ...at) - degrees)).toBeLessThan(0.05)
  })
  // Reda & Andreas 2003, the same case: 194.34024° from north. JPL Horizons for the other two.
  test.each([
    { at: [39.742476, -105.1786], when: '2003-10-17T19:30:30Z', degrees: 194.34024, tolerance: 0.02 },
    { at: PLACES.Stockholm!, when: '2026-12-21T12:00:00Z', degrees: 197.065, tolerance: 0.05 },
    { at: PLACES.Reykjavik!, when: '2026-03-20T12:00:00Z', degrees: 153.947, tolerance: 0.05 },
  ])('direction at $when is $degrees° from north', ({ at, when, degrees, tolerance }) => {
    expect(Math.abs(sunPositionDeg(Date.parse(when), at[0]!, at[1]!).azimuthDeg - degrees)).toBeLessThan(tolerance)
  })
  // Meeus, Astronomical Algorithms, 2nd ed., example 7.a: 1957 October 4.81 is 2436116.31.
  test('Julian date', () => {
    const atMillis = Date.parse('1957-10-04T00:00:00Z') + 0.81 * 86_400_000
    expect(Math.abs(julianDate(atMillis) - 2_436_116.31)).toBeLessThan(0.001)
  })
  // The sun stands in the zenith at the latitude of its declination: Reda & Andreas 2003, -9.31434°; Meeus, Astronomical
  // Algorithms, 2nd ed., p. 165 (1992-10-13 0h TD, 59 s before 0h UTC), -7.785°.
  test.each([
    { when: '2003-10-17T19:30:30Z', declination: -9.31434, tolerance: 0.005 },
    { when: '1992-10-12T23:59:01Z', declination: -7.785, tolerance: 0.003 },
  ])('declination at $when', ({ when, declination, tolerance }) => {
    expect(Math.abs(latitudeUnderTheSun(Date.parse(when)) - declination)).toBeLessThan(tolerance)
  })
  // FAO-56 Example 8, p. 80: 20° S on 3 September.
  test('a day of sunshine above the atmosphere is 32.2 MJ/m²', () => {
    expect(Math.abs(extraterrestrialMj(-20, 246) - 32.2)).toBeLessThan(0.1)
  })
})

describe('radiation', () => {
  // Haurwitz 1945, 1946, with the exponent -0.059 as in pvlib.
  test.each([
    [5, 48.62987],
    [10, 135.74175],
    [30, 487.89413],
  ])('clear sky at %d° is %d W/m²', (altitude, wm2) => {
    expect(Math.abs(clearSkyShortwaveWm2(altitude) - wm2)).toBeLessThan(0.01)
  })
  // Kasten & Czeplak 1980, Solar Energy 24, 177: 8 and 4 eighths.
  test.each([
    [1, 0.25],
    [0.5, 0.929],
  ])('cloud %d lets %d through', (cloud, factor) => {
    expect(Math.abs(cloudShortwaveFactor(cloud) - factor)).toBeLessThan(0.001)
  })
})

/** Latitude at which the sun stands highest, by golden steps over latitude and longitude in turn. */
function latitudeUnderTheSun(atMillis: number): number {
  let latitude = 0
  let longitude = 0
  for (let round = 0; round < 12; round++) {
    longitude = highest((at) => sunAltitudeDeg(atMillis, latitude, at), -180, 180, longitude, 180 / 4 ** round)
    latitude = highest((at) => sunAltitudeDeg(atMillis, at, longitude), -30, 30, latitude, 30 / 4 ** round)
  }
  return latitude
}

function highest(of: (x: number) => number, least: number, most: number, around: number, reach: number): number {
  let best = around
  for (let i = -20; i <= 20; i++) {
    const x = Math.min(most, Math.max(least, around + (i / 20) * reach))
    if (of(x) > of(best)) best = x
  }
  return best
}
