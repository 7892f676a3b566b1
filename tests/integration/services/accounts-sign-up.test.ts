// Signing up: the same answer whoever asks, and nobody gets an account with an address that is not theirs.
import { expect, test } from 'vitest'
import { confirmAddress, signInWithPassword, signUp } from '@/lib/services/accounts'
import { givenDatabase } from '@/tests/support/given-cast'
import { mailsTo, minutesLater, newEmail, newestKey, newMember, PASSWORD, visitor } from '@/tests/support/visitor'

const database = givenDatabase()

const userOf = (email: string) => database.db('users').where({ email }).first()

test('a new address gets a link that confirms it and signs in', async () => {
  const email = newEmail()
  await signUp(visitor(database.db), { name: 'Anna', email, password: PASSWORD })
  expect(await mailsTo(database.db, email)).toEqual([{ kind: 'verify-address', linkId: expect.any(String) }])
  expect((await userOf(email))?.email_verified_at).toBeNull()
  const confirmed = await confirmAddress(visitor(database.db), await newestKey(database.db, email, 'verify'), email)
  expect(confirmed).toEqual({ userId: (await userOf(email))?.id, hasRink: false, isLeaving: false })
  expect((await userOf(email))?.email_verified_at).toEqual(minutesLater(0))
})

test('the password is kept as argon2id and nothing that was promised holds a token', async () => {
  const email = newEmail()
  await signUp(visitor(database.db), { name: 'Anna', email, password: PASSWORD })
  expect((await userOf(email))?.password_hash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/)
  const key = await newestKey(database.db, email, 'verify')
  const proof = key.split('.')[1] ?? ''
  const rows = [await database.db('messages').select(), await database.db('account_links').select()]
  expect(JSON.stringify(rows)).not.toContain(proof)
  const jobs = await database.db.raw('select payload from graphile_worker._private_jobs')
  expect(JSON.stringify(jobs.rows)).not.toContain(proof)
})

test('a known address changes nothing and its owner is told', async () => {
  const { email } = await newMember(database.db)
  const before = await userOf(email)
  const answer = await signUp(visitor(database.db), { name: 'Mallory', email, password: 'another long password' })
  expect(answer).toBeUndefined()
  expect(await userOf(email)).toEqual(before)
  expect((await mailsTo(database.db, email)).map(({ kind }) => kind).sort()).toEqual([
    'address-already-registered',
    'verify-address',
  ])
})

test('signing up again before confirming starts over: the newer password counts and the older link is dead', async () => {
  const email = newEmail()
  await signUp(visitor(database.db), { name: 'Ana', email, password: 'the first password' })
  const older = await newestKey(database.db, email, 'verify')
  await signUp(visitor(database.db, minutesLater(1)), { name: 'Anna', email, password: PASSWORD })
  await expect(confirmAddress(visitor(database.db, minutesLater(2)), older, email)).rejects.toThrow('Ask for a new one')
  const newer = await newestKey(database.db, email, 'verify')
  const { userId } = await confirmAddress(visitor(database.db, minutesLater(2)), newer, email)
  expect(await signInWithPassword(visitor(database.db), { email, password: PASSWORD })).toMatchObject({ userId })
  expect((await userOf(email))?.name).toBe('Anna')
})

test('two sign-ups with one address at once make one person', async () => {
  const email = newEmail()
  const input = { name: 'Anna', email, password: PASSWORD }
  await Promise.all([signUp(visitor(database.db), input), signUp(visitor(database.db), input)])
  expect(await database.db('users').where({ email })).toHaveLength(1)
  expect(await database.db('account_links').where({ user_id: (await userOf(email))?.id, used_at: null })).toHaveLength(
    1,
  )
})
