// The nights ahead of a rink: everything the Week page shows.
import { findCellTrouble } from '@/db/queries/cell-reads'
import { findNewestOutlook, listScoredHours, type StoredOutlook } from '@/db/queries/outlooks'
import { findRinkForJudging, type RinkForJudging } from '@/db/queries/rinks'
import { findAccount } from '@/db/queries/users'
import { requireRink } from '@/lib/access/require-rink'
import { nightsAhead, type NightAhead } from '@/lib/advice/week'
import { summariseWeek } from '@/lib/advice/week-summary'
import type { Judgement } from '@/lib/advice/types'
import type { ServiceContext } from '@/lib/context'
import { NotFoundError } from '@/lib/errors'
import { rinkIdSchema } from '@/lib/schemas/rinks'
import type { WeekNight, WeekView } from '@/lib/schemas/week-view'
import { forecastRead } from './forecast-read'
import { nightFrame } from './night-frame'

const NIGHTS = 10

/**
 * @param openDate The night to open, 'yyyy-MM-dd'; one that is not ahead opens nothing.
 * @throws NotFoundError when the viewer is no member of the rink.
 */
export async function getWeek(context: ServiceContext, rinkId: string, openDate?: string): Promise<WeekView> {
  const access = await requireRink(context, rinkIdSchema.parse(rinkId), 'view')
  const { db, now, viewer } = context
  const [rink, person, outlook] = await Promise.all([
    findRinkForJudging(db, access.rinkId),
    findAccount(db, viewer.userId),
    findNewestOutlook(db, access),
  ])
  if (!rink || !person) throw new NotFoundError('Rink')
  return {
    readAt: now.toISOString(),
    rink: { id: rink.id, name: rink.name, timeZone: rink.timeZone, phase: rink.phase },
    viewer: { units: person.units, clock: person.clock },
    outlook: outlook ? await outlookOf(context, rink, outlook, openDate) : null,
    forecast: outlook ? await forecastRead(context, outlook.forecastId) : null,
    lastReadFailed: (await findCellTrouble(db, rink.gridCellId)) !== null,
  }
}

async function outlookOf(
  { db, now }: ServiceContext,
  rink: RinkForJudging,
  outlook: StoredOutlook,
  openDate: string | undefined,
): Promise<NonNullable<WeekView['outlook']>> {
  const hours = await listScoredHours(db, outlook.id)
  const judgement = { modelVersion: outlook.modelVersion, hours, ...outlook.advice }
  const { timeZone, phase, maxPasses, water } = rink
  const nights = nightsAhead(judgement, {
    now,
    timeZone,
    phase,
    maxPasses,
    layerMm: water.layerMm,
    plannedDate: outlook.nightDate,
    otherNights: outlook.advice.otherNights ?? [],
    nights: NIGHTS,
  })
  const asked = nights.find((night) => night.nightDate === openDate)
  return {
    judgedAt: outlook.judgedAt.toISOString(),
    modelVersion: outlook.modelVersion,
    nights: nights.map((night) => drawnNight(judgement, rink, night)),
    summary: summariseWeek(nights, judgement, now),
    fill: outlook.advice.fill,
    fillWindows: judgement.windows.filter(({ kind, endsAt }) => kind === 'fill' && Date.parse(endsAt) > now.getTime()),
    open: asked ? { nightDate: asked.nightDate, hours: hoursOf(judgement, asked) } : null,
  }
}

function hoursOf(judgement: Judgement, { startsAt, endsAt }: NightAhead) {
  return judgement.hours.filter(({ time }) => time >= startsAt && time < endsAt)
}

function drawnNight(judgement: Judgement, rink: RinkForJudging, night: NightAhead): WeekNight {
  const { sunsetAt, sunriseAt } = nightFrame(rink, night.nightDate)
  const bars = hoursOf(judgement, night).map(({ time, verdict, isKnown, freezeRateMmPerH }) => ({
    startsAt: time,
    verdict,
    freezeRateMmPerH: isKnown ? freezeRateMmPerH : null,
  }))
  return { ...night, sunsetAt, sunriseAt, bars }
}
