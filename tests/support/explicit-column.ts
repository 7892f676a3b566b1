// A slow, plain reference: 1 mm cells, explicit steps, enthalpy per cell. It shares the surface fluxes with the model and nothing else.
import { surfaceBalance } from '@/lib/physics/balance'
import type { PreparedHour } from '@/lib/physics/types'

const FUSION = 333_600
const ICE = { density: 916.721, heat: 2096.71, conductivity: 2.24 }
const WATER = { density: 1000, heat: 4200, conductivity: 0.56 }
/** Half a cell's thickness over its conductivity, per mass. [m² K/W per kg/m²] */
const HALF_ICE = 1 / (2 * ICE.density * ICE.conductivity)
const HALF_WATER = 1 / (2 * WATER.density * WATER.conductivity)
/** Under the limit dz²/2α of the thinnest ice cell, 0.3 s. [s] */
const STEP_SECONDS = 0.25
/** The surface law is drawn anew this often. [s] */
const LAW_SECONDS = 60

export interface ExplicitNight {
  /** Sheet from the top down, one temperature per slab; its cells are 1 mm unless told otherwise. */
  sheet: { thicknessMm: number; temperatureC: number; cellMm?: number }[]
  layer: { layerMm: number; temperatureC: number }
  hours: PreparedHour[]
  groundWm2: number
}

/** Minutes until no liquid is left, or null. */
export function explicitMinutesToSet(night: ExplicitNight): number | null {
  const cells = buildCells(night)
  let seconds = 0
  let law = { loss: 0, slope: 0, around: 0 }
  let surfaceC = 0
  let lawAge = LAW_SECONDS
  const end = night.hours.length * 3600
  while (seconds < end) {
    if (lawAge >= LAW_SECONDS) {
      law = drawLaw(night.hours[Math.floor(seconds / 3600)]!, surfaceC)
      lawAge = 0
    }
    surfaceC = step(cells, law, night.groundWm2)
    seconds += STEP_SECONDS
    lawAge += STEP_SECONDS
    if (!hasLiquidOnTop(cells)) return seconds / 60
  }
  return null
}

interface Cells {
  count: number
  mass: Float64Array
  enthalpy: Float64Array
  temperature: Float64Array
  /** Half thickness over conductivity. [m² K/W] */
  half: Float64Array
  /** Cells of the layer and the first of the sheet. */
  top: number
}

function buildCells({ sheet, layer }: ExplicitNight): Cells {
  const mass: number[] = []
  const enthalpy: number[] = []
  const layerCells = Math.max(1, Math.round(layer.layerMm))
  for (let i = 0; i < layerCells; i++) {
    mass.push(layer.layerMm / layerCells)
    enthalpy.push((layer.layerMm / layerCells) * WATER.heat * layer.temperatureC)
  }
  for (const slab of sheet) {
    const slabCells = Math.max(1, Math.round(slab.thicknessMm / (slab.cellMm ?? 1)))
    for (let i = 0; i < slabCells; i++) {
      const cell = (slab.thicknessMm / slabCells / 1000) * ICE.density
      mass.push(cell)
      enthalpy.push(cell * (ICE.heat * slab.temperatureC - FUSION))
    }
  }
  const count = mass.length
  return {
    count,
    mass: Float64Array.from(mass),
    enthalpy: Float64Array.from(enthalpy),
    temperature: new Float64Array(count),
    half: new Float64Array(count),
    top: Math.min(count, layerCells + 4),
  }
}

function drawLaw(hour: PreparedHour, surfaceC: number): { loss: number; slope: number; around: number } {
  const around = surfaceC
  const loss = surfaceBalance(hour, 'wet', around).netWm2
  return { loss, slope: loss - surfaceBalance(hour, 'wet', around - 1).netWm2, around }
}

/** One explicit step; returns the surface temperature. */
function step(cells: Cells, law: { loss: number; slope: number; around: number }, groundWm2: number): number {
  const { count, mass, enthalpy, temperature, half } = cells
  for (let i = 0; i < count; i++) {
    const perKg = enthalpy[i]! / mass[i]!
    if (perKg <= -FUSION) {
      temperature[i] = (perKg + FUSION) / ICE.heat
      half[i] = mass[i]! * HALF_ICE
    } else if (perKg >= 0) {
      temperature[i] = perKg / WATER.heat
      half[i] = mass[i]! * HALF_WATER
    } else {
      const liquid = 1 + perKg / FUSION
      temperature[i] = 0
      half[i] = mass[i]! * (liquid * HALF_WATER + (1 - liquid) * HALF_ICE)
    }
  }
  const perHalf = 1 / half[0]!
  const surfaceC = (temperature[0]! * perHalf - law.loss + law.slope * law.around) / (perHalf + law.slope)
  let fromAbove = (surfaceC - temperature[0]!) * perHalf
  const last = count - 1
  for (let i = 0; i < last; i++) {
    const toBelow = (temperature[i]! - temperature[i + 1]!) / (half[i]! + half[i + 1]!)
    enthalpy[i]! += (fromAbove - toBelow) * STEP_SECONDS
    fromAbove = toBelow
  }
  enthalpy[last]! += (fromAbove + groundWm2) * STEP_SECONDS
  return surfaceC
}

/** Liquid of the layer, and of sheet it may have melted; what the ground melts at the foot is not the layer's. */
function hasLiquidOnTop({ top, mass, enthalpy }: Cells): boolean {
  for (let i = 0; i < top; i++) if (enthalpy[i]! > -FUSION * mass[i]! * (1 - 1e-9)) return true
  return false
}
