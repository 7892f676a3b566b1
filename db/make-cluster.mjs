// A new cluster in a folder: initdb with a random password, finished or not there at all.
import { execFile } from 'node:child_process'
import crypto from 'node:crypto'
import fs from 'node:fs'
import path from 'node:path'
import { promisify } from 'node:util'

import { Problem } from '../lib/machine/problem.mjs'
import { isAlive } from '../lib/machine/processes.mjs'

import { programEnvironment, programFolder } from './postgres-programs.mjs'

export const ROLE = 'nightsheet'

/** The password of ROLE; a cluster to come gets a random one, which only our own account can read. */
export function readPassword(folder) {
  const file = `${folder}.password`
  try {
    if (!fs.existsSync(folder))
      fs.writeFileSync(file, crypto.randomBytes(24).toString('hex'), { mode: 0o600, flag: 'wx' })
  } catch (error) {
    if (error.code !== 'EEXIST') throw error
  }
  if (!fs.existsSync(file)) {
    throw new Problem(`${file} is gone, and with it the way into ${folder}. Remove the folder and its data.`)
  }
  return fs.readFileSync(file, 'utf8')
}

function sweepUnfinished(folder) {
  const prefix = `${path.basename(folder)}.new-`
  for (const name of fs.readdirSync(path.dirname(folder))) {
    if (name.startsWith(prefix) && !isAlive(Number(name.slice(prefix.length)))) {
      fs.rmSync(path.join(path.dirname(folder), name), { recursive: true, force: true })
    }
  }
}

/** Built aside and renamed: neither a cut-off set-up nor one of another command is ever taken for a cluster. */
export async function makeCluster({ folder, owner, password }) {
  sweepUnfinished(folder)
  const unfinished = `${folder}.new-${process.pid}`
  const passwordFile = path.join(unfinished, 'password')
  const data = path.join(unfinished, 'data')
  fs.mkdirSync(unfinished, { mode: 0o700 })
  fs.writeFileSync(passwordFile, password, { mode: 0o600 })
  if (owner) for (const file of [unfinished, passwordFile]) fs.chownSync(file, owner.uid, owner.gid)
  const access = ['-U', ROLE, '-A', 'scram-sha-256', `--pwfile=${passwordFile}`]
  try {
    const args = ['-D', data, ...access, '--locale=C.UTF-8', '-E', 'UTF8']
    const options = { cwd: '/', env: programEnvironment(), ...owner }
    await promisify(execFile)(path.join(programFolder(folder), 'initdb'), args, options)
    if (!fs.existsSync(folder)) fs.renameSync(data, folder)
  } catch (error) {
    throw new Problem(`PostgreSQL could not make a cluster in ${folder}: ${error.stderr?.trim() || error.message}`)
  } finally {
    fs.rmSync(unfinished, { recursive: true, force: true })
  }
}
