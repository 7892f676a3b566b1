// Forecasts as fetched. They are kept: advice is judged by them later.
import type { Db } from '@/db/knex'
import type { HourlyRecord } from '@/lib/physics/types'

export interface Attribution {
  text: string
  url: string
  licence: string
}

export interface StoredForecast {
  id: string
  provider: string
  issuedAt: Date | null
  fetchedAt: Date
  expiresAt: Date
  hours: HourlyRecord[]
  members: HourlyRecord[][] | null
  attribution: Attribution
}

export interface NewForecast extends Omit<StoredForecast, 'id'> {
  cellId: string
  /** The hour it was fetched in. */
  slotAt: Date
}

const HEAD = {
  id: 'id',
  provider: 'provider',
  issuedAt: 'issued_at',
  fetchedAt: 'fetched_at',
  expiresAt: 'expires_at',
  attribution: 'attribution',
}

/** Stores a forecast once per cell and hour; false when that hour has one already. */
export async function insertForecast(db: Db, forecast: NewForecast): Promise<boolean> {
  const rows = await db('forecasts')
    .insert({
      grid_cell_id: forecast.cellId,
      provider: forecast.provider,
      slot_at: forecast.slotAt,
      issued_at: forecast.issuedAt,
      fetched_at: forecast.fetchedAt,
      expires_at: forecast.expiresAt,
      hours: JSON.stringify(forecast.hours),
      members: forecast.members && JSON.stringify(forecast.members),
      attribution: JSON.stringify(forecast.attribution),
    })
    .onConflict(['grid_cell_id', 'slot_at'])
    .ignore()
    .returning('id')
  return rows.length > 0
}

export async function hasForecast(db: Db, cellId: string, slotAt: Date): Promise<boolean> {
  return (await db('forecasts').where({ grid_cell_id: cellId, slot_at: slotAt }).first('id')) !== undefined
}

/** The newest good forecast of a cell, however old; with `readBy` the newest of that time. */
export async function findNewestForecast(db: Db, cellId: string, readBy?: Date): Promise<StoredForecast | undefined> {
  return db('forecasts')
    .where({ grid_cell_id: cellId })
    .modify((query) => void (readBy && query.where('slot_at', '<=', readBy)))
    .orderBy('slot_at', 'desc')
    .first<StoredForecast | undefined>({ ...HEAD, hours: 'hours', members: 'members' })
}

/** The first forecast that was read at or after an instant. */
export async function findOldestForecastSince(
  db: Db,
  cellId: string,
  since: Date,
): Promise<Pick<StoredForecast, 'id' | 'hours'> | undefined> {
  return db('forecasts')
    .where({ grid_cell_id: cellId })
    .where('slot_at', '>=', since)
    .orderBy('slot_at')
    .first<Pick<StoredForecast, 'id' | 'hours'> | undefined>({ id: 'id', hours: 'hours' })
}

/** Where a forecast came from and how old it is, without its hours. */
export async function findForecastHead(
  db: Db,
  forecastId: string,
): Promise<Omit<StoredForecast, 'hours' | 'members'> | undefined> {
  return db('forecasts').where({ id: forecastId }).first(HEAD)
}
