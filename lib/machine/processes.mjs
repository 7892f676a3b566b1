// Child processes that leave nothing behind: run one to its end, keep one running, look at a foreign one.
import { spawn } from 'node:child_process'
import fs from 'node:fs'
import path from 'node:path'
import { stripVTControlCharacters } from 'node:util'

import { Problem } from './problem.mjs'

const DIE_WITH_PARENT = new URL('./die-with-parent.mjs', import.meta.url).href
const children = new Set()
const runs = new Set()

/** A file of /proc/<pid>; undefined when there is no such process or it is not ours to see. */
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

/** Name, arguments and start in clock ticks (proc(5), stat, field 22), which tells it from a later one of the same number. */
export function describeProcess(pid) {
  const stat = readProc(pid, 'stat') ?? ''
  const fromThirdField = stat.slice(stat.lastIndexOf(')') + 2).split(' ')
  return {
    name: readProc(pid, 'comm')?.trim(),
    args: (readProc(pid, 'cmdline') ?? '').split('\0'),
    startedAt: fromThirdField[19],
  }
}

/** The last lines of a log, for showing why a child died. */
export function tail(logFile, lines = 20) {
  try {
    return stripVTControlCharacters(fs.readFileSync(logFile, 'utf8')).trimEnd().split('\n').slice(-lines).join('\n')
  } catch {
    return ''
  }
}

function signalGroup({ pid }, signal) {
  try {
    if (pid) process.kill(-pid, signal)
  } catch {
    // It ended by itself in between.
  }
}

/**
 * Starts a program with its output in `logFile`, in a process group of its own: Ctrl-C in the terminal must not reach
 * it before us. `show` lets its standard output through to the terminal.
 */
export function startChild(name, program, args, { env, cwd, logFile, show = false }) {
  fs.mkdirSync(path.dirname(logFile), { recursive: true })
  const log = fs.openSync(logFile, 'w')
  const isNode = program === process.execPath
  const child = spawn(program, isNode ? ['--import', DIE_WITH_PARENT, ...args] : args, {
    env: isNode ? { ...env, NIGHTSHEET_PARENT: String(process.pid) } : env,
    cwd,
    detached: true,
    stdio: ['ignore', show ? 'inherit' : log, log],
  })
  fs.closeSync(log)
  children.add(child)
  const ended = new Promise((resolve) => {
    const end = (outcome) => {
      children.delete(child)
      resolve(outcome)
    }
    child.once('exit', (code, signal) => end({ code: code ?? `signal ${signal}` }))
    child.once('error', (error) => end({ error }))
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

/** Runs a program to its end and returns its exit code; one that takes longer than `limitMillis` is ended. */
export async function runForCode(name, program, args, { limitMillis, ...options }) {
  const started = startChild(name, program, args, options)
  runs.add(started.child)
  const limit = limitMillis ? setTimeout(() => void stopChild(started), limitMillis) : undefined
  const { code, error } = await started.ended
  clearTimeout(limit)
  runs.delete(started.child)
  if (error) throw new Problem(`${name}: cannot run ${program} (${error.message}).`)
  return code
}

/** Runs a program to its end; throws a Problem with the log when it fails. */
export async function run(name, program, args, options) {
  const code = await runForCode(name, program, args, options)
  if (code !== 0) throw new Problem(`${name} failed (exit code ${code}).`, { logFile: options.logFile })
}

/** Asks everything that `run` waits for to end, for a Ctrl-C during set-up. */
export function interruptRuns() {
  for (const child of runs) signalGroup(child, 'SIGTERM')
}

/** Ends whatever is still running, at once, for a second Ctrl-C. */
export function killAllChildren() {
  for (const child of children) signalGroup(child, 'SIGKILL')
}
