// The theme of a person's pages: their choice, and the sky over their rink.
import { beforeAll, expect, test } from 'vitest'
import { getPageTheme, SYSTEM_THEME } from '@/lib/services/themes'
import { createCast, addActor, type Cast } from '@/tests/support/cast'
import { givenDatabase } from '@/tests/support/given-cast'

// 5 pm and noon at the rink's longitude, in mid-January.
const EVENING = new Date('2027-01-12T22:30:00Z')
const NOON = new Date('2027-01-12T17:00:00Z')

const database = givenDatabase()
let cast: Cast
beforeAll(async () => {
  cast = await createCast(database.db, EVENING)
})

const choose = (userId: string, theme: 'system' | 'light' | 'dark' | 'dark-after-sunset') =>
  database.db('users').where({ id: userId }).update({ theme })

test('a plain choice stands; without one the system decides', async () => {
  expect(await getPageTheme(cast.keeper.at(EVENING), null)).toEqual(SYSTEM_THEME)
  await choose(cast.keeper.userId, 'light')
  expect(await getPageTheme(cast.keeper.at(EVENING), null)).toEqual({ theme: 'light', changes: [] })
})

test('after sunset is told by the rink, also to its skaters', async () => {
  await choose(cast.skater.userId, 'dark-after-sunset')
  expect(await getPageTheme(cast.skater.at(EVENING), null)).toMatchObject({ theme: 'dark' })
  const { theme, changes } = await getPageTheme(cast.skater.at(NOON), null)
  expect(theme).toBe('light')
  expect(changes[0]?.theme).toBe('dark')
})

test('the rink on screen comes first, a stranger’s rink says nothing', async () => {
  const east = await createCast(database.db, EVENING, { latitude: '61.3', longitude: '10.2' })
  await database.db('rink_members').insert({ rink_id: east.rinkId, user_id: cast.skater.userId, role: 'skater' })
  // At noon in Ontario it is 6 pm in Norway.
  expect(await getPageTheme(cast.skater.at(NOON), east.rinkId)).toMatchObject({ theme: 'dark' })
  expect(await getPageTheme(cast.skater.at(NOON), cast.rinkId)).toMatchObject({ theme: 'light' })
  const alone = await addActor(database.db, 'Alone')
  await choose(alone.userId, 'dark-after-sunset')
  expect(await getPageTheme(alone.at(EVENING), cast.rinkId)).toEqual(SYSTEM_THEME)
})
