// On a night to hold off: what would make it good. The night is judged again with one thing changed, and the smallest change told.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { prepareHours } from '@/lib/physics/prepare'
import type { HourlyRecord, PreparedHour } from '@/lib/physics/types'
import { judgeFloodStart } from './flood-factors'
import { carrySheet } from './forecast-run'
import { nightBounds } from './night'
import { packNight, type NightModel } from './night-model'
import { isGood, isHourAvailable } from './score-hours'
import type { JudgeInput, Phase } from './types'

/** Degrees tried, in order. Ours: beyond 10 °C it is another night. [°C] */
const COLDER_C = [1, 2, 3, 4, 5, 6, 8, 10]
/** Cloud below this share is no reason to wish for a clear sky. Ours. [0-1] */
const SOME_CLOUD = 0.3
/** Wind that is called calm. Ours. [m/s at 10 m] */
const CALM_MPS = 1
const KELVIN = 273.15

export interface WhatWouldTurn {
  code: 'colder' | 'clear_sky' | 'calm' | 'dry' | 'thinner'
  /** `goodAt` is the first good hour then; `byC` and `layerMm` say how much. */
  values: Record<string, number | string>
}

interface Change {
  code: WhatWouldTurn['code']
  values: WhatWouldTurn['values']
  hour?: (hour: HourlyRecord) => Partial<HourlyRecord>
  layerMm?: number
}

const WITH_A_SHEET: readonly Phase[] = ['freezing', 'skating', 'thaw']

/**
 * What would turn a night without a good hour.
 *
 * @param input What the night was judged from.
 * @param nightDate 'yyyy-MM-dd', see night.ts.
 * @returns Each change that alone makes an hour of the keeper's good; none when no single one does, in phases without
 *   a sheet to flood, or when the forecast does not reach the night.
 * @throws RangeError as `judge` does.
 *
 * Source: ours: each change is tried on the night's own model.
 */
export function whatWouldTurn(input: JudgeInput, nightDate: string): WhatWouldTurn[] {
  if (!WITH_A_SHEET.includes(input.rink.phase)) return []
  const model = packNight(input, nightDate)
  if (!model) return []
  const first = input.hours.findIndex(({ time }) => time === model.hours[0]?.time)
  const records = input.hours.slice(first, first + model.hours.length)
  const toMillis = nightBounds(nightDate, input.rink.timeZone).endsAt.getTime()
  const turnedBy = ({ code, values, hour, layerMm }: Change): WhatWouldTurn[] => {
    const goodAt = firstGoodHour(model, changed(model, records, hour), toMillis, layerMm)
    return goodAt === null ? [] : [{ code, values: { ...values, goodAt } }]
  }
  const others = wishes(records, model.setting.nowMillis, toMillis, input.water.layerMm).flatMap(turnedBy)
  for (const byC of COLDER_C) {
    const [colder] = turnedBy({ code: 'colder', values: { byC }, hour: colderBy(byC) })
    if (colder) return [...others, colder]
  }
  return others
}

/** The changes worth trying, by what there is to change. */
function wishes(records: readonly HourlyRecord[], fromMillis: number, toMillis: number, layerMm: number): Change[] {
  const hours = records.filter(({ time }) => Date.parse(time) + HOUR_MILLIS > fromMillis && Date.parse(time) < toMillis)
  const changes: Change[] = []
  if (hours.some(({ cloudCover }) => (cloudCover ?? 0) > SOME_CLOUD)) {
    changes.push({ code: 'clear_sky', values: {}, hour: () => ({ cloudCover: 0, longwaveDownWm2: null }) })
  }
  if (hours.some(({ precipitationMm, snowfallCm }) => (precipitationMm ?? 0) > 0 || (snowfallCm ?? 0) > 0)) {
    changes.push({ code: 'dry', values: {}, hour: () => ({ precipitationMm: 0, rainMm: 0, snowfallCm: 0 }) })
  }
  if (hours.some(({ windSpeedMps }) => (windSpeedMps ?? 0) > CALM_MPS)) {
    changes.push({ code: 'calm', values: {}, hour: calm })
  }
  changes.push({ code: 'thinner', values: { layerMm: layerMm / 2 }, layerMm: layerMm / 2 })
  return changes
}

function calm({ windSpeedMps }: HourlyRecord): Partial<HourlyRecord> {
  return { windSpeedMps: windSpeedMps === null ? null : Math.min(windSpeedMps, CALM_MPS), windGustMps: null }
}

/** Air, dew point and, where it was given, the sky's radiation, which goes as the fourth power of the temperature. */
function colderBy(byC: number) {
  return (hour: HourlyRecord): Partial<HourlyRecord> => {
    const { airTemperatureC, dewPointC, longwaveDownWm2 } = hour
    if (airTemperatureC === null) return {}
    const share = ((airTemperatureC - byC + KELVIN) / (airTemperatureC + KELVIN)) ** 4
    return {
      airTemperatureC: airTemperatureC - byC,
      dewPointC: dewPointC === null ? null : dewPointC - byC,
      ...(longwaveDownWm2 == null ? {} : { longwaveDownWm2: longwaveDownWm2 * share }),
    }
  }
}

/** The night's hours with every hour from now on changed. */
function changed(
  { setting, hours }: NightModel,
  records: readonly HourlyRecord[],
  hour: Change['hour'],
): PreparedHour[] {
  if (!hour) return hours
  const isToCome = ({ time }: HourlyRecord) => Date.parse(time) + HOUR_MILLIS > setting.nowMillis
  return prepareHours(
    records.map((record) => (isToCome(record) ? { ...record, ...hour(record) } : record)),
    setting.site,
  )
}

function firstGoodHour(
  { setting }: NightModel,
  hours: PreparedHour[],
  toMillis: number,
  layerMm = setting.layer.layerMm,
): string | null {
  const run = carrySheet(setting, hours)
  const layered = { ...setting, layer: { ...setting.layer, layerMm } }
  for (const [index, { isKnown, startsAtMillis, time }] of hours.entries()) {
    if (startsAtMillis + HOUR_MILLIS <= setting.nowMillis || startsAtMillis >= toMillis) continue
    if (isKnown && isHourAvailable(setting, startsAtMillis) && isGood(judgeFloodStart(layered, run, index))) return time
  }
  return null
}
