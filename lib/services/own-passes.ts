// The keeper's own plan of a night: kept, judged with the newest forecast whenever it is shown, and dropped again.
import { listFloodsSince } from '@/db/queries/floods'
import { listOwnPasses, replaceOwnPasses, type OwnPass } from '@/db/queries/own-passes'
import { getRinkForJudging, type RinkForJudging } from '@/db/queries/rinks'
import type { RinkAccess } from '@/lib/access/proofs'
import { requireRink } from '@/lib/access/require-rink'
import { judgePasses } from '@/lib/advice/move-pass'
import { nightBounds, tonightDate, tonightStartsAt } from '@/lib/advice/night'
import { unpackNight } from '@/lib/advice/night-model'
import type { ServiceContext } from '@/lib/context'
import { InvalidInputError } from '@/lib/errors'
import type { DropOwnPasses, KeepOwnPasses } from '@/lib/schemas/own-passes'
import type { TonightPass } from '@/lib/schemas/tonight-view'
import { readNightModel } from './night-model'

/**
 * Keeps tonight's passes as the keeper wants them; the last one to say stands. Passes that are poured already are left out.
 *
 * @throws ForbiddenError for everybody but the keeper; InvalidInputError for a night other than tonight, or a pass outside it.
 */
export async function keepOwnPasses(context: ServiceContext, input: KeepOwnPasses): Promise<void> {
  const access = await requireRink(context, input.rinkId, 'manage')
  const { db, now, viewer } = context
  const { startsAt, endsAt, turnsAt } = await tonightOf(context, input)
  if (input.passes.some((pass) => pass.startsAt < startsAt || pass.startsAt >= endsAt)) {
    throw new InvalidInputError('A pass has to start between noon and noon.', {
      passes: 'A pass lies outside this night.',
    })
  }
  await db.transaction(async (trx) => {
    const poured = await listFloodsSince(trx, access, turnsAt)
    const isPoured = (number: number) => poured.some((flood) => flood.passNumber === number)
    const passes = input.passes
      .filter(({ number }) => !isPoured(number))
      .map(({ temperatureC, ...pass }) => ({ ...pass, waterTemperatureC: temperatureC }))
    await replaceOwnPasses(trx, access, input.nightDate, passes, { changedBy: viewer.userId, now })
  })
}

/** The advised plan stands again. @throws as keepOwnPasses */
export async function dropOwnPasses(context: ServiceContext, input: DropOwnPasses): Promise<void> {
  const access = await requireRink(context, input.rinkId, 'manage')
  await tonightOf(context, input)
  await context.db.transaction((trx) =>
    replaceOwnPasses(trx, access, input.nightDate, [], { changedBy: context.viewer.userId, now: context.now }),
  )
}

async function tonightOf({ db, now }: ServiceContext, { rinkId, nightDate }: DropOwnPasses) {
  const rink = await getRinkForJudging(db, rinkId)
  if (nightDate !== tonightDate(now, rink.timeZone)) {
    throw new InvalidInputError('That night is over.', { nightDate: 'Only tonight’s plan can be changed.' })
  }
  return { ...nightBounds(nightDate, rink.timeZone), turnsAt: tonightStartsAt(nightDate, rink.timeZone) }
}

/** The keeper's plan of a night as it stands with the newest forecast; null when the advised plan stands. */
export async function judgeOwnPasses(
  context: Pick<ServiceContext, 'db' | 'now'>,
  access: RinkAccess,
  rink: RinkForJudging,
  nightDate: string,
): Promise<{ by: string | null; passes: TonightPass[] } | null> {
  const own = await listOwnPasses(context.db, access, nightDate)
  const [first] = own
  if (!first) return null
  const model = await readNightModel(context, access, rink, nightDate)
  const judged = model
    ? judgePasses(
        unpackNight(model),
        own.map((pass) => ({
          startsAt: pass.startsAt.toISOString(),
          layerMm: pass.layerMm,
          temperatureC: pass.waterTemperatureC,
          hoseMinutes: hoseMinutesOf(pass, rink),
        })),
      )
    : []
  return { by: first.by, passes: own.map((pass, index) => toView(pass, judged[index] ?? null, rink)) }
}

function hoseMinutesOf({ layerMm, flowLPerMin }: OwnPass, { lengthM, widthM }: RinkForJudging): number {
  return Math.ceil((layerMm * lengthM * widthM) / flowLPerMin)
}

function toView(pass: OwnPass, judged: ReturnType<typeof judgePasses>[number], rink: RinkForJudging): TonightPass {
  return {
    number: pass.number,
    startsAt: pass.startsAt.toISOString(),
    setBy: judged?.setBy ?? null,
    layerMm: pass.layerMm,
    waterL: Math.round(pass.layerMm * rink.lengthM * rink.widthM),
    hoseMinutes: hoseMinutesOf(pass, rink),
    temperatureC: pass.waterTemperatureC,
    flowLPerMin: pass.flowLPerMin,
    warnings: judged?.warnings ?? [],
    limits: judged?.limits ?? [],
    poured: null,
  }
}
