// The browser's reader of our route handlers, against answers intercepted on the wire.
import { http, HttpResponse } from 'msw'
import { setupServer } from 'msw/node'
import { afterAll, afterEach, beforeAll, describe, expect, test } from 'vitest'
import { fetchJson, FetchJsonError } from '@/lib/http/fetch-json'

const ADDRESS = 'https://rink.example/api/rinks/1/outlook'
const server = setupServer()

beforeAll(() => server.listen({ onUnhandledRequest: 'error' }))
afterEach(() => server.resetHandlers())
afterAll(() => server.close())

const answer = (response: () => Response) => server.use(http.get(ADDRESS, response))

test('gives the body, and asks for one that no cache kept', async () => {
  let accept: string | null = null
  server.use(
    http.get(ADDRESS, ({ request }) => {
      accept = request.headers.get('accept')
      return HttpResponse.json({ readAt: 'now' })
    }),
  )
  expect(await fetchJson(ADDRESS)).toEqual({ readAt: 'now' })
  expect(accept).toBe('application/json')
})

describe('refusals', () => {
  test('carry the status and the server’s own words', async () => {
    answer(() => HttpResponse.json({ error: { code: 'not_found', message: 'Rink not found.' } }, { status: 404 }))
    await expect(fetchJson(ADDRESS)).rejects.toMatchObject({ status: 404, message: 'Rink not found.' })
  })

  test('of a proxy that speaks HTML get plain words', async () => {
    answer(() => HttpResponse.html('<h1>Bad gateway</h1>', { status: 502 }))
    const failure = await fetchJson(ADDRESS).catch((error: unknown) => error)
    expect(failure).toBeInstanceOf(FetchJsonError)
    expect(failure).toMatchObject({ status: 502, message: 'The server did not answer as it should.' })
  })

  test('of the network are no refusals of ours', async () => {
    answer(() => HttpResponse.error())
    await expect(fetchJson(ADDRESS)).rejects.toBeInstanceOf(TypeError)
  })
})
