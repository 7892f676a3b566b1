// Reading the weather: one request per cell and hour, the last good forecast kept, another try promised.
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest'
import { findNewestForecast } from '@/db/queries/forecasts'
import { startWeatherFake, type WeatherFake } from '@/fakes/weather/server'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { pullForecast, slotOf, startSweep } from '@/lib/services/forecasts'
import { createOpenMeteo } from '@/lib/weather/open-meteo'
import type { WeatherProvider } from '@/lib/weather/port'
import { rinkForm } from '@/tests/support/cast'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { setUpRinkSchema } from '@/lib/schemas/rinks'
import { setUpRink } from '@/lib/services/rinks'

// The fake tells the weather of the present, so these tests run on the present.
const NOW = new Date()
const NEXT_HOUR = new Date(NOW.getTime() + HOUR_MILLIS)

const database = givenDatabase()
const cast = givenCast(database, NOW)
let weather: WeatherFake
let provider: WeatherProvider

beforeAll(async () => {
  weather = await startWeatherFake({ port: 0 })
  provider = createOpenMeteo({ baseUrl: weather.url, userAgent: 'Nightsheet tests', retryDelayMs: 1 })
})
afterAll(() => weather.close())
beforeEach(async () => {
  await fetch(`${weather.url}/__fake/requests`, { method: 'DELETE' })
  await fetch(`${weather.url}/__fake/fault`, { method: 'DELETE' })
})

const pull = (now: Date) => pullForecast({ db: database.db, now, provider }, cast.cellId)
const setFault = (kind: string) =>
  fetch(`${weather.url}/__fake/fault`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ kind }),
  })
const forecastsOfCell = () => database.db('forecasts').where({ grid_cell_id: cast.cellId })

async function requestsSeen(): Promise<number> {
  const { requests } = (await (await fetch(`${weather.url}/__fake/requests`)).json()) as { requests: unknown[] }
  return requests.length
}

async function jobs(keyLike: string): Promise<{ key: string; run_at: Date }[]> {
  const { rows } = await database.db.raw('select key, run_at from graphile_worker.jobs where key like ? order by key', [
    keyLike,
  ])
  return rows
}

describe('one cell', () => {
  test('is read once however many rinks share it and however often the job runs', async () => {
    const form = rinkForm()
    const cell = await database.db('grid_cells').where({ id: cast.cellId }).first()
    const second = await setUpRink(
      cast.crew.at(NOW),
      setUpRinkSchema.parse({ ...form, latitude: String(cell?.latitude_deg), longitude: String(cell?.longitude_deg) }),
    )
    await pull(NOW)
    await pull(NOW)
    expect(await requestsSeen()).toBe(1)
    expect(await forecastsOfCell()).toHaveLength(1)
    const refreshes = (await jobs('refresh:%')).map(({ key }) => key)
    expect(refreshes).toEqual(expect.arrayContaining([`refresh:${cast.rinkId}`, `refresh:${second.rinkId}`]))
  })

  test('keeps every hour’s forecast for the record', async () => {
    await pull(NOW)
    await pull(NEXT_HOUR)
    expect(await forecastsOfCell()).toHaveLength(2)
    const newest = await findNewestForecast(database.db, cast.cellId)
    expect(newest?.fetchedAt).toEqual(NEXT_HOUR)
    expect(newest?.hours.length).toBeGreaterThan(240)
  })

  test('stores one forecast when two workers race', async () => {
    await Promise.all([pull(NOW), pull(NOW)])
    expect(await forecastsOfCell()).toHaveLength(1)
  })
})

describe('a service that fails', () => {
  test.each(['500', 'broken-200', 'html-502'])(
    '%s: the last good forecast stands and another try is promised',
    async (kind) => {
      await pull(NOW)
      await setFault(kind)
      await pull(NEXT_HOUR)
      expect(await forecastsOfCell()).toHaveLength(1)
      const cell = await database.db('grid_cells').where({ id: cast.cellId }).first('last_error', 'retry_at')
      expect(cell?.last_error).toBeTruthy()
      expect(cell?.retry_at?.getTime()).toBeGreaterThan(NEXT_HOUR.getTime())
      const [again] = await jobs(`pull:${cast.cellId}`)
      expect(again?.run_at).toEqual(cell?.retry_at)
    },
  )

  test('is asked again by nobody before its limit is over', async () => {
    await setFault('429')
    await pull(NOW)
    const cell = await database.db('grid_cells').where({ id: cast.cellId }).first('retry_at')
    expect(cell?.retry_at?.getTime()).toBeGreaterThan(NOW.getTime())
    await database.db.raw(`select graphile_worker.complete_jobs(array(select id from graphile_worker.jobs))`)
    await startSweep(database.db, slotOf(NEXT_HOUR), new Date((cell?.retry_at?.getTime() ?? 0) - 1))
    expect(await jobs(`pull:${cast.cellId}`)).toEqual([])
  })

  test('is forgotten once it answers again', async () => {
    await setFault('500')
    await pull(NOW)
    await fetch(`${weather.url}/__fake/fault`, { method: 'DELETE' })
    await pull(NOW)
    const cell = await database.db('grid_cells').where({ id: cast.cellId }).first('last_error', 'retry_at')
    expect(cell).toEqual({ last_error: null, retry_at: null })
  })
})

describe('the hourly round', () => {
  test('starts once an hour, whoever asks first', async () => {
    const slotAt = slotOf(new Date(NOW.getTime() + 5 * HOUR_MILLIS))
    const started = await Promise.all([startSweep(database.db, slotAt, NOW), startSweep(database.db, slotAt, NOW)])
    expect(started.filter((cells) => cells !== null)).toHaveLength(1)
  })

  test('leaves rinks alone that wait for autumn or are closed', async () => {
    await database.db('rinks').update({ phase: 'closed' })
    const cells = await startSweep(database.db, slotOf(new Date(NOW.getTime() + 6 * HOUR_MILLIS)), NOW)
    expect(cells).toBe(0)
  })
})
