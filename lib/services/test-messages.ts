// "Send me a test": a real message through the queue, to one device or by mail, and what became of it.
import { randomUUID } from 'node:crypto'
import { promiseMessage } from '@/db/queries/messages'
import { listDevices } from '@/db/queries/push-subscriptions'
import { findMessageId, findTestState, type TestState } from '@/db/queries/test-messages'
import type { ServiceContext } from '@/lib/context'
import { NotFoundError } from '@/lib/errors'
import { MINUTE_MILLIS } from '@/lib/physics/constants'
import type { TestInput } from '@/lib/schemas/accounts'
import { spend } from './rate-limits'

/** What became of a test. */
export type Test = TestState

/** A test that comes later than this confuses more than it says. */
const LIFETIME_MILLIS = 10 * MINUTE_MILLIS

/** @throws NotFoundError for a device that is not the viewer's; RateLimitedError after a dozen in an hour. */
export async function sendTest(context: ServiceContext, { deviceId }: TestInput): Promise<{ messageId: string }> {
  const { db, now, viewer } = context
  if (deviceId && !(await listDevices(db, viewer.userId)).some(({ id }) => id === deviceId)) {
    throw new NotFoundError('Device')
  }
  await spend(context, 'testByUser', viewer.userId)
  const dedupeKey = `test:${randomUUID()}`
  return db.transaction(async (trx) => {
    await promiseMessage(
      trx,
      {
        dedupeKey,
        userId: viewer.userId,
        channel: deviceId ? 'push' : 'email',
        kind: 'test',
        content: deviceId ? { deviceId } : {},
        sendAt: now,
        expiresAt: new Date(now.getTime() + LIFETIME_MILLIS),
      },
      now,
    )
    const messageId = await findMessageId(trx, dedupeKey)
    if (!messageId) throw new Error('A promised message is not there')
    return { messageId }
  })
}

/** @throws NotFoundError for anything but one's own test. */
export async function getTest({ db, viewer }: ServiceContext, messageId: string): Promise<TestState> {
  const test = await findTestState(db, viewer.userId, messageId)
  if (!test) throw new NotFoundError('Test')
  return test
}
