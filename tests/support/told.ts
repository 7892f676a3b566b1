// What a rink's people were promised to be told, and a device to be told on.
import type { Cast } from './cast'
import type { TestDatabase } from './test-database'

export function listMessages({ db }: TestDatabase, { rinkId }: Cast) {
  return db('messages').where({ rink_id: rinkId }).orderBy(['created_at', 'dedupe_key']).select()
}

/** "fill-ahead 2027-01-16 email keeper": kind, the day to fill where there is one, channel, and who. */
export async function listTold(database: TestDatabase, cast: Cast): Promise<string[]> {
  const names = new Map([
    [cast.keeper.userId, 'keeper'],
    [cast.crew.userId, 'crew'],
  ])
  const rows = await listMessages(database, cast)
  return rows
    .map(({ kind, channel, user_id, content }) => {
      const { fillDate } = content as { fillDate?: string }
      return [kind, fillDate, channel, names.get(user_id) ?? 'somebody'].filter(Boolean).join(' ')
    })
    .sort()
}

export async function addDevice({ db }: TestDatabase, { keeper, rinkId }: Cast): Promise<void> {
  const device = { user_id: keeper.userId, endpoint: `https://push.example/${rinkId}`, p256dh: 'key', auth: 'auth' }
  await db('push_subscriptions').insert(device)
}
