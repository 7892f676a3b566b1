// Reading the weather for a grid cell: one request however many rinks share it.
import { findCell, listCellsDue, listRinksOfCell, noteCellRead, noteCellTrouble } from '@/db/queries/cell-reads'
import { hasForecast, insertForecast } from '@/db/queries/forecasts'
import { enqueuePull, enqueueRefresh } from '@/db/queries/jobs'
import { startRun } from '@/db/queries/job-runs'
import type { Db } from '@/db/knex'
import { logEvent, logFailure } from '@/lib/log'
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { WeatherError, type Forecast, type WeatherProvider } from '@/lib/weather/port'

/** After the adapter's own tries have failed; a wrong setting is looked at again by the next sweep. */
const RETRY_MINUTES = { transient: 5, malformed: 5, throttled: 10, coverage: 360, refused: 60 } as const

/** The hour an instant lies in, as forecasts and judgements are filed. */
export function slotOf(now: Date): Date {
  return new Date(Math.floor(now.getTime() / HOUR_MILLIS) * HOUR_MILLIS)
}

/**
 * Starts the hourly round: every cell in season gets a pull. Once per hour, whichever worker asks first.
 * @returns how many cells were asked for, or null when this hour's round was started before.
 */
export async function startSweep(db: Db, slotAt: Date, now: Date): Promise<number | null> {
  return db.transaction(async (trx) => {
    if (!(await startRun(trx, { job: 'sweep', key: slotAt.toISOString() }, now))) return null
    const cells = await listCellsDue(trx, now)
    for (const cellId of cells) await enqueuePull(trx, cellId)
    return cells.length
  })
}

/**
 * Reads and stores this hour's forecast for a cell and asks for judgements of its rinks. Repeating it changes nothing.
 * When the service fails, the last good forecast stands, the rinks are judged with it, and another try is promised.
 */
export async function pullForecast(
  { db, now, provider }: { db: Db; now: Date; provider: WeatherProvider },
  cellId: string,
): Promise<void> {
  const cell = await findCell(db, cellId)
  if (!cell) return
  const slotAt = slotOf(now)
  const read = (await hasForecast(db, cellId, slotAt)) ? null : await readForecast(provider, cell, now)
  await db.transaction(async (trx) => {
    if (read && 'hours' in read) {
      await insertForecast(trx, { cellId, slotAt, ...read })
      await noteCellRead(trx, cellId, now)
    } else if (read) {
      const retryAt = read.retryAt ?? new Date(now.getTime() + RETRY_MINUTES[read.kind] * MINUTE_MILLIS)
      await noteCellTrouble(trx, cellId, { error: `${read.kind}: ${read.message}`, retryAt }, now)
      await enqueuePull(trx, cellId, retryAt)
    }
    for (const rinkId of await listRinksOfCell(trx, cellId)) await enqueueRefresh(trx, rinkId)
  })
  if (read && 'hours' in read)
    logEvent('forecast.stored', { cellId, provider: read.provider, hours: read.hours.length })
}

/** The forecast, or what went wrong; anything that is not the service's doing is thrown. */
async function readForecast(
  provider: WeatherProvider,
  cell: { id: string; latitudeDeg: number; longitudeDeg: number },
  now: Date,
): Promise<Forecast | WeatherError> {
  try {
    return await provider.fetchHourly({ latitudeDeg: cell.latitudeDeg, longitudeDeg: cell.longitudeDeg }, { now })
  } catch (error) {
    if (!(error instanceof WeatherError)) throw error
    logFailure('forecast.failed', error, { cellId: cell.id, provider: provider.id, kind: error.kind })
    return error
  }
}
