// Child processes that leave nothing behind: run one to its end, keep one running, look at a foreign one.
import { spawn } from 'node:child_process'
import fs from 'node:fs'
import path from 'node:path'
import { fileURLToPath, pathToFileURL } from 'node:url'

import { Problem } from './problem.mjs'

const DIE_WITH_PARENT = pathToFileURL(fileURLToPath(new URL('./die-with-parent.mjs', import.meta.url))).href
const running = new Set()

/** Field of /proc/<pid>/…; undefined when there is no such process or it is not ours to see. */
function readProc(pid, name) {
  try {
    return fs.readFileSync(`/proc/${pid}/${name}`, 'utf8')
  } catch {
    return undefined
  }
}

/** A zombie answers kill 0 as if it lived, so the state decides. */
export function isAlive(pid) {
  const state = /^State:\s+(\w)/m.exec(readProc(pid, 'status') ?? '')?.[1]
  return state !== undefined && state !== 'Z' && state !== 'X'
}

/** Name, arguments and start time in clock ticks: together they tell a process from a later one of the same number. */
export function describeProcess(pid) {
  const stat = readProc(pid, 'stat') ?? ''
  const afterName = stat.slice(stat.lastIndexOf(')') + 2).split(' ')
  return {
    name: readProc(pid, 'comm')?.trim(),
    args: (readProc(pid, 'cmdline') ?? '').split('\0'),
    startedAt: afterName[19],
  }
}

/** The last lines of a log, for showing why a child died. */
export function tail(logFile, lines = 20) {
  try {
    return fs.readFileSync(logFile, 'utf8').trimEnd().split('\n').slice(-lines).join('\n')
  } catch {
    return ''
  }
}

function signalGroup(child, signal) {
  try {
    process.kill(-child.pid, signal)
  } catch {
    // It ended by itself in between.
  }
}

/**
 * Starts a program in a process group of its own (Ctrl-C in the terminal must not reach it before us) with its output
 * in `logFile`. A `node` program also gets a channel by which it notices our death.
 */
export function startChild(name, program, args, { env, cwd, logFile, show = false }) {
  fs.mkdirSync(path.dirname(logFile), { recursive: true })
  const log = fs.openSync(logFile, 'w')
  const isNode = program === process.execPath
  const stdout = show ? 'inherit' : log
  const child = spawn(program, isNode ? ['--import', DIE_WITH_PARENT, ...args] : args, {
    env,
    cwd,
    detached: true,
    stdio: ['ignore', stdout, log, ...(isNode ? ['ipc'] : [])],
  })
  fs.closeSync(log)
  running.add(child)
  const ended = new Promise((resolve) => {
    const end = (code, signal, error) => {
      running.delete(child)
      resolve({ code, signal, error })
    }
    child.once('exit', (code, signal) => end(code, signal))
    child.once('error', (error) => end(null, null, error))
  })
  return { name, child, logFile, ended }
}

/** Asks a child and all that it started to end; after `patienceMillis` they have to. */
export async function stopChild({ child, ended }, patienceMillis = 20_000) {
  signalGroup(child, 'SIGTERM')
  const force = setTimeout(() => signalGroup(child, 'SIGKILL'), patienceMillis)
  await ended
  clearTimeout(force)
  signalGroup(child, 'SIGKILL')
}

/** Ends whatever is still running, at once: for the second Ctrl-C and for a failed set-up. */
export function killAllChildren() {
  for (const child of running) signalGroup(child, 'SIGKILL')
}

/** Runs a program to its end and returns its exit code; throws only when it cannot be started. */
export async function runForCode(name, program, args, options) {
  const { code, signal, error } = await startChild(name, program, args, options).ended
  if (error) throw new Problem(`${name}: cannot run ${program} (${error.message}).`)
  return code ?? `signal ${signal}`
}

/** Runs a program to its end; throws a Problem with the log when it fails. */
export async function run(name, program, args, options) {
  const code = await runForCode(name, program, args, options)
  if (code !== 0) throw new Problem(`${name} failed (exit code ${code}).`, { logFile: options.logFile })
}
