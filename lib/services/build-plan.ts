// The plan of a build: where its form starts, and keeping what came of it for the rink.
import { findWaterPrice, setFillWater } from '@/db/queries/build-plans'
import type { HoursRow, RinkForJudging } from '@/db/queries/rinks'
import { findAccount } from '@/db/queries/users'
import { isGranted } from '@/lib/access/permissions'
import { buildSums } from '@/lib/advice/build-sums'
import { nightDateOf } from '@/lib/advice/night'
import { seasonOf } from '@/lib/advice/season'
import type { Phase } from '@/lib/advice/types'
import { localDateOf } from '@/lib/advice/zoned-time'
import type { ServiceContext } from '@/lib/context'
import { InvalidInputError } from '@/lib/errors'
import { floorExtremesM, floorOf, type FloorShape } from '@/lib/physics/floor'
import { levelOf } from '@/lib/physics/stage'
import type { KeepPlanInput } from '@/lib/schemas/build-plan'
import { fitsMeasure, rangeMessage } from '@/lib/schemas/measures'
import type { WordOptions } from '@/lib/words/options'
import { getRinkAndReader } from './rink-and-reader'
import { changing } from './rink-settings'

export interface PlanView {
  rink: { id: string; name: string; phase: Phase }
  reader: WordOptions
  mayManage: boolean
  /** At the rink, 'yyyy-MM-dd'. */
  today: string
  /** What the rink has now, in SI. */
  start: {
    lengthM: number
    widthM: number
    floor: FloorShape | null
    leastDepthMm: number
    flowLPerMin: number
    hoursInOneGo: number
    waterPricePerM3: number | null
    boardHeightMm: number | null
    /** The autumn in which the season that is on, or the next one, begins. */
    seasonYear: number
  }
}

/** @throws NotFoundError for strangers. */
export async function getPlan(context: ServiceContext, rinkId: string): Promise<PlanView> {
  const { access, rink, reader, role } = await getRinkAndReader(context, rinkId)
  return {
    rink: { id: rink.id, name: rink.name, phase: rink.phase },
    reader,
    mayManage: isGranted(role, 'manage'),
    today: localDateOf(context.now.getTime(), rink.timeZone),
    start: {
      lengthM: rink.lengthM,
      widthM: rink.widthM,
      floor: rink.floor,
      leastDepthMm: leastDepthMm(rink),
      flowLPerMin: rink.water.flowLPerMin,
      hoursInOneGo: Math.max(...rink.available.map(hoursOf)),
      waterPricePerM3: await findWaterPrice(context.db, access),
      boardHeightMm: rink.boardHeightMm,
      seasonYear: seasonOf(nightDateOf(context.now, rink.timeZone)).year,
    },
  }
}

/** A fill that leaves the high corner dry starts from this. [mm] Ours. */
const LEAST_WATER_MM = 40

/** Water over the highest point when the rink's own fill is in. [mm] */
function leastDepthMm({ lengthM, widthM, floor, water }: RinkForJudging): number {
  const ground = floorOf(lengthM, widthM, floor)
  const levelM = levelOf(ground, (water.fillDepthMm / 1000) * lengthM * widthM)
  const depthMm = Math.round((floorExtremesM(ground).highestM - levelM) * 1000)
  return fitsMeasure('leastDepth', depthMm) ? depthMm : LEAST_WATER_MM
}

function hoursOf({ from, to }: HoursRow): number {
  const minutes = (time: string) => Number(time.slice(0, 2)) * 60 + Number(time.slice(3))
  return ((minutes(to) - minutes(from) + 1440) % 1440 || 1440) / 60
}

/**
 * Keeps size, floor, boards, price, flow and the mean depth of the fill for the rink.
 *
 * @throws ForbiddenError for crew and skaters; InvalidInputError for water that a rink cannot hold.
 */
export async function keepPlan(context: ServiceContext, { rinkId, plan }: KeepPlanInput): Promise<void> {
  const { water, flow } = buildSums(plan)
  const fillDepthMm = water.meanDepthM * 1000
  if (!fitsMeasure('fillDepth', fillDepthMm)) {
    const person = await findAccount(context.db, context.viewer.userId)
    const range = person ? rangeMessage('fillDepth', person.units) : ''
    throw new InvalidInputError('Something here needs another look.', {
      leastDepth: `Mean depth of the fill: ${range}`,
    })
  }
  await changing(context, rinkId, async (trx, access) => {
    await setFillWater(trx, access, { fillDepthMm, flowLPerMin: flow.lPerMin })
    return {
      length_m: plan.lengthM,
      width_m: plan.widthM,
      floor: plan.floor ?? null,
      board_height_mm: plan.boardHeightM == null ? null : plan.boardHeightM * 1000,
      water_price_per_m3: plan.waterPricePerM3 ?? null,
    }
  })
}
