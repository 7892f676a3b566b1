// Telling people of a rink with ice that a thaw is near: once, before the silence.
import { isAsJudged } from '@/db/queries/rink-settings'
import { promiseMessage } from '@/db/queries/messages'
import { listToldThaws } from '@/db/queries/told-thaws'
import type { AlertRecipient } from '@/db/queries/alert-preferences'
import { isMuted } from '@/lib/advice/alert-due'
import { tonightDate } from '@/lib/advice/night'
import { dueThaw } from '@/lib/advice/thaw-due'
import type { Thaw } from '@/lib/advice/types'
import { DAY_MILLIS } from '@/lib/physics/constants'
import type { AlertContent } from '@/lib/schemas/alert-content'
import { nightLabel } from '@/lib/words/night-label'
import { wordsFor } from '@/lib/words/options'
import { thawText } from '@/lib/words/thaw'
import { channelsOf, type Channel } from './alert-channels'
import { listPeopleToTell, tellInstant, type RinkToTell } from './people-to-tell'

/** No forecast carries a thaw that was told longer ago than this. Ours. */
const TOLD_DAYS = 30

/** Promises what is due. Those whose time of day is still to come have a job at it from `tellNight`. */
export async function tellThaw(telling: RinkToTell): Promise<void> {
  const { trx, access, now, rink, advice } = telling
  if (!(await isAsJudged(trx, access, { phase: 'skating', settingsVersion: telling.settingsVersion }))) return
  const night = tonightDate(now, rink.timeZone)
  const told = await listToldThaws(trx, rink.id, new Date(now.getTime() - TOLD_DAYS * DAY_MILLIS))
  for (const person of await listPeopleToTell(trx, access)) {
    for (const channel of await channelsOf(trx, person)) {
      const thaw = dueThaw({
        now,
        tellAt: tellInstant(person.tellAt, night, rink.timeZone),
        isMuted: isMuted(person.mutedThroughDate, night),
        isForecastStale: now >= telling.forecastExpiresAt,
        thaws: advice.thaws,
        told: told.filter((one) => one.userId === person.userId && one.channel === channel),
      })
      if (thaw) await promiseThaw(telling, person, channel, thaw)
    }
  }
}

async function promiseThaw(
  { trx, now, rink }: RinkToTell,
  person: AlertRecipient,
  channel: Channel,
  thaw: Thaw,
): Promise<void> {
  const nightDate = tonightDate(now, rink.timeZone)
  const { startsAt, endsAt } = thaw
  const content: AlertContent = {
    rinkId: rink.id,
    nightDate,
    thaw: { startsAt, endsAt },
    words: {
      rinkName: rink.name,
      nightLabel: nightLabel(nightDate),
      ...thawText(thaw, wordsFor(person, rink.timeZone)),
      passes: [],
      cautions: [],
      why: [],
    },
  }
  await promiseMessage(
    trx,
    {
      dedupeKey: `thaw-ahead:${rink.id}:${startsAt}:${channel}:${person.userId}`,
      userId: person.userId,
      rinkId: rink.id,
      nightDate,
      channel,
      kind: 'thaw-ahead',
      content: { ...content },
      sendAt: now,
      // While it lasts it is still news why nothing else comes.
      expiresAt: new Date(endsAt),
    },
    now,
  )
}
