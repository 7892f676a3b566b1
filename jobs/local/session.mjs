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

/** Prints a Problem as one line with the end of its log; anything else is a bug and keeps its stack. */
function report(error) {
  if (!(error instanceof Problem)) return console.error(error)
  console.error(error.message)
  if (!error.logFile) return undefined
  const lines = tail(error.logFile)
  return console.error(lines ? `The end of ${error.logFile}:\n${lines.replace(/^/gm, '  | ')}` : `See ${error.logFile}`)
}

export class Session {
  /** Said when everything is undone. */
  farewell = ''
  #cleanups = []
  #isStopping = false
  #stoppedAt = 0
  #end = deferEnd()

  /** Prints what is being done, then how long it took and what `work` says about it. */
  async step(title, work) {
    this.#refuseWhenStopping()
    const startedAt = Date.now()
    process.stdout.write(`  ${title} … `)
    try {
      const note = await work()
      console.log(formatSeconds(Date.now() - startedAt) + (typeof note === 'string' ? `, ${note}` : ''))
    } catch (error) {
      console.log(this.#isStopping ? 'stopped' : 'failed')
      throw error
    }
    this.#refuseWhenStopping()
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
      code = error instanceof Interrupted || this.#isStopping ? INTERRUPTED : 1
      if (code === 1) report(error)
    }
    this.#isStopping = true
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
    if (this.#isStopping) {
      if (Date.now() - this.#stoppedAt > SAME_SIGNAL_MILLIS) killAllChildren()
      return
    }
    this.#isStopping = true
    this.#stoppedAt = Date.now()
    interruptRuns()
    this.#end.resolve()
  }

  #refuseWhenStopping() {
    if (this.#isStopping) throw new Interrupted()
  }
}

/** Promise.withResolvers, which Node 20 does not have. */
function deferEnd() {
  const deferred = {}
  deferred.promise = new Promise((resolve, reject) => Object.assign(deferred, { resolve, reject }))
  return deferred
}
