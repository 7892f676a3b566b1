// The people of a rink: who sees them, who changes a role or takes somebody off, and that somebody always keeps it.
import { randomUUID } from 'node:crypto'
import { describe, expect, test } from 'vitest'
import { ForbiddenError, NotFoundError } from '@/lib/errors'
import type { Role } from '@/lib/access/permissions'
import { changeRoleSchema } from '@/lib/schemas/people'
import { changeRole, getPeople, takeOff } from '@/lib/services/people'
import { listMyRinks } from '@/lib/services/rinks'
import type { Actor } from '@/tests/support/cast'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'

const NOW = new Date('2027-01-12T20:00:00Z')
const database = givenDatabase()
const cast = givenCast(database, NOW)

const change = (by: Actor, whom: Actor, role: Role) =>
  changeRole(by.at(NOW), { rinkId: cast.rinkId, userId: whom.userId, role })
const takeOffAs = (by: Actor, whom: Actor) => takeOff(by.at(NOW), { rinkId: cast.rinkId, userId: whom.userId })
const rolesNow = async () => {
  const { people } = await getPeople(cast.keeper.at(NOW), cast.rinkId)
  return Object.fromEntries(people.map(({ name, role }) => [name, role]))
}
const keepers = async () => database.db('rink_members').where({ rink_id: cast.rinkId, role: 'keeper' })

test('everybody on the rink sees names and roles, and no address', async () => {
  for (const actor of [cast.keeper, cast.crew, cast.skater]) {
    const view = await getPeople(actor.at(NOW), cast.rinkId)
    expect(view.people.map(({ name, role }) => [name, role])).toEqual(
      expect.arrayContaining([
        ['Keeper', 'keeper'],
        ['Crew', 'crew'],
        ['Skater', 'skater'],
      ]),
    )
    expect(view.people.filter(({ isViewer }) => isViewer)).toMatchObject([{ userId: actor.userId }])
    expect(JSON.stringify(view)).not.toContain('@')
  }
  await expect(getPeople(cast.stranger.at(NOW), cast.rinkId)).rejects.toThrow(NotFoundError)
  await expect(getPeople(cast.keeper.at(NOW), randomUUID())).rejects.toThrow(NotFoundError)
})

test('a keeper changes what somebody is; the others may not, and a stranger finds nothing', async () => {
  await change(cast.keeper, cast.skater, 'crew')
  expect(await rolesNow()).toEqual({ Keeper: 'keeper', Crew: 'crew', Skater: 'crew' })
  for (const act of [change, takeOffAs] as const) {
    await expect(act(cast.crew, cast.skater, 'keeper')).rejects.toThrow(ForbiddenError)
    await expect(act(cast.crew, cast.crew, 'keeper')).rejects.toThrow(ForbiddenError)
    await expect(act(cast.stranger, cast.skater, 'keeper')).rejects.toThrow(NotFoundError)
    await expect(act(cast.keeper, cast.stranger, 'crew')).rejects.toThrow(NotFoundError)
  }
  expect(await rolesNow()).toEqual({ Keeper: 'keeper', Crew: 'crew', Skater: 'crew' })
})

test('there are three roles and no other', () => {
  const typed = { rinkId: randomUUID(), userId: randomUUID() }
  expect(changeRoleSchema.safeParse({ ...typed, role: 'admin' }).success).toBe(false)
  expect(changeRoleSchema.safeParse({ ...typed, role: '' }).success).toBe(false)
  expect(changeRoleSchema.safeParse({ ...typed, role: 'skater' }).success).toBe(true)
})

test('who is taken off has the rink no more and is told no more; the others stay', async () => {
  await database.db('alert_preferences').insert({ rink_id: cast.rinkId, user_id: cast.crew.userId })
  await takeOffAs(cast.keeper, cast.crew)
  expect(await listMyRinks(cast.crew.at(NOW))).toEqual([])
  await expect(getPeople(cast.crew.at(NOW), cast.rinkId)).rejects.toThrow(NotFoundError)
  expect(await rolesNow()).toEqual({ Keeper: 'keeper', Skater: 'skater' })
  expect(await database.db('alert_preferences').where({ user_id: cast.crew.userId })).toEqual([])
})

describe('somebody always keeps it', () => {
  test('the only keeper neither steps back nor takes themselves off', async () => {
    await expect(change(cast.keeper, cast.keeper, 'crew')).rejects.toThrow('needs a keeper')
    await expect(takeOffAs(cast.keeper, cast.keeper)).rejects.toThrow('needs a keeper')
    expect(await getPeople(cast.keeper.at(NOW), cast.rinkId)).toMatchObject({ isOnlyKeeper: true })
    expect(await rolesNow()).toMatchObject({ Keeper: 'keeper' })
  })

  test('with a second keeper either may step back', async () => {
    await change(cast.keeper, cast.crew, 'keeper')
    expect(await getPeople(cast.keeper.at(NOW), cast.rinkId)).toMatchObject({ isOnlyKeeper: false })
    await change(cast.keeper, cast.keeper, 'skater')
    await expect(change(cast.keeper, cast.skater, 'crew')).rejects.toThrow(ForbiddenError)
    await expect(change(cast.crew, cast.crew, 'crew')).rejects.toThrow('needs a keeper')
  })

  test.each([
    ['step back', () => [change(cast.keeper, cast.keeper, 'crew'), change(cast.crew, cast.crew, 'crew')]],
    ['take each other off', () => [takeOffAs(cast.keeper, cast.crew), takeOffAs(cast.crew, cast.keeper)]],
  ] as const)('of two keepers who %s at once, one does', async (_name, both) => {
    await change(cast.keeper, cast.crew, 'keeper')
    const outcomes = await Promise.allSettled(both())
    expect(outcomes.filter(({ status }) => status === 'fulfilled')).toHaveLength(1)
    expect(await keepers()).toHaveLength(1)
  })
})
