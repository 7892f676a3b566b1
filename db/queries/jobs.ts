// Promising work: one row in the queue, written in the caller's transaction.
import type { Db } from '@/db/knex'

/** Every job there is, with its payload: ids, never copies. The handlers are in jobs/definitions.ts. */
export interface JobPayloads {
  sweep: { slotAt: string }
  'pull-forecast': { cellId: string }
  'refresh-outlook': { rinkId: string }
  'decide-alerts': { rinkId: string }
  'deliver-message': { messageId: string }
  'settle-night': { rinkId: string; nightDate: string }
  'learn-yard': { rinkId: string }
  prune: { slotAt: string }
}

interface EnqueueOptions {
  /** A pending job with the same key is replaced, so there is one at most. */
  key: string
  runAt?: Date
  /** Jobs of one queue run one after the other, over all workers. */
  queue?: string
}

export async function enqueueJob<J extends keyof JobPayloads>(
  db: Db,
  job: J,
  payload: JobPayloads[J],
  { key, runAt, queue }: EnqueueOptions,
): Promise<void> {
  await db.raw(
    `select graphile_worker.add_job(:job, :payload::json, queue_name => :queue, run_at => :runAt::timestamptz, job_key => :key)`,
    { job, payload: JSON.stringify(payload), queue: queue ?? null, runAt: runAt ?? null, key },
  )
}

/** A forecast for one cell, soon. Two lanes over all cells: a free weather service allows no more requests at once. */
export async function enqueuePull(db: Db, cellId: string, runAt?: Date): Promise<void> {
  const lane = parseInt(cellId.slice(-1), 16) % 2
  await enqueueJob(db, 'pull-forecast', { cellId }, { key: `pull:${cellId}`, queue: `weather-${lane}`, runAt })
}

/** A new judgement of one rink, soon. */
export async function enqueueRefresh(db: Db, rinkId: string): Promise<void> {
  await enqueueJob(db, 'refresh-outlook', { rinkId }, { key: `refresh:${rinkId}` })
}

/** A look, soon, at whether there is something to tell about a rink's night. */
export async function enqueueDecision(db: Db, rinkId: string): Promise<void> {
  await enqueueJob(db, 'decide-alerts', { rinkId }, { key: `decide:${rinkId}:now` })
}

/** A night that is over, to be held against what came. */
export async function enqueueSettling(db: Db, rinkId: string, nightDate: string): Promise<void> {
  await enqueueJob(db, 'settle-night', { rinkId, nightDate }, { key: `settle:${rinkId}:${nightDate}` })
}

/** A new look at what a yard's reports teach, soon. */
export async function enqueueLearning(db: Db, rinkId: string): Promise<void> {
  await enqueueJob(db, 'learn-yard', { rinkId }, { key: `learn:${rinkId}` })
}
