// What was advised for a night, version by version.
import type { Db } from '@/db/knex'
import type { PlannedPass, Reason } from '@/lib/advice/types'

interface AdvisedBase {
  id: string
  version: number
}

export interface OpenWindow extends AdvisedBase {
  state: 'open'
  startsAt: Date
  endsAt: Date
  latestStartAt: Date
  setByAt: Date
  score: number
  agreement: number
  runs: number
  passes: PlannedPass[]
}

export interface ClosedWindow extends AdvisedBase {
  state: 'closed'
  closedReason: Reason | null
}

export type AdvisedWindow = OpenWindow | ClosedWindow

export type WindowContent = Omit<OpenWindow, 'id' | 'version'> | Omit<ClosedWindow, 'id' | 'version'>

export interface WindowKey {
  rinkId: string
  nightDate: string
  kind: 'fill' | 'flood'
}

const where = ({ rinkId, nightDate, kind }: WindowKey) => ({ rink_id: rinkId, night_date: nightDate, kind })

/** The version that stands for a night. */
export async function findAdvisedWindow(db: Db, key: WindowKey): Promise<AdvisedWindow | undefined> {
  return db('advised_windows').where(where(key)).orderBy('version', 'desc').first<AdvisedWindow | undefined>({
    id: 'id',
    version: 'version',
    state: 'state',
    startsAt: 'starts_at',
    endsAt: 'ends_at',
    latestStartAt: 'latest_start_at',
    setByAt: 'set_by_at',
    score: 'score',
    agreement: 'agreement',
    runs: 'runs',
    passes: 'passes',
    closedReason: 'closed_reason',
  })
}

/** Adds the next version. The unique key on (rink, night, kind, version) refuses a second writer. */
export async function insertAdvisedWindow(
  trx: Db,
  key: WindowKey,
  version: number,
  content: WindowContent,
  origin: { outlookId: string; forecastId: string; modelVersion: string; timeZone: string; now: Date },
): Promise<AdvisedWindow> {
  const times =
    content.state === 'open'
      ? {
          starts_at: content.startsAt,
          ends_at: content.endsAt,
          latest_start_at: content.latestStartAt,
          set_by_at: content.setByAt,
          score: content.score,
          agreement: content.agreement,
          runs: content.runs,
          passes: JSON.stringify(content.passes),
        }
      : { closed_reason: content.closedReason && JSON.stringify(content.closedReason) }
  const [row] = await trx('advised_windows')
    .insert({
      ...where(key),
      version,
      state: content.state,
      time_zone: origin.timeZone,
      outlook_id: origin.outlookId,
      forecast_id: origin.forecastId,
      model_version: origin.modelVersion,
      advised_at: origin.now,
      ...times,
    })
    .returning('id')
  return { ...content, id: row?.id ?? '', version }
}
