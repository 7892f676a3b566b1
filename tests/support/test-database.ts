// A database of its own for a test file, cloned from the migrated template.
import { randomUUID } from 'node:crypto'
import type { Knex } from 'knex'
import pRetry from 'p-retry'
import { inject } from 'vitest'

import { createPool } from '@/db/knex'

import { runStatement, withDatabase } from './administer'

const OBJECT_IN_USE = '55006'
const CLONE_TRIES = 20

export type TestDatabase = {
  db: Knex
  /** For code under test that opens its own connections: the worker, the queue. */
  connectionString: string
  /** Closes the pool and removes the database. */
  drop: () => Promise<void>
}

/** Clones the template. Call in beforeAll, `drop` in afterAll. */
export async function createTestDatabase(): Promise<TestDatabase> {
  const templateUrl = inject('templateUrl')
  const template = new URL(templateUrl).pathname.slice(1)
  // The template's prefix names the run, so that what a killed run leaves can be swept.
  const name = `${template.replace(/_template$/, '')}_${randomUUID().slice(0, 13)}`
  await cloneTemplate(templateUrl, template, name)
  const connectionString = withDatabase(templateUrl, name)
  const db = createPool(connectionString)
  return {
    db,
    connectionString,
    drop: async () => {
      await db.destroy()
      await runStatement(withDatabase(templateUrl, 'postgres'), `drop database if exists "${name}" with (force)`)
    },
  }
}

/** PostgreSQL refuses to clone while another clone of the same template is being made. */
function cloneTemplate(templateUrl: string, template: string, name: string): Promise<void> {
  const clone = () =>
    runStatement(withDatabase(templateUrl, 'postgres'), `create database "${name}" template "${template}"`)
  return pRetry(clone, {
    retries: CLONE_TRIES,
    minTimeout: 50,
    maxTimeout: 500,
    shouldRetry: ({ error }) => (error as { code?: string }).code === OBJECT_IN_USE,
  })
}
