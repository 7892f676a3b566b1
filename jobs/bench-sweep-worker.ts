// One worker of the sweep bench: judges what is queued until its parent lets go of it. It delivers nothing.
import { run } from 'graphile-worker'
import pg from 'pg'
import { createPool } from '@/db/knex'
import { systemRinkAccess } from '@/lib/access/system'
import { readClock } from '@/lib/clock'
import { refreshOutlook } from '@/lib/services/outlooks'

const connectionString = process.env.DATABASE_URL ?? ''
const db = createPool(connectionString)
const pgPool = new pg.Pool({ connectionString, max: 6 })

process.send?.('ready')
await new Promise((resolve) => process.once('message', resolve))
const runner = await run({
  pgPool,
  concurrency: 4,
  noHandleSignals: true,
  taskList: {
    'refresh-outlook': async (payload) => {
      const { rinkId } = payload as { rinkId: string }
      await refreshOutlook({ db, now: readClock() }, systemRinkAccess<'view'>(rinkId))
    },
  },
})
await new Promise((resolve) => process.once('disconnect', resolve))
await runner.stop()
await pgPool.end()
await db.destroy()
