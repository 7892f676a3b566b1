// The water of a fill: how much is still to pour, how long the hose takes, and how deep it stands on the floor.
import { floorOf, type FloorGrid } from '@/lib/physics/floor'
import { levelOf, stageAt } from '@/lib/physics/stage'
import type { Setting } from './setting'

export interface HosePlan {
  /** Still to pour. */
  litres: number
  hoseHours: number
}

/**
 * Water and hose time of what is still to fill. 1 mm on 1 m² is 1 L.
 *
 * @param setting Rink, from makeSetting.
 * @returns Water [L] and hose time [h], 0 or more.
 *
 * Source: depth times area over flow.
 */
export function hosePlanOf({ input }: Setting): HosePlan {
  const { fillDepthMm, flowLPerMin, filledLitres = 0 } = input.water
  const litres = Math.max(0, fillDepthMm * input.rink.lengthM * input.rink.widthM - filledLitres)
  return { litres, hoseHours: litres / flowLPerMin / 60 }
}

/**
 * The rink's floor as measured; flat where it was not.
 *
 * @param setting Rink, from makeSetting.
 * @returns Grid of depths. [m]
 *
 * Source: floorOf.
 */
export function floorOfRink({ input }: Setting): FloorGrid {
  return floorOf(input.rink.lengthM, input.rink.widthM, input.rink.floor)
}

/** Asked for every start in every run, and the same in all. */
const deepest = new WeakMap<Setting, number>()

/**
 * Water over the deepest place once the fill is in: it cools, skins over and freezes through last.
 *
 * @param setting Rink, from makeSetting.
 * @returns Depth. [mm]
 *
 * Source: levelOf and stageAt; the fill's mean depth on a flat floor.
 */
export function deepestFillMm(setting: Setting): number {
  const { rink, water } = setting.input
  if (!rink.floor) return water.fillDepthMm
  const known = deepest.get(setting)
  if (known !== undefined) return known
  const floor = floorOfRink(setting)
  const level = levelOf(floor, (water.fillDepthMm / 1000) * rink.lengthM * rink.widthM)
  const depthMm = stageAt(floor, level).deepestM * 1000
  deepest.set(setting, depthMm)
  return depthMm
}
