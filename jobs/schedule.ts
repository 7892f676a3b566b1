// The timetable. It only enqueues, in UTC: node-cron skips an hour when a local clock changes (DEVELOPERS.md, decisions).
import cron from 'node-cron'
import type { Knex } from 'knex'
import { enqueueJob } from '@/db/queries/jobs'
import { logFailure } from '@/lib/log'
import { slotOf } from '@/lib/services/forecasts'

/** Minute of the hour at which forecasts are read: services have their newest run out by then. */
const SWEEP_AT = '7 * * * *'
const PRUNE_AT = '40 4 * * *'

/** Asks for this hour's sweep; asking again within the hour changes nothing. */
export async function requestSweep(db: Knex, now: Date): Promise<void> {
  const slotAt = slotOf(now).toISOString()
  await enqueueJob(db, 'sweep', { slotAt }, { key: `sweep:${slotAt}` })
}

/** Starts the timetable; the returned function stops it. */
export function startSchedule(db: Knex, readClock: () => Date): () => Promise<void> {
  const enqueue = (what: string, work: () => Promise<void>) => () => {
    work().catch((error: unknown) => logFailure('schedule.failed', error, { what }))
  }
  const options = { timezone: 'UTC' }
  const tasks = [
    cron.schedule(
      SWEEP_AT,
      enqueue('sweep', () => requestSweep(db, readClock())),
      options,
    ),
    cron.schedule(
      PRUNE_AT,
      enqueue('prune', async () => {
        const slotAt = slotOf(readClock()).toISOString()
        await enqueueJob(db, 'prune', { slotAt }, { key: `prune:${slotAt}` })
      }),
      options,
    ),
  ]
  return async () => {
    await Promise.all(tasks.map((task) => task.stop()))
  }
}
