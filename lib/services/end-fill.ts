// The end of a fill: the hose is off, its water is in the log, and no reminder is left. Where the rink goes on is the caller's.
import {
  deleteFill,
  finishFill,
  listFillChecks,
  listFillSessions,
  stopFillSession,
  type Fill,
} from '@/db/queries/fills'
import { enqueueRefresh } from '@/db/queries/jobs'
import { insertEntry } from '@/db/queries/log-entries'
import type { RinkForJudging } from '@/db/queries/rinks'
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import { nightDateOf } from '@/lib/advice/night'
import type { ServiceContext } from '@/lib/context'
import { MINUTE_MILLIS } from '@/lib/physics/constants'
import { litresBy, targetLitres } from './fill-facts'
import { setFillReminders } from './fill-reminders'

/** Less water than this in all was no fill. [L] Ours. */
const LEAST_LITRES = 1

export interface OpenFill {
  trx: Db
  access: RinkAccess<'writeLog'>
  rink: RinkForJudging
  fill: Fill
}

interface End {
  endedAt: Date
  /** Its water does not stand on the rink. */
  isGivenUp: boolean
  /** For the log. */
  note: string
}

/** @returns false when no water ran: then the fill is gone. */
export async function endFill(
  { now, viewer }: Pick<ServiceContext, 'now' | 'viewer'>,
  { trx, access, rink, fill }: OpenFill,
  { endedAt, isGivenUp, note }: End,
): Promise<boolean> {
  await stopFillSession(trx, fill.id, endedAt)
  const waterL = litresBy(await listFillSessions(trx, fill.id), now)
  await finishFill(trx, fill.id, { endedAt, isGivenUp })
  await setFillReminders(trx, access, { rink, fill, now, viewer })
  await enqueueRefresh(trx, rink.id)
  if (waterL < LEAST_LITRES) {
    await deleteFill(trx, fill.id)
    return false
  }
  const water = { waterL, waterTemperatureC: rink.water.temperatureC, waterKind: rink.water.kind }
  const when = { happenedAt: endedAt, nightDate: nightDateOf(endedAt, rink.timeZone) }
  await insertEntry(
    trx,
    access,
    { kind: 'fill', entryKey: fill.id, writtenBy: viewer.userId, ...when, ...water, note },
    now,
  )
  return true
}

/**
 * When a fill that nobody ended was over: when the hose was last turned off, else when the water wanted was in, unless
 * somebody looked after the running hose later than that.
 */
export async function likelyEnd({ trx, rink, fill }: Omit<OpenFill, 'access'>, now: Date): Promise<Date> {
  const sessions = await listFillSessions(trx, fill.id)
  const running = sessions.find(({ stoppedAt }) => stoppedAt === null)
  if (!running) return sessions.at(-1)?.stoppedAt ?? now
  const litresLeft = Math.max(0, targetLitres(rink, fill) - litresBy(sessions, running.startedAt))
  const fullMillis = running.startedAt.getTime() + (litresLeft / running.flowLPerMin) * MINUTE_MILLIS
  const looks = (await listFillChecks(trx, fill.id)).map(({ checkedAt }) => checkedAt.getTime())
  return new Date(Math.min(now.getTime(), Math.max(fullMillis, ...looks)))
}
