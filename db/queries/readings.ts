// Drilled holes, as the log has them.
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'

export interface Reading {
  at: Date
  thicknessMm: number
  by: string | null
}

/** The newest reading after an instant. */
export async function findNewestReading(db: Db, access: RinkAccess, after: Date): Promise<Reading | undefined> {
  return db('log_entries as e')
    .leftJoin('users as u', 'u.id', 'e.written_by')
    .where({ 'e.rink_id': access.rinkId, 'e.kind': 'reading', 'e.deleted_at': null })
    .where('e.happened_at', '>=', after)
    .orderBy([
      { column: 'e.happened_at', order: 'desc' },
      { column: 'e.created_at', order: 'desc' },
    ])
    .first<Reading | undefined>({ at: 'e.happened_at', thicknessMm: 'e.thickness_mm', by: 'u.name' })
}
