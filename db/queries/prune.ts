// Deletes rows that nobody will read again.
import type { Db } from '@/db/knex'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { deleteDueAccounts } from './account-ends'
import { deleteUnconfirmedUsersBefore } from './users'

/** How long each kind of row is kept. Ours. [h] */
const KEEP_HOURS = {
  outlooks: 48,
  modelledSheets: 72,
  links: 24 * 7,
  invitations: 24 * 14,
  rateLimits: 48,
  runs: 24 * 7,
  spentJobs: 24 * 7,
  goneDevices: 24 * 30,
  // One season is held against the last.
  messages: 24 * 400,
  unconfirmed: 24 * 7,
} as const

/**
 * Outlooks go but for the newest of each rink: what was advised lives on in advised_windows, the weather in forecasts.
 * @returns rows deleted by kind.
 */
export async function pruneExpired(db: Db, now: Date): Promise<Record<string, number>> {
  const before = (hours: number) => new Date(now.getTime() - hours * HOUR_MILLIS)
  const outlooks = await db('outlooks as o')
    .where('o.judged_at', '<', before(KEEP_HOURS.outlooks))
    .whereExists(
      db('outlooks as newer')
        .select(db.raw('1'))
        .whereRaw('newer.rink_id = o.rink_id and newer.judged_at > o.judged_at'),
    )
    .delete()
  const sheets = await db('sheet_states')
    .where({ origin: 'modelled' })
    .where('as_of', '<', before(KEEP_HOURS.modelledSheets))
    // The last of each day by the rink's clock stays: the season's thickness is drawn from it, and a run may start there.
    .whereRaw(
      `exists (select 1 from sheet_states newer join rinks r on r.id = newer.rink_id
               where newer.rink_id = sheet_states.rink_id and newer.origin = 'modelled'
               and newer.as_of > sheet_states.as_of and newer.as_of < ?
               and (newer.as_of at time zone r.time_zone)::date = (sheet_states.as_of at time zone r.time_zone)::date)`,
      [before(24)],
    )
    .delete()
  const sessions = await db('sessions').where('expires_at', '<', now).delete()
  const links = await db('account_links').where('expires_at', '<', before(KEEP_HOURS.links)).delete()
  const invitations = await db('invitations').where('expires_at', '<', before(KEEP_HOURS.invitations)).delete()
  const limits = await db('rate_limits').where('window_starts_at', '<', before(KEEP_HOURS.rateLimits)).delete()
  const runs = await db('job_runs')
    .whereNot({ key: '' })
    .where('last_started_at', '<', before(KEEP_HOURS.runs))
    .delete()
  const jobs = await forgetSpentJobs(db, before(KEEP_HOURS.spentJobs))
  const devices = await db('push_subscriptions').where('disabled_at', '<', before(KEEP_HOURS.goneDevices)).delete()
  // Their attempts go along.
  const messages = await db('messages').where('settled_at', '<', before(KEEP_HOURS.messages)).delete()
  const accounts = await deleteDueAccounts(db, now)
  const unconfirmed = await deleteUnconfirmedUsersBefore(db, before(KEEP_HOURS.unconfirmed))
  return {
    accounts,
    unconfirmed,
    outlooks,
    sheets,
    sessions,
    links,
    invitations,
    limits,
    runs,
    jobs,
    devices,
    messages,
  }
}

/** Jobs that used up their tries; until then api/health counts them. The queue's own function leaves out locked ones. */
async function forgetSpentJobs(db: Db, instant: Date): Promise<number> {
  const { rows } = await db.raw<{ rows: { jobs: number }[] }>(
    `select count(*)::int as jobs from graphile_worker.complete_jobs(array(
       select id from graphile_worker.jobs where attempts >= max_attempts and updated_at < :instant))`,
    { instant },
  )
  return rows[0]?.jobs ?? 0
}
