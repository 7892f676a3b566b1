// What would turn a night to hold off: each change is checked by judging the changed weather in full.
import { expect, test } from 'vitest'
import { judge } from '@/lib/advice/judge'
import { whatWouldTurn, type WhatWouldTurn } from '@/lib/advice/what-would-change'
import type { JudgeInput } from '@/lib/advice/types'
import type { HourlyRecord } from '@/lib/physics/types'
import { inputOf, steadyHours, timeOf } from '../../support/advice-weather'

const NIGHT = '2027-01-12'
const ask = (hours: HourlyRecord[], given: Partial<JudgeInput> = {}) => whatWouldTurn(inputOf(hours, given), NIGHT)
const codes = (turns: WhatWouldTurn[]) => turns.map(({ code }) => code)
const goodHours = (hours: HourlyRecord[]) =>
  judge(inputOf(hours), { runs: 0 })
    .hours.slice(0, 24)
    .filter(({ verdict, isAvailable }) => verdict === 'flood' && isAvailable)

test('a mild overcast night: how much colder it would have to be, and no degree more', () => {
  const mild = (colderC: number) =>
    steadyHours(72, { airTemperatureC: 1 - colderC, dewPointC: 0 - colderC, cloudCover: 1 })
  expect(goodHours(mild(0))).toEqual([])
  const turn = ask(mild(0)).find(({ code }) => code === 'colder')
  const byC = Number(turn?.values.byC)
  expect(goodHours(mild(byC))[0]?.time).toBe(turn?.values.goodAt)
  expect(goodHours(mild(byC - 1))).toEqual([])
})

test('a damp overcast night that only cloud spoils: a clear sky', () => {
  const cloudy = { airTemperatureC: 1, dewPointC: -1, cloudCover: 1, windSpeedMps: 1 }
  expect(goodHours(steadyHours(72, cloudy))).toEqual([])
  const turn = ask(steadyHours(72, cloudy)).find(({ code }) => code === 'clear_sky')
  expect(goodHours(steadyHours(72, { ...cloudy, cloudCover: 0 }))[0]?.time).toBe(turn?.values.goodAt)
})

test('snow on a cold night: only a dry one would do, and no cold helps', () => {
  const snowy = steadyHours(72, { precipitationMm: 0.5, snowfallCm: 0.5 })
  const turns = ask(snowy)
  expect(codes(turns)).toContain('dry')
  expect(codes(turns)).not.toContain('colder')
})

test('rain and warmth together: no single change turns it', () => {
  const wet = steadyHours(72, { airTemperatureC: 8, dewPointC: 7, cloudCover: 1, precipitationMm: 2, rainMm: 2 })
  expect(ask(wet)).toEqual([])
})

test('only hours to come in which the keeper can go out count', () => {
  const mild = steadyHours(72, { airTemperatureC: 1, dewPointC: 0, cloudCover: 1 })
  const turns = ask(mild, { now: timeOf(8.5) })
  expect(turns.length).toBeGreaterThan(0)
  for (const { values } of turns) {
    // Hours from 5 pm to 1 am are five to thirteen after noon.
    expect(String(values.goodAt) >= timeOf(8) && String(values.goodAt) < timeOf(13)).toBe(true)
  }
})

test('a rink without a sheet has nothing to flood', () => {
  const input = inputOf(steadyHours(72, { airTemperatureC: 1 }))
  expect(whatWouldTurn({ ...input, rink: { ...input.rink, phase: 'waiting' } }, NIGHT)).toEqual([])
})
