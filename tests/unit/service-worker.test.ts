// The service worker beside a browser's own parts: what it keeps, forgets, sends again and gives up.
import { readFileSync } from 'node:fs'
import { runInNewContext } from 'node:vm'
import { beforeEach, expect, test } from 'vitest'

const SHEET = '/rinks/6b203df5-2bdf-4757-a047-5c08e20f33d1'
const SOURCE = readFileSync('public/sw.js', 'utf8')

type Answer = (path: string, body: unknown) => Promise<Response>

/** A browser with one worker: its caches, its database of check-offs and its network. */
function givenWorker() {
  const listeners = new Map<string, (event: object) => void>()
  const stores = new Map<string, Map<string, Response>>()
  const checkOffs = new Map<string, object>()
  const browser = {
    stores,
    checkOffs,
    endpoint: 'https://push.example/new' as string | undefined,
    network: (async () => new Response(null, { status: 204 })) as Answer,
    asked: [] as string[],
    /** Dispatches an event and waits for all that it asked to wait for. */
    async dispatch(type: string, event: object): Promise<Response | undefined> {
      const waits: unknown[] = []
      let answer: Promise<Response> | undefined
      const respondWith = (given: Promise<Response>) => (answer = given)
      listeners.get(type)?.({ ...event, waitUntil: (wait: unknown) => waits.push(wait), respondWith })
      const response = await answer
      for (let next = 0; next < waits.length; next++) await waits[next]
      return response
    },
  }
  const open = async (name: string) => {
    const store = stores.get(name) ?? stores.set(name, new Map()).get(name)!
    return {
      match: async (key: string) => store.get(key)?.clone(),
      put: async (key: string, response: Response) => void store.set(key, response),
      delete: async (key: string) => store.delete(key),
      keys: async () => [...store.keys()],
    }
  }
  const caches = { open, delete: async (name: string) => stores.delete(name), keys: async () => [...stores.keys()] }
  const done = (result: unknown) => {
    const request: { result: unknown; onsuccess?: () => void } = { result }
    queueMicrotask(() => request.onsuccess?.())
    return request
  }
  const objectStore = () => ({
    getAll: () => done([...checkOffs.values()]),
    put: (value: object, key: string) => done(checkOffs.set(key, value)),
    delete: (key: string) => done(checkOffs.delete(key)),
  })
  const fetch = (request: string | { url: string }, options: { body?: string } = {}) => {
    const path = typeof request === 'string' ? request : new URL(request.url).pathname
    browser.asked.push(path)
    return browser.network(path, options.body && JSON.parse(options.body))
  }
  const self = {
    addEventListener: (type: string, listener: (event: object) => void) => listeners.set(type, listener),
    location: { origin: 'https://rink.example' },
    clients: { matchAll: async () => [] },
    registration: {
      pushManager: { getSubscription: async () => browser.endpoint && { endpoint: browser.endpoint } },
    },
  }
  const indexedDB = { open: () => done({ transaction: () => ({ objectStore }) }) }
  runInNewContext(SOURCE, { self, caches, fetch, indexedDB, Response, URL, setTimeout, Date, console })
  return browser
}

let browser: ReturnType<typeof givenWorker>
beforeEach(() => {
  browser = givenWorker()
})

const page = () => new Response('<title>Birch Lane</title>', { headers: { Date: new Date(0).toUTCString() } })
const opens = (path: string) => ({
  request: { url: `https://rink.example${path}`, method: 'GET', mode: 'navigate', headers: new Headers() },
})
const posts = (path: string) => ({ request: { url: `https://rink.example${path}`, method: 'POST', mode: 'cors' } })
const keptSheets = () => [...(browser.stores.get('night-sheets-1')?.keys() ?? [])]

test('a sheet that was opened is kept, and forgotten when somebody signs in or out', async () => {
  browser.network = async () => page()
  await browser.dispatch('fetch', opens(SHEET))
  expect(keptSheets()).toEqual([SHEET])
  await browser.dispatch('message', { data: 'forget', ports: [] })
  expect(keptSheets()).toEqual([])
})

test.each([
  ['the page signs out', () => browser.dispatch('message', { data: 'forget', ports: [] })],
  ['a form of the door is sent', () => browser.dispatch('fetch', posts('/sign-out'))],
])('a sheet that arrives after %s is not kept', async (_when, leave) => {
  const arrivals: ((response: Response) => void)[] = []
  browser.network = () => new Promise((resolve) => arrivals.push(resolve))
  const underWay = [
    browser.dispatch('fetch', opens(SHEET)),
    browser.dispatch('message', { data: { sheet: SHEET, isChanged: true } }),
  ]
  await new Promise((resolve) => setTimeout(resolve, 0))
  await leave()
  expect(arrivals).toHaveLength(2)
  for (const arrive of arrivals) arrive(page())
  await Promise.all(underWay)
  expect(keptSheets()).toEqual([])
})

const checkOff = (entryKey: string) => ({ entryKey, rinkId: SHEET.slice(7), passNumber: 1 })

test.each([401, 409, 429, 503])('a check-off that meets %i stays to be sent', async (status) => {
  browser.checkOffs.set('one', checkOff('one'))
  browser.network = async () => Response.json({ error: { message: 'No.' } }, { status })
  await expect(browser.dispatch('sync', { tag: 'check-offs' })).rejects.toThrow('still to be sent')
  expect([...browser.checkOffs.values()]).toEqual([checkOff('one')])
})

test('a check-off that is taken goes, and one that is refused says why', async () => {
  browser.checkOffs.set('taken', checkOff('taken'))
  browser.checkOffs.set('late', checkOff('late'))
  browser.network = async (_path, body) =>
    (body as { entryKey: string }).entryKey === 'taken'
      ? new Response(null, { status: 204 })
      : Response.json({ error: { message: 'Too late.' } }, { status: 422 })
  await browser.dispatch('sync', { tag: 'check-offs' })
  expect([...browser.checkOffs.values()]).toEqual([{ ...checkOff('late'), refused: 'Too late.' }])
})

const change = () => {
  const subscription = { endpoint: 'https://push.example/new' }
  return {
    oldSubscription: { endpoint: 'https://push.example/old' },
    newSubscription: { ...subscription, toJSON: () => subscription },
  }
}
const told = () => browser.asked.filter((path) => path === '/api/push-subscriptions').length

test('a push address that the server did not hear of is told again with the next page, until it has answered', async () => {
  browser.network = async () => Promise.reject(new TypeError('no network'))
  await browser.dispatch('pushsubscriptionchange', change())
  browser.network = async () => new Response(null, { status: 503 })
  await browser.dispatch('fetch', opens('/rinks'))
  expect(told()).toBe(2)
  const bodies: unknown[] = []
  browser.network = async (path, body) => {
    if (path === '/api/push-subscriptions') bodies.push(body)
    return new Response('{}')
  }
  await browser.dispatch('fetch', opens('/rinks'))
  await browser.dispatch('fetch', opens('/rinks'))
  expect(bodies).toEqual([
    { oldEndpoint: 'https://push.example/old', subscription: { endpoint: 'https://push.example/new' } },
  ])
})

test('a device that was switched off meanwhile is not switched on again', async () => {
  browser.network = async () => Promise.reject(new TypeError('no network'))
  await browser.dispatch('pushsubscriptionchange', change())
  browser.endpoint = undefined
  browser.network = async () => new Response('{}')
  await browser.dispatch('fetch', opens('/rinks'))
  expect(told()).toBe(1)
})
