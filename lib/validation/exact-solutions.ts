// The sheet under a surface simple enough for an exact answer: a bulk coefficient to steady air, and nothing from below.
import { conductThrough, stepsPerHour } from '@/lib/physics/sheet-hour'
import { createSheet, reportSheet } from '@/lib/physics/sheet'
import { ICE_CONDUCTIVITY } from '@/lib/physics/constants'
import { faceResistance } from '@/lib/physics/column'
import { freezeOpenWater, growThinIce, isThinIce, type LinearLoss } from '@/lib/physics/thin-ice'
import { NO_SUNSHINE } from '@/lib/physics/sunshine-in-ice'
import { passedThrough } from '@/lib/physics/sheet-surface'
import { tidyCells } from '@/lib/physics/grid'
import type { SheetState } from '@/lib/physics/sheet'

/** So great a coefficient that the surface has the temperature of the air. [W m⁻² K⁻¹] */
export const NO_RESISTANCE_WM2K = 1e6

/**
 * Ice after some hours on deep water at 0 °C, by the model's own column.
 *
 * @param startM Ice at the start. [m]
 * @param airC Air. [°C], below 0
 * @param bulkWm2K Coefficient from surface to air.
 * @param hours Time. [h]
 * @returns Thickness. [m]
 */
export function columnThicknessM(startM: number, airC: number, bulkWm2K: number, hours: number): number {
  const meanC = (0.5 * airC * startM) / (startM + ICE_CONDUCTIVITY / bulkWm2K)
  const state = createSheet({
    thicknessMm: startM * 1000,
    temperatureC: meanC,
    snowCoverCm: 0,
    unfrozenBelowMm: 50_000,
    base: 'ground',
  })
  const loss = { lossAt0Wm2: -airC * bulkWm2K, slopeWm2K: bulkWm2K }
  for (let hour = 0; hour < hours; hour++) {
    const steps = stepsPerHour(state)
    for (let i = 0; i < steps; i++) step(state, loss, 3600 / steps)
    tidyCells(state)
  }
  return reportSheet(state).thicknessMm / 1000
}

function step(state: SheetState, loss: LinearLoss, seconds: number): void {
  if (state.massKgM2.length === 0) freezeOpenWater(state, loss, 0, seconds)
  else if (isThinIce(state)) growThinIce(state, loss, 0, seconds)
  else {
    const parts = { longwave: 0, sensible: 0, latent: 0, shortwave: 0, precipitation: 0 }
    const law = { netWm2: loss.lossAt0Wm2, parts, slopeWm2K: loss.slopeWm2K, aroundC: 0 }
    const resistance = faceResistance(state.massKgM2[0]!, state.enthalpyJM2[0]!)
    conductThrough(state, passedThrough('ice', law, NO_SUNSHINE, resistance), 0, seconds)
  }
}
