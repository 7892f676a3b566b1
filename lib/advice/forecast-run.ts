// One forecast run seen by the advice: prepared hours, running sums, and the sheet carried through them.
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { advanceSheet, createSheet, pourLayer, reportSheet, type SheetState } from '@/lib/physics/sheet'
import { minutesToSet, type Layer } from '@/lib/physics/layer'
import type { PreparedHour } from '@/lib/physics/types'
import { deepestFillMm } from './fill-water'
import { readStoredSheet } from './stored-sheet'
import type { Setting } from './setting'
import type { SheetReport } from './types'

export interface ForecastRun {
  hours: PreparedHour[]
  /** Rain and snow before each hour, water equivalent; one more entry than hours. [mm] */
  wetBefore: Float64Array
  /** Unknown hours before each hour; one more entry than hours. */
  unknownBefore: Int32Array
  /** The sheet at the start of each hour, poured layers on it. */
  sheets: SheetState[]
  /** The same before the layers poured at that hour, and one more at the end: what is kept to resume from. */
  carried: SheetState[]
  /** At the end of each hour; empty when not wanted. */
  reports: SheetReport[]
  /** When the last layer that was really poured is set, or the end of the run when it is not; null when none was. */
  pouredSetMillis: number | null
}

/**
 * Water in what falls; where only the depth of snow is given, a centimetre is taken as a millimetre.
 *
 * @param hour Prepared hour, known.
 * @returns Water. [mm]
 *
 * Source: common practice, 1 cm of snow is about 1 mm of water; from memory.
 */
export function wetMmOf(hour: PreparedHour): number {
  return hour.precipitationMm > 0 ? hour.precipitationMm : hour.snowfallCm
}

/** Hours that a run has in common with another, from the first one on. */
export interface SharedStart {
  run: ForecastRun
  count: number
}

/**
 * Carries the sheet of the input through a run of hours.
 *
 * @param setting Rink, from makeSetting.
 * @param hours Prepared hours of the run.
 * @param shared What it has in common with the main run: sheets are taken from there, and no reports are made.
 * @returns The run: its hours, the sheet at the start of each, and what a keeper would measure.
 *
 * Source: advanceSheet, hour by hour.
 */
export function carrySheet(setting: Setting, hours: PreparedHour[], shared?: SharedStart): ForecastRun {
  const from = shared?.count ?? 0
  const run: ForecastRun = {
    hours,
    wetBefore: new Float64Array(hours.length + 1),
    unknownBefore: new Int32Array(hours.length + 1),
    sheets: shared?.run.sheets.slice(0, from) ?? [],
    carried: shared?.run.carried.slice(0, from) ?? [],
    reports: [],
    pouredSetMillis: null,
  }
  const asOf = setting.input.sheet.asOf
  const asOfMillis = asOf === undefined ? setting.firstMillis : Date.parse(asOf)
  const poured = (setting.input.poured ?? []).filter((layer) => entryMillis(layer.at) >= asOfMillis)
  let sheet = shared?.run.carried[from] ?? startingSheet(setting)
  for (let index = 0; index < hours.length; index += 1) {
    const hour = hours[index] as PreparedHour
    run.wetBefore[index + 1] = (run.wetBefore[index] as number) + wetMmOf(hour)
    run.unknownBefore[index + 1] = (run.unknownBefore[index] as number) + (hour.isKnown ? 0 : 1)
    if (index < from) continue
    run.carried.push(sheet)
    for (const layer of poured) {
      if (entryMillis(layer.at) === hour.startsAtMillis) sheet = pourLayer(sheet, layer)
      noteWhenSet(run, sheet, index, layer)
    }
    run.sheets.push(sheet)
    if (hour.startsAtMillis >= asOfMillis) sheet = advanceSheet(sheet, hour)
    if (!shared) run.reports.push(reportSheet(sheet))
  }
  run.carried.push(sheet)
  return run
}

/** A layer enters the sheet at the full hour nearest to its time. */
function entryMillis(at: string): number {
  return Math.round(Date.parse(at) / HOUR_MILLIS) * HOUR_MILLIS
}

/** When a poured layer is set is reckoned from its own minute, not from the hour at which it enters the sheet. */
function noteWhenSet(run: ForecastRun, sheet: SheetState, index: number, poured: Layer & { at: string }): void {
  const { startsAtMillis } = run.hours[index] as PreparedHour
  const atMillis = Date.parse(poured.at)
  const fraction = (atMillis - startsAtMillis) / HOUR_MILLIS
  if (fraction < 0 || fraction >= 1) return
  const before = fraction < 0.5 ? (run.carried[index] as SheetState) : sheet
  const minutes = minutesToSet(before, run.hours, index, fraction, poured)
  const endMillis = startsAtMillis + (run.hours.length - index) * HOUR_MILLIS
  run.pouredSetMillis = minutes === null ? endMillis : atMillis + minutes * MINUTE_MILLIS
}

function startingSheet(setting: Setting): SheetState {
  const { input } = setting
  if (input.sheet.state !== undefined) return readStoredSheet(input.sheet.state)
  const { thicknessMm, temperatureC, snowCoverCm, liquidMm = 0 } = input.sheet
  const { temperatureC: waterTemperatureC } = input.water
  const isFloating = input.rink.phase === 'freezing'
  return createSheet({
    thicknessMm,
    temperatureC,
    snowCoverCm,
    liquidMm,
    unfrozenBelowMm: isFloating ? Math.max(0, deepestFillMm(setting) - thicknessMm * ICE_TO_WATER) : 0,
    waterTemperatureC: Math.min(40, waterTemperatureC),
    base: input.rink.base,
  })
}

/** Depth of water that a depth of ice was: ice of 916.7 kg/m³ at 0 °C (CRC Handbook, IAPWS). */
export const ICE_TO_WATER = 0.9167
