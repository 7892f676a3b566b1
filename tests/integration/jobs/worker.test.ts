// The worker as a process: two at once do no double work, SIGTERM drains, and a killed one leaves nothing stuck.
import { spawn, type ChildProcess } from 'node:child_process'
import { randomUUID } from 'node:crypto'
import { once } from 'node:events'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { afterAll, afterEach, beforeAll, expect, test, vi } from 'vitest'
import webPush from 'web-push'
import { enqueueJob } from '@/db/queries/jobs'
import { startMailFake, type MailFake } from '@/fakes/mail/server'
import { startWeatherFake, type WeatherFake } from '@/fakes/weather/server'
import { getHealth } from '@/lib/services/health'
import { createCast, type Cast } from '@/tests/support/cast'
import { eveningPlace } from '@/tests/support/evening-place'
import { givenDatabase } from '@/tests/support/given-cast'

const START_MILLIS = 60_000

const database = givenDatabase()
let weather: WeatherFake
let mail: MailFake
let cast: Cast
const workers = new Set<ChildProcess>()

beforeAll(async () => {
  ;[weather, mail] = await Promise.all([startWeatherFake({ port: 0 }), startMailFake({ smtpPort: 0, pagePort: 0 })])
  const place = eveningPlace(new Date())
  cast = await createCast(database.db, new Date(), {
    latitude: String(place.latitudeDeg),
    longitude: String(place.longitudeDeg),
    timeZone: place.timeZone,
    tellAt: '15:30',
  })
})
afterEach(async () => {
  await Promise.all([...workers].map((worker) => end(worker, 'SIGKILL')))
})
afterAll(() => Promise.all([weather.close(), mail.close()]))

async function startWorker(): Promise<ChildProcess> {
  const vapid = webPush.generateVAPIDKeys()
  const worker = spawn(process.execPath, ['--import', 'tsx', 'jobs/worker.ts'], {
    stdio: ['ignore', 'pipe', 'inherit'],
    env: {
      ...process.env,
      DATABASE_URL: database.connectionString,
      PUBLIC_URL: 'http://localhost:3200',
      NEXTAUTH_SECRET: randomUUID(),
      OPEN_METEO_URL: weather.url,
      SMTP_URL: mail.smtpUrl,
      VAPID_PUBLIC_KEY: vapid.publicKey,
      VAPID_PRIVATE_KEY: vapid.privateKey,
      PUSH_CA_FILE: path.join(tmpdir(), 'none.pem'),
    },
  })
  workers.add(worker)
  worker.once('exit', () => workers.delete(worker))
  let output = ''
  worker.stdout?.on('data', (chunk: Buffer) => (output += chunk.toString()))
  await vi.waitFor(() => expect(output).toContain('worker.started'), START_MILLIS)
  return worker
}

async function end(worker: ChildProcess, signal: NodeJS.Signals): Promise<number | null> {
  const exited = once(worker, 'exit')
  worker.kill(signal)
  const [code] = (await exited) as [number | null]
  return code
}

async function mailTo(email: string): Promise<unknown[]> {
  return (await fetch(`${mail.url}/api/messages?to=${encodeURIComponent(email)}`)).json()
}

const deliveredMessages = () => database.db('messages').where({ rink_id: cast.rinkId, state: 'delivered' })

test(
  'two workers bring one mail to each person, SIGTERM ends them, and health says what ran',
  { timeout: 120_000 },
  async () => {
    const [one, two] = await Promise.all([startWorker(), startWorker()])
    await vi.waitFor(async () => expect(await deliveredMessages()).toHaveLength(2), { timeout: 30_000, interval: 200 })
    expect(await mailTo(cast.keeper.email)).toHaveLength(1)
    expect(await mailTo(cast.crew.email)).toHaveLength(1)
    expect(await database.db('forecasts').where({ grid_cell_id: cast.cellId })).toHaveLength(1)
    expect(await database.db('outlooks').where({ rink_id: cast.rinkId })).toHaveLength(1)

    const health = await getHealth(database.db, new Date())
    expect(health).toMatchObject({ status: 'ok', workers: 2, deadMessages: 0, failedJobs: 0 })
    expect(health.jobs.map(({ job }) => job)).toEqual(
      expect.arrayContaining(['sweep', 'pull-forecast', 'refresh-outlook']),
    )

    expect(await Promise.all([end(one, 'SIGTERM'), end(two, 'SIGTERM')])).toEqual([0, 0])
    expect((await getHealth(database.db, new Date())).troubles).toContain('No worker is running.')
  },
)

test('a job that a killed worker held is done by the next one', { timeout: 120_000 }, async () => {
  // A worker that was killed leaves its job locked under its name: that is what the row says here.
  await enqueueJob(database.db, 'refresh-outlook', { rinkId: cast.rinkId }, { key: 'left-behind' })
  await database.db.raw(
    `update graphile_worker._private_jobs set locked_by = 'worker-killed', locked_at = now(), attempts = 1 where key = 'left-behind'`,
  )
  await startWorker()
  await vi.waitFor(
    async () => {
      const { rows } = await database.db.raw(`select 1 from graphile_worker.jobs where key = 'left-behind'`)
      expect(rows).toEqual([])
    },
    { timeout: 20_000, interval: 200 },
  )
})
