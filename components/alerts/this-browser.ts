// Web push in this browser: what it can do, whether it does, and switching it on and off. Nothing asks before a tap.

export type PushState =
  | 'unsupported'
  /** On iPhone and iPad only web apps on the home screen get pushes. */
  | 'needs-install'
  | 'denied'
  | 'off'
  | 'on'

export class PushRefusedError extends Error {}

function isAppleMobile(): boolean {
  // iPads call themselves Macs, but no Mac has a touch screen.
  return (
    /iPhone|iPad|iPod/.test(navigator.userAgent) ||
    (/Macintosh/.test(navigator.userAgent) && navigator.maxTouchPoints > 1)
  )
}

function isInstalled(): boolean {
  return matchMedia('(display-mode: standalone)').matches
}

async function fingerprintOf(endpoint: string): Promise<string> {
  const digest = await crypto.subtle.digest('SHA-256', new TextEncoder().encode(endpoint))
  return [...new Uint8Array(digest)].map((byte) => byte.toString(16).padStart(2, '0')).join('')
}

async function presentSubscription(): Promise<PushSubscription | null> {
  const registration = await navigator.serviceWorker.getRegistration('/')
  return (await registration?.pushManager.getSubscription()) ?? null
}

/** @param fingerprints of the devices that the account knows: one removed elsewhere is off here too. */
export async function readPushState(fingerprints: readonly string[]): Promise<PushState> {
  const isAble = 'serviceWorker' in navigator && 'PushManager' in window && 'Notification' in window
  if (!isAble) return isAppleMobile() && !isInstalled() ? 'needs-install' : 'unsupported'
  if (Notification.permission === 'denied') return 'denied'
  const subscription = await presentSubscription()
  return subscription && fingerprints.includes(await fingerprintOf(subscription.endpoint)) ? 'on' : 'off'
}

/** To be called from a tap: the browser asks for permission here. @throws PushRefusedError with words for the person. */
export async function switchPushOn(vapidPublicKey: string): Promise<void> {
  if ((await Notification.requestPermission()) !== 'granted')
    throw new PushRefusedError('Notifications were not allowed.')
  await navigator.serviceWorker.register('/sw.js', { scope: '/', updateViaCache: 'none' })
  const { pushManager } = await navigator.serviceWorker.ready
  const subscription = await subscribe(pushManager, vapidPublicKey)
  await send('POST', subscription.toJSON())
}

/** A subscription made for another server's key cannot be used; the browser insists that it goes first. */
async function subscribe(pushManager: PushManager, applicationServerKey: string): Promise<PushSubscription> {
  const options = { userVisibleOnly: true, applicationServerKey }
  try {
    return await pushManager.subscribe(options)
  } catch (error) {
    const former = await pushManager.getSubscription()
    if (!former)
      throw new PushRefusedError('The browser could not reach its push service. Try again later.', { cause: error })
    await former.unsubscribe()
    return pushManager.subscribe(options)
  }
}

/** The server forgets first: then a failure leaves the device on, as the page says. */
export async function switchPushOff(): Promise<void> {
  const subscription = await presentSubscription()
  if (!subscription) return
  await send('DELETE', { endpoint: subscription.endpoint })
  await subscription.unsubscribe()
}

async function send(method: 'POST' | 'DELETE', body: unknown): Promise<void> {
  const response = await fetch('/api/push-subscriptions', {
    method,
    headers: { 'Content-Type': 'application/json' },
    body: JSON.stringify(body),
  })
  if (response.ok) return
  const refusal: { error?: { message?: string } } = await response.json().catch(() => ({}))
  throw new PushRefusedError(refusal.error?.message ?? 'The server did not answer as it should. Try again in a minute.')
}
