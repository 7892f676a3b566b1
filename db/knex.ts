// The pool, and how Knex finds migrations. Ids stay strings, dates stay text.
import path from 'node:path'
import { fileURLToPath } from 'node:url'
import knex, { type Knex } from 'knex'
import pg from 'pg'
import './types'

/** A pool or a transaction: queries do not care which. */
export type Db = Knex

const DATE_OID = 1082
// A night is a calendar day in the rink's zone; pg would turn it into midnight of this machine's zone.
pg.types.setTypeParser(DATE_OID, (text) => text)

/** Knex settings for one database. */
export function knexConfig(connectionString: string): Knex.Config {
  const folder = path.dirname(fileURLToPath(import.meta.url))
  return {
    client: 'pg',
    connection: { connectionString, application_name: 'nightsheet' },
    pool: { min: 0, max: 10 },
    // A failure is logged and shown to the admin: it names the query, never the addresses and keys that went into it.
    compileSqlOnError: false,
    migrations: { directory: path.join(folder, 'migrations'), extension: 'ts' },
  }
}

/** Opens a pool. The caller destroys it. */
export function createPool(connectionString: string): Knex {
  return knex(knexConfig(connectionString))
}
