// Installs what is missing on a Debian machine with apt-get, as root or through sudo.
import { spawn, spawnSync } from 'node:child_process'
import fs from 'node:fs'
import path from 'node:path'

import { Problem } from './problem.mjs'

/** The path of a program, also when it lies in a folder that an ordinary user's PATH leaves out. */
export function findProgram(name) {
  const folders = (process.env.PATH ?? '').split(':').concat('/usr/bin', '/bin', '/usr/sbin', '/sbin')
  return folders.map((folder) => path.join(folder, name)).find((file) => fs.existsSync(file))
}

/** The words that make a command run as root; undefined when this account has no way to. */
function rootPrefix() {
  if (process.getuid() === 0) return []
  const sudo = findProgram('sudo')
  if (!sudo) return undefined
  if (spawnSync(sudo, ['-n', 'true'], { stdio: 'ignore' }).status === 0) return [sudo, '-n']
  return process.stdin.isTTY ? [sudo] : undefined
}

/** One shell line, so that a password is asked for once. A bare machine needs package lists first; others need not wait for them. */
function installScript(packages, beforehand) {
  const install = `apt-get install -y --no-install-recommends -o DPkg::Lock::Timeout=120 ${packages.join(' ')}`
  const lines = `export DEBIAN_FRONTEND=noninteractive; ${install} || { apt-get update && ${install}; }`
  return beforehand ? `${beforehand} && { ${lines}; }` : lines
}

/**
 * Installs packages; `beforehand` is a shell command that root runs first.
 * @throws Problem with the command to type when this account cannot become root.
 */
export async function installDebianPackages(packages, { logFolder, beforehand }) {
  const names = packages.join(' ')
  if (!findProgram('apt-get')) throw new Problem(`Missing: ${names}. Please install it: this machine has no apt-get.`)
  const prefix = rootPrefix()
  if (!prefix) throw new Problem(`Missing: ${names}. Run \`sudo apt-get install ${names}\` once, then start again.`)
  fs.mkdirSync(logFolder, { recursive: true })
  const logFile = path.join(logFolder, 'apt-get.log')
  const log = fs.openSync(logFile, 'w')
  const [program, ...args] = [...prefix, '/bin/sh', '-c', installScript(packages, beforehand)]
  // Stays in the terminal's own process group, so that sudo may ask for a password there.
  const child = spawn(program, args, { cwd: '/', stdio: ['inherit', log, log] })
  const code = await new Promise((resolve) => child.once('exit', resolve).once('error', resolve))
  fs.closeSync(log)
  if (code !== 0) throw new Problem(`apt-get could not install ${names}.`, { logFile })
}
