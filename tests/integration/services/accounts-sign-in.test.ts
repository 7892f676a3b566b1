// Signing in: one refusal for every reason, after the same work.
import { randomUUID } from 'node:crypto'
import { expect, test } from 'vitest'
import { signInWithPassword, signUp, SIGN_IN_REFUSED } from '@/lib/services/accounts'
import { LIMITS, spendOnEmail } from '@/lib/services/rate-limits'
import { givenDatabase } from '@/tests/support/given-cast'
import { mailsTo, minutesLater, newEmail, newMember, NOW, PASSWORD, visitor } from '@/tests/support/visitor'

const database = givenDatabase()

async function refusal(email: string, password: string): Promise<unknown> {
  return signInWithPassword(visitor(database.db), { email, password }).then(
    () => 'signed in',
    (error: Error & { code?: string; fields?: unknown }) => ({
      name: error.name,
      message: error.message,
      code: error.code,
      fields: error.fields,
    }),
  )
}

/** All the tries that the address has, each from somewhere else. */
async function guessFromEverywhere(email: string): Promise<void> {
  for (let hit = 0; hit < LIMITS.signInByEmail.hits; hit++) {
    await spendOnEmail({ db: database.db, now: NOW }, { limit: 'signInByEmail', email, from: randomUUID() })
  }
}

test('the right password of a confirmed address signs in', async () => {
  const { email, userId } = await newMember(database.db)
  expect(await signInWithPassword(visitor(database.db), { email, password: PASSWORD })).toEqual({
    userId,
    hasRink: false,
    isLeaving: false,
  })
})

test('wrong password, unknown address and unconfirmed address are refused alike', async () => {
  const { email } = await newMember(database.db)
  const unconfirmed = newEmail()
  await signUp(visitor(database.db), { name: 'Uwe', email: unconfirmed, password: PASSWORD })
  const refusals = [
    await refusal(email, 'not the password'),
    await refusal(newEmail(), PASSWORD),
    await refusal(unconfirmed, 'not the password'),
    await refusal(unconfirmed, PASSWORD),
  ]
  expect(new Set(refusals.map((each) => JSON.stringify(each))).size).toBe(1)
  expect(refusals[0]).toEqual({
    name: 'InvalidInputError',
    message: SIGN_IN_REFUSED,
    code: 'invalid_input',
    fields: {},
  })
})

test('the right password of an unconfirmed address brings a fresh link', async () => {
  const email = newEmail()
  await signUp(visitor(database.db), { name: 'Uwe', email, password: PASSWORD })
  await refusal(email, 'not the password')
  expect(await mailsTo(database.db, email)).toHaveLength(1)
  await refusal(email, PASSWORD)
  expect((await mailsTo(database.db, email)).map(({ kind }) => kind)).toEqual(['verify-address', 'verify-address'])
})

test('whoever guesses from one place is stopped there, and shuts nobody else out', async () => {
  const { email, userId } = await newMember(database.db)
  const guesser = visitor(database.db, NOW, '203.0.113.9')
  const guess = () => signInWithPassword(guesser, { email, password: 'a guess' })
  for (let hit = 0; hit < LIMITS.signInByEmailAndVisitor.hits; hit++)
    await expect(guess()).rejects.toThrow(SIGN_IN_REFUSED)
  for (let hit = 0; hit < LIMITS.signInByEmail.hits; hit++) {
    await expect(guess()).rejects.toMatchObject({ code: 'rate_limited' })
  }
  expect(await signInWithPassword(visitor(database.db), { email, password: PASSWORD })).toMatchObject({ userId })
})

test('the right password counts for no try', async () => {
  const { email, userId } = await newMember(database.db)
  const owner = visitor(database.db, NOW, '203.0.113.10')
  for (let hit = 0; hit < LIMITS.signInByEmailAndVisitor.hits + 2; hit++) {
    expect(await signInWithPassword(owner, { email, password: PASSWORD })).toMatchObject({ userId })
  }
})

test('after too many tries on one address even the right password waits', async () => {
  const { email } = await newMember(database.db)
  await guessFromEverywhere(email)
  const attempt = signInWithPassword(visitor(database.db), { email, password: PASSWORD })
  // NOW is on the quarter hour, so the whole window is still ahead.
  await expect(attempt).rejects.toMatchObject({ code: 'rate_limited', retryAfterSeconds: 900 })
  const later = signInWithPassword(visitor(database.db, minutesLater(15)), { email, password: PASSWORD })
  await expect(later).resolves.toMatchObject({ hasRink: false })
})

test('an unknown address is limited like a known one', async () => {
  const email = newEmail()
  await guessFromEverywhere(email)
  expect(await refusal(email, 'a guess')).toMatchObject({ code: 'rate_limited' })
})
