// Bringing the advised window of a night up to date, and having people told, in the transaction that changed it.
import {
  findAdvisedWindow,
  insertAdvisedWindow,
  type AdvisedWindow,
  type WindowKey,
} from '@/db/queries/advised-windows'
import { findForecastHead } from '@/db/queries/forecasts'
import { findNewestOutlook, type StoredOutlook } from '@/db/queries/outlooks'
import { lockRink } from '@/db/queries/rink-settings'
import { findRinkForJudging, type RinkForJudging } from '@/db/queries/rinks'
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import { nextWindowStep } from '@/lib/advice/window-change'
import type { RinkToTell } from './people-to-tell'
import { tellFillDay } from './tell-fill-day'
import { tellNight } from './tell-night'
import { tellThaw } from './tell-thaw'

type JudgedOutlook = Pick<
  StoredOutlook,
  'id' | 'forecastId' | 'settingsVersion' | 'modelVersion' | 'summary' | 'advice'
>

interface Deciding {
  trx: Db
  access: RinkAccess<'view'>
  now: Date
}

/** Brings the advised window of the night up to date and promises what there is to tell about it, and of the days ahead. */
export async function adviseNight(
  deciding: Deciding,
  rink: RinkForJudging,
  outlook: JudgedOutlook,
  forecastExpiresAt: Date,
): Promise<void> {
  await lockRink(deciding.trx, deciding.access)
  const newest = await findNewestOutlook(deciding.trx, deciding.access)
  // While we judged, another worker judged later facts and has told people of them: ours would take that back.
  if (newest && newest.judgedAt > deciding.now) return
  const night = { rinkId: rink.id, nightDate: outlook.summary.nightDate }
  await stepWindow(deciding, rink, outlook, { ...night, kind: 'fill' })
  const window = await stepWindow(deciding, rink, outlook, { ...night, kind: 'flood' })
  await tellNight({ ...deciding, rink, summary: outlook.summary, window, forecastExpiresAt })
  const { settingsVersion, advice } = outlook
  await tellAhead({ ...deciding, rink, settingsVersion, advice, forecastExpiresAt })
}

/** What is to come in the days ahead, by the rink's phase. */
async function tellAhead(telling: RinkToTell): Promise<void> {
  if (telling.rink.phase === 'waiting') await tellFillDay(telling)
  if (telling.rink.phase === 'skating') await tellThaw(telling)
}

/** Tells those whose time of day has come, with the outlook that stands. */
export async function decideAlerts({ db, now }: { db: Db; now: Date }, access: RinkAccess<'view'>): Promise<void> {
  await db.transaction(async (trx) => {
    await lockRink(trx, access)
    const rink = await findRinkForJudging(trx, access.rinkId)
    const outlook = await findNewestOutlook(trx, access)
    const forecast = outlook && (await findForecastHead(trx, outlook.forecastId))
    if (!rink || !outlook || !forecast) return
    const window = await findAdvisedWindow(trx, { rinkId: rink.id, nightDate: outlook.nightDate, kind: 'flood' })
    const telling = { trx, access, now, rink, forecastExpiresAt: forecast.expiresAt }
    await tellNight({ ...telling, summary: outlook.summary, window })
    await tellAhead({ ...telling, settingsVersion: outlook.settingsVersion, advice: outlook.advice })
  })
}

async function stepWindow(
  { trx, now }: Deciding,
  rink: RinkForJudging,
  outlook: JudgedOutlook,
  key: WindowKey,
): Promise<AdvisedWindow | undefined> {
  const advised = await findAdvisedWindow(trx, key)
  const step = nextWindowStep(advised, outlook.summary, key.kind, now)
  if (step.step === 'keep') return advised
  const origin = { outlookId: outlook.id, ...outlook, timeZone: rink.timeZone, now }
  const version = (advised?.version ?? 0) + 1
  if (step.step === 'close') {
    return insertAdvisedWindow(trx, key, version, { state: 'closed', closedReason: step.reason }, origin)
  }
  const { window } = step
  const content = {
    state: 'open' as const,
    startsAt: new Date(window.startsAt),
    endsAt: new Date(window.endsAt),
    latestStartAt: new Date(window.latestStartAt),
    setByAt: new Date(window.setBy),
    score: window.score,
    agreement: window.agreement,
    runs: window.runs,
    passes: key.kind === 'flood' ? outlook.summary.passes : [],
  }
  return insertAdvisedWindow(trx, key, version, content, origin)
}
