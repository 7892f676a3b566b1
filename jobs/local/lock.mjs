// One `npm start` (or `npm test`) at a time in a folder; the lock of a killed one is recognised and taken over.
import fs from 'node:fs'
import path from 'node:path'

import { Problem } from '../../lib/machine/problem.mjs'
import { describeProcess, isAlive } from '../../lib/machine/processes.mjs'

import { dataFolder } from './project.mjs'

const fileOf = (command) => path.join(dataFolder, `${command}.lock`)

/** Who holds the lock; a later process with the same number is told by its start time. */
export function findHolder(command) {
  try {
    const holder = JSON.parse(fs.readFileSync(fileOf(command), 'utf8'))
    return isAlive(holder.pid) && describeProcess(holder.pid).startedAt === holder.startedAt ? holder : undefined
  } catch {
    return undefined
  }
}

function write(command, flag, extra = {}) {
  const { startedAt } = describeProcess(process.pid)
  fs.writeFileSync(fileOf(command), JSON.stringify({ pid: process.pid, startedAt, ...extra }), { flag })
}

/**
 * Takes the lock of a command ('start' or 'test').
 * @throws Problem that says where it runs already.
 */
export function takeLock(command) {
  for (let attempt = 0; attempt < 2; attempt += 1) {
    try {
      write(command, 'wx')
      break
    } catch (error) {
      if (error.code !== 'EEXIST') throw error
      const holder = findHolder(command)
      if (holder) {
        const where = holder.address ? ` at ${holder.address}` : ''
        throw new Problem(
          `\`npm ${command}\` already runs in this folder${where} (process ${holder.pid}): stop it there first.`,
        )
      }
      fs.rmSync(fileOf(command), { force: true })
    }
  }
  return {
    note: (address) => write(command, 'w', { address }),
    release: () => findHolder(command)?.pid === process.pid && fs.rmSync(fileOf(command), { force: true }),
  }
}
