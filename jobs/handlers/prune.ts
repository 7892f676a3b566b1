// Clears away what has served its purpose. Forecasts, advised windows and the log stay: they are the record.
import { pruneExpired } from '@/db/queries/prune'
import { logEvent } from '@/lib/log'
import type { WorkerParts } from '../parts'

export async function pruneJob({ db, readClock }: WorkerParts): Promise<void> {
  logEvent('records.pruned', await pruneExpired(db, readClock()))
}
