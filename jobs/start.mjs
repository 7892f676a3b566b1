// `npm start`: sets everything up on a bare machine, runs web, worker and fakes, and stops all of it on Ctrl-C.
import fs from 'node:fs'
import path from 'node:path'

import { makeDataFolder } from '../db/cluster-place.mjs'
import { ensurePostgresInstalled } from '../db/postgres-programs.mjs'
import { ensureDatabase, isRunning, startCluster, stopCluster } from '../db/server.mjs'
import { Problem } from '../lib/machine/problem.mjs'

import { ensureBuild } from './local/build.mjs'
import { ensureDependencies } from './local/dependencies.mjs'
import { takeLock } from './local/lock.mjs'
import { runScript, startFakes, startWeb, startWorker } from './local/parts.mjs'
import { dataFolder, logFolder, projectFolder } from './local/project.mjs'
import { formatSeconds, Session } from './local/session.mjs'
import { checkSettings, planStart } from './local/settings.mjs'
import { welcome } from './local/welcome.mjs'

const POSTGRES_PORT = 54329
const WATCH_MILLIS = 1000
const DIST_FOLDER = '.next'
const dev = process.argv.includes('--dev')
const startedAt = Date.now()

/** Settings may lie in a file; what the environment says wins. */
function readEnvFile() {
  const file = path.join(projectFolder, '.env')
  if (fs.existsSync(file)) process.loadEnvFile(file)
}

/** The server may be an earlier start's, so its end is not told to us. */
function watch(session, cluster, logFile) {
  const fail = () => session.fail(new Problem('The PostgreSQL server ended unexpectedly.', { logFile }))
  setInterval(() => isRunning(cluster) || fail(), WATCH_MILLIS).unref()
}

/** The private cluster with our database in it; returns the address. */
async function startOwnDatabase(session) {
  await session.step('PostgreSQL programs', async (note) => {
    note((await ensurePostgresInstalled(logFolder)) ? 'installed' : 'already there')
  })
  return session.step('PostgreSQL server', async (note) => {
    const logFile = path.join(logFolder, 'postgres.log')
    const folder = path.join(dataFolder, 'postgres')
    const cluster = await startCluster({ folder, preferredPort: POSTGRES_PORT, logFile })
    session.defer(() => stopCluster(cluster))
    watch(session, cluster, logFile)
    note(`port ${cluster.port}`)
    return ensureDatabase(cluster, 'nightsheet')
  })
}

/** What takes long comes first: ports are picked when they are about to be used. */
async function setUp(session) {
  await session.step('Packages', (note) => ensureDependencies('start', note))
  await session.step('Settings', async () => checkSettings(await planStart()))
  if (!dev) await session.step('Production build', (note) => ensureBuild(DIST_FOLDER, note))
  const plan = await planStart()
  const mode = { NODE_ENV: dev ? 'development' : 'production' }
  const ownDatabase = plan.hasOwnDatabase ? { DATABASE_URL: await startOwnDatabase(session) } : {}
  return { ...plan, env: { ...plan.settings, ...plan.fakeEnvironment, ...mode, ...ownDatabase } }
}

async function runParts(session, { env, isDemo, hasOwnDatabase, wantsDemoData, host, ports }) {
  const database = hasOwnDatabase ? 'the database' : 'the database of DATABASE_URL'
  await session.step('Migrations', () => runScript(`Migrating ${database}`, 'db/migrate.ts', 'migrate', env))
  if (isDemo) await session.step('Fakes of weather, mail and push', () => startFakes(session, 'fakes', env))
  if (wantsDemoData) await session.step('Demo data', () => runScript('Seeding', 'db/seed.ts', 'seed', env))
  await session.step('Worker', () => startWorker(session, 'worker', env))
  const web = { env, host, port: ports.web, distFolder: DIST_FOLDER, dev }
  await session.step('Web server', () => startWeb(session, 'web', web))
}

async function main(session) {
  readEnvFile()
  makeDataFolder(dataFolder)
  const lock = takeLock('start')
  session.defer(lock.release)
  const plan = await setUp(session)
  await runParts(session, plan)
  lock.note(plan.settings.PUBLIC_URL)
  const seconds = formatSeconds(Date.now() - startedAt)
  console.log(welcome({ ...plan, seedLog: path.join(logFolder, 'seed.log'), seconds }))
  await session.untilStopped()
  console.log('\n  Stopping …')
  session.farewell = '  Stopped.'
}

await new Session().run(main)
