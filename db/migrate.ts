// Brings a database to the newest schema: ours through Knex, then the queue's own. Safe to repeat and to race.
import path from 'node:path'
import { fileURLToPath } from 'node:url'
import { runMigrations } from 'graphile-worker'
import { createPool } from './knex'

/** @throws when the database cannot be reached or a migration fails; nothing is half done. */
async function migrateToLatest(connectionString: string): Promise<void> {
  const db = createPool(connectionString)
  try {
    await db.migrate.latest()
    await runMigrations({ connectionString })
  } finally {
    await db.destroy()
  }
}

if (process.argv[1] && path.resolve(process.argv[1]) === fileURLToPath(import.meta.url)) {
  if (!process.env.DATABASE_URL) throw new Error('Settings: DATABASE_URL is missing')
  await migrateToLatest(process.env.DATABASE_URL)
}
