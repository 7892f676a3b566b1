// What a test file starts from: a database of its own, and a rink with its people anew before each test.
import { afterAll, beforeAll, beforeEach } from 'vitest'
import { createCast, type Cast } from './cast'
import { createTestDatabase, type TestDatabase } from './test-database'

/** Filled before the file's first test, dropped after its last. */
export function givenDatabase(): TestDatabase {
  const database = {} as TestDatabase
  beforeAll(async () => {
    Object.assign(database, await createTestDatabase())
  })
  afterAll(() => database.drop())
  return database
}

/** Filled before each test of the file, or of the `describe` it stands in; `changes` as in `rinkForm`. */
export function givenCast(database: TestDatabase, now: Date, changes?: Record<string, string>): Cast {
  const cast = {} as Cast
  beforeEach(async () => {
    Object.assign(cast, await createCast(database.db, now, changes))
  })
  return cast
}
