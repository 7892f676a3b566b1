// Inviting somebody: who may, what is mailed and to whom, again and back, limits, and what goes with whom.
import { randomUUID } from 'node:crypto'
import { describe, expect, test } from 'vitest'
import { findMessageToDeliver } from '@/db/queries/deliveries'
import { pruneExpired } from '@/db/queries/prune'
import { ForbiddenError, NotFoundError } from '@/lib/errors'
import { DeliveryError } from '@/lib/messaging/port'
import type { Role } from '@/lib/access/permissions'
import { DAY_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { inviteSchema } from '@/lib/schemas/people'
import { exportAccount } from '@/lib/services/account-export'
import { deliverMessage } from '@/lib/services/deliveries'
import {
  invite,
  MOST_INVITATIONS,
  MOST_PEOPLE,
  sendInvitationAgain,
  takeInvitationBack,
} from '@/lib/services/invitations'
import { changeRole, getPeople } from '@/lib/services/people'
import { deleteRink, leaveRink } from '@/lib/services/rink-end'
import { createCast, type Actor } from '@/tests/support/cast'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { invitationKey, invitationMailTo, invitationTo } from '@/tests/support/invited'
import { SETTINGS } from '@/tests/support/night-at-the-rink'

const NOW = new Date('2027-01-12T20:00:00Z')
const minutesLater = (minutes: number) => new Date(NOW.getTime() + minutes * MINUTE_MILLIS)
const daysLater = (days: number) => new Date(NOW.getTime() + days * DAY_MILLIS)

const database = givenDatabase()
const cast = givenCast(database, NOW)

const newAddress = () => `nils-${randomUUID()}@nightsheet.example`
const asking = (email: string, role: Role = 'crew') => inviteSchema.parse({ rinkId: cast.rinkId, email, role })
const inviteAs = (actor: Actor, email: string, role?: Role, now = NOW) => invite(actor.at(now), asking(email, role))
const invitedAt = async (now = NOW, actor = cast.keeper) => (await getPeople(actor.at(now), cast.rinkId)).invited ?? []
const onlyInvitation = async () => ({ rinkId: cast.rinkId, invitationId: (await invitedAt())[0]?.id ?? '' })
const makeKeeper = (actor: Actor) =>
  changeRole(cast.keeper.at(NOW), { rinkId: cast.rinkId, userId: actor.userId, role: 'keeper' })

test('a keeper asks an address in, as sign-up would write it, and sees whom they wait for', async () => {
  const email = newAddress()
  await inviteAs(cast.keeper, ` ${email.toUpperCase()} `, 'skater')
  expect(await invitedAt()).toMatchObject([
    { email, role: 'skater', expiresAt: daysLater(14), hasRunOut: false, hasFailed: false },
  ])
})

test('only a keeper may; crew and skaters see no addresses, a stranger finds no rink', async () => {
  await inviteAs(cast.keeper, newAddress())
  const one = await onlyInvitation()
  const acts = [
    (actor: Actor) => inviteAs(actor, newAddress()),
    (actor: Actor) => sendInvitationAgain(actor.at(NOW), one),
    (actor: Actor) => takeInvitationBack(actor.at(NOW), one),
  ]
  for (const act of acts) {
    await expect(act(cast.crew)).rejects.toThrow(ForbiddenError)
    await expect(act(cast.skater)).rejects.toThrow(ForbiddenError)
    await expect(act(cast.stranger)).rejects.toThrow(NotFoundError)
  }
  expect(await getPeople(cast.crew.at(NOW), cast.rinkId)).toMatchObject({ invited: null })
  expect(await getPeople(cast.skater.at(NOW), cast.rinkId)).toMatchObject({ invited: null })
  await expect(getPeople(cast.stranger.at(NOW), cast.rinkId)).rejects.toThrow(NotFoundError)
  expect(await invitedAt()).toHaveLength(1)
})

test('an invitation of another rink cannot be touched from here', async () => {
  const elsewhere = await createCast(database.db, NOW)
  await invite(elsewhere.keeper.at(NOW), { ...asking(newAddress()), rinkId: elsewhere.rinkId })
  const { invited } = await getPeople(elsewhere.keeper.at(NOW), elsewhere.rinkId)
  const theirs = { rinkId: cast.rinkId, invitationId: invited?.[0]?.id ?? '' }
  await expect(takeInvitationBack(cast.keeper.at(NOW), theirs)).rejects.toThrow(NotFoundError)
  await expect(sendInvitationAgain(cast.keeper.at(NOW), theirs)).rejects.toThrow(NotFoundError)
})

test('an address is answered alike whether or not it has an account', async () => {
  await inviteAs(cast.keeper, newAddress())
  await inviteAs(cast.keeper, cast.stranger.email)
  await inviteAs(cast.keeper, cast.crew.email)
  expect((await invitedAt()).map(({ email }) => email)).toContain(cast.stranger.email)
  expect(await invitedAt()).toHaveLength(3)
})

test('one’s own address and one that is invited already are refused at the field', async () => {
  const email = newAddress()
  await inviteAs(cast.keeper, email)
  for (const again of [email, cast.keeper.email]) {
    await expect(inviteAs(cast.keeper, again)).rejects.toMatchObject({ fields: { email: expect.any(String) } })
  }
  await inviteAs(cast.keeper, email, 'keeper', daysLater(14.1))
  expect(await invitedAt(daysLater(14.1))).toMatchObject([{ email, role: 'keeper', hasRunOut: false }])
})

describe('the mail', () => {
  test('goes to the address that was typed, says who asks to what and as what, and carries the way in', async () => {
    const email = newAddress()
    await inviteAs(cast.keeper, email)
    const mail = await invitationMailTo(database.db, email)
    expect(mail).toMatchObject({ to: email, subject: 'Keeper invites you to Birch Lane' })
    for (const part of ['as crew', '14 days', `${SETTINGS.publicUrl}/invitation?key=`])
      expect(mail.text).toContain(part)
    expect(mail.text + mail.html).not.toContain(cast.keeper.email)
    const { rows } = await database.db.raw(`select payload from graphile_worker._private_jobs where key = ?`, [
      `message:${(await invitationTo(database.db, email))?.id}`,
    ])
    expect(rows).toHaveLength(1)
  })

  test('keeps its secret out of the database', async () => {
    const email = newAddress()
    await inviteAs(cast.keeper, email)
    const [, proof = ''] = (await invitationKey(database.db, email)).split('.')
    const rows = [await database.db('messages').select(), await database.db('invitations').select()]
    expect(proof).toHaveLength(43)
    expect(JSON.stringify(rows)).not.toContain(proof)
  })

  test('carries no link and no line of its own from a name', async () => {
    const email = newAddress()
    await database
      .db('users')
      .where({ id: cast.keeper.userId })
      .update({ name: 'win https://evil.example/now or x@evil.example' })
    await inviteAs(cast.keeper, email)
    const { subject, text, html } = await invitationMailTo(database.db, email)
    expect(subject + text + html).not.toMatch(/evil\.example|x@evil/)
    expect(subject).not.toMatch(/[\r\n]/)
  })

  test('goes whatever the keeper chose for alerts, and not once the invitation stands no more', async () => {
    const email = newAddress()
    await database.db('alert_preferences').where({ user_id: cast.keeper.userId }).update({ wants_email: false })
    await inviteAs(cast.keeper, email)
    expect(await invitationTo(database.db, email)).toMatchObject({ email, isUnwanted: false })
    await takeInvitationBack(cast.keeper.at(NOW), await onlyInvitation())
    expect(await invitationTo(database.db, email)).toMatchObject({ isUnwanted: true })
  })

  test('never goes to the keeper when the rink and its invitations are gone', async () => {
    const email = newAddress()
    await inviteAs(cast.keeper, email)
    const { id = '' } = (await invitationTo(database.db, email)) ?? {}
    await deleteRink(cast.keeper.at(NOW), { rinkId: cast.rinkId, name: 'Birch Lane' })
    expect(await findMessageToDeliver(database.db, id)).toMatchObject({ isUnwanted: true })
  })

  test('that is refused for good says so on the page, and leaves the keeper’s own mailbox in use', async () => {
    const email = newAddress()
    await inviteAs(cast.keeper, email)
    const { id = '' } = (await invitationTo(database.db, email)) ?? {}
    const refused = () => Promise.reject(new DeliveryError('no such mailbox', true))
    await deliverMessage(
      { db: database.db, readClock: () => NOW, email: { send: refused }, push: { send: refused }, settings: SETTINGS },
      id,
    )
    expect(await invitedAt()).toMatchObject([{ email, hasFailed: true }])
    const keeper = await database.db('users').where({ id: cast.keeper.userId }).first('email_refused_at')
    expect(keeper?.email_refused_at).toBeNull()
  })
})

test('sent again, it is the same link in a new mail, and its days start anew', async () => {
  const email = newAddress()
  await inviteAs(cast.keeper, email)
  const first = await invitationTo(database.db, email)
  const key = await invitationKey(database.db, email)
  await sendInvitationAgain(cast.keeper.at(daysLater(20)), await onlyInvitation())
  const second = await invitationTo(database.db, email)
  expect(second?.id).not.toBe(first?.id)
  expect(await invitationKey(database.db, email)).toBe(key)
  expect(await invitedAt(daysLater(20))).toMatchObject([{ expiresAt: daysLater(34), hasRunOut: false }])
})

test('taken back, it is off the list and cannot be sent again', async () => {
  await inviteAs(cast.keeper, newAddress())
  const one = await onlyInvitation()
  await takeInvitationBack(cast.keeper.at(NOW), one)
  expect(await invitedAt()).toEqual([])
  await expect(takeInvitationBack(cast.keeper.at(NOW), one)).rejects.toThrow(NotFoundError)
  await expect(sendInvitationAgain(cast.keeper.at(NOW), one)).rejects.toThrow(NotFoundError)
})

describe('limits', () => {
  test('an address is not bombed, whichever rink asks', async () => {
    const email = newAddress()
    await inviteAs(cast.keeper, email)
    const one = await onlyInvitation()
    for (let sent = 1; sent < 6; sent++) await sendInvitationAgain(cast.keeper.at(minutesLater(sent)), one)
    await expect(sendInvitationAgain(cast.keeper.at(minutesLater(6)), one)).rejects.toMatchObject({
      code: 'rate_limited',
      message: expect.stringContaining('hours'),
    })
    const mails = await database.db('messages').where({ kind: 'rink-invitation', user_id: cast.keeper.userId })
    expect(mails).toHaveLength(6)
  })

  test('a rink sends so many a day', async () => {
    await makeKeeper(cast.crew)
    for (let sent = 0; sent < 40; sent++) {
      await inviteAs(sent % 2 ? cast.keeper : cast.crew, newAddress())
      await takeInvitationBack(cast.keeper.at(NOW), await onlyInvitation())
    }
    for (const actor of [cast.keeper, cast.crew]) {
      await expect(inviteAs(actor, newAddress())).rejects.toMatchObject({ code: 'rate_limited' })
    }
    await inviteAs(cast.keeper, newAddress(), 'crew', daysLater(1))
  })

  test('so many invitations wait, and so many people fit, with a sentence', async () => {
    for (let sent = 0; sent < MOST_INVITATIONS; sent++) await inviteAs(cast.keeper, newAddress())
    await expect(inviteAs(cast.keeper, newAddress())).rejects.toThrow(`${MOST_INVITATIONS} invitations`)
    await database.db('invitations').where({ rink_id: cast.rinkId }).delete()
    await fillTo(MOST_PEOPLE)
    await expect(inviteAs(cast.keeper, newAddress())).rejects.toThrow(`${MOST_PEOPLE} people`)
  })

  async function fillTo(people: number): Promise<void> {
    const rows = Array.from({ length: people - 3 }, () => ({ name: 'Guest', email: newAddress() }))
    const users = await database.db('users').insert(rows).returning('id')
    await database
      .db('rink_members')
      .insert(users.map(({ id }) => ({ rink_id: cast.rinkId, user_id: id, role: 'skater' as const })))
  }

  test('of two who invite the same address at once, one does', async () => {
    const email = newAddress()
    const both = await Promise.allSettled([inviteAs(cast.keeper, email), inviteAs(cast.keeper, email)])
    expect(both.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
    expect(await invitedAt()).toHaveLength(1)
  })
})

describe('what goes with whom', () => {
  test('a keeper who leaves or steps back has no invitations out', async () => {
    await makeKeeper(cast.crew)
    await makeKeeper(cast.skater)
    await inviteAs(cast.crew, newAddress())
    await inviteAs(cast.skater, newAddress())
    const stays = newAddress()
    await inviteAs(cast.keeper, stays)
    await leaveRink(cast.crew.at(NOW), cast.rinkId)
    await changeRole(cast.keeper.at(NOW), { rinkId: cast.rinkId, userId: cast.skater.userId, role: 'crew' })
    expect((await invitedAt()).map(({ email }) => email)).toEqual([stays])
  })

  test('an account takes its invitations along, in its file and at its end', async () => {
    const email = newAddress()
    await makeKeeper(cast.crew)
    await inviteAs(cast.crew, email)
    expect(await exportAccount(cast.crew.at(NOW))).toMatchObject({
      invitations: [{ rink: 'Birch Lane', email, role: 'crew', taken_at: null }],
    })
    expect(await exportAccount(cast.keeper.at(NOW))).toMatchObject({ invitations: [] })
    await database.db('users').where({ id: cast.crew.userId }).update({ deletion_due_at: NOW })
    await pruneExpired(database.db, daysLater(1))
    expect(await database.db('invitations').where({ rink_id: cast.rinkId })).toEqual([])
  })

  test('what ran out is kept for two weeks more', async () => {
    await inviteAs(cast.keeper, newAddress())
    await pruneExpired(database.db, daysLater(27))
    expect(await invitedAt(daysLater(27))).toMatchObject([{ hasRunOut: true }])
    await pruneExpired(database.db, daysLater(29))
    expect(await invitedAt(daysLater(29))).toEqual([])
  })
})
