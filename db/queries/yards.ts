// What the log tells of a yard, and what was learned from it.
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import type { LearnedYard, YardReport } from '@/lib/advice/yard/types'

/** An entry that says something of the yard and is not kept as a report yet. */
export interface TellingEntry {
  id: string
  version: number
  kind: 'flood' | 'reading'
  happenedAt: Date
  outcome: 'set' | 'wet' | 'spoiled' | null
  outcomeAt: Date | null
  updatedAt: Date
  thicknessMm: number | null
}

/** Floods that somebody answered for, and drilled thicknesses, newer than `since` and new or changed since they were kept. */
export async function listTellingEntries(db: Db, access: RinkAccess, since: Date): Promise<TellingEntry[]> {
  return db('log_entries as e')
    .leftJoin('yard_reports as y', (join) => join.on('y.entry_id', 'e.id').andOn('y.entry_version', 'e.version'))
    .where({ 'e.rink_id': access.rinkId, 'e.deleted_at': null })
    .where('e.happened_at', '>=', since)
    .whereNull('y.entry_id')
    .whereRaw(`(e.kind = 'reading' or (e.kind = 'flood' and e.outcome in ('set', 'wet')))`)
    .orderBy('e.happened_at')
    .select<TellingEntry[]>({
      id: 'e.id',
      version: 'e.version',
      kind: 'e.kind',
      happenedAt: 'e.happened_at',
      outcome: 'e.outcome',
      outcomeAt: 'e.outcome_at',
      updatedAt: 'e.updated_at',
      thicknessMm: 'e.thickness_mm',
    })
}

export async function putYardReport(
  db: Db,
  rinkId: string,
  entry: { id: string; version: number; happenedAt: Date },
  report: YardReport,
): Promise<void> {
  const row = { entry_version: entry.version, happened_at: entry.happenedAt, report: JSON.stringify(report) }
  await db('yard_reports')
    .insert({ entry_id: entry.id, rink_id: rinkId, ...row })
    .onConflict('entry_id')
    .merge(row)
}

/** Reports whose entry still stands as it was kept. */
export async function listYardReports(db: Db, access: RinkAccess, since: Date): Promise<YardReport[]> {
  const rows = await db('yard_reports as y')
    .join('log_entries as e', (join) => join.on('e.id', 'y.entry_id').andOn('e.version', 'y.entry_version'))
    .where({ 'y.rink_id': access.rinkId, 'e.deleted_at': null })
    .where('y.happened_at', '>=', since)
    .orderBy('y.happened_at')
    .select('y.report')
  return rows.map(({ report }) => report as YardReport)
}

export interface YardEstimate {
  estimatedAt: Date
  modelVersion: string
  learned: LearnedYard
}

export async function findYardEstimate(db: Db, rinkId: string): Promise<YardEstimate | undefined> {
  const row = await db('yard_estimates').where({ rink_id: rinkId }).first('estimated_at', 'model_version', 'detail')
  if (!row) return undefined
  return { estimatedAt: row.estimated_at, modelVersion: row.model_version, learned: row.detail as LearnedYard }
}

export async function putYardEstimate(db: Db, rinkId: string, estimate: YardEstimate): Promise<void> {
  const { learned, estimatedAt, modelVersion } = estimate
  const row = {
    estimated_at: estimatedAt,
    model_version: modelVersion,
    is_learned: learned.isLearned,
    shelter: learned.shelter,
    sky_view: learned.skyView,
    reports: learned.reportsUsed,
    detail: JSON.stringify(learned),
  }
  await db('yard_estimates')
    .insert({ rink_id: rinkId, ...row })
    .onConflict('rink_id')
    .merge(row)
}
