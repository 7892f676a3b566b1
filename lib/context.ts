// What every use case is given: where to read, what time it is, and who asks.
import type { Db } from '@/db/knex'

export interface Viewer {
  userId: string
  isAdmin: boolean
}

export interface ServiceContext {
  db: Db
  now: Date
  viewer: Viewer
}
