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
