// The private cluster through what befalls it: kills, stale files, taken ports.
import fs from 'node:fs'
import net from 'node:net'
import os from 'node:os'
import path from 'node:path'
import { setTimeout as wait } from 'node:timers/promises'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { findPostmaster } from '@/db/postmaster.mjs'
import { ensureDatabase, isRunning, queryCluster, startCluster, stopCluster } from '@/db/server.mjs'

const PREFERRED_PORT = 54_600
let home: string

beforeAll(() => {
  home = fs.mkdtempSync(path.join(os.tmpdir(), 'nightsheet-cluster-'))
  // The account that runs PostgreSQL for root has to get in.
  fs.chmodSync(home, 0o711)
})
afterAll(async () => {
  const running = findPostmaster(folder())
  if (running) await stopCluster({ folder: folder(), pid: running.pid })
  fs.rmSync(home, { recursive: true, force: true })
})

const folder = () => path.join(home, 'data', 'postgres')
const start = () =>
  startCluster({
    folder: folder(),
    preferredPort: PREFERRED_PORT,
    logFile: path.join(home, 'postgres.log'),
    settings: { fsync: 'off' },
  })

test('a new cluster starts, keeps its password to this account, and is found running by a second start', async () => {
  const first = await start()
  await ensureDatabase(first, 'rinks')
  const second = await start()
  expect(second.pid).toBe(first.pid)
  expect(await queryCluster(second, "select count(*) from pg_database where datname = 'rinks'")).toEqual(['1'])
  expect(fs.statSync(`${folder()}.password`).mode & 0o777).toBe(0o600)
  await stopCluster(second)
  expect(isRunning(first)).toBe(false)
})

test('a server that was killed outright starts again', async () => {
  const killed = await start()
  process.kill(killed.pid, 'SIGKILL')
  await wait(50)
  const again = await start()
  expect(again.pid).not.toBe(killed.pid)
  expect(await queryCluster(again, 'select 1')).toEqual(['1'])
  await stopCluster(again)
})

test('a stale file that names a living process of another kind does not hold the server up', async () => {
  const { uid, gid } = fs.statSync(folder())
  const stale = path.join(folder(), 'postmaster.pid')
  fs.writeFileSync(stale, `${process.pid}\n${folder()}\n1700000000\n${PREFERRED_PORT}\n\n127.0.0.1\n 1 2\nready\n`)
  fs.chownSync(stale, uid, gid)
  const cluster = await start()
  expect(cluster.pid).not.toBe(process.pid)
  await stopCluster(cluster)
})

test('a taken port is passed over, and the address names the one in use', async () => {
  const neighbour = net.createServer().listen(PREFERRED_PORT, '127.0.0.1')
  const cluster = await start()
  expect(cluster.port).toBeGreaterThan(PREFERRED_PORT)
  expect(cluster.urlOf('rinks')).toContain(`:${cluster.port}/rinks`)
  expect(await queryCluster(cluster, 'select 1')).toEqual(['1'])
  await stopCluster(cluster)
  neighbour.close()
})
