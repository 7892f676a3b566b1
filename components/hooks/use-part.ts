// A heavy part of a page, fetched once it is wanted. Unlike React's lazy(), which breaks the page for good when the network
// fails, it says that it could not be had and can be asked for again; the return of the network asks by itself.
'use client'
import { useCallback, useEffect, useState, type ComponentType } from 'react'

export type LoadPart<P> = () => Promise<{ default: ComponentType<P> }>

/** `load` has to stay the same function from one drawing to the next. */
export function usePart<P>(load: LoadPart<P>, isWanted = true) {
  const [Part, setPart] = useState<ComponentType<P> | null>(null)
  const [hasFailed, setHasFailed] = useState(false)

  const fetchPart = useCallback(
    () =>
      load().then(
        (loaded) => {
          setPart(() => loaded.default)
          setHasFailed(false)
        },
        () => setHasFailed(true),
      ),
    [load],
  )

  useEffect(() => {
    if (!isWanted || Part) return
    const first = setTimeout(() => void fetchPart(), 0)
    window.addEventListener('online', fetchPart)
    return () => {
      clearTimeout(first)
      window.removeEventListener('online', fetchPart)
    }
  }, [isWanted, Part, fetchPart])

  return { Part, hasFailed, fetchPart }
}
