// Jobs of a worker that was killed stay locked, and the queue would wait hours for it. Who lives holds an advisory lock.
import pg from 'pg'
import { PRESENCE_LOCK } from '@/db/queries/health'
import { logEvent, logFailure } from '@/lib/log'
import { MINUTE_MILLIS } from '@/lib/physics/constants'

/** No handler runs this long: the time limits of providers and mail servers are far shorter. */
const LONGEST_JOB_MINUTES = 15
const REJOIN_MILLIS = 5_000
const LOOK_ROUND_MILLIS = 5 * MINUTE_MILLIS

/**
 * Holds the presence lock for the life of this process, after freeing the jobs of workers that no longer live: all
 * locked jobs when nobody else is present, else those locked longer than any job can take, then and every five minutes.
 *
 * @returns a function that gives the lock up.
 */
export async function announcePresence(connectionString: string): Promise<() => Promise<void>> {
  let isLeaving = false
  let client = await join(connectionString, rejoin, true)

  function rejoin(): void {
    if (isLeaving) return
    setTimeout(() => {
      join(connectionString, rejoin, false).then(
        (joined) => (client = joined),
        () => rejoin(),
      )
    }, REJOIN_MILLIS).unref()
  }

  // One of several that was killed is seldom the last to start: whoever lives on hands its jobs to the others.
  const round = setInterval(() => {
    freeAbandonedJobs(client, LONGEST_JOB_MINUTES).catch((error: unknown) => logFailure('jobs.not_freed', error))
  }, LOOK_ROUND_MILLIS).unref()

  return async () => {
    isLeaving = true
    clearInterval(round)
    await client.end().catch(() => undefined)
  }
}

async function join(connectionString: string, onLost: () => void, isFirst: boolean): Promise<pg.Client> {
  const client = new pg.Client({ connectionString, application_name: 'nightsheet presence' })
  client.on('error', (error) => {
    logFailure('worker.presence_lost', error)
    onLost()
  })
  await client.connect()
  const { rows } = await client.query('select pg_try_advisory_lock($1) as alone', [PRESENCE_LOCK])
  const isAlone = rows[0]?.alone === true
  // After a lost connection this worker's own jobs may still run: nothing of them is freed then.
  if (isFirst) await freeAbandonedJobs(client, isAlone ? 0 : LONGEST_JOB_MINUTES)
  await client.query('select pg_advisory_lock_shared($1)', [PRESENCE_LOCK])
  if (isAlone) await client.query('select pg_advisory_unlock($1)', [PRESENCE_LOCK])
  return client
}

async function freeAbandonedJobs(client: pg.Client, lockedForMinutes: number): Promise<void> {
  const { rows } = await client.query(
    `with abandoned as (
       select array_agg(distinct locked_by) as workers from graphile_worker.jobs
       where locked_by is not null and locked_at <= now() - make_interval(mins => $1::int))
     select cardinality(workers) as count, graphile_worker.force_unlock_workers(workers) from abandoned
     where workers is not null`,
    [lockedForMinutes],
  )
  if (rows[0]) logEvent('jobs.freed', { workers: Number(rows[0].count) })
}
