// `npm test`: sets everything up on a bare machine, runs every suite, and ends with `N passed, N failed`.
import { makeDataFolder } from '../db/cluster-place.mjs'
import { ensureDependencies } from '../jobs/local/dependencies.mjs'
import { takeLock } from '../jobs/local/lock.mjs'
import { dataFolder } from '../jobs/local/project.mjs'
import { describeFailure, formatSeconds, Session } from '../jobs/local/session.mjs'
import { Problem } from '../lib/machine/problem.mjs'

import { runBench } from './support/bench.mjs'
import { ensureChromium, startProduct } from './support/e2e-product.mjs'
import { CHECK_NAMES, runCheck, runPlaywright, runVitest, SUITE_NAMES } from './support/suites.mjs'
import { closeTestCluster, makeTestDatabase, openTestCluster } from './support/test-cluster.mjs'

const BENCH = 'bench-sweep'
const startedAt = Date.now()

/** `npm test -- lint unit tests/unit/alerts`: names of suites, then what the tools are to look at. */
function readArguments(words) {
  const known = [...SUITE_NAMES, BENCH]
  const named = known.filter((name) => words.includes(name))
  const filters = words.filter((word) => !known.includes(word))
  if (named.length === 0 && filters.length > 0) {
    throw new Problem(`No suite is called ${filters[0]}. There are: ${known.join(', ')}.`)
  }
  return { suites: named.length > 0 ? named : SUITE_NAMES, filters }
}

/** The test server, started when the first suite asks for it. */
function createClusterOpener(session) {
  let cluster
  return async () => {
    if (cluster) return cluster
    return session.step('PostgreSQL for tests', async (note) => {
      cluster = await openTestCluster()
      session.defer(() => closeTestCluster(cluster))
      note(`port ${cluster.port}`)
      return cluster
    })
  }
}

/** What a suite needs before it can run; the end of the session undoes it. */
async function prepare(session, suite, openCluster) {
  if (suite === 'integration') return { databaseUrl: (await openCluster()).homeUrl }
  if (suite !== 'e2e') return {}
  const cluster = await openCluster()
  const chromium = await session.step('Chromium', ensureChromium)
  const addresses = await startProduct(session, await makeTestDatabase(cluster, 'e2e'))
  return { addresses: { ...addresses, CHROMIUM: chromium } }
}

function runPrepared(suite, options) {
  if (CHECK_NAMES.includes(suite)) return runCheck(suite)
  return suite === 'e2e' ? runPlaywright(options) : runVitest(suite, options)
}

/** A suite whose set-up fails has failed once; the others still run. */
async function runSuite(session, suite, filters, openCluster) {
  try {
    const prepared = await prepare(session, suite, openCluster)
    const begun = Date.now()
    const outcome = await session.step(`Suite ${suite}`, async (note) => {
      const counts = await runPrepared(suite, { filters, ...prepared })
      note(`${counts.passed} passed${counts.failed > 0 ? `, ${counts.failed} FAILED` : ''}`)
      return counts
    })
    for (const failure of outcome.failures) console.log(failure.replace(/^/gm, '    | '))
    return { ...outcome, millis: Date.now() - begun }
  } catch (error) {
    if (session.isStopping) throw error
    console.log(describeFailure(error))
    return { suite, passed: 0, failed: 1, skipped: 0, millis: 0 }
  }
}

function printTable(outcomes) {
  const rows = outcomes.map(({ suite, passed, failed, skipped, millis }) => {
    return [suite, passed, failed, skipped, formatSeconds(millis)].map(String)
  })
  console.log('')
  for (const [suite, ...cells] of [['suite', 'passed', 'failed', 'skipped', 'time'], ...rows]) {
    console.log(`  ${suite.padEnd(12)}${cells.map((cell) => cell.padStart(10)).join('')}`)
  }
  console.log(`\n  ${formatSeconds(Date.now() - startedAt)} in all\n`)
}

async function main(session) {
  const { suites, filters } = readArguments(process.argv.slice(2))
  makeDataFolder(dataFolder)
  const lock = takeLock('test')
  session.defer(lock.release)
  await session.step('Packages', (note) => ensureDependencies('test', note))
  const openCluster = createClusterOpener(session)
  if (suites.includes(BENCH)) return runBench(session, await openCluster(), filters)

  const outcomes = []
  for (const suite of suites) outcomes.push(await runSuite(session, suite, filters, openCluster))
  printTable(outcomes)
  const sum = (key) => outcomes.reduce((total, outcome) => total + outcome[key], 0)
  session.farewell = `${sum('passed')} passed, ${sum('failed')} failed`
  return sum('failed') > 0 ? 1 : 0
}

// Whatever stops the run before the suites is a failure too.
await new Session({ farewell: '0 passed, 1 failed' }).run(main)
