// Floods on measured winter nights in yards of all sorts, by plain explicit columns; snow counts as swept away as it falls.
import { normalFrom, seededUniform } from '@/lib/advice/random'
import { expectedIn } from '@/lib/advice/yard/expected'
import type { LayerReport, Yard } from '@/lib/advice/yard/types'
import { DAY_MILLIS, HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { prepareHours } from '@/lib/physics/prepare'
import type { HourlyRecord } from '@/lib/physics/types'
import { JOKIOINEN_SITE, readJokioinen } from './measured-winters'
import { carryPlainSheet, floodOnPlainSheet, plainSheet } from './true-nights'

/** The sheet is known at noon and poured on at 18:00 UTC, 20:00 by the rink's clock. */
const HOURS_BEFORE = 6
const HOURS_AFTER = 24
/** Until 7 am. */
const LONGEST_MINUTES = 11 * 60
const LAYER = { layerMm: 3, temperatureC: 8 }
const THICKNESS_MM = 100

export const MEASURED_PLACE = { latitudeDeg: JOKIOINEN_SITE.latitude, longitudeDeg: JOKIOINEN_SITE.longitude }

/** Hours from noon on of each day from one date to another whose record has no gap. */
export function measuredNights(fromAt: Date, toAt: Date): HourlyRecord[][] {
  const records = readJokioinen()
  const indexAt = new Map(records.map((record, index) => [Date.parse(record.time), index]))
  const nights: HourlyRecord[][] = []
  for (let noon = fromAt.getTime(); noon <= toAt.getTime(); noon += DAY_MILLIS) {
    const first = indexAt.get(noon)
    const last = indexAt.get(noon + (HOURS_BEFORE + HOURS_AFTER - 1) * HOUR_MILLIS)
    if (first === undefined || last !== first + HOURS_BEFORE + HOURS_AFTER - 1) continue
    nights.push(records.slice(first, last + 1).map((record) => ({ ...record, precipitationMm: 0 })))
  }
  return nights
}

export interface YardNight {
  report: LayerReport
  trueMinutes: number
}

/** The nights on which a flood sets by 7 am in a yard, as the keeper would report them: a tenth off, to ten minutes. */
export function yardNights(nights: readonly HourlyRecord[][], yard: Yard, seed: number): YardNight[] {
  const normal = normalFrom(seededUniform(seed))
  return nights.flatMap((records) => {
    const scatter = Math.exp(0.1 * normal())
    const hours = prepareHours(records, { ...MEASURED_PLACE, ...yard })
    const sheetC = Math.min(-1, records[0]!.airTemperatureC! / 2)
    const sheet = plainSheet(THICKNESS_MM, sheetC)
    for (let index = 0; index < HOURS_BEFORE; index += 1) carryPlainSheet(sheet, hours[index]!)
    const trueMinutes = floodOnPlainSheet(sheet, LAYER, hours.slice(HOURS_BEFORE), LONGEST_MINUTES).setMinutes
    if (trueMinutes === null) return []
    const pouredAt = records[HOURS_BEFORE]!.time
    const saidMinutes = Math.max(10, Math.round((trueMinutes * scatter) / 10) * 10)
    const report: LayerReport = {
      kind: 'set',
      hours: records,
      sheet: { thicknessMm: THICKNESS_MM, temperatureC: sheetC, snowCoverCm: 0, base: 'liner' },
      poured: [{ at: pouredAt, ...LAYER }],
      at: new Date(Date.parse(pouredAt) + saidMinutes * MINUTE_MILLIS).toISOString(),
    }
    return [{ report, trueMinutes }]
  })
}

/** Mean of how far off the set time is when foretold with a yard's factors. [min] */
export function meanMinutesOff(nights: readonly YardNight[], yard: Yard): number {
  const off = nights.map(({ report, trueMinutes }) =>
    Math.abs(Math.min(LONGEST_MINUTES, expectedIn(yard, report, MEASURED_PLACE)!) - trueMinutes),
  )
  return off.reduce((sum, one) => sum + one, 0) / off.length
}
