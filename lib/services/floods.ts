// Passes poured tonight: checked off once, taken back when it was a slip.
import { bumpSettingsVersion, deleteFlood, insertFlood } from '@/db/queries/floods'
import { enqueueRefresh } from '@/db/queries/jobs'
import { findRinkForJudging } from '@/db/queries/rinks'
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
  const rink = await findRinkForJudging(db, input.rinkId)
  if (!rink) throw new NotFoundError('Rink')
  if (input.nightDate !== tonightDate(now, rink.timeZone)) {
    throw new InvalidInputError('That night is over.', { nightDate: 'Only tonight’s passes can be checked off.' })
  }
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

/** Takes back a pass of tonight that was checked off; taking it back twice changes nothing. */
export async function undoPass(context: ServiceContext, input: UndoPass): Promise<void> {
  const access = await requireRink(context, input.rinkId, 'logFlood')
  await context.db.transaction(async (trx) => {
    if (!(await deleteFlood(trx, access, input))) return
    await bumpSettingsVersion(trx, access, context.now)
    await enqueueRefresh(trx, input.rinkId)
  })
}
