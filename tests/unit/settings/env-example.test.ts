// .env.example is the list of settings that people read, and that a test run keeps out of its environment.
import fs from 'node:fs'
import { expect, test } from 'vitest'

const read = (file: string) => fs.readFileSync(new URL(`../../../${file}`, import.meta.url), 'utf8')
const namesIn = (text: string, pattern: RegExp) => [...text.matchAll(pattern)].map(([, name]) => name)

test('.env.example names every setting that lib/env.ts parses', () => {
  const parsed = namesIn(read('lib/env.ts'), /^ {2}([A-Z][A-Z0-9_]+): z/gm)
  expect(parsed).toContain('DATABASE_URL')
  expect(namesIn(read('.env.example'), /^# ([A-Z][A-Z0-9_]+)=/gm)).toEqual(expect.arrayContaining(parsed))
})
