// Every job by name: its payload and its handler. How often one is tried is the queue's own; messages have an expiry.
import type { Task } from 'graphile-worker'
import { z } from 'zod'
import type { JobPayloads } from '@/db/queries/jobs'
import { noteRun } from '@/db/queries/job-runs'
import { logFailure } from '@/lib/log'
import { decideAlertsJob } from './handlers/decide-alerts'
import { deliverMessageJob } from './handlers/deliver-message'
import { learnYardJob } from './handlers/learn-yard'
import { pruneJob } from './handlers/prune'
import { pullForecastJob } from './handlers/pull-forecast'
import { refreshOutlookJob } from './handlers/refresh-outlook'
import { settleNightJob } from './handlers/settle-night'
import { sweepJob } from './handlers/sweep'
import type { WorkerParts } from './parts'

type Definitions = {
  [J in keyof JobPayloads]: {
    schema: z.ZodType<JobPayloads[J]>
    run: (parts: WorkerParts, payload: JobPayloads[J]) => Promise<void>
  }
}

const id = z.uuid()

export const definitions: Definitions = {
  sweep: { schema: z.object({ slotAt: z.iso.datetime() }), run: sweepJob },
  'pull-forecast': { schema: z.object({ cellId: id }), run: pullForecastJob },
  'refresh-outlook': { schema: z.object({ rinkId: id }), run: refreshOutlookJob },
  'decide-alerts': { schema: z.object({ rinkId: id }), run: decideAlertsJob },
  'deliver-message': { schema: z.object({ messageId: id }), run: deliverMessageJob },
  'settle-night': { schema: z.object({ rinkId: id, nightDate: z.iso.date() }), run: settleNightJob },
  'learn-yard': { schema: z.object({ rinkId: id }), run: learnYardJob },
  prune: { schema: z.object({ slotAt: z.iso.datetime() }), run: pruneJob },
}

function taskOf<J extends keyof JobPayloads>(parts: WorkerParts, job: J): Task {
  const { schema, run } = definitions[job]
  return async (payload) => {
    const startedAt = parts.readClock()
    const note = (error: string | null) => noteRun(parts.db, { job, startedAt, endedAt: parts.readClock(), error })
    try {
      await run(parts, schema.parse(payload))
    } catch (error) {
      logFailure('job.failed', error, { job })
      await note(error instanceof Error ? error.message.slice(0, 300) : String(error))
      throw error
    }
    await note(null)
  }
}

/** The tasks that graphile-worker runs. A failed one is tried again with its own backoff. */
export function taskList(parts: WorkerParts): Record<keyof JobPayloads, Task> {
  const jobs = Object.keys(definitions) as (keyof JobPayloads)[]
  return Object.fromEntries(jobs.map((job) => [job, taskOf(parts, job)])) as Record<keyof JobPayloads, Task>
}
