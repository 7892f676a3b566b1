// The night on the front page: invented weather of a clear, cold evening with snow before dawn, judged by the real model.
import { judge, MODEL_VERSION } from '@/lib/advice/judge'
import { nightBounds } from '@/lib/advice/night'
import { summariseNight } from '@/lib/advice/night-summary'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { HourlyRecord } from '@/lib/physics/types'
import type { TonightView } from '@/lib/schemas/tonight-view'
import { METRIC } from '@/lib/units'

const TIME_ZONE = 'America/Toronto'
const NIGHT_DATE = '2027-01-12'
const PLACE = { latitude: 45.8, longitude: -77.1 }
const { startsAt, endsAt } = nightBounds(NIGHT_DATE, TIME_ZONE)
const NOW = new Date(startsAt.getTime() + 3.5 * HOUR_MILLIS)
/** By hours after noon. */
const SUNSET_HOUR = 4.7
const SUNRISE_HOUR = 19.7

type Sample = Pick<TonightView, 'rink' | 'viewer' | 'night' | 'readAt'> & {
  outlook: NonNullable<TonightView['outlook']>
}

let judged: Sample | undefined

/** Judged once: the same weather gives the same night. */
export function sampleNight(): Sample {
  judged ??= judgeSample()
  return judged
}

/** Air falls from -3 to -11 °C and rises again; cloud closes in after 2 am, snow falls from 4 to 9 am. */
function weatherAt(hour: number): HourlyRecord {
  const cooling = Math.sin((Math.PI / 2) * Math.min(Math.max((hour - 2) / 11, 0), 1))
  const warming = Math.min(Math.max((hour - 14) / 10, 0), 1)
  const airTemperatureC = -3 - 8 * cooling + 7 * warming
  const isSnowing = hour >= 16 && hour < 21
  const isDay = hour < SUNSET_HOUR || hour > SUNRISE_HOUR
  return {
    time: new Date(startsAt.getTime() + hour * HOUR_MILLIS).toISOString().replace('.000Z', 'Z'),
    airTemperatureC,
    dewPointC: airTemperatureC - (isSnowing ? 1 : 4),
    windSpeedMps: hour > 13 ? 4 : 2.5,
    windGustMps: hour > 13 ? 7 : 4,
    cloudCover: hour > 13 ? 0.95 : 0.1,
    shortwaveWm2: isDay ? 120 : 0,
    precipitationMm: isSnowing ? 0.7 : 0,
    rainMm: 0,
    snowfallCm: isSnowing ? 0.8 : 0,
    pressureHpa: 1012,
  }
}

function judgeSample(): Sample {
  const water = { temperatureC: 6, flowLPerMin: 25, layerMm: 3, fillDepthMm: 120 }
  const rink = {
    ...PLACE,
    timeZone: TIME_ZONE,
    lengthM: 12,
    widthM: 9,
    shelter: 'suburban',
    skyView: 0.85,
    base: 'liner',
    phase: 'skating',
  } as const
  const judgement = judge({
    now: NOW.toISOString(),
    rink,
    water,
    sheet: { thicknessMm: 90, temperatureC: -3, snowCoverCm: 0 },
    available: [{ from: '18:00', to: '01:00' }],
    maxPasses: 3,
    hours: Array.from({ length: 48 }, (_, hour) => weatherAt(hour)),
  })
  const summary = summariseNight(judgement, { nightDate: NIGHT_DATE, now: NOW, timeZone: TIME_ZONE })
  const iso = (hour: number) => new Date(startsAt.getTime() + hour * HOUR_MILLIS).toISOString()
  return {
    readAt: NOW.toISOString(),
    rink: { id: '', name: 'A sample rink', placeName: '', timeZone: TIME_ZONE, phase: 'skating', people: 1, water },
    viewer: { id: '', role: 'skater', units: METRIC, clock: '12', mutedThrough: null },
    night: {
      date: NIGHT_DATE,
      startsAt: startsAt.toISOString(),
      endsAt: endsAt.toISOString(),
      sunsetAt: iso(SUNSET_HOUR),
      sunriseAt: iso(SUNRISE_HOUR),
    },
    outlook: {
      judgedAt: NOW.toISOString(),
      modelVersion: MODEL_VERSION,
      summary,
      hours: judgement.hours.filter((hour) => hour.time < endsAt.toISOString()),
      passes: summary.passes.map((pass, index) => ({
        ...pass,
        number: index + 1,
        temperatureC: water.temperatureC,
        flowLPerMin: water.flowLPerMin,
        warnings: [],
        limits: [],
        poured: null,
      })),
      ownPlan: null,
      wouldTurn: [],
      days: [],
      thaws: [],
    },
  }
}
