// What went wrong lately, for whoever runs the server. Names and addresses of people stay out of it.
import type { Db } from '@/db/knex'
import type { StaffAccess } from '@/lib/access/proofs'

export interface FailingCell {
  latitudeDeg: number
  longitudeDeg: number
  lastError: string
  retryAt: Date | null
}

export interface RecentFailure {
  kind: string
  channel: string
  attemptedAt: Date
  outcome: string
  error: string | null
}

const MOST_ROWS = 20

/** Cells whose newest try at reading the weather failed. */
export async function listFailingCells(db: Db, _access: StaffAccess): Promise<FailingCell[]> {
  return db('grid_cells')
    .whereNotNull('last_error')
    .orderBy('last_tried_at', 'desc')
    .limit(MOST_ROWS)
    .select<FailingCell[]>({
      latitudeDeg: 'latitude_deg',
      longitudeDeg: 'longitude_deg',
      lastError: 'last_error',
      retryAt: 'retry_at',
    })
}

/** The newest deliveries that failed. */
export async function listRecentFailures(db: Db, _access: StaffAccess): Promise<RecentFailure[]> {
  return db('delivery_attempts as a')
    .join('messages as m', 'm.id', 'a.message_id')
    .whereNot({ 'a.outcome': 'delivered' })
    .orderBy('a.attempted_at', 'desc')
    .limit(MOST_ROWS)
    .select({
      kind: 'm.kind',
      channel: 'm.channel',
      attemptedAt: 'a.attempted_at',
      outcome: 'a.outcome',
      error: 'a.error',
    })
}
