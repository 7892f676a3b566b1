// What a form gets to know after its action ran.
import { redirect } from 'next/navigation'
import { describe, expect, test } from 'vitest'
import { z } from 'zod'
import { ForbiddenError, InvalidInputError, NotFoundError } from '@/lib/errors'
import { atLeast } from '@/lib/http/at-least'
import { formAction } from '@/lib/http/form-action'
import { IDLE } from '@/lib/http/form-state'
import { orNotFound } from '@/lib/http/or-not-found'

const schema = z.object({
  flow: z.coerce.number('A number.').max(200, 'At most 200.'),
  password: z.string().optional(),
})

function form(fields: Record<string, string | File>): FormData {
  const data = new FormData()
  for (const [name, value] of Object.entries(fields)) data.set(name, value)
  return data
}

describe('formAction', () => {
  test('shows the good news and what was sent', async () => {
    const action = formAction(schema, async ({ flow }) => `${flow} L/min.`)
    const state = await action(IDLE, form({ flow: '25' }))
    expect(state).toEqual({ status: 'ok', message: '25 L/min.', values: { flow: '25' } })
  })

  test('keeps what was typed, but never a password, a file or a field of Next', async () => {
    const action = formAction(schema, async () => undefined)
    const typed = {
      flow: '500',
      password: 'a',
      newPassword: 'b',
      note: 'icy',
      $ACTION_KEY: 'x',
      photo: new File(['x'], 'x.jpg'),
    }
    expect(await action(IDLE, form(typed))).toEqual({
      status: 'error',
      message: 'Some entries need another look.',
      fields: { flow: 'At most 200.' },
      values: { flow: '500', note: 'icy' },
    })
  })

  test('shows what a service refused, at its field', async () => {
    const refused = formAction(schema, async () => {
      throw new InvalidInputError('No.', { flow: 'Not that much.' })
    })
    expect(await refused(IDLE, form({ flow: '1' }))).toMatchObject({
      message: 'No.',
      fields: { flow: 'Not that much.' },
    })
    const forbidden = formAction(schema, async () => {
      throw new ForbiddenError()
    })
    expect(await forbidden(IDLE, form({ flow: '1' }))).toMatchObject({ status: 'error', values: { flow: '1' } })
  })

  test('lets redirects and bugs through', async () => {
    const away = formAction(schema, async () => redirect('/rinks'))
    await expect(away(IDLE, form({ flow: '1' }))).rejects.toThrow('NEXT_REDIRECT')
    const broken = formAction(schema, async () => {
      throw new TypeError('a bug')
    })
    await expect(broken(IDLE, form({ flow: '1' }))).rejects.toThrow(TypeError)
  })
})

describe('orNotFound', () => {
  test.each([new NotFoundError('Rink'), z.uuid().safeParse('x').error])(
    '%o looks like a page that does not exist',
    async (error) => {
      await expect(orNotFound(Promise.reject(error))).rejects.toThrow('NEXT_HTTP_ERROR_FALLBACK;404')
    },
  )

  test('anything else passes', async () => {
    await expect(orNotFound(Promise.resolve(3))).resolves.toBe(3)
    await expect(orNotFound(Promise.reject(new TypeError('a bug')))).rejects.toThrow(TypeError)
  })
})

test('an answer that shall take a while takes it, well or ill', async () => {
  const startedAt = performance.now()
  await expect(atLeast(30, Promise.resolve(1))).resolves.toBe(1)
  await expect(atLeast(30, Promise.reject(new Error('no')))).rejects.toThrow('no')
  // Timers may fire a millisecond early.
  expect(performance.now() - startedAt).toBeGreaterThan(57)
})
