// Answering an invitation: once, in time, by whoever holds its key, and never by looking at it.
import { randomUUID } from 'node:crypto'
import { beforeEach, describe, expect, test } from 'vitest'
import { insertAccountLink } from '@/db/queries/account-links'
import { listAlertRecipients } from '@/db/queries/alert-preferences'
import { systemRinkAccess } from '@/lib/access/system'
import type { Role } from '@/lib/access/permissions'
import { linkKey } from '@/lib/auth/account-links'
import type { OpenContext } from '@/lib/context'
import { DAY_MILLIS } from '@/lib/physics/constants'
import { signInWithLink } from '@/lib/services/accounts'
import { invite, MOST_PEOPLE, takeInvitationBack } from '@/lib/services/invitations'
import { join, readInvitation } from '@/lib/services/joining'
import { getMyRink } from '@/lib/services/my-rinks'
import { getPeople, takeOff } from '@/lib/services/people'
import { listMyRinks } from '@/lib/services/rinks'
import { addActor, type Actor } from '@/tests/support/cast'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { invitationKey } from '@/tests/support/invited'
import { SETTINGS } from '@/tests/support/night-at-the-rink'

const NOW = new Date('2027-01-12T20:00:00Z')
const TOO_LATE = new Date(NOW.getTime() + 14 * DAY_MILLIS)

const database = givenDatabase()
const cast = givenCast(database, NOW)
let nils: Actor
beforeEach(async () => {
  nils = await addActor(database.db, 'Nils')
})

const open = (now = NOW): OpenContext => ({ db: database.db, now, secret: SETTINGS.secret, ipAddress: undefined })
const viewer = ({ userId }: Actor) => ({ userId, isAdmin: false })
const joinAs = (actor: Actor, key: string, now = NOW) => join(open(now), viewer(actor), key)
const read = (key: string, actor?: Actor, now = NOW) => readInvitation(open(now), actor && viewer(actor), key)
const rinksOf = async (actor: Actor) => (await listMyRinks(actor.at(NOW))).map(({ id, role }) => [id, role])

async function invited(role: Role = 'crew', email = nils.email): Promise<string> {
  await invite(cast.keeper.at(NOW), { rinkId: cast.rinkId, email, role })
  return invitationKey(database.db, email)
}

async function takeBack(): Promise<void> {
  const { invited: standing } = await getPeople(cast.keeper.at(NOW), cast.rinkId)
  await takeInvitationBack(cast.keeper.at(NOW), { rinkId: cast.rinkId, invitationId: standing?.[0]?.id ?? '' })
}

test('looking says who asks to what and which account would join, and changes nothing', async () => {
  const key = await invited()
  const said = { state: 'open', rinkName: 'Birch Lane', inviterName: 'Keeper', role: 'crew', email: nils.email }
  expect(await read(key)).toEqual({ ...said, account: null })
  expect(await read(key, nils)).toEqual({ ...said, account: { name: 'Nils', email: nils.email } })
  expect(await read(key, cast.stranger)).toMatchObject({ account: { email: cast.stranger.email } })
  expect(await rinksOf(nils)).toEqual([])
})

test.each(['keeper', 'crew', 'skater'] as const)('joining as %s puts the rink on one’s list', async (role) => {
  const key = await invited(role)
  expect(await joinAs(nils, key)).toMatchObject({ rinkId: cast.rinkId })
  expect(await rinksOf(nils)).toEqual([[cast.rinkId, role]])
  expect(await getMyRink(nils.at(NOW), cast.rinkId)).toMatchObject({ role })
  expect((await getPeople(cast.keeper.at(NOW), cast.rinkId)).invited).toEqual([])
})

test('who joins is told as any member is who never chose', async () => {
  await joinAs(nils, await invited())
  const recipients = await listAlertRecipients(database.db, systemRinkAccess(cast.rinkId))
  const choice = (actor: Actor) => {
    const found = recipients.find(({ userId }) => userId === actor.userId)
    return found && [found.tellAt, found.wantsEmail, found.wantsPush, found.mutedThroughDate]
  }
  expect(choice(nils)).toEqual(['15:30', true, true, null])
  expect(choice(nils)).toEqual(choice(cast.crew))
  const { rows } = await database.db.raw(`select 1 from graphile_worker.jobs where key = ?`, [
    `decide:${cast.rinkId}:now`,
  ])
  expect(rows).toHaveLength(1)
})

test('an account with another address may join by the link; the invitation is used up then', async () => {
  const key = await invited()
  await joinAs(cast.stranger, key)
  expect(await rinksOf(cast.stranger)).toEqual([[cast.rinkId, 'crew']])
  await expect(joinAs(nils, key)).rejects.toThrow('has been used')
  expect(await read(key, nils)).toMatchObject({ state: 'closed', sentence: expect.stringContaining('used') })
})

test('pressing twice joins once, one after the other and at once', async () => {
  const key = await invited()
  await Promise.all([joinAs(nils, key), joinAs(nils, key)])
  await joinAs(nils, key)
  expect(await rinksOf(nils)).toEqual([[cast.rinkId, 'crew']])
  expect(await read(key, nils)).toMatchObject({ state: 'joined', role: 'crew' })
})

test('of two people who take it at once, one joins', async () => {
  const key = await invited()
  const both = await Promise.allSettled([joinAs(nils, key), joinAs(cast.stranger, key)])
  expect(both.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
  expect(both.find((one) => one.status === 'rejected')?.reason).toMatchObject({ code: 'invalid_input' })
  expect((await getPeople(cast.keeper.at(NOW), cast.rinkId)).people).toHaveLength(4)
})

test('who is on the rink stays as they are, and the invitation stays for whom it is for', async () => {
  const key = await invited('skater')
  await joinAs(cast.keeper, key)
  expect(await read(key, cast.keeper)).toMatchObject({ state: 'joined', role: 'keeper' })
  expect(await read(key, nils)).toMatchObject({ state: 'open' })
  await joinAs(nils, key)
  expect(await rinksOf(nils)).toEqual([[cast.rinkId, 'skater']])
})

describe('one that cannot be taken says why', () => {
  test('run out', async () => {
    const key = await invited()
    expect(await read(key, nils, TOO_LATE)).toMatchObject({ sentence: 'This invitation has run out.' })
    await expect(joinAs(nils, key, TOO_LATE)).rejects.toThrow('run out')
    expect(await rinksOf(nils)).toEqual([])
  })

  test('taken back', async () => {
    const key = await invited()
    await takeBack()
    expect(await read(key)).toEqual({ state: 'closed', sentence: 'This invitation was taken back.' })
    await expect(joinAs(nils, key)).rejects.toThrow('taken back')
  })

  test('forged, of another purpose, or no key at all', async () => {
    const key = await invited()
    const [id = ''] = key.split('.')
    const forged = [
      `${id}.${'A'.repeat(43)}`,
      linkKey(SETTINGS.secret, { id, purpose: 'verify' }),
      linkKey('another secret that this server does not have', { id, purpose: 'invitation' }),
      linkKey(SETTINGS.secret, { id: randomUUID(), purpose: 'invitation' }),
      id,
      '',
    ]
    for (const wrong of forged) {
      expect(await read(wrong, nils)).toMatchObject({ state: 'closed' })
      await expect(joinAs(nils, wrong)).rejects.toMatchObject({ code: 'invalid_input' })
    }
  })

  test('used by somebody who was taken off the rink since', async () => {
    const key = await invited()
    await joinAs(nils, key)
    await takeOff(cast.keeper.at(NOW), { rinkId: cast.rinkId, userId: nils.userId })
    await expect(joinAs(nils, key)).rejects.toThrow('has been used')
    expect(await rinksOf(nils)).toEqual([])
  })

  test('to a full rink, and it is not used up', async () => {
    const [first, second] = [await invited(), await invited('crew', cast.stranger.email)]
    const guests = Array.from({ length: MOST_PEOPLE - 4 }, () => ({
      name: 'Guest',
      email: `${randomUUID()}@a.example`,
    }))
    const users = await database.db('users').insert(guests).returning('id')
    await database
      .db('rink_members')
      .insert(users.map(({ id }) => ({ rink_id: cast.rinkId, user_id: id, role: 'skater' as const })))
    const both = await Promise.allSettled([joinAs(nils, first), joinAs(cast.stranger, second)])
    expect(both.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
    expect(both.find((one) => one.status === 'rejected')?.reason).toMatchObject({
      message: expect.stringContaining('is full'),
    })
    const late = both[0].status === 'rejected' ? nils : cast.stranger
    expect(await read(late === nils ? first : second, late)).toMatchObject({ state: 'open' })
  })
})

describe('at the door', () => {
  const signInAgain = async (actor: Actor, now = NOW) => {
    const { id } = await insertAccountLink(
      database.db,
      { userId: actor.userId, purpose: 'sign-in', expiresAt: new Date(now.getTime() + DAY_MILLIS) },
      now,
    )
    return signInWithLink(open(now), linkKey(SETTINGS.secret, { id, purpose: 'sign-in' }))
  }

  test('who has no rink is led to the invitation that waits for their address, while it stands', async () => {
    expect((await signInAgain(nils)).invitationPath).toBeUndefined()
    const key = await invited()
    expect(await signInAgain(nils)).toMatchObject({ hasRink: false, invitationPath: `/invitation?key=${key}` })
    expect((await signInAgain(cast.stranger)).invitationPath).toBeUndefined()
    expect((await signInAgain(nils, TOO_LATE)).invitationPath).toBeUndefined()
    await takeBack()
    expect((await signInAgain(nils)).invitationPath).toBeUndefined()
  })

  test('who has one goes there', async () => {
    await invited('crew', cast.crew.email)
    expect(await signInAgain(cast.crew)).toMatchObject({ hasRink: true, invitationPath: undefined })
  })
})
