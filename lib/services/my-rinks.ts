// A person's rinks with what tonight holds for each, in a sentence.
import { listMembers } from '@/db/queries/members'
import { listNewestSummaries } from '@/db/queries/outlooks'
import { listRinksOfUser, type RinkOfUser } from '@/db/queries/rinks'
import { findAccount } from '@/db/queries/users'
import type { Role } from '@/lib/access/permissions'
import { requireRink } from '@/lib/access/require-rink'
import { tonightDate } from '@/lib/advice/night'
import type { ServiceContext } from '@/lib/context'
import { NotFoundError } from '@/lib/errors'
import { rinkIdSchema } from '@/lib/schemas/rinks'
import { verdictSentence } from '@/lib/words/night'
import { wordsFor } from '@/lib/words/options'

export interface MyRink extends RinkOfUser {
  /** Null before the first outlook, or when the newest one is of another night. */
  tonight: { isGood: boolean; sentence: string } | null
}

export async function listMyRinksTonight({ db, now, viewer }: ServiceContext): Promise<MyRink[]> {
  const [rinks, summaries, account] = await Promise.all([
    listRinksOfUser(db, viewer.userId),
    listNewestSummaries(db, viewer.userId),
    findAccount(db, viewer.userId),
  ])
  const byRink = new Map(summaries.map(({ rinkId, summary }) => [rinkId, summary]))
  return rinks.map((rink) => {
    const summary = byRink.get(rink.id)
    if (!summary || !account || summary.nightDate !== tonightDate(now, rink.timeZone)) return { ...rink, tonight: null }
    const words = wordsFor(account, rink.timeZone)
    const isGood = summary.verdict === 'flood' || summary.verdict === 'fill'
    return { ...rink, tonight: { isGood, sentence: verdictSentence(summary, now, words) } }
  })
}

/** One rink of the viewer's with their role. @throws NotFoundError for strangers. */
export async function getMyRink(context: ServiceContext, rinkId: string): Promise<RinkOfUser> {
  const access = await requireRink(context, rinkIdSchema.parse(rinkId), 'view')
  const rink = (await listRinksOfUser(context.db, context.viewer.userId)).find(({ id }) => id === access.rinkId)
  if (!rink) throw new NotFoundError('Rink')
  return rink
}

export interface WhoMay {
  rinkName: string
  role: Role
  /** Names of those who keep it. */
  keepers: string[]
}

/** For a member who opened what their role may not. @throws NotFoundError for strangers. */
export async function getWhoMay(context: ServiceContext, rinkId: string): Promise<WhoMay> {
  const access = await requireRink(context, rinkIdSchema.parse(rinkId), 'view')
  const [{ name, role }, people] = await Promise.all([getMyRink(context, rinkId), listMembers(context.db, access)])
  return {
    rinkName: name,
    role,
    keepers: people.filter((person) => person.role === 'keeper').map((person) => person.name),
  }
}
