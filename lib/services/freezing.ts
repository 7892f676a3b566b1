// A rink that freezes: what the Freezing page shows, and the keeper's word that it is open.
import { findCellTrouble } from '@/db/queries/cell-reads'
import { findStandingFill } from '@/db/queries/fills'
import { findNewestForecast } from '@/db/queries/forecasts'
import { enqueueRefresh } from '@/db/queries/jobs'
import { findNewestThickness } from '@/db/queries/log-season'
import { findNewestReading, type Reading } from '@/db/queries/readings'
import { changeRink, lockRink } from '@/db/queries/rink-settings'
import { findRinkForJudging, type RinkForJudging } from '@/db/queries/rinks'
import type { Db } from '@/db/knex'
import { isGranted } from '@/lib/access/permissions'
import type { RinkAccess } from '@/lib/access/proofs'
import { requireRink } from '@/lib/access/require-rink'
import { freezingOutlook } from '@/lib/advice/freezing'
import type { ServiceContext } from '@/lib/context'
import { ConflictError } from '@/lib/errors'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { FreezingView } from '@/lib/schemas/freezing-view'
import { hasIce } from '@/lib/schemas/rink-choices'
import { forecastRead } from './forecast-read'
import { gatherJudgeInput } from './judge-input'
import { getRinkAndReader } from './rink-and-reader'

/** A hole drilled longer ago opens no rink: it says little about today's ice. [h] Ours. */
const OPENS_HOURS = 72

/** @throws NotFoundError for strangers. */
export async function getFreezing(context: ServiceContext, rinkId: string): Promise<FreezingView> {
  const { access, rink, reader, role } = await getRinkAndReader(context, rinkId)
  const { db, now } = context
  const { sinceAt, reading } = await drilledSinceFill(db, access, now)
  return {
    readAt: now.toISOString(),
    rink: { id: rink.id, name: rink.name, phase: rink.phase, carriesSkaterMm: rink.carriesSkaterMm },
    reader,
    mayWrite: isGranted(role, 'writeLog'),
    mayManage: isGranted(role, 'manage'),
    ...(rink.phase === 'freezing' ? await estimate(context, access, rink) : { outlook: null, forecast: null }),
    lastReadFailed: (await findCellTrouble(db, rink.gridCellId)) !== null,
    sinceAt: sinceAt?.toISOString() ?? null,
    reading: reading ? { ...reading, at: reading.at.toISOString() } : null,
    sheetMm: hasIce(rink.phase) ? ((await findNewestThickness(db, access, now)) ?? null) : null,
    isDrilledThick: isThick(rink, reading),
  }
}

/** Ice as the newest forecast has it; none past its last hour, for the weather since is not known. */
async function estimate(
  { db, now }: ServiceContext,
  access: RinkAccess,
  rink: RinkForJudging,
): Promise<Pick<FreezingView, 'outlook' | 'forecast'>> {
  const forecast = await findNewestForecast(db, rink.gridCellId, now)
  if (!forecast) return { outlook: null, forecast: null }
  const input = await gatherJudgeInput(db, access, { rink, forecast, now })
  return { outlook: input ? freezingOutlook(input) : null, forecast: await forecastRead({ db, now }, forecast.id) }
}

async function drilledSinceFill(
  db: Db,
  access: RinkAccess,
  now: Date,
): Promise<{ sinceAt: Date | null; reading: Reading | undefined }> {
  const sinceAt = (await findStandingFill(db, access))?.finishedAt ?? null
  const recent = new Date(now.getTime() - OPENS_HOURS * HOUR_MILLIS)
  const after = sinceAt !== null && sinceAt > recent ? sinceAt : recent
  return { sinceAt, reading: await findNewestReading(db, access, after) }
}

function isThick({ carriesSkaterMm }: RinkForJudging, reading: Reading | undefined): boolean {
  return reading !== undefined && reading.thicknessMm >= carriesSkaterMm
}

/**
 * The keeper has drilled and opens the rink.
 *
 * @throws ConflictError when it does not freeze any more, or when the newest hole is too thin or too old.
 */
export async function openForSkating(context: ServiceContext, { rinkId }: { rinkId: string }): Promise<void> {
  const { db, now } = context
  const access = await requireRink(context, rinkId, 'manage')
  await db.transaction(async (trx) => {
    await lockRink(trx, access)
    const rink = await findRinkForJudging(trx, access.rinkId)
    if (rink?.phase !== 'freezing') {
      throw new ConflictError('This rink is no longer freezing. Load the page again to see how it stands.')
    }
    const { reading } = await drilledSinceFill(trx, access, now)
    if (!isThick(rink, reading)) {
      throw new ConflictError('Drill first: no hole of the last three days is thick enough.')
    }
    await changeRink(trx, access, { phase: 'skating' }, now)
    await enqueueRefresh(trx, rinkId)
  })
}
