// Passes poured tonight: checked off once, taken back when it was a slip.
import { randomUUID } from 'node:crypto'
import { insertFlood } from '@/db/queries/floods'
import { enqueueRefresh } from '@/db/queries/jobs'
import { lockPass, updateEntry } from '@/db/queries/log-entries'
import { countChange } from '@/db/queries/rink-settings'
import { getRinkForJudging, type RinkForJudging } from '@/db/queries/rinks'
import type { RinkAccess } from '@/lib/access/proofs'
import { requireRink } from '@/lib/access/require-rink'
import { judgePasses } from '@/lib/advice/move-pass'
import { tonightDate } from '@/lib/advice/night'
import { unpackNight } from '@/lib/advice/night-model'
import type { ServiceContext } from '@/lib/context'
import { InvalidInputError, OtherAccountError } from '@/lib/errors'
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import type { CheckOffPass, SentCheckOff, UndoPass } from '@/lib/schemas/floods'
import { readNightModel } from './night-model'

/** What a phone kept while it had no network may be this old. */
const LATEST_NEWS_MILLIS = 48 * HOUR_MILLIS
/** Phones' clocks run a little ahead. */
const CLOCK_AHEAD_MILLIS = 5 * MINUTE_MILLIS

/** What only a phone says of a check-off; without it the pass is poured now. */
type Sent = Partial<Pick<SentCheckOff, 'entryKey' | 'pouredAt' | 'userId'>>

/**
 * Logs a pass as poured. The plan is judged anew, since the sheet has grown and carries water.
 * Checking off the same pass again, or sending the same check-off twice, changes nothing.
 *
 * @throws ForbiddenError for skaters; OtherAccountError for what somebody else kept on this device; InvalidInputError for a
 *   night other than the one that was tonight when it was poured.
 */
export async function checkOffPass(context: ServiceContext, input: CheckOffPass & Sent): Promise<void> {
  const { db, now, viewer } = context
  // Before access: that whoever is signed in here now may not see the rink is no answer to who poured.
  if (input.userId !== undefined && input.userId !== viewer.userId) throw new OtherAccountError()
  const access = await requireRink(context, input.rinkId, 'writeLog')
  const pouredAt = pouredAtOf(input, now)
  const rink = await getRinkIfTonight({ ...context, now: pouredAt }, input)
  const waterTemperatureC = input.waterTemperatureC ?? rink.water.temperatureC
  const saidSetByAt = await saidSetBy(context, access, rink, { ...input, pouredAt, waterTemperatureC })
  await db.transaction(async (trx) => {
    const isNew = await insertFlood(
      trx,
      access,
      {
        nightDate: input.nightDate,
        passNumber: input.passNumber,
        pouredAt,
        layerMm: input.layerMm,
        waterL: input.layerMm * rink.lengthM * rink.widthM,
        waterTemperatureC,
        waterKind: rink.water.kind,
        pouredBy: viewer.userId,
        saidSetByAt,
        entryKey: input.entryKey ?? randomUUID(),
      },
      now,
    )
    if (!isNew) return
    await countChange(trx, access, now)
    await enqueueRefresh(trx, input.rinkId)
  })
}

function pouredAtOf({ pouredAt }: Sent, now: Date): Date {
  if (!pouredAt) return now
  const ageMillis = now.getTime() - pouredAt.getTime()
  if (ageMillis > LATEST_NEWS_MILLIS || ageMillis < -CLOCK_AHEAD_MILLIS) {
    throw new InvalidInputError('That was poured too long ago to be checked off here. Write it into the log instead.')
  }
  return ageMillis < 0 ? now : pouredAt
}

/**
 * Takes back a pass of tonight that was checked off; taking it back twice changes nothing.
 *
 * @throws ForbiddenError for skaters; InvalidInputError for a night other than tonight: what was poured then is the record.
 */
export async function undoPass(context: ServiceContext, input: UndoPass): Promise<void> {
  const access = await requireRink(context, input.rinkId, 'writeLog')
  await getRinkIfTonight(context, input)
  const { db, now, viewer } = context
  await db.transaction(async (trx) => {
    const entry = await lockPass(trx, access, input)
    if (!entry) return
    await updateEntry(trx, entry, { deletedAt: now }, { changedBy: viewer.userId, now })
    await countChange(trx, access, now)
    await enqueueRefresh(trx, input.rinkId)
  })
}

async function getRinkIfTonight({ db, now }: ServiceContext, { rinkId, nightDate }: UndoPass): Promise<RinkForJudging> {
  const rink = await getRinkForJudging(db, rinkId)
  if (nightDate === tonightDate(now, rink.timeZone)) return rink
  throw new InvalidInputError('That night is over.', { nightDate: 'Only tonight’s passes can be checked off.' })
}

/** When the model has this very pass set: its water, its minute, the sheet and the weather as known now. */
async function saidSetBy(
  context: ServiceContext,
  access: RinkAccess<'writeLog'>,
  rink: RinkForJudging,
  pass: CheckOffPass & { pouredAt: Date; waterTemperatureC: number },
): Promise<Date | null> {
  const model = await readNightModel(context, access, rink, pass.nightDate)
  if (!model) return null
  const wanted = {
    startsAt: pass.pouredAt.toISOString(),
    layerMm: pass.layerMm,
    temperatureC: pass.waterTemperatureC,
  }
  const setBy = judgePasses(unpackNight(model), [wanted])[0]?.setBy
  return setBy ? new Date(setBy) : null
}
