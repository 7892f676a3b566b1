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
      const input = scoreExample()
      const spoiled = {
        ...input,
        hours: input.hours.map((hour, index) => (index === 3 ? { ...hour, airTemperatureC: 60 } : hour)),
      }
      for (const [text, path] of [
        [JSON.stringify(spoiled), 'hours[3].airTemperatureC: expected'],
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
