// What a failed query says of itself: it ends up in logs and on the server page.
import { expect, test } from 'vitest'
import { givenDatabase } from '@/tests/support/given-cast'

const database = givenDatabase()
const SECRET = 'somebody@nightsheet.example'

test.each([
  ['an insert', () => database.db('users').insert({ email: SECRET, name: SECRET, clock: '36' as '12' })],
  // A question mark of SQL's own is no place for a value either.
  ['SQL with an operator', () => database.db.raw(`select length(?) / 0 where not '{}'::jsonb \\? 'key'`, [SECRET])],
])('%s that fails names none of the values that it was given', async (_what, run) => {
  const error = await Promise.resolve(run()).then(
    () => null,
    (reason: Error) => reason,
  )
  expect(error?.message).toMatch(/users_clock_check|division by zero/)
  expect(error?.message).not.toContain(SECRET)
})
