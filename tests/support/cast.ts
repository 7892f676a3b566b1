// Who every service is tried with: a keeper, a crew member, a skater, a stranger and the server's admin.
import { randomUUID } from 'node:crypto'
import type { Knex } from 'knex'
import type { ServiceContext } from '@/lib/context'
import { setUpRinkSchema } from '@/lib/schemas/rinks'
import { setUpRink } from '@/lib/services/rinks'

export interface Actor {
  userId: string
  email: string
  /** The context of a request made at `now`. */
  at(now: Date): ServiceContext
}

/** Adds a person whose address is confirmed. */
export async function addActor(db: Knex, name: string, options: { isAdmin?: boolean } = {}): Promise<Actor> {
  const email = `${name.toLowerCase()}-${randomUUID().slice(0, 8)}@nightsheet.example`
  const isAdmin = options.isAdmin ?? false
  const [row] = await db('users')
    .insert({ name, email, is_admin: isAdmin, email_verified_at: new Date('2027-01-01T00:00:00Z') })
    .returning('id')
  const userId = row?.id ?? ''
  return { userId, email, at: (now) => ({ db, now, viewer: { userId, isAdmin } }) }
}

/** Rinks of one test file lie in cells of their own: a cell has one forecast an hour. */
let rinksMade = 0

/** What a keeper near the Ottawa types into the set-up form; `changes` replaces fields. */
export function rinkForm(changes: Record<string, string> = {}): Record<string, string> {
  rinksMade += 1
  return {
    units: 'metric',
    creationKey: randomUUID(),
    name: 'Birch Lane',
    placeName: 'Upper Ottawa Valley',
    latitude: (45 + rinksMade * 0.02).toFixed(2),
    longitude: '-77.3',
    timeZone: 'America/Toronto',
    phase: 'skating',
    iceThickness: '9',
    flow: '25',
    waterTemperature: '6',
    hoursFrom: '17:00',
    hoursTo: '01:00',
    wantsPush: 'on',
    wantsEmail: 'on',
    ...changes,
  }
}

export interface Cast {
  keeper: Actor
  crew: Actor
  skater: Actor
  stranger: Actor
  rinkId: string
  cellId: string
}

/** A rink with its people, set up through the service at `now`. */
export async function createCast(db: Knex, now: Date, changes: Record<string, string> = {}): Promise<Cast> {
  const [keeper, crew, skater, stranger] = await Promise.all([
    addActor(db, 'Keeper'),
    addActor(db, 'Crew'),
    addActor(db, 'Skater'),
    addActor(db, 'Stranger'),
  ])
  const { rinkId } = await setUpRink(keeper.at(now), setUpRinkSchema.parse(rinkForm(changes)))
  await db('rink_members').insert([
    { rink_id: rinkId, user_id: crew.userId, role: 'crew' },
    { rink_id: rinkId, user_id: skater.userId, role: 'skater' },
  ])
  const rink = await db('rinks').where({ id: rinkId }).first('grid_cell_id')
  return { keeper, crew, skater, stranger, rinkId, cellId: rink?.grid_cell_id ?? '' }
}
