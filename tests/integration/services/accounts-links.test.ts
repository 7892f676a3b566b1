// Mailed links: once, in time, for one purpose, and made by us.
import { describe, expect, test } from 'vitest'
import { insertSession } from '@/db/queries/sessions'
import { hashSessionToken } from '@/lib/auth/session-tokens'
import { linkKey, linkUrl } from '@/lib/auth/account-links'
import {
  confirmAddress,
  findLinkOwner,
  requestLink,
  resetPassword,
  signInWithLink,
  signInWithPassword,
  signUp,
} from '@/lib/services/accounts'
import { LIMITS } from '@/lib/services/rate-limits'
import { givenDatabase } from '@/tests/support/given-cast'
import {
  mailsTo,
  minutesLater,
  newEmail,
  newestKey,
  newMember,
  NOW,
  PASSWORD,
  SECRET,
  visitor,
} from '@/tests/support/visitor'

const REFUSED = { code: 'invalid_input', message: 'This link has been used or has run out. Ask for a new one.' }

const database = givenDatabase()

async function mailedSignInKey(email: string): Promise<string> {
  await requestLink(visitor(database.db), { email }, 'sign-in')
  return newestKey(database.db, email, 'sign-in')
}

test('a link is mailed to a known address, and nothing happens for an unknown one', async () => {
  const { email, userId } = await newMember(database.db)
  const stranger = newEmail()
  const messages = async () => Number((await database.db('messages').count({ n: '*' }).first())?.n)
  const before = await messages()
  expect(await requestLink(visitor(database.db), { email: stranger }, 'sign-in')).toBeUndefined()
  expect(await messages()).toBe(before)
  expect(await requestLink(visitor(database.db), { email }, 'sign-in')).toBeUndefined()
  expect(await messages()).toBe(before + 1)
  const key = await newestKey(database.db, email, 'sign-in')
  expect(await signInWithLink(visitor(database.db), key)).toEqual({ userId, hasRink: false, isLeaving: false })
})

test('the mail is dropped no later than its link dies', async () => {
  const { email, userId } = await newMember(database.db)
  await mailedSignInKey(email)
  const message = await database.db('messages').where({ user_id: userId, kind: 'sign-in-link' }).first()
  expect(message?.expires_at).toEqual(minutesLater(30))
})

test('looking at a link uses nothing up', async () => {
  const { email } = await newMember(database.db)
  const key = await mailedSignInKey(email)
  for (let look = 0; look < 3; look++) {
    expect(await findLinkOwner(visitor(database.db), 'sign-in', key)).toEqual({ email })
  }
  await expect(signInWithLink(visitor(database.db), key)).resolves.toBeDefined()
  expect(await findLinkOwner(visitor(database.db), 'sign-in', key)).toBeUndefined()
})

test('a link works once, even for two presses at once', async () => {
  const { email } = await newMember(database.db)
  const key = await mailedSignInKey(email)
  const presses = await Promise.allSettled([1, 2, 3].map(() => signInWithLink(visitor(database.db), key)))
  expect(presses.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected', 'rejected'])
  await expect(signInWithLink(visitor(database.db), key)).rejects.toMatchObject(REFUSED)
})

test.each([
  { purpose: 'sign-in', lastMinute: 29, deadMinute: 30 },
  { purpose: 'reset', lastMinute: 29, deadMinute: 30 },
  { purpose: 'verify', lastMinute: 24 * 60 - 1, deadMinute: 24 * 60 },
] as const)('a $purpose link dies after $deadMinute minutes', async ({ purpose, lastMinute, deadMinute }) => {
  const email = newEmail()
  await signUp(visitor(database.db), { name: 'Anna', email, password: PASSWORD })
  if (purpose !== 'verify') await requestLink(visitor(database.db), { email }, purpose)
  const key = await newestKey(database.db, email, purpose)
  expect(await findLinkOwner(visitor(database.db, minutesLater(lastMinute)), purpose, key)).toEqual({ email })
  const late = visitor(database.db, minutesLater(deadMinute))
  expect(await findLinkOwner(late, purpose, key)).toBeUndefined()
  if (purpose === 'verify') await expect(confirmAddress(late, key, undefined)).rejects.toMatchObject(REFUSED)
  if (purpose === 'sign-in') await expect(signInWithLink(late, key)).rejects.toMatchObject(REFUSED)
  if (purpose === 'reset') await expect(resetPassword(late, { key, password: PASSWORD })).rejects.toMatchObject(REFUSED)
})

describe('a key that we did not make', () => {
  test.each([
    [
      'made with another secret',
      (id: string) => linkKey('another secret, of sufficient length too', { id, purpose: 'sign-in' }),
    ],
    ['made for another purpose', (id: string) => linkKey(SECRET, { id, purpose: 'reset' })],
    [
      'of a link that does not exist',
      () => linkKey(SECRET, { id: '11111111-1111-4111-8111-111111111111', purpose: 'sign-in' }),
    ],
    ['with the proof cut off', (id: string) => id],
    [
      'with one character changed',
      (id: string) =>
        linkKey(SECRET, { id, purpose: 'sign-in' }).replace(/\.(.)/, (_dot, first) => (first === 'A' ? '.B' : '.A')),
    ],
    ['that is nothing of the kind', () => "' or 1=1 --"],
  ])('%s opens nothing', async (_what, forge) => {
    const { email } = await newMember(database.db)
    const [id = ''] = (await mailedSignInKey(email)).split('.')
    await expect(signInWithLink(visitor(database.db), forge(id))).rejects.toMatchObject(REFUSED)
    expect(await findLinkOwner(visitor(database.db), 'sign-in', forge(id))).toBeUndefined()
  })
})

test('a sign-in link to an unconfirmed address drops the password that a stranger may have chosen', async () => {
  const email = newEmail()
  await signUp(visitor(database.db), { name: 'Mallory', email, password: 'what mallory knows' })
  await signInWithLink(visitor(database.db), await mailedSignInKey(email))
  const attempt = signInWithPassword(visitor(database.db), { email, password: 'what mallory knows' })
  await expect(attempt).rejects.toMatchObject({ code: 'invalid_input' })
})

test('a reset changes the password and ends every session and every other link', async () => {
  const { email, userId } = await newMember(database.db)
  const tokenHash = hashSessionToken('an older browser')
  await insertSession(database.db, { tokenHash, userId, expiresAt: minutesLater(60) }, NOW)
  const signInKey = await mailedSignInKey(email)
  await requestLink(visitor(database.db), { email }, 'reset')
  const key = await newestKey(database.db, email, 'reset')
  await resetPassword(visitor(database.db), { key, password: 'a newly chosen one' })
  expect(await database.db('sessions').where({ user_id: userId })).toEqual([])
  await expect(signInWithLink(visitor(database.db), signInKey)).rejects.toMatchObject(REFUSED)
  await expect(signInWithPassword(visitor(database.db), { email, password: PASSWORD })).rejects.toThrow()
  await expect(
    signInWithPassword(visitor(database.db), { email, password: 'a newly chosen one' }),
  ).resolves.toBeDefined()
  await expect(resetPassword(visitor(database.db), { key, password: 'once more please' })).rejects.toMatchObject(
    REFUSED,
  )
})

test('mails to one address are limited, known or not, and the limit ends with the hour', async () => {
  for (const email of [newEmail(), (await newMember(database.db)).email]) {
    const ask = (now: Date) => requestLink(visitor(database.db, now), { email }, 'reset')
    const spent = (await mailsTo(database.db, email)).length
    for (let hit = spent; hit < LIMITS.mailByEmail.hits; hit++) await ask(NOW)
    await expect(ask(NOW)).rejects.toMatchObject({ code: 'rate_limited' })
    await expect(ask(minutesLater(60))).resolves.toBeUndefined()
  }
})

test('somebody else cannot use up the mails that an owner may ask for', async () => {
  const { email } = await newMember(database.db)
  const other = visitor(database.db, NOW, '203.0.113.9')
  for (let hit = 0; hit < LIMITS.mailByEmailAndVisitor.hits; hit++) await requestLink(other, { email }, 'sign-in')
  for (let hit = 0; hit < LIMITS.mailByEmail.hits; hit++) {
    await expect(requestLink(other, { email }, 'sign-in')).rejects.toMatchObject({ code: 'rate_limited' })
  }
  await expect(requestLink(visitor(database.db), { email }, 'sign-in')).resolves.toBeUndefined()
})

test('the address in the mail leads to the page of its purpose', () => {
  const id = '6b203df5-2bdf-4757-a047-5c08e20f33d1'
  const path = (purpose: 'verify' | 'sign-in' | 'reset') =>
    new URL(linkUrl('https://rink.example', SECRET, { id, purpose })).pathname
  expect([path('verify'), path('sign-in'), path('reset')]).toEqual(['/verify', '/sign-in/link', '/reset/new'])
})
