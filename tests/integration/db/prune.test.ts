// What is cleared away: jobs that used up their tries after a week, what people were told after more than a year.
import { expect, test } from 'vitest'
import { enqueueJob } from '@/db/queries/jobs'
import { promiseMessage } from '@/db/queries/messages'
import { pruneExpired } from '@/db/queries/prune'
import { DAY_MILLIS } from '@/lib/physics/constants'
import { getHealth } from '@/lib/services/health'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'

const NOW = new Date('2027-01-12T21:10:00Z')
const daysLater = (days: number) => new Date(NOW.getTime() + days * DAY_MILLIS)

const database = givenDatabase()
const cast = givenCast(database, NOW)

test('a job that used up its tries counts for a week, one that is held or still tried stays', async () => {
  for (const key of ['spent', 'held', 'tried']) {
    await enqueueJob(database.db, 'learn-yard', { rinkId: cast.rinkId }, { key })
  }
  await database.db.raw(
    `update graphile_worker._private_jobs set updated_at = :now,
       attempts = case key when 'tried' then max_attempts - 1 else max_attempts end,
       locked_by = case key when 'held' then 'a worker' end, locked_at = case key when 'held' then now() end
     where key in ('spent', 'held', 'tried')`,
    { now: NOW },
  )
  const keysLeft = async () => {
    const { rows } = await database.db.raw(
      `select key from graphile_worker.jobs where key in ('spent', 'held', 'tried') order by key`,
    )
    return rows.map(({ key }: { key: string }) => key)
  }
  await pruneExpired(database.db, daysLater(6.9))
  expect(await keysLeft()).toEqual(['held', 'spent', 'tried'])
  expect((await getHealth(database.db, NOW)).failedJobs).toBe(2)
  await pruneExpired(database.db, daysLater(7.1))
  expect(await keysLeft()).toEqual(['held', 'tried'])
})

test('what was told is kept for 400 days, with its attempts; what is still to be told stays', async () => {
  for (const key of ['told', 'to be told']) {
    const channel = { channel: 'email', kind: 'test', content: {} } as const
    const times = { sendAt: NOW, expiresAt: daysLater(900) }
    await promiseMessage(database.db, { dedupeKey: key, userId: cast.keeper.userId, ...channel, ...times }, NOW)
  }
  const [told] = await database
    .db('messages')
    .where({ dedupe_key: 'told' })
    .update({ state: 'delivered', settled_at: NOW })
    .returning('id')
  await database.db('delivery_attempts').insert({ message_id: told?.id, attempted_at: NOW, outcome: 'delivered' })
  const left = async () => [
    await database.db('messages').where({ user_id: cast.keeper.userId }).orderBy('dedupe_key').pluck('dedupe_key'),
    await database.db('delivery_attempts').where({ message_id: told?.id }).pluck('outcome'),
  ]
  await pruneExpired(database.db, daysLater(399))
  expect(await left()).toEqual([['to be told', 'told'], ['delivered']])
  await pruneExpired(database.db, daysLater(401))
  expect(await left()).toEqual([['to be told'], []])
})
