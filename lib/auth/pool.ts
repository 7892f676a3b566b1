// The web process's pool. On globalThis, because the development server loads modules anew at every change.
import { createPool, type Db } from '@/db/knex'
import { readEnvironment } from '@/lib/env'

const shared = globalThis as typeof globalThis & { nightsheetPool?: Db }

export function sharedPool(): Db {
  shared.nightsheetPool ??= createPool(readEnvironment().DATABASE_URL)
  return shared.nightsheetPool
}
