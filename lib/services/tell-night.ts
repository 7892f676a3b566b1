// Telling people about a night: who, on which channel, and whether there is anything to say.
import type { AlertRecipient } from '@/db/queries/alert-preferences'
import type { AdvisedWindow } from '@/db/queries/advised-windows'
import { listToldAlerts, type ToldAlert } from '@/db/queries/alerts'
import { listFloodsSince } from '@/db/queries/floods'
import { enqueueJob } from '@/db/queries/jobs'
import { promiseMessage } from '@/db/queries/messages'
import type { RinkForJudging } from '@/db/queries/rinks'
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import { dueAlert, isMuted, type AlertKind } from '@/lib/advice/alert-due'
import { tonightStartsAt } from '@/lib/advice/night'
import type { NightSummary } from '@/lib/advice/night-summary'
import { channelsOf, type Channel } from './alert-channels'
import { alertContent } from './alert-content'
import { listPeopleToTell, tellInstant } from './people-to-tell'

/** The night as it stands, inside the transaction that decides about it. */
export interface NightToTell {
  trx: Db
  access: RinkAccess<'view'>
  now: Date
  rink: RinkForJudging
  summary: NightSummary
  window: AdvisedWindow | undefined
  forecastExpiresAt: Date
}

/** Promises what is due to each keeper and crew member; those whose time of day is still to come get a job at it. */
export async function tellNight(night: NightToTell): Promise<void> {
  const { trx, access, now, rink, summary } = night
  const told = await listToldAlerts(trx, { rinkId: rink.id, nightDate: summary.nightDate })
  const poured = await listFloodsSince(trx, access, tonightStartsAt(summary.nightDate, rink.timeZone))
  const hasPoured = poured.some((pass) => pass.nightDate === summary.nightDate)
  for (const person of await listPeopleToTell(trx, access)) {
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
    for (const channel of await channelsOf(trx, person)) {
      const heard = told.filter((alert) => alert.userId === person.userId && alert.channel === channel)
      const kind = dueTo(night, person, { tellAt, heard, hasPoured })
      if (kind) await promiseAlert(night, person, channel, kind)
    }
  }
}

function dueTo(
  { now, summary, window, forecastExpiresAt }: NightToTell,
  person: AlertRecipient,
  facts: { tellAt: Date; heard: ToldAlert[]; hasPoured: boolean },
): AlertKind | null {
  return dueAlert({
    now,
    tellAt: facts.tellAt,
    isMuted: isMuted(person.mutedThroughDate, summary.nightDate),
    isForecastStale: now >= forecastExpiresAt,
    window: window
      ? {
          version: window.version,
          state: window.state,
          latestStartAt: window.state === 'open' ? window.latestStartAt : null,
        }
      : null,
    told: facts.heard[0] ?? null,
    changesTold: facts.heard.filter((alert) => alert.kind !== 'flood-tonight').length,
    hasPoured: facts.hasPoured,
  })
}

async function promiseAlert(
  { trx, now, rink, summary, window }: NightToTell,
  person: AlertRecipient,
  channel: Channel,
  kind: AlertKind,
): Promise<void> {
  if (!window) return
  const expiresAt = expiryOf(window, summary)
  if (expiresAt <= now) return
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
      content: { ...alertContent({ rink, summary, person }, now) },
      windowId: window.id,
      sendAt: now,
      expiresAt,
    },
    now,
  )
}

/** Late news of tonight is dropped: an open window is worth telling until its latest start, a closed one until morning. */
function expiryOf(window: AdvisedWindow, summary: NightSummary): Date {
  return window.state === 'open' ? window.latestStartAt : new Date(summary.endsAt)
}
