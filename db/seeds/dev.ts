// Demo people and rinks, made through the services as a person would make them. Repeating it changes nothing.
import type { Db } from '@/db/knex'
import { putPushSubscription } from '@/db/queries/push-subscriptions'
import { getRinkHead } from '@/db/queries/rinks'
import { systemRinkAccess } from '@/lib/access/system'
import { hashPassword } from '@/lib/auth/passwords'
import { setUpRinkSchema } from '@/lib/schemas/rinks'
import { setUpRink } from '@/lib/services/rinks'
import { seedLogNight } from './log'
import { DEMO_PASSWORD, DEMO_PEOPLE, type DemoPerson } from './people'
import { seedPastNights } from './past-nights'
import { DEMO_RINKS } from './rinks'

/** Where the fakes listen; without them the demo has no device and the weather it finds. */
export interface SeedSettings {
  weatherFakeUrl?: string
  pushFakeUrl?: string
}

export async function seedDemo(db: Db, now: Date, { weatherFakeUrl, pushFakeUrl }: SeedSettings = {}): Promise<void> {
  const ids = await seedPeople(db, now)
  if (weatherFakeUrl) await setScenarios(weatherFakeUrl)
  if (pushFakeUrl) await giveDevice(db, ids.keeper, pushFakeUrl, now)
  await seedRinks(db, ids, now)
}

async function seedPeople(db: Db, now: Date): Promise<Record<DemoPerson, string>> {
  const ids: Partial<Record<DemoPerson, string>> = {}
  for (const { who, name, email, isAdmin } of DEMO_PEOPLE) {
    const known = await db('users').where({ email }).first('id')
    ids[who] = known?.id ?? (await insertPerson(db, { name, email, isAdmin }, now))
  }
  return ids as Record<DemoPerson, string>
}

async function insertPerson(
  db: Db,
  person: { name: string; email: string; isAdmin: boolean },
  now: Date,
): Promise<string> {
  const [row] = await db('users')
    .insert({
      name: person.name,
      email: person.email,
      is_admin: person.isAdmin,
      password_hash: await hashPassword(DEMO_PASSWORD),
      email_verified_at: now,
    })
    .returning('id')
  if (!row) throw new Error('An insert returned no row')
  return row.id
}

/** Rinks of the keeper; crew member and skater belong to the first one. */
async function seedRinks(db: Db, ids: Record<DemoPerson, string>, now: Date): Promise<void> {
  const context = { db, now, viewer: { userId: ids.keeper, isAdmin: false } }
  for (const [index, { fields }] of DEMO_RINKS.entries()) {
    const { rinkId } = await setUpRink(context, setUpRinkSchema.parse(fields))
    if (index > 0) continue
    const others = [
      { rink_id: rinkId, user_id: ids.crew, role: 'crew' as const },
      { rink_id: rinkId, user_id: ids.skater, role: 'skater' as const },
    ]
    await db('rink_members').insert(others).onConflict(['rink_id', 'user_id']).ignore()
    await db('alert_preferences')
      .insert({ rink_id: rinkId, user_id: ids.crew })
      .onConflict(['rink_id', 'user_id'])
      .ignore()
    const access = systemRinkAccess<'view'>(rinkId)
    const { timeZone } = await getRinkHead(db, access)
    await seedPastNights(db, access, now, (night, date) => seedLogNight({ db, ids, rinkId, timeZone }, night, date))
  }
}

async function setScenarios(weatherFakeUrl: string): Promise<void> {
  for (const { scenario, fields } of DEMO_RINKS) {
    await post(`${weatherFakeUrl}/__fake/scenario`, {
      scenario,
      latitude: Number(fields.latitude),
      longitude: Number(fields.longitude),
    })
  }
}

/** A device at the push fake, unless the keeper has one there already. */
async function giveDevice(db: Db, userId: string, pushFakeUrl: string, now: Date): Promise<void> {
  const { endpoint, keys } = (await post(`${pushFakeUrl}/subscriptions`, {})) as {
    endpoint: string
    keys: { p256dh: string; auth: string }
  }
  const origin = new URL(endpoint).origin
  const known = await db('push_subscriptions')
    .where({ user_id: userId, disabled_at: null })
    .whereLike('endpoint', `${origin}/%`)
    .first('id')
  if (!known) await putPushSubscription(db, userId, { endpoint, ...keys }, now)
}

async function post(url: string, body: unknown): Promise<unknown> {
  const response = await fetch(url, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify(body),
  })
  if (!response.ok) throw new Error(`${url} answered ${response.status}`)
  return response.json()
}
