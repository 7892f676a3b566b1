// The night sheet: everything the Tonight page shows of one rink and one night.
import { findAlertPreferences } from '@/db/queries/alert-preferences'
import { findCellTrouble } from '@/db/queries/cell-reads'
import { listFloodsSince } from '@/db/queries/floods'
import { findMembership, listMembers } from '@/db/queries/members'
import { findNewestOutlook, listScoredHours, type StoredOutlook } from '@/db/queries/outlooks'
import { findRinkForJudging, type RinkForJudging } from '@/db/queries/rinks'
import { findAccount } from '@/db/queries/users'
import { requireRink } from '@/lib/access/require-rink'
import type { RinkAccess } from '@/lib/access/proofs'
import { nightBounds, tonightDate, tonightStartsAt } from '@/lib/advice/night'
import { summariseNight } from '@/lib/advice/night-summary'
import type { ServiceContext } from '@/lib/context'
import { NotFoundError } from '@/lib/errors'
import type { TonightView } from '@/lib/schemas/tonight-view'
import { daysAhead } from './days-ahead'
import { forecastRead } from './forecast-read'
import { nightFrame } from './night-frame'
import { judgeOwnPasses } from './own-passes'
import { passesOf } from './tonight-passes'

/** @throws NotFoundError when the viewer is no member of the rink. */
export async function getTonight(context: ServiceContext, rinkId: string): Promise<TonightView> {
  const access = await requireRink(context, rinkId, 'view')
  const { db, now, viewer } = context
  const [rink, membership, people, preferences, person, outlook] = await Promise.all([
    findRinkForJudging(db, rinkId),
    findMembership(db, { rinkId, userId: viewer.userId }),
    listMembers(db, access),
    findAlertPreferences(db, access, viewer.userId),
    findAccount(db, viewer.userId),
    findNewestOutlook(db, access),
  ])
  if (!rink || !membership || !person) throw new NotFoundError('Rink')
  const nightDate = tonightDate(now, rink.timeZone)
  return {
    readAt: now.toISOString(),
    rink: {
      id: rink.id,
      name: rink.name,
      placeName: rink.placeName,
      timeZone: rink.timeZone,
      phase: rink.phase,
      people: people.length,
      water: {
        temperatureC: rink.water.temperatureC,
        flowLPerMin: rink.water.flowLPerMin,
        layerMm: rink.water.layerMm,
      },
    },
    viewer: {
      id: viewer.userId,
      role: membership.role,
      units: person.units,
      clock: person.clock,
      mutedThrough: preferences?.mutedThroughDate ?? null,
    },
    night: nightFrame(rink, nightDate),
    outlook: outlook ? await outlookOf(context, access, rink, outlook, nightDate) : null,
    forecast: outlook ? await forecastRead(context, outlook.forecastId) : null,
    lastReadFailed: (await findCellTrouble(db, rink.gridCellId)) !== null,
  }
}

async function outlookOf(
  { db, now }: ServiceContext,
  access: RinkAccess,
  rink: RinkForJudging,
  outlook: StoredOutlook,
  nightDate: string,
): Promise<TonightView['outlook']> {
  const { timeZone } = rink
  const { startsAt, endsAt } = nightBounds(nightDate, timeZone)
  const [hours, floods, own] = await Promise.all([
    listScoredHours(db, outlook.id),
    listFloodsSince(db, access, tonightStartsAt(nightDate, timeZone)),
    judgeOwnPasses({ db, now }, access, rink, nightDate),
  ])
  const judgement = { modelVersion: outlook.modelVersion, hours, ...outlook.advice }
  const summary = summariseNight(judgement, { nightDate, now, timeZone })
  const poured = floods.filter((flood) => flood.nightDate === nightDate)
  return {
    judgedAt: outlook.judgedAt.toISOString(),
    modelVersion: outlook.modelVersion,
    summary,
    hours: hours.filter((hour) => hour.time >= isoHour(startsAt) && hour.time < isoHour(endsAt)),
    ...passesOf(rink, poured, own, summary.passes, outlook.judgedAt),
    wouldTurn: summary.verdict === 'hold' ? (outlook.advice.wouldTurn ?? []) : [],
    days: daysAhead(hours, now, timeZone),
    thaws: outlook.advice.thaws,
  }
}

const isoHour = (at: Date) => at.toISOString().replace('.000Z', 'Z')
