// Is the product doing its job? For the operator's monitor and the server page; no private data.
import { readVitals } from '@/db/queries/health'
import { listRuns } from '@/db/queries/job-runs'
import type { Db } from '@/db/knex'
import { logFailure } from '@/lib/log'

export interface Health {
  status: 'ok' | 'degraded' | 'down'
  /** What is wrong, in words; empty when all is well. */
  troubles: string[]
  workers: number
  rinksInSeason: number
  newestForecastAgeMinutes: number | null
  oldestUnsentAgeSeconds: number | null
  deadMessages: number
  failedJobs: number
  jobs: {
    job: string
    lastStartedAt: string
    lastSucceededAt: string | null
    lastFailedAt: string | null
    lastError: string | null
  }[]
}

/** Mail and push go out within seconds; minutes mean that nobody sends. */
const LATE_SECONDS = 300

/** State of the whole product. Never throws: an unreachable database is an answer too. */
export async function getHealth(db: Db, now: Date): Promise<Health> {
  try {
    return await readHealth(db, now)
  } catch (error) {
    logFailure('health.unreadable', error)
    return { ...NOTHING_KNOWN, status: 'down', troubles: ['The database cannot be reached.'] }
  }
}

/** Anybody may ask, and every answer costs queries over all rinks. Ours. */
const REUSED_MILLIS = 10_000

/** Reads the state of the product, and gives the same answer to all who ask within ten seconds. */
export function createHealthReader(): (db: Db, now: Date) => Promise<Health> {
  let last: { readAt: Date; health: Promise<Health> } | undefined
  return (db, now) => {
    if (!last || now.getTime() - last.readAt.getTime() >= REUSED_MILLIS) {
      last = { readAt: now, health: getHealth(db, now) }
    }
    return last.health
  }
}

const NOTHING_KNOWN = {
  workers: 0,
  rinksInSeason: 0,
  newestForecastAgeMinutes: null,
  oldestUnsentAgeSeconds: null,
  deadMessages: 0,
  failedJobs: 0,
  jobs: [],
}

async function readHealth(db: Db, now: Date): Promise<Health> {
  const [vitals, runs] = await Promise.all([readVitals(db, now), listRuns(db)])
  const secondsSince = (at: Date | null) => (at ? Math.max(0, Math.round((now.getTime() - at.getTime()) / 1000)) : null)
  const oldestUnsentAgeSeconds = secondsSince(vitals.oldestUnsentAt)
  const newestForecastAge = secondsSince(vitals.newestForecastAt)
  const troubles = [
    vitals.workers === 0 ? 'No worker is running.' : '',
    vitals.rinksWithoutForecast > 0
      ? `${vitals.rinksWithoutForecast} of ${vitals.rinksInSeason} rinks in season have no current forecast.`
      : '',
    (oldestUnsentAgeSeconds ?? 0) > LATE_SECONDS ? 'Messages wait longer than five minutes.' : '',
    vitals.failedJobs > 0 ? `${vitals.failedJobs} jobs used up their tries.` : '',
  ].filter(Boolean)
  return {
    status: troubles.length > 0 ? 'degraded' : 'ok',
    troubles,
    workers: vitals.workers,
    rinksInSeason: vitals.rinksInSeason,
    newestForecastAgeMinutes: newestForecastAge === null ? null : Math.round(newestForecastAge / 60),
    oldestUnsentAgeSeconds,
    deadMessages: vitals.deadMessages,
    failedJobs: vitals.failedJobs,
    jobs: runs.map((run) => ({
      job: run.job,
      lastStartedAt: run.lastStartedAt.toISOString(),
      lastSucceededAt: run.lastSucceededAt?.toISOString() ?? null,
      lastFailedAt: run.lastFailedAt?.toISOString() ?? null,
      lastError: run.lastError,
    })),
  }
}
