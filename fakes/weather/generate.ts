// The weather of one hour at one place in one scenario: a pure function, so that every answer tells the same story.
import { getPosition } from 'suncalc'
import { NIGHTS, type CurveField, type NightSketch, type Points } from './nights'
import { noise } from './noise'
import { solarOffsetHours, type Place } from './place'
import { SCENARIOS, type Scenario, type ScenarioName } from './scenarios'

export interface Weather {
  // At the hour
  temperatureC: number
  /** 0-1 */
  humidity: number
  /** 0-1 */
  cloud: number
  windMps: number
  windFromDeg: number
  pressureMslHpa: number
  sunUp: boolean
  // Over the hour that begins
  gustMps: number
  shortwaveWm2: number
  rainMm: number
  snowCm: number
}

export interface Story {
  scenario: ScenarioName
  place: Place
  /** Solar date of tonight, days since 1970. */
  tonight: number
}

/** No rain or snow from its first hour to its last. */
const NONE: Points = [
  [12, 0],
  [35, 0],
]

/** Null where the scenario has a gap. `unixHour` is whole hours since 1970, UTC. */
export function weatherAt(story: Story, unixHour: number): Weather | null {
  const { place } = story
  const scenario: Scenario = SCENARIOS[story.scenario]
  const hour = unixHour + solarOffsetHours(place) - 24 * story.tonight
  const index = Math.floor((hour - 12) / 24)
  const night = nightAt(scenario, index)
  if (night.unknown?.some(([from, to]) => hour - 24 * index >= from && hour - 24 * index < to)) return null

  const read = (field: CurveField) => interpolate(pointsAround(story.scenario, index, field), hour)
  const uneven = (size: number, salt: number) => size * noise(place.latitude, place.longitude, unixHour, salt)
  const cloud = clamp(read('cloud') + uneven(0.03, 1), 0, 1)
  const windMps = Math.max(0.2, read('windMps') + uneven(0.25, 2))
  const cellC = 0.3 * noise(place.latitude, place.longitude)
  return {
    temperatureC: read('temperatureC') + cellC + uneven(0.15, 3),
    humidity: clamp(read('humidity') + uneven(0.01, 4), 0.2, 1),
    cloud,
    windMps,
    windFromDeg: (night.windFromDeg + uneven(15, 5) + 360) % 360,
    pressureMslHpa: read('pressureHpa') + uneven(0.2, 6),
    sunUp: sunHeightDeg(unixHour, place) > 0,
    gustMps: windMps * night.gustFactor,
    shortwaveWm2: shortwave(unixHour, place, cloud),
    rainMm: Math.max(0, read('rainMmPerH')),
    snowCm: Math.max(0, read('snowCmPerH')),
  }
}

function nightAt(scenario: Scenario, index: number): NightSketch {
  const { nights, before } = scenario
  if (index < 0) return NIGHTS[before]
  const name = index < nights.length ? nights[index] : nights[1 + ((index - nights.length) % (nights.length - 1))]
  return NIGHTS[name ?? before]
}

/** Straight lines through the points. */
function interpolate(points: Points, hour: number): number {
  const after = points.findIndex(([h]) => h >= hour)
  const [toHour, toValue] = points[after] ?? [hour, 0]
  const [fromHour, fromValue] = points[after - 1] ?? [toHour, toValue]
  return toHour === fromHour ? toValue : fromValue + ((toValue - fromValue) * (hour - fromHour)) / (toHour - fromHour)
}

/** Kept, since a series of ten days asks for the same points hundreds of times. */
const knownPoints = new Map<string, Points>()

/** The points of a night and its neighbours, in hours from midnight before tonight. */
function pointsAround(name: ScenarioName, index: number, field: CurveField): Points {
  const key = `${name} ${index} ${field}`
  const known = knownPoints.get(key)
  if (known) return known
  const points = [index - 1, index, index + 1].flatMap((i) => {
    const curve = nightAt(SCENARIOS[name], i)[field] ?? NONE
    const own: Points = typeof curve === 'number' ? steady(curve) : curve
    return own.map(([h, value]): [number, number] => [h + 24 * i, value])
  })
  knownPoints.set(key, points)
  return points
}

/** Reached in the afternoon and kept to the morning, so that the change to another night takes hours. */
function steady(value: number): Points {
  return [
    [17, value],
    [31, value],
  ]
}

/** Mean of the hour. Kasten & Czeplak 1980: 910 sin h - 30 W/m² under clear sky, times 1 - 0.75 N^3.4 under cloud N (from memory). */
function shortwave(unixHour: number, place: Place, cloud: number): number {
  const quarters = [0.125, 0.375, 0.625, 0.875].map((part) => {
    const height = (sunHeightDeg(unixHour + part, place) * Math.PI) / 180
    return Math.max(0, 910 * Math.sin(height) - 30)
  })
  const clear = quarters.reduce((sum, value) => sum + value, 0) / quarters.length
  return clear * (1 - 0.75 * cloud ** 3.4)
}

function sunHeightDeg(unixHour: number, place: Place): number {
  return getPosition(new Date(unixHour * 3_600_000), place.latitude, place.longitude).altitude
}

function clamp(value: number, least: number, most: number): number {
  return Math.min(most, Math.max(least, value))
}
