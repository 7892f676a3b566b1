// What a report should have been in a yard, by the model: minutes until set, or thickness.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { advanceSheet, createSheet, pourLayer, reportSheet, type SheetState } from '@/lib/physics/sheet'
import { minutesToSet } from '@/lib/physics/layer'
import { prepareHours } from '@/lib/physics/prepare'
import type { PreparedHour } from '@/lib/physics/types'
import { readStoredSheet } from '../stored-sheet'
import { SHELTER_NODES, SKY_VIEW_NODES } from './figures'
import type { Yard, YardLesson, YardReport } from './types'

export type Place = Pick<YardLesson, 'latitudeDeg' | 'longitudeDeg'>

/**
 * What a report would read if the yard were so.
 *
 * @param yard Shelter and open sky. [0-1]
 * @param report Report; ranges at the fields.
 * @param place Latitude and longitude. [°]
 * @returns Minutes from the last pour until set [min], or thickness [mm]; null when weather is missing before the
 *   report.
 *
 * Source: minutesToSet, advanceSheet.
 */
export function expectedIn(yard: Yard, report: YardReport, place: Place): number | null {
  const prepared = prepareHours(report.hours, { ...place, ...yard })
  const firstUnknown = prepared.findIndex((hour) => !hour.isKnown)
  const hours = firstUnknown < 0 ? prepared : prepared.slice(0, firstUnknown)
  const first = Date.parse(report.hours[0]!.time)
  if (first + hours.length * HOUR_MILLIS < Date.parse(report.at)) return null
  const sheet = startingSheet(report)
  if (report.kind === 'drilled') {
    const until = Math.round((Date.parse(report.at) - first) / HOUR_MILLIS)
    return reportSheet(carry(sheet, hours.slice(0, until), report.poured)).thicknessMm
  }
  const layer = report.poured.at(-1)!
  const hoursIn = (Date.parse(layer.at) - first) / HOUR_MILLIS
  const index = Math.floor(hoursIn)
  const below = carry(sheet, hours.slice(0, index), report.poured.slice(0, -1))
  const minutes = minutesToSet(below, hours, index, hoursIn - index, layer)
  // Not set within the hours: taken as twice their length, so that a report of "set" still pulls.
  return minutes ?? 2 * 60 * (hours.length - hoursIn)
}

/** A layer enters the sheet at the full hour nearest to its time, as in the judged runs. */
function carry(start: SheetState, hours: readonly PreparedHour[], poured: YardReport['poured']): SheetState {
  const entryMillis = poured.map(({ at }) => Math.round(Date.parse(at) / HOUR_MILLIS) * HOUR_MILLIS)
  return hours.reduce((before, hour) => {
    const entering = poured.filter((_, index) => entryMillis[index] === hour.startsAtMillis)
    return advanceSheet(entering.reduce(pourLayer, before), hour)
  }, start)
}

/**
 * The sheet at the start of the report's hours.
 *
 * @param report Report; ranges at the fields.
 * @returns Sheet.
 * @throws RangeError for a sheet out of range.
 *
 * Source: createSheet, readStoredSheet.
 */
export function startingSheet({ sheet }: YardReport): SheetState {
  return 'state' in sheet ? readStoredSheet(sheet.state) : createSheet(sheet)
}

/**
 * As expectedIn for any yard, worked out at a few and read off between them: fits ask thousands of times. A set time
 * is read off as its inverse, which is nearly straight in both factors.
 *
 * @param report Report; ranges at the fields.
 * @param place Latitude and longitude. [°]
 * @returns Function of the yard, as expectedIn [min] or [mm]; null as there.
 *
 * Source: bilinear between nodes; ours.
 */
export function expectedInAny(report: YardReport, place: Place): ((yard: Yard) => number) | null {
  const inverse = report.kind !== 'drilled'
  const table: number[][] = []
  for (const shelter of SHELTER_NODES) {
    const row: number[] = []
    for (const skyView of SKY_VIEW_NODES) {
      const value = expectedIn({ shelter, skyView }, report, place)
      if (value === null) return null
      row.push(inverse ? 1 / Math.max(1, value) : value)
    }
    table.push(row)
  }
  return (yard) => {
    const value = between(SHELTER_NODES, yard.shelter, (i) =>
      between(SKY_VIEW_NODES, yard.skyView, (j) => table[i]![j]!),
    )
    return inverse ? 1 / value : value
  }
}

/** Straight line between the two nodes around a place; a hair outside, the outer line goes on. */
function between(nodes: readonly number[], at: number, valueAt: (node: number) => number): number {
  const above = nodes.findIndex((node) => node >= at)
  const right = above < 0 ? nodes.length - 1 : Math.max(1, above)
  const left = nodes[right - 1]!
  const share = (at - left) / (nodes[right]! - left)
  return valueAt(right - 1) * (1 - share) + valueAt(right) * share
}
