// Whether the browser believes it has a network. On the server and at first: yes.
'use client'
import { useSyncExternalStore } from 'react'

function listen(onChange: () => void): () => void {
  window.addEventListener('online', onChange)
  window.addEventListener('offline', onChange)
  return () => {
    window.removeEventListener('online', onChange)
    window.removeEventListener('offline', onChange)
  }
}

export function useOnline(): boolean {
  return useSyncExternalStore(
    listen,
    () => navigator.onLine,
    () => true,
  )
}
