// From records to hours: what is filled in, what is not, and what is refused.
import { describe, expect, test } from 'vitest'
import { blackBodyWm2 } from '@/lib/physics/sky'
import { prepareHours } from '@/lib/physics/prepare'
import { RINK_WIND_RATIO, shelterFactor } from '@/lib/physics/site'
import { surfaceBalance } from '@/lib/physics/balance'
import type { HourlyRecord } from '@/lib/physics/types'

const SITE = { latitudeDeg: 45.4, longitudeDeg: -75.7, shelter: 0.6, skyView: 0.85 }

function records(count: number, change: (index: number) => Partial<HourlyRecord> = () => ({})): HourlyRecord[] {
  return Array.from({ length: count }, (_, index) => ({
    time: new Date(Date.UTC(2027, 0, 12, 12 + index)).toISOString(),
    airTemperatureC: -5 - index,
    dewPointC: -8 - index,
    windSpeedMps: 3,
    windGustMps: 6,
    cloudCover: 0.5,
    shortwaveWm2: 0,
    precipitationMm: 0,
    rainMm: 0,
    snowfallCm: 0,
    pressureHpa: 1010,
    ...change(index),
  }))
}

describe('gaps', () => {
  const nothing = { airTemperatureC: null, windSpeedMps: null, dewPointC: null }

  test('one missing hour is the mean of its neighbours', () => {
    const hours = prepareHours(
      records(5, (index) => (index === 2 ? nothing : {})),
      SITE,
    )
    expect(hours[2]!.isKnown).toBe(true)
    expect(hours[2]!.airTemperatureC).toBeCloseTo(-7, 9)
    expect(hours[2]!.windSpeedMps).toBeCloseTo(3, 9)
  })
  test('two missing hours stay unknown, and only they', () => {
    const hours = prepareHours(
      records(6, (index) => (index === 2 || index === 3 ? nothing : {})),
      SITE,
    )
    expect(hours.map(({ isKnown }) => isKnown)).toEqual([true, true, false, false, true, true])
  })
  test('a missing hour at the end stays unknown', () => {
    expect(
      prepareHours(
        records(3, (index) => (index === 2 ? nothing : {})),
        SITE,
      )[2]!.isKnown,
    ).toBe(false)
  })
  test('an unknown hour has no balance', () => {
    const [first] = prepareHours(
      records(1, () => nothing),
      SITE,
    )
    expect(() => surfaceBalance(first!, 'wet', 0)).toThrow(RangeError)
  })
})

describe('what services leave out', () => {
  test('gusts, pressure, rain and snow', () => {
    const [hour] = prepareHours(
      records(1, () => ({ windGustMps: null, pressureHpa: null, precipitationMm: 1, rainMm: null, snowfallCm: null })),
      SITE,
    )
    expect(hour!.windGustMps).toBeGreaterThan(3)
    expect(hour!.pressureHpa).toBe(1013.25)
    expect(hour!.rainMm).toBe(0)
    // 1 mm at the density of new snow at -5 °C, 103.8 kg/m³ (Anderson 1976).
    expect(hour!.snowfallCm).toBeCloseTo(0.963, 2)
  })
  test('warm precipitation is rain', () => {
    const [hour] = prepareHours(
      records(1, () => ({ airTemperatureC: 4, dewPointC: 3, precipitationMm: 1, rainMm: null, snowfallCm: null })),
      SITE,
    )
    expect(hour!.rainMm).toBe(1)
  })
  test('sunshine from the sun and the cloud: by day some, by night none', () => {
    const sunless = records(13, () => ({ shortwaveWm2: null }))
    const hours = prepareHours(sunless, SITE)
    // 12:00 to 01:00 UTC in Ottawa; the sun is highest near 17:10 UTC at 23°, where Haurwitz gives 368 and half cloud passes 0.93.
    expect(hours[5]!.shortwaveWm2).toBeGreaterThan(300)
    expect(hours[5]!.shortwaveWm2).toBeLessThan(368)
    expect(hours[12]!.shortwaveWm2).toBe(0)
  })
  test('longwave: measured is used, and the closed part of the dome shines at air temperature', () => {
    const [hour] = prepareHours(
      records(1, () => ({ longwaveDownWm2: 200 })),
      SITE,
    )
    expect(hour!.longwaveDownWm2).toBeCloseTo(0.85 * 200 + 0.15 * blackBodyWm2(-5), 6)
  })
  test('the dew point is never above the air', () => {
    const [a, b] = [records(1, () => ({ dewPointC: 3 })), records(1, () => ({ dewPointC: -5 }))]
    expect(prepareHours(a, SITE)[0]!.vapourPressureHpa).toBe(prepareHours(b, SITE)[0]!.vapourPressureHpa)
  })
  test('wind comes down to the rink and behind the fence', () => {
    expect(prepareHours(records(1), SITE)[0]!.windAtRinkMps).toBeCloseTo(3 * RINK_WIND_RATIO * 0.6, 9)
    expect(shelterFactor('open')).toBeGreaterThan(shelterFactor('suburban'))
    expect(shelterFactor('suburban')).toBeGreaterThan(shelterFactor('tight'))
    expect(shelterFactor(0.42)).toBe(0.42)
  })
})

describe('bad input', () => {
  const change = (part: Partial<HourlyRecord>) => () =>
    prepareHours(
      records(1, () => part),
      SITE,
    )
  test.each([
    { airTemperatureC: 60 },
    { windSpeedMps: -1 },
    { precipitationMm: -0.5 },
    { cloudCover: 1.4 },
    { shortwaveWm2: 5000 },
    { pressureHpa: 20 },
    { time: 'yesterday' },
  ])('%o is refused', (part) => expect(change(part)).toThrow(RangeError))
  test('a value that is no number counts as missing', () => {
    expect(
      prepareHours(
        records(1, () => ({ airTemperatureC: Number.NaN })),
        SITE,
      )[0]!.isKnown,
    ).toBe(false)
  })
  test('repeated, unordered or missing hours are refused', () => {
    const three = records(3)
    expect(() => prepareHours([three[0]!, three[0]!], SITE)).toThrow(RangeError)
    expect(() => prepareHours([three[1]!, three[0]!], SITE)).toThrow(RangeError)
    expect(() => prepareHours([three[0]!, three[2]!], SITE)).toThrow(RangeError)
  })
  test('a place off the globe is refused', () => {
    expect(() => prepareHours(records(1), { ...SITE, latitudeDeg: 91 })).toThrow(RangeError)
    expect(() => shelterFactor(1.2)).toThrow(RangeError)
  })
  test('no hours give no hours', () => expect(prepareHours([], SITE)).toEqual([]))
})
