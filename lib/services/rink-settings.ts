// Changing what a rink's advice depends on, one page at a time. Each change is counted, and the night is judged again.
import { lockOpenFill } from '@/db/queries/fills'
import { findOrCreateGridCell } from '@/db/queries/grid-cells'
import { enqueuePull, enqueueRefresh } from '@/db/queries/jobs'
import { changeRink, lockRink, replaceAvailableHours, type RinkChanges } from '@/db/queries/rink-settings'
import { findRinkForJudging, getRinkForJudging, type RinkForJudging } from '@/db/queries/rinks'
import { listWaterSources, type WaterSource } from '@/db/queries/water-sources'
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import { requireRink } from '@/lib/access/require-rink'
import type { ServiceContext } from '@/lib/context'
import type {
  ChangeHoursInput,
  ChangeIceInput,
  ChangeLimitsInput,
  ChangePlaceInput,
  ChangeYardInput,
} from '@/lib/schemas/rink-settings'
import { hasIce } from '@/lib/schemas/rink-choices'
import { cellOf } from '@/lib/weather/cell'
import { endFill, likelyEnd } from './end-fill'
import { placeOf } from './place-rink'
import { reportIce } from './rinks'

export interface RinkSettings extends RinkForJudging {
  sources: WaterSource[]
}

/** For the settings pages. @throws ForbiddenError for crew and skaters, NotFoundError for strangers. */
export async function getRinkSettings(context: ServiceContext, rinkId: string): Promise<RinkSettings> {
  const access = await requireRink(context, rinkId, 'manage')
  const rink = await getRinkForJudging(context.db, rinkId)
  return { ...rink, sources: await listWaterSources(context.db, access) }
}

type Work = (trx: Db, access: RinkAccess<'manage'>) => Promise<RinkChanges>

/** Runs the work under the rink's lock: the second of two changes at once sees what the first left. */
export async function changing(context: ServiceContext, rinkId: string, work: Work): Promise<void> {
  const { db, now } = context
  const access = await requireRink(context, rinkId, 'manage')
  await db.transaction(async (trx) => {
    await lockRink(trx, access)
    await changeRink(trx, access, await work(trx, access), now)
    await enqueueRefresh(trx, rinkId)
  })
}

/** Name, place and clock; in a new place with its own weather. */
export async function changePlace(context: ServiceContext, input: ChangePlaceInput): Promise<void> {
  const { latitudeDeg, longitudeDeg } = input
  await requireRink(context, input.rinkId, 'manage')
  const { placeName, timeZone, timeZoneBy } = await placeOf(input)
  await changing(context, input.rinkId, async (trx) => {
    const cell = await findOrCreateGridCell(trx, cellOf(latitudeDeg, longitudeDeg))
    const before = await findRinkForJudging(trx, input.rinkId)
    if (before?.gridCellId !== cell.id) await enqueuePull(trx, cell.id)
    return {
      name: input.name,
      place_name: placeName,
      latitude_deg: latitudeDeg,
      longitude_deg: longitudeDeg,
      grid_cell_id: cell.id,
      time_zone: timeZone,
      time_zone_by: timeZoneBy,
    }
  })
}

/** Size, floor, boards, and what stands between the rink and wind and sky. */
export async function changeYard(context: ServiceContext, { rinkId, ...yard }: ChangeYardInput): Promise<void> {
  await changing(context, rinkId, async () => ({
    length_m: yard.lengthM,
    width_m: yard.widthM,
    base: yard.base,
    shelter: yard.shelter,
    floor: yard.floor,
    board_height_mm: yard.boardHeightMm,
    // Undefined keeps a share of sky that no picture stands for.
    ...(yard.skyView === undefined ? {} : { sky_view: yard.skyView }),
  }))
}

/**
 * What there is now, and how thick it was measured. Another phase may be the first for which the weather is read, and
 * ends a fill that nobody has ended.
 */
export async function changeIce(context: ServiceContext, input: ChangeIceInput): Promise<void> {
  await changing(context, input.rinkId, async (trx) => {
    const rink = await getRinkForJudging(trx, input.rinkId)
    if (rink.phase !== input.phase) await enqueuePull(trx, rink.gridCellId)
    if (input.phase !== 'filling') await endOpenFill(context, trx, rink, !hasIce(input.phase))
    if (input.iceThicknessMm !== undefined) await reportIce(trx, input.rinkId, input.iceThicknessMm, context.now)
    return { phase: input.phase }
  })
}

/** Counts the water up to when the fill was likely over: a hose that nobody stopped here did not run until today. */
async function endOpenFill(context: ServiceContext, trx: Db, rink: RinkForJudging, isGivenUp: boolean): Promise<void> {
  const access = await requireRink({ ...context, db: trx }, rink.id, 'writeLog')
  const fill = await lockOpenFill(trx, access)
  if (!fill) return
  const open = { trx, access, rink, fill }
  const note = 'Nobody finished this fill; it ended when the rink was set otherwise in its settings.'
  await endFill(context, open, { endedAt: await likelyEnd(open, context.now), isGivenUp, note })
}

/** When somebody can go out, and how often in a night. */
export async function changeHours(context: ServiceContext, input: ChangeHoursInput): Promise<void> {
  await changing(context, input.rinkId, async (trx) => {
    await replaceAvailableHours(trx, input.rinkId, input.available)
    return { max_passes: input.maxPasses }
  })
}

/** Wind and cold beyond which the keeper stays in, and the ice on which people may skate. */
export async function changeLimits(context: ServiceContext, input: ChangeLimitsInput): Promise<void> {
  await changing(context, input.rinkId, async () => ({
    wind_limit_mps: input.windLimitMps,
    wind_chill_limit_c: input.windChillLimitC,
    carries_skater_mm: input.carriesSkaterMm,
  }))
}
