// The devices that get web pushes: one row per browser, owned by whoever last signed in there and asked for it.
import type { Db } from '@/db/knex'

export interface PushKeys {
  endpoint: string
  p256dh: string
  auth: string
}

export interface DeviceRow {
  id: string
  endpoint: string
  createdAt: Date
  disabledAt: Date | null
  disabledReason: string | null
}

/** Stores a device, or hands it over: a browser tells one account only, the one that asked last. */
export async function putPushSubscription(db: Db, userId: string, keys: PushKeys, now: Date): Promise<{ id: string }> {
  const row = { user_id: userId, ...keys, created_at: now, disabled_at: null, disabled_reason: null }
  const [stored] = await db('push_subscriptions').insert(row).onConflict('endpoint').merge().returning('id')
  if (!stored) throw new Error('An upsert returned no row')
  return stored
}

/**
 * How many devices the person is told on besides one: what is gone, or comes back, takes no place. Locks the person, so
 * that of two devices that are added at once the second sees the first.
 */
export async function countOtherDevices(trx: Db, userId: string, endpoint: string): Promise<number> {
  await trx('users').where({ id: userId }).forNoKeyUpdate().first('id')
  const row = await trx('push_subscriptions')
    .where({ user_id: userId })
    .whereNot({ endpoint })
    .whereNull('disabled_at')
    .count({ devices: '*' })
    .first()
  return Number(row?.devices ?? 0)
}

export async function listDevices(db: Db, userId: string): Promise<DeviceRow[]> {
  return db('push_subscriptions').where({ user_id: userId }).orderBy(['created_at', 'id']).select({
    id: 'id',
    endpoint: 'endpoint',
    createdAt: 'created_at',
    disabledAt: 'disabled_at',
    disabledReason: 'disabled_reason',
  })
}

/** Where a push to this person goes now. */
export async function listEnabledPushSubscriptions(db: Db, userId: string): Promise<(PushKeys & { id: string })[]> {
  return db('push_subscriptions')
    .where({ user_id: userId })
    .whereNull('disabled_at')
    .orderBy(['created_at', 'id'])
    .select('id', 'endpoint', 'p256dh', 'auth')
}

/** Only one's own: somebody else's device is left alone, and the answer is the same as for none. */
export async function deletePushSubscription(
  db: Db,
  userId: string,
  which: { id: string } | { endpoint: string },
): Promise<boolean> {
  const deleted = await db('push_subscriptions')
    .where({ user_id: userId, ...which })
    .delete()
  return deleted === 1
}

/** The push service said that this address is gone for good; the first reason stays. */
export async function disablePushSubscription(db: Db, id: string, reason: string, now: Date): Promise<void> {
  await db('push_subscriptions')
    .where({ id })
    .whereNull('disabled_at')
    .update({ disabled_at: now, disabled_reason: reason })
}
