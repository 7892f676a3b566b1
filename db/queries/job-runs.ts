// When each kind of work last began and last ended well: what api/health shows.
import type { Db } from '@/db/knex'

export interface JobRun {
  job: string
  lastStartedAt: Date
  lastSucceededAt: Date | null
  lastFailedAt: Date | null
  lastError: string | null
}

/** Claims a run that must begin once, such as an hour's sweep; false when it was claimed before. */
export async function startRun(db: Db, run: { job: string; key: string }, now: Date): Promise<boolean> {
  const rows = await db('job_runs')
    .insert({ ...run, last_started_at: now, last_succeeded_at: now })
    .onConflict(['job', 'key'])
    .ignore()
    .returning('job')
  return rows.length > 0
}

/** Notes how a job ended. One row per kind of job: the record is a light, not a log. */
export async function noteRun(
  db: Db,
  run: { job: string; startedAt: Date; endedAt: Date; error: string | null },
): Promise<void> {
  const end =
    run.error === null ? { last_succeeded_at: run.endedAt } : { last_failed_at: run.endedAt, last_error: run.error }
  await db('job_runs')
    .insert({ job: run.job, key: '', last_started_at: run.startedAt, ...end })
    .onConflict(['job', 'key'])
    .merge({ last_started_at: run.startedAt, ...end })
}

export async function listRuns(db: Db): Promise<JobRun[]> {
  return db('job_runs').where({ key: '' }).orderBy('job').select({
    job: 'job',
    lastStartedAt: 'last_started_at',
    lastSucceededAt: 'last_succeeded_at',
    lastFailedAt: 'last_failed_at',
    lastError: 'last_error',
  })
}
