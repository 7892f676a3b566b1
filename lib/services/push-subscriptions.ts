// The devices on which a person gets notifications.
import { createECDH, createHash } from 'node:crypto'
import {
  countOtherDevices,
  deletePushSubscription,
  listDevices,
  putPushSubscription,
  type DeviceRow,
  type PushKeys,
} from '@/db/queries/push-subscriptions'
import { enqueueDecision } from '@/db/queries/jobs'
import { listRinksOfUser } from '@/db/queries/rinks'
import type { Db } from '@/db/knex'
import type { ServiceContext } from '@/lib/context'
import { ConflictError, InvalidInputError, NotFoundError } from '@/lib/errors'
import { isAllowedPushEndpoint } from '@/lib/messaging/push-services'
import type { PushSubscriptionInput } from '@/lib/schemas/alerts'

export interface Device {
  id: string
  /** Who carries the pushes: names the browser well enough to tell a phone from a laptop. */
  pushHost: string
  /** SHA-256 of the address, by which a browser knows itself in the list. */
  fingerprint: string
  addedAt: Date
  disabledReason: string | null
}

function toDevice({ id, endpoint, createdAt, disabledReason }: DeviceRow): Device {
  const fingerprint = createHash('sha256').update(endpoint).digest('hex')
  return { id, pushHost: new URL(endpoint).hostname, fingerprint, addedAt: createdAt, disabledReason }
}

export async function listOwnDevices({ db, viewer }: ServiceContext): Promise<Device[]> {
  return (await listDevices(db, viewer.userId)).map(toDevice)
}

/** More phones than a household has; each alert goes to every one. */
const MOST_DEVICES = 20

/** A key that is no point on the curve would make every push to it fail in the worker. */
function isCurvePoint(p256dh: string): boolean {
  const own = createECDH('prime256v1')
  own.generateKeys()
  try {
    own.computeSecret(Buffer.from(p256dh, 'base64url'))
    return true
  } catch {
    return false
  }
}

function checkedKeys({ endpoint, keys }: PushSubscriptionInput, pushOrigins: readonly string[]): PushKeys {
  if (!isAllowedPushEndpoint(endpoint, pushOrigins)) {
    throw new InvalidInputError('This browser uses a push service that we do not know.', {
      endpoint: 'Not a known push service.',
    })
  }
  if (!isCurvePoint(keys.p256dh)) {
    throw new InvalidInputError('This browser sent a key that cannot be used.', {
      'keys.p256dh': 'Not a point on P-256.',
    })
  }
  return { endpoint, ...keys }
}

async function refuseTooMany(trx: Db, userId: string, { endpoint }: PushKeys): Promise<void> {
  if ((await countOtherDevices(trx, userId, endpoint)) < MOST_DEVICES) return
  throw new ConflictError(`You have ${MOST_DEVICES} devices already. Remove one under Alerts first.`)
}

/**
 * Adds the device, or takes it over from the account that used it before: that one hears nothing there any more.
 *
 * @param pushOrigins Push services besides the browsers' own.
 */
export async function addDevice(
  { db, now, viewer }: ServiceContext,
  subscription: PushSubscriptionInput,
  pushOrigins: readonly string[],
): Promise<{ id: string }> {
  const keys = checkedKeys(subscription, pushOrigins)
  return db.transaction(async (trx) => {
    await refuseTooMany(trx, viewer.userId, keys)
    const device = await putPushSubscription(trx, viewer.userId, keys, now)
    // Whoever adds a device in the evening wants to hear of tonight on it too.
    for (const { id } of await listRinksOfUser(trx, viewer.userId)) await enqueueDecision(trx, id)
    return device
  })
}

/** The browser gave its subscription a new address. Only one's own old address is given up. */
export async function replaceDevice(
  { db, now, viewer }: ServiceContext,
  { oldEndpoint, subscription }: { oldEndpoint?: string | null; subscription: PushSubscriptionInput },
  pushOrigins: readonly string[],
): Promise<{ id: string }> {
  const keys = checkedKeys(subscription, pushOrigins)
  return db.transaction(async (trx) => {
    if (oldEndpoint) await deletePushSubscription(trx, viewer.userId, { endpoint: oldEndpoint })
    await refuseTooMany(trx, viewer.userId, keys)
    return putPushSubscription(trx, viewer.userId, keys, now)
  })
}

/** Switching off what is off already is fine: the browser may have forgotten before we did. */
export async function forgetDevice({ db, viewer }: ServiceContext, endpoint: string): Promise<void> {
  await deletePushSubscription(db, viewer.userId, { endpoint })
}

/** @throws NotFoundError for a device that is not the viewer's. */
export async function removeDevice({ db, viewer }: ServiceContext, deviceId: string): Promise<void> {
  if (!(await deletePushSubscription(db, viewer.userId, { id: deviceId }))) throw new NotFoundError('Device')
}
