// Passes poured tonight: checked off once, taken back when it was a slip.
import { bumpSettingsVersion, deleteFlood, insertFlood } from '@/db/queries/floods'
import { enqueueRefresh } from '@/db/queries/jobs'
import { findRinkForJudging, type RinkForJudging } from '@/db/queries/rinks'
import { requireRink } from '@/lib/access/require-rink'
import { tonightDate } from '@/lib/advice/night'
import type { ServiceContext } from '@/lib/context'
import { InvalidInputError, NotFoundError } from '@/lib/errors'
import type { CheckOffPass, UndoPass } from '@/lib/schemas/floods'

/**
 * Logs a pass as poured now. The plan is judged anew, since the sheet has grown and carries water.
 * Checking off the same pass again changes nothing.
 *
 * @throws ForbiddenError for skaters; InvalidInputError for a night other than tonight.
 */
export async function checkOffPass(context: ServiceContext, input: CheckOffPass): Promise<void> {
  const access = await requireRink(context, input.rinkId, 'logFlood')
  const { db, now, viewer } = context
  const rink = await getRinkIfTonight(context, input)
  await db.transaction(async (trx) => {
    const isNew = await insertFlood(
      trx,
      access,
      {
        nightDate: input.nightDate,
        passNumber: input.passNumber,
        pouredAt: now,
        layerMm: input.layerMm,
        waterL: input.layerMm * rink.lengthM * rink.widthM,
        waterTemperatureC: rink.water.temperatureC,
        pouredBy: viewer.userId,
      },
      now,
    )
    if (!isNew) return
    await bumpSettingsVersion(trx, access, now)
    await enqueueRefresh(trx, input.rinkId)
  })
}

/**
 * Takes back a pass of tonight that was checked off; taking it back twice changes nothing.
 *
 * @throws ForbiddenError for skaters; InvalidInputError for a night other than tonight: what was poured then is the record.
 */
export async function undoPass(context: ServiceContext, input: UndoPass): Promise<void> {
  const access = await requireRink(context, input.rinkId, 'logFlood')
  await getRinkIfTonight(context, input)
  await context.db.transaction(async (trx) => {
    if (!(await deleteFlood(trx, access, input))) return
    await bumpSettingsVersion(trx, access, context.now)
    await enqueueRefresh(trx, input.rinkId)
  })
}

async function getRinkIfTonight({ db, now }: ServiceContext, { rinkId, nightDate }: UndoPass): Promise<RinkForJudging> {
  const rink = await findRinkForJudging(db, rinkId)
  if (!rink) throw new NotFoundError('Rink')
  if (nightDate === tonightDate(now, rink.timeZone)) return rink
  throw new InvalidInputError('That night is over.', { nightDate: 'Only tonight’s passes can be checked off.' })
}
