// Registers the service worker: it shows notifications and keeps the last night sheet for when there is no network.
'use client'
import { useEffect } from 'react'

export function ServiceWorker() {
  useEffect(() => {
    if (!('serviceWorker' in navigator)) return
    // Private windows and plain http refuse; the page works without it.
    navigator.serviceWorker.register('/sw.js', { scope: '/', updateViaCache: 'none' }).catch(() => undefined)
  }, [])
  return null
}
