// Service worker: shows notifications, keeps the last good copy of each night sheet for when there is no network, and sends
// check-offs that were made without one.

const PAGES = 'night-sheets-1'
const FILES = 'files-1'
/** What the server has not been told yet. */
const UNTOLD = 'untold-1'
const NAMES = [PAGES, FILES, UNTOLD]
const MOST_PAGES = 10
const MOST_FILES = 120
/** A phone at the far end of a yard may hold a weak line for minutes. */
const PATIENCE_MILLIS = 4000
const FRESH_MILLIS = 10 * 60 * 1000

/** The Tonight page of a rink, which shows the age of its own forecast. Nothing else of a person's is kept. */
const NIGHT_SHEET = /^\/rinks\/[0-9a-f]{8}-[0-9a-f-]{27}$/
/** Pages through which one person leaves or another comes in. */
const DOORS = /^\/(sign-in|sign-up|sign-out|verify|reset)(\/|$)/
/** How a streamed page that answered 200 says that it was a redirect or not found, or that it broke. */
const REFUSED = /NEXT_REDIRECT|NEXT_HTTP_ERROR/
const BROKEN = /data-dgst="\d+"/

self.addEventListener('install', () => self.skipWaiting())
self.addEventListener('activate', (event) => event.waitUntil(takeOver()))

async function takeOver() {
  const names = await caches.keys()
  await Promise.all(names.filter((name) => !NAMES.includes(name)).map((name) => caches.delete(name)))
  await self.clients.claim()
}

// Notifications

self.addEventListener('push', (event) => event.waitUntil(showMessage(event.data)))

async function showMessage(data) {
  const {
    title = 'Nightsheet',
    body = 'There is news about your rink.',
    url = '/rinks',
    tag = 'news',
  } = readMessage(data)
  const [shown] = await self.registration.getNotifications({ tag })
  await self.registration.showNotification(title, {
    body,
    tag,
    // A repeat of the same words stays silent; changed words are worth a second sound.
    renotify: shown !== undefined && shown.body !== body,
    data: { url },
    icon: '/notification-icon.png',
    badge: '/notification-badge.png',
  })
}

/** Every push must show something, even one that cannot be read. */
function readMessage(data) {
  try {
    return data.json() ?? {}
  } catch {
    return {}
  }
}

self.addEventListener('notificationclick', (event) => {
  event.notification.close()
  event.waitUntil(openTab(event.notification.data?.url))
})

async function openTab(address) {
  const wanted = new URL(address ?? '/rinks', self.location.origin)
  const target = wanted.origin === self.location.origin ? wanted : new URL('/rinks', self.location.origin)
  const tabs = await self.clients.matchAll({ type: 'window', includeUncontrolled: true })
  const open = tabs.find((tab) => tab.url.split('#')[0] === target.href.split('#')[0])
  return open ? open.focus() : self.clients.openWindow(target.href)
}

const SUBSCRIPTIONS = '/api/push-subscriptions'

/** The browser gave the device a new address: without this its owner would stop hearing from us. */
self.addEventListener('pushsubscriptionchange', (event) => event.waitUntil(replaceSubscription(event)))

async function replaceSubscription({ oldSubscription, newSubscription }) {
  const subscription = newSubscription ?? (await subscribeAgain(oldSubscription))
  if (!subscription) return
  const body = JSON.stringify({ oldEndpoint: oldSubscription?.endpoint ?? null, subscription: subscription.toJSON() })
  const untold = await caches.open(UNTOLD)
  await untold.put(SUBSCRIPTIONS, new Response(body))
  await tellReplacement()
}

/** Also with every page, until the server has answered: a browser that starts up may have no network yet. */
async function tellReplacement() {
  const untold = await caches.open(UNTOLD)
  const body = await (await untold.match(SUBSCRIPTIONS))?.text()
  if (!body) return
  const present = await self.registration.pushManager.getSubscription()
  // Switched off meanwhile, or replaced once more: then this is no news.
  const isNews = present?.endpoint === JSON.parse(body).subscription.endpoint
  const headers = { 'Content-Type': 'application/json' }
  const response = isNews && (await fetch(SUBSCRIPTIONS, { method: 'PUT', headers, body }).catch(() => null))
  if (!isNews || isLastWord(response)) await untold.delete(SUBSCRIPTIONS)
}

function subscribeAgain(oldSubscription) {
  const applicationServerKey = oldSubscription?.options.applicationServerKey
  return (
    applicationServerKey && self.registration.pushManager.subscribe({ userVisibleOnly: true, applicationServerKey })
  )
}

// Copies for when there is no network

self.addEventListener('fetch', (event) => {
  const { request } = event
  const url = new URL(request.url)
  if (url.origin !== self.location.origin) return
  // Somebody signs in or out: whoever comes next must not find the sheets of whoever was here before.
  if (request.method === 'POST' && DOORS.test(url.pathname)) event.waitUntil(forget([PAGES]))
  if (request.method !== 'GET') return
  if (request.mode === 'navigate') event.waitUntil(tellReplacement())
  if (url.pathname.startsWith('/_next/static/')) event.respondWith(answerFile(event))
  else if (request.mode === 'navigate') event.respondWith(answerPage(event, url.pathname))
  else if (NIGHT_SHEET.test(url.pathname) && isVisit(request)) event.waitUntil(keepFresh(url.pathname))
})

// Check-offs made without a network; names as in components/rinks/kept-check-offs.ts

const DATABASE = 'nightsheet'
const CHECK_OFFS = 'check-offs'
/** Sign-in, waiting, another account signed in and broken servers pass; other refusals are the last word. */
const PASSING = [401, 408, 409, 425, 429]

function isLastWord(response) {
  return response !== null && response.status < 500 && !PASSING.includes(response.status)
}

self.addEventListener('sync', (event) => {
  if (event.tag === CHECK_OFFS) event.waitUntil(sendCheckOffs())
})

/** Throws when some are left, so that the browser tries again. */
async function sendCheckOffs() {
  const store = await openCheckOffs()
  const kept = await answerOf(store('readonly').getAll())
  const left = await Promise.all(kept.filter((one) => !one.refused).map((one) => sendCheckOff(store, one)))
  const pages = await self.clients.matchAll({ type: 'window' })
  for (const page of pages) page.postMessage('check-offs-sent')
  if (left.some((isLeft) => isLeft)) throw new Error('Some check-offs are still to be sent.')
}

async function sendCheckOff(store, checkOff) {
  const response = await fetch(`/api/rinks/${checkOff.rinkId}/check-offs`, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json' },
    body: JSON.stringify(checkOff),
  }).catch(() => null)
  if (!isLastWord(response)) return true
  if (response.ok) {
    await answerOf(store('readwrite').delete(checkOff.entryKey))
    return false
  }
  const answer = await response.json().catch(() => ({}))
  const refused = answer.error?.message ?? 'The server did not take it.'
  await answerOf(store('readwrite').put({ ...checkOff, refused }, checkOff.entryKey))
  return false
}

async function openCheckOffs() {
  const opening = indexedDB.open(DATABASE)
  opening.onupgradeneeded = () => opening.result.createObjectStore(CHECK_OFFS)
  const database = await answerOf(opening)
  return (mode) => database.transaction(CHECK_OFFS, mode).objectStore(CHECK_OFFS)
}

function answerOf(request) {
  return new Promise((resolve, reject) => {
    request.onsuccess = () => resolve(request.result)
    request.onerror = () => reject(request.error)
  })
}

// Whose copies these are

/** The person may have signed out, so that whoever uses the browser next finds nothing. */
self.addEventListener('message', (event) => {
  const { sheet, isChanged } = event.data ?? {}
  // An open sheet was read anew, or somebody changed it: the copy shall not bring back what they undid.
  if (NIGHT_SHEET.test(sheet)) event.waitUntil(keepFresh(sheet, isChanged))
  if (event.data !== 'forget') return
  event.waitUntil(forget(NAMES).then(() => event.ports[0]?.postMessage('forgotten')))
})

/** Raised when somebody leaves or comes in: what was asked for before is not kept afterwards. */
let visit = 1

async function forget(names) {
  visit += 1
  await Promise.all(names.map((name) => caches.delete(name)))
}

/** Network first; the copy when the network fails, the server breaks, or neither answers in time. */
async function answerPage(event, path) {
  const askedIn = visit
  const fromNetwork = fetch(event.request)
  if (!NIGHT_SHEET.test(path)) return fromNetwork.catch(offlinePage)
  const kept = await (await caches.open(PAGES)).match(path)
  const answered = fromNetwork.then((response) => {
    event.waitUntil(keepPage(path, response.clone(), askedIn))
    return response.status >= 500 && kept ? kept : response
  })
  event.waitUntil(answered.catch(() => undefined))
  if (!kept) return answered.catch(offlinePage)
  const outOfPatience = new Promise((resolve) => setTimeout(resolve, PATIENCE_MILLIS, kept))
  return Promise.race([answered.catch(() => kept), outOfPatience])
}

/** After a redirect or a refusal the reader may no longer see the sheet: then the copy goes too. */
async function keepPage(path, response, askedIn) {
  if (response.status >= 500) return
  const pages = await caches.open(PAGES)
  const text = response.ok && !response.redirected ? await response.clone().text() : ''
  if (BROKEN.test(text)) return
  await pages.delete(path)
  if (!text || REFUSED.test(text) || askedIn !== visit) return
  await pages.put(path, response)
  await drop(pages, MOST_PAGES)
}

/** Moving between screens fetches data, not pages; so a visit to a sheet also fetches its page, now and then. */
async function keepFresh(path, isChanged = false) {
  const kept = await (await caches.open(PAGES)).match(path)
  if (!isChanged && kept && Date.now() - Date.parse(kept.headers.get('Date')) < FRESH_MILLIS) return
  const askedIn = visit
  await fetch(path, { redirect: 'manual', headers: { Accept: 'text/html' } }).then(
    (response) => keepPage(path, response, askedIn),
    () => undefined,
  )
}

/** Next marks the data of a screen so, and what it fetches ahead of a touch. */
function isVisit({ headers }) {
  return (
    headers.get('RSC') === '1' && !headers.get('Next-Router-Prefetch') && !headers.get('Next-Router-Segment-Prefetch')
  )
}

/** Their names carry a hash of their content, so a copy never goes stale. */
async function answerFile({ request }) {
  const files = await caches.open(FILES)
  const kept = await files.match(request)
  if (kept) return kept
  const response = await fetch(request)
  if (response.ok && response.headers.get('Cache-Control')?.includes('immutable')) {
    await files.put(request, response.clone())
    await drop(files, MOST_FILES)
  }
  return response
}

/** The oldest first, down to so many. */
async function drop(cache, most) {
  const requests = await cache.keys()
  await Promise.all(requests.slice(0, Math.max(0, requests.length - most)).map((request) => cache.delete(request)))
}

async function offlinePage() {
  const pages = await caches.open(PAGES)
  const links = await Promise.all((await pages.keys()).map((request) => linkTo(pages, request)))
  const found = links.length ? `<p>Kept from your last visit:</p><ul>${links.join('')}</ul>` : ''
  return new Response(
    `<!doctype html><html lang="en"><meta charset="utf-8"><meta name="viewport" content="width=device-width,initial-scale=1">
<title>No network · Nightsheet</title><style>:root{color-scheme:light dark}body{font:17px/1.5 "IBM Plex Sans",system-ui,sans-serif;max-width:36rem;margin:48px auto;padding:0 20px}
h1{font-size:28px;font-weight:500}a{color:inherit;display:inline-block;padding:12px 0}</style>
<h1>No network.</h1><p>This page could not be fetched. It is fetched again by itself once there is a network.</p>
<p><a href="">Try again</a></p>${found}<script>addEventListener('online', () => location.reload())</script></html>`,
    { status: 503, headers: { 'Content-Type': 'text/html; charset=utf-8' } },
  )
}

/** The title is taken as it stands in the page, already escaped. */
async function linkTo(pages, request) {
  const title = /<title>([^<]*)<\/title>/.exec(await (await pages.match(request)).text())?.[1]
  return `<li><a href="${new URL(request.url).pathname}">${title || 'Night sheet'}</a></li>`
}
