// The PostgreSQL server for tests: apart from the demo's, quick and forgetful, shared by every test run of this folder.
import path from 'node:path'
import { fileURLToPath } from 'node:url'

import { ensurePostgresInstalled } from '../../db/postgres-programs.mjs'
import { dropDatabase, ensureDatabase, queryCluster, startCluster, stopCluster } from '../../db/server.mjs'
import { isAlive } from '../../lib/machine/processes.mjs'

const DATA_FOLDER = fileURLToPath(new URL('../../.data', import.meta.url))
const LOG_FOLDER = path.join(DATA_FOLDER, 'logs')
const PORT = 54339
const MAX_CONNECTIONS = 300
// Nothing here has to outlive a power cut.
const FORGETFUL = { fsync: 'off', synchronous_commit: 'off', full_page_writes: 'off', max_connections: MAX_CONNECTIONS }

/** Databases carry the number of the process that made them, so that a later run can sweep a killed one's. */
const nameFor = (pid, what) => `t_${pid}_${what}`
const ownerOf = (database) => Number(database.split('_')[1])

const listTestDatabases = (cluster) =>
  queryCluster(cluster, String.raw`select datname from pg_database where datname like 't\_%\_%'`)

/** Starts or joins the server; `homeUrl` is a database of this process, which keeps others from stopping the server. */
export async function openTestCluster() {
  await ensurePostgresInstalled(LOG_FOLDER)
  const cluster = await startCluster({
    folder: path.join(DATA_FOLDER, 'postgres-test'),
    preferredPort: PORT,
    logFile: path.join(LOG_FOLDER, 'postgres-test.log'),
    settings: FORGETFUL,
  })
  const homeUrl = await ensureDatabase(cluster, nameFor(process.pid, 'home'))
  for (const database of await listTestDatabases(cluster)) {
    if (!isAlive(ownerOf(database))) await dropDatabase(cluster, database)
  }
  return { ...cluster, homeUrl }
}

/** Makes an empty database of this process on the server. */
export function makeTestDatabase(cluster, what) {
  return ensureDatabase(cluster, nameFor(process.pid, what))
}

/** Removes what this process made there; the last one out stops the server. */
export async function closeTestCluster(cluster) {
  for (const database of await listTestDatabases(cluster)) {
    if (ownerOf(database) === process.pid) await dropDatabase(cluster, database)
  }
  const remaining = await listTestDatabases(cluster)
  if (!remaining.some((database) => isAlive(ownerOf(database)))) await stopCluster(cluster)
}
