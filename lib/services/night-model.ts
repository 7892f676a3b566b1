// The model of one night, for passes wherever they are put: in a browser, or for passes that were poured or moved.
import { findNewestForecast } from '@/db/queries/forecasts'
import { getRinkForJudging, type RinkForJudging } from '@/db/queries/rinks'
import { listWaterSources } from '@/db/queries/water-sources'
import type { RinkAccess } from '@/lib/access/proofs'
import { requireRink } from '@/lib/access/require-rink'
import { tonightDate } from '@/lib/advice/night'
import { packNight, type NightModel } from '@/lib/advice/night-model'
import type { ServiceContext } from '@/lib/context'
import { NotFoundError } from '@/lib/errors'
import { WATER_DEFAULTS } from '@/lib/schemas/rink-choices'
import type { MovableNight, WaterChoice } from '@/lib/schemas/tonight-view'
import { gatherJudgeInput } from './judge-input'

/** A night packed for reckoning; null before the first forecast, or when the forecast does not reach it. */
export async function readNightModel(
  { db, now }: Pick<ServiceContext, 'db' | 'now'>,
  access: RinkAccess,
  rink: RinkForJudging,
  nightDate: string,
): Promise<NightModel | null> {
  const forecast = await findNewestForecast(db, rink.gridCellId)
  const input = forecast && (await gatherJudgeInput(db, access, { rink, forecast, now }))
  return input ? packNight(input, nightDate) : null
}

/**
 * What the keeper's browser needs to move tonight's passes.
 *
 * @throws NotFoundError for strangers, and before the first forecast; ForbiddenError for everybody but the keeper.
 */
export async function getMovableNight(context: ServiceContext, rinkId: string): Promise<MovableNight> {
  const access = await requireRink(context, rinkId, 'manage')
  const rink = await getRinkForJudging(context.db, rinkId)
  const model = await readNightModel(context, access, rink, tonightDate(context.now, rink.timeZone))
  if (!model) throw new NotFoundError('Forecast')
  const sources = await listWaterSources(context.db, access)
  return { model, waters: watersOf(sources), areaM2: rink.lengthM * rink.widthM }
}

/** The rink's own sources, and a hot tap as houses have it where none was described. */
function watersOf(sources: readonly WaterChoice[]): WaterChoice[] {
  const own = sources.map(({ kind, temperatureC, flowLPerMin }) => ({ kind, temperatureC, flowLPerMin }))
  const hasHot = own.some(({ kind }) => kind === 'hot-tap')
  return hasHot ? own : [...own, { kind: 'hot-tap', ...WATER_DEFAULTS['hot-tap'] }]
}
