// What came of each night that was advised.
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import type { LayerReport, SaidNight, SettledNight } from '@/lib/advice/settle-night'
import type { PlannedPass } from '@/lib/advice/types'

export interface NightOutcome extends SettledNight {
  nightDate: string
  said: SaidNight['said']
  startsAt: Date | null
  endsAt: Date | null
  setByAt: Date | null
  agreement: number | null
}

/**
 * Nights that ended an hour ago or more, were judged, and are not settled yet. Local noon ends a night.
 * The planning and closed phases give no advice.
 */
export async function listNightsToSettle(db: Db, now: Date): Promise<{ rinkId: string; nightDate: string }[]> {
  const { rows } = await db.raw<{ rows: { rinkId: string; nightDate: string }[] }>(
    `select distinct o.rink_id as "rinkId", o.night_date as "nightDate"
       from outlooks o join rinks r on r.id = o.rink_id
      where r.phase in ('freezing', 'skating', 'thaw') and o.verdict <> 'unknown'
        and (o.night_date + 1 + time '13:00') at time zone o.time_zone <= :now
        and not exists (select 1 from night_outcomes n where n.rink_id = o.rink_id and n.night_date = o.night_date)`,
    { now },
  )
  return rows
}

export interface SaidVersion {
  id: string
  state: 'open' | 'closed'
  advisedAt: Date
  startsAt: Date | null
  endsAt: Date | null
  setByAt: Date | null
  agreement: number | null
  passes: PlannedPass[]
  modelVersion: string
}

/** Every version of a night's flood window, oldest first. */
export async function listFloodVersions(db: Db, access: RinkAccess, nightDate: string): Promise<SaidVersion[]> {
  return db('advised_windows')
    .where({ rink_id: access.rinkId, night_date: nightDate, kind: 'flood' })
    .orderBy('version')
    .select<SaidVersion[]>({
      id: 'id',
      state: 'state',
      advisedAt: 'advised_at',
      startsAt: 'starts_at',
      endsAt: 'ends_at',
      setByAt: 'set_by_at',
      agreement: 'agreement',
      passes: 'passes',
      modelVersion: 'model_version',
    })
}

/** What people found of the layers poured in a night. */
export async function listLayerReports(db: Db, access: RinkAccess, nightDate: string): Promise<LayerReport[]> {
  const rows = await db('log_entries')
    .where({ rink_id: access.rinkId, night_date: nightDate, kind: 'flood', deleted_at: null })
    .whereNotNull('outcome')
    .orderBy('happened_at')
    .select('happened_at', 'said_set_by_at', 'outcome', 'outcome_at')
  return rows.flatMap(({ happened_at, said_set_by_at, outcome, outcome_at }) =>
    outcome && outcome_at
      ? [
          {
            pouredAt: happened_at.toISOString(),
            saidSetBy: said_set_by_at?.toISOString() ?? null,
            outcome,
            at: outcome_at.toISOString(),
          },
        ]
      : [],
  )
}

/** Settles a night once; a second worker's word changes nothing. @returns true when this call settled it. */
export async function insertNightOutcome(
  db: Db,
  rinkId: string,
  outcome: NightOutcome & { windowId: string | null; modelVersion: string },
  now: Date,
): Promise<boolean> {
  const rows = await db('night_outcomes')
    .insert({
      rink_id: rinkId,
      night_date: outcome.nightDate,
      said: outcome.said,
      window_id: outcome.windowId,
      starts_at: outcome.startsAt,
      ends_at: outcome.endsAt,
      set_by_at: outcome.setByAt,
      agreement: outcome.agreement,
      result: outcome.result,
      source: outcome.source,
      detail: JSON.stringify(outcome.detail),
      model_version: outcome.modelVersion,
      settled_at: now,
    })
    .onConflict(['rink_id', 'night_date'])
    .ignore()
    .returning('night_date')
  return rows.length > 0
}

/** Settled nights from one date to another, newest first. */
export async function listNightOutcomes(
  db: Db,
  access: RinkAccess,
  { from, to }: { from: string; to: string },
): Promise<NightOutcome[]> {
  return db('night_outcomes')
    .where({ rink_id: access.rinkId })
    .whereBetween('night_date', [from, to])
    .orderBy('night_date', 'desc')
    .select<NightOutcome[]>({
      nightDate: 'night_date',
      said: 'said',
      startsAt: 'starts_at',
      endsAt: 'ends_at',
      setByAt: 'set_by_at',
      agreement: 'agreement',
      result: 'result',
      source: 'source',
      detail: 'detail',
    })
}
