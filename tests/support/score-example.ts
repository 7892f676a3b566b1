// An invented two days for `npm run score`: a clear cold night, snow towards morning, a grey mild day, a damp second night.
import type { JudgeInput } from '@/lib/advice/types'
import type { HourlyRecord } from '@/lib/physics/types'

const FIRST = Date.parse('2027-01-12T17:00:00Z')
const HOUR = 3_600_000

// Every third hour from local noon; the hours between are on the straight line.
const AIR = [-3, -3.6, -6.2, -8.4, -9.8, -9.2, -7, -5, -2.4, -1.4, -1, -1.3, -1.8, -2, -2.2, -2.4, -2.4]
const SPREAD = [4, 4.2, 4.6, 4.4, 4, 3.2, 1.4, 0.8, 0.9, 0.8, 0.6, 0.5, 0.4, 0.4, 0.4, 0.5, 0.5]
const CLOUD = [0.5, 0.3, 0.1, 0.05, 0.05, 0.5, 1, 1, 1, 1, 1, 1, 1, 1, 1, 1, 1]
const WIND = [4.2, 3.6, 2.6, 2.2, 2, 2.4, 3, 3.4, 3, 2.4, 2, 1.6, 1.4, 1.2, 1.2, 1.4, 1.4]
/** Centimetres an hour, from 5 am local on the first night. */
const SNOW = new Map([
  [17, 0.4],
  [18, 0.8],
  [19, 1],
  [20, 0.7],
  [21, 0.5],
])

function at(row: readonly number[], hour: number): number {
  const left = Math.floor(hour / 3)
  const share = hour / 3 - left
  const value = (row[left] ?? 0) * (1 - share) + (row[left + 1] ?? row[left] ?? 0) * share
  return Math.round(value * 100) / 100
}

function sunWm2(hour: number): number {
  const local = (12 + hour) % 24
  const sun = Math.max(0, Math.sin((Math.PI * (local - 7.7)) / 9.2))
  return local > 7.7 && local < 16.9 ? Math.round(420 * sun * (1 - 0.7 * at(CLOUD, hour))) : 0
}

export function scoreExampleHours(): HourlyRecord[] {
  return Array.from({ length: 48 }, (_, hour) => {
    const snowfallCm = SNOW.get(hour) ?? 0
    const airTemperatureC = at(AIR, hour)
    return {
      time: new Date(FIRST + hour * HOUR).toISOString().replace('.000Z', 'Z'),
      airTemperatureC,
      dewPointC: Math.round((airTemperatureC - at(SPREAD, hour)) * 10) / 10,
      windSpeedMps: at(WIND, hour),
      windGustMps: Math.round(at(WIND, hour) * 16) / 10,
      cloudCover: at(CLOUD, hour),
      shortwaveWm2: sunWm2(hour),
      precipitationMm: Math.round(snowfallCm * 7) / 10,
      rainMm: 0,
      snowfallCm,
      pressureHpa: 1008,
    }
  })
}

export function scoreExample(): JudgeInput {
  return {
    now: '2027-01-12T21:42:00Z',
    rink: {
      latitude: 45.9,
      longitude: -77.3,
      timeZone: 'America/Toronto',
      lengthM: 10,
      widthM: 10,
      shelter: 'suburban',
      skyView: 0.85,
      base: 'liner',
      phase: 'skating',
    },
    water: { temperatureC: 6, flowLPerMin: 25, layerMm: 3, fillDepthMm: 120 },
    sheet: { thicknessMm: 90, temperatureC: -4, snowCoverCm: 0 },
    available: [{ from: '17:00', to: '01:00' }],
    maxPasses: 3,
    hours: scoreExampleHours(),
  }
}
