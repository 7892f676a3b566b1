// Reads what the test tools write about a run, into one form: counts, and what failed in a line or two each.
import fs from 'node:fs'
import { stripVTControlCharacters } from 'node:util'

const MESSAGE_LINES = 20

const shorten = (message = '') =>
  stripVTControlCharacters(message).trim().split('\n').slice(0, MESSAGE_LINES).join('\n')

function readReport(file) {
  try {
    return JSON.parse(fs.readFileSync(file, 'utf8'))
  } catch {
    return undefined
  }
}

function count(tests) {
  const failures = tests.filter((test) => test.outcome === 'failed')
  return {
    passed: tests.filter((test) => test.outcome === 'passed').length,
    failed: failures.length,
    skipped: tests.filter((test) => test.outcome === 'skipped').length,
    failures: failures.map(({ name, message }) => `${name}\n${shorten(message)}`),
  }
}

function fromVitestFile(file, projectFolder) {
  const name = file.name.replace(`${projectFolder}/`, '')
  const tests = file.assertionResults.map((test) => ({
    name: `${name}: ${test.fullName}`,
    outcome: test.status === 'passed' || test.status === 'failed' ? test.status : 'skipped',
    message: test.failureMessages?.[0],
  }))
  // A file that cannot be loaded, or whose hooks fail, has no failed test to show for it.
  const isHidden = file.status === 'failed' && !tests.some((test) => test.outcome === 'failed')
  return isHidden ? [...tests, { name, outcome: 'failed', message: file.message }] : tests
}

/** Counts of Vitest's JSON report; undefined when there is none. */
export function readVitest(file, projectFolder) {
  const report = readReport(file)
  return report && count(report.testResults.flatMap((result) => fromVitestFile(result, projectFolder)))
}

function fromPlaywrightSuite(suite) {
  const own = (suite.specs ?? []).flatMap((spec) =>
    spec.tests.map((test) => ({
      name: `${spec.file}: ${spec.title}`,
      // 'flaky' passed at the second try only, which is a failure to be looked into.
      outcome: { expected: 'passed', skipped: 'skipped' }[test.status] ?? 'failed',
      message: test.results.flatMap((result) => result.errors ?? [])[0]?.message,
    })),
  )
  return [...own, ...(suite.suites ?? []).flatMap(fromPlaywrightSuite)]
}

/** Counts of Playwright's JSON report; undefined when there is none. */
export function readPlaywright(file) {
  const report = readReport(file)
  if (!report) return undefined
  const outside = (report.errors ?? []).map((error) => ({ name: 'e2e', outcome: 'failed', message: error.message }))
  return count([...report.suites.flatMap(fromPlaywrightSuite), ...outside])
}
