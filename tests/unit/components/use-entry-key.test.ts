// The key of an entry over what happens to its form: the page rendered anew, an answer that is lost, a save.
import { expect, test } from 'vitest'
import { keepKey, type KeptKey } from '@/components/hooks/use-entry-key'
import { IDLE, type FormState } from '@/lib/http/form-state'

const start: KeptKey = { key: 'a', seen: IDLE, isSpent: false }
const LOST: FormState = { status: 'error' }
const SAVED: FormState = { status: 'ok' }
const through = (steps: [FormState, string][]) =>
  steps.reduce((kept, [state, offered]) => keepKey(kept, state, offered), start).key

test('a page rendered each minute leaves it, also between a lost answer and the next try', () => {
  expect(through([[IDLE, 'b']])).toBe('a')
  expect(
    through([
      [LOST, 'a'],
      [LOST, 'b'],
    ]),
  ).toBe('a')
})

test('once saved, the next entry has the key that the page brings next, whichever comes first', () => {
  expect(through([[SAVED, 'b']])).toBe('b')
  expect(
    through([
      [IDLE, 'b'],
      [SAVED, 'b'],
      [SAVED, 'c'],
    ]),
  ).toBe('b')
  expect(through([[SAVED, 'a']])).toBe('a')
  expect(
    through([
      [SAVED, 'a'],
      [LOST, 'a'],
      [LOST, 'b'],
    ]),
  ).toBe('b')
})
