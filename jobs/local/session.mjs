// One run of `npm start` or `npm test`: steps with their seconds, and everything undone in reverse order at the end.
import { interruptRuns, killAllChildren, tail } from '../../lib/machine/processes.mjs'
import { Problem } from '../../lib/machine/problem.mjs'

const PARENT_CHECK_MILLIS = 500
// npm passes on the Ctrl-C that the terminal has already sent to us: the same one, not a second.
const SAME_SIGNAL_MILLIS = 1000
const INTERRUPTED = 130

class Interrupted extends Error {}

export function formatSeconds(millis) {
  return `${(millis / 1000).toFixed(1)} s`
}

/** A Problem as one line with the end of its log; anything else is a bug and keeps its stack. */
export function describeFailure(error) {
  const isClosed = error?.code === 'EACCES' || error?.code === 'EPERM'
  if (isClosed && error.path)
    return `${error.path} is closed to this account: another one has made it. (${error.message})`
  if (!(error instanceof Problem)) return error?.stack ?? String(error)
  if (!error.logFile) return error.message
  const lines = tail(error.logFile)
  const log = lines ? `The end of ${error.logFile}:\n${lines.replace(/^/gm, '  | ')}` : `See ${error.logFile}`
  return `${error.message}\n${log}`
}

const report = (error) => console.error(describeFailure(error))

export class Session {
  #cleanups = []
  #stoppedAt = 0
  #end = deferEnd()
  isStopping = false

  /** `farewell` is said when everything is undone. */
  constructor({ farewell = '' } = {}) {
    this.farewell = farewell
  }

  /** Prints what is being done, then how long it took and what `work` notes about it; returns what `work` returns. */
  async step(title, work) {
    this.#refuseWhenStopping()
    const startedAt = Date.now()
    const notes = []
    process.stdout.write(`  ${title} … `)
    try {
      const result = await work((note) => notes.push(note))
      console.log([formatSeconds(Date.now() - startedAt), ...notes].join(', '))
      this.#refuseWhenStopping()
      return result
    } catch (error) {
      if (!(error instanceof Interrupted)) console.log(this.isStopping ? 'stopped' : 'failed')
      throw error
    }
  }

  /** Has `cleanup` called at the end, last one first. */
  defer(cleanup) {
    this.#cleanups.push(cleanup)
  }

  /** Fulfils when somebody asks us to stop; rejects when `fail` is called first. */
  untilStopped() {
    return this.#end.promise
  }

  /** Ends the run because something that should go on has died. */
  fail(error) {
    this.#end.reject(error)
  }

  /** Runs `main` to its end, cleans up, and leaves with its exit code. */
  async run(main) {
    this.#listen()
    let code
    try {
      code = (await main(this)) ?? 0
    } catch (error) {
      code = error instanceof Interrupted || this.isStopping ? INTERRUPTED : 1
      if (code === 1) report(error)
    }
    this.isStopping = true
    for (const cleanup of this.#cleanups.reverse()) await Promise.resolve(cleanup()).catch(report)
    if (this.farewell) console.log(this.farewell)
    process.exit(code)
  }

  #listen() {
    // A closed terminal must not end us in the middle of stopping.
    for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {})
    for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => this.#stop())
    this.#end.promise.catch(() => {})
    // SIGTERM to npm does not reach us; that npm is gone does.
    const parent = process.ppid
    const isUnderNpm = process.env.npm_lifecycle_event !== undefined
    if (isUnderNpm) setInterval(() => process.ppid !== parent && this.#stop(), PARENT_CHECK_MILLIS).unref()
  }

  #stop() {
    if (this.isStopping) {
      if (Date.now() - this.#stoppedAt > SAME_SIGNAL_MILLIS) killAllChildren()
      return
    }
    this.isStopping = true
    this.#stoppedAt = Date.now()
    interruptRuns()
    this.#end.resolve()
  }

  #refuseWhenStopping() {
    if (this.isStopping) throw new Interrupted()
  }
}

/** Promise.withResolvers, which Node 20 does not have. */
function deferEnd() {
  const deferred = {}
  deferred.promise = new Promise((resolve, reject) => Object.assign(deferred, { resolve, reject }))
  return deferred
}
