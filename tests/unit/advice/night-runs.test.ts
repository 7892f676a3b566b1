// The nights for which the forecast itself has no good hour, as its other runs see them.
import { expect, test } from 'vitest'
import { judge } from '@/lib/advice/judge'
import { askOtherNights } from '@/lib/advice/night-runs'
import { inputOf, steadyHours } from '../../support/advice-weather'

/** Three nights of +6 °C in the forecast; in three of ten members the second is clear and cold, -8 °C. */
const mild = { airTemperatureC: 6, dewPointC: 5, cloudCover: 1 }
const hours = steadyHours(72, mild)
const cold = steadyHours(72)
const members = Array.from({ length: 10 }, (_, member) =>
  hours.map((hour, index) => (member < 3 && index >= 24 && index < 48 ? cold[index]! : hour)),
)
const input = inputOf(hours, { members })

test('are counted night by night', () => {
  expect(judge(input).windows).toEqual([])
  expect(askOtherNights(input, [])).toEqual([
    { nightDate: '2027-01-12', agreeing: 0, runs: 10 },
    { nightDate: '2027-01-13', agreeing: 3, runs: 10 },
    { nightDate: '2027-01-14', agreeing: 0, runs: 10 },
  ])
})

test('leave out nights with a window, of which the judgement has asked', () => {
  const given = { ...input, hours: members[0]! }
  const { windows } = judge(given)
  expect(windows).toMatchObject([{ agreement: 0.3, runs: 10 }])
  expect(askOtherNights(given, windows).map(({ nightDate }) => nightDate)).toEqual(['2027-01-12', '2027-01-14'])
})

test('are asked in hours in which the keeper can go out, and only where something is poured', () => {
  const available = [{ from: '17:00', to: '18:00', weekdays: [3] }]
  expect(askOtherNights({ ...input, available }, [])).toEqual([{ nightDate: '2027-01-13', agreeing: 3, runs: 10 }])
  expect(askOtherNights({ ...input, rink: { ...input.rink, phase: 'closed' } }, [])).toEqual([])
  const { members: _, ...alone } = input
  expect(askOtherNights(alone, [], { runs: 0 })).toEqual([])
})
