// Unsubscribing by a mail's link, and choosing under Alerts: by the right person, for one rink, as often as one likes.
import { createHash } from 'node:crypto'
import { describe, expect, test } from 'vitest'
import { promiseMessage } from '@/db/queries/messages'
import { putPushSubscription } from '@/db/queries/push-subscriptions'
import { ForbiddenError, InvalidInputError, NotFoundError } from '@/lib/errors'
import { alertPreferencesSchema, muteSchema } from '@/lib/schemas/alerts'
import { chooseAlertPreferences, getAlertSettings, muteAlerts } from '@/lib/services/alert-preferences'
import { getMailChoice, unsubscribeByToken, unsubscribeToken, unsubscribeUrl } from '@/lib/services/unsubscribe'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'

// 2:10 pm in Toronto on 12 January.
const NOW = new Date('2027-01-12T19:10:00Z')
const SECRET = 'a secret that only these tests use, long enough'

const database = givenDatabase()
const cast = givenCast(database, NOW)

const context = () => ({ db: database.db, now: NOW })
const preferences = async (userId: string) =>
  database.db('alert_preferences').where({ rink_id: cast.rinkId, user_id: userId }).first()
const tokenFor = (userId: string) => unsubscribeToken(SECRET, { userId, rinkId: cast.rinkId })

describe('the link in a mail', () => {
  test('switches e-mail about this rink off, and nothing else; again is fine', async () => {
    const token = tokenFor(cast.keeper.userId)
    await Promise.all([unsubscribeByToken(context(), SECRET, token), unsubscribeByToken(context(), SECRET, token)])
    await unsubscribeByToken(context(), SECRET, token)
    expect(await preferences(cast.keeper.userId)).toMatchObject({
      wants_email: false,
      wants_push: true,
      tell_at: '15:30',
    })
    expect(await getMailChoice(context(), SECRET, token)).toEqual({ rinkName: 'Birch Lane', wantsEmail: false })
  })

  test('works for somebody who never chose anything', async () => {
    await unsubscribeByToken(context(), SECRET, tokenFor(cast.crew.userId))
    expect(await preferences(cast.crew.userId)).toMatchObject({ wants_email: false, wants_push: true })
  })

  test('looking at the page behind it changes nothing', async () => {
    expect(await getMailChoice(context(), SECRET, tokenFor(cast.keeper.userId))).toEqual({
      rinkName: 'Birch Lane',
      wantsEmail: true,
    })
    expect(await preferences(cast.keeper.userId)).toMatchObject({ wants_email: true })
  })

  test('for somebody who has left the rink it says so, and stores nothing', async () => {
    await database.db('rink_members').where({ rink_id: cast.rinkId, user_id: cast.crew.userId }).delete()
    await unsubscribeByToken(context(), SECRET, tokenFor(cast.crew.userId))
    expect(await preferences(cast.crew.userId)).toBeUndefined()
    expect(await getMailChoice(context(), SECRET, tokenFor(cast.crew.userId))).toEqual({
      rinkName: null,
      wantsEmail: false,
    })
  })

  test('is refused when forged, cut off, empty or signed with another secret', async () => {
    const token = tokenFor(cast.keeper.userId)
    const [, rinkId, signature] = token.split('.')
    const forged = [
      `${cast.crew.userId}.${rinkId}.${signature}`,
      token.slice(0, -1),
      `${token.slice(0, -1)}${token.endsWith('A') ? 'B' : 'A'}`,
      unsubscribeToken('another secret, of the same length as ours', {
        userId: cast.keeper.userId,
        rinkId: cast.rinkId,
      }),
      '',
      null,
      ['a', 'b'],
      'x'.repeat(100_000),
    ]
    for (const wrong of forged) {
      await expect(unsubscribeByToken(context(), SECRET, wrong)).rejects.toThrow(InvalidInputError)
    }
    expect(await preferences(cast.keeper.userId)).toMatchObject({ wants_email: true })
    expect(await preferences(cast.crew.userId)).toBeUndefined()
  })

  test('the address needs no escaping', () => {
    const url = unsubscribeUrl('https://nightsheet.example', SECRET, {
      userId: cast.keeper.userId,
      rinkId: cast.rinkId,
    })
    expect(new URL(url).searchParams.get('token')).toBe(tokenFor(cast.keeper.userId))
  })
})

describe('choosing under Alerts', () => {
  const choose = (changes: Record<string, string>) =>
    alertPreferencesSchema.parse({ rinkId: cast.rinkId, tellAt: '14:00', ...changes })
  const mute = (changes: Record<string, string>) => muteSchema.parse({ rinkId: cast.rinkId, ...changes })

  test('keeper and crew choose for themselves alone', async () => {
    await chooseAlertPreferences(cast.crew.at(NOW), choose({ wantsPush: 'on' }))
    expect(await preferences(cast.crew.userId)).toMatchObject({
      tell_at: '14:00',
      wants_email: false,
      wants_push: true,
    })
    expect(await preferences(cast.keeper.userId)).toMatchObject({ tell_at: '15:30', wants_email: true })
  })

  test('each sees their own devices and messages, and what failed', async () => {
    const endpoint = 'https://updates.push.services.mozilla.com/wpush/v2/abc'
    const keys = { p256dh: 'p', auth: 'a' }
    await putPushSubscription(database.db, cast.keeper.userId, { endpoint, ...keys }, NOW)
    const night = { rinkId: cast.rinkId, nightDate: '2027-01-12', channel: 'email', kind: 'flood-tonight' } as const
    const sending = { content: {}, sendAt: NOW, expiresAt: new Date('2027-01-13T04:00:00Z') }
    const message = { dedupeKey: `flood-tonight:${cast.rinkId}`, userId: cast.keeper.userId, ...night, ...sending }
    await promiseMessage(database.db, message, NOW)
    const mine = await getAlertSettings(cast.keeper.at(NOW), cast.rinkId)
    expect(mine.tonightDate).toBe('2027-01-12')
    expect(mine.devices).toMatchObject([{ pushHost: 'updates.push.services.mozilla.com', disabledReason: null }])
    // What the browser works out for itself: SHA-256 of the address, in hex.
    expect(mine.devices[0]?.fingerprint).toBe(createHash('sha256').update(endpoint).digest('hex'))
    expect(mine.told).toMatchObject([
      { kind: 'flood-tonight', channel: 'email', nightDate: '2027-01-12', state: 'promised' },
    ])
    expect(await getAlertSettings(cast.crew.at(NOW), cast.rinkId)).toMatchObject({ devices: [], told: [] })
  })

  test('silence: tonight, through a date, and no more; other choices stay', async () => {
    expect(await muteAlerts(cast.keeper.at(NOW), mute({ until: 'tonight' }))).toEqual({
      mutedThroughDate: '2027-01-12',
    })
    await muteAlerts(cast.keeper.at(NOW), mute({ until: 'date', throughDate: '2027-01-17' }))
    expect((await getAlertSettings(cast.keeper.at(NOW), cast.rinkId)).preferences).toEqual({
      tellAt: '15:30',
      wantsEmail: true,
      wantsPush: true,
      mutedThroughDate: '2027-01-17',
    })
    expect(await muteAlerts(cast.keeper.at(NOW), mute({ until: 'never' }))).toEqual({ mutedThroughDate: null })
  })

  test('a night that is over, one years ahead, and no date at all are refused at the date', async () => {
    for (const throughDate of ['2027-01-11', '2030-01-01']) {
      const refusal = muteAlerts(cast.keeper.at(NOW), mute({ until: 'date', throughDate }))
      await expect(refusal).rejects.toMatchObject({
        code: 'invalid_input',
        fields: { throughDate: expect.any(String) },
      })
    }
    expect(muteSchema.safeParse({ rinkId: cast.rinkId, until: 'date' }).error?.issues[0]?.path).toEqual(['throughDate'])
  })

  test('a skater is told nothing, and a stranger cannot see that the rink exists', async () => {
    await expect(getAlertSettings(cast.skater.at(NOW), cast.rinkId)).rejects.toThrow(ForbiddenError)
    await expect(muteAlerts(cast.skater.at(NOW), mute({ until: 'tonight' }))).rejects.toThrow(ForbiddenError)
    await expect(chooseAlertPreferences(cast.skater.at(NOW), choose({}))).rejects.toThrow(ForbiddenError)
    await expect(getAlertSettings(cast.stranger.at(NOW), cast.rinkId)).rejects.toThrow(NotFoundError)
    await expect(muteAlerts(cast.stranger.at(NOW), mute({ until: 'tonight' }))).rejects.toThrow(NotFoundError)
    await expect(chooseAlertPreferences(cast.stranger.at(NOW), choose({}))).rejects.toThrow(NotFoundError)
  })
})
