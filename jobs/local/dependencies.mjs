// node_modules as package-lock.json wants it, by npm ci when it is not.
import crypto from 'node:crypto'
import fs from 'node:fs'
import path from 'node:path'

import { Problem } from '../../lib/machine/problem.mjs'
import { run } from '../../lib/machine/processes.mjs'

import { findHolder } from './lock.mjs'
import { cleanEnvironment, inProject, projectFolder } from './project.mjs'

const lockFile = path.join(projectFolder, 'package-lock.json')
// Inside node_modules, so that it goes when that goes.
const marker = path.join(projectFolder, 'node_modules', '.nightsheet-lock-hash')
const installedList = path.join(projectFolder, 'node_modules', '.package-lock.json')

const hashLock = () =>
  crypto.createHash('sha256').update(fs.readFileSync(lockFile)).update(process.version.split('.')[0]).digest('hex')

const readJson = (file) => JSON.parse(fs.readFileSync(file, 'utf8'))

/** Somebody may have run npm ci by hand: npm's own list then agrees with the lock, but for packages of other systems. */
function isInstalledByHand() {
  if (!fs.existsSync(installedList)) return false
  const installed = readJson(installedList).packages
  return Object.entries(readJson(lockFile).packages).every(
    ([place, wanted]) =>
      place === '' || (installed[place]?.version ?? (wanted.optional && wanted.version)) === wanted.version,
  )
}

function isUpToDate() {
  if (fs.existsSync(marker)) return fs.readFileSync(marker, 'utf8') === hashLock()
  return isInstalledByHand()
}

/** Installs what is missing; `command` is ours, any other command that runs here forbids it. */
export async function ensureDependencies(command, note) {
  if (!isUpToDate()) {
    const other = ['start', 'test'].find((name) => name !== command && findHolder(name))
    if (other) throw new Problem(`package-lock.json has changed: stop \`npm ${other}\` in this folder first.`)
    const env = cleanEnvironment()
    // npm ci would leave the build tools out.
    delete env.NODE_ENV
    const npm = process.env.npm_execpath
    const words = ['ci', '--include=dev', '--no-audit', '--no-fund']
    const [program, args] = npm ? [process.execPath, [npm, ...words]] : ['npm', words]
    await run('npm ci', program, args, inProject('npm-ci', env))
  } else note('up to date')
  fs.writeFileSync(marker, hashLock())
}
