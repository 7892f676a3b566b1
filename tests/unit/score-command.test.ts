// `npm run score` as a command: one document out, nothing else; a bad document exits 2 with its faults on standard error.
import { spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { describe, expect, test } from 'vitest'
import type { Judgement } from '@/lib/advice/types'
import { scoreExample } from '../support/score-example'

const SLOW = 60_000

/** As package.json runs it, with an environment that holds no settings. */
function score(input: string, args: string[] = []) {
  const environment = { PATH: process.env.PATH ?? '', HOME: tmpdir(), NODE_ENV: 'production' as const }
  return spawnSync('node', ['--import', 'tsx', 'jobs/score.ts', ...args], { input, encoding: 'utf8', env: environment })
}

type WithTexts = Judgement & { hours: { reasons: { code: string; text: string; factor: number }[] }[] }

describe('npm run score', () => {
  test(
    'reads standard input and a file alike, and writes one JSON document with a sentence for every reason',
    () => {
      const text = JSON.stringify(scoreExample())
      const folder = mkdtempSync(join(tmpdir(), 'score-'))
      writeFileSync(join(folder, 'example.json'), text)
      const piped = score(text)
      const fromFile = score('', [join(folder, 'example.json')])
      rmSync(folder, { recursive: true })
      expect(piped.stderr).toBe('')
      expect(piped.status).toBe(0)
      expect(fromFile.stdout).toBe(piped.stdout)
      const output = JSON.parse(piped.stdout) as WithTexts
      expect(Object.keys(output)).toEqual(
        expect.arrayContaining(['modelVersion', 'hours', 'windows', 'plan', 'fill', 'thaws']),
      )
      expect(output.hours).toHaveLength(48)
      for (const { reasons } of output.hours) {
        for (const reason of reasons) expect(reason.text).toMatch(/^\S.*\.$/)
      }
      expect(output.windows[0]?.kind).toBe('flood')
      expect(output.plan.passes.length).toBeGreaterThan(0)
    },
    SLOW,
  )

  test(
    'exits 2 with the JSON path, and writes nothing on standard output',
    () => {
      const { hours, ...rest } = scoreExample()
      const withHours = (change: (one: object[]) => object[]) => JSON.stringify({ ...rest, hours: change([...hours]) })
      const withHour = (index: number, change: object) =>
        withHours((all) => all.map((one, at) => (at === index ? { ...one, ...change } : one)))
      for (const [text, path] of [
        [withHour(3, { airTemperatureC: 60 }), 'hours[3].airTemperatureC: expected'],
        [withHour(3, { airTemperatureC: 'x' }).replace('"x"', 'NaN'), 'hours[3].airTemperatureC: expected'],
        [withHour(4, { relativeHumidity: 140 }), 'hours[4].relativeHumidity: expected'],
        [withHour(6, { precipitationMm: -0.1 }), 'hours[6].precipitationMm: expected'],
        [withHours((all) => all.filter((_, at) => at !== 8)), 'hours[8].time: expected'],
        [withHours((all) => [...all.slice(0, 9), ...all.slice(8)]), 'hours[9].time: expected'],
        [withHours((all) => all.reverse()), 'hours[1].time: expected'],
        [withHours(() => []), 'hours: expected at least one hour'],
        ['not json', '(document): expected one JSON document'],
        ['[]', '(document): '],
      ] as const) {
        const result = score(text)
        expect(result.status).toBe(2)
        expect(result.stdout).toBe('')
        expect(result.stderr.startsWith(path), result.stderr).toBe(true)
        expect(result.stderr.trimEnd().split('\n')).toHaveLength(1)
      }
    },
    SLOW,
  )
})
