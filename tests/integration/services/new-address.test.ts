// A new address: asked for by the account's owner, confirmed by the same person, and by nobody else.
import { beforeEach, expect, test } from 'vitest'
import { findMessageToDeliver } from '@/db/queries/deliveries'
import type { ServiceContext, Viewer } from '@/lib/context'
import { signInWithPassword } from '@/lib/services/accounts'
import { askForEmailChange, readNewAddress, takeNewAddress } from '@/lib/services/new-address'
import { getAccount } from '@/lib/services/own-account'
import { renderEmail } from '@/lib/services/render-message'
import { givenDatabase } from '@/tests/support/given-cast'
import { SETTINGS } from '@/tests/support/night-at-the-rink'
import { mailsTo, newEmail, newestKey, newMember, NOW, PASSWORD, SECRET, visitor } from '@/tests/support/visitor'

const database = givenDatabase()
let anna: { email: string; userId: string }
beforeEach(async () => {
  anna = await newMember(database.db)
})

const viewerOf = (userId: string): Viewer => ({ userId, isAdmin: false })
const as = (userId: string): ServiceContext => ({ db: database.db, now: NOW, viewer: viewerOf(userId) })
/** Somebody signed in who opens a mailed link. */
const linkTo = (userId: string) => ({ ...as(userId), secret: SECRET })
const newestMessage = async (userId: string, kind: string) => {
  const row = await database.db('messages').where({ user_id: userId, kind }).orderBy('created_at', 'desc').first('id')
  return row && findMessageToDeliver(database.db, row.id)
}

test('a new address counts once the mail that went there was answered, and not before', async () => {
  const email = newEmail()
  await askForEmailChange(as(anna.userId), { email, currentPassword: PASSWORD })
  expect(await newestMessage(anna.userId, 'change-address')).toMatchObject({ email })
  expect(await getAccount(as(anna.userId))).toMatchObject({ email: anna.email })
  const key = await newestKey(database.db, anna.email, 'change-email')
  await takeNewAddress(linkTo(anna.userId), key)
  expect(await getAccount(as(anna.userId))).toMatchObject({ email })
  expect(await signInWithPassword(visitor(database.db), { email, password: PASSWORD })).toMatchObject({
    userId: anna.userId,
  })
  await expect(takeNewAddress(linkTo(anna.userId), key)).rejects.toMatchObject({ code: 'invalid_input' })
})

test('a new address is told to the address that was left, which does not learn the new one', async () => {
  const email = newEmail()
  await askForEmailChange(as(anna.userId), { email, currentPassword: PASSWORD })
  await takeNewAddress(linkTo(anna.userId), await newestKey(database.db, anna.email, 'change-email'))
  const message = await newestMessage(anna.userId, 'address-changed')
  expect(message).toMatchObject({ email: anna.email })
  const mail = renderEmail({ ...message!, attempts: 0 }, SETTINGS)
  expect(mail).toMatchObject({ to: anna.email, subject: expect.stringContaining('new e-mail address') })
  expect(mail.text + mail.html).not.toContain(email)
})

test('a new address goes to one of two who take it at once', async () => {
  const email = newEmail()
  const other = await newMember(database.db)
  const presses: (() => Promise<void>)[] = []
  for (const person of [anna, other]) {
    await askForEmailChange(as(person.userId), { email, currentPassword: PASSWORD })
    const key = await newestKey(database.db, person.email, 'change-email')
    presses.push(() => takeNewAddress(linkTo(person.userId), key))
  }
  const taken = await Promise.allSettled(presses.map((press) => press()))
  expect(taken.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
  const refused = taken.find((one) => one.status === 'rejected')
  expect(refused?.reason).toMatchObject({ code: 'invalid_input' })
})

test('a new address needs the password', async () => {
  const asked = askForEmailChange(as(anna.userId), { email: newEmail(), currentPassword: 'a guess' })
  await expect(asked).rejects.toMatchObject({ fields: { currentPassword: expect.any(String) } })
})

test('an address that belongs to somebody is not taken, and its owner is told', async () => {
  const other = await newMember(database.db)
  await askForEmailChange(as(anna.userId), { email: other.email, currentPassword: PASSWORD })
  expect((await mailsTo(database.db, other.email)).map(({ kind }) => kind)).toContain('address-already-registered')
  expect(await newestMessage(anna.userId, 'change-address')).toBeUndefined()
})

test('an address that somebody took meanwhile stays theirs', async () => {
  const email = newEmail()
  await askForEmailChange(as(anna.userId), { email, currentPassword: PASSWORD })
  const key = await newestKey(database.db, anna.email, 'change-email')
  await newMember(database.db, email)
  await expect(takeNewAddress(linkTo(anna.userId), key)).rejects.toMatchObject({ code: 'invalid_input' })
  expect(await getAccount(as(anna.userId))).toMatchObject({ email: anna.email })
})

test('whoever reads a mistyped address gets neither the account nor its name', async () => {
  const email = newEmail()
  await askForEmailChange(as(anna.userId), { email, currentPassword: PASSWORD })
  const key = await newestKey(database.db, anna.email, 'change-email')
  const stranger = await newMember(database.db)
  expect(await readNewAddress(visitor(database.db), undefined, key)).toEqual({ state: 'stranger' })
  expect(await readNewAddress(visitor(database.db), viewerOf(stranger.userId), key)).toEqual({
    state: 'another-account',
  })
  await expect(takeNewAddress(linkTo(stranger.userId), key)).rejects.toMatchObject({ code: 'invalid_input' })
  expect(await getAccount(as(anna.userId))).toMatchObject({ email: anna.email })
  // The stranger's press used nothing up.
  expect(await readNewAddress(visitor(database.db), viewerOf(anna.userId), key)).toEqual({
    state: 'open',
    email,
    presentEmail: anna.email,
  })
  await takeNewAddress(linkTo(anna.userId), key)
  expect(await readNewAddress(visitor(database.db), viewerOf(anna.userId), key)).toEqual({ state: 'dead' })
})
