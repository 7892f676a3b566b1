// What a form shows after its action: the faults of its fields, a refusal in words, and a breakdown that loses nothing.
import { afterEach, expect, test, vi } from 'vitest'
import { z } from 'zod'
import { ConflictError, InvalidInputError } from '@/lib/errors'
import { formAction } from '@/lib/http/form-action'
import { IDLE } from '@/lib/http/form-state'

const schema = z.object({ name: z.string().min(3, 'Three letters at least.'), password: z.string().optional() })
const typed = { name: 'Birch Lane', password: 'not to be sent back' }

function run(work: () => Promise<string | void>, fields: Record<string, string> = typed) {
  const formData = new FormData()
  for (const [name, value] of Object.entries(fields)) formData.set(name, value)
  return formAction(schema, work)(IDLE, formData)
}

afterEach(() => vi.restoreAllMocks())

test('good news comes with what was typed, never with a password', async () => {
  expect(await run(async () => 'Saved.')).toEqual({ status: 'ok', message: 'Saved.', values: { name: 'Birch Lane' } })
})

test('what the schema refuses stands at its field, and nothing is done', async () => {
  const work = vi.fn(async () => undefined)
  const state = await run(work, { name: 'B' })
  expect(state).toMatchObject({ status: 'error', fields: { name: 'Three letters at least.' }, values: { name: 'B' } })
  expect(work).not.toHaveBeenCalled()
})

test('a refusal is said in its own words', async () => {
  const refused = await run(() => Promise.reject(new InvalidInputError('No.', { name: 'That name is taken.' })))
  expect(refused).toMatchObject({ message: 'No.', fields: { name: 'That name is taken.' } })
  const overtaken = await run(() => Promise.reject(new ConflictError('Somebody was faster.', { version: '2' })))
  expect(overtaken).toMatchObject({ message: 'Somebody was faster.', latest: { version: '2' } })
})

test('a breakdown keeps what was typed, tells no inside, and is logged', async () => {
  const log = vi.spyOn(process.stderr, 'write').mockReturnValue(true)
  const state = await run(() => Promise.reject(new Error('connect ECONNREFUSED 127.0.0.1:5432')))
  expect(state).toMatchObject({ status: 'error', values: { name: 'Birch Lane' } })
  expect(JSON.stringify(state)).not.toContain('5432')
  expect(log.mock.calls.join()).toContain('action.failed')
})
