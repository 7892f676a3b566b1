// `npm run bench:sweep`: a migrated database on the test server, and the measuring program on it.
import { cleanEnvironment, inProject } from '../../jobs/local/project.mjs'
import { runScript } from '../../jobs/local/parts.mjs'
import { runForCode } from '../../lib/machine/processes.mjs'

import { makeTestDatabase } from './test-cluster.mjs'

/** Shows what the program prints; returns its exit code. */
export async function runBench(session, cluster, words) {
  const env = { ...cleanEnvironment(), NODE_ENV: 'production', DATABASE_URL: await makeTestDatabase(cluster, 'bench') }
  await session.step('Migrations', () => runScript('Migrating', 'db/migrate.ts', 'bench-migrate', env))
  session.farewell = ''
  const options = { ...inProject('bench-sweep', env), show: true }
  return runForCode('bench-sweep', process.execPath, ['--import', 'tsx', 'jobs/bench-sweep.ts', ...words], options)
}
