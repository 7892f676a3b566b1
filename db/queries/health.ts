// Signs of life: how fresh the forecasts are, what waits to be sent, who works.
import type { Db } from '@/db/knex'

export interface Vitals {
  /** Rinks in season whose newest forecast is stale or missing, of all in season. */
  rinksInSeason: number
  rinksWithoutForecast: number
  newestForecastAt: Date | null
  oldestUnsentAt: Date | null
  /** Messages given up in the last day. */
  deadMessages: number
  /** Jobs that used up their tries. */
  failedJobs: number
  workers: number
}

/** The advisory lock that every living worker holds. */
export const PRESENCE_LOCK = 7_204_811

export async function readVitals(db: Db, now: Date): Promise<Vitals> {
  const { rows } = await db.raw<{ rows: Vitals[] }>(
    `with in_season as (
       select r.id, (select f.expires_at from forecasts f where f.grid_cell_id = r.grid_cell_id
                     order by f.slot_at desc limit 1) as good_until
       from rinks r where r.phase not in ('planning', 'closed'))
     select (select count(*)::int from in_season) as "rinksInSeason",
            (select count(*)::int from in_season where good_until is null or good_until <= :now) as "rinksWithoutForecast",
            (select max(fetched_at) from forecasts) as "newestForecastAt",
            (select min(send_at) from messages where state = 'promised' and send_at <= :now) as "oldestUnsentAt",
            (select count(*)::int from messages where state = 'dead' and settled_at > :now::timestamptz - interval '1 day')
              as "deadMessages",
            (select count(*)::int from graphile_worker.jobs where attempts >= max_attempts) as "failedJobs",
            (select count(*)::int from pg_locks where locktype = 'advisory' and granted and mode = 'ShareLock'
               and objid = :lock and database = (select oid from pg_database where datname = current_database()))
              as "workers"`,
    { now, lock: PRESENCE_LOCK },
  )
  const vitals = rows[0]
  if (!vitals) throw new Error('The vitals query returned no row')
  return vitals
}
