// What the log says of the sheet, and what the model had for it: the two sides of a reading.
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import type { SheetReport } from '@/lib/advice/types'
import { HOUR_MILLIS } from '@/lib/physics/constants'

export interface HourOfSheet {
  judgedAt: Date
  /** At the end of the hour. */
  sheet: SheetReport
  /** When a layer poured at the start of the hour is solid. */
  setsAt: Date | null
  startsAt: Date
}

/** The hour of the newest outlook that an instant lies in. */
export async function findHourOfSheet(db: Db, access: RinkAccess, at: Date): Promise<HourOfSheet | undefined> {
  const startsAt = new Date(Math.floor(at.getTime() / HOUR_MILLIS) * HOUR_MILLIS)
  const newest = db('outlooks').where({ rink_id: access.rinkId }).orderBy('judged_at', 'desc').limit(1).select('id')
  return db('scored_hours as h')
    .join('outlooks as o', 'o.id', 'h.outlook_id')
    .where('h.starts_at', startsAt)
    .whereIn('h.outlook_id', newest)
    .first<HourOfSheet | undefined>(
      'o.judged_at as judgedAt',
      'h.sets_at as setsAt',
      'h.starts_at as startsAt',
      db.raw(`h.detail->'sheet' as sheet`),
    )
}

/** The newest reading in a span that was written or changed since an instant. */
export async function findReadingSince(
  db: Db,
  access: RinkAccess,
  { from, to, writtenSince }: { from: Date; to: Date; writtenSince: Date },
): Promise<number | undefined> {
  const row = await db('log_entries')
    .where({ rink_id: access.rinkId, kind: 'reading', deleted_at: null })
    .whereBetween('happened_at', [from, to])
    .where('updated_at', '>=', writtenSince)
    .orderBy('happened_at', 'desc')
    .first<{ thicknessMm: number } | undefined>({ thicknessMm: 'thickness_mm' })
  return row?.thicknessMm
}

/** The newest sheet on record in a span. */
export async function findSheetBetween(
  db: Db,
  access: RinkAccess,
  { from, to }: { from: Date; to: Date },
): Promise<Pick<SheetReport, 'thicknessMm' | 'temperatureC' | 'snowCoverCm'> | undefined> {
  return db('sheet_states')
    .where({ rink_id: access.rinkId })
    .where('as_of', '>=', from)
    .where('as_of', '<', to)
    .orderBy('as_of', 'desc')
    .first({ thicknessMm: 'thickness_mm', temperatureC: 'temperature_c', snowCoverCm: 'snow_cover_cm' })
}

/** What was written of the sheet at one instant. */
export async function listSheetEntriesAt(
  db: Db,
  access: RinkAccess,
  at: Date,
): Promise<{ kind: string; thicknessMm: number | null }[]> {
  return db('log_entries')
    .where({ rink_id: access.rinkId, happened_at: at, deleted_at: null })
    .whereIn('kind', ['reading', 'clear', 'scrape'])
    .orderBy('created_at')
    .select({ kind: 'kind', thicknessMm: 'thickness_mm' })
}

/** Instants at which somebody cleared or scraped, after one and up to another, before anybody measured again. */
export async function listSweptBetween(
  db: Db,
  access: RinkAccess,
  { after, to }: { after: Date; to: Date },
): Promise<Date[]> {
  const { rows } = await db.raw<{ rows: { at: Date }[] }>(
    `select distinct happened_at as at from log_entries
      where rink_id = :rinkId and kind in ('clear', 'scrape') and deleted_at is null
        and happened_at > :after and happened_at <= :to
        and happened_at < coalesce((select min(happened_at) from log_entries
              where rink_id = :rinkId and kind = 'reading' and deleted_at is null and happened_at > :after), 'infinity')
      order by at`,
    { rinkId: access.rinkId, after, to },
  )
  return rows.map(({ at }) => at)
}

/** Takes back what was reported for an instant. */
export async function deleteReportedSheet(trx: Db, access: RinkAccess<'writeLog'>, at: Date): Promise<void> {
  await trx('sheet_states').where({ rink_id: access.rinkId, as_of: at, origin: 'reported' }).delete()
}

/** Forgets where the model carried the sheet from an instant on, because it started from what is no longer so. */
export async function deleteModelledSheetsFrom(trx: Db, access: RinkAccess<'writeLog'>, at: Date): Promise<void> {
  await trx('sheet_states').where({ rink_id: access.rinkId, origin: 'modelled' }).where('as_of', '>=', at).delete()
}
