// The whole product for the end-to-end suite: its own build, database, fakes, worker and web on ports of their own.
import fs from 'node:fs'
import path from 'node:path'

import { ensureBuild } from '../../jobs/local/build.mjs'
import { runScript, startFakes, startWeb, startWorker } from '../../jobs/local/parts.mjs'
import { cleanEnvironment, logFolder } from '../../jobs/local/project.mjs'
import { makeSecrets } from '../../jobs/local/secrets.mjs'
import { describeFakes, pickPorts, withoutSettings } from '../../jobs/local/settings.mjs'
import { findProgram, installDebianPackages } from '../../lib/machine/debian-packages.mjs'

import { testFolder } from './suites.mjs'

// Out of the way of `npm start`.
const PORT_SHIFT = 100
const DIST_FOLDER = '.next-test'
const HOST = '127.0.0.1'

/** Debian's Chromium, installed when there is none; returns its path. */
export async function ensureChromium() {
  if (!findProgram('chromium')) await installDebianPackages(['chromium'], { logFolder })
  return findProgram('chromium')
}

function describe(databaseUrl, ports) {
  const caFile = path.join(testFolder, 'fakes', 'authority.pem')
  const fakes = describeFakes(ports, caFile)
  const address = `http://localhost:${ports.web}`
  const settings = {
    ...fakes.settings,
    ...makeSecrets(),
    DATABASE_URL: databaseUrl,
    PUBLIC_URL: address,
    NEXTAUTH_URL: address,
  }
  const env = { ...withoutSettings(cleanEnvironment()), NODE_ENV: 'production', ...settings, ...fakes.environment }
  return { address, env, caFile }
}

/** Builds and starts everything within the session; returns the addresses that the journeys need. */
export async function startProduct(session, databaseUrl) {
  await session.step('Build for the tests', (note) => ensureBuild(DIST_FOLDER, note))
  const ports = await pickPorts({ shift: PORT_SHIFT, environment: {} })
  const { address, env, caFile } = describe(databaseUrl, ports)
  fs.rmSync(path.dirname(caFile), { recursive: true, force: true })
  await session.step('Web, worker and fakes', async (note) => {
    await runScript('Migrating', 'db/migrate.ts', 'test-migrate', env)
    await startFakes(session, 'test-fakes', env)
    await startWorker(session, 'test-worker', env)
    await startWeb(session, 'test-web', { env, host: HOST, port: ports.web, distFolder: DIST_FOLDER })
    note(address)
  })
  const { FAKE_WEATHER_URL, FAKE_MAIL_URL, FAKE_PUSH_URL } = env
  return { BASE_URL: address, DATABASE_URL: databaseUrl, FAKE_WEATHER_URL, FAKE_MAIL_URL, FAKE_PUSH_URL }
}
