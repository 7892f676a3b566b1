// The suites of `npm test`: how each is run, and how its outcome is counted.
import fs from 'node:fs'
import path from 'node:path'

import { cleanEnvironment, dataFolder, inProject, projectFolder } from '../../jobs/local/project.mjs'
import { runForCode, tail } from '../../lib/machine/processes.mjs'

import { readPlaywright, readVitest } from './results.mjs'

/** Reports of the tools, and what the fakes keep while e2e runs. */
export const testFolder = path.join(dataFolder, 'test')

const program = (name) => path.join(projectFolder, 'node_modules', name)
const NEXT = program('next/dist/bin/next')

/** Checks that count as one test each: the commands have to succeed one after the other. */
const CHECKS = {
  types: [
    [NEXT, 'typegen'],
    [program('typescript/bin/tsc'), '--noEmit'],
  ],
  lint: [[program('eslint/bin/eslint.js'), '.', '--max-warnings', '0']],
  format: [[program('prettier/bin/prettier.cjs'), '--check', '.']],
}
export const CHECK_NAMES = Object.keys(CHECKS)
export const VITEST_NAMES = ['unit', 'contract', 'integration']
export const SUITE_NAMES = [...CHECK_NAMES, ...VITEST_NAMES, 'e2e']

function environment(extra = {}) {
  const env = { ...cleanEnvironment(), NEXT_TELEMETRY_DISABLED: '1', ...extra }
  // Each tool sets its own when there is none.
  if (!extra.NODE_ENV) delete env.NODE_ENV
  return env
}

// A test that never ends must not hold up whoever waits for the last line.
const LIMIT_MILLIS = 20 * 60_000

function run(suite, words, env) {
  const options = { ...inProject(`test-${suite}`, env), limitMillis: LIMIT_MILLIS }
  return runForCode(suite, process.execPath, words, options)
}

/** A tool that fails without naming a test, or that finds none, has failed once. */
function settle(suite, code, counts) {
  const { passed = 0, failed = 0, skipped = 0, failures = [] } = counts ?? {}
  if (failed > 0 || (code === 0 && passed > 0)) return { suite, passed, failed, skipped, failures }
  const why = code === 0 ? 'ran no test' : `exit code ${code}\n${tail(inProject(`test-${suite}`).logFile)}`
  return { suite, passed, failed: 1, skipped, failures: [`${suite}: ${why}`] }
}

export async function runCheck(suite) {
  for (const words of CHECKS[suite]) {
    const code = await run(suite, words, environment())
    if (code !== 0) return settle(suite, code)
  }
  return settle(suite, 0, { passed: 1 })
}

/** The file of a report, without the one of an earlier run. */
function freshReport(suite) {
  fs.mkdirSync(testFolder, { recursive: true })
  const file = path.join(testFolder, `${suite}.json`)
  fs.rmSync(file, { force: true })
  return file
}

/** `filters` are file names or options for the tool. */
export async function runVitest(suite, { filters = [], databaseUrl }) {
  const report = freshReport(suite)
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`]
  const env = environment(databaseUrl ? { DATABASE_URL: databaseUrl } : {})
  if (!databaseUrl) delete env.DATABASE_URL
  const code = await run(
    suite,
    [program('vitest/vitest.mjs'), 'run', '--project', suite, ...reporters, ...filters],
    env,
  )
  return settle(suite, code, readVitest(report, projectFolder))
}

/** `addresses` tell the journeys where everything listens. */
export async function runPlaywright({ filters = [], addresses }) {
  const report = freshReport('e2e')
  const env = environment({ ...addresses, E2E_REPORT: report })
  const code = await run('e2e', [program('@playwright/test/cli.js'), 'test', ...filters], env)
  return settle('e2e', code, readPlaywright(report))
}
