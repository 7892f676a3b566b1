// Where things lie in this folder, and the environment that its programs get.
import path from 'node:path'
import { fileURLToPath } from 'node:url'

export const projectFolder = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '')
export const dataFolder = path.join(projectFolder, '.data')
export const logFolder = path.join(dataFolder, 'logs')

/** What npm adds when it runs a script is about npm, and would change what a second npm does. */
const FROM_NPM = /^npm_(lifecycle|package)_|^npm_(command|execpath|node_execpath)$|^INIT_CWD$/

export function cleanEnvironment() {
  return Object.fromEntries(Object.entries(process.env).filter(([name]) => !FROM_NPM.test(name)))
}

/** Options for a program that runs in this folder with its output in `.data/logs/<log>.log`. */
export function inProject(log, env) {
  return { cwd: projectFolder, env, logFile: path.join(logFolder, `${log}.log`) }
}
