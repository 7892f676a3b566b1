// Fills with their hose sessions and looks. Unique indexes decide: one open fill a rink, one running hose a fill.
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'

export interface Fill {
  id: string
  startedAt: Date
  startedBy: string | null
  startedByName: string | null
  targetDepthMm: number
  finishedAt: Date | null
}

export interface FillSession {
  startedAt: Date
  stoppedAt: Date | null
  flowLPerMin: number
}

export interface FillCheck {
  checkedAt: Date
  byId: string | null
  by: string | null
  lowCornerDepthMm: number | null
  note: string
}

const FILL = {
  id: 'f.id',
  startedAt: 'f.started_at',
  startedBy: 'f.started_by',
  startedByName: 'u.name',
  targetDepthMm: 'f.target_depth_mm',
  finishedAt: 'f.finished_at',
}

function fillsOf(db: Db, access: RinkAccess) {
  return db('fills as f').leftJoin('users as u', 'u.id', 'f.started_by').where('f.rink_id', access.rinkId)
}

/** The newest fill, open or finished. */
export async function findNewestFill(db: Db, access: RinkAccess): Promise<Fill | undefined> {
  return fillsOf(db, access).orderBy('f.started_at', 'desc').first<Fill | undefined>(FILL)
}

/** The fill whose water stands on the rink, or is to: the newest that was not given up. */
export async function findStandingFill(db: Db, access: RinkAccess): Promise<Fill | undefined> {
  return fillsOf(db, access).where('f.given_up', false).orderBy('f.started_at', 'desc').first<Fill | undefined>(FILL)
}

/** The open fill, held until the transaction ends: of two changes at once the second sees the first. */
export async function lockOpenFill(trx: Db, access: RinkAccess<'writeLog'>): Promise<Fill | undefined> {
  return fillsOf(trx, access).whereNull('f.finished_at').forUpdate('f').first<Fill | undefined>(FILL)
}

/** @returns the new fill's id; undefined when the rink has an open one. */
export async function insertFill(
  trx: Db,
  access: RinkAccess<'writeLog'>,
  fill: { startedBy: string; targetDepthMm: number },
  now: Date,
): Promise<string | undefined> {
  const [row] = await trx('fills')
    .insert({
      rink_id: access.rinkId,
      started_at: now,
      started_by: fill.startedBy,
      target_depth_mm: fill.targetDepthMm,
    })
    .onConflict(trx.raw('(rink_id) where finished_at is null'))
    .ignore()
    .returning('id')
  return row?.id
}

export async function finishFill(
  trx: Db,
  fillId: string,
  { endedAt, isGivenUp }: { endedAt: Date; isGivenUp: boolean },
): Promise<void> {
  await trx('fills').where({ id: fillId }).update({ finished_at: endedAt, given_up: isGivenUp })
}

/** A fill into which no water ran never was. */
export async function deleteFill(trx: Db, fillId: string): Promise<void> {
  await trx('fills').where({ id: fillId }).delete()
}

export async function listFillSessions(db: Db, fillId: string): Promise<FillSession[]> {
  return db('fill_sessions')
    .where({ fill_id: fillId })
    .orderBy('started_at')
    .select({ startedAt: 'started_at', stoppedAt: 'stopped_at', flowLPerMin: 'flow_l_per_min' })
}

/** @returns false when the hose runs already. */
export async function insertFillSession(trx: Db, fillId: string, flowLPerMin: number, now: Date): Promise<boolean> {
  const rows = await trx('fill_sessions')
    .insert({ fill_id: fillId, started_at: now, flow_l_per_min: flowLPerMin })
    .onConflict(trx.raw('(fill_id) where stopped_at is null'))
    .ignore()
    .returning('id')
  return rows.length > 0
}

/** @returns false when the hose is off already. Two taps in one instant make a session of a second, not none at all. */
export async function stopFillSession(trx: Db, fillId: string, now: Date): Promise<boolean> {
  const result = await trx.raw(
    `update fill_sessions set stopped_at = greatest(:now::timestamptz, started_at + interval '1 second')
      where fill_id = :fillId and stopped_at is null`,
    { fillId, now },
  )
  return result.rowCount === 1
}

export async function insertFillCheck(
  trx: Db,
  fillId: string,
  check: { checkedBy: string; lowCornerDepthMm: number | null; note: string },
  now: Date,
): Promise<void> {
  await trx('fill_checks')
    .insert({
      fill_id: fillId,
      checked_at: now,
      checked_by: check.checkedBy,
      low_corner_depth_mm: check.lowCornerDepthMm,
      note: check.note,
    })
    .onConflict(['fill_id', 'checked_at'])
    .ignore()
}

/** Oldest first. */
export async function listFillChecks(db: Db, fillId: string): Promise<FillCheck[]> {
  return db('fill_checks as c')
    .leftJoin('users as u', 'u.id', 'c.checked_by')
    .where('c.fill_id', fillId)
    .orderBy('c.checked_at')
    .select({
      checkedAt: 'c.checked_at',
      byId: 'c.checked_by',
      by: 'u.name',
      lowCornerDepthMm: 'c.low_corner_depth_mm',
      note: 'c.note',
    })
}

/** Takes back the reminders of a rink's fill that have not gone out: somebody was there, and others take their place. */
export async function dropFillReminders(trx: Db, access: RinkAccess<'writeLog'>): Promise<void> {
  await trx('messages').where({ rink_id: access.rinkId, kind: 'fill-check', state: 'promised' }).delete()
}
