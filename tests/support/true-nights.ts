// What really happens to floods on measured nights, by plain explicit columns that share only the surface fluxes with the model.
import { surfaceBalance } from '@/lib/physics/balance'
import { groundHeatWm2 } from '@/lib/physics/ground'
import type { PreparedHour } from '@/lib/physics/types'
import { explicitMinutesToSet } from './explicit-column'

const FUSION = 333_600
const ICE = { density: 916.7, heat: 2097, conductivity: 2.24 }
const CELL_MM = 5
/** Under the layer the sheet is resolved to the millimetre. */
const FINE_CELLS = 2
const STEP_SECONDS = 4
const LAW_EVERY = 15
const TRACE_MM = 0.1

/** A bare sheet of fixed mass: enthalpy of each cell from the top down, 0 for water at 0 °C. [J/m²] */
export type PlainSheet = Float64Array

const cellKg = (CELL_MM / 1000) * ICE.density

export function plainSheet(thicknessMm: number, temperatureC: number): PlainSheet {
  return new Float64Array(Math.round(thicknessMm / CELL_MM)).fill(cellKg * (ICE.heat * temperatureC - FUSION))
}

const temperatureOf = (enthalpy: number) => Math.min(0, (enthalpy / cellKg + FUSION) / ICE.heat)
const liquidMmOf = (enthalpy: number) => Math.max(0, cellKg + enthalpy / FUSION)

export function meanTemperatureC(sheet: PlainSheet): number {
  return sheet.reduce((sum, one) => sum + temperatureOf(one), 0) / sheet.length
}

/** Carries a bare, swept sheet through an hour. */
export function carryPlainSheet(sheet: PlainSheet, hour: PreparedHour): void {
  const half = CELL_MM / 1000 / 2 / ICE.conductivity
  const ground = groundHeatWm2('liner')
  let surfaceC = temperatureOf(sheet[0]!)
  let law = { loss: 0, slope: 0, around: 0 }
  for (let step = 0; step < 3600 / STEP_SECONDS; step += 1) {
    if (step % LAW_EVERY === 0) {
      const kind = liquidMmOf(sheet[0]!) > 0 ? 'wet' : 'ice'
      const loss = surfaceBalance(hour, kind, surfaceC).netWm2
      law = { loss, slope: loss - surfaceBalance(hour, kind, surfaceC - 1).netWm2, around: surfaceC }
    }
    const topC = temperatureOf(sheet[0]!)
    surfaceC = Math.min(0, (topC / half - law.loss + law.slope * law.around) / (1 / half + law.slope))
    let fromAbove = surfaceC < 0 ? (surfaceC - topC) / half : -(law.loss - law.slope * law.around)
    for (let i = 0; i + 1 < sheet.length; i += 1) {
      const toBelow = (temperatureOf(sheet[i]!) - temperatureOf(sheet[i + 1]!)) / (2 * half)
      sheet[i]! += (fromAbove - toBelow) * STEP_SECONDS
      fromAbove = toBelow
    }
    sheet[sheet.length - 1]! += (fromAbove + ground) * STEP_SECONDS
    // Fully melted cells keep 0 °C: melt water stands on the liner until it freezes again.
    for (let i = 0; i < sheet.length; i += 1) sheet[i] = Math.min(0, sheet[i]!)
  }
}

export interface TrueFlood {
  /** Null when it is not set before more than a trace of rain or snow falls, or before it is needed. */
  setMinutes: number | null
  isGood: boolean
}

/** What becomes of a flood poured at the start of the first hour on a sheet; it must be set within `withinMinutes`. */
export function floodOnPlainSheet(
  sheet: PlainSheet,
  layer: { layerMm: number; temperatureC: number },
  hours: PreparedHour[],
  withinMinutes: number,
): TrueFlood {
  const dryHours = hoursUntilWet(hours)
  const night = hours.slice(0, Math.min(dryHours, Math.ceil(withinMinutes / 60)))
  if (night.length === 0) return { setMinutes: null, isGood: false }
  const liquidMm = sheet.reduce((sum, one) => sum + liquidMmOf(one), 0)
  const setMinutes = explicitMinutesToSet({
    sheet: Array.from(sheet, (one, index) => ({
      thicknessMm: CELL_MM,
      temperatureC: temperatureOf(one),
      cellMm: index < FINE_CELLS ? 1 : CELL_MM,
    })),
    layer: {
      layerMm: layer.layerMm + liquidMm,
      temperatureC: (layer.temperatureC * layer.layerMm) / (layer.layerMm + liquidMm),
    },
    hours: night,
    groundWm2: groundHeatWm2('liner'),
  })
  return { setMinutes, isGood: setMinutes !== null && setMinutes <= withinMinutes }
}

/** Hours from the first until more than a trace has fallen, whole hours counted. */
function hoursUntilWet(hours: PreparedHour[]): number {
  let wetMm = 0
  const wet = hours.findIndex((hour) => (wetMm += hour.precipitationMm) > TRACE_MM + 1e-9)
  return wet < 0 ? hours.length : wet
}
