// False on the server and in the first render of the browser, true afterwards: for what only works with script.
'use client'
import { useSyncExternalStore } from 'react'

const never = () => () => {}

export function useHydrated(): boolean {
  return useSyncExternalStore(
    never,
    () => true,
    () => false,
  )
}
