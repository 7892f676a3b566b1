// Counting tries: at once, by window, by visitor.
import { randomUUID } from 'node:crypto'
import { expect, test } from 'vitest'
import { countHit } from '@/db/queries/rate-limits'
import { LIMITS, spend, spendByVisitor } from '@/lib/services/rate-limits'
import { givenDatabase } from '@/tests/support/given-cast'
import { minutesLater, NOW, visitor } from '@/tests/support/visitor'

const database = givenDatabase()

test('thirty tries at once are counted one by one', async () => {
  const key = randomUUID()
  const counts = await Promise.all(Array.from({ length: 30 }, () => countHit(database.db, key, NOW)))
  expect(counts.sort((a, b) => a - b)).toEqual(Array.from({ length: 30 }, (_, index) => index + 1))
})

test('every window counts anew', async () => {
  const key = randomUUID()
  await countHit(database.db, key, NOW)
  expect(await countHit(database.db, key, minutesLater(15))).toBe(1)
})

test('of tries at once exactly as many pass as the limit says', async () => {
  const { hits } = LIMITS.passwordChangeByUser
  const context = { db: database.db, now: NOW }
  const tries = Array.from({ length: hits + 5 }, () => spend(context, 'passwordChangeByUser', 'one person'))
  const passed = (await Promise.allSettled(tries)).filter(({ status }) => status === 'fulfilled')
  expect(passed).toHaveLength(hits)
  await expect(spend(context, 'passwordChangeByUser', 'another person')).resolves.toBeUndefined()
})

test('the wait lasts until the window ends', async () => {
  const context = { db: database.db, now: minutesLater(10) }
  for (let hit = 0; hit < LIMITS.mailByEmail.hits; hit++) await spend(context, 'mailByEmail', 'somebody')
  // The hour began at NOW, so fifty of its minutes are left.
  await expect(spend(context, 'mailByEmail', 'somebody')).rejects.toMatchObject({ retryAfterSeconds: 50 * 60 })
})

test('one visitor uses up nobody else’s tries', async () => {
  const greedy = visitor(database.db, NOW, '203.0.113.9')
  for (let hit = 0; hit < LIMITS.signUpByVisitor.hits; hit++) await spendByVisitor(greedy, 'signUpByVisitor')
  await expect(spendByVisitor(greedy, 'signUpByVisitor')).rejects.toMatchObject({ code: 'rate_limited' })
  await expect(spendByVisitor(visitor(database.db), 'signUpByVisitor')).resolves.toBeUndefined()
})

test('what is limited is not written down', async () => {
  await spend({ db: database.db, now: NOW }, 'mailByEmail', 'anna@nightsheet.example')
  const rows = await database.db('rate_limits').select('key')
  expect(JSON.stringify(rows)).not.toContain('anna')
})
