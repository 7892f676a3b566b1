// The sums of a rink before it is built: water, hose, boards, liner, cost, and what runs off in spring.
import { boardHeightM, footMomentNmPerM, freezingRiseM, lumberFor, waterPushNPerM } from '@/lib/physics/boards'
import { inRange } from '@/lib/physics/check'
import { GRAVITY, ICE_DENSITY, WATER_DENSITY } from '@/lib/physics/constants'
import { cornerDepthsM, floorExtremesM, floorOf, type FloorGrid } from '@/lib/physics/floor'
import { bucketFlowLPerMin } from '@/lib/physics/hose'
import { linerAcrossM, linerToOrderM, type LinerAllowance } from '@/lib/physics/liner'
import { meltWaterM3 } from '@/lib/physics/melt-water'
import { highToLowSection } from '@/lib/physics/section'
import { fillByHour, hoseHours, stageAt } from '@/lib/physics/stage'
import { buildCautions } from './build-cautions'
import { BUILD } from './thresholds'
import type { BuildInput, BuildSums, CornerSum, How, SourceId, SumId, WettedHour } from './build-types'

/**
 * All sums of the Plan page.
 *
 * @param input Ranges and defaults at the fields.
 * @returns Sums, each with its unit in its name; sentences, formulas and sources in words are made in
 *   lib/words/sums.ts.
 * @throws RangeError for a value out of range.
 *
 * Source: the physics it calls; limits in BUILD.
 */
export function buildSums(input: BuildInput): BuildSums {
  const floor = floorOf(input.lengthM, input.widthM, input.floor)
  const water = waterOf(floor, inRange('leastDepthM [m]', input.leastDepthM, 0.001, 1))
  const flow = flowOf(input)
  const hose = hoseOf(water.volumeM3, flow.lPerMin)
  const freeboardM = input.freeboardM ?? BUILD.freeboardM
  const boards = boardsOf(water.deepestM, freeboardM)
  const expansion = expansionOf(water.deepestM)
  const sums = {
    ground: groundOf(floor),
    water,
    corners: cornersOf(floor, water.levelM, freeboardM),
    section: highToLowSection(floor),
    flow,
    hose,
    sessions: sessionsOf(hose.hours, input.hoursPerSession),
    wetted: wettedOf(floor, flow.lPerMin, water.volumeM3),
    cost: costOf(water.volumeM3, input.waterPricePerM3),
    boards,
    push: pushOf(water.deepestM),
    expansion,
    liner: linerOf(input, boards.heightM),
    orderBy: orderByOf(input.seasonYear),
    meltWater: meltWaterOf(input, water.volumeM3),
  }
  return { ...sums, cautions: buildCautions(sums, { freeboardM, boardHeightM: input.boardHeightM ?? null }) }
}

function how(formulaId: SumId, sourceId: SourceId, values: Record<string, number>): How {
  return { formulaId, sourceId, values }
}

function groundOf(floor: FloorGrid): BuildSums['ground'] {
  const { lengthM, widthM } = floor
  const { highestM, lowestM } = floorExtremesM(floor)
  const areaM2 = lengthM * widthM
  return { areaM2, fallM: lowestM - highestM, how: how('ground', 'geometry', { lengthM, widthM, highestM, lowestM }) }
}

function waterOf(floor: FloorGrid, leastDepthM: number): BuildSums['water'] {
  const levelM = floorExtremesM(floor).highestM - leastDepthM
  const { volumeM3, deepestM } = stageAt(floor, levelM)
  const areaM2 = floor.lengthM * floor.widthM
  const meanDepthM = volumeM3 / areaM2
  return {
    volumeM3,
    meanDepthM,
    deepestM,
    levelM,
    how: how('water', 'stage_storage', { areaM2, meanDepthM, volumeM3 }),
  }
}

function cornersOf(floor: FloorGrid, levelM: number, freeboardM: number): BuildSums['corners'] {
  return cornerDepthsM(floor).map((floorM): CornerSum => {
    const waterM = Math.max(0, floorM - levelM)
    return { floorM, waterM, boardM: boardHeightM(waterM, freeboardM) }
  }) as BuildSums['corners']
}

function flowOf({ flow }: BuildInput): BuildSums['flow'] {
  if ('lPerMin' in flow) {
    const lPerMin = inRange('lPerMin [L/min]', flow.lPerMin, 0.1, 2000)
    return { lPerMin, how: how('flow', 'keeper', { lPerMin }) }
  }
  const { bucketL, bucketSeconds } = flow
  const lPerMin = bucketFlowLPerMin(bucketL, bucketSeconds)
  return { lPerMin, how: how('flow', 'definition', { bucketL, bucketSeconds, lPerMin }) }
}

function hoseOf(volumeM3: number, lPerMin: number): BuildSums['hose'] {
  const litres = volumeM3 * 1000
  const hours = hoseHours(litres, lPerMin)
  return { hours, how: how('hose', 'definition', { litres, lPerMin, hours }) }
}

function sessionsOf(hours: number, hoursPerSession?: number): BuildSums['sessions'] {
  const most = hoursPerSession === undefined ? hours : inRange('hoursPerSession [h]', hoursPerSession, 0.25, 24)
  const count = Math.max(1, Math.ceil(hours / most - 1e-9))
  return {
    count,
    hoursEach: hours / count,
    how: how('sessions', 'definition', { hours, hoursPerSession: most, count }),
  }
}

function wettedOf(floor: FloorGrid, lPerMin: number, volumeM3: number): BuildSums['wetted'] {
  const areaM2 = floor.lengthM * floor.widthM
  const corners = cornerDepthsM(floor)
  const byHour = fillByHour(floor, lPerMin, volumeM3).map(({ hours, levelM, stage }): WettedHour => ({
    hours,
    litres: hours * 60 * lPerMin,
    levelM,
    wettedShare: stage.wetShare,
    wettedM2: stage.wetShare * areaM2,
    cornerDepthsM: corners.map((floorM) => Math.max(0, floorM - levelM)),
  }))
  return { byHour, how: how('wetted', 'stage_storage', { lPerMin, areaM2 }) }
}

function costOf(volumeM3: number, pricePerM3?: number | null): BuildSums['cost'] {
  if (pricePerM3 === undefined || pricePerM3 === null) return null
  const amount = volumeM3 * inRange('waterPricePerM3', pricePerM3, 0, 1000)
  return { amount, how: how('cost', 'keeper', { volumeM3, pricePerM3, amount }) }
}

function boardsOf(deepestM: number, freeboardM: number): BuildSums['boards'] {
  const heightM = boardHeightM(deepestM, freeboardM)
  const values = { waterM: deepestM, freeboardM, heightM }
  return { heightM, lumber: lumberFor(heightM), how: how('boards', 'definition', values) }
}

function pushOf(waterM: number): BuildSums['push'] {
  const pushNPerM = waterPushNPerM(waterM)
  const moment = footMomentNmPerM(waterM)
  return {
    pushNPerM,
    pushKgPerM: pushNPerM / GRAVITY,
    footMomentNmPerM: moment,
    how: how('push', 'hydrostatics', { waterM, pushNPerM, footMomentNmPerM: moment, gravity: GRAVITY }),
  }
}

function expansionOf(waterM: number): BuildSums['expansion'] {
  const riseM = freezingRiseM(waterM)
  const values = { waterM, riseM, waterDensity: WATER_DENSITY, iceDensity: ICE_DENSITY }
  return { riseM, how: how('expansion', 'iapws', values) }
}

function linerOf(input: BuildInput, boardsM: number): BuildSums['liner'] {
  const allowance: LinerAllowance = {
    boardHeightM: boardsM,
    boardThicknessM: input.boardThicknessM ?? BUILD.boardThicknessM,
    tuckM: input.tuckM ?? BUILD.tuckM,
    foldShare: input.foldShare ?? BUILD.foldShare,
    overlapM: input.overlapM ?? BUILD.overlapM,
  }
  const stepM = input.linerStepM ?? BUILD.linerStepM
  return {
    lengthM: linerToOrderM(input.lengthM, allowance, stepM),
    widthM: linerToOrderM(input.widthM, allowance, stepM),
    lengthBeforeFoldsM: linerAcrossM(input.lengthM, allowance),
    widthBeforeFoldsM: linerAcrossM(input.widthM, allowance),
    how: how('liner', 'common_practice', { insideM: input.lengthM, ...allowance, stepM }),
  }
}

function orderByOf(seasonYear: number): BuildSums['orderBy'] {
  const year = inRange('seasonYear', seasonYear, 1900, 2999)
  return { date: `${year}-${BUILD.orderByMonthDay}`, how: how('orderBy', 'common_practice', { seasonYear: year }) }
}

function meltWaterOf(input: BuildInput, fillM3: number): BuildSums['meltWater'] {
  const { lengthM, widthM, floodsL = 0, sublimatedMm = 0 } = input
  const areaM2 = lengthM * widthM
  const volumeM3 = meltWaterM3(fillM3 * 1000 + floodsL, areaM2, sublimatedMm)
  const values = { fillM3, floodsM3: floodsL / 1000, sublimatedM3: (sublimatedMm * areaM2) / 1000, volumeM3 }
  return { volumeM3, how: how('meltWater', 'mass_balance', values) }
}
