// Limits that a keeper set for themselves: beyond them no flood is advised, whatever the ice.
import { expect, test } from 'vitest'
import { judge } from '@/lib/advice/judge'
import type { JudgeInput } from '@/lib/advice/types'
import { inputOf, steadyHours } from '../../support/advice-weather'

/** 8 pm local is the eighth hour after noon. */
const EIGHT_PM = 8

const hourWith = (limits: JudgeInput['limits'], weather: Parameters<typeof steadyHours>[1]) =>
  judge(inputOf(steadyHours(36, weather), { limits }), { runs: 0 }).hours[EIGHT_PM]

// -12 °C in 2 m/s (7.2 km/h) is a wind chill of -16.5 by Environment Canada's formula.
const cold = { airTemperatureC: -12, dewPointC: -16, windSpeedMps: 2, windGustMps: 3 }

test('below the wind chill that the keeper bears, hold off; above it nothing changes', () => {
  const usual = hourWith(undefined, cold)
  expect(usual?.verdict).toBe('flood')
  expect(hourWith({ windChillC: -25 }, cold)).toEqual(usual)
  const limited = hourWith({ windChillC: -15 }, cold)
  expect(limited?.verdict).toBe('hold')
  expect(limited?.limits?.person).toBe(0)
  expect(limited?.limits?.ice).toBe(usual?.limits?.ice)
})

test('above the wind that the keeper bears, hold off; below it nothing changes', () => {
  const usual = hourWith(undefined, cold)
  // 2 m/s at 10 m are 2 × ln(2 / 0.03) / ln(10 / 0.03) × 0.6 = 0.87 m/s at the rink of a suburban yard.
  const atRinkMps = (2 * Math.log(2 / 0.03) * 0.6) / Math.log(10 / 0.03)
  expect(hourWith({ windMps: atRinkMps + 0.1 }, cold)).toEqual(usual)
  const limited = hourWith({ windMps: atRinkMps - 0.1 }, cold)
  expect(limited?.verdict).toBe('hold')
  expect(limited?.reasons[0]).toMatchObject({ code: 'windy', factor: 0 })
})
