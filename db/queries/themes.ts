// The theme that a person chose, with where one of their rinks lies: "after sunset" is told by its sky.
import type { Db } from '@/db/knex'
import type { UserRow } from '@/db/types'

export interface ThemeFacts {
  theme: UserRow['theme']
  /** Null for people without a rink. */
  latitudeDeg: number | null
  longitudeDeg: number | null
}

/** @param rinkId The rink on screen, which comes first if the person is on it; then rinks in season. */
export async function findThemeFacts(db: Db, userId: string, rinkId: string | null): Promise<ThemeFacts | undefined> {
  const { rows } = await db.raw<{ rows: ThemeFacts[] }>(
    `select u.theme, r.latitude_deg as "latitudeDeg", r.longitude_deg as "longitudeDeg"
       from users u
       left join lateral (
         select k.latitude_deg, k.longitude_deg
           from rink_members m join rinks k on k.id = m.rink_id
          where m.user_id = u.id
          order by (k.id = :rinkId::uuid) desc nulls last, k.phase in ('planning', 'closed'), k.name, k.id
          limit 1) r on true
      where u.id = :userId`,
    { userId, rinkId },
  )
  return rows[0]
}
