// How a fill stands: everything the Filling page shows.
import { listFillChecks, listFillSessions, findNewestFill, type Fill, type FillSession } from '@/db/queries/fills'
import { findMembership } from '@/db/queries/members'
import { findNewestOutlook, listScoredHours } from '@/db/queries/outlooks'
import { findRinkForJudging, type RinkForJudging } from '@/db/queries/rinks'
import { findAccount } from '@/db/queries/users'
import type { Db } from '@/db/knex'
import { isGranted } from '@/lib/access/permissions'
import type { RinkAccess } from '@/lib/access/proofs'
import { requireRink } from '@/lib/access/require-rink'
import { fillProgress } from '@/lib/advice/fill-progress'
import type { HoseHour } from '@/lib/advice/hose-warning'
import type { ServiceContext } from '@/lib/context'
import { NotFoundError } from '@/lib/errors'
import type { FillingView, OpenFillView } from '@/lib/schemas/filling-view'
import { rinkIdSchema } from '@/lib/schemas/rinks'
import { litresBy, lowCornerDepthMm as reckonedDepthMm, lowCornerOf, progressInput, targetLitres } from './fill-facts'

/** @throws NotFoundError for strangers. */
export async function getFilling(context: ServiceContext, rinkId: string): Promise<FillingView> {
  const access = await requireRink(context, rinkIdSchema.parse(rinkId), 'view')
  const { db, now, viewer } = context
  const [rink, person, member, fill] = await Promise.all([
    findRinkForJudging(db, access.rinkId),
    findAccount(db, viewer.userId),
    findMembership(db, { rinkId: access.rinkId, userId: viewer.userId }),
    findNewestFill(db, access),
  ])
  if (!rink || !person || !member) throw new NotFoundError('Rink')
  const sessions = fill ? await listFillSessions(db, fill.id) : []
  const isOpen = fill !== undefined && fill.finishedAt === null
  return {
    readAt: now.toISOString(),
    rink: { id: rink.id, name: rink.name, phase: rink.phase },
    reader: { units: person.units, clock: person.clock, timeZone: rink.timeZone, locale: 'en' },
    mayWrite: isGranted(member.role, 'writeLog'),
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
