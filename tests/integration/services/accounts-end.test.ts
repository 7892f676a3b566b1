// An unasked confirmation, sessions one by one, tests of channels, everything to take along, and the end of an account.
import { setTimeout } from 'node:timers/promises'
import type { Knex } from 'knex'
import { beforeEach, describe, expect, test } from 'vitest'
import { findMessageToDeliver } from '@/db/queries/deliveries'
import { deleteMember } from '@/db/queries/members'
import { pruneExpired } from '@/db/queries/prune'
import { putPushSubscription } from '@/db/queries/push-subscriptions'
import { systemRinkAccess } from '@/lib/access/system'
import { openSession } from '@/lib/auth/sessions'
import type { ServiceContext } from '@/lib/context'
import { DAY_MILLIS } from '@/lib/physics/constants'
import { askForDeletion, keepAccount, listRinksThatGo } from '@/lib/services/account-deletion'
import { exportAccount } from '@/lib/services/account-export'
import { confirmAddress, signInWithPassword, signUp } from '@/lib/services/accounts'
import { getAccount } from '@/lib/services/own-account'
import { endOwnSession, listOwnSessions } from '@/lib/services/own-sessions'
import { getTest, sendTest } from '@/lib/services/test-messages'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { mailsTo, newEmail, newestKey, newMember, NOW, PASSWORD, visitor } from '@/tests/support/visitor'

const database = givenDatabase()
let anna: { email: string; userId: string }
beforeEach(async () => {
  anna = await newMember(database.db)
})

const as = (userId: string, now = NOW): ServiceContext => ({ db: database.db, now, viewer: { userId, isAdmin: false } })
const daysLater = (days: number) => new Date(NOW.getTime() + days * DAY_MILLIS)
/** Until somebody waits for a row, or for so long that nobody will. */
async function waitForLock(db: Knex): Promise<void> {
  for (let look = 0; look < 40; look++) {
    const { rows } = await db.raw(
      `select 1 from pg_stat_activity where wait_event_type = 'Lock' and datname = current_database()`,
    )
    if (rows.length > 0) return
    await setTimeout(50)
  }
}
const newestMessage = async (userId: string, kind: string) => {
  const row = await database.db('messages').where({ user_id: userId, kind }).orderBy('created_at', 'desc').first('id')
  return row && findMessageToDeliver(database.db, row.id)
}

describe('an unasked confirmation', () => {
  const signedUp = async () => {
    const email = newEmail()
    await signUp(visitor(database.db), { name: 'Mallory', email, password: PASSWORD })
    return { email, key: await newestKey(database.db, email, 'verify') }
  }

  test('does not keep the password that somebody else typed in another browser', async () => {
    const { email, key } = await signedUp()
    const { userId } = await confirmAddress(visitor(database.db), key, undefined)
    expect(await getAccount(as(userId))).toMatchObject({ email, hasPassword: false })
    await expect(signInWithPassword(visitor(database.db), { email, password: PASSWORD })).rejects.toThrow()
  })

  test('nor does a browser that signed up with another address', async () => {
    const { key } = await signedUp()
    const { userId } = await confirmAddress(visitor(database.db), key, newEmail())
    expect(await getAccount(as(userId))).toMatchObject({ hasPassword: false })
  })
})

test('sessions are listed with their browser and ended one by one, one’s own only', async () => {
  const firefox = 'Mozilla/5.0 (Android 14; Mobile; rv:128.0) Gecko/128.0 Firefox/128.0'
  await openSession(database.db, anna.userId, NOW, firefox)
  await openSession(database.db, anna.userId, NOW)
  const sessions = await listOwnSessions(as(anna.userId))
  expect(sessions.map(({ device }) => device).sort()).toEqual(['', 'Firefox on Android'])
  const [first] = sessions
  const other = await newMember(database.db)
  const handle = first?.handle ?? ''
  await expect(endOwnSession(as(other.userId), handle)).rejects.toMatchObject({ code: 'not_found' })
  await endOwnSession(as(anna.userId), handle)
  expect((await listOwnSessions(as(anna.userId))).map((session) => session.handle)).not.toContain(handle)
  await expect(endOwnSession(as(anna.userId), handle)).rejects.toMatchObject({ code: 'not_found' })
})

describe('a test', () => {
  const device = (userId: string, name: string) =>
    putPushSubscription(
      database.db,
      userId,
      { endpoint: `https://updates.push.services.mozilla.com/${name}`, p256dh: 'p', auth: 'a' },
      NOW,
    )

  test('is a message to the one device, or a mail, whose fate its sender may ask for', async () => {
    const { id: deviceId } = await device(anna.userId, 'one')
    const push = await sendTest(as(anna.userId), { deviceId })
    expect(await newestMessage(anna.userId, 'test')).toMatchObject({ channel: 'push', content: { deviceId } })
    expect(await getTest(as(anna.userId), push.messageId)).toEqual({ state: 'promised', error: null })
    const mail = await sendTest(as(anna.userId), {})
    expect(await findMessageToDeliver(database.db, mail.messageId)).toMatchObject({
      channel: 'email',
      email: anna.email,
    })
    const other = await newMember(database.db)
    await expect(getTest(as(other.userId), mail.messageId)).rejects.toMatchObject({ code: 'not_found' })
  })

  test('goes to no device of somebody else, and not without end', async () => {
    const other = await newMember(database.db)
    const { id: deviceId } = await device(other.userId, 'two')
    await expect(sendTest(as(anna.userId), { deviceId })).rejects.toMatchObject({ code: 'not_found' })
    for (let sent = 0; sent < 12; sent++) await sendTest(as(anna.userId), {})
    await expect(sendTest(as(anna.userId), {})).rejects.toMatchObject({ code: 'rate_limited' })
  })
})

describe('with a rink', () => {
  const cast = givenCast(database, NOW)

  test('everything can be taken along, and no secret is in it', async () => {
    await database.db('users').where({ id: cast.keeper.userId }).update({ password_hash: 'never-told' })
    await putPushSubscription(
      database.db,
      cast.keeper.userId,
      { endpoint: 'https://updates.push.services.mozilla.com/secret-path', p256dh: 'key-p', auth: 'key-a' },
      NOW,
    )
    const { token } = await openSession(database.db, cast.keeper.userId, NOW)
    const document = await exportAccount(cast.keeper.at(NOW))
    expect(document).toMatchObject({
      account: { email: cast.keeper.email, units: { temperature: 'C' } },
      devices: [{ push_service: 'updates.push.services.mozilla.com' }],
      rinks: [{ role: 'keeper', settings: { name: 'Birch Lane' }, water_sources: [{ kind: 'cold-tap' }] }],
    })
    const text = JSON.stringify(document)
    for (const secret of ['never-told', 'secret-path', 'key-p', 'key-a', token, cast.crew.email]) {
      expect(text).not.toContain(secret)
    }
    expect(await exportAccount(cast.stranger.at(NOW))).toMatchObject({ rinks: [] })
  })

  test('an account goes after two weeks with the rinks that only it keeps, unless it is kept', async () => {
    expect((await listRinksThatGo(cast.keeper.at(NOW))).map(({ id }) => id)).toEqual([cast.rinkId])
    expect(await listRinksThatGo(cast.crew.at(NOW))).toEqual([])
    await askForDeletion(cast.keeper.at(NOW), { currentPassword: '' })
    await askForDeletion(cast.crew.at(NOW), { currentPassword: '' })
    await keepAccount(cast.crew.at(daysLater(3)))
    expect((await mailsTo(database.db, cast.keeper.email)).map(({ kind }) => kind)).toEqual(['deletion-asked'])
    await pruneExpired(database.db, daysLater(13.9))
    expect(await getAccount(cast.keeper.at(NOW))).toMatchObject({ deletionDueAt: daysLater(14) })
    await pruneExpired(database.db, daysLater(14.1))
    await expect(getAccount(cast.keeper.at(NOW))).rejects.toMatchObject({ code: 'not_found' })
    expect(await database.db('rinks').where({ id: cast.rinkId })).toEqual([])
    expect(await getAccount(cast.crew.at(NOW))).toMatchObject({ deletionDueAt: null })
  })

  test('a rink that somebody else keeps too stays', async () => {
    await database
      .db('rink_members')
      .where({ rink_id: cast.rinkId, user_id: cast.crew.userId })
      .update({ role: 'keeper' })
    await askForDeletion(cast.keeper.at(NOW), { currentPassword: '' })
    await pruneExpired(database.db, daysLater(15))
    expect(await database.db('rinks').where({ id: cast.rinkId })).toHaveLength(1)
  })

  test('a keeper who leaves while the other’s account ends leaves no rink without a keeper', async () => {
    const { rinkId, keeper, crew } = cast
    await database.db('rink_members').where({ rink_id: rinkId, user_id: crew.userId }).update({ role: 'keeper' })
    await askForDeletion(keeper.at(NOW), { currentPassword: '' })
    const leaving = await database.db.transaction()
    await deleteMember(leaving, systemRinkAccess(rinkId), crew.userId, NOW)
    const ending = pruneExpired(database.db, daysLater(15))
    await waitForLock(database.db)
    await leaving.commit()
    await ending
    expect(await database.db('rinks').where({ id: rinkId })).toEqual([])
  })

  test('asking needs the password', async () => {
    const asked = askForDeletion(as(anna.userId), { currentPassword: 'a guess' })
    await expect(asked).rejects.toMatchObject({ fields: { currentPassword: expect.any(String) } })
  })
})
