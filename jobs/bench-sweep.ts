// `npm run bench:sweep`: rinks a second from stored forecasts to stored windows and alerts, with one worker and with two.
import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { createPool } from '@/db/knex'
import { findOrCreateGridCell } from '@/db/queries/grid-cells'
import { enqueueRefresh } from '@/db/queries/jobs'
import { startWeatherFake } from '@/fakes/weather/server'
import { readClock } from '@/lib/clock'
import { insertForecast } from '@/db/queries/forecasts'
import { slotOf } from '@/lib/services/forecasts'
import { cellOf } from '@/lib/weather/cell'
import { createOpenMeteo } from '@/lib/weather/open-meteo'
import { eveningPlace } from '@/tests/support/evening-place'

const CELLS = 200
const RINKS_PER_CELL = 10

const connectionString = process.env.DATABASE_URL ?? ''
const db = createPool(connectionString)

/** 200 cells round a place where it is evening, each with its forecast read over HTTP, and ten rinks in each. */
async function setUp(): Promise<void> {
  const weather = await startWeatherFake({ port: 0 })
  const provider = createOpenMeteo({ baseUrl: weather.url, userAgent: 'Nightsheet bench' })
  const place = eveningPlace(readClock())
  const [keeper] = await db('users')
    .insert({ email: 'bench@nightsheet.example', name: 'Bench', email_verified_at: readClock() })
    .returning('id')
  for (let index = 0; index < CELLS; index += 1) {
    const latitudeDeg = place.latitudeDeg + (index % 20) * 0.05
    const longitudeDeg = place.longitudeDeg + Math.floor(index / 20) * 0.05
    const cell = await findOrCreateGridCell(db, cellOf(latitudeDeg, longitudeDeg))
    const now = readClock()
    const forecast = await provider.fetchHourly(cellOf(latitudeDeg, longitudeDeg), { now })
    await insertForecast(db, { cellId: cell.id, slotAt: slotOf(now), ...forecast })
    await insertRinks({ ...place, cellId: cell.id, latitudeDeg, longitudeDeg, userId: keeper?.id ?? '' })
  }
  await weather.close()
}

async function insertRinks(at: {
  cellId: string
  latitudeDeg: number
  longitudeDeg: number
  timeZone: string
  placeName: string
  userId: string
}): Promise<void> {
  await db.raw(
    `with rink as (
       insert into rinks (name, place_name, latitude_deg, longitude_deg, grid_cell_id, time_zone, length_m, width_m, base,
                          phase, shelter, sky_view, created_by, creation_key)
       select 'Rink ' || n, :placeName, :latitudeDeg, :longitudeDeg, :cellId, :timeZone, 10, 10, 'liner', 'skating',
              'suburban', 0.85, :userId, gen_random_uuid()
       from generate_series(1, :count) n returning id),
     water as (
       insert into water_sources (rink_id, kind, flow_l_per_min, temperature_c, layer_mm, fill_depth_mm)
       select id, 'cold-tap', 25, 6, 3, 100 from rink),
     hours as (insert into available_hours (rink_id, from_local, to_local) select id, '17:00', '01:00' from rink),
     sheet as (
       insert into sheet_states (rink_id, as_of, origin, thickness_mm, temperature_c, snow_cover_cm)
       select id, now() - interval '2 days', 'reported', 90, -3, 0 from rink),
     member as (
       insert into rink_members (rink_id, user_id, role) select id, :userId, 'keeper' from rink returning rink_id)
     insert into alert_preferences (rink_id, user_id, wants_push) select rink_id, :userId, false from member`,
    { ...at, count: RINKS_PER_CELL },
  )
}

/** Forgets what was judged, and asks for every rink anew. */
async function reset(): Promise<void> {
  await db.raw('truncate outlooks, advised_windows, messages cascade')
  await db.raw(`delete from sheet_states where origin = 'modelled'`)
  await db.raw(`select graphile_worker.complete_jobs(array(select id from graphile_worker.jobs))`)
  for (const { id } of await db('rinks').select('id')) await enqueueRefresh(db, id)
}

/** Starts workers as processes of their own and waits until nothing is left to judge. */
async function measure(workers: number): Promise<Figures> {
  await reset()
  const children = Array.from({ length: workers }, () =>
    spawn(process.execPath, ['--import', 'tsx', 'jobs/bench-sweep-worker.ts'], {
      stdio: ['ignore', 'ignore', 'inherit', 'ipc'],
    }),
  )
  await Promise.all(children.map((child) => once(child, 'message')))
  const startedAt = performance.now()
  for (const child of children) child.send('go')
  while (await isWorkLeft()) await new Promise((resolve) => setTimeout(resolve, 100))
  const seconds = (performance.now() - startedAt) / 1000
  for (const child of children) child.disconnect()
  await Promise.all(children.map((child) => once(child, 'exit')))
  return { workers, seconds, ...(await countResults()) }
}

interface Figures {
  workers: number
  seconds: number
  outlooks: number
  windows: number
  messages: number
}

async function isWorkLeft(): Promise<boolean> {
  const { rows } = await db.raw(
    `select exists (select 1 from graphile_worker.jobs where task_identifier = 'refresh-outlook') as "isLeft"`,
  )
  return rows[0].isLeft
}

async function countResults(): Promise<Pick<Figures, 'outlooks' | 'windows' | 'messages'>> {
  const { rows } = await db.raw(
    `select (select count(*)::int from outlooks) as outlooks,
            (select count(*)::int from advised_windows where state = 'open') as windows,
            (select count(*)::int from messages) as messages`,
  )
  return rows[0]
}

function report(figures: Figures[]): void {
  const rinks = CELLS * RINKS_PER_CELL
  const rate = ({ seconds }: Figures) => rinks / seconds
  if (process.argv.includes('--json')) {
    process.stdout.write(`${JSON.stringify(figures.map((row) => ({ ...row, rinks, rinksPerSecond: rate(row) })))}\n`)
    return
  }
  for (const row of figures) {
    process.stdout.write(
      `${row.workers} worker${row.workers > 1 ? 's' : ''}: ${rinks} rinks on ${CELLS} cells in ${row.seconds.toFixed(1)} s, ` +
        `${rate(row).toFixed(0)} rinks/s (${row.outlooks} outlooks, ${row.windows} windows, ${row.messages} messages)\n`,
    )
  }
  const [one, two] = figures
  if (one && two) process.stdout.write(`two against one: ${(rate(two) / rate(one)).toFixed(2)}\n`)
}

await setUp()
report([await measure(1), await measure(2)])
await db.destroy()
