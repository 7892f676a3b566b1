// The end of a rink, or of one's part in it.
import { countKeepers, deleteMember, findMembership } from '@/db/queries/members'
import { deleteRink as deleteRinkRow } from '@/db/queries/rink-settings'
import { getRinkHead } from '@/db/queries/rinks'
import { requireRink } from '@/lib/access/require-rink'
import type { ServiceContext } from '@/lib/context'
import { InvalidInputError, NotFoundError } from '@/lib/errors'
import type { DeleteRinkInput } from '@/lib/schemas/rink-settings'

/** For good, with its log: so its name has to be typed. @throws InvalidInputError when it is another name. */
export async function deleteRink(context: ServiceContext, { rinkId, name }: DeleteRinkInput): Promise<void> {
  const access = await requireRink(context, rinkId, 'manage')
  const rink = await getRinkHead(context.db, access)
  if (name.toLowerCase() !== rink.name.toLowerCase()) {
    throw new InvalidInputError('Nothing was deleted.', { name: `Type ${rink.name}, the name of this rink.` })
  }
  await deleteRinkRow(context.db, access)
}

export interface Leaving {
  rinkName: string
  /** The only keeper cannot leave: nobody could look after the rink. */
  isOnlyKeeper: boolean
}

/** What leaving would mean, for the page that asks. @throws NotFoundError for strangers. */
export async function getLeaving(context: ServiceContext, rinkId: string): Promise<Leaving> {
  const access = await requireRink(context, rinkId, 'view')
  const membership = await findMembership(context.db, { rinkId, userId: context.viewer.userId })
  const { name } = await getRinkHead(context.db, access)
  const isOnlyKeeper = membership?.role === 'keeper' && (await countKeepers(context.db, access)) === 1
  return { rinkName: name, isOnlyKeeper }
}

/** Gives up one's part in a rink; the rink and its log stay. @throws InvalidInputError for its only keeper. */
export async function leaveRink(context: ServiceContext, rinkId: string): Promise<void> {
  const access = await requireRink(context, rinkId, 'view')
  await context.db.transaction(async (trx) => {
    const left = await deleteMember(trx, access, context.viewer.userId, context.now)
    if (!left) throw new NotFoundError('Rink')
    // Counted after the row is gone and under the lock of those that are left: two keepers cannot both leave at once.
    if (left.role === 'keeper' && (await countKeepers(trx, access)) === 0) {
      throw new InvalidInputError('You are its only keeper. Make somebody else keeper first, or delete the rink.')
    }
  })
}
