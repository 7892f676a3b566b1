// Reports from invented yards: what a keeper would write down of floods that plain explicit columns say the truth about.
import { normalFrom, seededUniform } from '@/lib/advice/random'
import type { LayerReport, Yard } from '@/lib/advice/yard/types'
import { DAY_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { groundHeatWm2 } from '@/lib/physics/ground'
import { prepareHours } from '@/lib/physics/prepare'
import type { HourlyRecord } from '@/lib/physics/types'
import { explicitMinutesToSet } from './explicit-column'
import { randomNight, seeded } from './random-weather'

export const PLACE = { latitudeDeg: 46, longitudeDeg: -75 }
/** As most keepers set it. */
export const PRIOR: Yard = { shelter: 0.6, skyView: 0.85 }

export interface InventedNight {
  hours: HourlyRecord[]
  sheetC: number
  layer: { layerMm: number; temperatureC: number }
}

/** Frosty nights of all sorts, each on its own date, the flood poured at the first hour. */
export function inventedNights(seed: number, count: number): InventedNight[] {
  return Array.from({ length: count }, (_, index) => {
    const nightSeed = seed * 1000 + index
    const pick = seeded(nightSeed)
    const hours = randomNight(nightSeed, 30, pick(-14, -5)).map((record) => ({
      ...record,
      time: new Date(Date.parse(record.time) + index * DAY_MILLIS).toISOString(),
    }))
    return { hours, sheetC: pick(-5, -1), layer: { layerMm: pick(2, 5), temperatureC: pick(4, 12) } }
  })
}

/** Minutes that a flood takes in a yard, by the explicit column. */
export function trueMinutes({ hours, sheetC, layer }: InventedNight, yard: Yard): number | null {
  return explicitMinutesToSet({
    sheet: [
      { thicknessMm: 10, temperatureC: sheetC },
      { thicknessMm: 90, temperatureC: sheetC, cellMm: 5 },
    ],
    layer,
    hours: prepareHours(hours, { ...PLACE, ...yard }),
    groundWm2: groundHeatWm2('liner'),
  })
}

/** A report of such a flood, seen so many minutes after the pour. */
export function reportAfter(
  { hours, sheetC, layer }: InventedNight,
  minutes: number,
  kind: LayerReport['kind'] = 'set',
): LayerReport {
  const pouredAt = hours[0]!.time
  return {
    kind,
    hours,
    sheet: { thicknessMm: 100, temperatureC: sheetC, snowCoverCm: 0, base: 'liner' },
    poured: [{ at: pouredAt, ...layer }],
    at: new Date(Date.parse(pouredAt) + minutes * MINUTE_MILLIS).toISOString(),
  }
}

/** Scatter of what people write down: a tenth of the time, then the nearest ten minutes. */
export function asWritten(seed: number): (minutes: number) => number {
  const normal = normalFrom(seededUniform(seed))
  return (minutes) => Math.max(10, Math.round((minutes * Math.exp(0.1 * normal())) / 10) * 10)
}

/** Reports of set times of these nights in a yard, scattered; nights that never set are not told of. */
export function setReports(nights: readonly InventedNight[], yard: Yard, seed = 1): LayerReport[] {
  const written = asWritten(seed)
  return nights.flatMap((night) => {
    const minutes = trueMinutes(night, yard)
    return minutes === null ? [] : [reportAfter(night, written(minutes))]
  })
}
