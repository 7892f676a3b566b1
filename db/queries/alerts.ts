// What people heard of a night.
import type { Db } from '@/db/knex'
import type { AlertKind } from '@/lib/advice/alert-due'

export interface ToldAlert {
  userId: string
  channel: 'email' | 'push'
  kind: AlertKind
  version: number
}

/** Alerts promised for a night, newest window version first. */
export async function listToldAlerts(
  db: Db,
  { rinkId, nightDate }: { rinkId: string; nightDate: string },
): Promise<ToldAlert[]> {
  return (
    db('messages as m')
      .join('advised_windows as w', 'w.id', 'm.window_id')
      .where({ 'm.rink_id': rinkId, 'm.night_date': nightDate })
      // What never arrived was not told.
      .whereIn('m.state', ['promised', 'delivered'])
      .distinct<ToldAlert[]>({ userId: 'm.user_id', channel: 'm.channel', kind: 'm.kind', version: 'w.version' })
      .orderBy('version', 'desc')
  )
}
