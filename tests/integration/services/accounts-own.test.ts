// One's own account and its sessions, as next-auth sees them.
import { METRIC, type Units } from '@/lib/units'
import { expect, test } from 'vitest'
import { pruneExpired } from '@/db/queries/prune'
import { sessionAdapter } from '@/lib/auth/adapter'
import { SESSION_SECONDS } from '@/lib/auth/session-cookie'
import { openSession } from '@/lib/auth/sessions'
import type { ServiceContext } from '@/lib/context'
import { DAY_MILLIS } from '@/lib/physics/constants'
import { requestLink, signInWithLink, signInWithPassword, signUp } from '@/lib/services/accounts'
import { askForEmailChange } from '@/lib/services/new-address'
import { changePassword, getAccount, saveAccount } from '@/lib/services/own-account'
import { signOutEverywhere } from '@/lib/services/own-sessions'
import { LIMITS } from '@/lib/services/rate-limits'
import { givenDatabase } from '@/tests/support/given-cast'
import { mailsTo, minutesLater, newEmail, newestKey, newMember, NOW, PASSWORD, visitor } from '@/tests/support/visitor'

const database = givenDatabase()

// next-auth's adapter reads the clock itself, so sessions here begin in the present.
const present = () => new Date()
const as = (userId: string, signedInAt?: Date): ServiceContext => ({
  db: database.db,
  now: NOW,
  viewer: { userId, isAdmin: false, signedInAt },
})
const open = (userId: string) => openSession(database.db, userId, present())
const read = (token: string) => sessionAdapter(database.db).getSessionAndUser?.(token)

test('a session is found by its token, which the database does not hold', async () => {
  const { email, userId } = await newMember(database.db)
  const { token, expiresAt } = await open(userId)
  expect(await read(token)).toMatchObject({
    session: { sessionToken: token, userId, expires: expiresAt },
    user: { id: userId, email, name: 'Anna', isAdmin: false, signedInAt: expect.any(Date) },
  })
  expect(JSON.stringify(await database.db('sessions').select())).not.toContain(token)
  expect(await read(`${token}x`)).toBeNull()
})

test('who becomes admin is one from the next request on', async () => {
  const { userId } = await newMember(database.db)
  const { token } = await open(userId)
  await database.db('users').where({ id: userId }).update({ is_admin: true })
  expect(await read(token)).toMatchObject({ user: { isAdmin: true } })
})

test('an expired session is none', async () => {
  const { userId } = await newMember(database.db)
  const longAgo = new Date(present().getTime() - SESSION_SECONDS * 1000 - 1000)
  const { token } = await openSession(database.db, userId, longAgo)
  expect(await read(token)).toBeNull()
})

test('signing out ends one session, signing out everywhere ends all and kills links on their way', async () => {
  const { email, userId } = await newMember(database.db)
  const [first, second, third] = [await open(userId), await open(userId), await open(userId)]
  await sessionAdapter(database.db).deleteSession?.(first.token)
  expect([await read(first.token), await read(second.token)]).toMatchObject([null, { user: { id: userId } }])
  await requestLink(visitor(database.db), { email }, 'sign-in')
  const other = await newMember(database.db)
  const othersSession = await open(other.userId)
  await signOutEverywhere(as(userId))
  expect([await read(second.token), await read(third.token)]).toEqual([null, null])
  expect(await read(othersSession.token)).not.toBeNull()
  const key = await newestKey(database.db, email, 'sign-in')
  await expect(signInWithLink(visitor(database.db), key)).rejects.toMatchObject({ code: 'invalid_input' })
})

test('changing the password needs the present one and ends every session', async () => {
  const { email, userId } = await newMember(database.db)
  const { token } = await open(userId)
  const wrong = changePassword(as(userId), { currentPassword: 'a guess', newPassword: 'a newly chosen one' })
  await expect(wrong).rejects.toMatchObject({ code: 'invalid_input', fields: { currentPassword: expect.any(String) } })
  expect(await read(token)).not.toBeNull()
  await changePassword(as(userId), { currentPassword: PASSWORD, newPassword: 'a newly chosen one' })
  expect(await read(token)).toBeNull()
  await expect(
    signInWithPassword(visitor(database.db), { email, password: 'a newly chosen one' }),
  ).resolves.toBeDefined()
})

test('guessing the present password is limited', async () => {
  const { userId } = await newMember(database.db)
  const guess = () => changePassword(as(userId), { currentPassword: 'a guess', newPassword: 'a newly chosen one' })
  for (let hit = 0; hit < LIMITS.passwordChangeByUser.hits; hit++) await expect(guess()).rejects.toThrow('Nothing')
  await expect(guess()).rejects.toMatchObject({ code: 'rate_limited' })
})

async function linkOnly(): Promise<{ email: string; userId: string }> {
  const email = newEmail()
  await signUp(visitor(database.db), { name: 'Lin', email, password: PASSWORD })
  await requestLink(visitor(database.db), { email }, 'sign-in')
  const { userId } = await signInWithLink(visitor(database.db), await newestKey(database.db, email, 'sign-in'))
  return { email, userId }
}

test('without a password the account moves only for somebody who came from its mailbox in the last half hour', async () => {
  const { email, userId } = await linkOnly()
  for (const signedInAt of [undefined, minutesLater(-31)]) {
    const context = as(userId, signedInAt)
    const moved = askForEmailChange(context, { email: newEmail(), currentPassword: '' })
    await expect(moved).rejects.toMatchObject({ code: 'invalid_input' })
    const locked = changePassword(context, { currentPassword: '', newPassword: 'a thief’s own' })
    await expect(locked).rejects.toMatchObject({ code: 'invalid_input' })
  }
  expect((await mailsTo(database.db, email)).map(({ kind }) => kind)).not.toContain('change-address')
  await askForEmailChange(as(userId, minutesLater(-29)), { email: newEmail(), currentPassword: '' })
  expect((await mailsTo(database.db, email)).map(({ kind }) => kind)).toContain('change-address')
})

test('somebody who only ever used links sets a first password', async () => {
  const { userId } = await linkOnly()
  expect(await getAccount(as(userId))).toMatchObject({ hasPassword: false })
  await changePassword(as(userId, NOW), { currentPassword: '', newPassword: 'a first password' })
  expect(await getAccount(as(userId))).toMatchObject({ hasPassword: true })
})

const MIXED: Units = { temperature: 'C', ice: 'in', water: 'gal', size: 'ft', wind: 'm/s' }

test('name, units and clock are kept, one’s own only', async () => {
  const { email, userId } = await newMember(database.db)
  const other = await newMember(database.db)
  await saveAccount(as(userId), { name: 'Anna B.', units: MIXED, clock: '24', theme: 'dark' })
  const expected = {
    email,
    name: 'Anna B.',
    units: MIXED,
    clock: '24',
    theme: 'dark',
    hasPassword: true,
    isEmailRefused: false,
    deletionDueAt: null,
  }
  expect(await getAccount(as(userId))).toEqual(expected)
  expect(await getAccount(as(other.userId))).toMatchObject({
    name: 'Anna',
    units: METRIC,
    clock: '12',
    theme: 'system',
  })
  await expect(getAccount(as('11111111-1111-4111-8111-111111111111'))).rejects.toMatchObject({ code: 'not_found' })
})

test('pruning forgets what is over and nothing that still counts', async () => {
  const { userId } = await newMember(database.db)
  const unconfirmed = newEmail()
  await signUp(visitor(database.db), { name: 'Gone', email: unconfirmed, password: PASSWORD })
  const { token } = await open(userId)
  const inTwentyDays = new Date(NOW.getTime() + 20 * DAY_MILLIS)
  await pruneExpired(database.db, inTwentyDays)
  expect(await read(token)).not.toBeNull()
  expect(await database.db('users').where({ email: unconfirmed })).toEqual([])
  expect(await database.db('users').where({ id: userId })).toHaveLength(1)
  expect(await database.db('rate_limits')).toEqual([])
  expect(await database.db('account_links')).toEqual([])
})
