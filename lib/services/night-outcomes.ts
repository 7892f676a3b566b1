// Nights that are over: what was said is held against people's reports and against the weather as it came.
import { enqueueSettling } from '@/db/queries/jobs'
import {
  insertNightOutcome,
  listFloodVersions,
  listLayerReports,
  listNightsToSettle,
  type SaidVersion,
} from '@/db/queries/night-outcomes'
import { findRinkForJudging, type RinkForJudging } from '@/db/queries/rinks'
import { findStartingSheet } from '@/db/queries/sheet-states'
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import { judge, MODEL_VERSION } from '@/lib/advice/judge'
import { nightBounds } from '@/lib/advice/night'
import { settleNight } from '@/lib/advice/settle-night'
import type { Judgement } from '@/lib/advice/types'
import { judgeInputOf } from './judge-input'
import { weatherAsItCame } from './weather-as-it-came'
import { findYardInUse } from './yard-in-use'

/** Asks for every night that ended since the last round to be settled. @returns how many. */
export async function startSettling(db: Db, now: Date): Promise<number> {
  const nights = await listNightsToSettle(db, now)
  await db.transaction(async (trx) => {
    for (const { rinkId, nightDate } of nights) await enqueueSettling(trx, rinkId, nightDate)
  })
  return nights.length
}

/** Settles one night; repeating it changes nothing. @returns true when this call settled it. */
export async function settleRinkNight(
  { db, now }: { db: Db; now: Date },
  access: RinkAccess<'view'>,
  nightDate: string,
): Promise<boolean> {
  const rink = await findRinkForJudging(db, access.rinkId)
  if (!rink) return false
  const [versions, reports, hindsight] = await Promise.all([
    listFloodVersions(db, access, nightDate),
    listLayerReports(db, access, nightDate),
    judgeInHindsight(db, rink, nightDate),
  ])
  const stood = versionThatStood(versions)
  const open = stood?.state === 'open' ? stood : undefined
  const said = open ? ('flood' as const) : ('hold' as const)
  const night = {
    said,
    startsAt: open?.startsAt?.toISOString() ?? null,
    endsAt: open?.endsAt?.toISOString() ?? null,
    passes: open?.passes ?? [],
  }
  const settled = settleNight(night, hindsight, reports, rink.timeZone)
  const outcome = {
    ...settled,
    nightDate,
    said,
    startsAt: open?.startsAt ?? null,
    endsAt: open?.endsAt ?? null,
    setByAt: open?.setByAt ?? null,
    agreement: open?.agreement ?? null,
    windowId: stood?.id ?? null,
    modelVersion: stood?.modelVersion ?? MODEL_VERSION,
  }
  return insertNightOutcome(db, rink.id, outcome, now)
}

/** The version that stood when the first hour of the advised window came: people had acted on it by then. */
function versionThatStood(versions: readonly SaidVersion[]): SaidVersion | undefined {
  const stood = versions.findLast(
    ({ advisedAt, startsAt }) => advisedAt <= (startsAt ?? versions[0]?.startsAt ?? advisedAt),
  )
  return stood ?? versions[0]
}

/** The night judged with the weather as it came. */
async function judgeInHindsight(
  db: Db,
  rink: RinkForJudging,
  nightDate: string,
): Promise<Pick<Judgement, 'hours' | 'windows'>> {
  const { startsAt, endsAt } = nightBounds(nightDate, rink.timeZone)
  // A day more, so that a layer poured late can set within the hours.
  const hours = await weatherAsItCame(db, rink.gridCellId, { from: startsAt, to: endsAt, aheadHours: 24 })
  const firstHour = hours[0]
  if (!firstHour) return { hours: [], windows: [] }
  const firstHourAt = new Date(firstHour.time)
  const sheet = await findStartingSheet(db, rink.id, { firstHourAt, now: startsAt })
  const { hours: scored, windows } = judge(
    judgeInputOf({
      rink,
      yard: await findYardInUse(db, rink),
      forecast: { hours, members: null },
      sheet,
      poured: [],
      firstHourAt,
      now: startsAt,
    }),
    { runs: 0 },
  )
  return {
    hours: scored.filter(({ time }) => Date.parse(time) < endsAt.getTime()),
    windows: windows.filter((window) => Date.parse(window.startsAt) < endsAt.getTime()),
  }
}
