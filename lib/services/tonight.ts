// The night sheet: everything the Tonight page shows of one rink and one night.
import { getTimes } from 'suncalc'
import { findAlertPreferences } from '@/db/queries/alert-preferences'
import { findCellTrouble } from '@/db/queries/cell-reads'
import { listFloodsSince, type PouredPass } from '@/db/queries/floods'
import { findForecastHead } from '@/db/queries/forecasts'
import { findMembership, listMembers } from '@/db/queries/members'
import { findNewestOutlook, listScoredHours, type StoredOutlook } from '@/db/queries/outlooks'
import { findRinkForJudging, type RinkForJudging } from '@/db/queries/rinks'
import { findAccount } from '@/db/queries/users'
import { requireRink } from '@/lib/access/require-rink'
import type { RinkAccess } from '@/lib/access/proofs'
import { nightBounds, tonightDate } from '@/lib/advice/night'
import { summariseNight } from '@/lib/advice/night-summary'
import type { PlannedPass } from '@/lib/advice/types'
import type { ServiceContext } from '@/lib/context'
import { NotFoundError } from '@/lib/errors'
import type { TonightPass, TonightView } from '@/lib/schemas/tonight-view'
import { daysAhead } from './days-ahead'
import { judgeOwnPasses } from './own-passes'

const MORNING_MILLIS = 3 * 3_600_000

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
    night: nightOf(rink, nightDate),
    outlook: outlook ? await outlookOf(context, access, rink, outlook, nightDate) : null,
    forecast: outlook ? await forecastOf(context, outlook) : null,
    lastReadFailed: (await findCellTrouble(db, rink.gridCellId)) !== null,
  }
}

function nightOf(rink: RinkForJudging, date: string): TonightView['night'] {
  const { startsAt, endsAt } = nightBounds(date, rink.timeZone)
  const iso = (at: Date | null, isWithin: (at: Date) => boolean) => (at && isWithin(at) ? at.toISOString() : null)
  const evening = getTimes(startsAt, rink.latitudeDeg, rink.longitudeDeg)
  const morning = getTimes(endsAt, rink.latitudeDeg, rink.longitudeDeg)
  const isWithin = (at: Date) => at >= startsAt && at <= endsAt
  return {
    date,
    startsAt: startsAt.toISOString(),
    endsAt: endsAt.toISOString(),
    sunsetAt: iso(evening.sunset, isWithin),
    sunriseAt: iso(morning.sunrise, isWithin),
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
    // "Tonight" turns at 9 am, three hours before its night begins.
    listFloodsSince(db, access, new Date(startsAt.getTime() - MORNING_MILLIS)),
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

type Plan = Pick<NonNullable<TonightView['outlook']>, 'passes' | 'ownPlan'>

/** What was poured first, then what is still planned: the keeper's own plan where there is one. */
function passesOf(
  rink: RinkForJudging,
  poured: readonly PouredPass[],
  own: Awaited<ReturnType<typeof judgeOwnPasses>>,
  planned: readonly PlannedPass[],
  judgedAt: Date,
): Plan {
  const done = poured.map((flood, index) => pouredView(rink, flood, index))
  const isPoured = ({ number }: TonightPass) => done.some((pass) => pass.number === number)
  const open = own ? own.passes : advisedPasses(rink, poured, planned, judgedAt)
  return { passes: [...done, ...open.filter((pass) => !isPoured(pass))], ownPlan: own && { by: own.by } }
}

function pouredView({ water }: RinkForJudging, flood: PouredPass, index: number): TonightPass {
  const at = flood.pouredAt.toISOString()
  const saidSetByAt = flood.saidSetByAt?.toISOString() ?? null
  return {
    number: flood.passNumber ?? index + 1,
    startsAt: at,
    setBy: saidSetByAt ?? at,
    layerMm: flood.layerMm,
    waterL: flood.waterL,
    hoseMinutes: 0,
    temperatureC: flood.waterTemperatureC,
    flowLPerMin: water.flowLPerMin,
    warnings: [],
    limits: [],
    poured: {
      at,
      by: flood.by,
      entry: { id: flood.id, version: flood.version },
      saidSetByAt,
      outcome: flood.outcome,
      outcomeAt: flood.outcomeAt?.toISOString() ?? null,
    },
  }
}

/** Numbered on from what was poured. A plan made before a pass was poured still holds it. */
function advisedPasses(
  { water }: RinkForJudging,
  poured: readonly PouredPass[],
  planned: readonly PlannedPass[],
  judgedAt: Date,
): TonightPass[] {
  const known = poured.flatMap(({ passNumber, pouredAt }, index) =>
    pouredAt <= judgedAt ? [passNumber ?? index + 1] : [],
  )
  const last = Math.max(0, ...known)
  const { temperatureC, flowLPerMin } = water
  return planned.map((pass, index) => ({
    ...pass,
    number: last + index + 1,
    temperatureC,
    flowLPerMin,
    warnings: [],
    limits: [],
    poured: null,
  }))
}

async function forecastOf({ db, now }: ServiceContext, outlook: StoredOutlook): Promise<TonightView['forecast']> {
  const forecast = await findForecastHead(db, outlook.forecastId)
  if (!forecast) return null
  return {
    provider: forecast.provider,
    issuedAt: forecast.issuedAt?.toISOString() ?? null,
    fetchedAt: forecast.fetchedAt.toISOString(),
    isStale: now >= forecast.expiresAt,
    attribution: forecast.attribution,
  }
}
