// A rink's taps: which there are, and which is the usual one.
import { deleteWater, insertWater, listWaterSources, makeWaterUsual, updateWater } from '@/db/queries/water-sources'
import type { ServiceContext } from '@/lib/context'
import { InvalidInputError, NotFoundError } from '@/lib/errors'
import type { OneWaterInput, SaveWaterInput } from '@/lib/schemas/rink-settings'
import { changing } from './rink-settings'

/** More than any rink has; a list stays a list. */
const MOST_SOURCES = 8

/** Changes a source, or adds one. @throws NotFoundError for a source of another rink. */
export async function saveWater(context: ServiceContext, input: SaveWaterInput): Promise<void> {
  await changing(context, input.rinkId, async (trx, access) => {
    if (input.sourceId !== undefined) {
      if (!(await updateWater(trx, access, input.sourceId, input.water))) throw new NotFoundError('Source')
      return {}
    }
    const known = await listWaterSources(trx, access)
    if (known.length >= MOST_SOURCES) throw new InvalidInputError(`At most ${MOST_SOURCES} sources: remove one first.`)
    await insertWater(trx, input.rinkId, input.water, known.length === 0)
    return {}
  })
}

/** From now on plans pour from this one. @throws NotFoundError for a source of another rink. */
export async function pourFromWater(context: ServiceContext, { rinkId, sourceId }: OneWaterInput): Promise<void> {
  await changing(context, rinkId, async (trx, access) => {
    if (!(await makeWaterUsual(trx, access, sourceId))) throw new NotFoundError('Source')
    return {}
  })
}

/** @throws InvalidInputError for the usual source, so that the last one stays; NotFoundError for another rink's. */
export async function removeWater(context: ServiceContext, { rinkId, sourceId }: OneWaterInput): Promise<void> {
  await changing(context, rinkId, async (trx, access) => {
    if (await deleteWater(trx, access, sourceId)) return {}
    const known = await listWaterSources(trx, access)
    if (!known.some(({ id }) => id === sourceId)) throw new NotFoundError('Source')
    throw new InvalidInputError(
      known.length === 1 ? 'A rink needs water: the last source stays.' : 'Make another source the usual one first.',
    )
  })
}
