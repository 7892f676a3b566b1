// Deciding what to tell about a night, in the transaction that changed it.
import { listAlertRecipients, type AlertRecipient } from '@/db/queries/alert-preferences'
import {
  findAdvisedWindow,
  insertAdvisedWindow,
  type AdvisedWindow,
  type WindowKey,
} from '@/db/queries/advised-windows'
import { listToldAlerts, type ToldAlert } from '@/db/queries/alerts'
import { listFloodsSince } from '@/db/queries/floods'
import { findForecastHead } from '@/db/queries/forecasts'
import { enqueueJob } from '@/db/queries/jobs'
import { promiseMessage } from '@/db/queries/messages'
import { findNewestOutlook, type StoredOutlook } from '@/db/queries/outlooks'
import { listEnabledPushSubscriptions } from '@/db/queries/push-subscriptions'
import { findRinkForJudging, type RinkForJudging } from '@/db/queries/rinks'
import type { Db } from '@/db/knex'
import { isGranted } from '@/lib/access/permissions'
import type { RinkAccess } from '@/lib/access/proofs'
import { dueAlert, type AlertKind } from '@/lib/advice/alert-due'
import { nightBounds } from '@/lib/advice/night'
import type { NightSummary } from '@/lib/advice/night-summary'
import { nextWindowStep } from '@/lib/advice/window-change'
import { instantOfLocal } from '@/lib/advice/zoned-time'
import { alertContent } from './alert-content'

type JudgedOutlook = Pick<StoredOutlook, 'id' | 'forecastId' | 'modelVersion' | 'summary'>

interface Deciding {
  trx: Db
  access: RinkAccess<'view'>
  now: Date
}

/** Two workers never decide one rink at the same time; the lock goes with the transaction. */
async function lockRink(trx: Db, rinkId: string): Promise<void> {
  await trx.raw('select id from rinks where id = ? for update', [rinkId])
}

/** Brings the advised window of the night up to date and promises what there is to tell about it. */
export async function adviseNight(
  deciding: Deciding,
  rink: RinkForJudging,
  outlook: JudgedOutlook,
  forecastExpiresAt: Date,
): Promise<void> {
  await lockRink(deciding.trx, rink.id)
  const night = { rinkId: rink.id, nightDate: outlook.summary.nightDate }
  await stepWindow(deciding, rink, outlook, { ...night, kind: 'fill' })
  const window = await stepWindow(deciding, rink, outlook, { ...night, kind: 'flood' })
  await tellRecipients(deciding, rink, outlook.summary, window, forecastExpiresAt)
}

/** Tells those whose time of day has come, with the outlook that stands. */
export async function decideAlerts({ db, now }: { db: Db; now: Date }, access: RinkAccess<'view'>): Promise<void> {
  await db.transaction(async (trx) => {
    await lockRink(trx, access.rinkId)
    const rink = await findRinkForJudging(trx, access.rinkId)
    const outlook = await findNewestOutlook(trx, access)
    const forecast = outlook && (await findForecastHead(trx, outlook.forecastId))
    if (!rink || !outlook || !forecast) return
    const window = await findAdvisedWindow(trx, { rinkId: rink.id, nightDate: outlook.nightDate, kind: 'flood' })
    await tellRecipients({ trx, access, now }, rink, outlook.summary, window, forecast.expiresAt)
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

async function tellRecipients(
  deciding: Deciding,
  rink: RinkForJudging,
  summary: NightSummary,
  window: AdvisedWindow | undefined,
  forecastExpiresAt: Date,
): Promise<void> {
  const { trx, access, now } = deciding
  const recipients = (await listAlertRecipients(trx, access)).filter(
    (person) => isGranted(person.role, 'receiveAlerts') && person.isEmailVerified,
  )
  const told = await listToldAlerts(trx, { rinkId: rink.id, nightDate: summary.nightDate })
  const poured = await listFloodsSince(trx, access, nightBounds(summary.nightDate, rink.timeZone).startsAt)
  for (const person of recipients) {
    const tellAt = tellInstant(person.tellAt, summary.nightDate, rink.timeZone)
    if (tellAt > now) {
      await enqueueJob(
        trx,
        'decide-alerts',
        { rinkId: rink.id },
        { key: `decide:${rink.id}:${person.tellAt}`, runAt: tellAt },
      )
      continue
    }
    const heard = told.filter(({ userId }) => userId === person.userId)
    const kind = dueAlert({
      now,
      tellAt,
      isMuted: person.mutedThroughDate !== null && person.mutedThroughDate >= summary.nightDate,
      isForecastStale: now >= forecastExpiresAt,
      window: window
        ? {
            version: window.version,
            state: window.state,
            latestStartAt: window.state === 'open' ? window.latestStartAt : null,
          }
        : null,
      told: heard[0] ?? null,
      changesTold: heard.filter((alert) => alert.kind !== 'flood-tonight').length,
      hasPoured: poured.some((pass) => pass.nightDate === summary.nightDate),
    })
    if (kind && window) await promiseAlert(deciding, { kind, rink, summary, window, person, heard })
  }
}

/** A person's time of day belongs to the afternoon and evening of the night's date, or to the small hours after it. */
function tellInstant(tellAt: string, nightDate: string, timeZone: string): Date {
  const [hours = 0, minutes = 0] = tellAt.split(':').map(Number)
  return new Date(instantOfLocal(nightDate, hours * 60 + minutes, timeZone))
}

interface Alert {
  kind: AlertKind
  rink: RinkForJudging
  summary: NightSummary
  window: AdvisedWindow
  person: AlertRecipient
  heard: ToldAlert[]
}

async function promiseAlert({ trx, now }: Deciding, alert: Alert): Promise<void> {
  const { kind, rink, summary, window, person } = alert
  const devices = person.wantsPush ? await listEnabledPushSubscriptions(trx, person.userId) : []
  const channels = [
    ...(person.wantsEmail && !person.isEmailRefused ? ['email' as const] : []),
    ...(devices.length > 0 ? ['push' as const] : []),
  ]
  const content = alertContent({ rink, summary, person }, now)
  const expiresAt = expiryOf(window, summary)
  if (expiresAt <= now) return
  for (const channel of channels) {
    const reason = kind === 'flood-tonight' ? kind : `${kind}:${window.version}`
    await promiseMessage(
      trx,
      {
        dedupeKey: `${reason}:${rink.id}:${summary.nightDate}:${channel}:${person.userId}`,
        userId: person.userId,
        rinkId: rink.id,
        nightDate: summary.nightDate,
        channel,
        kind,
        content: { ...content },
        windowId: window.id,
        sendAt: now,
        expiresAt,
      },
      now,
    )
  }
}

/** Late news of tonight is dropped: an open window is worth telling until its latest start, a closed one until morning. */
function expiryOf(window: AdvisedWindow, summary: NightSummary): Date {
  return window.state === 'open' ? window.latestStartAt : new Date(summary.endsAt)
}
