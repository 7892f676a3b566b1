// What a route handler answers: its own answer, or one translation of what went wrong.
import { notFound } from 'next/navigation'
import { afterEach, expect, test, vi } from 'vitest'
import { z } from 'zod'
import {
  ConflictError,
  ForbiddenError,
  InvalidInputError,
  NotFoundError,
  NotSignedInError,
  OtherAccountError,
  RateLimitedError,
} from '@/lib/errors'
import { readJson } from '@/lib/http/read-json'
import { route } from '@/lib/http/route'

const URL_HERE = 'https://rink.example/api/things'

afterEach(() => {
  vi.restoreAllMocks()
})

function post(body: BodyInit | null, headers: Record<string, string> = {}): Request {
  const init = { method: 'POST', body, headers: { origin: 'https://rink.example', host: 'rink.example', ...headers } }
  return new Request(URL_HERE, init)
}

function failing(error: unknown) {
  return route(async () => {
    throw error
  })
}

test('an answer passes through', async () => {
  const answer = await route(async () => Response.json({ mm: 3 }))(new Request(URL_HERE), {})
  expect([answer.status, await answer.json()]).toEqual([200, { mm: 3 }])
})

test.each([
  [
    new InvalidInputError('No.', { flow: 'Too much.' }),
    422,
    { code: 'invalid_input', message: 'No.', fields: { flow: 'Too much.' } },
  ],
  [new NotSignedInError(), 401, { code: 'not_signed_in', message: 'Sign in first.' }],
  [new NotFoundError('Rink'), 404, { code: 'not_found', message: 'Rink not found.' }],
  [new ForbiddenError(), 403, { code: 'forbidden', message: 'Your role on this rink does not allow that.' }],
  [
    new OtherAccountError(),
    409,
    { code: 'other_account', message: 'Somebody else is signed in here. Sign in as the person who entered this.' },
  ],
  [new ConflictError('Taken.'), 409, { code: 'conflict', message: 'Taken.' }],
])('%o becomes its status', async (error, status, fault) => {
  const answer = await failing(error)(new Request(URL_HERE), {})
  expect([answer.status, await answer.json()]).toEqual([status, { error: fault }])
  expect(answer.headers.get('cache-control')).toBe('no-store')
})

test('a limit says how long to wait', async () => {
  const answer = await failing(new RateLimitedError(90))(new Request(URL_HERE), {})
  expect([answer.status, answer.headers.get('retry-after')]).toEqual([429, '90'])
})

test.each([
  [30, '1 minute'],
  [90, '2 minutes'],
  [12 * 60, '12 minutes'],
  [3600, '60 minutes'],
  [3601, '2 hours'],
])('a wait of %i s is said as %s', (seconds, wait) => {
  expect(new RateLimitedError(seconds).message).toBe(`Too many tries. Try again in ${wait}.`)
})

test('a bug is logged and shows no internals', async () => {
  const log = vi.spyOn(process.stderr, 'write').mockReturnValue(true)
  const answer = await failing(new Error('password of the database is x'))(new Request(`${URL_HERE}?key=secret`), {})
  expect(answer.status).toBe(500)
  expect(await answer.text()).not.toContain('database')
  expect(log.mock.calls[0]?.[0]).toContain('route.failed')
  expect(log.mock.calls[0]?.[0]).not.toContain('secret')
})

test('what Next throws for itself reaches Next', async () => {
  await expect(route(async () => notFound())(new Request(URL_HERE), {})).rejects.toThrow('NEXT_HTTP_ERROR_FALLBACK')
})

const echo = route(async (request: Request) =>
  Response.json(await readJson(request, z.object({ mm: z.number('A number.') }))),
)

test('a body that does not fit is refused by field', async () => {
  const answer = await echo(post('{"mm":"three"}'), {})
  expect([answer.status, await answer.json()]).toMatchObject([
    422,
    { error: { code: 'invalid_input', fields: { mm: 'A number.' } } },
  ])
})

test.each(['', '{"mm":', 'mm=3'])('a body that is not JSON is refused: %o', async (body) => {
  expect((await echo(post(body), {})).status).toBe(422)
})

test('ten megabytes are refused by their announced length, unread', async () => {
  const request = post('x'.repeat(10_000_000), { 'content-length': '10000000' })
  expect((await echo(request, {})).status).toBe(413)
  expect(request.bodyUsed).toBe(false)
})

test('an endless body is cut off soon after the limit', async () => {
  let sent = 0
  const endless = new ReadableStream<Uint8Array>({
    pull(controller) {
      sent += 1024
      controller.enqueue(new Uint8Array(1024))
    },
  })
  const headers = { origin: 'https://rink.example', host: 'rink.example' }
  const request = new Request(URL_HERE, { method: 'POST', body: endless, headers, duplex: 'half' } as RequestInit)
  expect((await echo(request, {})).status).toBe(413)
  expect(sent).toBeLessThan(80 * 1024)
})

test.each([
  ['another site', { origin: 'https://evil.example', host: 'rink.example' }],
  ['an opaque origin', { origin: 'null', host: 'rink.example' }],
  ['another port', { origin: 'https://rink.example:8443', host: 'rink.example' }],
  ['nowhere', { host: 'rink.example' }],
  ['nowhere, from another site', { host: 'rink.example', 'sec-fetch-site': 'cross-site' }],
])('a write from %s is refused before the handler runs', async (_from, headers) => {
  const handler = vi.fn(async () => Response.json({}))
  const answer = await route(handler)(
    new Request(URL_HERE, { method: 'DELETE', headers: new Headers(headers as Record<string, string>) }),
    {},
  )
  expect(answer.status).toBe(403)
  expect(handler).not.toHaveBeenCalled()
})

test('a write without Origin counts when the browser says that it is our own', async () => {
  const headers = { host: 'rink.example', 'sec-fetch-site': 'same-origin' }
  const answer = await route(async () => Response.json({}))(new Request(URL_HERE, { method: 'POST', headers }), {})
  expect(answer.status).toBe(200)
})

test('reads, and calls that nobody’s session vouches for, may come from anywhere', async () => {
  const handler = async () => Response.json({})
  const evil = { origin: 'https://evil.example', host: 'rink.example' }
  expect((await route(handler)(new Request(URL_HERE, { headers: evil }), {})).status).toBe(200)
  const open = route(handler, { acceptsAnyOrigin: true })
  expect((await open(new Request(URL_HERE, { method: 'POST', headers: evil }), {})).status).toBe(200)
})
