// Passes poured tonight: checked off once, taken back when it was a slip.
import { bumpSettingsVersion, deleteFlood, insertFlood, listFloodsSince } from '@/db/queries/floods'
import { enqueueRefresh } from '@/db/queries/jobs'
import { findNewestOutlook } from '@/db/queries/outlooks'
import { findRinkForJudging, type RinkForJudging } from '@/db/queries/rinks'
import type { RinkAccess } from '@/lib/access/proofs'
import { requireRink } from '@/lib/access/require-rink'
import { tonightDate } from '@/lib/advice/night'
import type { ServiceContext } from '@/lib/context'
import { InvalidInputError, NotFoundError } from '@/lib/errors'
import type { CheckOffPass, UndoPass } from '@/lib/schemas/floods'

const DAY_MILLIS = 86_400_000

/**
 * Logs a pass as poured now. The plan is judged anew, since the sheet has grown and carries water.
 * Checking off the same pass again changes nothing.
 *
 * @throws ForbiddenError for skaters; InvalidInputError for a night other than tonight.
 */
export async function checkOffPass(context: ServiceContext, input: CheckOffPass): Promise<void> {
  const access = await requireRink(context, input.rinkId, 'writeLog')
  const { db, now, viewer } = context
  const rink = await getRinkIfTonight(context, input)
  const saidSetByAt = await saidSetBy(context, access, input)
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
        saidSetByAt,
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
  const access = await requireRink(context, input.rinkId, 'writeLog')
  await getRinkIfTonight(context, input)
  await context.db.transaction(async (trx) => {
    if (!(await deleteFlood(trx, access, input, context.now))) return
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

/** When the plan said that this pass would be set, shifted by how late it was poured. */
async function saidSetBy(
  { db, now }: ServiceContext,
  access: RinkAccess<'writeLog'>,
  { nightDate, passNumber }: UndoPass,
): Promise<Date | null> {
  const [outlook, poured] = await Promise.all([
    findNewestOutlook(db, access),
    listFloodsSince(db, access, new Date(now.getTime() - DAY_MILLIS)),
  ])
  const before = poured.filter((pass) => pass.nightDate === nightDate && pass.pouredAt <= (outlook?.judgedAt ?? now))
  const last = Math.max(0, ...before.map((pass) => pass.passNumber ?? 0))
  const pass = outlook?.summary.nightDate === nightDate ? outlook.summary.passes[passNumber - last - 1] : undefined
  return pass ? new Date(now.getTime() + Date.parse(pass.setBy) - Date.parse(pass.startsAt)) : null
}
