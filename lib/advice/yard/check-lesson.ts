// Refuses reports that contradict themselves before anything is learned from them.
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { inRange } from '@/lib/physics/check'
import type { YardLesson, YardReport } from './types'

/** A layer that was watched for longer than this was not watched. [min] Ours: four days. */
const LONGEST_WATCH_MINUTES = 4 * 24 * 60

/**
 * Refuses a lesson that no yard can be learned from.
 *
 * @param lesson Place [°], prior [0-1] and reports; ranges at the fields.
 * @throws RangeError naming what is wrong.
 *
 * Source: ours.
 */
export function checkLesson({ latitudeDeg, longitudeDeg, prior, reports }: YardLesson): void {
  inRange('latitudeDeg [°]', latitudeDeg, -90, 90)
  inRange('longitudeDeg [°]', longitudeDeg, -180, 180)
  inRange('prior.shelter [0-1]', prior.shelter, 0, 1)
  inRange('prior.skyView [0-1]', prior.skyView, 0, 1)
  for (const report of reports) checkReport(report)
}

function checkReport(report: YardReport): void {
  const first = report.hours[0]
  if (!first) throw new RangeError('hours must not be empty')
  const firstMillis = instant('hours[0].time', first.time)
  const endMillis = firstMillis + report.hours.length * HOUR_MILLIS
  const atMillis = inRange('at [within the hours]', instant('at', report.at), firstMillis, endMillis)
  let lastMillis = firstMillis
  for (const layer of report.poured) {
    inRange('layerMm [mm]', layer.layerMm, 0.01, 500)
    inRange('temperatureC [°C]', layer.temperatureC, 0, 100)
    lastMillis = inRange('poured.at [oldest first, before at]', instant('poured.at', layer.at), lastMillis, atMillis)
  }
  if (report.kind === 'drilled') {
    inRange('thicknessMm [mm]', report.thicknessMm, 0, 3000)
    return
  }
  if (report.poured.length === 0)
    throw new RangeError(`a report of kind ${report.kind} needs the layer that was poured`)
  inRange('at [min after the pour]', (atMillis - lastMillis) / MINUTE_MILLIS, 1, LONGEST_WATCH_MINUTES)
  inRange('uncertaintyMinutes [min]', report.uncertaintyMinutes ?? 1, 1, 600)
}

function instant(name: string, text: string): number {
  const millis = Date.parse(text)
  if (Number.isNaN(millis)) throw new RangeError(`${name} must be an ISO 8601 instant, got ${text}`)
  return millis
}
