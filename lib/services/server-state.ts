// How this server does, for whoever runs it.
import { listFailingCells, listRecentFailures, type FailingCell, type RecentFailure } from '@/db/queries/troubles'
import { requireStaff } from '@/lib/access/require-rink'
import type { ServiceContext } from '@/lib/context'
import { getHealth, type Health } from './health'

export interface ServerState {
  health: Health
  failingCells: FailingCell[]
  recentFailures: RecentFailure[]
}

/** @throws NotFoundError for everybody else: for them this page does not exist. */
export async function getServerState(context: ServiceContext): Promise<ServerState> {
  const access = requireStaff(context)
  const [health, failingCells, recentFailures] = await Promise.all([
    getHealth(context.db, context.now),
    listFailingCells(context.db, access),
    listRecentFailures(context.db, access),
  ])
  return { health, failingCells, recentFailures }
}
