// The document of `npm run score`: what it takes, and that every fault is named by its JSON path.
import { describe, expect, test } from 'vitest'
import { parseScoreText, scoreFaults, scoreInputSchema } from '@/lib/schemas/score'
import { scoreExample } from '../support/score-example'

type Loose = Record<string, unknown>
type Document = Loose & { hours: Loose[]; rink: Loose; sheet: Loose; water: Loose }

const document = () => JSON.parse(JSON.stringify(scoreExample())) as Document
const hour = (one: Document, index: number) => one.hours[index] as Loose

function faultsOf(spoil: (one: Document) => void): string[] {
  const one = document()
  spoil(one)
  const result = scoreInputSchema.safeParse(one)
  return result.success ? [] : scoreFaults(result.error)
}

test('the example parses and keeps its numbers', () => {
  const parsed = scoreInputSchema.parse(document())
  expect(parsed.hours).toHaveLength(48)
  expect(parsed.hours[0]).toMatchObject({ time: '2027-01-12T17:00:00Z', airTemperatureC: -3, windSpeedMps: 4.2 })
})

test('absent and null values are both missing', () => {
  const one = document()
  delete hour(one, 2).rainMm
  hour(one, 3).airTemperatureC = null
  const parsed = scoreInputSchema.parse(one)
  expect(parsed.hours[2]?.rainMm).toBeNull()
  expect(parsed.hours[3]?.airTemperatureC).toBeNull()
})

test('the dew point follows from relative humidity where it is absent', () => {
  const one = document()
  Object.assign(hour(one, 0), { airTemperatureC: -10, dewPointC: null, relativeHumidityPercent: 80 })
  // At -10 °C and 80 % over water the dew point is -12.8 °C (Magnus form of WMO-No. 8).
  expect(scoreInputSchema.parse(one).hours[0]?.dewPointC).toBeCloseTo(-12.8, 1)
})

describe('nonsense is refused at its path', () => {
  test.each<[string, (one: Document) => void]>([
    ['hours[3].airTemperatureC: expected a number from -60 to 50 °C, got 60', (d) => (hour(d, 3).airTemperatureC = 60)],
    [
      'hours[3].airTemperatureC: expected a number from -60 to 50 °C, got "NaN"',
      (d) => (hour(d, 3).airTemperatureC = 'NaN'),
    ],
    [
      'hours[4].relativeHumidity: expected a number from 0 to 100 %, got 140',
      (d) => (hour(d, 4).relativeHumidity = 140),
    ],
    ['hours[5].dewPointC: expected at most airTemperatureC', (d) => (hour(d, 5).dewPointC = 9)],
    ['hours[6].precipitationMm: expected a number from 0', (d) => (hour(d, 6).precipitationMm = -0.1)],
    ['hours[7].cloudCover: expected a number from 0 to 1', (d) => (hour(d, 7).cloudCover = 75)],
    ['hours: expected at least one hour', (d) => (d.hours = [])],
    ['hours[8].time: expected 2027-01-13T01:00:00Z', (d) => d.hours.splice(8, 1)],
    ['hours[9].time: expected 2027-01-13T02:00:00Z', (d) => d.hours.splice(8, 0, { ...hour(d, 8) })],
    ['hours[1].time: expected', (d) => d.hours.reverse()],
    // Local times, as a clock change repeats them: the second 01:00 is not an hour after the first.
    [
      'hours[1].time: expected 2027-11-07T02:00:00Z',
      (d) => {
        hour(d, 0).time = '2027-11-07T01:00:00Z'
        hour(d, 1).time = '2027-11-07T01:00:00Z'
      },
    ],
    ['hours[0].time: expected an instant in UTC', (d) => (hour(d, 0).time = '2027-11-07T01:00:00-04:00')],
    ['rink.horizonDeg: expected a number from 0 to 90', (d) => (d.rink.horizonDeg = [10, 20])],
    ['rink.shade: expected a number from 0 to 1', (d) => (d.rink.shade = 2)],
    ['hours[0].time: expected an instant in UTC', (d) => (hour(d, 0).time = 'yesterday')],
    ['hours[0].time: expected an instant in UTC', (d) => (hour(d, 0).time = '2027-01-12T17:00:00')],
    ['rink.timeZone: expected an IANA time zone', (d) => (d.rink.timeZone = 'Mars/Olympus')],
    ['rink.latitude: expected a number from -90 to 90', (d) => (d.rink.latitude = 91)],
    ['rink.lengthM: expected a number from 1', (d) => (d.rink.lengthM = 0)],
    ['rink.shelter: expected open, suburban, tight or a number from 0 to 1', (d) => (d.rink.shelter = 'windy')],
    ['sheet.temperatureC: expected a number from -50 to 0', (d) => (d.sheet.temperatureC = 4)],
    ['water.flowLPerMin: expected a number', (d) => (d.water.flowLPerMin = 0)],
    ['available[0].to: expected a time such as 17:00', (d) => (d.available = [{ from: '17:00', to: 'late' }])],
    ['maxPasses:', (d) => (d.maxPasses = 2.5)],
    ['members[0]: expected the same 48 hours', (d) => (d.members = [d.hours.slice(0, 10)])],
    [
      'members[0][2].windSpeedMps: expected',
      (d) => (d.members = [d.hours.map((one, i) => (i === 2 ? { ...one, windSpeedMps: -1 } : one))]),
    ],
    ['water:', (d) => delete (d as Loose).water],
  ])('%s', (expected, spoil) => {
    const faults = faultsOf(spoil)
    expect(
      faults.some((fault) => fault.startsWith(expected)),
      faults.join('\n'),
    ).toBe(true)
  })

  test('two faults make two lines', () => {
    const faults = faultsOf((d) => {
      d.rink.skyView = 2
      hour(d, 0).windSpeedMps = -3
    })
    expect(faults).toHaveLength(2)
  })
})

test('the word NaN where a number belongs is refused at its path, and kept inside strings', () => {
  expect(parseScoreText('{"a":NaN,"b":[-Infinity],"c":"NaN \\" NaN"}')).toEqual({
    a: 'NaN',
    b: ['-Infinity'],
    c: 'NaN " NaN',
  })
  expect(() => parseScoreText('{"a":')).toThrow(SyntaxError)
})
