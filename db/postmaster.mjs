// What postmaster.pid says about a cluster, and whether it can be believed.
import fs from 'node:fs'
import path from 'node:path'

import { describeProcess, isAlive } from '../lib/machine/processes.mjs'

// Above the largest number that Linux gives to a process, so that nobody ever answers to it.
const NOBODY = 2_147_483_646

const pidFile = (folder) => path.join(folder, 'postmaster.pid')

/** Lines of postmaster.pid: 1 process, 4 port, 8 state (PostgreSQL source, miscadmin.h, LOCK_FILE_LINE_…). */
function readPidFile(folder) {
  try {
    return fs.readFileSync(pidFile(folder), 'utf8').split('\n')
  } catch {
    return undefined
  }
}

/** The arguments are readable for everyone, /proc/<pid>/cwd is not, not even for root in a container. */
function isOurs(pid, folder) {
  const { name, args } = describeProcess(pid)
  return name === 'postgres' && args[args.indexOf('-D') + 1] === folder
}

/** The living server of this cluster, if there is one. */
export function findPostmaster(folder) {
  const lines = readPidFile(folder)
  const pid = Number(lines?.[0])
  if (!lines || !(pid > 0) || !isAlive(pid) || !isOurs(pid, folder)) return undefined
  return { pid, port: Number(lines[3]), isReady: lines[7]?.trim() === 'ready' }
}

/**
 * PostgreSQL refuses to start for as long as any process answers to the number in a stale file: another program that
 * got the number since, or a zombie. The number is replaced, not the file removed: its shared-memory key is what keeps
 * a new server away while old backends still write.
 */
export function disownStalePidFile(folder) {
  const lines = readPidFile(folder)
  if (!lines || findPostmaster(folder)) return
  if (Number(lines[0]) > 0 && lines.length > 6)
    fs.writeFileSync(pidFile(folder), [NOBODY, ...lines.slice(1)].join('\n'))
  else fs.rmSync(pidFile(folder))
}
