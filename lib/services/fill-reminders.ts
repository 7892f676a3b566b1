// Reminders while the hose runs: a look every two hours, and one when the water should be in.
import { listAlertRecipients, type AlertRecipient } from '@/db/queries/alert-preferences'
import { dropFillReminders, listFillChecks, listFillSessions, type Fill } from '@/db/queries/fills'
import { promiseMessage } from '@/db/queries/messages'
import type { RinkForJudging } from '@/db/queries/rinks'
import type { Db } from '@/db/knex'
import { isGranted } from '@/lib/access/permissions'
import type { RinkAccess } from '@/lib/access/proofs'
import { isMuted } from '@/lib/advice/alert-due'
import { tonightDate } from '@/lib/advice/night'
import { FILLING } from '@/lib/advice/thresholds'
import type { ServiceContext } from '@/lib/context'
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import type { FillCheckContent } from '@/lib/schemas/alert-content'
import { cautionText } from '@/lib/words/cautions'
import { fillReminder } from '@/lib/words/fill-reminder'
import { wordsFor } from '@/lib/words/options'
import { channelsOf } from './alert-channels'
import { litresBy, targetLitres } from './fill-facts'

const STEP_MILLIS = FILLING.checkEveryHours * HOUR_MILLIS
/** Nobody is called out for longer than this after the last look: a day and a night. Ours. */
const MOST_REMINDERS = 12
const TAKE_CARE = ['backflow', 'wet_pavement', 'electric_leads', 'not_alone']

interface Reminder {
  dueAt: Date
  litres: number
  isDone: boolean
}

/**
 * Sets the reminders anew from `now`, the last time that somebody was there; with the hose off there are none. Told are
 * who started the fill, who looked after it, and who acts now.
 */
export async function setFillReminders(
  trx: Db,
  access: RinkAccess<'writeLog'>,
  { rink, fill, now, viewer }: { rink: RinkForJudging; fill: Fill } & Pick<ServiceContext, 'now' | 'viewer'>,
): Promise<void> {
  await dropFillReminders(trx, access)
  const sessions = await listFillSessions(trx, fill.id)
  const running = sessions.find(({ stoppedAt }) => stoppedAt === null)
  if (!running) return
  const litresLeft = targetLitres(rink, fill) - litresBy(sessions, now)
  const reminders = remindersOf(now, litresLeft / running.flowLPerMin).map((reminder) => ({
    ...reminder,
    litres: litresBy(sessions, reminder.dueAt),
  }))
  const lookers = (await listFillChecks(trx, fill.id)).map(({ byId }) => byId)
  const keepers = new Set([fill.startedBy, viewer.userId, ...lookers])
  const people = (await listAlertRecipients(trx, access)).filter(
    ({ userId, role, isEmailVerified }) => keepers.has(userId) && isGranted(role, 'receiveAlerts') && isEmailVerified,
  )
  for (const person of people) await remind(trx, { rink, fill, person, now }, reminders)
}

function remindersOf(now: Date, minutesLeft: number): Omit<Reminder, 'litres'>[] {
  if (minutesLeft <= 0) return []
  const doneMillis = now.getTime() + minutesLeft * MINUTE_MILLIS
  const looks = Array.from({ length: MOST_REMINDERS }, (_, index) => now.getTime() + (index + 1) * STEP_MILLIS)
    .filter((atMillis) => atMillis < doneMillis)
    .map((atMillis) => ({ dueAt: new Date(atMillis), isDone: false }))
  return looks.length < MOST_REMINDERS ? [...looks, { dueAt: new Date(doneMillis), isDone: true }] : looks
}

async function remind(
  trx: Db,
  { rink, fill, person, now }: { rink: RinkForJudging; fill: Fill; person: AlertRecipient; now: Date },
  reminders: readonly Reminder[],
): Promise<void> {
  for (const channel of await channelsOf(trx, person)) {
    for (const reminder of reminders) {
      const { dueAt } = reminder
      // Silence that begins later is seen on delivery.
      const nightDate = tonightDate(dueAt, rink.timeZone)
      if (isMuted(person.mutedThroughDate, nightDate)) continue
      await promiseMessage(
        trx,
        {
          dedupeKey: `fill-check:${fill.id}:${dueAt.toISOString()}:${channel}:${person.userId}`,
          userId: person.userId,
          rinkId: rink.id,
          nightDate,
          channel,
          kind: 'fill-check',
          content: { ...contentOf(rink, person, reminder) },
          sendAt: dueAt,
          // The next one takes its place.
          expiresAt: new Date(dueAt.getTime() + STEP_MILLIS),
        },
        now,
      )
    }
  }
}

function contentOf(rink: RinkForJudging, person: AlertRecipient, { litres, isDone }: Reminder): FillCheckContent {
  const words = wordsFor(person, rink.timeZone)
  return {
    rinkId: rink.id,
    words: {
      rinkName: rink.name,
      ...fillReminder({ litres, isDone }, words),
      cautions: TAKE_CARE.map((code) => cautionText({ code, values: {} }, words)),
    },
  }
}
