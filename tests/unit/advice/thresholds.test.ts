// The rules that the thresholds name exist, and come from the source that is named.
import { existsSync, readFileSync } from 'node:fs'
import { describe, expect, test } from 'vitest'

const RULES = '../shared/reference/rules.json'

interface Rule {
  id: string
  source: string
}

/** "C23: Copperfield Mahogany (below …)" in the comments of thresholds.ts. */
function namedRules(): { id: string; name: string }[] {
  const text = readFileSync('lib/advice/thresholds.ts', 'utf8').replaceAll(/\n\s*\*?/g, ' ')
  return [...text.matchAll(/\b([A-Q]\d\d): ([A-ZÉ][^,.;()]*)/g)].map(([, id = '', name = '']) => ({
    id,
    name: name.trim(),
  }))
}

const plain = (text: string) =>
  text
    .normalize('NFD')
    .replaceAll(/[^A-Za-z ]/g, '')
    .toLowerCase()

test('thresholds name rules', () => {
  expect(namedRules().length).toBeGreaterThan(25)
})

/** Each top-level entry of each table in thresholds.ts, with the comment it stands under. */
function entriesWithComments(): { name: string; comment: string }[] {
  const entries: { name: string; comment: string }[] = []
  let table = ''
  let comment = ''
  let isInComment = false
  for (const line of readFileSync('lib/advice/thresholds.ts', 'utf8').split('\n')) {
    const started = /^export const (\w+)/.exec(line)
    if (started) [table, comment] = [started[1] ?? '', '']
    if (line.startsWith('  /**')) [comment, isInComment] = ['', true]
    if (isInComment) comment += line
    if (line.includes('*/')) isInComment = false
    const entry = /^ {2}(\w+):/.exec(line)
    if (entry && table) entries.push({ name: `${table}.${entry[1]}`, comment })
  }
  return entries
}

test('each threshold says which rule it rests on, which source, or that it is ours', () => {
  const entries = entriesWithComments()
  expect(entries.length).toBeGreaterThan(50)
  const says = /Rules? [A-Q]\d\d|\bours\b|common practice|derived|\b(19|20)\d\d\b|\bPS 20\b/i
  expect(entries.filter(({ comment }) => !says.test(comment)).map(({ name }) => name)).toEqual([])
})

describe.skipIf(!existsSync(RULES))('each rule', () => {
  test('is in the collection, from the source that is named', () => {
    const rules = new Map(
      (JSON.parse(readFileSync(RULES, 'utf8')) as Rule[]).map((rule) => [rule.id, plain(rule.source)]),
    )
    const wrong = namedRules().filter(({ id, name }) => {
      const words = plain(name)
        .split(' ')
        .filter((word) => word.length > 3)
      return !words.some((word) => rules.get(id)?.includes(word))
    })
    expect(wrong).toEqual([])
  })
})
