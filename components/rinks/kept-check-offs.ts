// Check-offs on this device until the server has them: kept in IndexedDB, where the service worker finds them too.
import { createStore, del, set, values } from 'idb-keyval'
import { checkOffsPath } from '@/lib/cache-keys/outlook'

export interface KeptCheckOff {
  /** The server keeps each key once. */
  entryKey: string
  /** Sent only as the person who pressed the button. */
  userId: string
  rinkId: string
  nightDate: string
  passNumber: number
  layerMm: number
  waterTemperatureC: number
  pouredAt: string
  /** What the server said when it would not have it; shown once, then dropped. */
  refused?: string
}

export type Sent = 'sent' | 'refused' | 'stuck'

/** Names shared with public/sw.js. */
const DATABASE = 'nightsheet'
const STORE = 'check-offs'
const SYNC_TAG = 'check-offs'

/** Sign-in, waiting, another account signed in and broken servers pass; other refusals are the last word. */
const PASSING = new Set([401, 408, 409, 425, 429])

const store = createStore(DATABASE, STORE)

/** Where the browser keeps nothing (private windows), until the page is closed. */
const inMemory = new Map<string, KeptCheckOff>()

export async function keep(checkOff: KeptCheckOff): Promise<void> {
  await set(checkOff.entryKey, checkOff, store).catch(() => inMemory.set(checkOff.entryKey, checkOff))
}

export async function drop(entryKey: string): Promise<void> {
  inMemory.delete(entryKey)
  await del(entryKey, store).catch(() => undefined)
}

/** Those of one person at one rink, oldest first. */
export async function listKept(userId: string, rinkId: string): Promise<KeptCheckOff[]> {
  const stored = await values<KeptCheckOff>(store).catch(() => [])
  return [...stored, ...inMemory.values()]
    .filter((one) => one.userId === userId && one.rinkId === rinkId)
    .sort((a, b) => a.pouredAt.localeCompare(b.pouredAt))
}

/** Sends one and settles it; what could not be sent stays. */
export async function send(checkOff: KeptCheckOff): Promise<Sent> {
  const response = await fetch(checkOffsPath(checkOff.rinkId), {
    method: 'POST',
    headers: { 'Content-Type': 'application/json' },
    body: JSON.stringify(checkOff),
  }).catch(() => null)
  if (response === null || response.status >= 500 || PASSING.has(response.status)) {
    await askToSync()
    return 'stuck'
  }
  if (response.ok) {
    await drop(checkOff.entryKey)
    return 'sent'
  }
  const answer = (await response.json().catch(() => ({}))) as { error?: { message?: string } }
  await keep({ ...checkOff, refused: answer.error?.message ?? 'The server did not take it.' })
  return 'refused'
}

interface SyncRegistration extends ServiceWorkerRegistration {
  sync?: { register(tag: string): Promise<void> }
}

/** Where the browser can, the service worker sends what is left once there is a network, the page closed or not. */
async function askToSync(): Promise<void> {
  const registration = (await navigator.serviceWorker?.getRegistration()) as SyncRegistration | undefined
  await registration?.sync?.register(SYNC_TAG).catch(() => undefined)
}
