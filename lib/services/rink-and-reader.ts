// What every page of a rink begins with: the rink, how its reader takes figures, and the reader's part there.
import { findMembership } from '@/db/queries/members'
import { findRinkForJudging, type RinkForJudging } from '@/db/queries/rinks'
import { findAccount } from '@/db/queries/users'
import type { Role } from '@/lib/access/permissions'
import type { RinkAccess } from '@/lib/access/proofs'
import { requireRink } from '@/lib/access/require-rink'
import type { ServiceContext } from '@/lib/context'
import { NotFoundError } from '@/lib/errors'
import { rinkIdSchema } from '@/lib/schemas/rinks'
import { wordsFor, type WordOptions } from '@/lib/words/options'
import { getAccount } from './own-account'

export interface RinkAndReader {
  access: RinkAccess<'view'>
  rink: RinkForJudging
  reader: WordOptions
  role: Role
}

/** How the viewer reads figures and times; times are the rink's. */
export async function readerOf(context: ServiceContext, timeZone: string): Promise<WordOptions> {
  return wordsFor(await getAccount(context), timeZone)
}

/** @param rinkId As it stands in the address. @throws NotFoundError for strangers. */
export async function getRinkAndReader(context: ServiceContext, rinkId: string): Promise<RinkAndReader> {
  const access = await requireRink(context, rinkIdSchema.parse(rinkId), 'view')
  const { db, viewer } = context
  const [rink, person, member] = await Promise.all([
    findRinkForJudging(db, access.rinkId),
    findAccount(db, viewer.userId),
    findMembership(db, { rinkId: access.rinkId, userId: viewer.userId }),
  ])
  if (!rink || !person || !member) throw new NotFoundError('Rink')
  return { access, rink, reader: wordsFor(person, rink.timeZone), role: member.role }
}
