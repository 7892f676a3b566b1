// Once per run of the integration suite: a migrated database that every test file clones.
import { execFile } from 'node:child_process'
import path from 'node:path'
import { fileURLToPath } from 'node:url'
import { promisify } from 'node:util'
import type { TestProject } from 'vitest/node'

import { runStatement, withDatabase } from './administer'
import { closeTestCluster, openTestCluster } from './test-cluster.mjs'

declare module 'vitest' {
  export interface ProvidedContext {
    /** Address of the migrated template; nobody connects to it any more. */
    templateUrl: string
  }
}

const PROJECT_FOLDER = path.join(path.dirname(fileURLToPath(import.meta.url)), '../..')

/** `npm test` gives the address of a test server; without it we start one, so that vitest can be called alone. */
export default async function setUp(project: TestProject): Promise<() => Promise<void>> {
  const given = process.env.DATABASE_URL
  const cluster = given ? undefined : await openTestCluster()
  const homeUrl = given ?? cluster?.homeUrl ?? ''
  const template = `t_${process.pid}_template`
  const tearDown = async () => {
    await runStatement(homeUrl, `drop database if exists "${template}" with (force)`)
    if (cluster) await closeTestCluster(cluster)
  }
  try {
    await runStatement(homeUrl, `create database "${template}"`)
    await migrate(withDatabase(homeUrl, template))
  } catch (error) {
    await tearDown()
    throw error
  }
  project.provide('templateUrl', withDatabase(homeUrl, template))
  return tearDown
}

/** In a process of its own, as in `npm start`: Knex imports migrations by Node itself, which needs tsx for them. */
async function migrate(databaseUrl: string): Promise<void> {
  const env = { ...process.env, DATABASE_URL: databaseUrl }
  await promisify(execFile)(process.execPath, ['--import', 'tsx', 'db/migrate.ts'], { cwd: PROJECT_FOLDER, env })
}
