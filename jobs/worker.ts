// The worker: reads settings, builds the parts, runs the timetable and the queue, and drains on SIGTERM.
import { Logger, run } from 'graphile-worker'
import pg from 'pg'
import { readEnvironment } from '@/lib/env'
import { logEvent, logFailure } from '@/lib/log'
import { taskList } from './definitions'
import { createParts } from './parts'
import { announcePresence } from './presence'
import { requestSweep, startSchedule } from './schedule'

const CONCURRENCY = 4

/** The queue's own chatter stays out of the log; handlers and failures write one JSON line each. */
const quietLogger = new Logger(() => (level, message) => {
  if (level === 'error') logEvent('queue.complained', { message })
})

function queuePool(connectionString: string): pg.Pool {
  const pool = new pg.Pool({ connectionString, max: CONCURRENCY + 2, application_name: 'nightsheet queue' })
  const note = (error: Error) => logFailure('queue.connection_lost', error)
  pool.on('error', note)
  pool.on('connect', (client) => client.on('error', note))
  return pool
}

async function main(): Promise<void> {
  const env = readEnvironment()
  const parts = createParts(env)
  const leave = await announcePresence(env.DATABASE_URL)
  const pgPool = queuePool(env.DATABASE_URL)
  const runner = await run({
    pgPool,
    concurrency: CONCURRENCY,
    noHandleSignals: true,
    logger: quietLogger,
    taskList: taskList(parts),
  })
  const stopSchedule = startSchedule(parts.db, parts.readClock)
  await requestSweep(parts.db, parts.readClock())
  logEvent('worker.started', { concurrency: CONCURRENCY })

  let isStopping = false
  const stop = async (signal: string) => {
    if (isStopping) return
    isStopping = true
    await stopSchedule()
    await runner.stop()
    await parts.db.destroy()
    await pgPool.end()
    await leave()
    logEvent('worker.stopped', { signal })
    process.exit(0)
  }
  for (const signal of ['SIGTERM', 'SIGINT'] as const) process.on(signal, () => void stop(signal))
}

main().catch((error: unknown) => {
  logFailure('worker.failed', error)
  process.exit(1)
})
