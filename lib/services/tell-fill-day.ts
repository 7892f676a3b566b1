// Telling people of a rink that waits for its fill which day that will be: who, on which channel, and what is due.
import type { AlertRecipient } from '@/db/queries/alert-preferences'
import { listToldFillDays } from '@/db/queries/fill-days'
import { promiseMessage } from '@/db/queries/messages'
import { isAsJudged } from '@/db/queries/rink-settings'
import { isMuted } from '@/lib/advice/alert-due'
import { dueFillDay, type FillDayKind, type FillStart, type ToldFillDay } from '@/lib/advice/fill-day-due'
import { nightDateOf, tonightDate } from '@/lib/advice/night'
import { DAY_MILLIS } from '@/lib/physics/constants'
import type { FillDayContent } from '@/lib/schemas/alert-content'
import { cautionText } from '@/lib/words/cautions'
import { fillDayText } from '@/lib/words/fill-day'
import { nightLabel } from '@/lib/words/night-label'
import { wordsFor } from '@/lib/words/options'
import { channelsOf, type Channel } from './alert-channels'
import { listPeopleToTell, tellInstant, type RinkToTell } from './people-to-tell'

/** What was told longer ago than this is of another cold spell. Ours. */
const TOLD_DAYS = 14
const TAKE_CARE = ['backflow', 'wet_pavement', 'run_off', 'electric_leads', 'not_alone']

/** Promises what is due. Those whose time of day is still to come have a job at it from `tellNight`. */
export async function tellFillDay(telling: RinkToTell): Promise<void> {
  const { trx, access, now, rink } = telling
  if (!(await isAsJudged(trx, access, { phase: 'waiting', settingsVersion: telling.settingsVersion }))) return
  const night = tonightDate(now, rink.timeZone)
  const start = startOf(telling)
  const told = await listToldFillDays(trx, rink.id, new Date(now.getTime() - TOLD_DAYS * DAY_MILLIS))
  for (const person of await listPeopleToTell(trx, access)) {
    for (const channel of await channelsOf(trx, person)) {
      const heard = told.filter((one) => one.userId === person.userId && one.channel === channel)
      const kind = dueFillDay({
        now,
        tonightDate: night,
        tellAt: tellInstant(person.tellAt, night, rink.timeZone),
        isMuted: isMuted(person.mutedThroughDate, night),
        isForecastStale: now >= telling.forecastExpiresAt,
        start,
        told: heard,
      })
      if (kind) await promiseFillDay(telling, { person, channel, kind, start, heard })
    }
  }
}

function startOf({ rink, advice: { fill } }: RinkToTell): FillStart | null {
  if (!fill.startsAt || fill.litres <= 0) return null
  const startsAt = new Date(fill.startsAt)
  return { startsAt, fillDate: nightDateOf(startsAt, rink.timeZone) }
}

interface DueFillDay {
  person: AlertRecipient
  channel: Channel
  kind: FillDayKind
  start: FillStart | null
  heard: readonly ToldFillDay[]
}

async function promiseFillDay(telling: RinkToTell, due: DueFillDay): Promise<void> {
  const { trx, now, rink } = telling
  const { person, channel, kind, heard } = due
  const day = kind === 'fill-closed' ? heard[0] : due.start
  if (!day) return
  const expiresAt = expiryOf(telling, day)
  if (expiresAt <= now) return
  // A date is new once; whatever follows is told after so many others.
  const reason = kind === 'fill-ahead' ? kind : `${kind}:${heard.length}`
  await promiseMessage(
    trx,
    {
      dedupeKey: `${reason}:${rink.id}:${day.fillDate}:${channel}:${person.userId}`,
      userId: person.userId,
      rinkId: rink.id,
      // The night it is told in: silence is about when one hears, not about when one fills.
      nightDate: tonightDate(now, rink.timeZone),
      channel,
      kind,
      content: { ...contentOf(telling, due, day) },
      sendAt: now,
      expiresAt,
    },
    now,
  )
}

/** Late news of a start is dropped; an hour of hose that has begun can still be started in. */
function expiryOf({ now, advice: { windows } }: RinkToTell, { startsAt }: FillStart): Date {
  if (startsAt > now) return startsAt
  const running = windows.find(
    (one) => one.kind === 'fill' && Date.parse(one.startsAt) <= startsAt.getTime() && new Date(one.endsAt) > now,
  )
  return running ? new Date(running.endsAt) : startsAt
}

function contentOf({ rink, advice, now }: RinkToTell, due: DueFillDay, day: FillStart): FillDayContent {
  const { person, kind, heard } = due
  const words = wordsFor(person, rink.timeZone)
  const news = { kind, day, before: heard[0] ?? null, base: rink.base, ...advice }
  return {
    rinkId: rink.id,
    fillDate: day.fillDate,
    startsAt: day.startsAt.toISOString(),
    words: {
      rinkName: rink.name,
      nightLabel: nightLabel(day.fillDate),
      ...fillDayText(news, now, words),
      cautions: kind === 'fill-closed' ? [] : TAKE_CARE.map((code) => cautionText({ code, values: {} }, words)),
    },
  }
}
