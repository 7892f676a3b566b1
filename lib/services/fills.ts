// Running a fill: start, pause, resume, look, finish. Each is one transaction, and of two people at once one is told of the other.
import {
  findNewestFill,
  insertFill,
  insertFillCheck,
  insertFillSession,
  listFillSessions,
  lockOpenFill,
  stopFillSession,
  type Fill,
} from '@/db/queries/fills'
import { enqueuePull, enqueueRefresh } from '@/db/queries/jobs'
import { countChange, lockRink, movePhase } from '@/db/queries/rink-settings'
import { insertReportedSheet } from '@/db/queries/sheet-states'
import { getRinkForJudging } from '@/db/queries/rinks'
import { requireRink } from '@/lib/access/require-rink'
import type { ServiceContext } from '@/lib/context'
import { ConflictError } from '@/lib/errors'
import { hasIce } from '@/lib/schemas/rink-choices'
import type { CheckFillInput, ResumeFillInput, StartFillInput } from '@/lib/schemas/fills'
import { endFill, type OpenFill } from './end-fill'
import { setFillReminders } from './fill-reminders'

/** What there is before the first ice. */
const OPEN_WATER = { thicknessMm: 0, temperatureC: 0, snowCoverCm: 0 }

/**
 * Starts a fill with the hose running.
 *
 * @throws ConflictError when one is open already, or when ice is there: a fill starts before it.
 */
export async function startFill(context: ServiceContext, input: StartFillInput): Promise<void> {
  const { db, now, viewer } = context
  const access = await requireRink(context, input.rinkId, 'writeLog')
  await db.transaction(async (trx) => {
    await lockRink(trx, access)
    const rink = await getRinkForJudging(trx, access.rinkId)
    const targetDepthMm = input.targetDepthMm ?? rink.water.fillDepthMm
    const fillId = await insertFill(trx, access, { startedBy: viewer.userId, targetDepthMm }, now)
    const fill = await findNewestFill(trx, access)
    if (!fillId || !fill) throw alreadyOpen(fill)
    if (hasIce(rink.phase)) {
      throw new ConflictError('There is ice on this rink. Its keeper can set it back to waiting in the rink settings.')
    }
    await insertFillSession(trx, fillId, input.flowLPerMin ?? rink.water.flowLPerMin, now)
    await movePhase(trx, access, 'filling', now)
    // Of a rink that was being planned no weather has been read.
    await enqueuePull(trx, rink.gridCellId)
    await enqueueRefresh(trx, rink.id)
    await setFillReminders(trx, access, { rink, fill, now, viewer })
  })
}

function alreadyOpen(fill: Fill | undefined): ConflictError {
  return new ConflictError(`${fill?.startedByName ?? 'Somebody'} has started this fill already: it stands below.`)
}

/** @throws ConflictError when the hose is off already. */
export async function pauseFill(context: ServiceContext, { rinkId }: { rinkId: string }): Promise<void> {
  const { now, viewer } = context
  await atOpenFill(context, rinkId, async ({ trx, access, rink, fill }) => {
    if (!(await stopFillSession(trx, fill.id, now))) throw new ConflictError('The hose is off already.')
    await setFillReminders(trx, access, { rink, fill, now, viewer })
    await countChange(trx, access, now)
    await enqueueRefresh(trx, rinkId)
  })
}

/** @throws ConflictError when the hose runs already. */
export async function resumeFill(context: ServiceContext, input: ResumeFillInput): Promise<void> {
  const { now, viewer } = context
  await atOpenFill(context, input.rinkId, async ({ trx, access, rink, fill }) => {
    const last = (await listFillSessions(trx, fill.id)).at(-1)
    const flowLPerMin = input.flowLPerMin ?? last?.flowLPerMin ?? rink.water.flowLPerMin
    if (!(await insertFillSession(trx, fill.id, flowLPerMin, now))) throw new ConflictError('The hose runs already.')
    await setFillReminders(trx, access, { rink, fill, now, viewer })
    await countChange(trx, access, now)
    await enqueueRefresh(trx, input.rinkId)
  })
}

/** Somebody was there: the next look is due two hours from now. */
export async function checkFill(context: ServiceContext, input: CheckFillInput): Promise<void> {
  const { now, viewer } = context
  await atOpenFill(context, input.rinkId, async ({ trx, access, rink, fill }) => {
    const { lowCornerDepthMm, note } = input
    await insertFillCheck(trx, fill.id, { checkedBy: viewer.userId, lowCornerDepthMm, note }, now)
    await setFillReminders(trx, access, { rink, fill, now, viewer })
  })
}

/** The water is in: it goes into the log, and the rink freezes from open water. A fill without water never was. */
export async function finishFill(context: ServiceContext, { rinkId }: { rinkId: string }): Promise<void> {
  const { now } = context
  await atOpenFill(context, rinkId, async (open) => {
    const { trx, access } = open
    const isFilled = await endFill(context, open, { endedAt: now, isGivenUp: false, note: '' })
    if (isFilled) await insertReportedSheet(trx, rinkId, OPEN_WATER, now)
    await movePhase(trx, access, isFilled ? 'freezing' : 'waiting', now)
  })
}

/** The fill came to nothing, a torn liner for one: its water is logged, and the rink waits again. */
export async function giveUpFill(context: ServiceContext, { rinkId }: { rinkId: string }): Promise<void> {
  await atOpenFill(context, rinkId, async (open) => {
    const { now } = context
    await endFill(context, open, { endedAt: now, isGivenUp: true, note: 'Given up before it was full.' })
    await movePhase(open.trx, open.access, 'waiting', now)
  })
}

async function atOpenFill(
  context: ServiceContext,
  rinkId: string,
  work: (open: OpenFill) => Promise<void>,
): Promise<void> {
  const access = await requireRink(context, rinkId, 'writeLog')
  await context.db.transaction(async (trx) => {
    // The rink before the fill, as its settings do: of two who each held one, both would wait.
    await lockRink(trx, access)
    const fill = await lockOpenFill(trx, access)
    const rink = await getRinkForJudging(trx, access.rinkId)
    if (!fill || rink.phase !== 'filling') {
      throw new ConflictError('This fill is finished. Load the page again to see how it stands.')
    }
    await work({ trx, access, fill, rink })
  })
}
