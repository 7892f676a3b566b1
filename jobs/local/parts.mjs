// The running parts of the product: fakes, worker and web, each started when it is due and known to be up.
import fs from 'node:fs'
import path from 'node:path'
import { setTimeout as wait } from 'node:timers/promises'

import { run, startChild, stopChild } from '../../lib/machine/processes.mjs'
import { Problem } from '../../lib/machine/problem.mjs'

import { inProject, projectFolder } from './project.mjs'

const READY_SECONDS = 90
const script = (file) => ['--import', 'tsx', file]

/** Runs one of our TypeScript programs to its end. */
export function runScript(name, file, log, env) {
  return run(name, process.execPath, script(file), inProject(log, env))
}

/** Starts a part that has to go on until the session ends; its death ends the session. */
function startPart(session, name, args, log, env) {
  const part = startChild(name, process.execPath, args, inProject(log, env))
  let isWanted = true
  session.defer(() => {
    isWanted = false
    return stopChild(part)
  })
  void part.ended.then(({ code, error }) => {
    part.hasEnded = true
    const how = error ? error.message : `exit code ${code}`
    if (isWanted) session.fail(new Problem(`The ${name} ended unexpectedly (${how}).`, { logFile: part.logFile }))
  })
  return part
}

async function untilReady(part, isReady) {
  for (const end = Date.now() + READY_SECONDS * 1000; Date.now() < end && !part.hasEnded; await wait(100)) {
    if (await isReady()) return
  }
  const what = part.hasEnded ? 'did not start' : `was not ready after ${READY_SECONDS} s`
  throw new Problem(`The ${part.name} ${what}.`, { logFile: part.logFile })
}

const hasLogged = (part, text) => fs.readFileSync(part.logFile, 'utf8').includes(text)

/** Weather, mail and push on loopback. */
export async function startFakes(session, log, env) {
  const part = startPart(session, 'fakes', script('fakes/start.ts'), log, env)
  await untilReady(part, () => hasLogged(part, 'fakes ready'))
}

/** The scheduled job and the queue. */
export async function startWorker(session, log, env) {
  const part = startPart(session, 'worker', script('jobs/worker.ts'), log, env)
  await untilReady(part, () => hasLogged(part, 'worker.started'))
}

/** The web server, from a production build or, for `dev`, from the sources. */
export async function startWeb(session, log, { env, host, port, distFolder, dev = false }) {
  const next = path.join(projectFolder, 'node_modules/next/dist/bin/next')
  const args = [next, dev ? 'dev' : 'start', '-H', host, '-p', String(port)]
  const webEnv = { ...env, NODE_ENV: dev ? 'development' : 'production', NEXT_DIST_DIR: distFolder }
  const part = startPart(session, 'web server', args, log, { ...webEnv, NEXT_TELEMETRY_DISABLED: '1' })
  const address = `http://${host === '0.0.0.0' ? '127.0.0.1' : host}:${port}/api/health`
  const answers = () =>
    fetch(address, { signal: AbortSignal.timeout(10_000) }).then(
      () => true,
      () => false,
    )
  await untilReady(part, answers)
}
