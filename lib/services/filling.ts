// How a fill stands: everything the Filling page shows.
import { listFillChecks, listFillSessions, findNewestFill, type Fill, type FillSession } from '@/db/queries/fills'
import { findNewestOutlook, listScoredHours } from '@/db/queries/outlooks'
import type { RinkForJudging } from '@/db/queries/rinks'
import type { Db } from '@/db/knex'
import { isGranted } from '@/lib/access/permissions'
import type { RinkAccess } from '@/lib/access/proofs'
import { fillProgress } from '@/lib/advice/fill-progress'
import type { HoseHour } from '@/lib/advice/hose-warning'
import type { ServiceContext } from '@/lib/context'
import type { FillingView, OpenFillView } from '@/lib/schemas/filling-view'
import { litresBy, lowCornerDepthMm as reckonedDepthMm, lowCornerOf, progressInput, targetLitres } from './fill-facts'
import { getRinkAndReader } from './rink-and-reader'

/** @throws NotFoundError for strangers. */
export async function getFilling(context: ServiceContext, rinkId: string): Promise<FillingView> {
  const { access, rink, reader, role } = await getRinkAndReader(context, rinkId)
  const { db, now } = context
  const fill = await findNewestFill(db, access)
  const sessions = fill ? await listFillSessions(db, fill.id) : []
  const isOpen = fill !== undefined && fill.finishedAt === null
  return {
    readAt: now.toISOString(),
    rink: { id: rink.id, name: rink.name, phase: rink.phase },
    reader,
    mayWrite: isGranted(role, 'writeLog'),
    usual: { fillDepthMm: rink.water.fillDepthMm, flowLPerMin: rink.water.flowLPerMin },
    fill: isOpen ? await openFillView(context, access, { rink, fill, sessions }) : null,
    last: fill?.finishedAt
      ? { finishedAt: fill.finishedAt.toISOString(), litres: litresBy(sessions, fill.finishedAt) }
      : null,
  }
}

async function openFillView(
  { db, now }: ServiceContext,
  access: RinkAccess,
  { rink, fill, sessions }: { rink: RinkForJudging; fill: Fill; sessions: FillSession[] },
): Promise<OpenFillView> {
  const checks = await listFillChecks(db, fill.id)
  const progress = fillProgress({
    ...progressInput(rink, fill, { sessions, checks, now }),
    hours: await hoseHours(db, access),
    waterTemperatureC: rink.water.temperatureC,
  })
  return {
    startedAt: fill.startedAt.toISOString(),
    startedBy: fill.startedByName,
    targetDepthMm: fill.targetDepthMm,
    targetL: targetLitres(rink, fill),
    flowLPerMin: sessions.at(-1)?.flowLPerMin ?? rink.water.flowLPerMin,
    progress,
    lowCorner: lowCornerOf(rink),
    sessions: sessions.map((session) => ({
      startedAt: session.startedAt.toISOString(),
      stoppedAt: session.stoppedAt?.toISOString() ?? null,
      litres: litresBy([session], now),
    })),
    checks: checks
      .map(({ checkedAt, by, lowCornerDepthMm, note }) => ({
        at: checkedAt.toISOString(),
        by,
        lowCornerDepthMm,
        reckonedDepthMm: reckonedDepthMm(rink, litresBy(sessions, checkedAt)),
        note,
      }))
      .reverse(),
  }
}

/** The weather where the hose lies, from the newest judgement. */
async function hoseHours(db: Db, access: RinkAccess): Promise<HoseHour[]> {
  const outlook = await findNewestOutlook(db, access)
  const hours = outlook ? await listScoredHours(db, outlook.id) : []
  return hours.map(({ time, weather }) => ({
    time,
    airTemperatureC: weather?.airTemperatureC ?? null,
    windAtRinkMps: weather?.windAtRinkMps ?? null,
  }))
}
