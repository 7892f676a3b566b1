// Rows of sessions and links: found, extended, ended.
import { expect, test } from 'vitest'
import { consumeAccountLink, findGoodAccountLink, insertAccountLink } from '@/db/queries/account-links'
import { extendSession, findSession, insertSession } from '@/db/queries/sessions'
import { hashSessionToken } from '@/lib/auth/session-tokens'
import { givenDatabase } from '@/tests/support/given-cast'
import { minutesLater, newMember, NOW } from '@/tests/support/visitor'

const database = givenDatabase()

test('a session lives until it expires, and longer when extended', async () => {
  const { userId } = await newMember(database.db)
  const tokenHash = hashSessionToken('one browser')
  await insertSession(database.db, { tokenHash, userId, expiresAt: minutesLater(10) }, NOW)
  expect(await findSession(database.db, tokenHash, minutesLater(9))).toMatchObject({ userId })
  expect(await findSession(database.db, tokenHash, minutesLater(10))).toBeUndefined()
  await extendSession(database.db, tokenHash, minutesLater(20))
  expect(await findSession(database.db, tokenHash, minutesLater(19))).toMatchObject({ expiresAt: minutesLater(20) })
})

test('a raw token cannot be stored in place of its hash', async () => {
  const { userId } = await newMember(database.db)
  const session = { tokenHash: 'a raw token', userId, expiresAt: minutesLater(10) }
  await expect(insertSession(database.db, session, NOW)).rejects.toThrow('sessions_token_hash_check')
})

test('sessions go with their person', async () => {
  const { userId } = await newMember(database.db)
  const tokenHash = hashSessionToken('soon nobody’s')
  await insertSession(database.db, { tokenHash, userId, expiresAt: minutesLater(10) }, NOW)
  await database.db('users').where({ id: userId }).delete()
  expect(await database.db('sessions').where({ token_hash: tokenHash })).toEqual([])
})

test('a link is used up for its own purpose only', async () => {
  const { userId } = await newMember(database.db)
  const { id } = await insertAccountLink(database.db, { userId, purpose: 'reset', expiresAt: minutesLater(30) }, NOW)
  expect(await consumeAccountLink(database.db, { id, purpose: 'sign-in' }, NOW)).toBeUndefined()
  expect(await findGoodAccountLink(database.db, { id, purpose: 'reset' }, NOW)).toEqual({ userId, newEmail: null })
  expect(await consumeAccountLink(database.db, { id, purpose: 'reset' }, NOW)).toEqual({ userId, newEmail: null })
  expect(await consumeAccountLink(database.db, { id, purpose: 'reset' }, NOW)).toBeUndefined()
})
