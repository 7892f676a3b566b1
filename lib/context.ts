// What every use case is given: where to read, what time it is, and who asks.
import type { Db } from '@/db/knex'

export interface Viewer {
  userId: string
  isAdmin: boolean
  /** When this browser was signed in: by password, or from the mailbox. */
  signedInAt?: Date
}

export interface ServiceContext {
  db: Db
  now: Date
  viewer: Viewer
}

/** What a use case is given when nobody is signed in: the secret that mailed links are made with, and where the visitor comes from. */
export interface OpenContext {
  db: Db
  now: Date
  secret: string
  /** Undefined when no trustworthy part of the request says it. */
  ipAddress: string | undefined
}
