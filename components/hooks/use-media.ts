// Whether a media query holds; null on the server and in the first render of the browser, which do not know.
'use client'
import { useCallback, useSyncExternalStore } from 'react'

export function useMedia(query: string): boolean | null {
  const subscribe = useCallback(
    (onChange: () => void) => {
      const media = matchMedia(query)
      media.addEventListener('change', onChange)
      return () => media.removeEventListener('change', onChange)
    },
    [query],
  )
  return useSyncExternalStore(
    subscribe,
    () => matchMedia(query).matches,
    () => null,
  )
}
